/**
 * Cheapest one-to-one assignment of rows to columns (H. W. Kuhn, Naval Res. Logist. Quart. 2, 83, 1955; in the form of
 * shortest augmenting paths with potentials). `cost[i][j]` may be Infinity for a pair that is not allowed; there must be
 * at least as many columns as rows. Returns the column of each row, or null where no full assignment is allowed.
 */
export function hungarian(cost: readonly (readonly number[])[]): number[] | null {
  const n = cost.length;
  const m = cost[0]?.length ?? 0;
  if (n > m) return null;
  const u = new Float64Array(n + 1);
  const v = new Float64Array(m + 1);
  const rowOf = new Int32Array(m + 1);
  const way = new Int32Array(m + 1);
  for (let i = 1; i <= n; i++) {
    rowOf[0] = i;
    let column = 0;
    const least = new Float64Array(m + 1).fill(Infinity);
    const used = new Uint8Array(m + 1);
    do {
      used[column] = 1;
      const row = rowOf[column]!;
      let delta = Infinity;
      let next = -1;
      for (let j = 1; j <= m; j++) {
        if (used[j] === 1) continue;
        const reduced = cost[row - 1]![j - 1]! - u[row]! - v[j]!;
        if (reduced < least[j]!) {
          least[j] = reduced;
          way[j] = column;
        }
        if (least[j]! < delta) {
          delta = least[j]!;
          next = j;
        }
      }
      if (next < 0 || delta === Infinity) return null;
      for (let j = 0; j <= m; j++) {
        if (used[j] === 1) {
          u[rowOf[j]!]! += delta;
          v[j]! -= delta;
        } else least[j]! -= delta;
      }
      column = next;
    } while (rowOf[column] !== 0);
    do {
      const before = way[column]!;
      rowOf[column] = rowOf[before]!;
      column = before;
    } while (column !== 0);
  }
  const columns = new Array<number>(n).fill(-1);
  for (let j = 1; j <= m; j++) if (rowOf[j]! > 0) columns[rowOf[j]! - 1] = j - 1;
  return columns;
}
