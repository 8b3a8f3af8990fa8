import { irrepNamed, type PointGroup } from '../pointGroup';
import { difference, product, reduce, sum, type Character } from '../representations/character';
import { antisymmetrisedPower } from '../representations/powers';
import { term, type Term } from './term';

/** Electrons in the orbitals of one irreducible representation. */
export interface Shell {
  readonly irrep: string;
  readonly electrons: number;
}

/** Orbital character that goes with each spin; the key is 2S. */
type SpinCharacters = ReadonlyMap<number, Character>;

/**
 * Terms of equivalent electrons. With a electrons of spin up and b of spin down the orbital part is Λᵃ ⊗ Λᵇ; every spin
 * S ≥ (a−b)/2 shows up there once, so the character of spin S is the difference of neighbouring M_S. The exclusion
 * principle is in the antisymmetrised powers Λ (Griffith, The Theory of Transition-Metal Ions, 1961, ch. 9).
 */
function shellCharacters(group: PointGroup, { irrep, electrons }: Shell): SpinCharacters {
  const { characters, dimension } = irrepNamed(group, irrep);
  if (!Number.isInteger(electrons) || electrons < 0 || electrons > 2 * dimension) {
    throw new RangeError(`${irrep} holds 0 to ${2 * dimension} electrons, not ${electrons}`);
  }
  const oneSpin = (k: number): Character =>
    k > dimension ? group.classes.map(() => 0) : antisymmetrisedPower(group, characters, k);
  const bySpin = new Map<number, Character>();
  for (let down = 0; 2 * down <= electrons; down++) {
    const up = electrons - down;
    const here = product(oneSpin(up), oneSpin(down));
    const above = down === 0 ? here.map(() => 0) : product(oneSpin(up + 1), oneSpin(down - 1));
    const character = difference(here, above);
    if (character.some((value) => Math.abs(value) > 1e-9)) bySpin.set(up - down, character);
  }
  return bySpin;
}

/** Terms of inequivalent shells together: direct product of the orbital parts, vector coupling of the spins. */
function couple(a: SpinCharacters, b: SpinCharacters): SpinCharacters {
  const coupled = new Map<number, Character>();
  for (const [spinA, characterA] of a) {
    for (const [spinB, characterB] of b) {
      const orbital = product(characterA, characterB);
      for (let spin = Math.abs(spinA - spinB); spin <= spinA + spinB; spin += 2) {
        const before = coupled.get(spin);
        coupled.set(spin, before === undefined ? orbital : sum(before, orbital));
      }
    }
  }
  return coupled;
}

/** Terms of any set of shells of a point group, highest multiplicity first. Throws on an over-full shell. */
export function termsOfShells(group: PointGroup, shells: readonly Shell[]): Term[] {
  const empty: SpinCharacters = new Map([[0, group.classes.map(() => 1)]]);
  const all = shells.map((shell) => shellCharacters(group, shell)).reduce(couple, empty);
  return [...all]
    .sort(([a], [b]) => b - a)
    .flatMap(([spin, character]) =>
      reduce(group, character).map(({ irrep, times }) =>
        term(spin + 1, irrep.mulliken, irrep.dimension, times),
      ),
    );
}
