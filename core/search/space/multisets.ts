import type { LigandPool } from './ligandPool';
import type { Pattern } from './pattern';

/**
 * All kinds but the last are chosen (`picks`, positions in the pool, one per kind); the last one runs over
 * `last[from]`, `last[from + 1]`, ... except the positions already picked. The innermost loop is left to the caller,
 * because it is where a search spends its time.
 */
export type PrefixVisitor = (picks: Int32Array, last: Int32Array, from: number) => void;

const none = new Int32Array(0);

/** First index in ascending `list` whose entry is greater than `value`. */
function after(list: Int32Array, value: number): number {
  let low = 0;
  let high = list.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (list[middle]! <= value) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** Whether kind `i` fills the sphere just as the kind before it does: then the two are chosen in ascending order. */
export const repeatsPrevious = (pattern: Pattern, i: number): boolean =>
  i > 0 && pattern[i]!.denticity === pattern[i - 1]!.denticity && pattern[i]!.count === pattern[i - 1]!.count;

/** Visits every choice of all but the last kind of a pattern. Kinds are different ligands; equal kinds ascend. */
export function visitPrefixes(pattern: Pattern, pool: LigandPool, visit: PrefixVisitor): void {
  const lists = pattern.map(({ denticity }) => pool.byDenticity.get(denticity) ?? none);
  const picks = new Int32Array(pattern.length - 1);
  const end = pattern.length - 1;
  const choose = (kind: number): void => {
    const list = lists[kind]!;
    const from = repeatsPrevious(pattern, kind) ? after(list, picks[kind - 1]!) : 0;
    if (kind === end) {
      if (from < list.length) visit(picks, list, from);
      return;
    }
    for (let i = from; i < list.length; i++) {
      const position = list[i]!;
      let taken = false;
      for (let j = 0; j < kind; j++) taken ||= picks[j] === position;
      if (taken) continue;
      picks[kind] = position;
      choose(kind + 1);
    }
  };
  choose(0);
}

/** Visits every multiset of ligands of a pattern; `picks` is reused between calls. */
export function visitMultisets(pattern: Pattern, pool: LigandPool, visit: (picks: Int32Array) => void): void {
  const whole = new Int32Array(pattern.length);
  const end = pattern.length - 1;
  visitPrefixes(pattern, pool, (picks, last, from) => {
    whole.set(picks);
    for (let i = from; i < last.length; i++) {
      const position = last[i]!;
      if (picks.includes(position)) continue;
      whole[end] = position;
      visit(whole);
    }
  });
}
