import { vectorGroup } from '../adaptation/species';
import { symmetryBlocks } from '../blocks/symmetryBlocks';
import { type FieldFrame } from '../field/fieldFrame';
import { hamiltonianParameters, type CheckedProblem } from '../problem';
import { type Amplitudes } from '../states/amplitudes';
import { blockLevels } from '../states/blockLevels';

/** States that must be degenerate by symmetry alone, or happen to be: one energy, one spin. */
export interface LevelSet {
  /** cm⁻¹, without the trace of the field. */
  readonly energy: number;
  /** Null with spin-orbit coupling. */
  readonly S: number | null;
  /** In the laboratory; the spin is left aside where S is given. */
  readonly states: readonly Amplitudes[];
}

/** All states of a problem without magnetic field, gathered where energies are within `near` of each other; ascending. */
export function levelSets(problem: CheckedProblem, frame: FieldFrame, near: number): LevelSet[] {
  const parameters = hamiltonianParameters(problem, frame.tensors);
  const blocks = symmetryBlocks(problem.electrons, vectorGroup(frame.group), problem.zeta !== 0);
  const single = blocks.flatMap((block) => blockLevels(block, parameters, frame.rotation));
  single.sort((a, b) => (a.S ?? 0) - (b.S ?? 0) || a.energy - b.energy);
  const sets: { energy: number; last: number; S: number | null; states: Amplitudes[] }[] = [];
  for (const { energy, S, states } of single) {
    const before = sets.at(-1);
    if (before !== undefined && before.S === S && energy - before.last <= near) {
      before.states.push(...states);
      before.last = energy;
    } else sets.push({ energy, last: energy, S, states: [...states] });
  }
  return sets.sort((a, b) => a.energy - b.energy);
}
