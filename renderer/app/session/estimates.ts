import type { CandidateInput } from '../../../core/record/composition';
import type { Candidate } from '../../../core/record/project';
import type { EstimateCache } from '../../store';
import type { CandidateSummary } from '../../workers/estimateSummary';
import type { EstimatePool } from '../../workers/pool';
import type { Overlay } from '../../workers/protocol';
import { type Conditions, estimateKey, inputOf } from './candidateInput';
import { Observable } from './observable';

/** Questions looked up and sent off together. */
const portion = 1000;

export interface EstimatesSetup {
  readonly pool: Pick<EstimatePool, 'many'>;
  readonly cache: Pick<EstimateCache, 'read' | 'write'>;
  readonly conditions: Conditions;
  readonly overlay: Overlay;
  /** Names model and parameters: an answer of another model is never shown. */
  readonly madeWith: string;
}

/** Summaries for the rows of a project: from memory, from the stored cache, or computed in the background. */
export class Estimates extends Observable {
  readonly #setup: EstimatesSetup;
  readonly #keyOf = new Map<string, string>();
  readonly #summaries = new Map<string, CandidateSummary>();
  readonly #waiting = new Map<string, CandidateInput>();
  #stop = new AbortController();
  #asked = 0;
  #answered = 0;
  #running = false;
  #error: string | null = null;

  constructor(setup: EstimatesSetup) {
    super();
    this.#setup = setup;
  }

  /** Undefined while it is being computed. */
  of(candidateId: string): CandidateSummary | undefined {
    const key = this.#keyOf.get(candidateId);
    return key === undefined ? undefined : this.#summaries.get(key);
  }

  /** Null when nothing is being computed. */
  get progress(): { readonly done: number; readonly total: number } | null {
    return this.#running ? { done: this.#answered, total: this.#asked } : null;
  }

  get error(): string | null {
    return this.#error;
  }

  /** Sees to it that each of these has a summary of what it now is. */
  want(candidates: readonly Candidate[]): void {
    for (const candidate of candidates) {
      const input = inputOf(candidate, this.#setup.conditions);
      const key = estimateKey(input, this.#setup.madeWith);
      this.#keyOf.set(candidate.id, key);
      if (this.#summaries.has(key) || this.#waiting.has(key)) continue;
      this.#waiting.set(key, { ...input, id: key });
      this.#asked += 1;
    }
    if (this.#waiting.size > 0 && !this.#running) void this.#work();
  }

  /** Ends what is being computed; what is known stays. */
  stop(): void {
    this.#stop.abort();
    this.#stop = new AbortController();
    this.#waiting.clear();
    this.#running = false;
    this.#asked = this.#answered = 0;
    this.stopTelling();
  }

  async #work(): Promise<void> {
    const { signal } = this.#stop;
    this.#running = true;
    this.#error = null;
    try {
      while (this.#waiting.size > 0 && !signal.aborted) {
        const inputs: CandidateInput[] = [];
        for (const [key, input] of this.#waiting) {
          if (inputs.length >= portion) break;
          this.#waiting.delete(key);
          inputs.push(input);
        }
        await this.#answer(inputs, signal);
      }
    } catch (error) {
      if (!signal.aborted) this.#error = error instanceof Error ? error.message : String(error);
    }
    if (signal.aborted) return;
    this.#running = false;
    this.#asked = this.#answered = 0;
    this.changed();
  }

  async #answer(inputs: readonly CandidateInput[], signal: AbortSignal): Promise<void> {
    const { cache, pool, overlay, madeWith } = this.#setup;
    const stored = await cache.read(inputs.map(({ id }) => id));
    const open: CandidateInput[] = [];
    inputs.forEach((input, index) => {
      const summary = stored[index] as CandidateSummary | undefined;
      if (summary === undefined) open.push(input);
      else this.#take(input.id, summary);
    });
    if (open.length > 0) {
      const fresh: { key: string; madeWith: string; summary: CandidateSummary }[] = [];
      await pool.many(
        open,
        overlay,
        (summaries) => {
          for (const [key, summary] of summaries) {
            this.#take(key, summary);
            fresh.push({ key, madeWith, summary });
          }
        },
        signal,
      );
      await cache.write(fresh);
    }
  }

  #take(key: string, summary: CandidateSummary): void {
    this.#summaries.set(key, summary);
    this.#answered += 1;
    this.changed(120);
  }
}
