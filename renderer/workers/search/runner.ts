import type { ParameterLibrary } from '../../../core/library';
import {
  checkWish,
  scoreCandidate,
  searchWish,
  type SearchProgress,
  type SearchResult,
  type Wish,
} from '../../../core/search';
import { type CandidateSummary, summarise } from '../estimateSummary';
import type { Overlay } from '../protocol';
import { answer } from './answer';
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
      case 'start':
        this.#start(message).catch((error: unknown) =>
          this.#post({ kind: 'failed', message: wordsOf(error) }),
        );
        return;
      default:
        try {
          const reply = answer(message, this.#libraryOf(message.overlay));
          this.#post({ kind: 'answer', job: message.job, reply });
        } catch (error) {
          this.#post({ kind: 'failed', job: message.job, message: wordsOf(error) });
        }
    }
  }

  async #start(message: Extract<ToSearch, { kind: 'start' }>): Promise<void> {
    const library = this.#libraryOf(message.overlay);
    const checked = checkWish(message.wish, library);
    if (!checked.ok) this.#post({ kind: 'refused', problems: checked.problems });
    else await this.#search(checked.value, library, message);
  }

  async #search(
    wish: Wish,
    library: ParameterLibrary,
    { top, from }: Extract<ToSearch, { kind: 'start' }>,
  ): Promise<void> {
    const run = searchWish(wish, library, { top, ...(from === null ? {} : { from }) });
    const report = reporter(wish, library, from === null ? 0 : from.evaluated + from.skipped);
    let running_ms = 0;
    let reported_ms = -report_ms;
    for (;;) {
      const began = performance.now();
      let step = run.next();
      while (step.done !== true && performance.now() - began < stretch_ms) step = run.next();
      running_ms += performance.now() - began;
      if (step.done === true || running_ms - reported_ms >= report_ms) {
        reported_ms = running_ms;
        this.#post({
          kind: 'progress',
          state: report(step.value, running_ms),
          finished: step.done === true,
        });
      }
      if (step.done === true) return;
      if (this.#paused) await new Promise<void>((resolve) => (this.#wake = resolve));
      else await nextTurn();
    }
  }
}

const wordsOf = (error: unknown): string => (error instanceof Error ? error.message : String(error));

function summaryOf(result: SearchResult, wish: Wish, library: ParameterLibrary): CandidateSummary {
  const { id, metal, oxidationState, geometry, isomer, ligands } = result;
  const scored = scoreCandidate({ id, metal, oxidationState, geometry, isomer, ligands }, wish, library);
  return scored === null
    ? { ok: false, problems: [] }
    : summarise({ ok: true, prediction: scored.prediction });
}

/** Turns progress into reports: rows get what they show, and what was sent before is not sent again. */
function reporter(
  wish: Wish,
  library: ParameterLibrary,
  doneBefore: number,
): (progress: SearchProgress, running_ms: number) => SearchState {
  let sent: ReadonlySet<string> = new Set();
  let last: string | null = null;
  return ({ count, evaluated, skipped, results }, running_ms) => {
    const ids = results.map(({ id }) => id);
    const same = ids.join('\n') === last;
    last = ids.join('\n');
    const before = sent;
    // What has left the list is forgotten on both sides.
    sent = new Set(ids);
    const fresh = evaluated + skipped - doneBefore;
    return {
      count,
      evaluated,
      skipped,
      rate: fresh <= 0 ? null : (1000 * fresh) / Math.max(1, running_ms),
      results: same
        ? null
        : results.map((result): ShownResult | string =>
            before.has(result.id) ? result.id : { ...result, summary: summaryOf(result, wish, library) },
          ),
    };
  };
}
