import { useCallback, useState } from 'react';
import { freshDraft, type WishDraft } from './wish/wishDraft';

interface Kept {
  readonly draft: WishDraft;
  readonly name: string;
}

/** Forms as they were left, by project: looking at another view loses nothing that was typed. */
const kept = new Map<string, Kept>();

/** The form of a project. Its name stands apart, so that typing it does not draw the whole form anew. */
export function useDraft(projectId: string) {
  const [draft, setDraft] = useState(() => kept.get(projectId)?.draft ?? freshDraft);
  const [name, setName] = useState(() => kept.get(projectId)?.name ?? freshDraft.name);
  const keep = useCallback(
    (part: Partial<Kept>): void => {
      const before = kept.get(projectId) ?? { draft: freshDraft, name: freshDraft.name };
      kept.set(projectId, { ...before, ...part });
    },
    [projectId],
  );
  return {
    draft,
    setDraft: useCallback(
      (next: WishDraft) => {
        keep({ draft: next });
        setDraft(next);
      },
      [keep],
    ),
    name,
    setName: useCallback(
      (next: string) => {
        keep({ name: next });
        setName(next);
      },
      [keep],
    ),
  };
}
