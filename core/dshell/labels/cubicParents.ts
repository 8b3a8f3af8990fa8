import { pointGroup, type CubicGroup } from '../../symmetry';
import { carriedBy, type Amplitudes } from '../states/amplitudes';
import { overlap } from './characters';

/** A term of the cubic parent with its share in a level; the name does not tell repeated terms apart. */
export interface CubicWeight {
  /** `3T1g` in O_h, `3T1` in T_d. */
  readonly label: string;
  readonly weight: number;
}

/** Every rotation of O once, with its class. */
const rotations = (() => {
  const { elements, classOf } = pointGroup('O');
  return elements.elements.flatMap(({ rotation }, i) =>
    // Of an element and its bar the one met first.
    i < elements.bar[i]! ? [{ carry: carriedBy(rotation), index: classOf[i]!.index }] : [],
  );
})();

/**
 * Shares of the cubic terms in orbital states over the cubic axes (norms add up to `count`): ⟨ψ|P_Γ|ψ⟩ with the projector
 * P_Γ = (dimension/24) Σ_g χ_Γ(g) R(g). Largest first.
 */
export function cubicWeights(parts: readonly Amplitudes[], count: number, group: CubicGroup): CubicWeight[] {
  const O = pointGroup('O');
  const weights = new Map<string, number>();
  for (const part of parts) {
    const diagonal = O.classes.map(() => 0);
    for (const { carry, index } of rotations) diagonal[index]! += overlap(part, carry(part));
    const multiplicity = 2 * part.multiplets[0]!.S + 1;
    for (const { mulliken, dimension, characters, spinor } of O.irreps) {
      if (spinor) continue;
      const label = `${multiplicity}${mulliken}${group === 'Oh' ? 'g' : ''}`;
      const share =
        (dimension / O.order) * diagonal.reduce((sum, value, c) => sum + characters[c]! * value, 0);
      weights.set(label, (weights.get(label) ?? 0) + share / count);
    }
  }
  return [...weights]
    .map(([label, weight]) => ({ label, weight }))
    .filter(({ weight }) => weight > 1e-9)
    .sort((a, b) => b.weight - a.weight);
}
