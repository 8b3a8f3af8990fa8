/**
 * Moves labels apart as little as possible: places in the order of `wanted` (rising), at least `gap` apart, inside
 * `[low, high]`. Null where they do not fit.
 */
export function labelPlaces(
  wanted: readonly number[],
  gap: number,
  [low, high]: readonly [number, number],
): number[] | null {
  if ((wanted.length - 1) * gap > high - low + 1e-9) return null;
  // Without the gaps this is the monotone curve nearest to the wanted places: pool neighbours that would overlap.
  const pools: { sum: number; count: number }[] = [];
  wanted.forEach((place, index) => {
    pools.push({ sum: place - index * gap, count: 1 });
    for (;;) {
      const [before, last] = [pools.at(-2), pools.at(-1)!];
      if (!before || before.sum / before.count <= last.sum / last.count) break;
      pools.splice(-2, 2, { sum: before.sum + last.sum, count: before.count + last.count });
    }
  });
  const ceiling = high - (wanted.length - 1) * gap;
  return pools
    .flatMap(({ sum, count }) => Array<number>(count).fill(Math.max(low, Math.min(ceiling, sum / count))))
    .map((place, index) => place + index * gap);
}

/** As many labels as fit, the first (lowest) ones first; places in the order of `wanted`. */
export function fittingLabels(
  wanted: readonly number[],
  gap: number,
  span: readonly [number, number],
): { readonly places: readonly number[]; readonly dropped: number } {
  const most = Math.max(0, Math.floor((span[1] - span[0]) / gap + 1e-9) + 1);
  const kept = wanted.slice(0, most);
  return { places: labelPlaces(kept, gap, span) ?? [], dropped: wanted.length - kept.length };
}
