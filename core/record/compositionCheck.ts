import { accepted, refused, type Checked, type Problem } from '../errors';
import {
  dElectronCount,
  findGeometry,
  findIon,
  findMetal,
  transitionMetals,
  type GeometryRecord,
  type IonRecord,
  type ParameterLibrary,
} from '../library';
import type { Composition } from './composition';
import { describeValue } from './describeValue';
import { didYouMean, suggestion } from './didYouMean';

type At = (name: string) => string;

const metalChoices = transitionMetals.map(({ symbol, name }) => ({ answer: symbol, names: [name] }));

export function checkMetal(
  metal: unknown,
  oxidationState: unknown,
  at: At,
  library: ParameterLibrary,
): Checked<IonRecord> {
  const problems: Problem[] = [];
  const remedy = 'give the symbol of a transition metal, for example "Fe"';
  const known = typeof metal === 'string' ? findMetal(metal) : undefined;
  if (metal === undefined) {
    problems.push({ code: 'missing-field', message: 'no metal is given', field: at('metal'), remedy });
  } else if (typeof metal !== 'string') {
    problems.push({
      code: 'wrong-type',
      message: `metal is ${describeValue(metal)}`,
      field: at('metal'),
      remedy,
    });
  } else if (known === undefined) {
    problems.push({
      code: 'unknown-metal',
      message: `${describeValue(metal)} is not a transition metal`,
      field: at('metal'),
      remedy: suggestion(didYouMean(metal, metalChoices)) ?? remedy,
    });
  }
  const field = at('oxidationState');
  const whole = 'give a whole number such as 2 or 3';
  if (oxidationState === undefined) {
    problems.push({ code: 'missing-field', message: 'no oxidation state is given', field, remedy: whole });
  } else if (typeof oxidationState !== 'number') {
    problems.push({
      code: 'wrong-type',
      message: `oxidationState is ${describeValue(oxidationState)}`,
      field,
      remedy: whole,
    });
  } else if (!Number.isFinite(oxidationState)) {
    problems.push({
      code: 'not-finite',
      message: `oxidationState is ${oxidationState}`,
      field,
      remedy: whole,
    });
  } else if (!Number.isInteger(oxidationState)) {
    problems.push({
      code: 'wrong-type',
      message: `oxidationState is ${oxidationState}, not a whole number`,
      field,
      remedy: `${whole}; enter the centres of a mixed-valence compound one by one`,
    });
  } else if (known !== undefined) {
    const ion = findIon(library, known.symbol, oxidationState);
    if (ion !== undefined) return accepted(ion);
    const d = dElectronCount(known, oxidationState);
    const [low, high] = known.oxidationStates;
    problems.push({
      code: 'impossible-oxidation-state',
      message: `${known.name} has no oxidation state ${oxidationState} (it would have ${d} d electrons)`,
      field,
      remedy: `give a number from ${Math.max(low, known.group - 10)} to ${high}`,
    });
  }
  return refused(...problems);
}

export function checkGeometry(
  value: unknown,
  field: string,
  library: ParameterLibrary,
): Checked<GeometryRecord> {
  const names = library.geometries.map(({ id }) => id);
  const remedy = `give one of ${names.join(', ')}`;
  if (value === undefined) {
    return refused({ code: 'missing-field', message: 'no geometry is given', field, remedy });
  }
  if (typeof value !== 'string') {
    return refused({ code: 'wrong-type', message: `geometry is ${describeValue(value)}`, field, remedy });
  }
  const found = findGeometry(value);
  if (found !== undefined) return accepted(found);
  const meant = didYouMean(
    value,
    library.geometries.map(({ id, aliases }) => ({ answer: id, names: aliases })),
  );
  return refused({
    code: 'unknown-geometry',
    message: `${describeValue(value)} is not a geometry this program knows`,
    field,
    remedy: suggestion(meant) ?? remedy,
  });
}

/** More ligands than any coordination polyhedron here has corners is a slip of the keyboard. */
const mostOfOneLigand = 12;

