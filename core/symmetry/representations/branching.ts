import { turned } from '../groups/operation';
import { irrepNamed, type PointGroup } from '../pointGroup';
import { identityRotation, type Quaternion } from '../rotation';
import { reduce, type Character, type Component } from './character';

/**
 * Restricts a character of `group` to `subgroup`. `frame` carries the standard axes of the subgroup onto its axes in the
 * frame of the group: the identity for O_h to D_4h, the turn of z onto [111] for O_h to D_3d.
 * Throws when an operation of the subgroup is not one of the group.
 */
export function restrictCharacter(
  group: PointGroup,
  character: Character,
  subgroup: PointGroup,
  spinor = false,
  frame: Quaternion = identityRotation,
): number[] {
  return subgroup.classes.map(({ representative }) => {
    const element = group.place(turned(representative, frame));
    if (element === undefined) throw new RangeError(`${subgroup.name} so turned is not within ${group.name}`);
    const { index, barred } = group.classOf[element]!;
    return spinor && barred ? -character[index]! : character[index]!;
  });
}

/** What an irreducible representation becomes in a subgroup (descent in symmetry): T2g of O_h is B2g + Eg of D_4h. */
export function descend(
  group: PointGroup,
  mulliken: string,
  subgroup: PointGroup,
  frame: Quaternion = identityRotation,
): Component[] {
  const { characters, spinor } = irrepNamed(group, mulliken);
  return reduce(subgroup, restrictCharacter(group, characters, subgroup, spinor, frame), spinor);
}
