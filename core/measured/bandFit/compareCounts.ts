import { findBands } from './findBands';
import { fitBands, type BandFit, type BandFitRequest } from './fitBands';
import type { GaussianBand } from './model';

export interface CountComparison {
  readonly count: number;
  readonly fit: BandFit;
  /** AICc above the smallest of the list; below 2 the counts are about equally supported. */
  readonly above: number;
  readonly caution: string | null;
  /** The smallest count that no larger one beats by more than 10. */
  readonly suggested: boolean;
}

/** Difference of AICc beyond which the worse model has essentially no support (K. P. Burnham, D. R. Anderson, 2002). */
const decisive = 10;

/** Where the fit leaves most of the spectrum unexplained, and how much. */
function largestResidual(fit: BandFit): GaussianBand {
  const { wavenumber_cm1: v, residual } = fit.curve;
  let best = 0;
  let bestMean = -Infinity;
  for (let i = 2; i < v.length - 2; i++) {
    const mean =
      (residual[i - 2]! + residual[i - 1]! + residual[i]! + residual[i + 1]! + residual[i + 2]!) / 5;
    if (mean > bestMean) [best, bestMean] = [i, mean];
  }
  const typical = fit.bands.reduce((sum, band) => sum + band.fwhm_cm1, 0) / fit.bands.length;
  return { centre_cm1: v[best]!, fwhm_cm1: typical, height: Math.max(bestMean, 1e-6) };
}

function cautionOf(fit: BandFit): string | null {
  if (fit.status === 'no convergence') return 'the fit did not converge';
  if (fit.status !== 'converged') return `the fit ended with: ${fit.status}`;
  const loose = fit.bands.filter(
    (band) => band.se.height !== null && band.se.height > 0.5 * Math.abs(band.height),
  ).length;
  if (loose > 0)
    return `${loose} of the bands could as well not be there (height within two standard errors of zero)`;
  return null;
}

/**
 * Fits the same points with one to `most` bands and compares them by Akaike's criterion for small samples (C. M. Hurvich,
 * C.-L. Tsai, Biometrika 76, 297, 1989). It helps to choose and decides nothing: real bands are not exactly Gaussian, and
 * a criterion of fit alone then asks for more bands than there are.
 */
export function compareCounts(request: Omit<BandFitRequest, 'start'>, most = 5): CountComparison[] {
  const order = request.wavenumber_cm1
    .map((_, i) => i)
    .sort((a, b) => request.wavenumber_cm1[a]! - request.wavenumber_cm1[b]!);
  const sightings = findBands(
    order.map((i) => request.wavenumber_cm1[i]!),
    order.map((i) => request.absorbance[i]!),
  ).sort((a, b) => b.height - a.height);
  const known = request.absorbance.flatMap((a, i) =>
    a === null ? [] : [{ v: request.wavenumber_cm1[i]!, a }],
  );
  const top = known.reduce((best, point) => (point.a > best.a ? point : best));
  const span = Math.max(...known.map((point) => point.v)) - Math.min(...known.map((point) => point.v));
  let start: GaussianBand[] = [sightings[0] ?? { centre_cm1: top.v, fwhm_cm1: span / 6, height: top.a }];
  const fits: BandFit[] = [];
  for (let count = 1; count <= most; count++) {
    const free = (count + 1) * 3 + (request.baseline === 'linear' ? 2 : 0);
    if (known.length <= free) break;
    const fit = fitBands({ ...request, start, furtherStarts: request.furtherStarts ?? 3 });
    fits.push(fit);
    const unused = sightings.find((sighting) =>
      fit.bands.every((band) => Math.abs(band.centre_cm1 - sighting.centre_cm1) > 0.3 * sighting.fwhm_cm1),
    );
    start = [...fit.bands, unused ?? largestResidual(fit)];
  }
  const least = Math.min(...fits.map((fit) => fit.aicc));
  const suggested = fits.findIndex((fit) => fit.aicc - least <= decisive);
  return fits.map((fit, i) => ({
    count: i + 1,
    fit,
    above: fit.aicc - least,
    caution: cautionOf(fit),
    suggested: i === suggested,
  }));
}
