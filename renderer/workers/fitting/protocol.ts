import type { CountComparison } from '../../../core/measured/bandFit/compareCounts';
import type { BandFit, BandFitRequest } from '../../../core/measured/bandFit/fitBands';
import type { FieldFit, FieldFitRequest } from '../../../core/measured/fieldFit/fitField';

export type FittingRequest =
  | { readonly kind: 'bands'; readonly request: BandFitRequest }
  | { readonly kind: 'counts'; readonly request: Omit<BandFitRequest, 'start'>; readonly most: number }
  | { readonly kind: 'field'; readonly request: FieldFitRequest };

/** What each kind of fit gives. */
export interface FittingResults {
  readonly bands: BandFit;
  readonly counts: readonly CountComparison[];
  readonly field: FieldFit;
}

export type FittingAnswer =
  | { readonly ok: true; readonly value: FittingResults[keyof FittingResults] }
  | { readonly ok: false; readonly message: string; readonly remedy: string | null };
