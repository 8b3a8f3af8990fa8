import { symmetricEigensystem, symmetricEigenvalues, type Eigensystem } from '../../numerics/eigen/symmetric';
import { type CubicBlock } from './cubicBlocks';

/**
 * The Hamiltonian of one block, row-major. `splitting` is E(e) − E(t2): 10Dq in an octahedral field, −10Dq in a
 * tetrahedral one. The centre of gravity of the one-electron levels is zero.
 */
export function blockHamiltonian(
  block: CubicBlock,
  electrons: number,
  splitting: number,
  B: number,
  C: number,
  alpha = 0,
): Float64Array {
  const { size, repulsionB, repulsionC, orbitalSquare, eCount } = block;
  const matrix = new Float64Array(size * size);
  for (let i = 0; i < size * size; i++) matrix[i] = B * repulsionB[i]! + C * repulsionC[i]!;
  if (alpha !== 0) for (let i = 0; i < size * size; i++) matrix[i]! += alpha * orbitalSquare[i]!;
  for (let i = 0; i < size; i++) matrix[i * size + i]! += splitting * (eCount[i]! - 0.4 * electrons);
  return matrix;
}

export function blockEnergies(
  block: CubicBlock,
  electrons: number,
  splitting: number,
  B: number,
  C: number,
): Float64Array {
  return symmetricEigenvalues(blockHamiltonian(block, electrons, splitting, B, C), block.size);
}

export function blockStates(
  block: CubicBlock,
  electrons: number,
  splitting: number,
  B: number,
  C: number,
  alpha = 0,
): Eigensystem {
  return symmetricEigensystem(blockHamiltonian(block, electrons, splitting, B, C, alpha), block.size);
}
