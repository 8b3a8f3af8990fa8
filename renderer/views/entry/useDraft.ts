import { useCallback, useState } from 'react';
import type { Candidate } from '../../../core/record/project';
import { drafts } from '../../store';
import { type Draft, draftOf, draftSchema, emptyDraft } from './draft';

/** The candidate as typed so far; kept through a crash or a reload until it is saved or given up. */
export function useDraft(projectId: string, candidate: Candidate | null) {
  const name = candidate === null ? `entry:${projectId}` : `edit:${candidate.id}`;
  const [draft, setDraft] = useState<Draft>(() => {
    const kept = draftSchema.safeParse(drafts.read(name));
    if (kept.success) return kept.data;
    return candidate === null ? emptyDraft : draftOf(candidate);
  });
  const set = useCallback(
    (next: Draft) => {
      setDraft(next);
      drafts.keep(name, next);
    },
    [name],
  );
  const drop = useCallback(
    (next: Draft) => {
      drafts.drop(name);
      setDraft(next);
    },
    [name],
  );
  return { draft, set, drop };
}
