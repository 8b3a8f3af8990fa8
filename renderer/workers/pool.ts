import type { PredictionOutcome } from '../../core/prediction/types';
import type { CandidateInput } from '../../core/record/composition';
import { EstimateClient, type TakeSummaries, type WorkerLike } from './client';
import type { LevelLine } from '../plots/levelDiagram/levelLine';
import type { DiagramRequest, OneOptions, Overlay } from './protocol';

/** Rows per request: large enough to keep a worker busy, small enough to share the work evenly. */
const portion = 200;

/**
 * One worker answers single questions at once, the others work through long lists. They are started when first needed.
 */
export class EstimatePool {
  readonly #start: () => WorkerLike;
  readonly #size: number;
  #single: EstimateClient | null = null;
  #bulk: EstimateClient[] = [];
  #asked = false;

  constructor(start: () => WorkerLike, size: number) {
    this.#start = start;
    this.#size = Math.max(1, size);
  }

  /**
   * Starts the worker that answers single questions and lets it work through samples, one at a time: the first question
   * about each kind of ion takes longest. A real question ends it.
   */
  async warmUp(samples: readonly CandidateInput[]): Promise<void> {
    const client = this.#singleClient();
    for (const sample of samples) {
      if (this.#asked) return;
      await client.one(sample, null).catch(() => undefined);
    }
  }

  one(
    input: CandidateInput,
    overlay: Overlay,
    options: OneOptions = {},
    signal?: AbortSignal,
  ): Promise<PredictionOutcome> {
    this.#asked = true;
    // Draws take their time: they must not keep the next question waiting.
    const client = (options.draws ?? 0) > 0 ? this.#bulkClient(0) : this.#singleClient();
    return client.one(input, overlay, options, signal);
  }

  /** Level lines for a diagram. */
  diagram(request: DiagramRequest, signal?: AbortSignal): Promise<readonly LevelLine[]> {
    return this.#singleClient().diagram(request, signal);
  }

  #bulkClient(place: number): EstimateClient {
    while (this.#bulk.length <= place) this.#bulk.push(new EstimateClient(this.#start()));
    return this.#bulk[place]!;
  }

  #singleClient(): EstimateClient {
    this.#single ??= new EstimateClient(this.#start());
    return this.#single;
  }

  /** Shares the list out; resolves when all is done, rejects on the first failure or when the signal aborts. */
  async many(
    inputs: readonly CandidateInput[],
    overlay: Overlay,
    take: TakeSummaries,
    signal?: AbortSignal,
  ): Promise<void> {
    const wanted = Math.min(this.#size, Math.ceil(inputs.length / portion));
    let next = 0;
    const work = async (client: EstimateClient): Promise<void> => {
      while (next < inputs.length) {
        const share = inputs.slice(next, next + portion);
        next += portion;
        await client.many(share, overlay, take, signal);
      }
    };
    await Promise.all(Array.from({ length: wanted }, (_, place) => work(this.#bulkClient(place))));
  }

  close(): void {
    this.#single?.close();
    for (const client of this.#bulk) client.close();
    this.#single = null;
    this.#bulk = [];
  }
}
