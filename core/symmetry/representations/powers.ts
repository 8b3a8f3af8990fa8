import { type PointGroup } from '../pointGroup';
import { type Character } from './character';

/** χ(g^k) at every class; `spinor` characters change sign where the power is a barred operation. */
export function characterOfPower(
  group: PointGroup,
  character: Character,
  k: number,
  spinor = false,
): number[] {
  const { product } = group.elements;
  return group.classes.map(({ representative }) => {
    const element = group.place(representative)!;
    let power = 0;
    for (let i = 0; i < k; i++) power = product[element]![power]!;
    const { index, barred } = group.classOf[power]!;
    return spinor && barred ? -character[index]! : character[index]!;
  });
}

/**
 * Character of the antisymmetrised k-th power, Λ^k: k electrons of one spin in the orbitals that carry `character`.
 * Newton's identities: k e_k = Σ_i (−1)^(i−1) e_(k−i) χ(g^i). Zero for k above the dimension.
 */
export const antisymmetrisedPower = (group: PointGroup, character: Character, k: number): number[] =>
  newton(group, character, k, -1);

/** Character of the symmetrised k-th power: k h_k = Σ_i h_(k−i) χ(g^i) (k vibrational quanta, for instance). */
export const symmetrisedPower = (group: PointGroup, character: Character, k: number): number[] =>
  newton(group, character, k, 1);

function newton(group: PointGroup, character: Character, k: number, sign: 1 | -1): number[] {
  const results: number[][] = [group.classes.map(() => 1)];
  for (let n = 1; n <= k; n++) {
    const total = group.classes.map(() => 0);
    for (let i = 1; i <= n; i++) {
      const powers = characterOfPower(group, character, i);
      const factor = i % 2 === 0 ? sign : 1;
      powers.forEach((value, c) => (total[c]! += (factor * results[n - i]![c]! * value) / n));
    }
    results.push(total.map((value) => Math.round(value * 1e9) / 1e9));
  }
  return results[k]!;
}
