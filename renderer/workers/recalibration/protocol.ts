import type { PlainObservation, Recalibration } from '../../../core/agreement/recalibration';
import type { ParameterValues } from '../../../core/library';

export interface RecalibrationRequest {
  readonly observations: readonly PlainObservation[];
  /** Values in use, that the proposal starts from; null for the library as it is. */
  readonly overlay: ParameterValues | null;
}

export type RecalibrationAnswer =
  | { readonly kind: 'progress'; readonly done: number; readonly of: number }
  | { readonly kind: 'result'; readonly value: Recalibration }
  | { readonly kind: 'failed'; readonly message: string };
