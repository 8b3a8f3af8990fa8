import { avogadro_per_mol, boltzmann_J_K } from '../../units';
import { SpinhueError } from '../../errors';
import { leastSquares, type FitStatus } from '../../numerics/leastSquares';

const gas_J_molK = avogadro_per_mol * boltzmann_J_K;

/** Share of high spin at equilibrium: x = 1 / (1 + exp[(dH/R)(1/T - 1/T_half)]). */
export const highSpinShare = (enthalpy_J_mol: number, half_K: number, temperature_K: number): number =>
  1 / (1 + Math.exp((enthalpy_J_mol / gas_J_molK) * (1 / temperature_K - 1 / half_K)));

/** Share of high spin in a mixture of two forms, from moments: mu^2 is additive. */
export const shareFromMoments = (moment: number, high: number, low: number): number =>
  (moment ** 2 - low ** 2) / (high ** 2 - low ** 2);

export const mixedMoment = (share: number, high: number, low: number): number =>
  Math.sqrt(share * high ** 2 + (1 - share) * low ** 2);

/**
 * Cooperativity above which a transition shows hysteresis: 2 R T_half (C. P. Slichter, H. G. Drickamer, J. Chem. Phys.
 * 56, 2142, 1972), J/mol.
 */
export const hysteresisThreshold = (half_K: number): number => 2 * gas_J_molK * half_K;

/**
 * Share of high spin with cooperativity Gamma, from ln((1-x)/x) = (dH + Gamma (1 - 2x)) / RT - dS/R, on the branch that
 * is reached on heating. Without hysteresis there is one branch.
 */
export function cooperativeShare(
  enthalpy_J_mol: number,
  half_K: number,
  gamma_J_mol: number,
  temperature_K: number,
): number {
  const RT = gas_J_molK * temperature_K;
  const misfit = (x: number) =>
    Math.log((1 - x) / x) -
    (enthalpy_J_mol + gamma_J_mol * (1 - 2 * x)) / RT +
    enthalpy_J_mol / (gas_J_molK * half_K);
  // Going up from x = 0 the first root belongs to the low-spin branch, which heating follows.
  let low = 1e-15;
  const steps = 400;
  for (let i = 1; i <= steps; i++) {
    let high = i / steps - (i === steps ? 1e-15 : 0);
    if (misfit(high) > 0) {
      low = high;
      continue;
    }
    for (let k = 0; k < 60; k++) {
      const middle = (low + high) / 2;
      if (misfit(middle) > 0) low = middle;
      else high = middle;
    }
    return (low + high) / 2;
  }
  return 1;
}

export interface VantHoffPoint {
  readonly temperature_K: number;
  readonly chiT: number;
  readonly u?: number | null;
}

export interface VantHoffFit {
  readonly enthalpy_kJ_mol: { readonly value: number; readonly se: number | null };
  readonly half_K: { readonly value: number; readonly se: number | null };
  /** dH / T_half. */
  readonly entropy_J_molK: { readonly value: number; readonly se: number | null };
  readonly chiTHigh: { readonly value: number; readonly se: number | null };
  readonly chiTLow: { readonly value: number; readonly se: number | null };
  readonly status: FitStatus;
  /** Share of the scatter that the curve accounts for. */
  readonly rSquared: number;
  readonly curve: readonly {
    readonly temperature_K: number;
    readonly chiT: number;
    readonly share: number;
  }[];
  readonly remarks: readonly string[];
}

/**
 * Fits a gradual spin equilibrium to chi T against temperature: dH, T_half and the two plateaus, or plateaus held where
 * they are known. Meant for solutions and for solids without cooperativity. Throws a SpinhueError for too few points.
 */
