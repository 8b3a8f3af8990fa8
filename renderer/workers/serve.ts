import type { PredictionOutcome } from '../../core/prediction/types';
import type { CandidateInput } from '../../core/record/composition';
import { diagramLines } from './diagram';
import { type CandidateSummary, summarise } from './estimateSummary';
import type { FromWorker, OneOptions, Overlay, ToWorker } from './protocol';

/** Estimates candidates, with one answer for each, in order. */
export type Predictor = (inputs: readonly CandidateInput[], options?: OneOptions) => PredictionOutcome[];

export interface Port {
  postMessage(message: FromWorker): void;
}

/** Longest stretch of work between two looks at the mail, ms. */
const stretch_ms = 40;
/** Estimated in one call, since the library is laid over anew with each. */
const handful = 10;

const nextTurn = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 0));

/** Answers requests one after another; long ones in stretches, so that a cancel gets through. */
export function serve(
  port: Port,
  predictorFor: (overlay: Overlay) => Predictor,
): (message: ToWorker) => void {
  const cancelled = new Set<number>();

  async function many({ job, inputs, overlay }: Extract<ToWorker, { kind: 'many' }>): Promise<void> {
    const predict = predictorFor(overlay);
    let place = 0;
    while (place < inputs.length && !cancelled.has(job)) {
      const summaries: (readonly [string, CandidateSummary])[] = [];
      const until = performance.now() + stretch_ms;
      do {
        const share = inputs.slice(place, place + handful);
        summaries.push(...summariesOf(predict, share));
        place += share.length;
      } while (place < inputs.length && performance.now() < until);
      port.postMessage({ kind: 'summaries', job, summaries });
      await nextTurn();
    }
    cancelled.delete(job);
    port.postMessage({ kind: 'finished', job });
  }

  return (message) => {
    if (message.kind === 'cancel') {
      cancelled.add(message.job);
      return;
    }
    const { job } = message;
    const failed = (error: unknown): void =>
      port.postMessage({
        kind: 'failed',
        job,
        message: error instanceof Error ? error.message : String(error),
      });
    if (message.kind === 'many') {
      many(message).catch(failed);
      return;
    }
    try {
      if (message.kind === 'diagram') {
        port.postMessage({ kind: 'lines', job, lines: diagramLines(message.request) });
        return;
      }
      const [outcome] = predictorFor(message.overlay)([message.input], message.options);
      port.postMessage({ kind: 'outcome', job, outcome: outcome! });
    } catch (error) {
      failed(error);
    }
  };
}

type Entry = readonly [id: string, summary: CandidateSummary];

/** One candidate that breaks the engine must not take the others along. */
function summariesOf(predict: Predictor, inputs: readonly CandidateInput[]): Entry[] {
  try {
    const outcomes = predict(inputs);
    return inputs.map(({ id }, index): Entry => [id, summarise(outcomes[index]!)]);
  } catch (error) {
    if (inputs.length > 1) return inputs.flatMap((input) => summariesOf(predict, [input]));
    const message = error instanceof Error ? error.message : String(error);
    return inputs.map(({ id }): Entry => [
      id,
      { ok: false, problems: [{ code: 'not-estimated', message, field: 'composition' }] },
    ]);
  }
}
