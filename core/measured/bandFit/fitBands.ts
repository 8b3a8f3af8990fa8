import { SpinhueError } from '../../errors';
import {
  correlationOf,
  leastSquares,
  type FitStatus,
  type LeastSquaresResult,
} from '../../numerics/leastSquares';
import { findExcess, noiseOf, type Excess } from './excess';
import {
  parametersPerBand,
  sumOfBands,
  toBands,
  toVector,
  type BaselineForm,
  type GaussianBand,
  type Span,
} from './model';
import { otherStarts } from './starts';

export interface BandFitRequest {
  /** In any order; points whose absorbance is null are left out. */
  readonly wavenumber_cm1: readonly number[];
  /** Absorbance or molar absorptivity. */
  readonly absorbance: readonly (number | null)[];
  /** One entry per band: the number of bands is the user's decision. */
  readonly start: readonly GaussianBand[];
  readonly baseline: BaselineForm;
  /** Limits for all bands; widths and heights are positive in any case. */
  readonly bounds?: {
    readonly centre_cm1?: readonly [number, number];
    readonly fwhm_cm1?: readonly [number, number];
    readonly height?: readonly [number, number];
  };
  /** How many further starts are tried; default 6. */
  readonly furtherStarts?: number;
}

export interface FittedBand extends GaussianBand {
  /** Standard errors from the curvature at the minimum and the scatter of the residuals; null where there is none. */
  readonly se: {
    readonly centre_cm1: number | null;
    readonly fwhm_cm1: number | null;
    readonly height: number | null;
  };
}

export interface FittedBaseline {
  readonly form: 'linear';
  /** b0 + b1 (v - low) / (high - low). */
  readonly b0: number;
  readonly b1: number;
  readonly low_cm1: number;
  readonly high_cm1: number;
  readonly se: { readonly b0: number | null; readonly b1: number | null };
}

export interface BandFit {
  /** In the order of the start values. */
  readonly bands: readonly FittedBand[];
  readonly baseline: FittedBaseline | null;
  readonly status: FitStatus;
  /** What the status means here, for a person. */
  readonly remarks: readonly string[];
  readonly rss: number;
  /** Standard deviation of the residuals. */
  readonly residual_sd: number;
  readonly points: number;
  /** Akaike's information criterion for small samples: compares numbers of bands on the same points only. */
  readonly aicc: number;
  readonly correlation: {
    readonly parameters: readonly string[];
    readonly matrix: readonly (readonly number[])[];
  } | null;
  /** Model at each point that was used, and data minus model, ascending wavenumber. */
  readonly curve: {
    readonly wavenumber_cm1: readonly number[];
    readonly model: readonly number[];
    readonly residual: readonly number[];
  };
  /** Stretches where the model lies above the spectrum, and where the spectrum is not accounted for. */
  readonly excess: readonly Excess[];
}

interface Points {
  readonly v: number[];
  readonly a: number[];
  readonly span: Span;
}

function invalid(field: string, message: string, remedy?: string): SpinhueError {
  return new SpinhueError({
    code: 'out-of-range',
    field,
    message,
    ...(remedy === undefined ? {} : { remedy }),
  });
}

