import type { CubicGeometry } from '../../dshell';
import { leastSquares, type LeastSquaresResult } from '../../numerics/leastSquares';
import { levelsFrom, sameLevel, type FieldParameters, type LevelKey } from './model';

/** A measured band with the level it is taken for. */
export interface TargetBand {
  readonly energy_cm1: number;
  readonly se_cm1: number;
  readonly level: LevelKey;
}

/** Which parameters move; the others are held, or tied to B by a fixed C/B. */
export interface Freedom {
  readonly tenDq: boolean;
  readonly B: boolean;
  readonly C: 'free' | 'held' | { readonly ratio: number };
}

export interface FieldSolution {
  readonly parameters: FieldParameters;
  readonly predicted: readonly number[];
  /** Sum of ((measured - calculated) / se)^2. */
  readonly chi2: number;
  /** Standard errors for unit weights: square roots of the diagonal of the inverse normal matrix; null where held. */
  readonly rawSe: { readonly tenDq: number | null; readonly B: number | null; readonly C: number | null };
  /** Correlation of 10Dq and B; null where one of them was held. */
  readonly correlation: {
    readonly names: readonly string[];
    readonly matrix: readonly (readonly number[])[];
  } | null;
  readonly status: LeastSquaresResult['status'];
  readonly isGround: boolean;
  readonly groundLabel: string;
}

export const limits = { tenDq: [100, 80_000], B: [5, 3000], C: [1, 15_000] } as const;

const names = ['tenDq', 'B', 'C'] as const;

/** Least-squares 10Dq, B and C for bands with known levels, by the exact levels and their slopes. */
export function solveField(
  dElectrons: number,
  geometry: CubicGeometry,
  groundMultiplicity: number,
  bands: readonly TargetBand[],
  start: FieldParameters,
  freedom: Freedom,
): FieldSolution {
  const free = names.filter((name) => (name === 'C' ? freedom.C === 'free' : freedom[name]));
  const full = (p: ArrayLike<number>): FieldParameters => {
    const values = { ...start };
    free.forEach((name, j) => (values[name] = p[j]!));
    if (typeof freedom.C === 'object') values.C = freedom.C.ratio * values.B;
    return values;
  };
  const n = Math.max(1, free.length);
  const fit = leastSquares({
    points: bands.length,
    start: free.length > 0 ? free.map((name) => start[name]) : [0],
    lower: free.length > 0 ? free.map((name) => limits[name][0]) : [0],
    upper: free.length > 0 ? free.map((name) => limits[name][1]) : [0],
    maxIterations: 60,
    evaluate(p, residuals, jacobian) {
      const { levels } = levelsFrom(dElectrons, geometry, full(p), groundMultiplicity);
      for (const [i, band] of bands.entries()) {
        const level = levels.find((each) => sameLevel(each, band.level));
        if (level === undefined) {
          residuals[i] = 1e6;
          continue;
        }
        residuals[i] = (level.energy - band.energy_cm1) / band.se_cm1;
        if (jacobian === null) continue;
        free.forEach((name, j) => {
          const tied = name === 'B' && typeof freedom.C === 'object' ? freedom.C.ratio * level.slope.C : 0;
          jacobian[i * n + j] = (level.slope[name] + tied) / band.se_cm1;
        });
      }
    },
  });
  const parameters = full(fit.parameters);
  const found = levelsFrom(dElectrons, geometry, parameters, groundMultiplicity);
  const variance = (name: (typeof names)[number]): number | null => {
    const j = free.indexOf(name);
    if (j < 0 || fit.inverseNormal === null || fit.atBound[j]) return null;
    return fit.inverseNormal[j]![j]!;
  };
  const se = (name: (typeof names)[number]): number | null => {
    const value = variance(name);
    return value === null ? null : Math.sqrt(value);
  };
  const inverse = fit.inverseNormal;
  return {
    parameters,
    predicted: bands.map(
      (band) => found.levels.find((level) => sameLevel(level, band.level))?.energy ?? Number.NaN,
    ),
    chi2: fit.rss,
    rawSe: { tenDq: se('tenDq'), B: se('B'), C: se('C') },
    correlation:
      inverse === null || free.length === 0
        ? null
        : {
            names: free,
            matrix: inverse.map((row, i) =>
              row.map((value, j) =>
                i === j ? 1 : value / Math.sqrt(inverse[i]![i]! * inverse[j]![j]! || 1),
              ),
            ),
          },
    status: fit.status,
    isGround: found.isGround,
    groundLabel: found.ground.label,
  };
}
