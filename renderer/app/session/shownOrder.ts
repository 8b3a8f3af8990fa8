interface HasCandidate {
  readonly candidate: { readonly id: string };
}

/** Rows as the table last showed them, for each project: the sheet goes on from there. */
const orders = new Map<string, readonly HasCandidate[]>();

export const rememberOrder = (projectId: string, rows: readonly HasCandidate[]): void =>
  void orders.set(projectId, rows);

export interface Neighbours {
  readonly before: string | null;
  readonly after: string | null;
  /** From 1; null where the table does not show it. */
  readonly place: number | null;
  readonly count: number;
}

export function neighboursOf(projectId: string, id: string): Neighbours {
  const order = orders.get(projectId) ?? [];
  const at = order.findIndex(({ candidate }) => candidate.id === id);
  if (at < 0) return { before: null, after: null, place: null, count: order.length };
  return {
    before: order[at - 1]?.candidate.id ?? null,
    after: order[at + 1]?.candidate.id ?? null,
    place: at + 1,
    count: order.length,
  };
}
