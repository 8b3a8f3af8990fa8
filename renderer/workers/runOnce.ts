interface Settle<Value> {
  readonly resolve: (value: Value) => void;
  readonly reject: (error: Error) => void;
}

/**
 * One question to a worker that is made for it and ends with its answer, or at once where the signal aborts.
 *
 * @param onAnswer Settles the promise, or takes note of progress and leaves it open.
 */
export function runOnce<Answer, Value>(
  worker: Worker,
  request: unknown,
  signal: AbortSignal,
  onAnswer: (answer: Answer, settle: Settle<Value>) => void,
): Promise<Value> {
  return new Promise<Value>((resolve, reject) => {
    signal.addEventListener('abort', () => reject(signal.reason as Error));
    worker.onmessage = ({ data }: MessageEvent<Answer>) => onAnswer(data, { resolve, reject });
    worker.onerror = ({ message }) => reject(new Error(message || 'It stopped for an unknown reason.'));
    worker.postMessage(request);
  }).finally(() => worker.terminate());
}
