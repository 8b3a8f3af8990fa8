import { useEffect, useMemo, useState } from 'react';
import type { PredictionOutcome } from '../../../core/prediction/types';
import type { CandidateInput } from '../../../core/record/composition';
import { useServices } from '../services';
import { useProject } from './ProjectSession';
import type { OneOptions } from '../../workers/protocol';

export interface AskedPrediction {
  /** The last answer; it stays while the next one is awaited. */
  readonly outcome: PredictionOutcome | null;
  /** Whether the answer belongs to what is asked now. */
  readonly current: boolean;
  readonly error: string | null;
}

interface Answer {
  readonly question: string;
  readonly outcome: PredictionOutcome | null;
  readonly error: string | null;
}

const none: Answer = { question: '', outcome: null, error: null };

/** The whole prediction for one candidate, asked anew whenever the question changes. */
export function usePrediction(input: CandidateInput | null, options: OneOptions = {}): AskedPrediction {
  const { pool } = useServices();
  const { overlay } = useProject();
  const [answer, setAnswer] = useState<Answer>(none);
  const question = useMemo(() => (input === null ? '' : JSON.stringify([input, options])), [input, options]);

  useEffect(() => {
    if (question === '') return;
    const stop = new AbortController();
    const [asked, wanted] = JSON.parse(question) as [CandidateInput, OneOptions];
    pool.one(asked, overlay, wanted, stop.signal).then(
      (outcome) => setAnswer({ question, outcome, error: null }),
      (error: unknown) => {
        if (stop.signal.aborted) return;
        setAnswer({ question, outcome: null, error: error instanceof Error ? error.message : String(error) });
      },
    );
    return () => stop.abort();
  }, [pool, overlay, question]);

  if (question === '') return { outcome: null, current: true, error: null };
  return { outcome: answer.outcome, current: answer.question === question, error: answer.error };
}
