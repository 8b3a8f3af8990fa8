import { arrangementGroup, type Vector3 } from '../../symmetry';
import { type AngularOverlapLigand } from '../field/fieldSpec';
import { namingGroup, type NamingGroup } from './namingGroup';

const degree = Math.PI / 180;

const directionOf = ({ theta, phi }: AngularOverlapLigand): Vector3 => [
  Math.sin(theta * degree) * Math.cos(phi * degree),
  Math.sin(theta * degree) * Math.sin(phi * degree),
  Math.cos(theta * degree),
];

/**
 * The point group of the ligands themselves, as it stands: D_3h of a trigonal bipyramid, C_3v of a fac isomer, whose fields taken
 * alone are more symmetric. Ligands with the same parameters are alike. Null where the group is not in the catalogue.
 */
export function ligandGroup(ligands: readonly AngularOverlapLigand[]): NamingGroup | null {
  const kinds = ligands.map(({ e_sigma, e_pi_x = 0, e_pi_y = 0, e_ds = 0 }) =>
    [e_sigma, e_pi_x, e_pi_y, e_ds].join(),
  );
  const { name, frame } = arrangementGroup(ligands.map(directionOf), kinds);
  return namingGroup(name, frame);
}
