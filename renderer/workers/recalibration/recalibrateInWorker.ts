import type { Recalibration } from '../../../core/agreement/recalibration';
import { runOnce } from '../runOnce';
import type { RecalibrationAnswer, RecalibrationRequest } from './protocol';

/** Recalibrates beside the window; the worker ends with the answer or where the signal aborts. */
export const recalibrateInWorker = (
  request: RecalibrationRequest,
  signal: AbortSignal,
  onProgress: (done: number, of: number) => void,
): Promise<Recalibration> =>
  runOnce<RecalibrationAnswer, Recalibration>(
    new Worker(new URL('./recalibration.worker.ts', import.meta.url), { type: 'module' }),
    request,
    signal,
    (answer, { resolve, reject }) => {
      if (answer.kind === 'progress') onProgress(answer.done, answer.of);
      else if (answer.kind === 'result') resolve(answer.value);
      else reject(new Error(answer.message));
    },
  );
