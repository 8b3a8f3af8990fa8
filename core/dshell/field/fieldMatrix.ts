import { SpinhueError } from '../../errors';
import { requireFinite, requireNotNegative } from '../checkProblem';
import { angularOverlapField } from './angularOverlap';
import { type AngularOverlapLigand, type FieldSpec } from './fieldSpec';
import { type FieldMatrix } from './tensorComponents';

const diagonal = (values: readonly number[]): number[][] =>
  values.map((value, a) => values.map((_, b) => (a === b ? value : 0)));

/**
 * The symmetric 5×5 of a field over [z2, x2-y2, xy, xz, yz], cm⁻¹; not made traceless. Throws `unknown-field-value`,
 * `missing-field`, `not-finite`, `not-symmetric`, `out-of-range` or `ligands-too-close`.
 */
export function fieldMatrix(spec: FieldSpec): number[][] {
  switch (spec.type) {
    case 'oct':
      return diagonal(cubic(spec.tenDq));
    case 'tet':
    case 'cube':
      return diagonal(cubic(spec.tenDq).map((energy) => -energy));
    case 'tetragonal':
      return diagonal(tetragonal(spec));
    case 'trigonal':
      return trigonal(spec);
    case 'aom':
      return angularOverlapField(spec.ligands);
    case 'sqp':
      return squarePlanar(spec);
    case 'matrix':
      return checkedMatrix(spec.matrix);
    default:
      throw new SpinhueError({
        code: 'unknown-field-value',
        message: `field type ${JSON.stringify((spec as { type?: unknown }).type)} is not known`,
        field: 'field.type',
        remedy: 'use one of oct, tet, cube, tetragonal, trigonal, aom, sqp, matrix',
      });
  }
}

function cubic(tenDq: number): number[] {
  requireNotNegative(tenDq, 'field.tenDq');
  return [0.6, 0.6, -0.4, -0.4, -0.4].map((share) => share * tenDq);
}

function tetragonal({ tenDq, Ds, Dt }: { tenDq: number; Ds: number; Dt: number }): number[] {
  requireFinite(Ds, 'field.Ds');
  requireFinite(Dt, 'field.Dt');
  const axial = [-2 * Ds - 6 * Dt, 2 * Ds - Dt, 2 * Ds - Dt, -Ds + 4 * Dt, -Ds + 4 * Dt];
  return cubic(tenDq).map((energy, a) => energy + axial[a]!);
}

/** An octahedron that stands on a face: threefold axis z, one ligand in the xz plane. */
const standingOctahedron: readonly AngularOverlapLigand[] = [0, 60, 120, 180, 240, 300].map((phi, i) => {
  const polar = (Math.acos(1 / Math.sqrt(3)) * 180) / Math.PI;
  return { theta: i % 2 === 0 ? polar : 180 - polar, phi, e_sigma: 1 / 3 };
});

/** Dσ and Dτ shift the orbitals of m = 0, ±1, ±2 about the threefold axis as Ds and Dt do about a fourfold one. */
function trigonal(spec: { tenDq: number; Dsigma: number; Dtau: number }): number[][] {
  const { tenDq, Dsigma, Dtau } = spec;
  requireNotNegative(tenDq, 'field.tenDq');
  requireFinite(Dsigma, 'field.Dsigma');
  requireFinite(Dtau, 'field.Dtau');
  const axial = tetragonal({ tenDq: 0, Ds: Dsigma, Dt: Dtau });
  const octahedral = angularOverlapField(standingOctahedron);
  return octahedral.map((row, a) =>
    row.map((value, b) => tenDq * (value - (a === b ? 0.4 : 0)) + (a === b ? axial[a]! : 0)),
  );
}

function squarePlanar(spec: Extract<FieldSpec, { type: 'sqp' }>): number[][] {
  const { e_sigma, e_pi_perp, e_pi_par, e_ds = 0 } = spec;
  requireFinite(e_sigma, 'field.e_sigma');
  requireFinite(e_pi_perp, 'field.e_pi_perp');
  requireFinite(e_pi_par, 'field.e_pi_par');
  requireNotNegative(e_ds, 'field.e_ds');
  return diagonal([e_sigma - 4 * e_ds, 3 * e_sigma, 4 * e_pi_par, 2 * e_pi_perp, 2 * e_pi_perp]);
}

function checkedMatrix(matrix: FieldMatrix): number[][] {
  const isSquare =
    Array.isArray(matrix as unknown) &&
    matrix.length === 5 &&
    matrix.every((row) => Array.isArray(row as unknown) && row.length === 5);
  if (!isSquare) {
    throw new SpinhueError({
      code: 'wrong-type',
      message: 'the field matrix is not 5 x 5',
      field: 'field.matrix',
      remedy: 'give five rows of five numbers over z2, x2-y2, xy, xz, yz',
    });
  }
  matrix.forEach((row, a) => row.forEach((value, b) => requireFinite(value, `field.matrix[${a}][${b}]`)));
  const largest = Math.max(...matrix.flat().map(Math.abs));
  for (let a = 0; a < 5; a++) {
    for (let b = 0; b < a; b++) {
      if (Math.abs(matrix[a]![b]! - matrix[b]![a]!) <= 1e-9 * largest) continue;
      throw new SpinhueError({
        code: 'not-symmetric',
        message: `the field matrix has ${matrix[a]![b]} at [${a}][${b}] and ${matrix[b]![a]} at [${b}][${a}]`,
        field: `field.matrix[${a}][${b}]`,
        remedy: 'give a symmetric matrix',
      });
    }
  }
  return matrix.map((row, a) => row.map((value, b) => 0.5 * (value + matrix[b]![a]!)));
}
