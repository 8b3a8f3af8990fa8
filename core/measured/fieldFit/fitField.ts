import { SpinhueError } from '../../errors';
import type { CubicGeometry } from '../../dshell';
import type { GeometryId } from '../../record/composition';
import { candidateAssignments, type FieldBand } from './candidates';
import { freeIonB, type FreeIonLimit } from './freeIon';
import { groundMultiplicityOf, parseLevel } from './labels';
import { groundMultiplicities, levelsFrom, sameLevel, type FieldParameters, type LevelKey } from './model';
import { solveField, type FieldSolution, type Freedom, type TargetBand } from './solve';
import { fitLowSymmetry, possibleMultiplicities } from './orbitals/describe';
import { describeFit } from './statement';
import { textbookRule, type TextbookValue } from './textbook';

export interface FieldFitRequest {
  readonly dElectrons: number;
  /** `octahedral` and `tetrahedral` by the cubic levels; other geometries by the energies of their d orbitals. */
  readonly geometry: GeometryId | 'tetragonal';
  readonly bands: readonly {
    readonly energy_cm1: number;
    /** Standard uncertainty of the position; a usual reading is assumed where none is given. */
    readonly se_cm1?: number | null;
    /** 2S + 1 of the upper level; the ground level's where not given. */
    readonly multiplicity?: number | null;
    /** `4T2g`, `4A2g -> 4T1g(P)` */
    readonly label?: string | null;
  }[];
  /** Ground-state multiplicity; both spins are tried where it is open and not given. */
  readonly groundMultiplicity?: number;
  /** What C/B is held at where the bands do not tell; default 4.5. */
  readonly ratioCB?: number;
  /** For the comparison with the free ion. */
  readonly metal?: string;
  readonly oxidationState?: number;
}

export interface FittedParameter {
  readonly value: number | null;
  /** Standard error; null where the value was held or follows from one that was. */
  readonly se: number | null;
  readonly status: 'fitted' | 'held' | 'tied to B' | 'not determined';
}

export interface FittedLevel {
  readonly energy_cm1: number;
  readonly calculated_cm1: number;
  readonly residual_cm1: number;
  readonly label: string;
  readonly multiplicity: number;
}

export interface FieldFit {
  readonly tenDq: FittedParameter;
  readonly B: FittedParameter;
  readonly C: FittedParameter;
  /** Energies of the d orbitals in a geometry without cubic symmetry, relative to the last; null in a cubic field. */
  readonly orbitals:
    readonly { readonly name: string; readonly energy_cm1: number; readonly se: number | null }[] | null;
  readonly groundTerm: string;
  readonly assignment: readonly FittedLevel[];
  readonly correlation: FieldSolution['correlation'];
  /** Root mean square of measured minus calculated, cm-1. */
  readonly rms_cm1: number;
  readonly chi2: number;
  readonly degreesOfFreedom: number;
  /** What these bands cannot tell, in plain words. */
  readonly notDetermined: readonly string[];
  readonly warnings: readonly string[];
  readonly remarks: readonly string[];
  /** Other assignments that fit, best first. */
  readonly alternatives: readonly {
    readonly tenDq: number;
    readonly B: number;
    readonly C: number;
    readonly labels: readonly string[];
    readonly groundTerm: string;
    readonly rms_cm1: number;
    readonly chi2: number;
  }[];
  /** Values by the closed formulas of textbooks where one applies, for comparison. */
  readonly textbook: TextbookValue | null;
}

/** Common practice: published maxima of broad bands agree to 1-2 % of their position. */
export const usualReading = (energy_cm1: number): number => 0.01 * energy_cm1;
const usualRatio = 4.5;

interface Trial {
  readonly solution: FieldSolution;
  readonly levels: readonly LevelKey[];
  readonly freedom: Freedom;
  readonly groundMultiplicity: number;
  readonly cost: number;
}

