import type { Problem } from '../../../core/errors';
import type { Composition } from '../../../core/record/composition';
import type { NeededField, Relaxation, SearchResult, WhyNot } from '../../../core/search';
import type { CandidateSummary } from '../estimateSummary';
import type { Overlay } from '../protocol';

/** A result with what its row shows beyond the score. */
export interface ShownResult extends SearchResult {
  readonly summary: CandidateSummary;
}

/** What a search needs to go on after its worker has gone: plain data that can be stored. */
export interface Checkpoint {
  readonly evaluated: number;
  readonly skipped: number;
  readonly results: readonly SearchResult[];
}

export interface SearchState {
  readonly count: number;
  readonly evaluated: number;
  readonly skipped: number;
  /** Candidates gone through each second of running time; null before there is one to tell from. */
  readonly rate: number | null;
  /**
   * Null where the list is that of the report before: most reports bring no new result. A result that an earlier report
   * brought stands as its id.
   */
  readonly results: readonly (ShownResult | string)[] | null;
}

interface Wished {
  readonly wish: unknown;
  readonly overlay: Overlay;
}

/** Questions about a wish that are answered in one go. */
export type Question = { readonly job: number } & Wished &
  (
    | { readonly kind: 'count' }
    /** How well one complex would meet the wish, part by part. */
    | { readonly kind: 'score'; readonly composition: Composition }
    /** Which part to give up where nothing meets the whole wish. */
    | { readonly kind: 'relax' }
    /** The fields that would put a band of one ion into a window of the wish. */
    | {
        readonly kind: 'needed';
        readonly ion: string;
        readonly geometry: NeededField['geometry'];
        /** Place of the window among the bands of the wish. */
        readonly band: number;
      }
  );

export type ToSearch =
  | ({ readonly kind: 'start'; readonly top: number; readonly from: Checkpoint | null } & Wished)
  | { readonly kind: 'pause' }
  | { readonly kind: 'resume' }
  | Question;

/** One complex held against a wish. */
export interface ScoredCandidate {
  readonly formula: string;
  readonly score: SearchResult;
  /** Rules of the wish that keep it out of the search altogether. */
  readonly exclusions: WhyNot['exclusions'];
  readonly summary: CandidateSummary;
}

export type Reply =
  | { readonly kind: 'refused'; readonly problems: readonly Problem[] }
  | { readonly kind: 'counted'; readonly count: number }
  | { readonly kind: 'scored'; readonly scored: ScoredCandidate }
  | { readonly kind: 'advice'; readonly relaxations: readonly Relaxation[] }
  | { readonly kind: 'needed'; readonly fields: readonly NeededField[] };

export type FromSearch =
  | { readonly kind: 'refused'; readonly problems: readonly Problem[] }
  | { readonly kind: 'progress'; readonly state: SearchState; readonly finished: boolean }
  | { readonly kind: 'answer'; readonly job: number; readonly reply: Reply }
  | { readonly kind: 'failed'; readonly message: string; readonly job?: number };
