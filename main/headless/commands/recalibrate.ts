import { readMeasuredSet } from '../../../core/agreement';
import { observationOf, recalibrate as run, type Observation } from '../../../core/agreement/recalibration';
import { SpinhueError } from '../../../core/errors';
import { defaultLibrary, findIon } from '../../../core/library';
import { parameterHash, sha256Hex } from '../../../core/record/hash';
import type { Command } from '../command';

/** Order of a list by a repeatable key, so that a half of it can be drawn again. */
function shuffled<T extends { id: string }>(items: readonly T[], seed: number): T[] {
  const key = (id: string): number => Number.parseInt(sha256Hex(`${seed} ${id}`).slice(0, 8), 16);
  return items.toSorted((a, b) => key(a.id) - key(b.id));
}

export const recalibrate: Command = {
  name: 'recalibrate',
  usage: 'FILE.json [--half] [--seed N]',
  summary: 'propose f, g, h, k from measured complexes, with the leave-one-out error before and after',
  options: { half: 'flag', seed: 'value' },
  operands: { min: 1, max: 1 },
  async run({ operands, options }, io) {
    const name = operands[0]!;
    const set = readMeasuredSet(await io.readJson(name));
    if (!set.ok) {
      const problem = set.problems[0]!;
      throw new SpinhueError({ ...problem, message: `${name}: ${problem.message}` });
    }
    const seed = Number(options.get('seed') ?? 1);
    if (!Number.isInteger(seed)) {
      throw new SpinhueError({ code: 'usage', field: '--seed', message: '--seed takes a whole number' });
    }
    // Complexes kept for testing never inform parameters; where none is marked all may.
    const marked = set.value.some((complex) => complex.useForTuning);
    const observations = set.value
      .filter((complex) => complex.useForTuning || !marked)
      .map((complex): Observation | null => {
        const { metal, oxidationState } = complex.composition;
        const ion =
          typeof metal === 'string' && typeof oxidationState === 'number'
            ? findIon(complex.library, metal, oxidationState)
            : undefined;
        return ion === undefined ? null : observationOf(complex, ion.dElectrons);
      })
      .filter((observation) => observation !== null);
    const order = shuffled(observations, seed);
    const size = options.has('half') ? order.length >> 1 : order.length;
    const result = run(order.slice(0, size), options.has('half') ? { check: order.slice(size) } : {});
    return {
      learnedFrom: order.slice(0, size).map(({ id }) => id),
      checkedOn: order.slice(size).map(({ id }) => id),
      adopted: result.parts.some(({ adopt }) => adopt),
      parts: result.parts,
      values: result.values,
      hash: parameterHash(result.values, defaultLibrary.version),
      libraryVersion: defaultLibrary.version,
    };
  },
};
