import type { BandLevel } from '../bandInput';
import { spinOrbitReach } from './spinOrbitSelection';

/**
 * Matrix element of spin-orbit coupling between multiplets in units of zeta: 1/2 between neighbours. Into the 6A1
 * ground level of d5 all components of 4T1 couple at once; 4 gives the 0.01 to 0.03 L/mol/cm of aqua manganese(II)
 * (from memory).
 */
const element = { between: 0.5, intoSextet: 4 };
/** Beyond this share the two are one band, and first order says nothing. */
const mostMixing = 0.3;

export interface SpinAllowedIntensity {
  readonly level: BandLevel;
  /** L mol⁻¹ cm⁻¹ */
  readonly molarAbsorptivity: number;
  readonly width_cm1: number;
}

export interface BorrowedBand {
  readonly molarAbsorptivity: number;
  readonly width_cm1: number;
}

/** First-order share (coupling / distance)² of one level in another. */
const mixing = (coupling_cm1: number, one: BandLevel, other: BandLevel): number =>
  Math.min(mostMixing, (coupling_cm1 / Math.max(1, Math.abs(one.energy - other.energy))) ** 2) *
  spinOrbitReach(one, other);

/** Share of levels of one multiplicity that spin-orbit coupling brings into the ground level. */
export function groundMixing(levels: readonly BandLevel[], multiplicity: number, zeta: number): number {
  const ground = levels[0]!;
  const coupling = (ground.multiplicity === 6 ? element.intoSextet : element.between) * zeta;
  let share = 0;
  for (const level of levels) {
    if (level.multiplicity === multiplicity) share += mixing(coupling, level, ground);
  }
  return Math.min(mostMixing, share);
}

/**
 * Strength of a spin-forbidden band: by spin-orbit coupling it takes its share of the area of each spin-allowed one, and,
 * through what coupling mixes into the ground level, of a transition within its own multiplicity. With the intensity of a
 * near neighbour it takes of its width too.
 *
 * @param own - molar absorptivity from within its own multiplicity: the mixing into the ground level times what a
 *   transition there would have
 * @param width_cm1 - width by its own slope
 */
export function borrowedBand(
  level: BandLevel,
  allowed: readonly SpinAllowedIntensity[],
  zeta: number,
  own: number,
  width_cm1: number,
): BorrowedBand {
  let area = own * width_cm1;
  let width = width_cm1;
  for (const lender of allowed) {
    const share = mixing(element.between * zeta, lender.level, level);
    area += share * lender.molarAbsorptivity * lender.width_cm1;
    width += (share / mostMixing) * lender.width_cm1;
  }
  return { molarAbsorptivity: area / width, width_cm1: width };
}
