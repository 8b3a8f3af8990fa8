import { runOnce } from '../runOnce';
import type { FileReading, ReadingAnswer, ReadingRequest } from './protocol';

/** No file that the limits let through takes longer on a slow machine. */
const longest_ms = 60_000;

/** Reads a file beside the window; ends with it where the signal aborts or a file takes too long. */
export const readInWorker = (request: ReadingRequest, signal: AbortSignal): Promise<FileReading> =>
  runOnce<ReadingAnswer, FileReading>(
    new Worker(new URL('./reading.worker.ts', import.meta.url), { type: 'module' }),
    request,
    AbortSignal.any([signal, AbortSignal.timeout(longest_ms)]),
    (answer, { resolve, reject }) => {
      if (answer.ok) resolve(answer.value);
      else reject(new Error(answer.message));
    },
  ).catch((error: unknown) => {
    if (error instanceof DOMException && error.name === 'TimeoutError')
      throw new Error('Reading this file takes too long; it was given up.');
    throw error;
  });
