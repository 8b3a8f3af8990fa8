import { SpinhueError } from '../../../core/errors';
import { predictMany } from '../../../core/prediction';
import type { Command } from '../command';
import { reportEntry } from '../estimateReport';

const shape = 'an array of {id, metal, oxidationState, geometry, ligands}, or one such object';

/** The entries of a file: a bare array, one candidate, or a list kept under `candidates` or `complexes`. */
export function entriesOf(input: unknown, name: string): readonly unknown[] {
  if (Array.isArray(input)) return input as unknown[];
  if (typeof input === 'object' && input !== null) {
    for (const key of ['candidates', 'complexes'] as const) {
      const list = (input as Record<string, unknown>)[key];
      if (Array.isArray(list)) return list as unknown[];
    }
    return [input];
  }
  throw new SpinhueError({
    code: 'wrong-type',
    message: `${name} holds ${input === null ? 'null' : `a ${typeof input}`}`,
    field: name,
    remedy: `give ${shape}`,
  });
}

const idOf = (entry: unknown, index: number): string => {
  const id = typeof entry === 'object' && entry !== null ? (entry as { id?: unknown }).id : undefined;
  return typeof id === 'string' && id !== '' ? id : `[${index}]`;
};

/** What was measured, where the entry is a record of measurements: printed beside what is predicted. */
function measuredOf(entry: unknown): Record<string, unknown> {
  if (typeof entry !== 'object' || entry === null || !('published' in entry)) return {};
  const { published, bands, groundSpin } = entry as Record<string, unknown>;
  return { measured: { published, bands, groundSpin } };
}

export const estimate: Command = {
  name: 'estimate',
  usage: 'FILE.json',
  summary: 'field, spin state, bands and colour of candidate complexes',
  options: {},
  operands: { min: 1, max: 1 },
  async run({ operands }, io) {
    const name = operands[0]!;
    const entries = entriesOf(await io.readJson(name), name);
    const ids = entries.map(idOf);
    const twice = [...new Set(ids.filter((id, index) => ids.indexOf(id) !== index))];
    if (twice.length > 0)
      io.note(`estimate: ids that occur more than once: ${twice.slice(0, 10).join(', ')}`);
    return predictMany(entries).map((outcome, index) => ({
      ...reportEntry(outcome, ids[index]!),
      ...measuredOf(entries[index]),
    }));
  },
};
