import type { Problem } from '../../../core/errors';
import type { SearchResult } from '../../../core/search';
import type { CandidateSummary } from '../estimateSummary';
import type { Overlay } from '../protocol';

/** A result with what its row shows beyond the score. */
export interface ShownResult extends SearchResult {
  readonly summary: CandidateSummary;
}

export interface SearchState {
  readonly count: number;
  readonly evaluated: number;
  readonly skipped: number;
  /** Candidates gone through each second of running time; null before there is one to tell from. */
  readonly rate: number | null;
  readonly results: readonly ShownResult[];
}

export type ToSearch =
  | { readonly kind: 'count'; readonly wish: unknown; readonly overlay: Overlay }
  | { readonly kind: 'start'; readonly wish: unknown; readonly overlay: Overlay; readonly top: number }
  | { readonly kind: 'pause' }
  | { readonly kind: 'resume' };

export type FromSearch =
  | { readonly kind: 'counted'; readonly count: number }
  | { readonly kind: 'refused'; readonly problems: readonly Problem[] }
  | { readonly kind: 'progress'; readonly state: SearchState; readonly finished: boolean }
  | { readonly kind: 'failed'; readonly message: string };
