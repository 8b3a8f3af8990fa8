import {
  coverage,
  errorSummary,
  standardScore,
  type ErrorSummary,
  type Share,
} from '../../../core/agreement';
import { assignBands } from '../../../core/measured/assignment/assignBands';
import { complexKey } from '../../../core/library/parameterLibrary';
import type { Analysis } from '../../../core/record/analysis';
import type { Composition } from '../../../core/record/composition';
import type { ListedBand, Measurement, MeasurementContent } from '../../../core/record/measurement';
import type { FrozenPrediction, ParameterSet } from '../../../core/record/project';
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
  /** The complex itself went into the parameters of its prediction: agreement says nothing of others. */
  readonly isInSample: boolean;
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

/** A band of a measurement that a prediction can be held against. */
interface Compared {
  readonly energy_cm1: { readonly value: number; readonly u: number | null };
  readonly feature: ListedBand['feature'];
  readonly partner: Band | null;
}

/** Bands of a kept assignment beside the partners that were chosen or found for them. */
function assigned(analysis: Analysis, feature: Compared['feature'], predicted: readonly Band[]): Compared[] {
  return analysis.assignment.map(({ energy_cm1, label, predicted_cm1 }) => ({
    energy_cm1,
    feature,
    partner:
      label === null
        ? null
        : (predicted.find((band) => band.label === label && band.energy_cm1 === predicted_cm1) ?? null),
  }));
}

/** Bands of a list beside the partners of the cheapest one-to-one matching. */
function matched(bands: readonly ListedBand[], predicted: readonly Band[]): Compared[] {
  const possible = partners(predicted, bands);
  const found = assignBands(
    bands.map(({ energy_cm1, molarAbsorptivity }) => ({
      energy_cm1: energy_cm1.value,
      u_cm1: energy_cm1.u ?? 0,
      molarAbsorptivity: molarAbsorptivity?.value ?? null,
    })),
    possible,
    { count: 1 },
  );
  return bands.map(({ energy_cm1, feature }, index) => {
    const place = found?.best.pairs[index]?.predicted ?? null;
    return { energy_cm1, feature, partner: place === null ? null : possible[place]! };
  });
}

function comparedOf(
  content: MeasurementContent,
  analysis: Analysis | null,
  predicted: readonly Band[],
): Compared[] {
  const kept = analysis !== null && analysis.assignment.length > 0 ? analysis : null;
  if (content.kind === 'spectrum') return kept === null ? [] : assigned(kept, 'fitted centre', predicted);
  if (content.kind !== 'band list') return [];
  if (kept?.assignment.length !== content.bands.length) return matched(content.bands, predicted);
  // The assignment says whose band it is; how it was read off is told by the list itself.
  return assigned(kept, 'maximum', predicted).map((band, index) => ({
    ...band,
    feature: content.bands[index]!.feature,
  }));
}

/**
 * Pairs of one measurement: bands as they were assigned, else the cheapest matching with the bands of its frozen
 * prediction. A spectrum counts once its bands are fitted and assigned.
 *
 * @param informed Complexes whose measurements went into the parameters of the prediction: no test of it.
 */
export function pairsOf(
  measurement: Measurement,
  frozen: FrozenPrediction | null,
  analysis: Analysis | null = null,
  informed: ReadonlySet<string> = none,
): BandPair[] {
  const content = currentContent(measurement);
  const isInSample = isInformed(frozen, informed);
  return comparedOf(content, analysis, bandsOf(frozen)).map(
    ({ energy_cm1, feature, partner }, index): BandPair => {
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
        isInSample,
      };
    },
  );
}

const none: ReadonlySet<string> = new Set();

/** Key of the complex that a frozen prediction is about; empty where it names none. */
function keyOfFrozen({ prediction }: FrozenPrediction): string {
  const { composition } = prediction as { composition?: Composition };
  return composition === undefined ? '' : complexKey(composition);
}

/** Whether the complex itself went into the parameters that its prediction was made with. */
export const isInformed = (frozen: FrozenPrediction | null, informed: ReadonlySet<string>): boolean =>
  frozen !== null && informed.has(keyOfFrozen(frozen));

/** Complexes that informed the parameter set a prediction was made with, by the hash of the set. */
export const informedBy = (
  sets: readonly ParameterSet[],
  frozen: FrozenPrediction | null,
): ReadonlySet<string> => new Set(sets.find(({ hash }) => hash === frozen?.parameterHash)?.informedBy ?? []);

export type Counted = BandPair & {
  readonly predicted: NonNullable<BandPair['predicted']>;
  readonly residual: number;
};

/** Pairs that test the prediction: a shoulder is no centre, and what was measured before freezing tests nothing. */
export const countedPairs = (pairs: readonly BandPair[]): Counted[] =>
  pairs.filter(
    (pair): pair is Counted =>
      pair.predicted !== null && pair.feature !== 'shoulder' && !pair.frozenAfterwards && !pair.isInSample,
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
