import { type FieldComponent } from '../field/tensorComponents';
import { cubicDimension, cubicIrreps, cubicStates, cubicSpinorSpecies } from './cubicSpecies';
import { cosineState, plainState, sineState, turnedState, type AdaptedVector } from './vector';

/**
 * The rotation groups that a d-electron field can have: a field holds ranks 0, 2 and 4 only and does not feel the
 * inversion, so that every point group acts as one of these (a fivefold or sixfold axis acts as D∞, C3 as D3, C4 as D4
 * about suitable axes). z is the main axis; y is a twofold axis of every D group.
 */
export const fieldGroups = ['SO3', 'O', 'Dinf', 'D4', 'D3', 'D2', 'C2', 'C1'] as const;
export type FieldGroup = (typeof fieldGroups)[number];

/** Numbers that a block of the Hamiltonian is made of once time reversal is used. */
export type Algebra = 'real' | 'complex' | 'quaternion';

/** One row of one symmetry species among the states of any J. */
export interface Species {
  readonly name: string;
  /** States of equal energy that go with each state of this row, itself included (spin not counted). */
  readonly degeneracy: number;
  readonly algebra: Algebra;
  /**
   * How the other states are had from an eigenvector: `none`, its time reverse, or `rotations`, which takes more than
   * time reversal (cubic and spherical rows; use the rows of a subgroup where vectors are wanted).
   */
  readonly partner: 'none' | 'time-reversal' | 'rotations';
  readonly states: (J: number) => AdaptedVector[];
}

const kept = (states: readonly (AdaptedVector | null)[]): AdaptedVector[] =>
  states.filter((state) => state !== null);

const range = (from: number, to: number, step = 1): number[] => {
  const list: number[] = [];
  for (let value = from; value <= to; value += step) list.push(value);
  return list;
};

/** M ≥ 0 with M ≡ remainder (mod n). */
const magnitudes = (J: number, n: number, remainder: number): number[] =>
  range(J % 1, J).filter((M) => M % n === remainder);
/** All M ≡ remainder (mod n), of either sign. */
const rowOf = (J: number, n: number, remainder: number): number[] =>
  range(-J, J).filter((M) => (((M - remainder) % n) + n) % n === 0);

const real = (
  name: string,
  states: (J: number) => AdaptedVector[],
  degeneracy = 1,
  partner: Species['partner'] = degeneracy === 1 ? 'none' : 'time-reversal',
): Species => ({ name, degeneracy, algebra: 'real', partner, states });

const cosines = (name: string, n: number, remainder: number): Species =>
  real(name, (J) => kept(magnitudes(J, n, remainder).map((M) => cosineState(J, M))));
const sines = (name: string, n: number, remainder: number): Species =>
  real(name, (J) => kept(magnitudes(J, n, remainder).map((M) => sineState(J, M))));
const both = (name: string, n: number, remainder: number): Species =>
  real(name, (J) => kept(magnitudes(J, n, remainder).flatMap((M) => [cosineState(J, M), sineState(J, M)])));
const row = (name: string, n: number, remainder: number): Species =>
  real(name, (J) => rowOf(J, n, remainder).map(plainState), 2);
const axial = (name: string, M: number): Species => real(name, (J) => (M <= J ? [plainState(M)] : []), 2);

/** Species of integer J: terms without spin-orbit coupling, or all states of an even number of electrons. */
function integerSpecies(group: FieldGroup, largestJ: number): Species[] {
  switch (group) {
    case 'SO3':
      return range(0, largestJ).map((J) =>
        real(
          `${J}`,
          (other) => (other === J ? [plainState(J)] : []),
          2 * J + 1,
          J === 0 ? 'none' : 'rotations',
        ),
      );
    case 'O':
      return cubicIrreps.map((irrep) =>
        real(
          irrep,
          (J) => cubicStates(J, irrep),
          cubicDimension[irrep],
          cubicDimension[irrep] === 1 ? 'none' : 'rotations',
        ),
      );
    case 'Dinf':
      return [
        real('Σ+', (J) => kept([cosineState(J, 0)])),
        real('Σ-', (J) => kept([sineState(J, 0)])),
        ...range(1, largestJ).map((M) => axial(`|${M}|`, M)),
      ];
    case 'D4':
      return [cosines('A1', 4, 0), sines('A2', 4, 0), cosines('B1', 4, 2), sines('B2', 4, 2), row('E', 4, 1)];
    case 'D3':
      return [cosines('A1', 3, 0), sines('A2', 3, 0), row('E', 3, 1)];
    case 'D2':
      return [cosines('A', 2, 0), sines('B1', 2, 0), cosines('B2', 2, 1), sines('B3', 2, 1)];
    case 'C2':
      return [both('A', 2, 0), both('B', 2, 1)];
    case 'C1':
      return [both('A', 1, 0)];
  }
}

