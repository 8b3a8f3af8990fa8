import { cubicLevels } from '../dshell';
import type { CubicGeometry, CubicLevel } from '../dshell/types';
import type { ParameterLibrary } from '../library';
import {
  estimate,
  fieldLevels,
  isOxoCation,
  octahedralOccupation,
  strongSplittingShare,
  type DoubtShare,
  type Estimate,
  type FieldEstimate,
  type Reason,
  type SpinChoice,
} from '../estimation';
import { crossoverRatio, verticalGap } from './crossover';
import { entropyTerm_cm1, spinEntropy } from './entropy';
import { momentRange, spinOnlyMoment } from './moment';
import { hundUnpaired, spinPair, type SpinPair } from './multiplicities';
import { normalCdf } from './normal';
import type { SpinPrediction } from './types';
import { nearCrossoverBelow, spinWords } from './words';

export interface SpinAnswer {
  readonly prediction: SpinPrediction;
  /** The spin state whose 10Dq the levels are to be computed with. */
  readonly choice: SpinChoice;
}

export const roomTemperature_K = 298.15;

/** What the field model leaves out of the gap (elastic and solvation energies), cm⁻¹, one standard deviation. */
const modelGapSigma_cm1 = 900;

const crossoverCache = new Map<string, number | null>();
const gridStep = 0.25;

function crossoverOnGrid(d: number, geometry: CubicGeometry, step: number, pair: SpinPair): number | null {
  const key = `${d} ${geometry} ${step}`;
  const known = crossoverCache.get(key);
  if (known !== undefined) return known;
  const value = crossoverRatio(d, geometry, step * gridStep, pair.high + 1, pair.low + 1);
  crossoverCache.set(key, value);
  return value;
}

/** Linear in C/B between exact values a quarter apart: the curve is straight to 1 part in 10 000 there. */
function crossoverAt(d: number, geometry: CubicGeometry, ratioCB: number, pair: SpinPair): number | null {
  const position = ratioCB / gridStep;
  const below = Math.floor(position);
  const low = crossoverOnGrid(d, geometry, below, pair);
  const high = crossoverOnGrid(d, geometry, below + 1, pair);
  return low === null || high === null ? null : low + (position - below) * (high - low);
}

const scaledShares = (of: Estimate, factor: number): DoubtShare[] =>
  (of.shares ?? []).map(({ cause, sigma }) => ({ cause, sigma: sigma * factor }));

const orbitalDegeneracy = (levels: readonly CubicLevel[], multiplicity: number): number => {
  const lowest = levels
    .filter((level) => level.multiplicity === multiplicity)
    .reduce((a, b) => (b.energy < a.energy ? b : a));
  return lowest.degeneracy;
};

/**
 * Energy by which a strong Jahn-Teller distortion lowers each spin state: a quarter of the splitting of the eg pair
 * (the bottom of the linear E ⊗ e potential; I. B. Bersuker, The Jahn-Teller Effect, 2006, from memory).
 */
function jahnTellerLowering(d: number, spin: SpinChoice, tenDq: number): number {
  return octahedralOccupation(d, spin).e % 2 === 1 ? (strongSplittingShare * tenDq) / 4 : 0;
}

interface Gap {
  readonly relaxed: Estimate;
  readonly vertical: number;
  readonly entropy: { value: number; sigma: number };
}

