import { useCallback, useState } from 'react';
import { z } from 'zod';
import type { Candidate } from '../../../core/record/project';
import { drafts } from '../../store';
import { type Draft, draftOf, draftSchema, emptyDraft } from './draft';

/** With the revision that it was made from, so that a later change from elsewhere is noticed on saving. */
const keptSchema = z.strictObject({ draft: draftSchema, basedOn: z.int().nullable() });

/** The candidate as typed so far; kept through a crash or a reload until it is saved or given up. */
export function useDraft(projectId: string, candidate: Candidate | null) {
  const name = candidate === null ? `entry:${projectId}` : `edit:${candidate.id}`;
  const [{ draft, basedOn }, setKept] = useState(() => {
    const kept = keptSchema.safeParse(drafts.read(name));
    if (kept.success) return kept.data;
    return candidate === null
      ? { draft: emptyDraft, basedOn: null }
      : { draft: draftOf(candidate), basedOn: candidate.revision };
  });
  const set = useCallback(
    (next: Draft) => {
      setKept({ draft: next, basedOn });
      drafts.keep(name, { draft: next, basedOn });
    },
    [name, basedOn],
  );
  const drop = useCallback(
    (next: Draft) => {
      drafts.drop(name);
      setKept({ draft: next, basedOn });
    },
    [name, basedOn],
  );
  return { draft, basedOn, set, drop };
}
