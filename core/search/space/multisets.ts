import type { LigandPool } from './ligandPool';
import type { Pattern } from './pattern';

const none = new Int32Array(0);

/** Whether kind `i` fills the sphere just as the kind before it does: then the two are chosen in ascending order. */
export const repeatsPrevious = (pattern: Pattern, i: number): boolean =>
  i > 0 && pattern[i]!.shape.key === pattern[i - 1]!.shape.key && pattern[i]!.count === pattern[i - 1]!.count;

/**
 * Every multiset of ligands of a pattern, as positions in the pool, one per kind. Kinds are different ligands; equal
 * kinds ascend, so that each multiset occurs once. The array is reused between steps.
 */
export function* multisetsOf(pattern: Pattern, pool: LigandPool): Generator<Int32Array> {
  const picks = new Int32Array(pattern.length);
  yield* choose(0);

  function* choose(kind: number): Generator<Int32Array> {
    if (kind === pattern.length) {
      yield picks;
      return;
    }
    const least = repeatsPrevious(pattern, kind) ? picks[kind - 1]! + 1 : 0;
    for (const position of pool.byShape.get(pattern[kind]!.shape.key) ?? none) {
      if (position < least || picks.subarray(0, kind).includes(position)) continue;
      picks[kind] = position;
      yield* choose(kind + 1);
    }
  }
}
