import { hungarian } from './hungarian';

export interface RankedAssignment {
  readonly columns: readonly number[];
  readonly cost: number;
}

interface Node {
  readonly cost: readonly (readonly number[])[];
  readonly found: RankedAssignment;
}

const total = (cost: readonly (readonly number[])[], columns: readonly number[]): number =>
  columns.reduce((sum, j, i) => sum + cost[i]![j]!, 0);

function solve(cost: readonly (readonly number[])[]): Node | null {
  const columns = hungarian(cost);
  if (columns === null) return null;
  const value = total(cost, columns);
  return Number.isFinite(value) ? { cost, found: { columns, cost: value } } : null;
}

/** The `count` cheapest assignments in order (K. G. Murty, Oper. Res. 16, 682, 1968). */
export function rankedAssignments(cost: readonly (readonly number[])[], count: number): RankedAssignment[] {
  const first = solve(cost);
  if (first === null) return [];
  const open: Node[] = [first];
  const ranked: RankedAssignment[] = [];
  while (open.length > 0 && ranked.length < count) {
    open.sort((a, b) => a.found.cost - b.found.cost);
    const node = open.shift()!;
    ranked.push(node.found);
    // Each child forbids one pair of this solution and keeps the pairs of the rows before it.
    const held = node.cost.map((row) => [...row]);
    for (const [i, j] of node.found.columns.entries()) {
      const child = held.map((row) => [...row]);
      child[i]![j] = Infinity;
      const solved = solve(child);
      if (solved !== null) open.push(solved);
      for (let k = 0; k < held[i]!.length; k++) if (k !== j) held[i]![k] = Infinity;
    }
  }
  return ranked;
}
