export type Interval = readonly [number, number];

/** A one-way street from data to pixels with a way back. */
export interface Scale {
  (value: number): number;
  readonly invert: (pixel: number) => number;
  readonly domain: Interval;
  readonly range: Interval;
  readonly kind: 'linear' | 'log';
}

function mapped(domain: Interval, range: Interval, kind: Scale['kind']): Scale {
  const to = (value: number): number => (kind === 'log' ? Math.log10(value) : value);
  const from = (value: number): number => (kind === 'log' ? 10 ** value : value);
  const [first, last] = [to(domain[0]), to(domain[1])];
  const width = last - first || 1;
  const scale = (value: number): number => range[0] + ((to(value) - first) / width) * (range[1] - range[0]);
  const invert = (pixel: number): number =>
    from(first + ((pixel - range[0]) / (range[1] - range[0] || 1)) * width);
  return Object.assign(scale, { invert, domain, range, kind });
}

export const linearScale = (domain: Interval, range: Interval): Scale => mapped(domain, range, 'linear');

/** Both ends of `domain` must be positive. */
export const logScale = (domain: Interval, range: Interval): Scale => mapped(domain, range, 'log');

/** Least and greatest of the finite values; `fallback` where there is none. */
export function extent(values: Iterable<number>, fallback: Interval = [0, 1]): Interval {
  let least = Infinity;
  let greatest = -Infinity;
  for (const value of values) {
    if (!Number.isFinite(value)) continue;
    if (value < least) least = value;
    if (value > greatest) greatest = value;
  }
  return least <= greatest ? [least, greatest] : fallback;
}

/** Widens an interval by a share of its length on both sides; an interval without length becomes one unit wide. */
export function padded([low, high]: Interval, share = 0.05): Interval {
  const margin = (high - low) * share || Math.abs(low) * share || 0.5;
  return [low - margin, high + margin];
}
