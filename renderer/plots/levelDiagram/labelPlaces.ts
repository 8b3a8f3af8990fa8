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

/** A label and how much it matters; of two that crowd each other, the lower `priority` goes. */
export interface WantedLabel {
  readonly at: number;
  readonly priority: number;
}

/** Neighbours of `index` that stand exactly at the gap: they push each other. */
function crowd(places: readonly number[], index: number, gap: number): readonly [number, number] {
  let [first, last] = [index, index];
  while (first > 0 && places[first]! - places[first - 1]! < gap + 1e-6) first--;
  while (last < places.length - 1 && places[last + 1]! - places[last]! < gap + 1e-6) last++;
  return [first, last];
}

/**
 * The labels that can stand within `reach` of where they belong, and where. Those that matter least give way; `wanted`
 * must rise.
 */
export function fittingLabels<Label extends WantedLabel>(
  wanted: readonly Label[],
  gap: number,
  span: readonly [number, number],
  reach: number,
): { readonly label: Label; readonly place: number }[] {
  const kept = [...wanted];
  while (kept.length > 0) {
    const places = labelPlaces(
      kept.map(({ at }) => at),
      gap,
      span,
    );
    let [first, last] = [0, kept.length - 1];
    if (places) {
      const moved = places.map((place, index) => Math.abs(place - kept[index]!.at));
      const worst = moved.indexOf(Math.max(...moved));
      if (moved[worst]! <= reach) return kept.map((label, index) => ({ label, place: places[index]! }));
      [first, last] = crowd(places, worst, gap);
      // A label alone in its crowd is held by the end of the span and cannot come nearer.
      if (first === last) return kept.map((label, index) => ({ label, place: places[index]! }));
    }
    let least = first;
    for (let index = first; index <= last; index++) {
      if (kept[index]!.priority < kept[least]!.priority) least = index;
    }
    kept.splice(least, 1);
  }
  return [];
}
