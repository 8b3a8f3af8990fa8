import { describe, expect, it } from 'vitest';
import { symmetricEigenvalues } from '../../numerics/eigen/symmetric';
import { type CubicIrrep } from '../types';
import { blockEnergies } from './blockEnergies';
import { cubicBlocks } from './cubicBlocks';

/**
 * Strong-field matrices of Y. Tanabe and S. Sugano, J. Phys. Soc. Jpn 9, 753 (1954), recalled, not looked up: number of e
 * electrons, diagonal [B, C] and off-diagonal [row, column, B, C]; the splitting is 10Dq per e electron.
 */
interface PublishedMatrix {
  readonly electrons: number;
  readonly multiplicity: number;
  readonly irrep: CubicIrrep;
  readonly e: readonly number[];
  readonly diagonal: readonly (readonly [B: number, C: number])[];
  readonly coupling: readonly (readonly [row: number, column: number, B: number, C: number])[];
}

const s2 = Math.SQRT2;
const s3 = Math.sqrt(3);
const s6 = Math.sqrt(6);

const matrices: readonly PublishedMatrix[] = [
  { electrons: 2, multiplicity: 3, irrep: 'A2', e: [2], diagonal: [[-8, 0]], coupling: [] },
  { electrons: 2, multiplicity: 3, irrep: 'T2', e: [1], diagonal: [[-8, 0]], coupling: [] },
  {
    ...{ electrons: 2, multiplicity: 3, irrep: 'T1', e: [0, 1] },
    diagonal: [
      [-5, 0],
      [4, 0],
    ],
    coupling: [[0, 1, 6, 0]],
  },
  {
    ...{ electrons: 2, multiplicity: 1, irrep: 'A1', e: [0, 2] },
    diagonal: [
      [10, 5],
      [8, 4],
    ],
    coupling: [[0, 1, 2 * s6, s6]],
  },
  {
    ...{ electrons: 2, multiplicity: 1, irrep: 'E', e: [0, 2] },
    diagonal: [
      [1, 2],
      [0, 2],
    ],
    coupling: [[0, 1, -2 * s3, 0]],
  },
  {
    ...{ electrons: 2, multiplicity: 1, irrep: 'T2', e: [0, 1] },
    diagonal: [
      [1, 2],
      [0, 2],
    ],
    coupling: [[0, 1, 2 * s3, 0]],
  },
  { electrons: 2, multiplicity: 1, irrep: 'T1', e: [1], diagonal: [[4, 2]], coupling: [] },
  { electrons: 3, multiplicity: 4, irrep: 'A2', e: [0], diagonal: [[-15, 0]], coupling: [] },
  { electrons: 3, multiplicity: 4, irrep: 'T2', e: [1], diagonal: [[-15, 0]], coupling: [] },
  {
    ...{ electrons: 3, multiplicity: 4, irrep: 'T1', e: [1, 2] },
    diagonal: [
      [-3, 0],
      [-12, 0],
    ],
    coupling: [[0, 1, 6, 0]],
  },
  { electrons: 3, multiplicity: 2, irrep: 'A1', e: [1], diagonal: [[-11, 3]], coupling: [] },
  { electrons: 3, multiplicity: 2, irrep: 'A2', e: [1], diagonal: [[9, 3]], coupling: [] },
  {
    ...{ electrons: 3, multiplicity: 2, irrep: 'E', e: [0, 1, 1, 3] },
    diagonal: [
      [-6, 3],
      [8, 6],
      [-1, 3],
      [-8, 4],
    ],
    coupling: [
      [0, 1, -6 * s2, 0],
      [0, 2, -3 * s2, 0],
      [1, 2, 10, 0],
      [1, 3, 2 * s3, s3],
      [2, 3, 2 * s3, 0],
    ],
  },
  {
    ...{ electrons: 3, multiplicity: 2, irrep: 'T2', e: [0, 1, 1, 2, 2] },
    diagonal: [
      [0, 5],
      [-6, 3],
      [4, 3],
      [6, 5],
      [-2, 3],
    ],
    coupling: [
      [0, 1, -3 * s3, 0],
      [0, 2, -5 * s3, 0],
      [0, 3, 4, 2],
      [0, 4, 2, 0],
      [1, 2, 3, 0],
      [1, 3, -3 * s3, 0],
      [1, 4, -3 * s3, 0],
      [2, 3, -s3, 0],
      [2, 4, s3, 0],
      [3, 4, 10, 0],
    ],
  },
];

describe('eigenvalues of the matrices of Tanabe and Sugano', () => {
  it.each(matrices.map((each) => [`${each.multiplicity}${each.irrep} of d${each.electrons}`, each] as const))(
    '%s',
    (_, { electrons, multiplicity, irrep, e, diagonal, coupling }) => {
      const block = cubicBlocks(electrons).find(
        (each) => each.irrep === irrep && 2 * each.S + 1 === multiplicity,
      )!;
      expect(block.size).toBe(e.length);
      for (const [tenDq, B, C] of [
        [17_400, 725, 2900],
        [8000, 1000, 4500],
        [30_000, 400, 2600],
        [0, 766, 3655],
      ] as const) {
        const n = e.length;
        const matrix = new Float64Array(n * n);
        diagonal.forEach(
          ([b, c], i) => (matrix[i * n + i] = tenDq * (e[i]! - 0.4 * electrons) + b * B + c * C),
        );
        coupling.forEach(([i, j, b, c]) => (matrix[j * n + i] = b * B + c * C));
        const mine = blockEnergies(block, electrons, tenDq, B, C);
        symmetricEigenvalues(matrix, n).forEach((energy, i) => expect(mine[i]).toBeCloseTo(energy, 6));
      }
    },
  );
});
