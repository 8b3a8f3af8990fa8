import { groupRecipes, type GroupRecipe } from './groups/catalogue';
import { className } from './groups/className';
import { closeGroup, type GroupElements } from './groups/closure';
import { conjugacyClasses } from './groups/conjugacyClass';
import { operationKey, type Operation } from './groups/operation';
import { betheName } from './representations/bethe';
import { classCharacters, type Reality } from './representations/classCharacters';
import { mullikenStem, parityMark, type ParityMark } from './representations/names';

/** A class of operations; its spinor characters are those of `representative` as given (not of its bar). */
export interface OperationClass {
  /** `C3`, `C2'`, `S4`, `σd`; powers as `C5^2`. */
  readonly name: string;
  readonly representative: Operation;
  /** Members in the single group, for the class sizes of the usual tables. */
  readonly size: number;
}

export interface Irrep {
  /** `T2g`, `B1`, `E''`, and for half-integer spin `E1/2g`. */
  readonly mulliken: string;
  /** `G5`; null where the group has no numbering in use. */
  readonly bethe: string | null;
  readonly parity: ParityMark;
  readonly dimension: number;
  /** Degeneracy of a level: twice the dimension for a real spinor (Kramers), else the dimension. */
  readonly degeneracy: number;
  readonly spinor: boolean;
  readonly reality: Reality;
  /** One per class of the group, in its order. */
  readonly characters: readonly number[];
}

/** A point group with its double group, in the standard orientation of `groups/catalogue`. */
export interface PointGroup {
  readonly name: string;
  /** Order of the single group. */
  readonly order: number;
  readonly classes: readonly OperationClass[];
  /** Integer-spin representations first, g before u, ' before ''. Complex-conjugate pairs are joined. */
  readonly irreps: readonly Irrep[];
  /** Elements of the double group: `order` operations and as many barred ones. */
  readonly elements: GroupElements;
  /** Class of each element of the double group; `barred` where it is conjugate to the bar of the representative. */
  readonly classOf: readonly { readonly index: number; readonly barred: boolean }[];
  /** Index of an operation among the elements, undefined when the group lacks it. */
  readonly place: (operation: Operation) => number | undefined;
}

const cache = new Map<string, PointGroup>();

/** The group of that Schoenflies name (`Oh`, `D2d`, `C3v`). Throws on a name that is not in the catalogue. */
export function pointGroup(name: string): PointGroup {
  let group = cache.get(name);
  if (group === undefined) {
    const recipe = groupRecipes.find((each) => each.name === name);
    if (recipe === undefined) throw new RangeError(`no point group ${name} in the catalogue`);
    cache.set(name, (group = build(recipe)));
  }
  return group;
}

export const isPointGroupName = (name: string): boolean => groupRecipes.some((each) => each.name === name);
export const pointGroupNames = (): string[] => groupRecipes.map(({ name }) => name);

/** The irreducible representation of that Mulliken name. Throws when the group has none. */
export function irrepNamed(group: PointGroup, mulliken: string): Irrep {
  const found = group.irreps.find((each) => each.mulliken === mulliken);
  if (found === undefined) throw new RangeError(`${group.name} has no representation ${mulliken}`);
  return found;
}

function build(recipe: GroupRecipe): PointGroup {
  const elements = closeGroup(recipe.generators);
  const doubleClasses = conjugacyClasses(elements);
  const places = new Map(elements.elements.map((operation, index) => [operationKey(operation), index]));
  const place = (operation: Operation): number | undefined => places.get(operationKey(operation));
  const doubleClassOf = new Map(
    doubleClasses.flatMap(({ members }, c) => members.map((member) => [member, c] as const)),
  );

  // A class and its bar are one class of the single group; the one with the smaller turn stands for both.
  const classes: OperationClass[] = [];
  const standing: number[] = [];
  const classOf: { index: number; barred: boolean }[] = [];
  doubleClasses.forEach(({ members, holdsItsBar }, c) => {
    if (classOf[members[0]!] !== undefined) return;
    const operations = members.map((member) => elements.elements[member]!);
    const partner = doubleClassOf.get(elements.bar[members[0]!]!)!;
    const [kept, other] = operations[0]!.rotation[0] >= -1e-9 ? [c, partner] : [partner, c];
    for (const member of doubleClasses[other]!.members)
      classOf[member] = { index: classes.length, barred: true };
    for (const member of doubleClasses[kept]!.members)
      classOf[member] = { index: classes.length, barred: false };
    const representative = elements.elements[doubleClasses[kept]!.members[0]!]!;
    const name = className(representative, operations, recipe);
    classes.push({ name, representative, size: holdsItsBar ? members.length / 2 : members.length });
    standing.push(kept);
  });

  const all = classCharacters(elements, doubleClasses);
  const irreps = all.map((characters): Irrep => {
    const at = (operation: Operation): number | null => {
      const index = place(operation);
      return index === undefined ? null : characters.characters[doubleClassOf.get(index)!]!;
    };
    const { dimension, spinor, reality } = characters;
    const mark = parityMark(dimension, at, spinor);
    const stem = mullikenStem(characters, at, recipe, all);
    return {
      mulliken: stem + mark,
      bethe: betheName(recipe.name, mark.startsWith("'") ? stem + mark : stem),
      parity: mark,
      dimension,
      degeneracy: spinor && reality === 'real' ? 2 * dimension : dimension,
      spinor,
      reality,
      characters: standing.map((c) => characters.characters[c]!),
    };
  });
  irreps.sort((a, b) => sortKey(a).localeCompare(sortKey(b), 'en'));
  const order = elements.elements.length / 2;
  return { name: recipe.name, order, classes, irreps, elements, classOf, place };
}

const parityOrder: Readonly<Record<ParityMark, number>> = { '': 0, g: 0, u: 1, "'": 0, "''": 1 };
const sortKey = ({ spinor, parity, mulliken }: Irrep): string =>
  `${Number(spinor)}${parityOrder[parity]}${mulliken.replaceAll(/[gu']/g, '')}`;
