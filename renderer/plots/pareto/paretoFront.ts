/** One candidate by what it costs and how likely it meets the wish. */
export interface ParetoPoint {
  readonly id: string;
  readonly name: string;
  /** Smaller is better: ligands to order, hazard count, price. */
  readonly cost: number;
  /** 0 to 1; larger is better. */
  readonly probability: number;
}

/** Candidates that no other beats on both counts, by rising cost; of equals the first stays. */
export function paretoFront(points: readonly ParetoPoint[]): ParetoPoint[] {
  const ordered = [...points].sort(
    (one, other) => one.cost - other.cost || other.probability - one.probability,
  );
  const front: ParetoPoint[] = [];
  let best = -Infinity;
  for (const point of ordered) {
    if (point.probability <= best) continue;
    front.push(point);
    best = point.probability;
  }
  return front;
}

/**
 * Sideways shifts, at most `reach`, so that candidates of one cost and nearly one probability do not hide each other.
 * The same points always get the same shifts.
 */
export function spreadSideways(points: readonly ParetoPoint[], reach: number): number[] {
  const met = new Map<string, number>();
  const steps = points.map(({ cost, probability }) => {
    const key = `${cost} ${Math.round(probability * 30)}`;
    const place = met.get(key) ?? 0;
    met.set(key, place + 1);
    return Math.ceil(place / 2) * (place % 2 === 0 ? -1 : 1);
  });
  const furthest = Math.max(3, ...steps.map(Math.abs));
  return steps.map((step) => (reach * step) / furthest);
}
