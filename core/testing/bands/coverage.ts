import { fitBands } from '../../measured/bandFit/fitBands';
import { gaussian, type BaselineForm, type GaussianBand } from '../../measured/bandFit/model';
import { seeded } from '../seeded';

/** A spectrum with known truth, points equally spaced in nm as an instrument gives them. */
export interface TrueSpectrum {
  readonly bands: readonly GaussianBand[];
  readonly baseline: readonly [number, number];
  readonly range_cm1: readonly [number, number];
  readonly points: number;
  readonly noise: number;
}

export function draw(truth: TrueSpectrum, seed: number): { wavenumber_cm1: number[]; absorbance: number[] } {
  const random = seeded(seed);
  const [low, high] = truth.range_cm1;
  const [from, to] = [1e7 / high, 1e7 / low];
  const wavenumber_cm1 = Array.from(
    { length: truth.points },
    (_, i) => 1e7 / (from + ((to - from) * i) / (truth.points - 1)),
  );
  const absorbance = wavenumber_cm1.map(
    (v) =>
      truth.bands.reduce((sum, band) => sum + gaussian(band, v), 0) +
      truth.baseline[0] +
      (truth.baseline[1] * (v - low)) / (high - low) +
      truth.noise * random.normal(),
  );
  return { wavenumber_cm1, absorbance };
}

/** Three bands of a d3 or d8 ion, the second a shoulder on the first; and two bands closer than their widths. */
export const trueSpectra: Readonly<Record<string, TrueSpectrum>> = {
  'three bands, one a shoulder': {
    bands: [
      { centre_cm1: 13_800, fwhm_cm1: 2600, height: 0.9 },
      { centre_cm1: 16_100, fwhm_cm1: 2400, height: 0.45 },
      { centre_cm1: 25_200, fwhm_cm1: 3800, height: 1.1 },
    ],
    baseline: [0, 0],
    range_cm1: [11_000, 30_000],
    points: 240,
    noise: 0.004,
  },
  'three bands on a slope': {
    bands: [
      { centre_cm1: 13_800, fwhm_cm1: 2600, height: 0.9 },
      { centre_cm1: 16_100, fwhm_cm1: 2400, height: 0.45 },
      { centre_cm1: 25_200, fwhm_cm1: 3800, height: 1.1 },
    ],
    baseline: [0.03, 0.05],
    range_cm1: [11_000, 30_000],
    points: 240,
    noise: 0.004,
  },
  'two close bands': {
    bands: [
      { centre_cm1: 17_000, fwhm_cm1: 2500, height: 0.8 },
      { centre_cm1: 18_600, fwhm_cm1: 2500, height: 0.7 },
    ],
    baseline: [0, 0],
    range_cm1: [12_000, 26_000],
    points: 200,
    noise: 0.003,
  },
};

export interface Coverage {
  readonly draws: number;
  readonly failed: number;
  /** Share of centres within three standard errors, and of all parameters within one. */
  readonly centresWithin3: number;
  readonly within1: number;
  readonly worst_ms: number;
}

/** Fits `draws` noisy copies from start values off by a few hundred cm-1 and 15 %, and counts how honest the standard errors are. */
export function coverage(truth: TrueSpectrum, draws: number, firstSeed: number): Coverage {
  const baseline: BaselineForm = truth.baseline.some((b) => b !== 0) ? 'linear' : 'none';
  let [failed, centres, centresIn, all, allIn, worst_ms] = [0, 0, 0, 0, 0, 0];
  for (let seed = firstSeed; seed < firstSeed + draws; seed++) {
    const random = seeded(seed + 1_000_000);
    const start = truth.bands.map((band) => ({
      centre_cm1: band.centre_cm1 + 250 * random.normal(),
      fwhm_cm1: band.fwhm_cm1 * Math.exp(0.15 * random.normal()),
      height: band.height * Math.exp(0.15 * random.normal()),
    }));
    const before = performance.now();
    const fit = fitBands({ ...draw(truth, seed), start, baseline });
    worst_ms = Math.max(worst_ms, performance.now() - before);
    if (fit.status !== 'converged') failed++;
    // A permutation of equal bands is the same fit: bands are compared in order of their centres.
    const bands = [...fit.bands].sort((a, b) => a.centre_cm1 - b.centre_cm1);
    for (const [k, band] of bands.entries()) {
      for (const key of ['centre_cm1', 'fwhm_cm1', 'height'] as const) {
        const off = Math.abs(band[key] - truth.bands[k]![key]) / (band.se[key] ?? 0);
        all++;
        if (off <= 1) allIn++;
        if (key !== 'centre_cm1') continue;
        centres++;
        if (off <= 3) centresIn++;
      }
    }
  }
  return { draws, failed, centresWithin3: centresIn / centres, within1: allIn / all, worst_ms };
}
