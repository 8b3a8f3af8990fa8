import { describe, expect, it } from 'vitest';
import { blandAltman, coverage, standardScore } from './pairs';
import { brierScore, confusionTable } from './brier';
import { studentT95 } from './studentT';
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

  // Table I of R. G. Newcombe, Stat. Med. 17 (1998) 857, score method without continuity correction (from memory).
  it.each([
    [81, 263, 0.2553, 0.3662],
    [15, 148, 0.0624, 0.1605],
    [0, 20, 0, 0.1611],
    [1, 29, 0.0061, 0.1718],
  ])('of %i in %i lie between the published limits', (hits, of, low, high) => {
    const [lower, upper] = wilsonInterval(hits, of);
    expect(lower).toBeCloseTo(low, 4);
    expect(upper).toBeCloseTo(high, 4);
  });

  it('claim nothing from no trials', () => {
    expect(wilsonInterval(0, 0)).toEqual([0, 1]);
    expect(shareOf(0, 0).share).toBeNull();
  });
});

describe('the width of an interval', () => {
  it('follows Student beyond the end of the table too (printed tables: 2.000 for 60, 1.980 for 120)', () => {
    expect(studentT95(16)).toBe(2.12);
    expect(studentT95(60)).toBeCloseTo(2.0, 3);
    expect(studentT95(120)).toBeCloseTo(1.98, 3);
    expect(studentT95(31)).toBeLessThan(studentT95(30));
    expect(studentT95(0)).toBe(Infinity);
  });
});

describe('spin forecasts', () => {
  it('score 0 when perfect and 0.25 when always undecided (Brier 1950)', () => {
    const always = [true, false, true].map((happened) => ({ probability: 0.5, happened }));
    expect(brierScore(always)).toBe(0.25);
    expect(brierScore([{ probability: 1, happened: true }])).toBe(0);
  });

  it('score 0.0375 in the worked example of scikit-learn for its Brier score', () => {
    // Outcomes 0, 1, 1, 0 forecast with 0.1, 0.9, 0.8, 0.3: documentation of sklearn.metrics.brier_score_loss.
    const forecasts = [
      { probability: 0.1, happened: false },
      { probability: 0.9, happened: true },
      { probability: 0.8, happened: true },
      { probability: 0.3, happened: false },
    ];
    expect(brierScore(forecasts)).toBeCloseTo(0.0375, 12);
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

  it('finds the published bias and limits between two flow meters', () => {
    // First readings of 17 people with a large and a small peak flow meter, l/min (Bland and Altman, Lancet 327, 1986,
    // 307, Table 1): mean difference -2.1 with a 95 % interval of -22.0 to 17.8, standard deviation 38.8. The paper draws
    // two of them; 1.96 are drawn here.
    const large = [494, 395, 516, 434, 476, 557, 413, 442, 650, 433, 417, 656, 267, 478, 178, 423, 427];
    const small = [512, 430, 520, 428, 500, 600, 364, 380, 658, 445, 432, 626, 260, 477, 259, 350, 451];
    const { bias, biasInterval, limits } = blandAltman(
      large.map((predicted, i) => ({ predicted, measured: small[i]! })),
    );
    expect(bias).toBeCloseTo(-2.1, 1);
    expect(Math.abs(biasInterval[0] + 22)).toBeLessThan(0.1);
    expect(Math.abs(biasInterval[1] - 17.8)).toBeLessThan(0.1);
    expect((limits[1] - bias) / 1.96).toBeCloseTo(38.8, 1);
    expect((bias - limits[0]) / 1.96).toBeCloseTo(38.8, 1);
  });
});
