import {
  coverage,
  errorSummary,
  standardScore,
  type ErrorSummary,
  type Share,
} from '../../../core/agreement';
import { assignBands } from '../../../core/measured/assignment/assignBands';
import type { ListedBand, Measurement } from '../../../core/record/measurement';
import type { FrozenPrediction } from '../../../core/record/project';
import { currentContent } from '../../../core/record/revisions';
import type { Band } from '../../../core/transitions/types';

/** One measured band beside the band of the prediction that stood when it was saved. */
export interface BandPair {
  readonly id: string;
  readonly measurementId: string;
  readonly candidateId: string;
  readonly feature: ListedBand['feature'];
  readonly measured: number;
  readonly u: number | null;
  /** Null where no predicted band fits within three standard deviations. */
  readonly predicted: Pick<Band, 'label' | 'kind' | 'energy_cm1' | 'sigma_cm1'> | null;
  /** Measured minus predicted, cm⁻¹. */
  readonly residual: number | null;
  /** Residual over the joint standard deviation. */
  readonly score: number | null;
  /** The measurement is dated before its prediction was frozen: no test of it. */
  readonly frozenAfterwards: boolean;
}

/** Bands of a frozen prediction; it is kept as loose JSON, perhaps by an older version. */
export function bandsOf(frozen: FrozenPrediction | null): Band[] {
  const { bands } = (frozen?.prediction ?? {}) as { bands?: unknown };
  if (!Array.isArray(bands)) return [];
  return (bands as Partial<Band>[]).filter(
    (band): band is Band =>
      Number.isFinite(band.energy_cm1) && Number.isFinite(band.sigma_cm1) && typeof band.label === 'string',
  );
}

/** Whether the date of measuring lies before the day on which its prediction was frozen. */
export const isFrozenAfterwards = (date: string | null, frozen: FrozenPrediction | null): boolean =>
  date !== null && frozen !== null && date < frozen.frozenAt.slice(0, 10);

/**
 * Weak spin-forbidden bands lie everywhere: they are partners only of bands whose strength is known, so that it can speak
 * against them, or where the complex has no spin-allowed band at all.
 */
function partners(bands: readonly Band[], measured: readonly ListedBand[]): readonly Band[] {
  if (measured.every(({ molarAbsorptivity }) => molarAbsorptivity !== null)) return bands;
  const strong = bands.filter(({ kind }) => kind !== 'spin-forbidden');
  return strong.some(({ kind }) => kind === 'spin-allowed') ? strong : bands;
}

/** Pairs of one measurement: the cheapest one-to-one matching with the bands of its frozen prediction. */
export function pairsOf(measurement: Measurement, frozen: FrozenPrediction | null): BandPair[] {
  const content = currentContent(measurement);
  if (content.kind !== 'band list') return [];
  const predicted = partners(bandsOf(frozen), content.bands);
  const matched = assignBands(
    content.bands.map(({ energy_cm1, molarAbsorptivity }) => ({
      energy_cm1: energy_cm1.value,
      u_cm1: energy_cm1.u ?? 0,
      molarAbsorptivity: molarAbsorptivity?.value ?? null,
    })),
    predicted,
    { count: 1 },
  );
  return content.bands.map(({ energy_cm1, feature }, index): BandPair => {
    const place = matched?.best.pairs[index]?.predicted ?? null;
    const partner = place === null ? null : predicted[place]!;
    const [measured, u] = [energy_cm1.value, energy_cm1.u];
    return {
      id: `${measurement.id} ${index}`,
      measurementId: measurement.id,
      candidateId: measurement.candidateId,
      feature,
      measured,
      u,
      predicted: partner,
      residual: partner === null ? null : measured - partner.energy_cm1,
      score:
        partner === null
          ? null
          : standardScore({
              predicted: partner.energy_cm1,
              sigma: partner.sigma_cm1,
              measured,
              uncertainty: u ?? 0,
            }),
      frozenAfterwards: isFrozenAfterwards(content.conditions.date, frozen),
    };
  });
}

export type Counted = BandPair & {
  readonly predicted: NonNullable<BandPair['predicted']>;
  readonly residual: number;
};

/** Pairs that test the prediction: a shoulder is no centre, and what was measured before freezing tests nothing. */
export const countedPairs = (pairs: readonly BandPair[]): Counted[] =>
  pairs.filter(
    (pair): pair is Counted =>
      pair.predicted !== null && pair.feature !== 'shoulder' && !pair.frozenAfterwards,
  );

export interface Agreement {
  readonly errors: ErrorSummary;
  readonly within68: Share;
  readonly within95: Share;
}

/** Null where nothing can be counted. Errors are predicted minus measured, cm⁻¹. */
export function agreementOf(pairs: readonly BandPair[]): Agreement | null {
  const counted = countedPairs(pairs);
  if (counted.length === 0) return null;
  return {
    errors: errorSummary(counted.map(({ residual }) => -residual)),
    ...coverage(
      counted.map(({ predicted, measured, u }) => ({
        predicted: predicted.energy_cm1,
        sigma: predicted.sigma_cm1,
        measured,
        uncertainty: u ?? 0,
      })),
    ),
  };
}
