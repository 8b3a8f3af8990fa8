import { studentT95 } from './studentT';
import { mean } from './summary';
import { shareOf, type Share } from './wilson';

/** One number predicted with its standard deviation, and the same number measured with its standard uncertainty. */
export interface Pair {
  readonly predicted: number;
  readonly sigma: number;
  readonly measured: number;
  readonly uncertainty: number;
}

/** Residual over its standard deviation, z = (measured - predicted) / sqrt(u^2 + s^2). */
export const standardScore = ({ predicted, sigma, measured, uncertainty }: Pair): number =>
  (measured - predicted) / Math.hypot(sigma, uncertainty);

/** Share of measurements inside the stated ranges: one standard deviation for 68 %, 1.96 for 95 %. */
export function coverage(pairs: readonly Pair[]): { readonly within68: Share; readonly within95: Share } {
  const scores = pairs.map((pair) => Math.abs(standardScore(pair)));
  return {
    within68: shareOf(scores.filter((z) => z <= 1).length, scores.length),
    within95: shareOf(scores.filter((z) => z <= 1.959964).length, scores.length),
  };
}

export interface BlandAltman {
  readonly points: readonly { readonly mean: number; readonly difference: number }[];
  readonly bias: number;
  /** 95 % interval of the bias by Student's t. */
  readonly biasInterval: readonly [number, number];
  /** Bias ± 1.96 standard deviations of the differences. */
  readonly limits: readonly [number, number];
}

/** Difference against mean of two methods (J. M. Bland, D. G. Altman, Lancet 327, 1986, 307). */
export function blandAltman(
  pairs: readonly { readonly predicted: number; readonly measured: number }[],
): BlandAltman {
  const points = pairs.map(({ predicted, measured }) => ({
    mean: (predicted + measured) / 2,
    difference: predicted - measured,
  }));
  const differences = points.map(({ difference }) => difference);
  const bias = mean(differences);
  const variance =
    differences.reduce((sum, difference) => sum + (difference - bias) ** 2, 0) / (differences.length - 1);
  const spread = 1.96 * Math.sqrt(variance);
  const half = studentT95(differences.length - 1) * Math.sqrt(variance / differences.length);
  return {
    points,
    bias,
    biasInterval: [bias - half, bias + half],
    limits: [bias - spread, bias + spread],
  };
}
