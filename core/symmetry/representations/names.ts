import { type GroupRecipe } from '../groups/catalogue';
import { properRotation, reflection, type Operation } from '../groups/operation';
import { type ClassCharacters } from './classCharacters';

/** Parity under the inversion, or under the mirror plane across the axis where there is no inversion. */
export type ParityMark = 'g' | 'u' | "'" | "''" | '';

/** Reads the character of a representation at an operation; null where the group lacks it. */
export type CharacterAt = (operation: Operation) => number | null;

const near = (a: number, b: number): boolean => Math.abs(a - b) < 1e-6;

export function parityMark(dimension: number, at: CharacterAt, spinor: boolean): ParityMark {
  const inverted = at({ rotation: [1, 0, 0, 0], parity: -1 });
  if (inverted !== null) return inverted > 0 ? 'g' : 'u';
  const mirrored = at(reflection('z'));
  if (mirrored === null || spinor || at(properRotation(2)) !== null) return '';
  return near(mirrored, dimension) ? "'" : "''";
}

function cubicName(dimension: number, at: CharacterAt, secondary: Operation | null): string {
  const letter = dimension === 1 ? 'A' : dimension === 2 ? 'E' : 'T';
  if (secondary === null || letter === 'E') return letter;
  return letter + (at(secondary)! > 0 ? '1' : '2');
}

/** A and B by the principal axis, subscripts by the secondary operation, E_k by the angle (R. S. Mulliken 1955). */
function axialName(dimension: number, at: CharacterAt, recipe: GroupRecipe, lonelyE: boolean): string {
  const { principal, secondary, order } = recipe;
  const turned = principal === null ? 1 : at(principal)!;
  if (dimension === 2) {
    return lonelyE ? 'E' : `E${Math.round((Math.acos(turned / 2) * order) / (2 * Math.PI))}`;
  }
  return (turned > 0 ? 'A' : 'B') + (secondary === null ? '' : at(secondary)! > 0 ? '1' : '2');
}

/** D_2 and D_2h: B1, B2, B3 are symmetric about z, y, x. */
function threeAxisName(at: CharacterAt): string {
  const symmetric = (['z', 'y', 'x'] as const).map((axis) => at(properRotation(2, axis))! > 0);
  return symmetric.every(Boolean) ? 'A' : `B${symmetric.indexOf(true) + 1}`;
}

/**
 * Spinor names by Altmann and Herzig (1994): E_j and F_j where the highest j about the main axis is |j|, A_j for the
 * real one-dimensional representations. E1/2 is the spin 1/2 itself.
 */
function spinorName(dimension: number, at: CharacterAt, recipe: GroupRecipe): string {
  if (recipe.family === 'cubic') {
    if (dimension === 4) return 'F3/2';
    return recipe.secondary !== null && spinorTurn(at, 4)! < 0 ? 'E5/2' : 'E1/2';
  }
  let order = 2 * recipe.order;
  while (order > 1 && spinorTurn(at, order) === null) order--;
  if (order === 1) return dimension === 1 ? 'A1/2' : 'E1/2';
  const twiceJ = Math.round((Math.acos(spinorTurn(at, order)! / dimension) * order) / Math.PI);
  return `${dimension === 1 ? 'A' : 'E'}${twiceJ}/2`;
}

/** Character of the turn by 2π/order about z, by itself or with the inversion, which does nothing to a spin. */
function spinorTurn(at: CharacterAt, order: number): number | null {
  const { rotation } = properRotation(order);
  return at({ rotation, parity: 1 }) ?? at({ rotation, parity: -1 });
}

/** Mulliken name without parity mark. `peers` are all representations of the group. */
export function mullikenStem(
  characters: ClassCharacters,
  at: CharacterAt,
  recipe: GroupRecipe,
  peers: readonly ClassCharacters[],
): string {
  const { dimension, spinor } = characters;
  if (spinor) return spinorName(dimension, at, recipe);
  if (recipe.family === 'cubic') return cubicName(dimension, at, recipe.secondary);
  if (recipe.order === 2 && ['dihedral', 'prismatic'].includes(recipe.family)) return threeAxisName(at);
  const doublets = peers.filter((peer) => peer.dimension === 2 && !peer.spinor).length;
  const parities = parityMark(dimension, at, false) === '' ? 1 : 2;
  return axialName(dimension, at, recipe, doublets === parities);
}