function gapOf(field: FieldEstimate, geometry: CubicGeometry, pair: SpinPair): Gap {
  const d = field.dElectrons;
  const B = field.racahB.value!;
  const C = field.racahC.value!;
  const octahedral = geometry === 'octahedral';
  const strongHigh = octahedral && octahedralOccupation(d, 'high').e % 2 === 1;
  // g of a Jahn-Teller ion is a band centre, which lies half the eg splitting above the cubic 10Dq.
  const toCubic = strongHigh ? 1 - strongSplittingShare / 2 : 1;
  const middle = field.fields.middle.value! * toCubic;
  const levels = cubicLevels({ dElectrons: d, geometry, tenDq: middle, B, C });
  const at = verticalGap(levels, pair.high + 1, pair.low + 1);
  const lowering = octahedral
    ? jahnTellerLowering(d, 'high', field.fields.high.value! * toCubic) -
      jahnTellerLowering(d, 'low', field.fields.low.value!)
    : 0;
  const value = at.gap + lowering;
  const vertical = at.gap + at.slope.tenDq * (field.fields.high.value! * toCubic - middle) + lowering;
  const reasons: Reason[] = [
    {
      kind: 'assumption',
      text: field.twoDistances
        ? 'relaxed gap = exact gap at the mean of the two metal-ligand distances (equal force constants)'
        : 'exact gap at one metal-ligand distance',
    },
    {
      kind: 'doubt',
      text: 'elastic and solvation energies are outside a ligand-field model',
      sigma: modelGapSigma_cm1,
    },
    { kind: 'settle', text: 'a moment or spectrum at two temperatures' },
  ];
  if (lowering !== 0) {
    reasons.push({
      kind: 'assumption',
      text: `Jahn-Teller distortion lowers the ${lowering > 0 ? 'high' : 'low'}-spin state by ${Math.abs(Math.round(lowering / 10) * 10)} cm-1`,
      sigma: Math.abs(lowering) * 0.4,
    });
  }
  const relaxed = estimate(
    value,
    [
      ...scaledShares(field.fields.middle, at.slope.tenDq * toCubic),
      ...scaledShares(field.racahB, at.slope.B),
      ...scaledShares(field.racahC, at.slope.C),
      { cause: `gap-model:${field.ion.ion}`, sigma: modelGapSigma_cm1 },
      { cause: 'jahn-teller', sigma: lowering * 0.4 },
    ],
    field.fields.middle.route,
    reasons,
  );
  const promoted = octahedral
    ? octahedralOccupation(d, 'high').e - octahedralOccupation(d, 'low').e
    : (pair.high - pair.low) / 2;
  const entropy = spinEntropy(
    orbitalDegeneracy(levels, pair.high + 1),
    orbitalDegeneracy(levels, pair.low + 1),
    promoted,
  );
  return { relaxed, vertical, entropy };
}

function temperatureWindow(gap: Gap): readonly [number, number] {
  const perKelvin = entropyTerm_cm1(gap.entropy.value, 1);
  const at = (energy: number): number => Math.max(0, Math.round(-energy / perKelvin / 10) * 10);
  const { value, sigma } = gap.relaxed;
  return [at(value! + sigma!), at(value! - sigma!)];
}

const moments = (field: FieldEstimate, unpaired: number) => ({
  multiplicity: unpaired + 1,
  unpairedElectrons: unpaired,
  momentSpinOnly_BM: spinOnlyMoment(unpaired),
  momentRange_BM: momentRange(field.composition.geometry, field.dElectrons, unpaired, field.ion.period),
});

function onlyOne(field: FieldEstimate, unpaired: number): SpinAnswer {
  return {
    choice: 'high',
    prediction: {
      state: 'only',
      probabilityHigh: null,
      words: 'no choice of spin state',
      gap: null,
      nearCrossover: false,
      crossoverTenDqOverB: null,
      ...moments(field, unpaired),
    },
  };
}

/** A state that follows from the kind of ion and polyhedron alone; the probability is a rule of the trade. */
function byRule(field: FieldEstimate, pair: SpinPair, probabilityHigh: number): SpinAnswer {
  const high = probabilityHigh >= 0.5;
  return {
    choice: high ? 'high' : 'low',
    prediction: {
      state: high ? 'high' : 'low',
      probabilityHigh,
      words: spinWords(probabilityHigh),
      gap: null,
      nearCrossover: Math.max(probabilityHigh, 1 - probabilityHigh) < nearCrossoverBelow,
      crossoverTenDqOverB: null,
      ...moments(field, high ? pair.high : pair.low),
    },
  };
}

function withoutNumbers(field: FieldEstimate, pair: SpinPair): SpinAnswer {
  if (field.ion.period !== '3d') return byRule(field, pair, 0.02);
  if (field.composition.geometry === 'square-planar' && field.dElectrons === 8)
    return byRule(field, pair, 0.03);
  if (field.composition.geometry === 'tetrahedral') return byRule(field, pair, 0.98);
  return byRule(field, pair, 0.5);
}

/** What relaxation of the skeleton may add to a gap in a polyhedron that is neither cubic nor known, cm⁻¹. */
const overlapGapSigma_cm1 = 2000;

