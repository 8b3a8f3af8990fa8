import type { LigandPool } from './ligandPool';
import { repeatsPrevious } from './multisets';
import type { Pattern } from './pattern';

/**
 * How many multisets of a pattern there are for each total charge of the ligands, without visiting them: ligands count
 * by (shape, charge) only, so this is a sum of products of falling factorials.
 */
export function countByCharge(pattern: Pattern, pool: LigandPool): ReadonlyMap<number, number> {
  const sizes = new Map<string, Map<number, number>>();
  for (const [key, positions] of pool.byShape) {
    const byCharge = new Map<number, number>();
    for (const position of positions) {
      const { charge } = pool.ligands[position]!;
      byCharge.set(charge, (byCharge.get(charge) ?? 0) + 1);
    }
    sizes.set(key, byCharge);
  }
  const totals = new Map<number, number>();
  const chosen: number[] = [];

  const assign = (kind: number, charge: number, ways: number): void => {
    if (kind === pattern.length) {
      totals.set(charge, (totals.get(charge) ?? 0) + ways);
      return;
    }
    const { shape, count } = pattern[kind]!;
    const repeats = repeatsPrevious(pattern, kind);
    for (const [each, size] of [...(sizes.get(shape.key) ?? [])].sort((a, b) => a[0] - b[0])) {
      // Equal kinds are unordered: charges do not fall, and among equal charges the order is divided out.
      if (repeats && each < chosen[kind - 1]!) continue;
      let used = 0;
      let equal = 1;
      for (let j = 0; j < kind; j++) {
        if (pattern[j]!.shape.key !== shape.key || chosen[j] !== each) continue;
        used++;
        if (pattern[j]!.count === count) equal++;
      }
      if (used >= size) continue;
      chosen[kind] = each;
      assign(kind + 1, charge + count * each, (ways * (size - used)) / equal);
    }
  };
  assign(0, 0, 1);
  return totals;
}
