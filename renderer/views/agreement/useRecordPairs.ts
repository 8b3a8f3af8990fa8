import { useCallback } from 'react';
import type { Measurement } from '../../../core/record/measurement';
import { useStored } from '../../app/services';
import { useProject } from '../../app/session/ProjectSession';
import type { Store } from '../../store';
import { type BandPair, informedBy, pairsOf } from './recordPairs';

const tables = ['measurements', 'frozenPredictions', 'analyses', 'parameterSets', 'candidates'] as const;

export interface RecordPairs {
  readonly pairs: readonly BandPair[];
  readonly measurements: readonly Measurement[];
  readonly frozen: Awaited<ReturnType<Store['frozenPredictions']['ofProject']>>;
  readonly analyses: Awaited<ReturnType<Store['analyses']['ofProject']>>;
}

/** Everything measured in the project beside what was predicted; candidates in the bin are left out. */
export function useRecordPairs(): { readonly value: RecordPairs | undefined; readonly error: string | null } {
  const { project, rows } = useProject();
  const ask = useCallback(
    async (store: Store): Promise<RecordPairs> => {
      const [all, frozen, analyses, sets] = await Promise.all([
        store.measurements.ofProject(project.id),
        store.frozenPredictions.ofProject(project.id),
        store.analyses.ofProject(project.id),
        store.parameterSets.of(project.id),
      ]);
      // Measurements of a candidate in the bin are in the bin with it.
      const measurements = all.filter(({ candidateId }) => rows.get(candidateId)?.deletedAt === null);
      const pairs = measurements.flatMap((each) => {
        const prediction = frozen.get(each.frozenPredictionId ?? '') ?? null;
        return pairsOf(each, prediction, analyses.get(each.id) ?? null, informedBy(sets, prediction));
      });
      return { pairs, measurements, frozen, analyses };
    },
    [project.id, rows],
  );
  return useStored(ask, tables);
}