function usable(request: BandFitRequest): Points {
  const { wavenumber_cm1: v, absorbance: a } = request;
  if (v.length !== a.length) {
    throw invalid('absorbance', `${v.length} wavenumbers but ${a.length} absorbances`);
  }
  const order = v.map((_, i) => i).filter((i) => a[i] !== null);
  for (const i of order) {
    if (!Number.isFinite(v[i]))
      throw invalid(`wavenumber_cm1[${i}]`, `wavenumber_cm1[${i}] is not a finite number`);
    if (!Number.isFinite(a[i])) throw invalid(`absorbance[${i}]`, `absorbance[${i}] is not a finite number`);
  }
  order.sort((i, j) => v[i]! - v[j]!);
  const parameters = parametersPerBand * request.start.length + (request.baseline === 'linear' ? 2 : 0);
  if (request.start.length === 0)
    throw invalid('start', 'start is empty: at least one band is needed', 'place a band');
  if (request.start.length > 20)
    throw invalid('start', `${request.start.length} bands; at most 20 are fitted`);
  if (order.length <= parameters) {
    throw invalid(
      'absorbance',
      `${order.length} usable points cannot determine ${parameters} parameters`,
      'use fewer bands or a wider range',
    );
  }
  for (const [k, band] of request.start.entries()) {
    for (const key of ['centre_cm1', 'fwhm_cm1', 'height'] as const) {
      if (!Number.isFinite(band[key]) || (key === 'fwhm_cm1' && band[key] <= 0)) {
        throw invalid(
          `start[${k}].${key}`,
          `start[${k}].${key} is ${band[key]}; expected a ${key === 'fwhm_cm1' ? 'positive ' : ''}finite number`,
        );
      }
    }
  }
  const sorted = order.map((i) => v[i]!);
  const span = { low: sorted[0]!, high: sorted.at(-1)! };
  if (!(span.high > span.low)) throw invalid('wavenumber_cm1', 'all wavenumbers are equal');
  return { v: sorted, a: order.map((i) => a[i]!), span };
}

function limitsOf(request: BandFitRequest, points: Points): { lower: number[]; upper: number[] } {
  const width = points.span.high - points.span.low;
  const spacing = width / (points.v.length - 1);
  const size = Math.max(...points.a.map(Math.abs), 1e-12);
  const [centre, fwhm, height] = [
    request.bounds?.centre_cm1 ?? [points.span.low - width / 2, points.span.high + width / 2],
    request.bounds?.fwhm_cm1 ?? [Math.min(2 * spacing, width / 10), 3 * width],
    request.bounds?.height ?? [0, 20 * size],
  ];
  const lower = request.start.flatMap(() => [centre[0], fwhm[0], height[0]]);
  const upper = request.start.flatMap(() => [centre[1], fwhm[1], height[1]]);
  if (request.baseline === 'linear') {
    lower.push(-10 * size, -20 * size);
    upper.push(10 * size, 20 * size);
  }
  return { lower, upper };
}

/** Bands of a solution in the order of the start values: fits started elsewhere may end with the bands exchanged. */
function inStartOrder(solution: readonly number[], start: readonly GaussianBand[]): number[] {
  const rank = start.map((_, k) => k).sort((a, b) => start[a]!.centre_cm1 - start[b]!.centre_cm1);
  const found = toBands(solution, start.length)
    .map((_, k) => k)
    .sort((a, b) => solution[3 * a]! - solution[3 * b]!);
  const order = new Array<number>(start.length);
  for (const [place, k] of rank.entries()) order[k] = found[place]!;
  return order;
}

function permute(result: LeastSquaresResult, order: readonly number[]): LeastSquaresResult {
  const places = result.parameters.map((_, j) => {
    const band = Math.floor(j / 3);
    return band < order.length ? 3 * order[band]! + (j % 3) : j;
  });
  return {
    ...result,
    parameters: places.map((j) => result.parameters[j]!),
    atBound: places.map((j) => result.atBound[j]!),
    inverseNormal:
      result.inverseNormal?.map((_, a) => places.map((b) => result.inverseNormal![places[a]!]![b]!)) ?? null,
    undetermined: result.undetermined.map((j) => places.indexOf(j)),
  };
}

const quantities = ['centre', 'width', 'height'] as const;
const parameterName = (j: number, bands: number): string =>
  j < 3 * bands ? `band ${Math.floor(j / 3) + 1} ${quantities[j % 3]}` : `baseline b${j - 3 * bands}`;

