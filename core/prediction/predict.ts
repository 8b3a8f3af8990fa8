import type { Problem } from '../errors';
import {
  cautionsFor,
  complexFormula,
  complexKey,
  defaultLibrary,
  withParameterSet,
  type ParameterLibrary,
  type ParameterValues,
} from '../library';
import type { CubicLevel } from '../dshell/types';
import { checkCandidate } from '../record/candidateCheck';
import type { CandidateInput, Composition } from '../record/composition';
import { parameterHash } from '../record/hash';
import {
  estimateField,
  fieldLevels,
  settlingMeasurement,
  withAccount,
  type Estimate,
  type FieldEstimate,
  type FieldLevel,
  type Flag,
} from '../estimation';
import { isomersOfComposition } from '../geometry/ligandSites';
import { spinState, type SpinAnswer } from '../spin';
import {
  colourAtThreeStrengths,
  colourBulk,
  colourCloud,
  colourOfSolution,
  type IlluminantId,
  type ObserverId,
} from '../colour';
import { predictBands, type Band } from '../transitions';
import { drawBands } from './drawBands';
import { modelVersion } from './modelVersion';
import type { Prediction, PredictionOutcome } from './types';

export interface PredictOptions {
  readonly library?: ParameterLibrary;
  /** A stored parameter set, or anything with its `name` and `values`. */
  readonly parameterSet?: (ParameterValues & { readonly name?: string }) | null;
  /** Number of draws for the colour cloud; 0 or absent for none. */
  readonly draws?: number;
  readonly temperature_K?: number;
  readonly illuminant?: IlluminantId;
  readonly observer?: ObserverId;
  readonly counterIon?: string | null;
  /** Put before every field that a problem names: `[3]`. */
  readonly place?: string;
}

const defaults = { concentration_mM: 10, path_cm: 1, temperature_K: 298.15 } as const;

interface LevelInputs {
  readonly tenDq: Estimate;
  readonly B: Estimate;
  readonly C: Estimate;
}

/** An ideal polyhedron and strengths carried over from six donors leave a level in doubt by this share of its energy. */
const overlapDoubt = 0.05;

const lessSure = (band: Band): Band =>
  band.multiplicity === null
    ? band
    : { ...band, sigma_cm1: Math.hypot(band.sigma_cm1, overlapDoubt * band.energy_cm1) };

const ligandsOf = (composition: Composition, library: ParameterLibrary) =>
  Object.entries(composition.ligands).flatMap(([id, count]) => {
    const ligand = library.ligands.get(id);
    return ligand === undefined ? [] : [{ ligand, count }];
  });

function groundTermOf(field: FieldEstimate, levels: readonly FieldLevel[]): string {
  if (levels.length > 0) return levels[0]!.label;
  if (field.dElectrons === 0 || field.dElectrons === 10) return '1A1';
  return 'not estimated';
}

/** A band that absorbs less than this at its strongest, or lies so far in the infrared, changes no colour. */
const leastAbsorbance = 2e-4;
const infrared_cm1 = 5000;

/** Seen colour at the stated strength, at a third and three times it, and of draws from the uncertainties. */
function seen(
  bands: readonly Band[],
  estimates: LevelInputs,
  conditions: Prediction['conditions'],
  options: PredictOptions,
  key: string,
  colourless: boolean,
): Pick<Prediction, 'colour' | 'colourAtThreeStrengths' | 'cloud'> {
  if (bands.length === 0 && !colourless) return { colour: null, colourAtThreeStrengths: [], cloud: null };
  const viewing = {
    concentration_mM: conditions.concentration_mM,
    path_cm: conditions.path_cm,
    ...(options.illuminant === undefined ? {} : { illuminant: options.illuminant }),
    ...(options.observer === undefined ? {} : { observer: options.observer }),
  };
  const count = options.draws ?? 0;
  const strength = (conditions.concentration_mM * conditions.path_cm) / 1000;
  const seenBand = ({ molarAbsorptivityRange, energy_cm1 }: Band): boolean =>
    molarAbsorptivityRange[1] * strength > leastAbsorbance && energy_cm1 > infrared_cm1;
  return {
    colour: colourOfSolution(bands, viewing),
    colourAtThreeStrengths: colourAtThreeStrengths(bands, viewing),
    cloud:
      count > 0 ? colourCloud(colourBulk(drawBands(bands, estimates, count, key, seenBand), viewing)) : null,
  };
}

