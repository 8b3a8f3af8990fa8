import { inverseRotation, termLetters, type Irrep, type PointGroup } from '../../symmetry';
import { irrepsOf } from '../../symmetry/representations/character';
import { parity } from '../angularMomentum/factorials';
import { carriedBy, type Amplitudes } from '../states/amplitudes';
import { characterReader } from './characters';
import { type NamingGroup } from './namingGroup';

/** A representation found in a set of states. */
export interface FoundIrrep {
  /** Mulliken symbol, or Bethe's G number with spin-orbit coupling (Mulliken where the group has no number). */
  readonly label: string;
  /** Mulliken symbol in either case; of a double group as Altmann and Herzig write it (`E1/2g`). */
  readonly mulliken: string;
  /** States that belong to it once (spin not counted unless spin-orbit coupling is there). */
  readonly dimension: number;
  readonly times: number;
}

/** Splits a set of states, complete with all partners, into representations; null when it is not a whole number of them. */
export type IrrepFinder = (states: readonly Amplitudes[]) => readonly FoundIrrep[] | null;

/** How far from a whole number a multiplicity may be. */
const wholeness = 0.02;

const whole = (raw: readonly number[]): number[] | null => {
  const rounded = raw.map(Math.round);
  return rounded.every((n, i) => n >= 0 && Math.abs(n - raw[i]!) < wholeness) ? rounded : null;
};

/** The finder for a naming group; states are given in the laboratory. */
export function irrepFinder(naming: NamingGroup, spinOrbit: boolean): IrrepFinder {
  if (naming.kind === 'spherical') return (states) => spherical(states, spinOrbit);
  if (naming.kind === 'axial') {
    const toFrame = carriedBy(inverseRotation(naming.frame));
    return (states) => axial(states.map(toFrame));
  }
  const { group, frame } = naming;
  const integer = candidates(group, false);
  const halfInteger = candidates(group, true);
  const read = characterReader(group, frame, integer.classes);
  return (states) => finite(group, isSpinor(states) ? halfInteger : integer, read(states), spinOrbit);
}

const isSpinor = (states: readonly Amplitudes[]): boolean => states[0]!.multiplets[0]!.J % 1 !== 0;

/** The representations that d electrons can have, with the classes that tell them apart. */
interface Candidates {
  readonly irreps: readonly Irrep[];
  /** Places of classes in the group: where the inversion is there, rotations say everything, d states being even. */
  readonly classes: readonly number[];
}

function candidates(group: PointGroup, spinor: boolean): Candidates {
  const centred = group.irreps.some(({ parity: mark }) => mark === 'g');
  return {
    irreps: irrepsOf(group, spinor).filter(({ parity: mark }) => mark !== 'u'),
    classes: group.classes.flatMap(({ representative }, c) =>
      centred && representative.parity === -1 ? [] : [c],
    ),
  };
}

function finite(
  { classes: all }: PointGroup,
  { irreps, classes }: Candidates,
  character: readonly number[],
  spinOrbit: boolean,
): FoundIrrep[] | null {
  const product = (a: (i: number) => number, b: (i: number) => number): number =>
    classes.reduce((sum, c, i) => sum + all[c]!.size * a(i) * b(i), 0);
  const times = whole(
    irreps.map(({ characters, degeneracy, dimension }) => {
      const own = (i: number): number => characters[classes[i]!]!;
      // A real spinor representation comes twice in a Kramers pair.
      return ((product((i) => character[i]!, own) / product(own, own)) * dimension) / degeneracy;
    }),
  );
  if (times === null) return null;
  return irreps.flatMap(({ mulliken, bethe, degeneracy }, i) => {
    const label = spinOrbit ? (bethe ?? mulliken) : mulliken;
    return times[i] === 0 ? [] : [{ label, mulliken, dimension: degeneracy, times: times[i]! }];
  });
}

/** How many of the states, in sum, have each |M|; the key is |M|. */
function magnitudes(states: readonly Amplitudes[]): Map<number, number> {
  const counts = new Map<number, number>();
  for (const { multiplets, re, im } of states) {
    multiplets.forEach(({ J }, which) => {
      for (let at = 0; at < 2 * J + 1; at++) {
        const M = Math.abs(at - J);
        counts.set(M, (counts.get(M) ?? 0) + re[which]![at]! ** 2 + im[which]![at]! ** 2);
      }
    });
  }
  return counts;
}

/** Terms S, P, D, ... of a free ion, or `J=5/2` with spin-orbit coupling: each fills every |M| up to J twice. */
function spherical(states: readonly Amplitudes[], spinOrbit: boolean): FoundIrrep[] | null {
  const counts = magnitudes(states);
  const perM = (M: number): number => (M === 0 ? 1 : 0.5) * (counts.get(M) ?? 0);
  const values = [...counts.keys()].sort((a, b) => a - b);
  const times = whole(values.map((J) => perM(J) - perM(J + 1)));
  if (times === null) return null;
  return values.flatMap((J, i) => {
    const written = J % 1 === 0 ? `${J}` : `${2 * J}/2`;
    const label = spinOrbit ? `J=${written}` : termLetters[J]!;
    return times[i] === 0 ? [] : [{ label, mulliken: label, dimension: 2 * J + 1, times: times[i]! }];
  });
}

const greek = 'ΣΠΔΦΓΗΙΚΛΜΝ';

/** D∞h: Σg+, Σg-, Πg, Δg, ... by |M|; E1/2g, E3/2g for half-integer M. d states are even. */
function axial(states: readonly Amplitudes[]): FoundIrrep[] | null {
  const rows: { label: string; dimension: number; raw: number }[] = [];
  for (const [M, count] of magnitudes(states)) {
    if (M % 1 !== 0) rows.push({ label: `E${2 * M}/2g`, dimension: 2, raw: count / 2 });
    else if (M > 0) rows.push({ label: `${greek[M]!}g`, dimension: 2, raw: count / 2 });
    else {
      const symmetric = symmetricShare(states);
      rows.push({ label: 'Σg+', dimension: 1, raw: symmetric });
      rows.push({ label: 'Σg-', dimension: 1, raw: count - symmetric });
    }
  }
  const times = whole(rows.map(({ raw }) => raw));
  if (times === null) return null;
  return rows.flatMap(({ label, dimension }, i) =>
    times[i] === 0 ? [] : [{ label, mulliken: label, dimension, times: times[i]! }],
  );
}

/** Weight of |J 0⟩ with even J: a C2 across the axis multiplies |J 0⟩ by (−1)^J. */
function symmetricShare(states: readonly Amplitudes[]): number {
  let share = 0;
  for (const { multiplets, re, im } of states) {
    multiplets.forEach(({ J }, which) => {
      if (J % 1 === 0 && parity(J) === 1) share += re[which]![J]! ** 2 + im[which]![J]! ** 2;
    });
  }
  return share;
}
