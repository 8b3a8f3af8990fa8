import type { Recalibration } from '../../../core/agreement/recalibration';
import type { RecalibrationAnswer, RecalibrationRequest } from './protocol';

/** Recalibrates beside the window; the worker ends with the answer or where the signal aborts. */
export function recalibrateInWorker(
  request: RecalibrationRequest,
  signal: AbortSignal,
  onProgress: (done: number, of: number) => void,
): Promise<Recalibration> {
  const worker = new Worker(new URL('./recalibration.worker.ts', import.meta.url), { type: 'module' });
  return new Promise<Recalibration>((resolve, reject) => {
    signal.addEventListener('abort', () => reject(signal.reason as Error));
    worker.onmessage = ({ data }: MessageEvent<RecalibrationAnswer>) => {
      if (data.kind === 'progress') onProgress(data.done, data.of);
      else if (data.kind === 'result') resolve(data.value);
      else reject(new Error(data.message));
    };
    worker.onerror = (event) => reject(new Error(event.message || 'It stopped for an unknown reason.'));
    worker.postMessage(request);
  }).finally(() => worker.terminate());
}
