import { useCallback, useMemo } from 'react';
import type { Composition } from '../../../core/record/composition';
import type { Candidate } from '../../../core/record/project';
import { useRouter } from '../../app/router/RouterContext';
import { useAction, useStore } from '../../app/services';
import { useProject } from '../../app/session/ProjectSession';
import { useToast } from '../../parts';
import { type Draft, emptyDraft, fieldsOf } from './draft';

interface Saving {
  readonly candidate: Candidate | null;
  readonly draft: Draft;
  /** Revision of the candidate that the draft was made from. */
  readonly basedOn: number | null;
  /** Null while the choices make no complex. */
  readonly composition: Composition | null;
  /** Told once the candidate is stored, with what the form shall hold next. Until then the draft stays. */
  readonly onSaved: (next: Draft) => void;
}

/** Stores a new candidate or the change of an old one. If storing fails, nothing on screen is lost. */
export function useSave({ candidate, draft, basedOn, composition, onSaved }: Saving) {
  const { project } = useProject();
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  const { go } = useRouter();

  const save = useCallback(async (): Promise<Candidate> => {
    const fields = { ...fieldsOf(draft), composition: composition! };
    if (candidate !== null) {
      return store.candidates.update(candidate, 'change a candidate', fields, basedOn ?? undefined);
    }
    const [row] = await store.candidates.create(project.id, [fields]);
    return row!;
  }, [store, project.id, candidate, draft, basedOn, composition]);

  return useMemo(() => {
    const run = (then: (saved: Candidate) => void): void => {
      if (composition === null) return;
      void act(async () => then(await save()));
    };
    return {
      /** Then shows its sheet. */
      andOpen: () =>
        run((saved) => {
          onSaved(emptyDraft);
          go({ view: 'sheet', project: project.id, item: saved.id });
        }),
      /** Keeps metal, state and geometry for the next one. */
      andGoOn: () =>
        run(() => {
          onSaved({
            ...emptyDraft,
            metal: draft.metal,
            oxidationState: draft.oxidationState,
            geometry: draft.geometry,
          });
          toast({
            message: 'Added to the project',
            undo: () => void act(() => store.journal.undo(project.id)),
          });
        }),
    };
  }, [act, save, onSaved, go, toast, store, project.id, composition, draft]);
}
