import { octahedralOccupation, type SpinChoice } from '../estimation';
import type { BandInput, BandLevel } from './bandInput';

export interface GroundState {
  readonly multiplicity: number;
  /** Electrons in the leading strong-field configuration. */
  readonly t2: number;
  readonly e: number;
  readonly lowSpin: boolean;
}

/** Ground configuration from the levels; by spin alone where they do not tell it or there are none. */
export function groundState({ dElectrons, geometry, levels }: BandInput): GroundState {
  const ground = levels[0];
  const highest = (dElectrons <= 5 ? dElectrons : 10 - dElectrons) + 1;
  const multiplicity = ground?.multiplicity ?? highest;
  const lowSpin = dElectrons >= 4 && dElectrons <= 7 && multiplicity < highest;
  const told = ground?.configurations[0];
  if (told !== undefined) return { multiplicity, t2: told.t2, e: told.e, lowSpin };
  const spin: SpinChoice = lowSpin ? 'low' : 'high';
  if (geometry !== 'tetrahedral') return { multiplicity, ...octahedralOccupation(dElectrons, spin), lowSpin };
  const holes = octahedralOccupation(10 - dElectrons, spin);
  return { multiplicity, t2: 6 - holes.t2, e: 4 - holes.e, lowSpin };
}

/**
 * Levels counted from the lowest one of a multiplicity, the first; those below it are left out. Unchanged where that is
 * the ground level already or no level has it.
 */
export function levelsFrom(
  levels: readonly BandLevel[],
  multiplicity: number | undefined,
): readonly BandLevel[] {
  const at = levels.findIndex((level) => level.multiplicity === multiplicity);
  if (at <= 0) return levels;
  const { energy, slope } = levels[at]!;
  return levels.slice(at).map((level) => ({
    ...level,
    energy: level.energy - energy,
    slope: {
      tenDq: level.slope.tenDq - slope.tenDq,
      B: level.slope.B - slope.B,
      C: level.slope.C - slope.C,
    },
  }));
}
