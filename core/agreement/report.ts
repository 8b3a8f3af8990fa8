import { coverage, type Pair } from './pairs';
import { brierScore, confusionTable, type ConfusionTable } from './brier';
import type { BandComparison, ComplexComparison, ValuePair } from './compareComplex';
import { errorSummary, type ErrorSummary } from './summary';
import { shareOf, type Share } from './wilson';

/** How well a set of complexes was predicted. Relative errors are fractions of the measured value. */
export interface AgreementReport {
  readonly complexes: number;
  readonly firstBand: ErrorSummary;
  readonly tenDq: ErrorSummary;
  /** 10Dq could be estimated. */
  readonly tenDqEstimated: Share;
  /** The same errors without complexes whose own 10Dq is an anchor of the library. */
  readonly tenDqNotAnchored: ErrorSummary;
  readonly racahB: ErrorSummary;
  /** Entries with d-d bands for which none could be predicted. */
  readonly notEstimated: Share;
  /** Neither near crossover nor badged. */
  readonly spinRight: Share;
  readonly spinRightOfAll: Share;
  readonly crossoversSeen: Share;
  readonly spinTable: ConfusionTable;
  readonly brier: number | null;
  readonly spinMissed: readonly string[];
  readonly bandsWithin68: Share;
  readonly bandsWithin95: Share;
  readonly chargeTransferWithin4000: Share;
  readonly hueRight: Share;
  readonly momentsInside: Share;
}

const relative = (pairs: readonly (ValuePair | null)[]): number[] =>
  pairs.flatMap((pair) => (pair?.relativeError == null ? [] : [pair.relativeError]));

const asPair = ({ measured, predicted, sigma }: BandComparison): Pair[] =>
  predicted === null || sigma === null ? [] : [{ measured, predicted, sigma, uncertainty: 0 }];

const shareWhere = <T>(items: readonly T[], holds: (item: T) => boolean): Share =>
  shareOf(items.filter(holds).length, items.length);

export function agreementReport(comparisons: readonly ComplexComparison[]): AgreementReport {
  const withTenDq = comparisons.filter(({ tenDq }) => tenDq !== null);
  const spins = comparisons.flatMap(({ id, spin }) => (spin === null ? [] : [{ id, ...spin }]));
  const decided = spins.filter(({ right }) => right !== null);
  const fair = decided.filter(({ nearCrossover, badged }) => !nearCrossover && !badged);
  const forecasts = decided.flatMap(({ found, probabilityHigh }) =>
    probabilityHigh === null ? [] : [{ probability: probabilityHigh, happened: found === 'high' }],
  );
  const withDd = comparisons.filter(({ bands, notEstimated }) => bands.length > 0 || notEstimated);
  const { within68, within95 } = coverage(comparisons.flatMap(({ bands }) => bands.flatMap(asPair)));
  const transfer = comparisons.flatMap(({ chargeTransfer }) => chargeTransfer);
  const colours = comparisons.flatMap(({ colour }) => colour ?? []);
  const moments = comparisons.flatMap(({ moment }) => (moment?.inside == null ? [] : [moment]));
  return {
    complexes: comparisons.length,
    firstBand: errorSummary(relative(comparisons.map(({ firstBand }) => firstBand))),
    tenDq: errorSummary(relative(withTenDq.map(({ tenDq }) => tenDq))),
    tenDqEstimated: shareWhere(withTenDq, ({ tenDq }) => tenDq!.predicted !== null),
    tenDqNotAnchored: errorSummary(
      relative(withTenDq.filter(({ route }) => route !== 'measured-relative').map(({ tenDq }) => tenDq)),
    ),
    racahB: errorSummary(relative(comparisons.map(({ racahB }) => racahB))),
    notEstimated: shareWhere(withDd, ({ notEstimated }) => notEstimated),
    spinRight: shareWhere(fair, ({ right }) => right === true),
    spinRightOfAll: shareWhere(decided, ({ right }) => right === true),
    crossoversSeen: shareWhere(
      spins.filter(({ found }) => found === 'crossover'),
      ({ nearCrossover, badged }) => nearCrossover || badged,
    ),
    spinTable: confusionTable(
      decided
        .filter(({ found }) => found === 'high' || found === 'low')
        .map(({ found, predicted }) => ({
          foundHigh: found === 'high',
          predictedHigh: predicted === 'high',
        })),
    ),
    brier: forecasts.length === 0 ? null : brierScore(forecasts),
    spinMissed: decided.filter(({ right }) => right === false).map(({ id }) => id),
    bandsWithin68: within68,
    bandsWithin95: within95,
    chargeTransferWithin4000: shareWhere(
      transfer,
      ({ measured, predicted }) => predicted !== null && Math.abs(predicted - measured) <= 4000,
    ),
    hueRight: shareWhere(colours, ({ right }) => right),
    momentsInside: shareWhere(moments, ({ inside }) => inside === true),
  };
}