export function checkLigands(
  value: unknown,
  geometry: GeometryRecord | null,
  field: string,
  library: ParameterLibrary,
): Checked<Record<string, number>> {
  const example = 'give ligand ids with their counts, for example {"nh3": 5, "cl": 1}';
  if (value === undefined) {
    return refused({ code: 'missing-field', message: 'no ligands are given', field, remedy: example });
  }
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    return refused({
      code: 'wrong-type',
      message: `ligands is ${describeValue(value)}`,
      field,
      remedy: example,
    });
  }
  const entries = Object.entries(value as Record<string, unknown>);
  if (entries.length === 0) {
    return refused({ code: 'missing-field', message: 'the ligand set is empty', field, remedy: example });
  }
  const problems: Problem[] = [];
  const counts: [string, number][] = [];
  let places = 0;
  for (const [id, count] of entries.slice(0, 50)) {
    const ligand = library.ligands.get(id);
    const here = `${field}.${id.slice(0, 60)}`;
    if (ligand === undefined) {
      const choices = [...library.ligands.values()].map(
        ({ id: answer, abbreviation, commonName, formula }) => ({
          answer,
          names: [abbreviation, commonName, formula],
        }),
      );
      problems.push({
        code: 'unknown-ligand',
        message: `there is no ligand ${describeValue(id)} in the library`,
        field: here,
        remedy:
          suggestion(didYouMean(id, choices)) ?? 'choose a ligand of the library, or add this one to it',
      });
    }
    if (typeof count !== 'number' || !Number.isInteger(count) || count < 1 || count > mostOfOneLigand) {
      problems.push({
        code: typeof count === 'number' && !Number.isFinite(count) ? 'not-finite' : 'bad-ligand-count',
        message: `the count of ${id.slice(0, 60)} is ${describeValue(count)}`,
        field: here,
        remedy: `give a whole number from 1 to ${mostOfOneLigand}`,
      });
    } else if (ligand !== undefined) {
      counts.push([id, count]);
      places += ligand.denticity * count;
    }
  }
  if (problems.length === 0 && geometry !== null && places !== geometry.coordinationNumber) {
    const sum = counts
      .map(([id, count]) => `${count} × ${id} (${library.ligands.get(id)!.denticity})`)
      .join(' + ');
    problems.push({
      code: 'coordination-number',
      message: `${sum} fill ${places} places; ${geometry.name} has ${geometry.coordinationNumber}`,
      field,
      remedy: places < geometry.coordinationNumber ? 'add ligands, for example water' : 'take ligands out',
    });
  }
  return problems.length > 0 ? refused(...problems) : accepted(Object.fromEntries(counts));
}

/** How many donors of each ligand, most first: the pattern that decides which isomers exist. */
function donorPattern(composition: Composition, library: ParameterLibrary): number[] {
  return Object.entries(composition.ligands)
    .map(([id, count]) => (library.ligands.get(id)?.denticity ?? 1) * count)
    .sort((a, b) => b - a);
}

function usualIsomers(composition: Composition, library: ParameterLibrary): string[] {
  const pattern = donorPattern(composition, library);
  const ligands = Object.keys(composition.ligands).flatMap((id) => library.ligands.get(id) ?? []);
  const unlike = ligands.some(({ donorAtoms }) => new Set(donorAtoms).size > 1);
  if (composition.geometry === 'octahedral' || composition.geometry === 'tetragonal') {
    if (unlike) return ['fac', 'mer', 'cis', 'trans'];
    if (ligands.some(({ denticity }) => denticity === 3)) return ['fac', 'mer'];
    if (pattern.length < 2) return [];
    const twoAlike = pattern.includes(2);
    const threeAlike = pattern.includes(3);
    return [...(twoAlike ? ['cis', 'trans'] : []), ...(threeAlike ? ['fac', 'mer'] : [])];
  }
  if (composition.geometry === 'square-planar') return pattern.length > 1 || unlike ? ['cis', 'trans'] : [];
  return [];
}

/** Null where no isomer is named; the check is of the composition, which must have such an isomer. */
export function checkIsomer(
  value: unknown,
  composition: Composition,
  field: string,
  library: ParameterLibrary,
  others: readonly string[],
): Checked<string | null> {
  if (value === undefined || value === null || value === '') return accepted(null);
  if (typeof value !== 'string') {
    return refused({
      code: 'wrong-type',
      message: `isomer is ${describeValue(value)}`,
      field,
      remedy: 'give cis, trans, fac or mer, or leave it out',
    });
  }
  const wanted = value.trim();
  const possible = [...new Set([...usualIsomers(composition, library), ...others])];
  const found = possible.find((name) => name.toLowerCase() === wanted.toLowerCase());
  if (found !== undefined) return accepted(found);
  return refused({
    code: 'unknown-isomer',
    message: `this ligand set has no ${describeValue(wanted)} isomer`,
    field,
    remedy: possible.length > 0 ? `give one of ${possible.slice(0, 12).join(', ')}` : 'leave the isomer out',
  });
}
