import type { CubicGeometry } from '../../dshell';
import { rankedAssignments } from '../assignment/ranked';
import { parseLevel } from './labels';
import { levelKey, levelsFrom, type FieldParameters, type KeyedLevel, type LevelKey } from './model';

export interface FieldBand {
  readonly energy_cm1: number;
  readonly se_cm1: number;
  readonly multiplicity: number | null;
  readonly label: string | null;
}

/** Whether a band may be taken for a level; a label that is not understood excludes nothing. */
function fits(band: FieldBand, level: KeyedLevel, groundMultiplicity: number): boolean {
  const named = band.label === null ? null : parseLevel(band.label);
  if (named !== null) {
    if (level.multiplicity !== named.multiplicity) return false;
    if (named.irrep !== null && level.irrep !== named.irrep) return false;
    // Of two levels of the ground multiplicity and one name, (F) is the lower and (P) the upper.
    if (level.multiplicity !== groundMultiplicity) return true;
    return named.parent === 'P' ? level.ordinal === 1 : named.parent === 'F' ? level.ordinal === 0 : true;
  }
  return level.multiplicity === (band.multiplicity ?? groundMultiplicity);
}

/** Price of a second, third and fourth band on one level: components of a level that a lower symmetry splits. */
const shares = [0, 0.5, 1, 1.5];

export interface CandidateAssignment {
  readonly levels: readonly LevelKey[];
  readonly at: FieldParameters;
  readonly cost: number;
}

const tenDqGrid = [
  3000, 4500, 6000, 8000, 10_000, 12_500, 15_000, 18_000, 21_500, 25_500, 30_000, 36_000, 44_000,
];
const bGrid = [350, 550, 750, 1000];

/**
 * Assignments worth a fit: at each point of a coarse grid of parameters the bands are matched with levels in the
 * cheapest ways, positions in units that let the grid be coarse. Bands in ascending order go to levels in ascending
 * order of energy wherever that is cheaper.
 */
export function candidateAssignments(
  dElectrons: number,
  geometry: CubicGeometry,
  groundMultiplicity: number,
  bands: readonly FieldBand[],
  ratios: readonly number[],
): CandidateAssignment[] {
  const found = new Map<string, CandidateAssignment>();
  for (const tenDq of tenDqGrid) {
    for (const B of bGrid) {
      for (const ratio of ratios) {
        const at = { tenDq, B, C: ratio * B };
        const { levels, isGround } = levelsFrom(dElectrons, geometry, at, groundMultiplicity);
        const upper = levels.filter((level) => level.energy > 1);
        const cost = bands.map((band) =>
          shares.flatMap((price) =>
            upper.map((level) => {
              if (!fits(band, level, groundMultiplicity)) return Infinity;
              // Only bands that say which level they belong to may share one.
              if (price > 0 && (band.label === null || parseLevel(band.label)?.irrep == null))
                return Infinity;
              const off = (level.energy - band.energy_cm1) / (0.1 * band.energy_cm1 + 500);
              return off * off + price;
            }),
          ),
        );
        for (const ranked of rankedAssignments(cost, 2)) {
          const keys = ranked.columns.map((j): LevelKey => upper[j % upper.length]!);
          const name = keys.map(levelKey).join(' ');
          const before = found.get(name);
          // Where the other spin lies lower, the point is no place for these bands, though a fit may lead away from it.
          const price = ranked.cost + (isGround ? 0 : 8);
          if (before === undefined || price < before.cost) found.set(name, { levels: keys, at, cost: price });
        }
      }
    }
  }
  return [...found.values()].sort((a, b) => a.cost - b.cost);
}
