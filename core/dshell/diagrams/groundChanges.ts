/** Where the lowest of several curves changes. */
export interface CurveChange {
  readonly x: number;
  readonly from: number;
  readonly to: number;
}

/**
 * Changes of the lowest curve between two places, ascending, each located to `precision`. `lowest(x)` gives one energy per
 * curve. A third curve that comes down between the two is found as well.
 */
export function lowestCurveChanges(
  lowest: (x: number) => readonly number[],
  from: number,
  to: number,
  precision: number,
): CurveChange[] {
  const leastAt = (x: number): number => {
    const energies = lowest(x);
    return energies.indexOf(Math.min(...energies));
  };
  const search = (left: number, a: number, right: number, b: number): CurveChange[] => {
    if (a === b) return [];
    const x = crossing((at) => lowest(at)[a]! - lowest(at)[b]!, left, right, precision);
    const between = leastAt(x);
    const tooNear = x - left <= precision || right - x <= precision;
    if (between === a || between === b || tooNear) return [{ x, from: a, to: b }];
    return [...search(left, a, x, between), ...search(x, between, right, b)];
  };
  return search(from, leastAt(from), to, leastAt(to));
}

/** Bisection; `difference` goes from negative to positive. */
function crossing(difference: (x: number) => number, from: number, to: number, precision: number): number {
  let [low, high] = [from, to];
  while (high - low > precision) {
    const middle = 0.5 * (low + high);
    if (middle <= low || middle >= high) break;
    if (difference(middle) < 0) low = middle;
    else high = middle;
  }
  return 0.5 * (low + high);
}