/** Species of half-integer J, in Bethe's numbering where the group has one. */
function halfIntegerSpecies(group: FieldGroup, largestJ: number): Species[] {
  switch (group) {
    case 'SO3':
      return range(0.5, largestJ).map((J) =>
        real(`${2 * J}/2`, (other) => (other === J ? [plainState(J)] : []), 2 * J + 1, 'rotations'),
      );
    case 'O':
      return cubicSpinorSpecies.map(({ name, degeneracy, states }) =>
        real(name, states, degeneracy, 'rotations'),
      );
    case 'Dinf':
      return range(0.5, largestJ).map((M) => axial(`|${2 * M}/2|`, M));
    case 'D4':
      return [row('G6', 4, 0.5), row('G7', 4, 2.5)];
    case 'D3':
      return [
        row('G4', 3, 0.5),
        {
          name: 'G5',
          degeneracy: 2,
          algebra: 'complex',
          partner: 'time-reversal',
          states: (J) => magnitudes(J, 3, 1.5).map((M) => turnedState(J, M)),
        },
      ];
    case 'D2':
      return [row('G5', 2, 0.5)];
    case 'C2':
      return [{ ...row('G3', 2, 0.5), algebra: 'complex' }];
    case 'C1':
      return [
        {
          name: 'G2',
          degeneracy: 2,
          algebra: 'quaternion',
          partner: 'time-reversal',
          states: (J) => range(0.5, J).map(plainState),
        },
      ];
  }
}

/** The rows in which a Hamiltonian of this symmetry falls apart, for J up to `largestJ` (integer or half-integer). */
export function speciesOf(group: FieldGroup, largestJ: number): Species[] {
  return Number.isInteger(largestJ) ? integerSpecies(group, largestJ) : halfIntegerSpecies(group, largestJ);
}

/**
 * Rows about z when a magnetic field along z breaks time reversal: M ≡ r (mod `order`), for order 0 each M by itself. There
 * are no partners left.
 */
export function magneticSpecies(order: number, algebra: 'real' | 'complex', largestJ: number): Species[] {
  const plain = (name: string, states: (J: number) => AdaptedVector[]): Species => ({
    ...{ name, degeneracy: 1, algebra, partner: 'none', states },
  });
  if (order === 0) {
    return range(-largestJ, largestJ).map((M) =>
      plain(`M=${M}`, (J) => (Math.abs(M) <= J ? [plainState(M)] : [])),
    );
  }
  return range(largestJ % 1, order - 0.5).map((remainder) =>
    plain(`M=${remainder}`, (J) => rowOf(J, order, remainder).map(plainState)),
  );
}

const even = (k: 2 | 4, q: number): FieldComponent => ({ k, q, part: 're' });
const odd = (k: 2 | 4, q: number): FieldComponent => ({ k, q, part: 'im' });
const axialComponents = [even(2, 0), even(4, 0)];
const rhombicComponents = [...axialComponents, even(2, 2), even(4, 2), even(4, 4)];
const monoclinicComponents = [...rhombicComponents, odd(2, 2), odd(4, 2), odd(4, 4)];

/** The tensor components that a field of each symmetry may have in its own frame. */
export const fieldComponents: Readonly<Record<FieldGroup, readonly FieldComponent[]>> = {
  SO3: [],
  O: [even(4, 0), even(4, 4)],
  Dinf: axialComponents,
  D4: [...axialComponents, even(4, 4)],
  D3: [...axialComponents, even(4, 3)],
  D2: rhombicComponents,
  C2: monoclinicComponents,
  C1: [...monoclinicComponents, ...[even(2, 1), odd(2, 1), even(4, 1), odd(4, 1), even(4, 3), odd(4, 3)]],
};

/** The group whose rows give eigenvectors: partners by time reversal alone. */
export const vectorGroup = (group: FieldGroup): FieldGroup =>
  group === 'SO3' ? 'Dinf' : group === 'O' ? 'D4' : group;
