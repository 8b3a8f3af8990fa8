import type { FileReading, ReadingAnswer, ReadingRequest } from './protocol';

/** No file that the limits let through takes longer on a slow machine. */
const longest_ms = 60_000;

/** Reads a file beside the window; ends with it where the signal aborts or a file takes too long. */
export function readInWorker(request: ReadingRequest, signal: AbortSignal): Promise<FileReading> {
  const worker = new Worker(new URL('./reading.worker.ts', import.meta.url), { type: 'module' });
  return new Promise<FileReading>((resolve, reject) => {
    const fail = (message: string): void => reject(new Error(message));
    const timer = setTimeout(() => fail('Reading this file takes too long; it was given up.'), longest_ms);
    signal.addEventListener('abort', () => {
      clearTimeout(timer);
      reject(signal.reason as Error);
    });
    worker.onmessage = ({ data }: MessageEvent<ReadingAnswer>) => {
      clearTimeout(timer);
      if (data.ok) resolve(data.value);
      else fail(data.message);
    };
    worker.onerror = (event) => fail(`Reading stopped: ${event.message || 'no reason given'}.`);
    worker.postMessage(request);
  }).finally(() => worker.terminate());
}
