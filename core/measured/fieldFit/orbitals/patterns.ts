import type { GeometryId } from '../../../record/composition';
import type { FieldMatrix } from '../../../dshell';

/** d orbitals that symmetry keeps together; the last set of a family is where energies are counted from. */
export interface OrbitalFamily {
  readonly names: readonly string[];
  /** The 5 x 5 field over [z2, x2-y2, xy, xz, yz] for energies of all sets but the last. */
  readonly field: (energies: ArrayLike<number>) => FieldMatrix;
  /** Whether the engine's D4h names hold here; else levels are known by spin and order only. */
  readonly named: boolean;
}

const diagonal = (z2: number, x2y2: number, xy: number): FieldMatrix => [
  [z2, 0, 0, 0, 0],
  [0, x2y2, 0, 0, 0],
  [0, 0, xy, 0, 0],
  [0, 0, 0, 0, 0],
  [0, 0, 0, 0, 0],
];

const fourfold: OrbitalFamily = {
  names: ['z2', 'x2-y2', 'xy', 'xz, yz'],
  field: (e) => diagonal(e[0]!, e[1]!, e[2]!),
  named: true,
};
const axial: OrbitalFamily = {
  names: ['z2', 'x2-y2, xy', 'xz, yz'],
  field: (e) => diagonal(e[0]!, e[1]!, e[1]!),
  named: false,
};

/**
 * Typical orbital energies of a geometry in units of the largest splitting, as sigma-only angular overlap gives them with
 * a little pi donation (J. K. Burdett, Molecular Shapes, 1980; from memory). They are starts of a fit, not results.
 */
export interface Pattern {
  readonly family: OrbitalFamily;
  readonly starts: readonly (readonly number[])[];
}

export const patterns: Readonly<Partial<Record<GeometryId | 'tetragonal', Pattern>>> = {
  'square-planar': {
    family: fourfold,
    starts: [
      [0.1, 1, 0.12],
      [-0.15, 1, 0.15],
      [0.35, 1, 0.1],
      [0.05, 1, -0.08],
    ],
  },
  tetragonal: {
    family: fourfold,
    starts: [
      [0.75, 1, 0.05],
      [0.5, 1, 0.05],
      [1, 0.75, -0.05],
      [0.3, 1, 0.08],
    ],
  },
  'square-pyramidal': {
    family: fourfold,
    starts: [
      [0.6, 1, 0.05],
      [0.75, 1, 0.2],
      [0.4, 1, 0],
    ],
  },
  'square-antiprismatic': {
    family: axial,
    starts: [
      [-0.6, 0],
      [-0.8, -0.4],
      [0.4, -0.6],
    ],
  },
  'trigonal-bipyramidal': {
    family: axial,
    starts: [
      [1, 0.4],
      [1, 0.25],
    ],
  },
  'trigonal-planar': {
    family: axial,
    starts: [
      [0.3, 1],
      [0.1, 1],
    ],
  },
  'trigonal-prismatic': {
    family: axial,
    starts: [
      [-0.9, -0.8],
      [-0.6, -0.7],
    ],
  },
  'pentagonal-bipyramidal': {
    family: axial,
    starts: [
      [1, 0.75],
      [1, 0.6],
    ],
  },
  linear: {
    family: axial,
    starts: [
      [1, -0.3],
      [0.6, -0.4],
      [0.8, 0],
    ],
  },
};
