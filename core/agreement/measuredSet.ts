import { accepted, refused, type Checked, type Problem } from '../errors';
import {
  defaultLibrary,
  ligandFromFacts,
  ligandKind,
  withLigands,
  type LigandRecord,
  type ParameterLibrary,
} from '../library';

/** One absorption band as published. */
export interface MeasuredBand {
  readonly energy_cm1: number;
  readonly epsilon: number | null;
  readonly assignment: string | null;
  readonly kind: string;
  /** `max` or `shoulder`; a shoulder is not a centre. */
  readonly feature: string;
}

/** A published complex with what was found on it. */
export interface MeasuredComplex {
  readonly id: string;
  readonly formula: string;
  readonly composition: Record<string, unknown>;
  readonly bands: readonly MeasuredBand[];
  readonly tenDq: number | null;
  readonly racahB: number | null;
  /** `high`, `low`, `only`, `crossover`, `intermediate`, or null where nobody says. */
  readonly groundSpin: string | null;
  readonly muEff: number | null;
  readonly colourWords: string | null;
  readonly medium: string | null;
  readonly useForTuning: boolean;
  readonly flags: readonly string[];
  /** The library this complex is to be estimated with: further ligands, other denticities. */
  readonly library: ParameterLibrary;
}

type Raw = Record<string, unknown>;
const isObject = (value: unknown): value is Raw =>
  typeof value === 'object' && value !== null && !Array.isArray(value);
const text = (value: unknown): string | null => (typeof value === 'string' ? value : null);
const number = (value: unknown): number | null =>
  typeof value === 'number' && Number.isFinite(value) ? value : null;
const texts = (value: unknown): string[] =>
  Array.isArray(value) ? value.filter((each): each is string => typeof each === 'string') : [];

/** Ligands that a set of measurements brings along: charge, denticity and donors, nothing else. */
function furtherLigands(meta: unknown): LigandRecord[] {
  if (!isObject(meta) || !isObject(meta.newLigands)) return [];
  return Object.entries(meta.newLigands).flatMap(([id, facts]) => {
    if (!isObject(facts)) return [];
    const donorAtoms = texts(facts.donorAtoms);
    const denticity = number(facts.denticity) ?? donorAtoms.length;
    const charge = number(facts.charge);
    if (donorAtoms.length === 0 || charge === null) return [];
    return [
      ligandFromFacts({
        id,
        name: text(facts.name) ?? id,
        formula: text(facts.formula),
        charge,
        denticity,
        donorAtoms,
        ...ligandKind(`${id} ${text(facts.name) ?? ''}`, donorAtoms),
      }),
    ];
  });
}

/**
 * A ligand that binds with fewer donors in this very complex is another ligand: it gets a name of its own (`edta/5`),
 * in the set and in the library.
 */
function withDenticities(
  library: ParameterLibrary,
  set: unknown,
  used: unknown,
): { readonly library: ParameterLibrary; readonly set: unknown } {
  if (!isObject(used) || !isObject(set)) return { library, set };
  const ligands = new Map(library.ligands);
  const renamed: Raw = { ...set };
  for (const [id, value] of Object.entries(used)) {
    const ligand = ligands.get(id);
    const denticity = number(value);
    if (ligand === undefined || denticity === null || denticity < 1 || denticity >= ligand.denticity)
      continue;
    if (renamed[id] === undefined) continue;
    const name = `${id}/${denticity}`;
    ligands.set(name, { ...ligand, id: name, denticity, donorAtoms: ligand.donorAtoms.slice(0, denticity) });
    renamed[name] = renamed[id];
    delete renamed[id];
  }
  return { library: { ...library, ligands }, set: renamed };
}

function readBand(raw: unknown): MeasuredBand[] {
  if (!isObject(raw)) return [];
  const energy = number(raw.energy_cm1);
  if (energy === null || energy <= 0) return [];
  return [
    {
      energy_cm1: energy,
      epsilon: number(raw.epsilon),
      assignment: text(raw.assignment),
      kind: text(raw.kind) ?? 'unknown',
      feature: text(raw.feature) ?? 'max',
    },
  ];
}

function readComplex(raw: Raw, library: ParameterLibrary): MeasuredComplex {
  const published = isObject(raw.published) ? raw.published : {};
  const bound = withDenticities(library, raw.ligands, raw.denticityUsed);
  return {
    id: text(raw.id)!,
    formula: text(raw.formula) ?? '',
    composition: {
      id: raw.id,
      metal: raw.metal,
      oxidationState: raw.oxidationState,
      geometry: raw.geometry,
      ligands: bound.set,
      isomer: raw.isomer,
    },
    bands: (Array.isArray(raw.bands) ? raw.bands : []).flatMap(readBand),
    tenDq: number(published.tenDq),
    racahB: number(published.racahB),
    groundSpin: text(raw.groundSpin),
    muEff: isObject(raw.muEff) ? number(raw.muEff.value) : null,
    colourWords: text(raw.colourWords),
    medium: text(raw.medium),
    useForTuning: raw.useForTuning === true,
    flags: texts(raw.flags),
    library: bound.library,
  };
}

/** Reads a set of published measurements (`{meta, complexes: [...]}`, or the bare array). */
export function readMeasuredSet(
  input: unknown,
  base: ParameterLibrary = defaultLibrary,
): Checked<readonly MeasuredComplex[]> {
  const list = Array.isArray(input) ? (input as unknown[]) : isObject(input) ? input.complexes : undefined;
  if (!Array.isArray(list)) {
    return refused({
      code: 'wrong-type',
      message: 'no list of complexes is there',
      field: 'complexes',
      remedy: 'give {complexes: [{id, metal, oxidationState, geometry, ligands, bands, ...}]}',
    });
  }
  if (list.length === 0) {
    return refused({ code: 'empty-input', message: 'the list of complexes is empty', field: 'complexes' });
  }
  const library = withLigands(base, furtherLigands(isObject(input) ? input.meta : undefined));
  const problems: Problem[] = [];
  const complexes: MeasuredComplex[] = [];
  list.forEach((raw: unknown, index) => {
    if (!isObject(raw) || text(raw.id) === null) {
      problems.push({
        code: 'missing-field',
        message: `complex ${index + 1} has no id`,
        field: `complexes[${index}].id`,
        remedy: 'give each complex an id',
      });
    } else {
      complexes.push(readComplex(raw, library));
    }
  });
  return problems.length > 0 ? refused(...problems) : accepted(complexes);
}
