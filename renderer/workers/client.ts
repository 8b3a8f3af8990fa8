import type { PredictionOutcome } from '../../core/prediction/types';
import type { CandidateInput } from '../../core/record/composition';
import type { CandidateSummary } from './estimateSummary';
import type { LevelLine } from '../plots/levelDiagram/levelLine';
import type { DiagramRequest, FromWorker, OneOptions, Overlay, ToWorker } from './protocol';

/** The part of a `Worker` that is used: tests put an object in its place. */
export interface WorkerLike {
  postMessage(message: ToWorker): void;
  terminate(): void;
  onmessage: ((event: MessageEvent<FromWorker>) => void) | null;
  onerror: ((event: ErrorEvent) => void) | null;
}

export type TakeSummaries = (summaries: readonly (readonly [string, CandidateSummary])[]) => void;

interface Job {
  readonly take: (message: FromWorker) => void;
  readonly fail: (error: Error) => void;
}

/** Worker-side jobs as promises, with cancel by `AbortSignal`. One instance owns one worker. */
export class EstimateClient {
  readonly #worker: WorkerLike;
  readonly #jobs = new Map<number, Job>();
  #next = 1;

  constructor(worker: WorkerLike) {
    this.#worker = worker;
    worker.onmessage = ({ data }) => {
      const job = this.#jobs.get(data.job);
      if (data.kind === 'failed') job?.fail(new Error(data.message));
      else job?.take(data);
    };
    worker.onerror = (event) => {
      const error = new Error(`The estimating process stopped: ${event.message || 'no reason given'}.`);
      for (const job of [...this.#jobs.values()]) job.fail(error);
    };
  }

  /** Jobs that wait for an answer. */
  get busy(): number {
    return this.#jobs.size;
  }

  /** The whole answer for one candidate. */
  one(
    input: CandidateInput,
    overlay: Overlay,
    options: OneOptions = {},
    signal?: AbortSignal,
  ): Promise<PredictionOutcome> {
    return this.#run<PredictionOutcome>(signal, (job) => ({ kind: 'one', job, input, overlay, options }), {
      outcome: ({ outcome }, resolve) => resolve(outcome),
    });
  }

  diagram(request: DiagramRequest, signal?: AbortSignal): Promise<readonly LevelLine[]> {
    return this.#run<readonly LevelLine[]>(signal, (job) => ({ kind: 'diagram', job, request }), {
      lines: ({ lines }, resolve) => resolve(lines),
    });
  }

  /** Summaries for many, handed over in portions; resolves when all are done or the signal aborts. */
  many(
    inputs: readonly CandidateInput[],
    overlay: Overlay,
    take: TakeSummaries,
    signal?: AbortSignal,
  ): Promise<void> {
    return this.#run<void>(signal, (job) => ({ kind: 'many', job, inputs, overlay }), {
      summaries: ({ summaries }) => take(summaries),
      finished: (_, resolve) => resolve(),
    });
  }

  close(): void {
    this.#worker.terminate();
    for (const job of [...this.#jobs.values()]) job.fail(new DOMException('closed', 'AbortError'));
  }

  #run<R>(
    signal: AbortSignal | undefined,
    request: (job: number) => ToWorker,
    handlers: {
      [K in FromWorker['kind']]?: (
        message: Extract<FromWorker, { kind: K }>,
        resolve: (result: R) => void,
      ) => void;
    },
  ): Promise<R> {
    if (signal?.aborted) return Promise.reject(signal.reason as Error);
    const job = this.#next++;
    return new Promise<R>((resolve, reject) => {
      const leave = (): void => {
        this.#jobs.delete(job);
        signal?.removeEventListener('abort', abort);
      };
      const abort = (): void => {
        leave();
        this.#worker.postMessage({ kind: 'cancel', job });
        reject(signal!.reason as Error);
      };
      this.#jobs.set(job, {
        take: (message) => {
          const handle = handlers[message.kind] as
            ((m: FromWorker, r: (result: R) => void) => void) | undefined;
          handle?.(message, (result) => {
            leave();
            resolve(result);
          });
        },
        fail: (error) => {
          leave();
          reject(error);
        },
      });
      signal?.addEventListener('abort', abort);
      this.#worker.postMessage(request(job));
    });
  }
}
