/** One kind of ligand in a coordination sphere, by what it does to the counting: how many places, how many of it. */
export interface PatternKind {
  readonly denticity: number;
  readonly count: number;
}

/** A way to fill a coordination sphere with at most so many kinds of ligand, whichever they are. */
export type Pattern = readonly PatternKind[];

/**
 * All patterns that fill `places` places with 1 to `maxKinds` kinds of the given denticities. Kinds are listed by
 * falling denticity, then falling count, so that each pattern occurs once. Ascending number of kinds.
 */
export function patternsFilling(places: number, denticities: readonly number[], maxKinds: number): Pattern[] {
  const kinds: PatternKind[] = [];
  for (const denticity of [...new Set(denticities)].sort((a, b) => b - a)) {
    for (let count = Math.floor(places / denticity); count >= 1; count--) kinds.push({ denticity, count });
  }
  const found: Pattern[] = [];
  const extend = (chosen: PatternKind[], from: number, left: number): void => {
    if (left === 0) {
      found.push([...chosen]);
      return;
    }
    if (chosen.length === maxKinds) return;
    // The same (denticity, count) may occur more than once: two different ligands, three of each.
    for (let i = from; i < kinds.length; i++) {
      const kind = kinds[i]!;
      const taken = kind.denticity * kind.count;
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
  pattern.map(({ denticity, count }) => `${denticity}:${count}`).join(' ');
