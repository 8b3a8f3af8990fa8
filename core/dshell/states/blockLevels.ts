import { hermitianEigensystem } from '../../numerics/eigen/hermitian';
import { quaternionEigensystem } from '../../numerics/eigen/quaternion';
import { symmetricEigensystem } from '../../numerics/eigen/symmetric';
import { type Quaternion } from '../../symmetry';
import { assemble, type Parameters } from '../blocks/assemble';
import { algebraWidth, type SymmetryBlock } from '../blocks/symmetryBlocks';
import { amplitudesOf, carriedBy, reversed, type Amplitudes } from './amplitudes';

/** An eigenvalue of one block with its states: its own row, and the time reverse where that is another one. */
export interface BlockLevel {
  readonly energy: number;
  /** Null with spin-orbit coupling; else the spin is left out of the states. */
  readonly S: number | null;
  readonly states: readonly Amplitudes[];
}

const solvers = {
  real: symmetricEigensystem,
  complex: hermitianEigensystem,
  quaternion: quaternionEigensystem,
} as const;

/** Solves one block; states are carried from the frame `rotation` of the block into the laboratory. */
export function blockLevels(
  block: SymmetryBlock,
  parameters: Parameters,
  rotation: Quaternion,
): BlockLevel[] {
  const { species, size, basis, S } = block;
  const width = algebraWidth[species.algebra];
  const { values, vectors } = solvers[species.algebra](assemble(block, parameters), size);
  const carry = carriedBy(rotation);
  return Array.from(values.subarray(0, size), (energy, k) => {
    const own = amplitudesOf(basis, vectors.subarray(k * size * width, (k + 1) * size * width), width);
    const set = species.partner === 'time-reversal' ? [own, reversed(own)] : [own];
    return { energy, S, states: set.map(carry) };
  });
}
