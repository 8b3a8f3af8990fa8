import { solveStates } from '../../../core/dshell';
import { SpinhueError } from '../../../core/errors';
import {
  electronG,
  groundDoubletG,
  inducedSusceptibility,
  type MagneticProblem,
  momentFactors,
  vanVleckSusceptibility,
  zeroFieldSplitting,
} from '../../../core/magnetism';
import type { Command } from '../command';
import { answerEntries } from '../entries';
import { readLevelProblem } from '../levelEntry';

type Entry = Record<string, unknown>;

/** The first of several spellings that is given, here or in the block of the computed cases (`magnetic`, `zeeman`). */
function given(entry: Entry, ...names: string[]): { value: unknown; name: string } | null {
  for (const block of [entry, entry.magnetic, entry.zeeman]) {
    if (typeof block !== 'object' || block === null) continue;
    for (const name of names) {
      const value = (block as Entry)[name];
      if (value !== undefined && value !== null) return { value, name };
    }
  }
  return null;
}

function numberOf(entry: Entry, ...names: string[]): number | undefined {
  const found = given(entry, ...names);
  if (found === null) return undefined;
  if (typeof found.value === 'number') return found.value;
  throw new SpinhueError({
    code: 'wrong-type',
    message: `${found.name} = ${JSON.stringify(found.value)}: a number is needed`,
    field: found.name,
  });
}

function temperaturesOf(entry: Entry): number[] {
  const found = given(entry, 'temperatures_K', 'T_K');
  if (found === null || (Array.isArray(found.value) && found.value.length === 0)) {
    throw new SpinhueError({
      code: 'missing-field',
      message: 'temperatures_K is missing',
      field: 'temperatures_K',
      remedy: 'give a list of temperatures in kelvin',
    });
  }
  const list: unknown[] = Array.isArray(found.value) ? found.value : [found.value];
  return list.map((value, i) => {
    if (typeof value === 'number') return value;
    throw new SpinhueError({
      code: 'wrong-type',
      message: `temperatures_K[${i}] = ${JSON.stringify(value)}: a number is needed`,
      field: `temperatures_K[${i}]`,
    });
  });
}

/** Field strength; a field given as a vector is for `levels`, not for a susceptibility along three axes. */
function fieldOf(entry: Entry): number {
  const found = given(entry, 'field_T', 'B_T');
  return found === null || Array.isArray(found.value) ? 0 : numberOf(entry, 'field_T', 'B_T')!;
}

function answer(entry: Entry) {
  const temperatures_K = temperaturesOf(entry);
  const field_T = fieldOf(entry);
  const { zeeman: _, ...levels } = readLevelProblem(entry);
  const problem: MagneticProblem = {
    ...levels,
    orbitalReduction: numberOf(entry, 'orbitalReduction', 'k') ?? 1,
    ge: numberOf(entry, 'ge') ?? electronG,
  };
  const points =
    field_T === 0
      ? vanVleckSusceptibility(problem, temperatures_K)
      : inducedSusceptibility(problem, field_T, temperatures_K);
  const states = solveStates(problem);
  const splitting = zeroFieldSplitting(problem, states);
  return {
    ...(entry.id === undefined ? {} : { id: entry.id }),
    temperatures_K,
    chi_xyz_cm3_mol: points.map(({ chi_xyz }) => chi_xyz),
    chiT_cm3K_mol: points.map(({ chiT }) => chiT),
    muEff_BM: points.map(({ muEff }) => muEff),
    gPrincipal: groundDoubletG(states, momentFactors(problem))?.principal ?? null,
    zeroFieldSplitting: splitting === null ? null : { D_cm1: splitting.D, E_cm1: splitting.E },
  };
}

export const magnetism: Command = {
  name: 'magnetism',
  usage: 'FILE.json',
  summary: 'susceptibility, effective moment, g, D and E of d^N ions at given temperatures',
  options: {},
  operands: { min: 1, max: 1 },
  run: async ({ operands }, io) => answerEntries(await io.readJson(operands[0]!), answer),
};
