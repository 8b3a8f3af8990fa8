import { useCallback, useMemo } from 'react';
import type { Measurement } from '../../../core/record/measurement';
import type { ParameterSet } from '../../../core/record/project';
import { useStored } from '../../app/services';
import { useVersion } from '../../app/session/observable';
import { useProject } from '../../app/session/ProjectSession';
import type { Store } from '../../store';
import { type FieldPair, fieldPairsOf } from './fieldPairs';
import { type BandPair, informedBy, pairsOf } from './recordPairs';

const tables = ['measurements', 'frozenPredictions', 'analyses', 'parameterSets'] as const;

export interface RecordPairs {
  readonly pairs: readonly BandPair[];
  readonly fields: readonly FieldPair[];
  readonly measurements: readonly Measurement[];
  readonly frozen: Awaited<ReturnType<Store['frozenPredictions']['ofProject']>>;
  readonly analyses: Awaited<ReturnType<Store['analyses']['ofProject']>>;
  /** Parameter sets of the project, newest first. */
  readonly sets: readonly ParameterSet[];
}

/** Everything measured in the project beside what was predicted; candidates in the bin are left out. */
export function useRecordPairs(): { readonly value: RecordPairs | undefined; readonly error: string | null } {
  const { project, rows } = useProject();
  const version = useVersion(rows);
  const ask = useCallback((store: Store) => everything(store, project.id), [project.id]);
  const { value: all, error } = useStored(ask, tables);
  const value = useMemo(() => {
    // After a change of parameters the rows are read anew; until then nobody knows which of them lie in the bin.
    if (all === undefined || rows.state === 'reading') return undefined;
    const kept = ({ candidateId }: { candidateId: string }): boolean =>
      rows.get(candidateId)?.deletedAt === null;
    return {
      ...all,
      measurements: all.measurements.filter(kept),
      pairs: all.pairs.filter(kept),
      fields: all.fields.filter(kept),
    };
    // The rows change in place; their version says so.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [all, rows, rows.state, version]);
  return { value, error };
}

async function everything(store: Store, projectId: string): Promise<RecordPairs> {
  const [measurements, frozen, analyses, sets] = await Promise.all([
    store.measurements.ofProject(projectId),
    store.frozenPredictions.ofProject(projectId),
    store.analyses.ofProject(projectId),
    store.parameterSets.of(projectId),
  ]);
  const judged = measurements.map((each) => {
    const prediction = frozen.get(each.frozenPredictionId ?? '') ?? null;
    return [each, prediction, analyses.get(each.id) ?? null, informedBy(sets, prediction)] as const;
  });
  const pairs = judged.flatMap((each) => pairsOf(...each));
  const fields = judged.flatMap((each) => fieldPairsOf(...each));
  return { pairs, fields, measurements, frozen, analyses, sets };
}
