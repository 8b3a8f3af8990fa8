import { describe, expect, it } from 'vitest';
import { draw, trueSpectra } from '../../testing/bands/coverage';
import { findBands } from './findBands';
import { gaussian } from './model';

const grid = Array.from({ length: 601 }, (_, i) => 10_000 + 40 * i);
const sum = (...bands: [number, number, number][]) =>
  grid.map((v) =>
    bands.reduce((s, [centre_cm1, fwhm_cm1, height]) => s + gaussian({ centre_cm1, fwhm_cm1, height }, v), 0),
  );
const ascending = (data: { wavenumber_cm1: number[]; absorbance: number[] }) =>
  [data.wavenumber_cm1.toReversed(), data.absorbance.toReversed()] as const;

describe('looking for bands', () => {
  it('finds two maxima and the shoulder between them in a noisy spectrum', () => {
    const found = findBands(...ascending(draw(trueSpectra['three bands, one a shoulder']!, 3)), {
      smoothing_cm1: 1800,
    });
    expect(found.map((band) => band.kind)).toEqual(['maximum', 'shoulder', 'maximum']);
    const truth = [13_800, 16_100, 25_200];
    found.forEach((band, i) => expect(Math.abs(band.centre_cm1 - truth[i]!)).toBeLessThan(500));
  });

  it('gives the width of a lone band within 10 %', () => {
    const [band, ...rest] = findBands(grid, sum([20_000, 3000, 0.5]));
    expect(rest).toEqual([]);
    expect(band!.fwhm_cm1 / 3000).toBeGreaterThan(0.9);
    expect(band!.fwhm_cm1 / 3000).toBeLessThan(1.1);
  });

  // Arithmetic on sums of Gaussians: a band of height 100 and FWHM 3000 at 24 000 on the tail of one of 500 at 30 000,
  // FWHM 5000, has its apparent maximum higher than its centre; on a stronger tail it has none and shows as a shoulder.
  it('calls a band on a tail a maximum or a shoulder, and in neither case a centre', () => {
    const onTail = findBands(grid, sum([24_000, 3000, 100], [30_000, 5000, 500]));
    expect(onTail[0]!.kind).toBe('maximum');
    expect(onTail[0]!.centre_cm1).toBeGreaterThan(24_200);
    const onSteepTail = findBands(grid, sum([24_000, 3000, 100], [31_000, 5000, 3000]));
    expect(onSteepTail[0]!.kind).toBe('shoulder');
  });

  it('finds nothing in noise, in a slope and in a handful of points', () => {
    const flat = draw({ ...trueSpectra['two close bands']!, bands: [] }, 5);
    expect(findBands(...ascending(flat))).toEqual([]);
    expect(
      findBands(
        grid,
        grid.map((v) => v / 1e5),
      ),
    ).toEqual([]);
    expect(findBands([1, 2, 3], [0, 1, 0])).toEqual([]);
  });
});
