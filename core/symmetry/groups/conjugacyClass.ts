import { type GroupElements } from './closure';

/** A conjugacy class of the double group, joined with the class of its inverses. */
export interface ConjugacyClass {
  /** Indices of the elements; the first stands for the class. */
  readonly members: readonly number[];
  /** The class is its own bar: every spinor character vanishes on it. */
  readonly holdsItsBar: boolean;
}

/**
 * Classes of g and g⁻¹ together. Joining them keeps every character real: a pair of complex-conjugate irreducible
 * representations then counts as one, as time reversal makes it in a field without magnetism.
 */
export function conjugacyClasses(group: GroupElements): ConjugacyClass[] {
  const { elements, product, inverse, bar } = group;
  const done = new Set<number>();
  const classes: ConjugacyClass[] = [];
  for (let i = 0; i < elements.length; i++) {
    if (done.has(i)) continue;
    const members = new Set<number>();
    for (let g = 0; g < elements.length; g++) {
      const conjugate = product[product[g]![i]!]![inverse[g]!]!;
      members.add(conjugate).add(inverse[conjugate]!);
    }
    for (const member of members) done.add(member);
    classes.push({ members: [...members], holdsItsBar: members.has(bar[i]!) });
  }
  return classes;
}
