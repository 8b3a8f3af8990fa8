import { hermitianEigenvalues } from '../../numerics/eigen/hermitian';
import { quaternionEigenvalues } from '../../numerics/eigen/quaternion';
import { symmetricEigenvalues } from '../../numerics/eigen/symmetric';
import { type FieldGroup } from '../adaptation/species';
import { assemble, type Parameters } from '../blocks/assemble';
import { algebraWidth, symmetryBlocks, type SymmetryBlock } from '../blocks/symmetryBlocks';
import { fieldFrame, inStandardFrame, type FieldFrame } from '../field/fieldFrame';
import { magneticProblem } from '../magneticProblem';
import { hamiltonianParameters, type CheckedProblem } from '../problem';

/** Eigenvalues of one block, ascending, without the trace of the field. */
export interface BlockLevels {
  readonly block: SymmetryBlock;
  readonly values: Float64Array;
}

/**
 * Eigenvalues of the whole shell, block by block. The rows are those of the symmetry found in the field, or of `group` in the
 * laboratory frame where a field is known to have it. Throws `no-convergence`.
 */
export function solveBlocks(problem: CheckedProblem, group?: FieldGroup): BlockLevels[] {
  if (problem.zeeman !== null) {
    const { blocks, parameters } = magneticProblem(problem, problem.zeeman);
    return blocks.map((block) => ({ block, values: blockValues(block, parameters) }));
  }
  const frame: FieldFrame =
    group === undefined ? fieldFrame(problem.V) : { ...inStandardFrame(problem.V), group };
  const parameters = hamiltonianParameters(problem, frame.tensors);
  return symmetryBlocks(problem.electrons, frame.group, problem.zeta !== 0).map((block) => ({
    block,
    values: blockValues(block, parameters),
  }));
}

let scratch = new Float64Array(0);

function blockValues(block: SymmetryBlock, parameters: Parameters): Float64Array {
  const length = block.size * block.size * algebraWidth[block.species.algebra];
  if (scratch.length < length) scratch = new Float64Array(length);
  const matrix = assemble(block, parameters, scratch);
  switch (block.species.algebra) {
    case 'real':
      return symmetricEigenvalues(matrix, block.size);
    case 'complex':
      return hermitianEigenvalues(matrix, block.size);
    case 'quaternion':
      return quaternionEigenvalues(matrix, block.size);
  }
}