function predictChecked(
  input: CandidateInput,
  library: ParameterLibrary,
  madeWith: Prediction['madeWith'],
  options: PredictOptions,
): Prediction {
  const composition: Composition = {
    metal: input.metal,
    oxidationState: input.oxidationState,
    geometry: input.geometry,
    ligands: input.ligands,
    isomer: input.isomer ?? null,
  };
  const temperature_K = options.temperature_K ?? defaults.temperature_K;
  const field = estimateField(composition, library);
  if (field === null) throw new Error('a checked candidate has an ion');
  const spin: SpinAnswer = spinState(field, library, { temperature_K });
  const tenDq = spin.choice === 'high' ? field.fields.high : field.fields.low;
  const inputs = { tenDq, B: field.racahB, C: field.racahC };
  const levels = fieldLevels(field, library, spin.choice, tenDq);
  const conditions = {
    concentration_mM: input.concentration_mM ?? defaults.concentration_mM,
    path_cm: input.path_cm ?? defaults.path_cm,
    temperature_K,
  };
  const predicted = predictBands({
    dElectrons: field.dElectrons,
    ion: field.ion,
    ligands: ligandsOf(composition, library),
    geometry: composition.geometry,
    isomer: composition.isomer ?? null,
    levels,
    groundMultiplicity: spin.prediction.multiplicity,
    tenDq,
    racahB: field.racahB,
    racahC: field.racahC,
    zeta: field.zeta,
    temperature_K,
    donorStrengths: field.donors,
    library,
  });
  const bands = field.cubic === null ? predicted.bands.map(lessSure) : predicted.bands;
  const flags: Flag[] = [...field.flags, ...predicted.flags];
  // Without d-d bands and with no charge transfer in sight nothing is left that could absorb.
  const colourless = (field.dElectrons === 0 || field.dElectrons === 10) && !flags.some(mayTransfer);
  if (spin.prediction.nearCrossover) {
    flags.push({
      code: 'near-crossover',
      severity: 'caution',
      message:
        'Near spin crossover: neither spin state can be called certain; bands are those of the likelier one.',
    });
  }
  return {
    id: input.id,
    composition,
    formula: complexFormula(composition, library),
    dElectrons: field.dElectrons,
    tenDq: withAccount(tenDq, settlingMeasurement(field.dElectrons, spin.choice === 'low')),
    ...(field.twoDistances ? { tenDqBySpin: { high: field.fields.high, low: field.fields.low } } : {}),
    racahB: withAccount(field.racahB, 'three bands of this complex, fitted together with 10Dq'),
    racahC: withAccount(field.racahC, 'one spin-forbidden band of this complex'),
    zeta: field.zeta,
    spin: spin.prediction,
    groundTerm: groundTermOf(field, levels),
    levels: field.cubic === null ? [] : (levels as readonly CubicLevel[]),
    ...(field.cubic === null && levels.length > 0 ? { overlapLevels: levels } : {}),
    bands,
    conditions,
    ...seen(bands, inputs, conditions, options, complexKey(composition), colourless),
    flags,
    leftOut: [...new Set([...field.leftOut, ...predicted.leftOut])],
    cautions: cautionsFor(composition, options.counterIon, library),
    madeWith,
  };
}

const mayTransfer = ({ code }: Flag): boolean => /possible|CT|charge-transfer/.test(code);

const libraryHashes = new WeakMap<ParameterLibrary, string>();

/** Hash of a library without a parameter set over it, worked out once. */
function hashOfLibrary(library: ParameterLibrary): string {
  const known = libraryHashes.get(library);
  if (known !== undefined) return known;
  const hash = parameterHash({}, library.version);
  libraryHashes.set(library, hash);
  return hash;
}

/** A library laid over by a parameter set, with what a prediction records about both. */
function prepare(options: PredictOptions): {
  library: ParameterLibrary;
  madeWith: Prediction['madeWith'];
} {
  const base = options.library ?? defaultLibrary;
  const set = options.parameterSet ?? null;
  return {
    library: set === null ? base : withParameterSet(base, set).library,
    madeWith: {
      parameterSet: set === null ? `library ${base.version}` : (set.name ?? 'parameter set'),
      parameterHash: set === null ? hashOfLibrary(base) : parameterHash(set.values, base.version),
      modelVersion,
    },
  };
}

const idOf = (input: unknown): string =>
  typeof input === 'object' && input !== null && 'id' in input && typeof input.id === 'string'
    ? input.id
    : '';

/** A temperature that a Boltzmann factor can take. */
function temperatureProblem(options: PredictOptions): Problem | null {
  const value = options.temperature_K;
  if (value === undefined || (Number.isFinite(value) && value > 0 && value <= 2000)) return null;
  return {
    code: Number.isFinite(value) ? 'out-of-range' : 'not-finite',
    message: `the temperature is ${value} K`,
    field: 'temperature_K',
    remedy: 'give a temperature above 0 and at most 2000 K',
  };
}

/**
 * Everything that can be said of a complex before it is made. Wrong input comes back as problems that name field, value
 * and remedy; what cannot be estimated comes back as an estimate without value that says why.
 */
export function predict(input: unknown, options: PredictOptions = {}): PredictionOutcome {
  return predictMany([input], { ...options, placeOf: () => options.place ?? '' })[0]!;
}

export interface PredictManyOptions extends PredictOptions {
  /** Where the i-th input stands; `[i]` by default. */
  readonly placeOf?: (index: number) => string;
}

/** The same for many candidates with one library; a candidate that is refused leaves the others alone. */
export function predictMany(
  inputs: readonly unknown[],
  options: PredictManyOptions = {},
): PredictionOutcome[] {
  const wrong = temperatureProblem(options);
  const { library, madeWith } = prepare(options);
  const placeOf = options.placeOf ?? ((index: number) => `[${index}]`);
  return inputs.map((input, index): PredictionOutcome => {
    if (wrong !== null) return { ok: false, id: idOf(input), problems: [wrong] };
    const isomersOf = (composition: Composition): string[] =>
      isomersOfComposition(composition, library).flatMap(({ name }) => name ?? []);
    const checked = checkCandidate(input, { library, place: placeOf(index), isomersOf });
    if (!checked.ok) return { ok: false, id: idOf(input), problems: checked.problems };
    return { ok: true, prediction: predictChecked(checked.value, library, madeWith, options) };
  });
}
