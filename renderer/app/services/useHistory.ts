import { useCallback, useEffect, useMemo, useState } from 'react';
import { useToast } from '../../parts';
import type { Change } from '../../store';
import { useStore } from './Services';
import { useAction } from './useAction';

export interface History {
  /** What undo would take back; null where there is nothing. */
  readonly undoLabel: string | null;
  readonly redoLabel: string | null;
  readonly undo: () => void;
  readonly redo: () => void;
}

/** Undo and redo, within one project or, at the start, across all. */
export function useHistory(scope: string | null): History {
  const store = useStore();
  const toast = useToast();
  const act = useAction();
  const [next, setNext] = useState<{ undo?: Change | undefined; redo?: Change | undefined }>({});

  useEffect(() => {
    let current = true;
    const look = async (): Promise<void> => {
      const [undo, redo] = await Promise.all([store.journal.nextUndo(scope), store.journal.nextRedo(scope)]);
      if (current) setNext({ undo, redo });
    };
    const lookQuietly = (): void => void look().catch(() => undefined);
    lookQuietly();
    const unsubscribe = store.feed.subscribe(lookQuietly);
    return () => {
      current = false;
      unsubscribe();
    };
  }, [store, scope]);

  const undo = useCallback(() => {
    void act(async () => {
      const change = await store.journal.undo(scope);
      toast({ message: change ? `Taken back: ${change.label}` : 'There is nothing to take back.' });
    });
  }, [act, store, scope, toast]);
  const redo = useCallback(() => {
    void act(async () => {
      const change = await store.journal.redo(scope);
      toast({ message: change ? `Done again: ${change.label}` : 'There is nothing to do again.' });
    });
  }, [act, store, scope, toast]);

  return useMemo(
    () => ({ undoLabel: next.undo?.label ?? null, redoLabel: next.redo?.label ?? null, undo, redo }),
    [next, undo, redo],
  );
}
