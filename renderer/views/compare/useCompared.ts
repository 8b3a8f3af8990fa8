import { useEffect, useMemo, useState } from 'react';
import type { Prediction, PredictionOutcome } from '../../../core/prediction/types';
import type { CandidateInput } from '../../../core/record/composition';
import { useServices } from '../../app/services';
import { inputOf } from '../../app/session/candidateInput';
import { useVersion } from '../../app/session/observable';
import { useProject } from '../../app/session/ProjectSession';
import { useLibrary } from '../../app/session/useLibrary';
import { compositionOf } from './compareItem';

/** One complex of a comparison; `candidateId` where it is one of the project. */
export interface Compared {
  readonly name: string;
  readonly candidateId: string | null;
  readonly prediction: Prediction;
}

export interface Comparison {
  readonly compared: readonly Compared[];
  /** Still awaited. */
  readonly waiting: number;
  /** What cannot be shown, each with the reason. */
  readonly refused: readonly { readonly name: string; readonly message: string }[];
}

interface Asked {
  readonly name: string;
  readonly candidateId: string | null;
  readonly counterIon: string | null;
  readonly input: CandidateInput | null;
}

/** The predictions of complexes named in an address, in its order. */
export function useCompared(names: readonly string[]): Comparison {
  const { rows, conditions, overlay } = useProject();
  const { pool } = useServices();
  const library = useLibrary();
  const version = useVersion(rows);
  const asked = useMemo(
    () =>
      names.map((name): Asked => {
        const candidate = rows.get(name);
        if (candidate) {
          const input = inputOf(candidate, conditions);
          return { name, candidateId: candidate.id, counterIon: candidate.counterIon, input };
        }
        const composition = compositionOf(name, library);
        const input = composition === null ? null : { ...composition, ...conditions, id: name };
        return { name, candidateId: null, counterIon: null, input };
      }),
    // The rows object stays the same while its content changes.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [names, rows, version, conditions, library],
  );
  const key = JSON.stringify([asked, overlay?.name ?? null]);
  const [answers, setAnswers] = useState<{ key: string; outcomes: ReadonlyMap<string, PredictionOutcome> }>({
    key: '',
    outcomes: new Map(),
  });
  useEffect(() => {
    const stop = new AbortController();
    void (async () => {
      const outcomes = new Map<string, PredictionOutcome>();
      for (const { name, input, counterIon } of asked) {
        if (input === null) continue;
        try {
          outcomes.set(name, await pool.one(input, overlay, { counterIon }, stop.signal));
        } catch (error) {
          if (stop.signal.aborted) return;
          const message = error instanceof Error ? error.message : String(error);
          outcomes.set(name, {
            ok: false,
            id: name,
            problems: [{ code: 'not-estimated', message, field: '' }],
          });
        }
        setAnswers({ key, outcomes: new Map(outcomes) });
      }
    })();
    return () => stop.abort();
    // The key stands for what is asked.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [key, pool]);

  return useMemo(() => {
    const outcomes = answers.key === key ? answers.outcomes : new Map<string, PredictionOutcome>();
    const compared: Compared[] = [];
    const refused: { name: string; message: string }[] = [];
    let waiting = 0;
    for (const { name, candidateId, input } of asked) {
      const outcome = outcomes.get(name);
      if (input === null && rows.state !== 'reading') {
        refused.push({
          name,
          message: 'it is neither a candidate of this project nor a complex of the library',
        });
      } else if (outcome === undefined) waiting += 1;
      else if (outcome.ok) compared.push({ name, candidateId, prediction: outcome.prediction });
      else refused.push({ name, message: outcome.problems[0]?.message ?? 'it is not estimated' });
    }
    return { compared, waiting, refused };
  }, [answers, key, asked, rows.state]);
}
