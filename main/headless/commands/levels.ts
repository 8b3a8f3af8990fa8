import { labelGroups, levels as solveLevels, type LabelGroup, type LevelProblem } from '../../../core/dshell';
import { labelLevels, levelAccount, namingGroup } from '../../../core/dshell/labels';
import { SpinhueError } from '../../../core/errors';
import type { Command } from '../command';
import { answerEntries } from '../entries';
import { readLevelProblem } from '../levelEntry';

/** `Oh*` asks for the double group; whether that applies follows from zeta. Null: no names; undefined: the field's own. */
function wantedGroup(entry: Record<string, unknown>): string | null | undefined {
  const value = entry.labelGroup;
  if (value === undefined || value === null) return value;
  if (value === 'ligands') return value;
  if (typeof value === 'string' && namingGroup(value) !== null) return value.replace(/\*$/, '');
  throw new SpinhueError({
    code: typeof value === 'string' ? 'unknown-field-value' : 'wrong-type',
    message: `labelGroup = ${JSON.stringify(value)}: the name of a point group is needed`,
    field: 'labelGroup',
    remedy: `one of ${labelGroups.join(', ')}, a lower group such as D3d or C2v, ligands for that of the ligands, null for no labels, or leave it out`,
  });
}

interface PrintedLevel {
  energy_cm1: number;
  degeneracy: number;
  multiplicity: number | null;
  label: string | null;
}

/** The engine's own names where it has them, else those that the eigenvectors show. */
function namedLevels(
  problem: LevelProblem,
  wanted: string | null | undefined,
  tolerance?: number,
): PrintedLevel[] {
  const own = labelGroups.find((group) => group === wanted);
  const labelGroup: LabelGroup | null | undefined = wanted === undefined ? undefined : (own ?? null);
  const list = solveLevels(problem, {
    ...(labelGroup === undefined ? {} : { labelGroup }),
    ...(tolerance === undefined ? {} : { tolerance }),
  });
  const lower = list.labelGroup === null && own === undefined && wanted !== null && !isMagnetic(problem);
  const labelled = lower ? labelLevels(problem, wanted === undefined ? {} : { group: wanted }) : null;
  if (labelled !== null && (wanted === undefined || wanted === 'ligands' || labelled.group === wanted)) {
    return labelled.levels.map(({ energy, degeneracy, multiplicity, irrep }) => ({
      ...{ energy_cm1: energy, degeneracy, multiplicity, label: irrep },
    }));
  }
  return list.levels.map(({ energy, degeneracy, multiplicity, label }) => ({
    ...{ energy_cm1: energy, degeneracy, multiplicity, label },
  }));
}

const isMagnetic = ({ zeeman }: LevelProblem): boolean => zeeman?.B_T.some((tesla) => tesla !== 0) ?? false;

function answer(entry: Record<string, unknown>) {
  const tolerance = entry.groupingTol_cm1;
  const wanted = wantedGroup(entry);
  const problem = readLevelProblem(entry);
  return {
    ...(entry.id === undefined ? {} : { id: entry.id }),
    levels: namedLevels(problem, wanted, typeof tolerance === 'number' ? tolerance : undefined),
  };
}

/** Every level with its parents in the free ion and the cubic field, its configurations, and the jump from the ground level. */
function account(entry: Record<string, unknown>) {
  const problem = readLevelProblem(entry);
  if (isMagnetic(problem)) {
    throw new SpinhueError({
      code: 'out-of-range',
      message: 'the account of levels is for zero magnetic field',
      field: 'zeeman',
      remedy: 'leave zeeman out',
    });
  }
  const wanted = wantedGroup(entry);
  const labelled = labelLevels(problem, wanted == null ? {} : { group: wanted });
  return {
    ...(entry.id === undefined ? {} : { id: entry.id }),
    group: labelled.group,
    cubicShare: labelled.cubicShare,
    levels: labelled.levels.map(({ energy, degeneracy, multiplicity, irrep }, index) => {
      const { freeIon, cubic, configurations, electronJump } = levelAccount(
        labelled,
        index,
        problem.dElectrons,
      );
      return {
        ...{ energy_cm1: energy, degeneracy, multiplicity, label: irrep },
        ...{ freeIon, cubic, electronJump },
        configurations: configurations.map(({ label, weight }) => ({ configuration: label, weight })),
      };
    }),
  };
}

export const levels: Command = {
  name: 'levels',
  usage: 'FILE.json [--account]',
  summary:
    'all levels of d^N ions in any field: energy, degeneracy, multiplicity, label; --account adds where each comes from',
  options: { account: 'flag' },
  operands: { min: 1, max: 1 },
  run: async ({ operands, options }, io) =>
    answerEntries(await io.readJson(operands[0]!), options.has('account') ? account : answer),
};
