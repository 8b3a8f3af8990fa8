import type { Estimate } from '../estimation/types';

/** No band centre is known better than this, cm⁻¹, whatever the parameters say. */
export const smallestSigma_cm1 = 400;

interface Slopes {
  readonly tenDq: number;
  readonly B: number;
  readonly C: number;
}

/**
 * Standard deviation (cm⁻¹) that the doubts of 10Dq, B and C leave in a level. Doubts with the same cause move the
 * three together and are added before they are squared: that is their covariance.
 */
export function propagatedSigma(
  slope: Slopes,
  parameters: { readonly tenDq: Estimate; readonly racahB: Estimate; readonly racahC: Estimate },
): number {
  const byCause = new Map<string, number>();
  let alone = 0;
  const parts: readonly (readonly [Estimate, number])[] = [
    [parameters.tenDq, slope.tenDq],
    [parameters.racahB, slope.B],
    [parameters.racahC, slope.C],
  ];
  for (const [estimate, factor] of parts) {
    if (estimate.shares === undefined) {
      alone += ((estimate.sigma ?? 0) * factor) ** 2;
      continue;
    }
    for (const { cause, sigma } of estimate.shares) {
      byCause.set(cause, (byCause.get(cause) ?? 0) + sigma * factor);
    }
  }
  let variance = alone;
  for (const part of byCause.values()) variance += part * part;
  return Math.sqrt(variance);
}
