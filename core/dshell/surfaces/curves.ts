import { blockHamiltonian } from '../cubic/blockEnergies';
import { cubicBlocks } from '../cubic/cubicBlocks';
import { symmetricEigensystem } from '../../numerics/eigen/symmetric';
import { type CubicGeometry, type CubicIrrep } from '../types';

/** One eigenvalue of one block, followed along 10Dq/B. */
export interface LevelCurve {
  readonly multiplicity: number;
  readonly irrep: CubicIrrep;
  readonly degeneracy: number;
  /** 0 for the lowest eigenvalue of its block. */
  readonly order: number;
}

/** The curves of d^N, spin by spin from the highest, block by block, ascending within a block. */
export function levelCurves(electrons: number): LevelCurve[] {
  return cubicBlocks(electrons).flatMap(({ S, irrep, degeneracy, size }) =>
    Array.from({ length: size }, (_, order) => ({ multiplicity: 2 * S + 1, irrep, degeneracy, order })),
  );
}

/** Energies of all curves at one 10Dq/B in units of B, with their derivatives with respect to 10Dq/B and to C/B. */
export interface CurvePoint {
  readonly x: number;
  readonly energy: Float64Array;
  readonly slope: Float64Array;
  readonly slopeC: Float64Array;
}

export function curvePoint(
  electrons: number,
  geometry: CubicGeometry,
  cOverB: number,
  x: number,
): CurvePoint {
  const blocks = cubicBlocks(electrons);
  const count = blocks.reduce((sum, { size }) => sum + size, 0);
  const sign = geometry === 'tetrahedral' ? -1 : 1;
  const energy = new Float64Array(count);
  const slope = new Float64Array(count);
  const slopeC = new Float64Array(count);
  let at = 0;
  for (const block of blocks) {
    const { size, eCount, repulsionC } = block;
    const matrix = blockHamiltonian(block, electrons, sign * x, 1, cOverB);
    const { values, vectors } = symmetricEigensystem(matrix, size);
    for (let k = 0; k < size; k++, at++) {
      energy[at] = values[k]!;
      for (let i = 0; i < size; i++) {
        const c = vectors[k * size + i]!;
        slope[at]! += sign * c * c * (eCount[i]! - 0.4 * electrons);
        for (let j = 0; j < size; j++) slopeC[at]! += c * vectors[k * size + j]! * repulsionC[i * size + j]!;
      }
    }
  }
  return { x, energy, slope, slopeC };
}
