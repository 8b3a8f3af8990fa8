import { cubicLevels } from '../dshell';
import type { CubicGeometry, CubicLevel, CubicProblem } from '../dshell/types';

export interface LevelGap {
  /** E(lowest level of the lower multiplicity) - E(lowest of the higher), cm⁻¹. */
  readonly gap: number;
  readonly slope: { readonly tenDq: number; readonly B: number; readonly C: number };
}

const lowestOf = (levels: readonly CubicLevel[], multiplicity: number): CubicLevel => {
  let lowest: CubicLevel | undefined;
  for (const level of levels) {
    if (level.multiplicity !== multiplicity) continue;
    if (lowest === undefined || level.energy < lowest.energy) lowest = level;
  }
  if (lowest === undefined) throw new Error(`no level of multiplicity ${multiplicity}`);
  return lowest;
};

/** Gap between the two spin states in one and the same field, with its exact slopes. */
export function verticalGap(
  levels: readonly CubicLevel[],
  highMultiplicity: number,
  lowMultiplicity: number,
): LevelGap {
  const high = lowestOf(levels, highMultiplicity);
  const low = lowestOf(levels, lowMultiplicity);
  return {
    gap: low.energy - high.energy,
    slope: {
      tenDq: low.slope.tenDq - high.slope.tenDq,
      B: low.slope.B - high.slope.B,
      C: low.slope.C - high.slope.C,
    },
  };
}

/**
 * 10Dq/B at which the ground state changes from high to low spin, from the exact levels of both spins (Y. Tanabe and
 * S. Sugano, J. Phys. Soc. Jpn 9, 1954, 753 and 766), not from a mean pairing energy. Null where it never does.
 */
export function crossoverRatio(
  dElectrons: number,
  geometry: CubicGeometry,
  ratioCB: number,
  highMultiplicity: number,
  lowMultiplicity: number,
  start = 22,
): number | null {
  const B = 1000;
  let ratio = start;
  for (let step = 0; step < 30; step++) {
    const problem: CubicProblem = { dElectrons, geometry, tenDq: ratio * B, B, C: ratioCB * B };
    const { gap, slope } = verticalGap(cubicLevels(problem), highMultiplicity, lowMultiplicity);
    if (slope.tenDq >= 0) return null;
    const change = -gap / slope.tenDq / B;
    ratio = Math.max(1, ratio + Math.max(-15, Math.min(15, change)));
    if (Math.abs(change) < 1e-7) return ratio;
    if (ratio > 500) return null;
  }
  return null;
}