function remarksOn(result: LeastSquaresResult, bands: number, moved: boolean): string[] {
  const names = (indices: readonly number[]) => indices.map((j) => parameterName(j, bands)).join(', ');
  const remarks: string[] = [];
  if (moved)
    remarks.push('a further start led to a clearly better fit than the given one; that one is shown');
  const stuck = result.atBound.flatMap((at, j) => (at ? [j] : []));
  if (stuck.length > 0) remarks.push(`on a bound, so without a standard error: ${names(stuck)}`);
  if (result.undetermined.length > 0)
    remarks.push(`not determined by these data: ${names(result.undetermined)}`);
  if (result.status === 'no convergence')
    remarks.push('the fit did not settle; the values are those of the last step');
  return remarks;
}

/**
 * Fits a sum of Gaussians in wavenumber, with a straight baseline on request, by bounded least squares with several
 * starts. The number of bands is what the start values say: bands are never added. Standard errors follow from the
 * Jacobian at the minimum and the scatter of the residuals; they hold where the model is right and the noise even.
 * Throws a SpinhueError for data or start values that cannot be fitted.
 */
export function fitBands(request: BandFitRequest): BandFit {
  const points = usable(request);
  const count = request.start.length;
  const limits = limitsOf(request, points);
  const n = limits.lower.length;
  const m = points.v.length;
  const solve = (start: readonly number[]) =>
    leastSquares({
      points: m,
      start,
      ...limits,
      evaluate(p, residuals, jacobian) {
        for (let i = 0; i < m; i++) {
          residuals[i] = sumOfBands(p, count, points.span, points.v[i]!, jacobian, i * n) - points.a[i]!;
        }
      },
    });
  const baselineStart = request.baseline === 'linear' ? [Math.min(points.a[0]!, points.a.at(-1)!, 0), 0] : [];
  let best = solve(toVector(request.start, baselineStart));
  const given = best;
  for (const start of otherStarts(request.start, points, request.furtherStarts ?? 6)) {
    const other = solve(toVector(start, baselineStart));
    // A rival must be better by more than rounding; then it is a different minimum.
    if (other.rss < best.rss * (1 - 1e-6) && other.status !== 'no convergence') best = other;
  }
  const result = best === given ? given : permute(best, inStartOrder(best.parameters, request.start));

  const p = result.parameters;
  const variance = result.rss / Math.max(1, m - n);
  const covariance = result.inverseNormal?.map((row) => row.map((value) => value * variance)) ?? null;
  const se = (j: number): number | null =>
    covariance === null || result.atBound[j] ? null : Math.sqrt(Math.max(0, covariance[j]![j]!));
  const model = points.v.map((v) => sumOfBands(p, count, points.span, v, null));
  const residual = points.a.map((value, i) => value - model[i]!);
  const k = n + 1;
  return {
    bands: toBands(p, count).map((band, i) => ({
      ...band,
      se: { centre_cm1: se(3 * i), fwhm_cm1: se(3 * i + 1), height: se(3 * i + 2) },
    })),
    baseline:
      request.baseline === 'none'
        ? null
        : {
            form: 'linear',
            b0: p[3 * count]!,
            b1: p[3 * count + 1]!,
            low_cm1: points.span.low,
            high_cm1: points.span.high,
            se: { b0: se(3 * count), b1: se(3 * count + 1) },
          },
    status: result.status,
    remarks: remarksOn(result, count, best.rss < given.rss * 0.99),
    rss: result.rss,
    residual_sd: Math.sqrt(variance),
    points: m,
    aicc:
      m - k - 1 > 0
        ? m * Math.log(Math.max(result.rss, 1e-300) / m) + 2 * k + (2 * k * (k + 1)) / (m - k - 1)
        : Infinity,
    correlation:
      covariance === null
        ? null
        : { parameters: p.map((_, j) => parameterName(j, count)), matrix: correlationOf(covariance) },
    curve: { wavenumber_cm1: points.v, model, residual },
    excess: findExcess(points.v, residual, noiseOf(points.a)),
  };
}
