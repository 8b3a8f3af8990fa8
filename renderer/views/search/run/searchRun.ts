import type { Problem } from '../../../../core/errors';
import type { WishInput } from '../../../../core/search';
import { Observable } from '../../../app/session/observable';
import type { Overlay } from '../../../workers/protocol';
import type {
  Checkpoint,
  FromSearch,
  SearchState,
  ShownResult,
  ToSearch,
} from '../../../workers/search/protocol';
import { startSearchWorker } from '../../../workers/search/startSearchWorker';

/** `stopped` can go on; `refused` and `failed` cannot. */
export type Phase = 'running' | 'paused' | 'stopped' | 'finished' | 'refused' | 'failed';

/** Kept of one search; as many are listed at most. */
export const resultsKept = 200;

export interface RunSetup {
  readonly id: string;
  readonly projectId: string;
  readonly wish: WishInput;
  readonly overlay: Overlay;
  /** ISO 8601 */
  readonly startedAt: string;
  readonly from: Checkpoint | null;
}

type SearchWorker = Pick<Worker, 'postMessage' | 'terminate' | 'onmessage' | 'onerror'>;

/** One search beside the window. It outlives the view that started it. */
export class SearchRun extends Observable {
  readonly setup: RunSetup;
  readonly #startWorker: () => SearchWorker;
  #worker: SearchWorker | null = null;
  #phase: Phase = 'running';
  #state: SearchState | null = null;
  #results: readonly ShownResult[] = [];
  #problems: readonly Problem[] = [];

  constructor(setup: RunSetup, startWorker: () => SearchWorker = startSearchWorker) {
    super();
    this.setup = setup;
    this.#startWorker = startWorker;
    this.#begin(setup.from);
  }

  get phase(): Phase {
    return this.#phase;
  }
  get state(): SearchState | null {
    return this.#state;
  }
  get results(): readonly ShownResult[] {
    return this.#results;
  }
  get problems(): readonly Problem[] {
    return this.#problems;
  }
  /** Whether it has work left that it could do. */
  get open(): boolean {
    return this.#phase === 'running' || this.#phase === 'paused' || this.#phase === 'stopped';
  }

  /** What it needs to go on in another window; null before there is anything to keep. */
  get checkpoint(): Checkpoint | null {
    if (this.#state === null) return this.setup.from;
    const { evaluated, skipped } = this.#state;
    return { evaluated, skipped, results: this.#results.map(({ summary: _, ...result }) => result) };
  }

  pause(): void {
    if (this.#phase !== 'running') return;
    this.#tell({ kind: 'pause' });
    this.#turn('paused');
  }

  /** Goes on after a pause, or from where it was stopped. */
  resume(): void {
    if (this.#phase === 'paused') {
      this.#tell({ kind: 'resume' });
      this.#turn('running');
    } else if (this.#phase === 'stopped') {
      this.#turn('running');
      this.#begin(this.checkpoint);
    }
  }

  /** Gives the processor back; what was found stays, and it can go on from there. */
  stop(): void {
    if (this.#phase !== 'running' && this.#phase !== 'paused') return;
    this.#end();
    this.#turn('stopped');
  }

  /** Ends it for good. */
  dispose(): void {
    this.#end();
    this.stopTelling();
  }

  #begin(from: Checkpoint | null): void {
    const worker = this.#startWorker();
    this.#worker = worker;
    worker.onmessage = ({ data }: MessageEvent<FromSearch>) => {
      if (this.#worker === worker) this.#hear(data);
    };
    worker.onerror = (event) =>
      this.#fail(`The search stopped: ${event.message || 'no reason was given'}`, 'start it again');
    const { wish, overlay } = this.setup;
    this.#tell({ kind: 'start', wish, overlay, top: resultsKept, from });
  }

  #hear(message: FromSearch): void {
    if (message.kind === 'progress') {
      this.#state = message.state;
      if (message.state.results !== null) this.#results = merged(this.#results, message.state.results);
      if (message.finished) this.#end();
      this.#turn(message.finished ? 'finished' : this.#phase);
    } else if (message.kind === 'refused') {
      this.#end();
      this.#problems = message.problems;
      this.#turn('refused');
    } else if (message.kind === 'failed') {
      this.#fail(message.message);
    }
  }

  #fail(message: string, remedy?: string): void {
    this.#end();
    this.#problems = [
      { code: 'not-estimated', message, field: '', ...(remedy === undefined ? {} : { remedy }) },
    ];
    this.#turn('failed');
  }

  #turn(phase: Phase): void {
    this.#phase = phase;
    this.changed();
  }

  #tell(message: ToSearch): void {
    this.#worker?.postMessage(message);
  }

  #end(): void {
    this.#worker?.terminate();
    this.#worker = null;
  }
}

/** A list whose known members are named by id only. */
function merged(
  before: readonly ShownResult[],
  given: readonly (ShownResult | string)[],
): readonly ShownResult[] {
  const known = new Map(before.map((result) => [result.id, result]));
  return given.flatMap((each) => (typeof each === 'string' ? (known.get(each) ?? []) : each));
}
