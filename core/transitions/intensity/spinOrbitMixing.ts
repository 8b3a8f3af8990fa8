import type { BandLevel } from '../bandInput';

/**
 * Matrix element of spin-orbit coupling between multiplets in units of zeta: 1/2 between neighbours. Into the 6A1
 * ground level of d5 all quartets couple at once; 4 gives the 0.01 to 0.03 L/mol/cm of aqua manganese(II) (from memory).
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

const mixing = (coupling_cm1: number, distance_cm1: number): number =>
  Math.min(mostMixing, (coupling_cm1 / Math.max(1, Math.abs(distance_cm1))) ** 2);

/**
 * Strength of a spin-forbidden band: it takes (coupling / distance)² of the area of each spin-allowed one by spin-orbit
 * coupling, and as much of the transitions within its own multiplicity as coupling mixes into the ground level. With the
 * intensity of a near neighbour it takes of its width too.
 *
 * @param own - molar absorptivity that a transition within its own multiplicity would have
 * @param width_cm1 - width by its own slope
 */
export function borrowedBand(
  level: BandLevel,
  groundMultiplicity: number,
  allowed: readonly SpinAllowedIntensity[],
  zeta: number,
  own: number,
  width_cm1: number,
): BorrowedBand {
  const toGround = groundMultiplicity === 6 ? element.intoSextet : element.between;
  let area = mixing(toGround * zeta, level.energy) * own * width_cm1;
  let width = width_cm1;
  for (const lender of allowed) {
    const share = mixing(element.between * zeta, lender.level.energy - level.energy);
    area += share * lender.molarAbsorptivity * lender.width_cm1;
    width += (share / mostMixing) * lender.width_cm1;
  }
  return { molarAbsorptivity: area / width, width_cm1: width };
}
