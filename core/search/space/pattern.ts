/** What a ligand is to the counting: how many places it takes, and how it may lie. */
export interface LigandShape {
  readonly key: string;
  readonly denticity: number;
}

/** One kind of ligand in a coordination sphere, whichever it is: its shape and how many of it. */
export interface PatternKind {
  readonly shape: LigandShape;
  readonly count: number;
}

/** A way to fill a coordination sphere with a few kinds of ligand. */
export type Pattern = readonly PatternKind[];

/**
 * All patterns that fill `places` places with 1 to `maxKinds` kinds of the given shapes. Kinds are listed by falling
 * denticity, then shape, then falling count, so that each pattern occurs once. Ascending number of kinds.
 */
export function patternsFilling(places: number, shapes: readonly LigandShape[], maxKinds: number): Pattern[] {
  const ordered = [...shapes].sort((a, b) => b.denticity - a.denticity || (a.key < b.key ? -1 : 1));
  const kinds: PatternKind[] = ordered.flatMap((shape) =>
    Array.from({ length: Math.floor(places / shape.denticity) }, (_, i) => ({
      shape,
      count: i + 1,
    })).reverse(),
  );
  const found: Pattern[] = [];
  const extend = (chosen: PatternKind[], from: number, left: number): void => {
    if (left === 0) {
      found.push([...chosen]);
      return;
    }
    if (chosen.length === maxKinds) return;
    // The same kind may occur more than once: two different ligands, three of each.
    for (let i = from; i < kinds.length; i++) {
      const kind = kinds[i]!;
      const taken = kind.shape.denticity * kind.count;
      if (taken > left) continue;
      chosen.push(kind);
      extend(chosen, i, left - taken);
      chosen.pop();
    }
  };
  extend([], 0, places);
  return found.sort((a, b) => a.length - b.length);
}

/** `2:3` for three of a bidentate ligand, `1:4 1:2` for four of one and two of another monodentate. */
export const patternKey = (pattern: Pattern): string =>
  pattern.map(({ shape, count }) => `${shape.key}:${count}`).join(' ');
