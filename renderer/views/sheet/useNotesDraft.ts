import { useCallback, useState } from 'react';
import { z } from 'zod';
import type { Candidate } from '../../../core/record/project';
import { inWords, useStore } from '../../app/services';
import { drafts } from '../../store';

/** What was typed, and the stored notes that it was typed over. */
const draftSchema = z.strictObject({ text: z.string(), over: z.string() });

export interface NotesDraft {
  readonly text: string;
  readonly unsaved: boolean;
  /** Notes that somebody else stored while these were being written; null where there are none. */
  readonly theirs: string | null;
  readonly problem: string | null;
  readonly write: (text: string) => void;
  readonly save: () => void;
  /** Stores what is on screen in place of theirs. */
  readonly keepMine: () => void;
  readonly takeTheirs: () => void;
}

/**
 * Notes as typed so far, kept through a crash. Notes stored meanwhile from elsewhere (another window, undo, a draft that
 * is older than what is stored) are never overwritten without a word.
 */
export function useNotesDraft(candidate: Candidate): NotesDraft {
  const store = useStore();
  const name = `notes:${candidate.id}`;
  const stored = candidate.notes;
  const [{ text, over }, setState] = useState(() => {
    const kept = draftSchema.safeParse(drafts.read(name));
    return kept.success ? kept.data : { text: stored, over: stored };
  });
  const [problem, setProblem] = useState<string | null>(null);
  // Nothing of one's own on screen, or the same as stored by now: follows what is stored.
  if (over !== stored && (text === over || text === stored)) setState({ text: stored, over: stored });

  const unsaved = text !== stored;
  const put = useCallback(
    (notes: string): void => {
      store.candidates.update(candidate, 'write notes', { notes }, candidate.revision).then(
        () => {
          setProblem(null);
          drafts.drop(name);
        },
        (error: unknown) => setProblem(inWords(error)),
      );
    },
    [store, candidate, name],
  );
  const conflict = unsaved && over !== stored;
  return {
    text,
    unsaved,
    theirs: conflict ? stored : null,
    problem,
    write: (next) => {
      setState({ text: next, over });
      drafts.keep(name, { text: next, over });
    },
    save: () => {
      if (unsaved && !conflict) put(text);
    },
    keepMine: () => {
      setState({ text, over: stored });
      put(text);
    },
    takeTheirs: () => {
      setState({ text: stored, over: stored });
      drafts.drop(name);
    },
  };
}
