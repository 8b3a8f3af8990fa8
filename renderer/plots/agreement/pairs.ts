/** One measurement beside the prediction that was frozen before it. */
export interface Pair {
  readonly id: string;
  /** Complex and quantity, `[Cr(en)3]3+ 4T2g`. */
  readonly name: string;
  readonly predicted: number;
  /** 68 %, same unit; null where the prediction states none. */
  readonly sigma: number | null;
  readonly measured: number;
  /** Standard uncertainty of the measurement; null where unknown. */
  readonly u: number | null;
  /** Metal, ligand or geometry it is grouped by; told apart by marker shape. */
  readonly group?: string;
}

/** Measured minus predicted over the joint standard deviation; null where the prediction states no range. */
export const standardised = ({ predicted, sigma, measured, u }: Pair): number | null =>
  sigma === null || sigma <= 0 ? null : (measured - predicted) / Math.hypot(sigma, u ?? 0);

/** Groups in the order in which they first occur. */
export function grouped(pairs: readonly Pair[]): ReadonlyMap<string, readonly Pair[]> {
  const groups = new Map<string, Pair[]>();
  for (const pair of pairs) {
    const name = pair.group ?? '';
    groups.set(name, [...(groups.get(name) ?? []), pair]);
  }
  return groups;
}
