import { useCallback, useState } from 'react';
import { freshDraft, type WishDraft } from './wish/wishDraft';

/** Forms as they were left, by project: looking at another view loses nothing that was typed. */
const drafts = new Map<string, WishDraft>();

export function useDraft(projectId: string): [WishDraft, (draft: WishDraft) => void] {
  const [draft, setDraft] = useState(() => drafts.get(projectId) ?? freshDraft);
  const set = useCallback(
    (next: WishDraft) => {
      drafts.set(projectId, next);
      setDraft(next);
    },
    [projectId],
  );
  return [draft, set];
}