export function fitVantHoff(
  points: readonly VantHoffPoint[],
  held: { readonly chiTHigh?: number; readonly chiTLow?: number } = {},
): VantHoffFit {
  const free = 4 - (held.chiTHigh === undefined ? 0 : 1) - (held.chiTLow === undefined ? 0 : 1);
  if (points.length <= free) {
    throw new SpinhueError({
      code: 'out-of-range',
      field: 'points',
      message: `${points.length} points cannot determine ${free} parameters`,
      remedy: 'measure at more temperatures or hold the plateaus',
    });
  }
  for (const [i, point] of points.entries()) {
    if (!(point.temperature_K > 0) || !Number.isFinite(point.chiT)) {
      throw new SpinhueError({
        code: 'out-of-range',
        field: `points[${i}]`,
        message: `points[${i}] is not a temperature with chi T`,
      });
    }
  }
  const values = points.map((point) => point.chiT);
  const temperatures = points.map((point) => point.temperature_K);
  const [bottom, top] = [Math.min(...values), Math.max(...values)];
  const middle = (bottom + top) / 2;
  const nearHalf = points.reduce((best, point) =>
    Math.abs(point.chiT - middle) < Math.abs(best.chiT - middle) ? point : best,
  );
  const sizes = points.map((point) => (point.u != null && point.u > 0 ? point.u : 1));
  const bounds = [
    [500, 200_000],
    [0.3 * Math.min(...temperatures), 3 * Math.max(...temperatures)],
    held.chiTHigh === undefined ? [middle, 3 * top] : [held.chiTHigh, held.chiTHigh],
    held.chiTLow === undefined ? [0, middle] : [held.chiTLow, held.chiTLow],
  ] as const;
  const solve = (enthalpy: number, half: number) =>
    leastSquares({
      points: points.length,
      start: [enthalpy, half, held.chiTHigh ?? top, held.chiTLow ?? bottom],
      lower: bounds.map((bound) => bound[0]),
      upper: bounds.map((bound) => bound[1]),
      evaluate(p, residuals, jacobian) {
        for (const [i, point] of points.entries()) {
          const T = point.temperature_K;
          const x = highSpinShare(p[0]!, p[1]!, T);
          residuals[i] = (x * p[2]! + (1 - x) * p[3]! - point.chiT) / sizes[i]!;
          if (jacobian === null) continue;
          const slope = (-x * (1 - x) * (p[2]! - p[3]!)) / sizes[i]!;
          jacobian[4 * i] = (slope * (1 / T - 1 / p[1]!)) / gas_J_molK;
          jacobian[4 * i + 1] = (slope * p[0]!) / gas_J_molK / p[1]! ** 2;
          jacobian[4 * i + 2] = x / sizes[i]!;
          jacobian[4 * i + 3] = (1 - x) / sizes[i]!;
        }
      },
    });
  const fits = [8e3, 2e4, 5e4].flatMap((dH) =>
    [0.8, 1, 1.25].map((by) => solve(dH, nearHalf.temperature_K * by)),
  );
  const best = fits.reduce((a, b) => (b.rss < a.rss ? b : a));
  return describe(points, best, held, bounds);
}

function describe(
  points: readonly VantHoffPoint[],
  fit: ReturnType<typeof leastSquares>,
  held: { readonly chiTHigh?: number; readonly chiTLow?: number },
  bounds: readonly (readonly [number, number] | readonly number[])[],
): VantHoffFit {
  const p = fit.parameters;
  const free = bounds.filter((bound) => bound[0] !== bound[1]).length;
  const variance = fit.rss / Math.max(1, points.length - free);
  const covariance = fit.inverseNormal?.map((row) => row.map((value) => value * variance)) ?? null;
  const se = (j: number): number | null =>
    covariance === null || fit.atBound[j] || bounds[j]![0] === bounds[j]![1]
      ? null
      : Math.sqrt(covariance[j]![j]!);
  const [dH, half] = [p[0]!, p[1]!];
  const entropySe =
    covariance === null || fit.atBound[0] || fit.atBound[1]
      ? null
      : Math.sqrt(
          Math.max(
            0,
            covariance[0]![0]! / half ** 2 -
              (2 * dH * covariance[0]![1]!) / half ** 3 +
              (dH ** 2 * covariance[1]![1]!) / half ** 4,
          ),
        );
  const mean = points.reduce((sum, point) => sum + point.chiT, 0) / points.length;
  const scatter = points.reduce((sum, point) => sum + (point.chiT - mean) ** 2, 0);
  const model = (T: number) => {
    const share = highSpinShare(dH, half, T);
    return { temperature_K: T, share, chiT: share * p[2]! + (1 - share) * p[3]! };
  };
  const left = points.reduce((sum, point) => sum + (point.chiT - model(point.temperature_K).chiT) ** 2, 0);
  const remarks: string[] = [];
  const shares = points.map((point) => model(point.temperature_K).share);
  if (held.chiTHigh === undefined && Math.max(...shares) < 0.9) {
    remarks.push(
      'the high-spin plateau is not reached: its chi T, and with it dH and T_half, is an extrapolation',
    );
  }
  if (held.chiTLow === undefined && Math.min(...shares) > 0.1) {
    remarks.push(
      'the low-spin plateau is not reached: its chi T, and with it dH and T_half, is an extrapolation',
    );
  }
  if (fit.status !== 'converged')
    remarks.push(`the fit is ${fit.status}: hold a plateau or measure over a wider range`);
  const temperatures = points.map((point) => point.temperature_K);
  if (half < Math.min(...temperatures) || half > Math.max(...temperatures)) {
    remarks.push('T_half lies outside the measured range: it is an extrapolation');
  }
  return {
    enthalpy_kJ_mol: { value: dH / 1000, se: se(0) === null ? null : se(0)! / 1000 },
    half_K: { value: half, se: se(1) },
    entropy_J_molK: { value: dH / half, se: entropySe },
    chiTHigh: { value: p[2]!, se: se(2) },
    chiTLow: { value: p[3]!, se: se(3) },
    status: fit.status,
    rSquared: scatter > 0 ? 1 - left / scatter : 0,
    curve: temperatures.map(model),
    remarks,
  };
}
