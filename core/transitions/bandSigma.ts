import type { Estimate } from '../estimation/types';

/** No band centre is known better than this, cm⁻¹, whatever the parameters say. */
export const smallestSigma_cm1 = 400;

interface Slopes {
  readonly tenDq: number;
  readonly B: number;
  readonly C: number;
}

/** What one standard deviation of each cause of doubt does to 10Dq, B and C, cm⁻¹. */
export interface CommonDoubts {
  readonly tenDq: Float64Array;
  readonly B: Float64Array;
  readonly C: Float64Array;
}

export interface FieldParameters {
  readonly tenDq: Estimate;
  readonly racahB: Estimate;
  readonly racahC: Estimate;
}

/** Gathers the doubts of the three parameters by cause; an estimate that names no causes is one of its own. */
export function commonDoubts({ tenDq, racahB, racahC }: FieldParameters): CommonDoubts {
  const places = new Map<string, number>();
  const parts = [tenDq, racahB, racahC].map((estimate, index) => {
    const shares = estimate.shares ?? [{ cause: `own ${index}`, sigma: estimate.sigma ?? 0 }];
    for (const { cause } of shares) if (!places.has(cause)) places.set(cause, places.size);
    return shares;
  });
  const [one, two, three] = parts.map((shares) => {
    const column = new Float64Array(places.size);
    for (const { cause, sigma } of shares) column[places.get(cause)!]! += sigma;
    return column;
  });
  return { tenDq: one!, B: two!, C: three! };
}

/**
 * Standard deviation (cm⁻¹) that the doubts of 10Dq, B and C leave in a level. Doubts with the same cause move the
 * three together and are added before they are squared: that is their covariance.
 */
export function propagatedSigma(slope: Slopes, doubts: CommonDoubts): number {
  let variance = 0;
  for (let cause = 0; cause < doubts.tenDq.length; cause++) {
    const moved =
      slope.tenDq * doubts.tenDq[cause]! + slope.B * doubts.B[cause]! + slope.C * doubts.C[cause]!;
    variance += moved * moved;
  }
  return Math.sqrt(variance);
}
