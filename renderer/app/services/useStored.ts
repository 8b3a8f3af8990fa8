import { useEffect, useState } from 'react';
import type { RecordTable } from '../../store';
import { inWords } from './useAction';
import { useStore } from './Services';
import type { Store } from '../../store';

export interface Stored<T> {
  readonly value: T | undefined;
  readonly error: string | null;
}

/**
 * Something read from the database, read again whenever a row of `tables` changes. `ask` must be stable (memoised): a
 * new function is a new question.
 */
export function useStored<T>(ask: (store: Store) => Promise<T>, tables: readonly RecordTable[]): Stored<T> {
  const store = useStore();
  const [answer, setAnswer] = useState<Stored<T> & { readonly ask: unknown }>({
    value: undefined,
    error: null,
    ask: null,
  });
  const key = tables.join(' ');
  useEffect(() => {
    let current = true;
    const read = (): void => {
      ask(store).then(
        (value) => current && setAnswer({ value, error: null, ask }),
        (error: unknown) => current && setAnswer({ value: undefined, error: inWords(error), ask }),
      );
    };
    read();
    const unsubscribe = store.feed.subscribe((edits) => {
      if (edits.some(({ table }) => key.includes(table))) read();
    });
    return () => {
      current = false;
      unsubscribe();
    };
  }, [store, ask, key]);
  return answer.ask === ask ? answer : { value: undefined, error: null };
}
