import { type Quaternion } from '../../symmetry';
import { vectorGroup } from '../adaptation/species';
import { type Parameters } from '../blocks/assemble';
import { symmetryBlocks, type SymmetryBlock } from '../blocks/symmetryBlocks';
import { fieldFrame } from '../field/fieldFrame';
import { fieldTrace } from '../field/tensorComponents';
import { freeIon } from '../freeIon/reducedElements';
import { magneticProblem } from '../magneticProblem';
import { checkProblem, hamiltonianParameters, type CheckedProblem, type LevelProblem } from '../problem';
import { type Amplitudes } from './amplitudes';
import { blockLevels } from './blockLevels';
import { determinantBasis, type DeterminantBasis } from './determinantBasis';
import { determinantWriter } from './toDeterminants';

/** All C(10, N) states with their vectors over the determinants of real orbitals. */
export interface SolvedStates {
  readonly basis: DeterminantBasis;
  /** Number of states. */
  readonly count: number;
  /** Absolute with A = 0 and the field as given, cm⁻¹, ascending. */
  readonly energies: Float64Array;
  /** Twice the spin of each state; null with spin-orbit coupling or in a magnetic field. */
  readonly twiceSpin: Int8Array | null;
  /** Row k of length `count`: the orthonormal state of `energies[k]`. */
  readonly re: Float64Array;
  readonly im: Float64Array;
  /** Row k of length terms: share of each free-ion term (order of `freeIon(N).terms`) in state k; adds up to 1. */
  readonly termWeights: Float64Array;
  /** The free-ion terms those shares belong to. */
  readonly terms: readonly { readonly S: number; readonly L: number; readonly seniority: number }[];
}

interface RawState {
  readonly energy: number;
  readonly S: number | null;
  readonly mS: number | null;
  readonly amplitudes: Amplitudes;
}

/**
 * Energies and eigenvectors of the complete problem in the laboratory frame. Degenerate states span their level; which
 * orthonormal set is taken within a level is not defined. Throws what `levels` throws.
 */
export function solveStates(problem: LevelProblem): SolvedStates {
  const checked = checkProblem(problem);
  const raw = checked.zeeman === null ? symmetricStates(checked) : magneticStates(checked);
  raw.sort((a, b) => a.energy - b.energy);
  const { electrons, V } = checked;
  const count = raw.length;
  const centre = (fieldTrace(V) * electrons) / 5;
  const { terms } = freeIon(electrons);
  const re = new Float64Array(count * count);
  const im = new Float64Array(count * count);
  const termWeights = new Float64Array(count * terms.length);
  const writer = determinantWriter(electrons);
  raw.forEach(({ amplitudes, mS }, k) => {
    writer.write(amplitudes, mS, re, im, k * count);
    amplitudes.multiplets.forEach(({ term }, which) => {
      const [ar, ai] = [amplitudes.re[which]!, amplitudes.im[which]!];
      for (let at = 0; at < ar.length; at++)
        termWeights[k * terms.length + term]! += ar[at]! ** 2 + ai[at]! ** 2;
    });
  });
  return {
    basis: determinantBasis(electrons),
    count,
    energies: Float64Array.from(raw, ({ energy }) => energy + centre),
    twiceSpin: raw[0]!.S === null ? null : Int8Array.from(raw, ({ S }) => 2 * S!),
    re,
    im,
    termWeights,
    terms: terms.map(({ S, L, seniority }) => ({ S, L, seniority })),
  };
}

function symmetricStates(problem: CheckedProblem): RawState[] {
  const frame = fieldFrame(problem.V);
  const parameters = hamiltonianParameters(problem, frame.tensors);
  const blocks = symmetryBlocks(problem.electrons, vectorGroup(frame.group), problem.zeta !== 0);
  return blocks.flatMap((block) => blockStates(block, parameters, frame.rotation));
}

function magneticStates(problem: CheckedProblem): RawState[] {
  const { blocks, parameters, rotation } = magneticProblem(problem, problem.zeeman!);
  return blocks.flatMap((block) => blockStates(block, parameters, rotation));
}

/** Every state of a block, one for each M_S where the spin is left aside. */
function blockStates(block: SymmetryBlock, parameters: Parameters, rotation: Quaternion): RawState[] {
  return blockLevels(block, parameters, rotation).flatMap(({ energy, S, states }) =>
    states.flatMap((amplitudes): RawState[] => {
      if (S === null) return [{ energy, S, mS: null, amplitudes }];
      return Array.from({ length: 2 * S + 1 }, (_, i) => ({ energy, S, mS: S - i, amplitudes }));
    }),
  );
}
