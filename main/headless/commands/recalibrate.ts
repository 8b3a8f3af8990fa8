import { readMeasuredSet } from '../../../core/agreement';
import {
  basisFor,
  bundleObservations,
  observationOf,
  recalibrate as run,
  type Observation,
} from '../../../core/agreement/recalibration';
import { SpinhueError, type Problem } from '../../../core/errors';
import { defaultLibrary, findIon, withParameterSet } from '../../../core/library';
import { bundleFormat, readBundle } from '../../../core/record/bundle';
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
  summary:
    'propose f, g, h, k from published complexes or an exported project, with the leave-one-out error before and after',
  options: { half: 'flag', seed: 'value' },
  operands: { min: 1, max: 1 },
  async run({ operands, options }, io) {
    const name = operands[0]!;
    const seed = Number(options.get('seed') ?? 1);
    if (!Number.isInteger(seed)) {
      throw new SpinhueError({ code: 'usage', field: '--seed', message: '--seed takes a whole number' });
    }
    const { observations, startsFrom } = observationsIn(name, await io.readJson(name));
    const order = shuffled(observations, seed);
    const size = options.has('half') ? order.length >> 1 : order.length;
    const result = run(order.slice(0, size), options.has('half') ? { check: order.slice(size) } : {});
    return {
      learnedFrom: order.slice(0, size).map(({ id }) => id),
      checkedOn: order.slice(size).map(({ id }) => id),
      startsFrom,
      adopted: result.parts.some(({ adopt }) => adopt),
      parts: result.parts,
      values: result.values,
      hash: parameterHash(result.values, defaultLibrary.version),
      libraryVersion: defaultLibrary.version,
    };
  },
};

interface Evidence {
  readonly observations: readonly Observation[];
  /** Name of the parameter set that the proposal starts from; null for the library as it is. */
  readonly startsFrom: string | null;
}

const isBundle = (input: unknown): boolean =>
  typeof input === 'object' && input !== null && (input as { format?: unknown }).format === bundleFormat;

const firstOf = (name: string, problems: readonly Problem[]): SpinhueError =>
  new SpinhueError({ ...problems[0]!, message: `${name}: ${problems[0]!.message}` });

function observationsIn(name: string, input: unknown): Evidence {
  return isBundle(input) ? recorded(name, input) : published(name, input);
}

/** Field fits of an exported project. */
function recorded(name: string, input: unknown): Evidence {
  const reading = readBundle(JSON.stringify(input));
  if (!reading.ok) throw firstOf(name, reading.problems);
  const { content } = reading;
  const plain = bundleObservations(content);
  if (plain.length === 0) {
    throw new SpinhueError({
      code: 'missing-field',
      field: 'analyses',
      message: `${name}: no measurement of this project has a field fit`,
      remedy: 'fit the field of measured complexes in the lab record and export the project again',
    });
  }
  const inUse = content.parameterSets.find(({ id }) => id === content.projects[0]?.parameterSetId);
  const basis = basisFor(plain, inUse ?? null, content.parameterSets);
  const library = basis === null ? defaultLibrary : withParameterSet(defaultLibrary, basis).library;
  return {
    observations: plain.map((each) => ({ ...each, library })),
    startsFrom: basis?.name ?? null,
  };
}

/** Published complexes. Those kept for testing never inform parameters; where none is marked all may. */
function published(name: string, input: unknown): Evidence {
  const set = readMeasuredSet(input);
  if (!set.ok) throw firstOf(name, set.problems);
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
  return { observations, startsFrom: null };
}
