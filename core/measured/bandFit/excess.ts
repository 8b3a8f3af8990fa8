/** A stretch where data and model part by more than the noise allows. */
export interface Excess {
  readonly kind: 'model above spectrum' | 'spectrum above model';
  readonly from_cm1: number;
  readonly to_cm1: number;
  /** Largest difference, in the unit of the ordinate. */
  readonly largest: number;
}

const median = (values: readonly number[]): number => {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[middle]! : (sorted[middle - 1]! + sorted[middle]!) / 2;
};

/**
 * Standard deviation of the noise, from the scatter of third differences of neighbouring points, in which smooth bands
 * cancel; independent of any model. Median absolute deviation times 1.4826; the differences 1, -3, 3, -1 have 20 times
 * the variance of one point.
 */
export function noiseOf(values: readonly number[]): number {
  if (values.length < 8) return 0;
  const differences = values
    .slice(3)
    .map((d, i) => Math.abs(d - 3 * values[i + 2]! + 3 * values[i + 1]! - values[i]!));
  return (1.4826 * median(differences)) / Math.sqrt(20);
}

/**
 * Stretches of at least five points where the residual, averaged over five points, is more than five standard
 * deviations of such an average away from zero. `residual` is data minus model.
 */
export function findExcess(
  wavenumber: readonly number[],
  residual: readonly number[],
  noise: number,
): Excess[] {
  const largestResidual = Math.max(...residual.map(Math.abs), 0);
  const limit = Math.max((5 * noise) / Math.sqrt(5), 1e-9, 1e-6 * largestResidual);
  const found: Excess[] = [];
  let run: { sign: number; start: number; largest: number } | null = null;
  const close = (end: number) => {
    if (run === null) return;
    found.push({
      kind: run.sign > 0 ? 'spectrum above model' : 'model above spectrum',
      from_cm1: wavenumber[run.start]!,
      to_cm1: wavenumber[end]!,
      largest: run.largest,
    });
    run = null;
  };
  for (let i = 2; i < residual.length - 2; i++) {
    const mean =
      (residual[i - 2]! + residual[i - 1]! + residual[i]! + residual[i + 1]! + residual[i + 2]!) / 5;
    const sign = Math.abs(mean) > limit ? Math.sign(mean) : 0;
    if (run !== null && sign !== (run as { sign: number }).sign) close(i + 1);
    if (sign === 0) continue;
    if (run === null) run = { sign, start: i - 2, largest: 0 };
    run.largest = Math.max(run.largest, Math.abs(mean));
  }
  close(residual.length - 1);
  return found;
}
