/** What can be read off a plot, point by point, under the pointer and by keyboard. */
export interface ReadSeries {
  readonly id: string;
  readonly name: string;
  readonly xs: ArrayLike<number>;
  readonly ys: ArrayLike<number>;
  /** The point in words, units included. */
  readonly text: (index: number) => string;
}

/** A point of a series, by place. */
export interface ReadPoint {
  readonly series: number;
  readonly index: number;
}

/** Index of the entry nearest to `x`; ties go to the first. */
export function nearestIndex(xs: ArrayLike<number>, x: number): number {
  let best = 0;
  for (let index = 1; index < xs.length; index++) {
    if (Math.abs(xs[index]! - x) < Math.abs(xs[best]! - x)) best = index;
  }
  return best;
}

/**
 * The point nearest to a place in pixels. `alongX` first settles on the nearest x of each curve, as one reads a curve;
 * without it plain distance counts, as one reads a cloud of points.
 */
export function nearestPoint(
  series: readonly ReadSeries[],
  toPixel: (x: number, y: number) => readonly [number, number],
  [px, py]: readonly [number, number],
  alongX: boolean,
): ReadPoint | null {
  let best: ReadPoint | null = null;
  let least = Infinity;
  series.forEach(({ xs, ys }, place) => {
    let column = -1;
    let columnDistance = Infinity;
    for (let index = 0; index < xs.length; index++) {
      const [x, y] = toPixel(xs[index]!, ys[index]!);
      const distance = alongX ? Math.abs(x - px) : (x - px) ** 2 + (y - py) ** 2;
      if (distance < columnDistance) {
        columnDistance = distance;
        column = index;
      }
    }
    if (column < 0) return;
    const score = alongX ? Math.abs(toPixel(xs[column]!, ys[column]!)[1] - py) : columnDistance;
    if (score < least) {
      least = score;
      best = { series: place, index: column };
    }
  });
  return best;
}

const bounded = (value: number, count: number): number => Math.max(0, Math.min(count - 1, value));

/** Where a key leads from `at`; null for a key that reads nothing. Up and down change to the series drawn above or below. */
export function stepReading(
  series: readonly ReadSeries[],
  at: ReadPoint | null,
  key: string,
  stride: number,
): ReadPoint | null {
  const filled = series.map((_, place) => place).filter((place) => series[place]!.xs.length > 0);
  if (filled.length === 0) return null;
  const from =
    at && series[at.series] && at.index < series[at.series]!.xs.length
      ? at
      : { series: filled[0]!, index: -1 };
  const count = series[from.series]!.xs.length;
  const along = (index: number): ReadPoint => ({ series: from.series, index: bounded(index, count) });
  switch (key) {
    case 'ArrowRight':
      return along(from.index + stride);
    case 'ArrowLeft':
      return along(from.index - stride);
    case 'Home':
      return along(0);
    case 'End':
      return along(count - 1);
    case 'ArrowUp':
    case 'ArrowDown': {
      if (from.index < 0) return along(0);
      const x = series[from.series]!.xs[from.index]!;
      const heights = filled.map((place) => {
        const index = nearestIndex(series[place]!.xs, x);
        return { series: place, index, y: series[place]!.ys[index]! };
      });
      heights.sort((one, other) => one.y - other.y || one.series - other.series);
      const place = heights.findIndex((entry) => entry.series === from.series);
      const next = heights[bounded(place + (key === 'ArrowUp' ? 1 : -1), heights.length)]!;
      return { series: next.series, index: next.index };
    }
    default:
      return null;
  }
}
