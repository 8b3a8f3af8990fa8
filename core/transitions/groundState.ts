import { octahedralOccupation, type SpinChoice } from '../estimation';
import type { BandInput, BandLevel } from './bandInput';

export interface GroundState {
  readonly multiplicity: number;
  /** Electrons in the leading strong-field configuration. */
  readonly t2: number;
  readonly e: number;
  readonly lowSpin: boolean;
}

/** Ground configuration from the levels, or by Hund's rule where there are none. */
export function groundState({ dElectrons, geometry, levels }: BandInput): GroundState {
  const ground = levels[0];
  const tetrahedral = geometry === 'tetrahedral';
  const highest = (dElectrons <= 5 ? dElectrons : 10 - dElectrons) + 1;
  if (ground?.configurations[0] === undefined) {
    const spin: SpinChoice = 'high';
    const like = octahedralOccupation(tetrahedral ? 10 - dElectrons : dElectrons, spin);
    const shell = tetrahedral ? { t2: 6 - like.t2, e: 4 - like.e } : like;
    return { multiplicity: ground?.multiplicity ?? highest, ...shell, lowSpin: false };
  }
  const { t2, e } = ground.configurations[0];
  const hasChoice = dElectrons >= 4 && dElectrons <= 7;
  return {
    multiplicity: ground.multiplicity,
    t2,
    e,
    lowSpin: hasChoice && ground.multiplicity < highest,
  };
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
