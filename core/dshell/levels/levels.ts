import { fieldTrace } from '../field/tensorComponents';
import { checkProblem, type CheckedProblem, type LevelProblem } from '../problem';
import { hasRows, naturalLabelGroup, rowLabel, rowsOf, type LabelGroup } from './labelGroup';
import { solveBlocks, type BlockLevels } from './solveBlocks';

export interface Level {
  /** Relative to the ground level, cm⁻¹. */
  readonly energy: number;
  readonly degeneracy: number;
  /** 2S + 1; null with spin-orbit coupling or in a magnetic field. */
  readonly multiplicity: number | null;
  /** Name of the row without the multiplicity (`T2g`, `G8`, `F`, `J=7/2`), or null. */
  readonly label: string | null;
}

export interface LevelOptions {
  /**
   * Which names are wanted. Given, a level is one (S, irrep) and accidental degeneracies stay apart. `null`: no names, a level
   * is a set of one spin within the tolerance. Left out: the most symmetric naming the field admits as it stands.
   */
  readonly labelGroup?: LabelGroup | null;
  /** Energies this close (cm⁻¹) count as one level where there are no names. */
  readonly tolerance?: number;
}

export interface LevelList {
  /** Ascending. */
  readonly levels: readonly Level[];
  /** Absolute energy of the ground level with A = 0 and the field as given, cm⁻¹. */
  readonly groundAbsolute: number;
  /** The naming used, null where there is none. */
  readonly labelGroup: LabelGroup | null;
}

/**
 * All levels of d^N over the complete space: repulsion, field, spin-orbit coupling, magnetic field. Exact in all of them; no
 * matrix is larger than the symmetry of the problem demands. Throws the input errors of `checkProblem` and `no-convergence`.
 */
export function levels(problem: LevelProblem, options: LevelOptions = {}): LevelList {
  const checked = checkProblem(problem);
  const tetrahedral = problem.field.type === 'tet' || problem.field.type === 'cube';
  const group = namingOf(checked, tetrahedral, options.labelGroup);
  const solved = solveBlocks(checked, group === null ? undefined : rowsOf[group]);
  const list =
    group === null
      ? groupedLevels(solved, options.tolerance)
      : solved.flatMap((each) => namedLevels(each, group, checked.zeta !== 0));
  list.sort((a, b) => a.energy - b.energy || (b.multiplicity ?? 0) - (a.multiplicity ?? 0));
  const ground = list[0]!.energy;
  return {
    levels: list.map((level) => ({ ...level, energy: level.energy - ground })),
    groundAbsolute: ground + (fieldTrace(checked.V) * checked.electrons) / 5,
    labelGroup: group,
  };
}

function namingOf(
  { V, zeeman }: CheckedProblem,
  tetrahedral: boolean,
  wanted: LabelGroup | null | undefined,
): LabelGroup | null {
  if (zeeman !== null || wanted === null) return null;
  if (wanted === undefined) return naturalLabelGroup(V, tetrahedral);
  return hasRows(V, rowsOf[wanted]) ? wanted : null;
}

const multiplicityOf = ({ block }: BlockLevels): number | null => (block.S === null ? null : 2 * block.S + 1);

function namedLevels(solved: BlockLevels, group: LabelGroup, spinOrbit: boolean): Level[] {
  const label = rowLabel(group, solved.block.species.name, spinOrbit);
  return Array.from(solved.values, (energy) => ({
    energy,
    degeneracy: solved.block.degeneracy,
    multiplicity: multiplicityOf(solved),
    label,
  }));
}

/** Sets of one spin within the tolerance; by default a rounding of the whole span. */
function groupedLevels(solved: readonly BlockLevels[], tolerance?: number): Level[] {
  const rows = solved
    .flatMap((each) =>
      Array.from(each.values, (energy) => ({
        energy,
        degeneracy: each.block.degeneracy,
        multiplicity: multiplicityOf(each),
      })),
    )
    .sort((a, b) => a.energy - b.energy);
  const span = rows.at(-1)!.energy - rows[0]!.energy;
  const near = tolerance ?? Math.max(1e-5, 4e-11 * span);
  const open = new Map<number | null, { last: number; level: { energy: number; degeneracy: number } }>();
  const found: { energy: number; degeneracy: number; multiplicity: number | null; label: null }[] = [];
  for (const { energy, degeneracy, multiplicity } of rows) {
    const current = open.get(multiplicity);
    if (current !== undefined && energy - current.last <= near) {
      current.level.degeneracy += degeneracy;
      current.last = energy;
      continue;
    }
    const level = { energy, degeneracy, multiplicity, label: null };
    found.push(level);
    open.set(multiplicity, { last: energy, level });
  }
  return found;
}