/** Spin state from the levels of a field that is not cubic: one geometry, no relaxation. */
function byLevels(field: FieldEstimate, library: ParameterLibrary, pair: SpinPair): SpinAnswer {
  const levels = fieldLevels(field, library, 'high', field.fields.middle);
  const ground = levels[0];
  if (ground === undefined) return withoutNumbers(field, pair);
  const high = levels.find(({ multiplicity }) => multiplicity === pair.high + 1);
  const other = levels.find(({ multiplicity }) => multiplicity < pair.high + 1);
  if (high === undefined || other === undefined) return onlyOne(field, ground.multiplicity - 1);
  const slope = (name: 'tenDq' | 'B' | 'C'): number => other.slope[name] - high.slope[name];
  const gap = estimate(
    other.energy - high.energy,
    [
      ...scaledShares(field.fields.middle, slope('tenDq')),
      ...scaledShares(field.racahB, slope('B')),
      ...scaledShares(field.racahC, slope('C')),
      { cause: `gap-model:${field.ion.ion}`, sigma: overlapGapSigma_cm1 },
    ],
    field.fields.middle.route,
    [
      {
        kind: 'assumption',
        text: 'exact gap in the ideal polyhedron, without relaxation',
        sigma: overlapGapSigma_cm1,
      },
    ],
  );
  const probabilityHigh = normalCdf(gap.value! / gap.sigma!);
  const unpaired = ground.multiplicity - 1;
  const state = unpaired === pair.high ? 'high' : unpaired === pair.low ? 'low' : 'intermediate';
  return {
    choice: state === 'high' ? 'high' : 'low',
    prediction: {
      state,
      probabilityHigh,
      words: state === 'intermediate' ? 'intermediate spin likely' : spinWords(probabilityHigh),
      gap,
      nearCrossover: Math.max(probabilityHigh, 1 - probabilityHigh) < nearCrossoverBelow,
      crossoverTenDqOverB: null,
      ...moments(field, unpaired),
    },
  };
}

/**
 * Spin state of a complex with its probability, from the exact levels of both spins under the stated uncertainties of
 * 10Dq, B and C/B. What counts as more stable is the free energy at `temperature_K`.
 */
export function spinState(
  field: FieldEstimate,
  library: ParameterLibrary,
  options: { readonly temperature_K?: number } = {},
): SpinAnswer {
  const temperature = options.temperature_K ?? roomTemperature_K;
  const pair = spinPair(field.dElectrons, field.composition.geometry);
  if (pair === null) return onlyOne(field, hundUnpaired(field.dElectrons));
  // A tetragonal octahedron is judged by its average field: the distortion comes with the spin state, not before it.
  const tetragonal = field.composition.geometry === 'tetragonal' && !isOxoCation(field.composition);
  const cubic = tetragonal ? 'octahedral' : field.cubic;
  const heavy = field.ion.period !== '3d';
  const planarPair = field.composition.geometry === 'square-planar' && field.dElectrons === 8;
  if (cubic === null && !heavy && !planarPair) return byLevels(field, library, pair);
  if (
    cubic === null ||
    heavy ||
    field.fields.middle.value === null ||
    field.racahB.value === null ||
    field.racahC.value === null
  ) {
    return withoutNumbers(field, pair);
  }
  const gap = gapOf(field, cubic, pair);
  const entropy = entropyTerm_cm1(gap.entropy.value, temperature);
  const sigma = Math.hypot(gap.relaxed.sigma!, entropyTerm_cm1(gap.entropy.sigma, temperature));
  const probabilityHigh = normalCdf((gap.relaxed.value! + entropy) / sigma);
  const high = probabilityHigh >= 0.5;
  const near = Math.max(probabilityHigh, 1 - probabilityHigh) < nearCrossoverBelow;
  return {
    choice: high ? 'high' : 'low',
    prediction: {
      state: high ? 'high' : 'low',
      probabilityHigh,
      words: spinWords(probabilityHigh),
      gap: gap.relaxed,
      verticalGap_cm1: gap.vertical,
      entropyTerm_cm1: entropy,
      temperature_K: temperature,
      nearCrossover: near,
      temperatureWindow_K: near ? temperatureWindow(gap) : null,
      crossoverTenDqOverB: crossoverAt(
        field.dElectrons,
        cubic,
        field.racahC.value / field.racahB.value,
        pair,
      ),
      ...moments(field, high ? pair.high : pair.low),
    },
  };
}
