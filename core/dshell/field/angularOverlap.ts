import { SpinhueError } from '../../errors';
import { compose, dRotation, rotationAbout } from '../../symmetry';
import { requireFinite, requireNotNegative } from '../checkProblem';
import { type AngularOverlapLigand } from './fieldSpec';

const degree = Math.PI / 180;
/** Two donors nearer than this cannot be two ligands of one metal, chelates included. */
const closestAngle = 30;

/** Weights of the five d orbitals in the three that a ligand in the given place overlaps with. */
export interface OverlapFactors {
  readonly sigma: readonly number[];
  readonly piX: readonly number[];
  readonly piY: readonly number[];
}

/**
 * Angular overlap factors over [z2, x2-y2, xy, xz, yz]: the local z2, xz and yz orbitals of a ligand frame turned by
 * Rz(φ) Ry(θ) Rz(ψ) (C. E. Schäffer, Struct. Bonding 5, 68, 1968).
 */
export function overlapFactors({ theta, phi, psi = 0 }: AngularOverlapLigand): OverlapFactors {
  const turn = compose(
    compose(rotationAbout([0, 0, 1], phi * degree), rotationAbout([0, 1, 0], theta * degree)),
    rotationAbout([0, 0, 1], psi * degree),
  );
  const D = dRotation(turn);
  const column = (b: number): number[] => D.map((row) => row[b]!);
  return { sigma: column(0), piX: column(3), piY: column(4) };
}

/**
 * Σ over ligands of e_σ f_σ f_σᵀ + e_πx f_πx f_πxᵀ + e_πy f_πy f_πyᵀ, less g gᵀ with g = Σ √e_ds f_σ for the mixing of the
 * metal s orbital (L. G. Vanquickenborne and A. Ceulemans, Inorg. Chem. 20, 796, 1981). cm⁻¹.
 * Throws `missing-field` for no ligands, `ligands-too-close`, `not-finite`, `out-of-range`.
 */
export function angularOverlapField(
  ligands: readonly AngularOverlapLigand[],
  field = 'field.ligands',
): number[][] {
  checkLigands(ligands, field);
  const V = Array.from({ length: 5 }, () => [0, 0, 0, 0, 0]);
  const mixing = [0, 0, 0, 0, 0];
  for (const ligand of ligands) {
    const { sigma, piX, piY } = overlapFactors(ligand);
    const { e_sigma, e_pi_x = 0, e_pi_y = 0, e_ds = 0 } = ligand;
    for (let a = 0; a < 5; a++) {
      mixing[a]! += Math.sqrt(e_ds) * sigma[a]!;
      for (let b = 0; b < 5; b++) {
        V[a]![b]! +=
          e_sigma * sigma[a]! * sigma[b]! + e_pi_x * piX[a]! * piX[b]! + e_pi_y * piY[a]! * piY[b]!;
      }
    }
  }
  return V.map((row, a) => row.map((value, b) => value - mixing[a]! * mixing[b]!));
}

function checkLigands(ligands: readonly AngularOverlapLigand[], field: string): void {
  if (!Array.isArray(ligands) || ligands.length === 0) {
    throw new SpinhueError({
      code: 'missing-field',
      message: 'the angular overlap field has no ligands',
      field,
      remedy: 'list at least one ligand with theta, phi and e_sigma',
    });
  }
  ligands.forEach((ligand, i) => {
    for (const name of ['theta', 'phi', 'psi', 'e_sigma', 'e_pi_x', 'e_pi_y', 'e_ds'] as const) {
      const value = ligand[name];
      const optional = name !== 'theta' && name !== 'phi' && name !== 'e_sigma';
      if (value === undefined && optional) continue;
      if (name === 'e_ds') requireNotNegative(value!, `${field}[${i}].${name}`);
      else requireFinite(value!, `${field}[${i}].${name}`);
    }
  });
  const directions = ligands.map(direction);
  directions.forEach((u, i) => {
    for (let j = 0; j < i; j++) {
      const v = directions[j]!;
      const cosine = u[0] * v[0] + u[1] * v[1] + u[2] * v[2];
      const angle = Math.acos(Math.min(1, Math.max(-1, cosine))) / degree;
      if (angle >= closestAngle - 1e-9) continue;
      throw new SpinhueError({
        code: 'ligands-too-close',
        message: `ligands ${j} and ${i} are ${angle.toFixed(1)} degrees apart; at least ${closestAngle} are needed`,
        field: `${field}[${i}]`,
        remedy: 'move one of them, or describe the pair as one ligand',
      });
    }
  });
}

function direction({ theta, phi }: AngularOverlapLigand): [number, number, number] {
  const [t, p] = [theta * degree, phi * degree];
  return [Math.sin(t) * Math.cos(p), Math.sin(t) * Math.sin(p), Math.cos(t)];
}