function checked(request: FieldFitRequest): FieldBand[] {
  const invalid = (field: string, message: string): never => {
    throw new SpinhueError({ code: 'out-of-range', field, message });
  };
  if (!Number.isInteger(request.dElectrons) || request.dElectrons < 1 || request.dElectrons > 9) {
    invalid('dElectrons', `dElectrons is ${request.dElectrons}; d-d bands need 1 to 9`);
  }
  if (request.bands.length === 0) invalid('bands', 'bands is empty: at least one band is needed');
  if (request.bands.length > 20) invalid('bands', `${request.bands.length} bands; at most 20 are fitted`);
  return request.bands.map((band, i) => {
    if (!(band.energy_cm1 > 0) || band.energy_cm1 > 100_000) {
      invalid(
        `bands[${i}].energy_cm1`,
        `bands[${i}].energy_cm1 is ${band.energy_cm1}; expected cm-1 up to 100 000`,
      );
    }
    if (band.se_cm1 != null && !(band.se_cm1 > 0 && band.se_cm1 < 1e5)) {
      invalid(
        `bands[${i}].se_cm1`,
        `bands[${i}].se_cm1 is ${band.se_cm1}; expected a positive uncertainty in cm-1`,
      );
    }
    return {
      energy_cm1: band.energy_cm1,
      se_cm1: band.se_cm1 ?? usualReading(band.energy_cm1),
      multiplicity: band.multiplicity ?? null,
      label: band.label ?? null,
    };
  });
}

/** Freedoms to try, the fullest first: what the bands cannot tell is tied or held in the next. */
function freedoms(count: number, ratio: number): Freedom[] {
  const tied = { ratio };
  const list: Freedom[] = [];
  if (count >= 3) list.push({ tenDq: true, B: true, C: 'free' });
  if (count >= 2) list.push({ tenDq: true, B: true, C: tied });
  list.push({ tenDq: true, B: false, C: tied });
  return list;
}

/** Assignments fitted per spin, the most promising of the coarse grid. */
const mostCandidates = 16;

/** A parameter whose standard error is more than this share of its value is not determined. */
const uselessShare = 0.35;

function isDetermined(solution: FieldSolution, freedom: Freedom): boolean {
  if (solution.status !== 'converged') return false;
  const known = (name: 'tenDq' | 'B' | 'C') => {
    const se = solution.rawSe[name];
    return se !== null && se < uselessShare * solution.parameters[name];
  };
  return known('tenDq') && (!freedom.B || known('B')) && (freedom.C !== 'free' || known('C'));
}

/** How odd a solution is: ratios of parameters that no complex has count against it, gently. */
function oddness(parameters: FieldParameters, largestB: number): number {
  const above = Math.max(0, Math.log(parameters.B / largestB)) / 0.1;
  const below = Math.max(0, Math.log((0.35 * largestB) / parameters.B)) / 0.2;
  const ratio = parameters.C / parameters.B;
  const ratioOff = Math.max(0, Math.log(ratio / 6.5), Math.log(3 / ratio)) / 0.15;
  return above ** 2 + below ** 2 + ratioOff ** 2;
}

/**
 * What speaks against an assignment beside its misfit: spin-allowed levels below the highest one used that no band was
 * found for, and bands taken for transitions of two electrons, which are weak and easily missed.
 */
function implausibility(trial: Omit<Trial, 'cost'>, request: CubicRequest): number {
  const { levels } = levelsFrom(
    request.dElectrons,
    request.geometry,
    trial.solution.parameters,
    trial.groundMultiplicity,
  );
  const top = Math.max(...trial.solution.predicted);
  let price = 0;
  for (const level of levels) {
    if (level.energy <= 1 || level.energy > top + 1 || level.multiplicity !== trial.groundMultiplicity)
      continue;
    const twoElectrons = Math.abs(level.slope.tenDq) > 1.5;
    const used = trial.levels.some((key) => sameLevel(key, level));
    if (used ? twoElectrons : !twoElectrons) price += 2;
    else if (!used) price += 0.5;
  }
  // A spin-forbidden band is seen only where nothing stronger covers it, and the lowest of a multiplicity first.
  for (const key of trial.levels) {
    if (key.multiplicity === trial.groundMultiplicity) continue;
    price += 1;
    const at = levels.findIndex((level) => sameLevel(level, key));
    price += levels
      .slice(0, at)
      .filter(
        (level) =>
          level.multiplicity === key.multiplicity && !trial.levels.some((used) => sameLevel(used, level)),
      ).length;
  }
  return price;
}

/**
 * Half the distance between bands that share a level: it is not the cubic model's business and counts as uncertainty.
 * Null where bands share that do not bear one name.
 */
function sharing(bands: readonly FieldBand[], levels: readonly LevelKey[]): number[] | null {
  const nameOf = (band: FieldBand) => JSON.stringify(band.label === null ? null : parseLevel(band.label));
  const halves: number[] = [];
  for (const [i, band] of bands.entries()) {
    const fellows = bands.filter((_, k) => sameLevel(levels[k]!, levels[i]!));
    if (fellows.some((fellow) => nameOf(fellow) !== nameOf(band))) return null;
    const places = fellows.map((fellow) => fellow.energy_cm1);
    halves.push((Math.max(...places) - Math.min(...places)) / 2);
  }
  return halves;
}

