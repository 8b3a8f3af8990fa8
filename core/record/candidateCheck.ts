import { accepted, refused, type Checked, type Problem } from '../errors';
import { defaultLibrary, type ParameterLibrary } from '../library';
import type { CandidateInput, GeometryId } from './composition';
import { checkGeometry, checkIsomer, checkLigands, checkMetal } from './compositionCheck';
import { didYouMean, suggestion } from './didYouMean';
import { describeValue } from './describeValue';

export interface CandidateCheckOptions {
  readonly library?: ParameterLibrary;
  /** Where the candidate stands, put before every field: `[3]` gives `[3].ligands.nh3`. */
  readonly place?: string;
  /** Names of positional isomers that exist for a composition, beyond cis, trans, fac and mer. */
  readonly isomersOf?: (composition: CandidateInput) => readonly string[];
}

const fields = [
  'id',
  'metal',
  'oxidationState',
  'geometry',
  'ligands',
  'isomer',
  'concentration_mM',
  'path_cm',
] as const;

/** Molar concentrations above that of pure water, and paths beyond ten metres, are slips of the unit. */
const limits = { concentration_mM: 55_500, path_cm: 1000 } as const;

function checkId(value: unknown, field: string): Checked<string> {
  if (typeof value === 'string' && value.trim() !== '' && value.length <= 200) return accepted(value);
  if (value === undefined) {
    return refused({
      code: 'missing-field',
      message: 'the candidate has no id',
      field,
      remedy: 'give a name',
    });
  }
  return refused({
    code: 'wrong-type',
    message: `id is ${describeValue(value)}`,
    field,
    remedy: 'give a text of 1 to 200 characters',
  });
}

function checkAmount(
  value: unknown,
  name: 'concentration_mM' | 'path_cm',
  field: string,
): Checked<number | undefined> {
  if (value === undefined || value === null) return accepted(undefined);
  const most = limits[name];
  const remedy = `give a number above 0 and at most ${most} (${name === 'path_cm' ? 'cm' : 'mmol/L'}), or leave it out`;
  if (typeof value !== 'number') {
    return refused({ code: 'wrong-type', message: `${name} is ${describeValue(value)}`, field, remedy });
  }
  if (!Number.isFinite(value)) {
    return refused({ code: 'not-finite', message: `${name} is ${value}`, field, remedy });
  }
  if (value <= 0 || value > most) {
    return refused({ code: 'out-of-range', message: `${name} is ${value}`, field, remedy });
  }
  return accepted(value);
}

/** Unknown fields are let pass (records carry more than this), but a misspelt known one is not. */
function misspelt(input: Record<string, unknown>, at: (name: string) => string): Problem[] {
  const choices = fields.map((answer) => ({ answer, names: [] }));
  return Object.keys(input).flatMap((name) => {
    if ((fields as readonly string[]).includes(name)) return [];
    const [meant] = didYouMean(name, choices, 1);
    if (meant === undefined || meant === 'id' || input[meant] !== undefined) return [];
    return [
      {
        code: 'unknown-field-value' as const,
        message: `there is no field ${name}`,
        field: at(name),
        remedy: suggestion([meant])!,
      },
    ];
  });
}

/**
 * Checks a candidate field by field and returns it in one spelling, or everything that is wrong with it: each problem
 * names the field, the value and the remedy.
 */
export function checkCandidate(input: unknown, options: CandidateCheckOptions = {}): Checked<CandidateInput> {
  const library = options.library ?? defaultLibrary;
  const place = options.place ?? '';
  const at = (name: string): string => (place === '' ? name : `${place}.${name}`);
  if (typeof input !== 'object' || input === null || Array.isArray(input)) {
    return refused({
      code: 'wrong-type',
      message: `a candidate is an object, not ${describeValue(input)}`,
      field: place === '' ? 'candidate' : place,
      remedy: 'give {id, metal, oxidationState, geometry, ligands}',
    });
  }
  const raw = input as Record<string, unknown>;
  const problems: Problem[] = [];
  const take = <T>(checked: Checked<T>): T | null => {
    if (checked.ok) return checked.value;
    problems.push(...checked.problems);
    return null;
  };
  const id = take(checkId(raw.id, at('id')));
  const ion = take(checkMetal(raw.metal, raw.oxidationState, at, library));
  const geometry = take(checkGeometry(raw.geometry, at('geometry'), library));
  const ligands = take(checkLigands(raw.ligands, geometry, at('ligands'), library));
  const concentration = take(checkAmount(raw.concentration_mM, 'concentration_mM', at('concentration_mM')));
  const path = take(checkAmount(raw.path_cm, 'path_cm', at('path_cm')));
  problems.push(...misspelt(raw, at));
  if (id === null || ion === null || geometry === null || ligands === null) return refused(...problems);
  const candidate: CandidateInput = {
    id,
    metal: ion.symbol,
    oxidationState: ion.oxidationState,
    geometry: geometry.id as GeometryId,
    ligands,
    isomer: null,
  };
  candidate.isomer = take(
    checkIsomer(raw.isomer, candidate, at('isomer'), library, options.isomersOf?.(candidate) ?? []),
  );
  if (concentration !== null && concentration !== undefined) candidate.concentration_mM = concentration;
  if (path !== null && path !== undefined) candidate.path_cm = path;
  return problems.length > 0 ? refused(...problems) : accepted(candidate);
}
