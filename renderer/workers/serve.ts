import type { PredictionOutcome } from '../../core/prediction/types';
import type { CandidateInput } from '../../core/record/composition';
import { type CandidateSummary, summarise } from './estimateSummary';
import type { FromWorker, Overlay, ToWorker } from './protocol';
import { visibleTransmittance } from './transmittance';

/** Estimates one candidate; made anew for each overlay, so that the library is laid over once per job. */
export type Predictor = (input: CandidateInput, draws: number) => PredictionOutcome;

export interface Port {
  postMessage(message: FromWorker): void;
}

/** Longest stretch of work between two looks at the mail, ms. */
const stretch_ms = 40;

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
        const input = inputs[place]!;
        summaries.push([input.id, summaryOf(predict, input)]);
        place += 1;
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
      const outcome = predictorFor(message.overlay)(message.input, message.draws);
      port.postMessage({ kind: 'outcome', job, outcome });
    } catch (error) {
      failed(error);
    }
  };
}

/** One candidate that breaks the engine must not take the others along. */
function summaryOf(predict: Predictor, input: CandidateInput): CandidateSummary {
  try {
    return summarise(predict(input, 0), ({ bands, conditions }) =>
      bands.length === 0
        ? null
        : visibleTransmittance(bands, conditions.concentration_mM, conditions.path_cm),
    );
  } catch (error) {
    const message = error instanceof Error ? error.message : String(error);
    return { ok: false, problems: [{ code: 'not-estimated', message, field: 'composition' }] };
  }
}
