import { labelGroups, levels as solveLevels, type LabelGroup } from '../../../core/dshell';
import { SpinhueError } from '../../../core/errors';
import type { Command } from '../command';
import { answerEntries } from '../entries';
import { readLevelProblem } from '../levelEntry';

/** `Oh*` asks for the double group; whether that applies follows from zeta. Names the engine does not give become null. */
function labelGroupOf(entry: Record<string, unknown>): LabelGroup | null | undefined {
  const value = entry.labelGroup;
  if (value === undefined || value === null) return value;
  if (typeof value !== 'string') {
    throw new SpinhueError({
      code: 'wrong-type',
      message: `labelGroup = ${JSON.stringify(value)}: the name of a point group is needed`,
      field: 'labelGroup',
      remedy: `one of ${labelGroups.join(', ')}, null for no labels, or leave it out`,
    });
  }
  const name = value.replace(/\*$/, '');
  return labelGroups.find((group) => group === name) ?? null;
}

function answer(entry: Record<string, unknown>) {
  const labelGroup = labelGroupOf(entry);
  const tolerance = entry.groupingTol_cm1;
  const { levels } = solveLevels(readLevelProblem(entry), {
    ...(labelGroup === undefined ? {} : { labelGroup }),
    ...(typeof tolerance === 'number' ? { tolerance } : {}),
  });
  return {
    ...(entry.id === undefined ? {} : { id: entry.id }),
    levels: levels.map(({ energy, degeneracy, multiplicity, label }) => ({
      energy_cm1: energy,
      degeneracy,
      multiplicity,
      label,
    })),
  };
}

export const levels: Command = {
  name: 'levels',
  usage: 'FILE.json',
  summary: 'all levels of d^N ions in any field: energy, degeneracy, multiplicity, label',
  options: {},
  operands: { min: 1, max: 1 },
  run: async ({ operands }, io) => answerEntries(await io.readJson(operands[0]!), answer),
};
