import type { EstimateRoute } from '../estimation';
import { predict, type Prediction, type PredictOptions } from '../prediction';
import { compareColour, type ColourComparison } from './compareColour';
import { firstAllowed, matchBands, matchChargeTransfer } from './matchBands';
import type { MeasuredBand, MeasuredComplex } from './measuredSet';

export interface ValuePair {
  readonly measured: number;
  readonly predicted: number | null;
  readonly sigma: number | null;
  /** (predicted - measured) / measured */
  readonly relativeError: number | null;
}

export interface BandComparison extends ValuePair {
  readonly kind: string;
  readonly assignment: string | null;
  readonly feature: string;
  readonly label: string | null;
}

export interface SpinComparison {
  readonly found: string;
  readonly predicted: string;
  readonly probabilityHigh: number | null;
  readonly nearCrossover: boolean;
  /** A flag says that the model fails here. */
  readonly badged: boolean;
  /** Null for crossover complexes, which are neither. */
  readonly right: boolean | null;
}

/** One complex, predicted beside measured. */
export interface ComplexComparison {
  readonly id: string;
  readonly formula: string;
  readonly useForTuning: boolean;
  readonly route: EstimateRoute;
  readonly tenDq: ValuePair | null;
  readonly racahB: ValuePair | null;
  readonly firstBand: BandComparison | null;
  readonly bands: readonly BandComparison[];
  readonly chargeTransfer: readonly BandComparison[];
  readonly spin: SpinComparison | null;
  readonly moment: { readonly measured: number; readonly inside: boolean | null } | null;
  readonly colour: ColourComparison | null;
  /** There were d-d bands and none could be predicted. */
  readonly notEstimated: boolean;
  readonly flags: readonly string[];
  readonly problem: string | null;
}

const pairOf = (measured: number, predicted: number | null, sigma: number | null): ValuePair => ({
  measured,
  predicted,
  sigma,
  relativeError: predicted === null ? null : (predicted - measured) / measured,
});

const bandPair = (
  measured: MeasuredBand,
  predicted: { energy_cm1: number; sigma_cm1: number; label: string } | null,
): BandComparison => ({
  ...pairOf(measured.energy_cm1, predicted?.energy_cm1 ?? null, predicted?.sigma_cm1 ?? null),
  kind: measured.kind,
  assignment: measured.assignment,
  feature: measured.feature,
  label: predicted?.label ?? null,
});

function compareSpin(measured: MeasuredComplex, { spin, flags }: Prediction): SpinComparison | null {
  const found = measured.groundSpin;
  if (found === null || found === 'only') return null;
  return {
    found,
    predicted: spin.state,
    probabilityHigh: spin.probabilityHigh,
    nearCrossover: spin.nearCrossover,
    badged: flags.some(({ severity }) => severity === 'invalid'),
    right: found === 'crossover' ? null : found === spin.state,
  };
}

const hasDd = (bands: readonly MeasuredBand[]): boolean =>
  bands.some(({ kind }) => kind === 'spin-allowed' || kind === 'spin-forbidden');

function unpredicted(measured: MeasuredComplex, problem: string): ComplexComparison {
  return {
    id: measured.id,
    formula: measured.formula,
    useForTuning: measured.useForTuning,
    route: 'not-estimated',
    tenDq: measured.tenDq === null ? null : pairOf(measured.tenDq, null, null),
    racahB: measured.racahB === null ? null : pairOf(measured.racahB, null, null),
    firstBand: null,
    bands: [],
    chargeTransfer: [],
    spin: null,
    moment: null,
    colour: null,
    notEstimated: hasDd(measured.bands),
    flags: [],
    problem,
  };
}

/** Predicts a complex from its composition alone and puts the result beside what was measured. */
export function compareComplex(measured: MeasuredComplex, options: PredictOptions = {}): ComplexComparison {
  const outcome = predict(measured.composition, { draws: 200, ...options, library: measured.library });
  if (!outcome.ok) return unpredicted(measured, outcome.problems[0]!.message);
  const { prediction } = outcome;
  const pairs = matchBands(measured.bands, prediction.bands);
  const first = firstAllowed(measured.bands);
  const firstPair = pairs.find((pair) => pair.measured === first);
  const range = prediction.spin.momentRange_BM;
  return {
    id: measured.id,
    formula: measured.formula,
    useForTuning: measured.useForTuning,
    route: prediction.tenDq.route,
    tenDq:
      measured.tenDq === null ? null : pairOf(measured.tenDq, prediction.tenDq.value, prediction.tenDq.sigma),
    racahB:
      measured.racahB === null
        ? null
        : pairOf(measured.racahB, prediction.racahB.value, prediction.racahB.sigma),
    firstBand: first === null ? null : bandPair(first, firstPair?.predicted ?? null),
    bands: pairs.map((pair) => bandPair(pair.measured, pair.predicted)),
    chargeTransfer: matchChargeTransfer(measured.bands, prediction.bands).map((pair) =>
      bandPair(pair.measured, pair.predicted),
    ),
    spin: compareSpin(measured, prediction),
    moment:
      measured.muEff === null
        ? null
        : {
            measured: measured.muEff,
            inside:
              range === null ? null : measured.muEff >= range[0] - 0.1 && measured.muEff <= range[1] + 0.1,
          },
    colour: compareColour(measured, prediction),
    notEstimated: hasDd(measured.bands) && pairs.length === 0,
    flags: prediction.flags.map(({ code }) => code),
    problem: null,
  };
}
