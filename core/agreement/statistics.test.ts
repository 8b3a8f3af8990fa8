import { describe, expect, it } from 'vitest';
import { blandAltman, coverage, standardScore } from './pairs';
import { brierScore, confusionTable } from './brier';
import { errorSummary, median, quantile } from './summary';
import { shareOf, wilsonInterval } from './wilson';

describe('summaries of errors', () => {
  it('keep the sign in the bias and drop it in the sizes', () => {
    const summary = errorSummary([3, -1, -2]);
    expect(summary).toMatchObject({ n: 3, bias: 0, meanAbsolute: 2, medianAbsolute: 2 });
    expect(summary.rootMeanSquare).toBeCloseTo(Math.sqrt(14 / 3), 12);
  });

  it('interpolate quantiles between order statistics (type 7 of Hyndman and Fan 1996)', () => {
    expect(quantile([1, 2, 3, 4], 0.9)).toBeCloseTo(3.7, 12);
    expect(median([5, 1, 3])).toBe(3);
    expect(median([])).toBeNaN();
  });
});

describe('shares', () => {
  it('have the Wilson interval: 31 of 35 is 0.886 with 0.74 to 0.95 at 95 %', () => {
    // E. B. Wilson 1927; digits from the closed form.
    const { share, interval95 } = shareOf(31, 35);
    expect(share).toBeCloseTo(0.886, 3);
    expect(interval95[0]).toBeCloseTo(0.74, 2);
    expect(interval95[1]).toBeCloseTo(0.955, 2);
  });

  it('claim nothing from no trials', () => {
    expect(wilsonInterval(0, 0)).toEqual([0, 1]);
    expect(shareOf(0, 0).share).toBeNull();
  });
});

describe('spin forecasts', () => {
  it('score 0 when perfect and 0.25 when always undecided (Brier 1950)', () => {
    const always = [true, false, true].map((happened) => ({ probability: 0.5, happened }));
    expect(brierScore(always)).toBe(0.25);
    expect(brierScore([{ probability: 1, happened: true }])).toBe(0);
  });

  it('fill a confusion table', () => {
    const table = confusionTable([
      { foundHigh: true, predictedHigh: true },
      { foundHigh: true, predictedHigh: false },
      { foundHigh: false, predictedHigh: false },
    ]);
    expect(table).toEqual({ highAsHigh: 1, highAsLow: 1, lowAsHigh: 0, lowAsLow: 1 });
  });
});

describe('predicted beside measured', () => {
  const pair = (predicted: number, measured: number) => ({ predicted, measured, sigma: 3, uncertainty: 4 });

  it('gives the residual in units of both uncertainties together', () => {
    expect(standardScore(pair(10, 20))).toBe(2);
  });

  it('counts what lies inside the stated ranges', () => {
    const { within68, within95 } = coverage([pair(0, 4), pair(0, 6), pair(0, 20), pair(0, -9)]);
    expect(within68.hits).toBe(1);
    expect(within95.hits).toBe(3);
  });

  it('shows differences against means with their limits of agreement (Bland and Altman 1986)', () => {
    const { points, bias, limits } = blandAltman([
      { predicted: 11, measured: 10 },
      { predicted: 9, measured: 10 },
      { predicted: 13, measured: 10 },
    ]);
    expect(points[2]).toEqual({ mean: 11.5, difference: 3 });
    expect(bias).toBe(1);
    expect(limits[1]).toBeCloseTo(1 + 1.96 * 2, 12);
  });
});
