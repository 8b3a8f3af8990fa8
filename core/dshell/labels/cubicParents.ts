import { pointGroup, type CubicGroup, type Irrep } from '../../symmetry';
import { type Amplitudes } from '../states/amplitudes';
import { diagonal, remembered, rotationMatrix } from './diagonal';

/** A term of the cubic parent with its share in a level; the name does not tell repeated terms apart. */
export interface CubicWeight {
  /** `3T1g` in O_h, `3T1` in T_d. */
  readonly label: string;
  readonly weight: number;
}

const O = pointGroup('O');
const irreps = O.irreps.filter(({ spinor }) => !spinor);

/** P_Γ = (dimension/24) Σ_g χ_Γ(g) R(g) among the states of one L. */
function projector({ dimension, characters }: Irrep, L: number): { re: Float64Array; im: Float64Array } {
  const sum = { re: new Float64Array((2 * L + 1) ** 2), im: new Float64Array((2 * L + 1) ** 2) };
  O.elements.elements.forEach(({ rotation }, element) => {
    // Every rotation occurs twice among the elements of the double group.
    const factor = (dimension / O.order / 2) * characters[O.classOf[element]!.index]!;
    if (factor === 0) return;
    const { re, im } = rotationMatrix(L, rotation);
    for (let i = 0; i < re.length; i++) {
      sum.re[i]! += factor * re[i]!;
      sum.im[i]! += factor * im[i]!;
    }
  });
  return sum;
}

const projectors = irreps.map((irrep) => remembered((L) => projector(irrep, L)));

/** Shares of the cubic terms in orbital states over the cubic axes (norms add up to `count`), largest first. */
export function cubicWeights(parts: readonly Amplitudes[], count: number, group: CubicGroup): CubicWeight[] {
  const weights = new Map<string, number>();
  for (const part of parts) {
    const multiplicity = 2 * part.multiplets[0]!.S + 1;
    irreps.forEach(({ mulliken }, i) => {
      const label = `${multiplicity}${mulliken}${group === 'Oh' ? 'g' : ''}`;
      weights.set(label, (weights.get(label) ?? 0) + diagonal(part, projectors[i]!) / count);
    });
  }
  return [...weights]
    .map(([label, weight]) => ({ label, weight }))
    .filter(({ weight }) => weight > 1e-9)
    .sort((a, b) => b.weight - a.weight);
}
