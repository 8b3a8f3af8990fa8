/** Mean; NaN for an empty list, as for all summaries here. */
export const mean = (values: readonly number[]): number =>
  values.reduce((sum, value) => sum + value, 0) / values.length;

/** p-th quantile (0 to 1) with linear interpolation between order statistics (R. J. Hyndman, Y. Fan 1996, type 7). */
export function quantile(values: readonly number[], p: number): number {
  if (values.length === 0) return NaN;
  const sorted = [...values].sort((a, b) => a - b);
  const at = (sorted.length - 1) * p;
  const below = Math.floor(at);
  const above = Math.min(below + 1, sorted.length - 1);
  return sorted[below]! + (at - below) * (sorted[above]! - sorted[below]!);
}

export const median = (values: readonly number[]): number => quantile(values, 0.5);

export interface ErrorSummary {
  readonly n: number;
  /** Mean of predicted minus measured. */
  readonly bias: number;
  readonly meanAbsolute: number;
  readonly rootMeanSquare: number;
  readonly medianAbsolute: number;
  readonly percentile90Absolute: number;
}

/** Summary of signed errors (predicted minus measured), in whatever unit or fraction they come. */
export function errorSummary(errors: readonly number[]): ErrorSummary {
  const sizes = errors.map(Math.abs);
  return {
    n: errors.length,
    bias: mean(errors),
    meanAbsolute: mean(sizes),
    rootMeanSquare: Math.sqrt(mean(errors.map((error) => error * error))),
    medianAbsolute: median(sizes),
    percentile90Absolute: quantile(sizes, 0.9),
  };
}
