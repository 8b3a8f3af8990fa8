/**
 * Score interval of a proportion (E. B. Wilson, J. Am. Stat. Assoc. 22, 1927, 209). `z` is 1.96 for 95 %.
 * With no trials it is the whole of [0, 1].
 */
export function wilsonInterval(successes: number, trials: number, z = 1.959964): readonly [number, number] {
  if (trials === 0) return [0, 1];
  const p = successes / trials;
  const scale = 1 / (1 + (z * z) / trials);
  const centre = scale * (p + (z * z) / (2 * trials));
  const half = scale * z * Math.sqrt((p * (1 - p)) / trials + (z * z) / (4 * trials * trials));
  return [Math.max(0, centre - half), Math.min(1, centre + half)];
}

export interface Share {
  readonly hits: number;
  readonly of: number;
  /** Null where there was nothing to count. */
  readonly share: number | null;
  readonly interval95: readonly [number, number];
}

export const shareOf = (hits: number, of: number): Share => ({
  hits,
  of,
  share: of === 0 ? null : hits / of,
  interval95: wilsonInterval(hits, of),
});
