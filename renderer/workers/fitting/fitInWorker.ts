import { runOnce } from '../runOnce';
import type { FittingAnswer, FittingRequest, FittingResults } from './protocol';

/** Fits beside the window; the worker ends with the answer or where the signal aborts. */
export const fitInWorker = <Kind extends FittingRequest['kind']>(
  request: Extract<FittingRequest, { kind: Kind }>,
  signal: AbortSignal,
): Promise<FittingResults[Kind]> =>
  runOnce<FittingAnswer, FittingResults[Kind]>(
    new Worker(new URL('./fitting.worker.ts', import.meta.url), { type: 'module' }),
    request,
    signal,
    (answer, { resolve, reject }) => {
      if (answer.ok) resolve(answer.value as FittingResults[Kind]);
      else
        reject(new Error(answer.remedy === null ? answer.message : `${answer.message}: ${answer.remedy}.`));
    },
  );
