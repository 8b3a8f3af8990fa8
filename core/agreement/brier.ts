/** A forecast probability and what happened. */
export interface Forecast {
  readonly probability: number;
  readonly happened: boolean;
}

/** Mean square of probability minus outcome (G. W. Brier, Mon. Weather Rev. 78, 1950, 1): 0 perfect, 0.25 a coin. */
export const brierScore = (forecasts: readonly Forecast[]): number =>
  forecasts.reduce((sum, { probability, happened }) => sum + (probability - (happened ? 1 : 0)) ** 2, 0) /
  forecasts.length;

export interface ConfusionTable {
  readonly highAsHigh: number;
  readonly highAsLow: number;
  readonly lowAsHigh: number;
  readonly lowAsLow: number;
}

/** Found spin state against predicted: `highAsLow` counts complexes found high spin and predicted low. */
export function confusionTable(
  pairs: readonly { readonly foundHigh: boolean; readonly predictedHigh: boolean }[],
): ConfusionTable {
  const count = (found: boolean, predicted: boolean): number =>
    pairs.filter(({ foundHigh, predictedHigh }) => foundHigh === found && predictedHigh === predicted).length;
  return {
    highAsHigh: count(true, true),
    highAsLow: count(true, false),
    lowAsHigh: count(false, true),
    lowAsLow: count(false, false),
  };
}
