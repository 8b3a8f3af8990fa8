import type { FittingAnswer, FittingRequest, FittingResults } from './protocol';

/** Fits beside the window; the worker ends with the answer or where the signal aborts. */
export function fitInWorker<Kind extends FittingRequest['kind']>(
  request: Extract<FittingRequest, { kind: Kind }>,
  signal: AbortSignal,
): Promise<FittingResults[Kind]> {
  const worker = new Worker(new URL('./fitting.worker.ts', import.meta.url), { type: 'module' });
  return new Promise<FittingResults[Kind]>((resolve, reject) => {
    signal.addEventListener('abort', () => reject(signal.reason as Error));
    worker.onmessage = ({ data }: MessageEvent<FittingAnswer>) => {
      if (data.ok) resolve(data.value as FittingResults[Kind]);
      else reject(new Error(data.remedy === null ? data.message : `${data.message}: ${data.remedy}.`));
    };
    worker.onerror = (event) => reject(new Error(event.message || 'The fit stopped for an unknown reason.'));
    worker.postMessage(request);
  }).finally(() => worker.terminate());
}
