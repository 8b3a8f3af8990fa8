/** Order in which the table last showed the candidates of each project: the sheet goes on from there. */
const orders = new Map<string, readonly string[]>();

export const rememberOrder = (projectId: string, ids: readonly string[]): void =>
  void orders.set(projectId, ids);

export interface Neighbours {
  readonly before: string | null;
  readonly after: string | null;
  /** From 1; null where the table does not show it. */
  readonly place: number | null;
  readonly count: number;
}

export function neighboursOf(projectId: string, id: string): Neighbours {
  const order = orders.get(projectId) ?? [];
  const at = order.indexOf(id);
  if (at < 0) return { before: null, after: null, place: null, count: order.length };
  return { before: order[at - 1] ?? null, after: order[at + 1] ?? null, place: at + 1, count: order.length };
}
