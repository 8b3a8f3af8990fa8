import { useCallback, useEffect, useRef, useState } from 'react';
import type { Problem } from '../../../core/errors';
import type { WishInput } from '../../../core/search';
import type { Overlay } from '../../workers/protocol';
import type { FromSearch, SearchState, ToSearch } from '../../workers/search/protocol';
import { startSearchWorker } from '../../workers/search/startSearchWorker';

export type Phase = 'idle' | 'running' | 'paused' | 'finished' | 'stopped';

export interface Search {
  readonly phase: Phase;
  readonly state: SearchState | null;
  readonly problems: readonly Problem[];
  readonly start: (wish: WishInput, overlay: Overlay) => void;
  readonly pause: () => void;
  readonly resume: () => void;
  /** Ends the search; what it has found stays. */
  readonly stop: () => void;
}

export const resultsShown = 50;

/** One search, run beside the window. Starting another one ends the one before; leaving the view ends it too. */
export function useSearch(): Search {
  const worker = useRef<Worker | null>(null);
  const [phase, setPhase] = useState<Phase>('idle');
  const [state, setState] = useState<SearchState | null>(null);
  const [problems, setProblems] = useState<readonly Problem[]>([]);

  const end = useCallback(() => {
    worker.current?.terminate();
    worker.current = null;
  }, []);
  useEffect(() => end, [end]);

  const fail = useCallback(
    (problem: Problem) => {
      end();
      setProblems([problem]);
      setPhase('stopped');
    },
    [end],
  );

  const start = useCallback(
    (wish: WishInput, overlay: Overlay) => {
      end();
      setState(null);
      setProblems([]);
      setPhase('running');
      const mine = startSearchWorker();
      worker.current = mine;
      mine.onmessage = ({ data }: MessageEvent<FromSearch>) => {
        if (data.kind === 'progress') {
          setState(data.state);
          if (data.finished) {
            end();
            setPhase('finished');
          }
        } else if (data.kind === 'refused') {
          end();
          setProblems(data.problems);
          setPhase('idle');
        } else if (data.kind === 'failed') {
          fail({ code: 'not-estimated', message: data.message, field: '' });
        }
      };
      mine.onerror = (event) =>
        fail({
          code: 'not-estimated',
          message: `The search stopped: ${event.message || 'no reason given'}`,
          field: '',
          remedy: 'start it again',
        });
      mine.postMessage({ kind: 'start', wish, overlay, top: resultsShown } satisfies ToSearch);
    },
    [end, fail],
  );
  const tell = useCallback((kind: 'pause' | 'resume') => {
    worker.current?.postMessage({ kind } satisfies ToSearch);
    setPhase(kind === 'pause' ? 'paused' : 'running');
  }, []);
  return {
    phase,
    state,
    problems,
    start,
    pause: () => tell('pause'),
    resume: () => tell('resume'),
    stop: () => {
      end();
      setPhase('stopped');
    },
  };
}