function tryAssignment(
  request: CubicRequest,
  bands: readonly FieldBand[],
  groundMultiplicity: number,
  levels: readonly LevelKey[],
  at: FieldParameters,
  largestB: number,
): Trial | null {
  const shared = sharing(bands, levels);
  if (shared === null) return null;
  const targets = bands.map((band, i): TargetBand => ({
    energy_cm1: band.energy_cm1,
    se_cm1: Math.hypot(band.se_cm1, shared[i]!),
    level: levels[i]!,
  }));
  const splitting = shared.reduce((sum, half, i) => sum + (half / (0.05 * bands[i]!.energy_cm1)) ** 2, 0);
  const ratio = request.ratioCB ?? usualRatio;
  const usualB = 0.75 * largestB;
  for (const freedom of freedoms(bands.length, ratio)) {
    const B = freedom.B ? at.B : usualB;
    const start = { ...at, B, C: freedom.C === 'free' ? at.C : ratio * B };
    const solution = solveField(
      request.dElectrons,
      request.geometry,
      groundMultiplicity,
      targets,
      start,
      freedom,
    );
    const last = !freedom.B;
    if (!isDetermined(solution, freedom) && !last) continue;
    if (!Number.isFinite(solution.chi2)) return null;
    const partial = { solution, levels, freedom, groundMultiplicity };
    const wrongGround = solution.isGround ? 0 : 50;
    const cost =
      solution.chi2 +
      oddness(solution.parameters, largestB) +
      implausibility(partial, request) +
      splitting +
      wrongGround;
    return { ...partial, cost };
  }
  return null;
}

/** Ground multiplicities in question: the stated one, the one that the labels name, or all that the field allows. */
function named(request: FieldFitRequest, possible: readonly number[]): readonly number[] {
  if (request.groundMultiplicity !== undefined) return [request.groundMultiplicity];
  const inLabels = new Set(
    request.bands.map((band) => (band.label == null ? null : groundMultiplicityOf(band.label))),
  );
  const meant = possible.filter((multiplicity) => inLabels.has(multiplicity));
  return meant.length > 0 ? meant : possible;
}

/**
 * 10Dq, B and C of a complex from its band positions, by least squares through the exact levels of d^N in a cubic field.
 * Bands without a label are assigned too: all sensible assignments are fitted, the best is returned and the others are
 * listed. Parameters that the bands do not determine are tied or held and named as such. Throws a SpinhueError for input
 * that makes no sense or that no level can be found for.
 */
export function fitField(request: FieldFitRequest): FieldFit {
  const bands = checked(request);
  const largestB = freeIonB(request);
  const ratio = request.ratioCB ?? usualRatio;
  if (request.geometry !== 'octahedral' && request.geometry !== 'tetrahedral') {
    const spins = named(request, possibleMultiplicities(request.dElectrons));
    return fitLowSymmetry(request.geometry, request.dElectrons, bands, spins, ratio, largestB);
  }
  return fitCubic({ ...request, geometry: request.geometry }, bands, largestB);
}

/** A request whose field is cubic. */
export type CubicRequest = FieldFitRequest & { readonly geometry: CubicGeometry };

function fitCubic(request: CubicRequest, bands: readonly FieldBand[], largestB: FreeIonLimit): FieldFit {
  const ratio = request.ratioCB ?? usualRatio;
  const spins = named(request, groundMultiplicities(request.dElectrons, request.geometry));
  const trials: Trial[] = [];
  for (const groundMultiplicity of spins) {
    const candidates = candidateAssignments(request.dElectrons, request.geometry, groundMultiplicity, bands, [
      ratio,
      3.6,
      5.5,
    ]);
    for (const candidate of candidates.slice(0, mostCandidates)) {
      const trial = tryAssignment(
        request,
        bands,
        groundMultiplicity,
        candidate.levels,
        candidate.at,
        largestB.value,
      );
      if (trial !== null) trials.push(trial);
    }
  }
  trials.sort((a, b) => a.cost - b.cost);
  const best = trials[0];
  if (best === undefined) {
    throw new SpinhueError({
      code: 'no-convergence',
      field: 'bands',
      message: 'no assignment of these bands to levels of this ion can be fitted',
      remedy: 'check the d count, the labels and the multiplicities',
    });
  }
  return describeFit({
    request,
    bands,
    best,
    trials,
    largestB,
    textbook: textbookRule(
      request.dElectrons,
      request.geometry,
      bands.map((b) => b.energy_cm1),
      best.levels,
    ),
  });
}

export type { Trial };
