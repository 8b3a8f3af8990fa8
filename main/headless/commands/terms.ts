import { SpinhueError } from '../../../core/errors';
import {
  configurationsOf,
  freeIonTerms,
  termsOfConfiguration,
  type ConfigurationTerms,
  type CubicGroup,
} from '../../../core/symmetry';
import type { Command } from '../command';
import { answerEntries } from '../entries';

const places = (entry: Record<string, unknown>, name: 't2g' | 'eg'): number | undefined => {
  const value = entry[name] ?? entry[name === 't2g' ? 't2' : 'e'];
  return value === undefined ? undefined : wholeNumber(value, name);
};

function wholeNumber(value: unknown, field: string): number {
  if (typeof value === 'number' && Number.isInteger(value)) return value;
  throw new SpinhueError({
    code: 'wrong-type',
    message: `${field} = ${JSON.stringify(value)}: a whole number is needed`,
    field,
  });
}

function cubicGroup(value: unknown): CubicGroup {
  if (value === undefined || value === 'Oh') return 'Oh';
  if (value === 'Td') return 'Td';
  throw new SpinhueError({
    code: 'unknown-field-value',
    message: `group = ${JSON.stringify(value)}: Oh or Td`,
    field: 'group',
  });
}

/** The configurations asked for: the one named, or all of the ion where only `dElectrons` is given. */
function configurations(entry: Record<string, unknown>, group: CubicGroup): ConfigurationTerms[] {
  const t2g = places(entry, 't2g');
  const eg = places(entry, 'eg');
  const given = entry.dElectrons;
  const dElectrons = given === undefined ? undefined : wholeNumber(given, 'dElectrons');
  if (t2g === undefined && eg === undefined) {
    if (dElectrons !== undefined) return configurationsOf(dElectrons, group);
    throw new SpinhueError({
      code: 'missing-field',
      message: 'neither dElectrons nor a configuration is given',
      field: 'dElectrons',
      remedy: 'give dElectrons, or t2g and eg',
    });
  }
  const inT2 = t2g ?? (dElectrons ?? eg!) - eg!;
  const inE = eg ?? (dElectrons ?? t2g!) - t2g!;
  if (dElectrons !== undefined && inT2 + inE !== dElectrons) {
    throw new SpinhueError({
      code: 'out-of-range',
      message: `t2g ${inT2} and eg ${inE} make ${inT2 + inE} electrons, not ${dElectrons}`,
      field: 'dElectrons',
      remedy: 'correct dElectrons or the configuration',
    });
  }
  return [termsOfConfiguration({ t2g: inT2, eg: inE }, group)];
}

function answer(entry: Record<string, unknown>) {
  const group = cubicGroup(entry.group);
  const found = configurations(entry, group);
  const dElectrons = found[0]!.t2g + found[0]!.eg;
  return {
    ...(entry.id === undefined ? {} : { id: entry.id }),
    dElectrons,
    group,
    freeIonTerms: freeIonTerms(dElectrons).map(({ label, times, microstates }) => ({
      label,
      times,
      microstates,
    })),
    configurations: found.map(({ t2g, eg, label, terms, microstates }) => ({
      configuration: label,
      t2g,
      eg,
      terms,
      microstates,
    })),
    microstates: found.reduce((sum, { microstates }) => sum + microstates, 0),
  };
}

export const terms: Command = {
  name: 'terms',
  usage: 'FILE.json',
  summary: 'terms and microstates of t2g^m eg^n, or of all configurations of d^N',
  options: {},
  operands: { min: 1, max: 1 },
  run: async ({ operands }, io) => answerEntries(await io.readJson(operands[0]!), answer),
};
