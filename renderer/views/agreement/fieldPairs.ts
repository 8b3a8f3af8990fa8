import { coverage, errorSummary, type ErrorSummary, type Share } from '../../../core/agreement';
import type { Analysis } from '../../../core/record/analysis';
import type { Measurement } from '../../../core/record/measurement';
import type { FrozenPrediction } from '../../../core/record/project';
import { currentContent } from '../../../core/record/revisions';
import { isFrozenAfterwards, isInformed } from './recordPairs';

/** 10Dq or B fitted to measured bands beside the value that stood predicted, cm⁻¹. */
export interface FieldPair {
  readonly id: string;
  readonly candidateId: string;
  readonly quantity: '10Dq' | 'B';
  readonly predicted: number;
  readonly sigma: number;
  readonly measured: number;
  readonly uncertainty: number;
  readonly frozenAfterwards: boolean;
  readonly isInSample: boolean;
}

interface FrozenField {
  readonly tenDq?: { readonly value?: unknown; readonly sigma?: unknown };
  readonly racahB?: { readonly value?: unknown; readonly sigma?: unknown };
}

const quantities = [
  ['10Dq', 'tenDq', 'tenDq'],
  ['B', 'B', 'racahB'],
] as const;

/** Pairs of the field fit of one measurement; a fit against physics, or a value that was held, makes none. */
export function fieldPairsOf(
  measurement: Measurement,
  frozen: FrozenPrediction | null,
  analysis: Analysis | null,
  informed: ReadonlySet<string>,
): FieldPair[] {
  const fit = analysis?.fieldFit ?? null;
  if (fit === null || frozen === null || fit.warnings.length > 0) return [];
  const prediction = frozen.prediction as FrozenField;
  const { date } = currentContent(measurement).conditions;
  return quantities.flatMap(([quantity, fitted, field]): FieldPair[] => {
    const { value, se, status } = fit[fitted];
    const { value: predicted, sigma } = prediction[field] ?? {};
    if (status !== 'fitted' || value === null || typeof predicted !== 'number') return [];
    if (typeof sigma !== 'number' || !(predicted > 0) || !(value > 0)) return [];
    return [
      {
        id: `${measurement.id} ${quantity}`,
        candidateId: measurement.candidateId,
        quantity,
        predicted,
        sigma,
        measured: value,
        uncertainty: se ?? 0,
        frozenAfterwards: isFrozenAfterwards(date, frozen),
        isInSample: isInformed(frozen, informed),
      },
    ];
  });
}

export interface FieldAgreement {
  /** In shares of the measured value, predicted minus measured: these errors grow with the value. */
  readonly errors: ErrorSummary;
  readonly within68: Share;
  readonly within95: Share;
}

/** How well one quantity was predicted; null where nothing can be counted. */
export function fieldAgreement(
  pairs: readonly FieldPair[],
  quantity: FieldPair['quantity'],
): FieldAgreement | null {
  const counted = pairs.filter(
    (pair) => pair.quantity === quantity && !pair.isInSample && !pair.frozenAfterwards,
  );
  if (counted.length === 0) return null;
  return {
    errors: errorSummary(counted.map(({ predicted, measured }) => predicted / measured - 1)),
    ...coverage(counted),
  };
}
