import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { levenbergMarquardt } from 'ml-levenberg-marquardt';
import { describe, expect, it } from 'vitest';
import { coverage, draw, trueSpectra } from '../../testing/bands/coverage';
import { fitBands } from './fitBands';
import { gaussian, sumOfBands, type GaussianBand } from './model';

interface Case {
  wavenumber_cm1: number[];
  absorbance: number[];
  truth: GaussianBand[];
  baseline_b: [number, number];
  sigma_expected: GaussianBand[];
  noise_sd: number;
}
// Synthetic spectra with their truth and Cramér-Rao standard deviations: core/testing/spectra/PROVENANCE.md.
const load = (name: string) =>
  JSON.parse(
    readFileSync(join(import.meta.dirname, `../../testing/spectra/fit/${name}.json`), 'utf8'),
  ) as Case;
const keys = ['centre_cm1', 'fwhm_cm1', 'height'] as const;
const off = (truth: readonly GaussianBand[]): GaussianBand[] =>
  truth.map((band, k) => ({
    centre_cm1: band.centre_cm1 + (k % 2 === 0 ? 300 : -250),
    fwhm_cm1: band.fwhm_cm1 * (k % 2 === 0 ? 1.2 : 0.85),
    height: band.height * 0.85,
  }));

describe('a band fit', () => {
  it.each(['three_bands_shoulder', 'three_bands_baseline', 'two_close'])(
    'of %s lands within four expected standard deviations, and its standard errors are the expected ones',
    (name) => {
      const data = load(name);
      const baseline = data.baseline_b.some((b) => b !== 0) ? 'linear' : 'none';
      const fit = fitBands({ ...data, start: off(data.truth), baseline });
      expect(fit.status).toBe('converged');
      for (const [k, band] of fit.bands.entries()) {
        for (const key of keys) {
          const sigma = data.sigma_expected[k]![key];
          expect(Math.abs(band[key] - data.truth[k]![key])).toBeLessThan(4 * sigma);
          expect(band.se[key]! / sigma).toBeGreaterThan(0.8);
          expect(band.se[key]! / sigma).toBeLessThan(1.25);
        }
      }
      expect(fit.residual_sd / data.noise_sd).toBeGreaterThan(0.9);
      expect(fit.residual_sd / data.noise_sd).toBeLessThan(1.1);
      expect(fit.excess).toEqual([]);
    },
  );

  it('of a spectrum without noise lands within 1 cm-1', () => {
    const data = load('noise_free');
    const fit = fitBands({ ...data, start: off(data.truth), baseline: 'none' });
    for (const [k, band] of fit.bands.entries()) {
      expect(Math.abs(band.centre_cm1 - data.truth[k]!.centre_cm1)).toBeLessThan(1);
      expect(Math.abs(band.fwhm_cm1 - data.truth[k]!.fwhm_cm1)).toBeLessThan(1);
    }
  });

  it('finds the sloping baseline', () => {
    const fit = fitBands({
      ...load('three_bands_baseline'),
      start: off(load('three_bands_baseline').truth),
      baseline: 'linear',
    });
    expect(Math.abs(fit.baseline!.b0 - 0.03)).toBeLessThan(4 * fit.baseline!.se.b0!);
    expect(Math.abs(fit.baseline!.b1 - 0.05)).toBeLessThan(4 * fit.baseline!.se.b1!);
  });

  it('started far off still finds the minimum, through its further starts', () => {
    const data = load('three_bands_shoulder');
    const far = [12_000, 19_000, 27_500].map((centre_cm1) => ({ centre_cm1, fwhm_cm1: 1500, height: 0.3 }));
    const near = fitBands({ ...data, start: data.truth, baseline: 'none' });
    const fit = fitBands({ ...data, start: far, baseline: 'none' });
    expect(fit.rss).toBeCloseTo(near.rss, 8);
  });

  // A second, independent optimiser (ml-levenberg-marquardt, MIT) on the same model, with x in 1000 cm-1, bounds and
  // strong damping, which it needs; at one minimum both must agree on the parameters.
  it('agrees with the general optimiser of another library', () => {
    const data = load('three_bands_shoulder');
    const fit = fitBands({ ...data, start: off(data.truth), baseline: 'none' });
    const theirs = levenbergMarquardt(
      { x: data.wavenumber_cm1.map((v) => v / 1000), y: data.absorbance },
      (p) => (x) => sumOfBands(p, 3, { low: 0, high: 1 }, x, null),
      {
        initialValues: off(data.truth).flatMap((b) => [b.centre_cm1 / 1000, b.fwhm_cm1 / 1000, b.height]),
        minValues: [10, 0.5, 0, 10, 0.5, 0, 10, 0.5, 0],
        maxValues: [32, 9, 9, 32, 9, 9, 32, 9, 9],
        damping: 1,
        maxIterations: 300,
        errorTolerance: 1e-12,
        gradientDifference: 1e-6,
      },
    );
    for (const [k, band] of fit.bands.entries()) {
      expect(Math.abs(theirs.parameterValues[3 * k]! * 1000 - band.centre_cm1)).toBeLessThan(
        0.1 * band.se.centre_cm1!,
      );
      expect(Math.abs(theirs.parameterValues[3 * k + 1]! * 1000 - band.fwhm_cm1)).toBeLessThan(
        0.1 * band.se.fwhm_cm1!,
      );
    }
    expect(fit.rss).toBeLessThanOrEqual(theirs.parameterError * 1.000001);
  });

  it('has an analytic Jacobian that agrees with central differences', () => {
    const p = Float64Array.from([13_800, 2600, 0.9, 16_100, 2400, 0.45, 0.03, 0.05]);
    const span = { low: 11_000, high: 30_000 };
    for (const v of [12_500, 14_900, 16_100]) {
      const slopes = new Float64Array(p.length);
      sumOfBands(p, 2, span, v, slopes);
      for (let j = 0; j < p.length; j++) {
        const h = Math.max(1e-4, Math.abs(p[j]!) * 1e-6);
        const at = (by: number) =>
          sumOfBands(
            Float64Array.from(p, (value, i) => (i === j ? value + by : value)),
            2,
            span,
            v,
            null,
          );
        expect(slopes[j]).toBeCloseTo((at(h) - at(-h)) / (2 * h), 7);
      }
    }
  });

  it('gives the same minimum in absorbance and in molar absorptivity', () => {
    const data = load('two_close');
    const start = off(data.truth);
    const fit = fitBands({ ...data, start, baseline: 'none' });
    const scaled = fitBands({
      ...data,
      absorbance: data.absorbance.map((a) => a * 50),
      start: start.map((band) => ({ ...band, height: band.height * 50 })),
      baseline: 'none',
    });
    expect(scaled.bands[0]!.centre_cm1).toBeCloseTo(fit.bands[0]!.centre_cm1, 2);
    expect(scaled.bands[0]!.height).toBeCloseTo(50 * fit.bands[0]!.height, 3);
  });

  it('leaves saturated points out', () => {
    const data = load('three_bands_shoulder');
    const absorbance = data.absorbance.map((a) => (a > 0.8 ? null : a));
    const fit = fitBands({ ...data, absorbance, start: off(data.truth), baseline: 'none' });
    expect(fit.points).toBeLessThan(data.absorbance.length);
    expect(Math.abs(fit.bands[2]!.centre_cm1 - 25_200)).toBeLessThan(4 * fit.bands[2]!.se.centre_cm1!);
    expect(fit.bands[2]!.se.height!).toBeGreaterThan(2 * 0.00113);
  });

  it('says which parameters two bands on one place leave open', () => {
    const data = draw(
      { ...trueSpectra['two close bands']!, bands: [trueSpectra['two close bands']!.bands[0]!], noise: 0 },
      1,
    );
    const start = [17_000, 17_000].map((centre_cm1) => ({ centre_cm1, fwhm_cm1: 2500, height: 0.4 }));
    const fit = fitBands({ ...data, start, baseline: 'none', furtherStarts: 0 });
    expect(fit.status).toBe('not identifiable');
    expect(fit.remarks.join()).toContain('band 1 height');
    expect(fit.bands[0]!.se.height).toBeNull();
  });

  it('says when a band ends on a bound', () => {
    const data = load('two_close');
    const fit = fitBands({
      ...data,
      start: off(data.truth),
      baseline: 'none',
      bounds: { centre_cm1: [17_200, 18_400] },
    });
    expect(fit.status).toBe('at bound');
    expect(fit.bands[0]!.se.centre_cm1).toBeNull();
    expect(fit.remarks.join()).toMatch(/bound.*centre/);
  });

  it('with a band too few shows where the spectrum is left over and where the model overshoots', () => {
    const data = load('three_bands_shoulder');
    const fit = fitBands({ ...data, start: [data.truth[0]!, data.truth[2]!], baseline: 'none' });
    expect(fit.excess.map((each) => each.kind)).toContain('spectrum above model');
    expect(fit.excess.map((each) => each.kind)).toContain('model above spectrum');
  });

  it('with three bands has a lower information criterion than with two or four', () => {
    const data = load('three_bands_shoulder');
    const aicc = (start: GaussianBand[]) => fitBands({ ...data, start, baseline: 'none' }).aicc;
    const three = aicc(off(data.truth));
    expect(three).toBeLessThan(aicc([data.truth[0]!, data.truth[2]!]));
    expect(three).toBeLessThan(
      aicc([...off(data.truth), { centre_cm1: 21_000, fwhm_cm1: 2000, height: 0.02 }]),
    );
  });

  // Needs of practice: two bands of heights 10 and 6, FWHM 3500, 3000 cm-1 apart. The apparent maximum is shifted by
  // about 326 cm-1 from the stronger band's centre (arithmetic on the sum of the two Gaussians), the fitted centre is not.
  it('recovers centres where overlap shifts the apparent maximum by 326 cm-1', () => {
    const bands = [
      { centre_cm1: 18_000, fwhm_cm1: 3500, height: 10 },
      { centre_cm1: 21_000, fwhm_cm1: 3500, height: 6 },
    ];
    const wavenumber_cm1 = Array.from({ length: 1001 }, (_, i) => 12_000 + 15 * i);
    const absorbance = wavenumber_cm1.map((v) => gaussian(bands[0]!, v) + gaussian(bands[1]!, v));
    const apparent = wavenumber_cm1[absorbance.indexOf(Math.max(...absorbance))]!;
    expect(Math.abs(apparent - 18_000 - 326)).toBeLessThan(15);
    const fit = fitBands({
      wavenumber_cm1,
      absorbance,
      start: [
        { centre_cm1: apparent, fwhm_cm1: 3500, height: 10 },
        { centre_cm1: 21_500, fwhm_cm1: 3000, height: 4 },
      ],
      baseline: 'none',
    });
    expect(fit.bands[0]!.centre_cm1).toBeCloseTo(18_000, 0);
  });

  it.each([
    ['an empty start', { start: [] }, 'start'],
    ['a width of zero', { start: [{ centre_cm1: 15_000, fwhm_cm1: 0, height: 1 }] }, 'start[0].fwhm_cm1'],
    ['lists of different length', { absorbance: [0.1, 0.2] }, 'absorbance'],
    ['too few points', { wavenumber_cm1: [1, 2], absorbance: [1, 2] }, 'absorbance'],
    [
      'a wavenumber that is not a number',
      { wavenumber_cm1: [Number.NaN, ...load('two_close').wavenumber_cm1.slice(1)] },
      'wavenumber_cm1[0]',
    ],
  ])('refuses %s with the place named', (_, change, field) => {
    const data = load('two_close');
    const request = {
      wavenumber_cm1: data.wavenumber_cm1,
      absorbance: data.absorbance,
      start: data.truth,
      baseline: 'none' as const,
    };
    expect(() => fitBands({ ...request, ...change })).toThrow(expect.objectContaining({ field }) as Error);
  });
});

describe('standard errors of band fits', () => {
  // 68.3 % of normal deviates lie within one standard deviation. The parameters of one fit go together, so 60 draws say it
  // to about 6 %; the limits are three times that. The full sample has a command of its own (soak:bands).
  it.each(Object.keys(trueSpectra))(
    'of %s are honest: one sigma holds about two thirds of 60 draws, three hold the centres',
    (name) => {
      const result = coverage(trueSpectra[name]!, 60, 1);
      expect(result.failed).toBe(0);
      expect(result.centresWithin3).toBeGreaterThanOrEqual(0.98);
      expect(result.within1).toBeGreaterThan(0.5);
      expect(result.within1).toBeLessThan(0.86);
    },
  );
});
