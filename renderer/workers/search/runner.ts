import type { ParameterLibrary } from '../../../core/library';
import {
  checkWish,
  countCandidates,
  scoreCandidate,
  searchWish,
  spaceOf,
  type SearchProgress,
  type SearchResult,
  type Wish,
} from '../../../core/search';
import { type CandidateSummary, summarise } from '../estimateSummary';
import type { Overlay } from '../protocol';
import type { FromSearch, SearchState, ShownResult, ToSearch } from './protocol';

/** Longest stretch of work between two looks at the mail, and between two reports, ms. */
const stretch_ms = 40;
const report_ms = 250;

const nextTurn = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 0));

/** One search at a time in stretches, so that pause gets through; to cancel, the worker is ended. */
export class SearchRunner {
  readonly #post: (message: FromSearch) => void;
  readonly #libraryOf: (overlay: Overlay) => ParameterLibrary;
  #paused = false;
  #wake: () => void = () => undefined;

  constructor(post: (message: FromSearch) => void, libraryOf: (overlay: Overlay) => ParameterLibrary) {
    this.#post = post;
    this.#libraryOf = libraryOf;
  }

  handle(message: ToSearch): void {
    switch (message.kind) {
      case 'pause':
        this.#paused = true;
        return;
      case 'resume':
        this.#paused = false;
        this.#wake();
        return;
      case 'count':
      case 'start':
        this.#begin(message).catch((error: unknown) =>
          this.#post({ kind: 'failed', message: error instanceof Error ? error.message : String(error) }),
        );
    }
  }

  async #begin(message: Extract<ToSearch, { wish: unknown }>): Promise<void> {
    const library = this.#libraryOf(message.overlay);
    const checked = checkWish(message.wish, library);
    if (!checked.ok) {
      this.#post({ kind: 'refused', problems: checked.problems });
    } else if (message.kind === 'count') {
      this.#post({ kind: 'counted', count: countCandidates(spaceOf(checked.value, library)) });
    } else {
      await this.#search(checked.value, library, message.top);
    }
  }

  async #search(wish: Wish, library: ParameterLibrary, top: number): Promise<void> {
    const run = searchWish(wish, library, { top });
    const summaries = new Map<string, CandidateSummary>();
    let running_ms = 0;
    let reported_ms = -report_ms;
    for (;;) {
      const from = performance.now();
      let step = run.next();
      while (step.done !== true && performance.now() - from < stretch_ms) step = run.next();
      running_ms += performance.now() - from;
      if (step.done === true || running_ms - reported_ms >= report_ms) {
        reported_ms = running_ms;
        const state = shown(step.value, running_ms, (result) => {
          const known = summaries.get(result.id) ?? summaryOf(result, wish, library);
          summaries.set(result.id, known);
          return known;
        });
        this.#post({ kind: 'progress', state, finished: step.done === true });
      }
      if (step.done === true) return;
      if (this.#paused) await new Promise<void>((resolve) => (this.#wake = resolve));
      else await nextTurn();
    }
  }
}

function summaryOf(result: SearchResult, wish: Wish, library: ParameterLibrary): CandidateSummary {
  const { id, metal, oxidationState, geometry, isomer, ligands } = result;
  const scored = scoreCandidate({ id, metal, oxidationState, geometry, isomer, ligands }, wish, library);
  return scored === null
    ? { ok: false, problems: [] }
    : summarise({ ok: true, prediction: scored.prediction });
}

function shown(
  { count, evaluated, skipped, results }: SearchProgress,
  running_ms: number,
  summary: (result: SearchResult) => CandidateSummary,
): SearchState {
  const done = evaluated + skipped;
  return {
    count,
    evaluated,
    skipped,
    rate: done === 0 ? null : (1000 * done) / Math.max(1, running_ms),
    results: results.map((result): ShownResult => ({ ...result, summary: summary(result) })),
  };
}
