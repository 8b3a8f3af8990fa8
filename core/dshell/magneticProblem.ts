import { bohrMagneton_cm1_T } from '../units';
import { magneticBlocks } from './blocks/magneticBlocks';
import { type OperatorName, type SymmetryBlock } from './blocks/symmetryBlocks';
import { magneticFrame, type MagneticFrame } from './field/magneticFrame';
import { hamiltonianParameters, type CheckedProblem, type ZeemanTerm } from './problem';

/** A problem in a magnetic field, in the frame of that field, ready to be solved block by block. */
export interface MagneticProblem extends MagneticFrame {
  readonly blocks: readonly SymmetryBlock[];
  readonly parameters: ReadonlyMap<OperatorName, number>;
}

/** H = H₀ + μ_B |B| (k L_z + g_e S_z) with z along the magnetic field. */
export function magneticProblem(
  problem: CheckedProblem,
  { B_T, k, ge }: Required<ZeemanTerm>,
): MagneticProblem {
  const frame = magneticFrame(problem.V, B_T);
  const parameters = hamiltonianParameters(problem, frame.tensors);
  const strength = bohrMagneton_cm1_T * Math.hypot(...B_T);
  parameters.set('Lz', strength * k);
  parameters.set('Sz', strength * ge);
  return { ...frame, blocks: magneticBlocks(problem.electrons, frame.order, frame.algebra), parameters };
}
