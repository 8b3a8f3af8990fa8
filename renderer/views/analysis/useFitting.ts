import { useCallback, useEffect, useRef, useState } from 'react';
import { fitInWorker } from '../../workers/fitting/fitInWorker';
import type { FittingRequest, FittingResults } from '../../workers/fitting/protocol';

interface Fitting<Kind extends FittingRequest['kind']> {
  readonly running: boolean;
  readonly error: string | null;
  /** Resolves to null where it was stopped or failed; a failure is shown. */
  readonly fit: (request: Extract<FittingRequest, { kind: Kind }>) => Promise<FittingResults[Kind] | null>;
  readonly stop: () => void;
}

/** One kind of fit, one at a time, beside the window. */
export function useFitting<Kind extends FittingRequest['kind']>(): Fitting<Kind> {
  const [running, setRunning] = useState(false);
  const [error, setError] = useState<string | null>(null);
  const abort = useRef<AbortController | null>(null);
  const stop = useCallback(() => abort.current?.abort(), []);
  useEffect(() => stop, [stop]);
  const fit = useCallback(async (request: Extract<FittingRequest, { kind: Kind }>) => {
    abort.current?.abort();
    const controller = new AbortController();
    abort.current = controller;
    setRunning(true);
    setError(null);
    try {
      return await fitInWorker<Kind>(request, controller.signal);
    } catch (cause) {
      if (!controller.signal.aborted) setError(cause instanceof Error ? cause.message : String(cause));
      return null;
    } finally {
      if (abort.current === controller) setRunning(false);
    }
  }, []);
  return { running, error, fit, stop };
}
