import { irrepNamed, type Irrep, type PointGroup } from '../pointGroup';

/** Values of a (reducible) character, one per class of a point group. */
export type Character = readonly number[];

export interface Component {
  readonly irrep: Irrep;
  readonly times: number;
}

/** Sum over the group: ⟨a|b⟩ = Σ_classes size a b / order. */
export const innerProduct = (group: PointGroup, a: Character, b: Character): number =>
  group.classes.reduce((sum, { size }, c) => sum + size * a[c]! * b[c]!, 0) / group.order;

export const product = (a: Character, b: Character): number[] => a.map((value, c) => value * b[c]!);
export const sum = (a: Character, b: Character): number[] => a.map((value, c) => value + b[c]!);
export const difference = (a: Character, b: Character): number[] => a.map((value, c) => value - b[c]!);

/** The representations of integer spin, or those of half-integer spin: the two never mix. */
export const irrepsOf = (group: PointGroup, spinor: boolean): Irrep[] =>
  group.irreps.filter((irrep) => irrep.spinor === spinor);

/** How often each of `irreps` occurs; fractional where `character` is not a character of the group (within rounding). */
export const multiplicities = (group: PointGroup, irreps: readonly Irrep[], character: Character): number[] =>
  irreps.map(
    ({ characters }) =>
      innerProduct(group, character, characters) / Math.round(innerProduct(group, characters, characters)),
  );

/** Splits a character into irreducible ones. Throws when it is not a character of the group. */
export function reduce(group: PointGroup, character: Character, spinor = false): Component[] {
  const irreps = irrepsOf(group, spinor);
  return multiplicities(group, irreps, character).flatMap((raw, i) => {
    const times = Math.round(raw);
    if (times < 0 || Math.abs(raw - times) > 1e-6)
      throw new RangeError(`not a character of ${group.name}: ${character.join(' ')}`);
    return times === 0 ? [] : [{ irrep: irreps[i]!, times }];
  });
}

/** `A1g + Eg + 2T2g`. */
export const writeSum = (components: readonly Component[]): string =>
  components.map(({ irrep, times }) => (times === 1 ? '' : times) + irrep.mulliken).join(' + ');

/** Direct product of two irreducible representations named by Mulliken symbols. */
export function directProduct(group: PointGroup, a: string, b: string): Component[] {
  const left = irrepNamed(group, a);
  const right = irrepNamed(group, b);
  return reduce(group, product(left.characters, right.characters), left.spinor !== right.spinor);
}
