import type { FromSearch, Question, Reply } from '../../../workers/search/protocol';
import { startSearchWorker } from '../../../workers/search/startSearchWorker';

export type Asked = Question extends infer Each ? (Each extends Question ? Omit<Each, 'job'> : never) : never;

interface Waiting {
  readonly resolve: (reply: Reply) => void;
  readonly reject: (error: Error) => void;
}

/** Asks about wishes beside the window, in one worker that is started with the first question. */
export class SearchAsker {
  #worker: Worker | null = null;
  #jobs = 0;
  readonly #waiting = new Map<number, Waiting>();

  ask(question: Asked): Promise<Reply> {
    const worker = (this.#worker ??= this.#start());
    const job = ++this.#jobs;
    return new Promise((resolve, reject) => {
      this.#waiting.set(job, { resolve, reject });
      worker.postMessage({ ...question, job });
    });
  }

  #start(): Worker {
    const worker = startSearchWorker();
    worker.onmessage = ({ data }: MessageEvent<FromSearch>) => {
      if (data.kind === 'answer') {
        this.#waiting.get(data.job)?.resolve(data.reply);
        this.#waiting.delete(data.job);
      } else if (data.kind === 'failed' && data.job !== undefined) {
        this.#waiting.get(data.job)?.reject(new Error(data.message));
        this.#waiting.delete(data.job);
      }
    };
    worker.onerror = (event) => {
      for (const { reject } of this.#waiting.values()) reject(new Error(event.message || 'no reason given'));
      this.#waiting.clear();
      worker.terminate();
      this.#worker = null;
    };
    return worker;
  }
}

export const searchAsker = new SearchAsker();
/** For questions that take seconds: the count above the form does not wait for them. */
export const patientAsker = new SearchAsker();
