import { useCallback } from 'react';
import { useAction, useServices } from '../../app/services';
import { useProject } from '../../app/session/ProjectSession';
import { formatShare, useToast } from '../../parts';
import { counted, type ShortlistEntry } from '../../store';
import type { ShownResult } from '../../workers/search/protocol';
import type { SearchRun } from './run/searchRun';

/** Takes results into the project; the prediction of each is frozen together with the wish that it was found for. */
export function useShortlist(run: SearchRun | undefined): (results: readonly ShownResult[]) => void {
  const { project, conditions } = useProject();
  const { store, pool } = useServices();
  const act = useAction();
  const toast = useToast();
  return useCallback(
    (results) => {
      if (run === undefined) return;
      const { wish, overlay } = run.setup;
      const seen = {
        concentration_mM: wish.colour?.concentration_mM ?? conditions.concentration_mM,
        path_cm: wish.colour?.path_cm ?? conditions.path_cm,
      };
      void act(async () => {
        const entries: ShortlistEntry[] = [];
        for (const { id, metal, oxidationState, geometry, isomer, ligands, ...result } of results) {
          const composition = { metal, oxidationState, geometry, ligands, isomer: isomer ?? null };
          const outcome = await pool.one({ ...composition, ...seen, id }, overlay);
          if (!outcome.ok)
            throw new Error(outcome.problems[0]?.message ?? `${result.formula} is not estimated`);
          const { probability, parts } = result;
          entries.push({
            composition,
            prediction: outcome.prediction,
            reason: `found for the wish “${wish.name}”, chance ${formatShare(probability)}`,
            shortlistedFor: { wish, probability, parts },
          });
        }
        await store.shortlist.add(project.id, entries);
        const what = results.length === 1 ? results[0]!.formula : counted(results.length, 'result');
        toast({
          message: `${what} in the project, the prediction frozen with the wish`,
          undo: () => void act(() => store.journal.undo(project.id)),
        });
      });
    },
    [act, conditions, pool, project.id, run, store, toast],
  );
}
