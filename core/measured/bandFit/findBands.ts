import { localFit } from '../treatment/localPolynomial';
import { noiseOf } from './excess';
import type { GaussianBand } from './model';

/** A place where the spectrum shows a band. A maximum and a shoulder are readings, not centres. */
export interface BandSighting extends GaussianBand {
  readonly kind: 'maximum' | 'shoulder';
  /** Size of the second derivative over its standard deviation. */
  readonly significance: number;
}

export interface FindOptions {
  /** Width over which the curve is smoothed, cm-1; about half the width of the narrowest band looked for. */
  readonly smoothing_cm1?: number;
  /** Sightings less significant than this are left out; default 5. */
  readonly least?: number;
}

/**
 * Maxima, and shoulders as minima of the second derivative (the usual sign of a hidden band), of a spectrum against
 * ascending wavenumber. Height and width are first guesses for a fit: the width of a Gaussian follows from height and
 * curvature at its top, w = sqrt(8 ln 2 h / |h''|). They suggest where bands may be placed; nothing is placed by them.
 */
export function findBands(
  wavenumber: readonly number[],
  y: readonly (number | null)[],
  options: FindOptions = {},
): BandSighting[] {
  const known = wavenumber
    .map((_, i) => i)
    .filter((i) => y[i] !== null && (i === 0 || wavenumber[i] !== wavenumber[i - 1]));
  const v = known.map((i) => wavenumber[i]!);
  const a = known.map((i) => y[i]!);
  if (v.length < 9) return [];
  const reach = (options.smoothing_cm1 ?? 1500) / 2;
  const noise = Math.max(noiseOf(a), 1e-12 * Math.max(...a.map(Math.abs)));
  const least = options.least ?? 5;
  const fits = v.map((_, i) => localFit(v, a, i, windowAround(v, i, reach), 4));
  const top = Math.max(...fits.map((fit) => fit.value));
  const curvature = fits.map((fit) => fit.second);
  const deviation = fits.map((fit) => fit.secondGain * noise);
  const inside = (i: number) => v[i]! - v[0]! >= reach / 2 && v.at(-1)! - v[i]! >= reach / 2;
  const deepest = v
    .map((_, i) => i)
    .filter(
      (i) =>
        i > 0 &&
        i < v.length - 1 &&
        inside(i) &&
        curvature[i]! < 0 &&
        curvature[i]! <= curvature[i - 1]! &&
        curvature[i]! < curvature[i + 1]!,
    )
    .sort((i, j) => curvature[i]! - curvature[j]!);
  const kept: number[] = [];
  for (const i of deepest) {
    if (-curvature[i]! < least * deviation[i]! || fits[i]!.value < 0.01 * top) continue;
    // Beside a deeper minimum it counts only where the curvature clearly rises between the two.
    const separate = kept.every((j) => {
      const between = Math.max(...curvature.slice(Math.min(i, j), Math.max(i, j) + 1));
      return between - curvature[i]! > least * deviation[i]!;
    });
    if (separate) kept.push(i);
  }
  const found: BandSighting[] = [];
  for (const i of kept.sort((p, q) => p - q)) {
    const fit = fits[i]!;
    const significance = -fit.second / deviation[i]!;
    const fwhm = Math.sqrt((8 * Math.LN2 * Math.max(fit.value, 1e-300)) / -fit.second);
    // A maximum lies where the slope changes sign within half a width of the place of strongest curvature.
    const peak = nearestMaximum(
      v,
      fits.map((each) => each.first),
      i,
      fwhm / 2,
    );
    found.push({
      kind: peak === null ? 'shoulder' : 'maximum',
      centre_cm1: peak ?? v[i]!,
      fwhm_cm1: Math.min(fwhm, v.at(-1)! - v[0]!),
      height: fit.value,
      significance,
    });
  }
  return found;
}

/** Odd number of points within `reach` on either side, at least seven. */
function windowAround(v: readonly number[], at: number, reach: number): number {
  let [low, high] = [at, at];
  while (low > 0 && v[at]! - v[low - 1]! <= reach) low--;
  while (high < v.length - 1 && v[high + 1]! - v[at]! <= reach) high++;
  return Math.min(Math.max(7, (high - low + 1) | 1), (v.length - 1) | 1);
}

function nearestMaximum(
  v: readonly number[],
  slope: readonly number[],
  at: number,
  reach: number,
): number | null {
  let best: number | null = null;
  for (let i = 0; i + 1 < v.length; i++) {
    if (!(slope[i]! > 0 && slope[i + 1]! <= 0)) continue;
    const place = v[i]! + ((v[i + 1]! - v[i]!) * slope[i]!) / (slope[i]! - slope[i + 1]!);
    if (
      Math.abs(place - v[at]!) <= reach &&
      (best === null || Math.abs(place - v[at]!) < Math.abs(best - v[at]!))
    )
      best = place;
  }
  return best;
}
