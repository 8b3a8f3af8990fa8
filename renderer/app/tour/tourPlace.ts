import { useSyncExternalStore } from 'react';

let place: number | null = null;
const listeners = new Set<() => void>();

const subscribe = (listener: () => void): (() => void) => {
  listeners.add(listener);
  return () => listeners.delete(listener);
};

/** Goes to a stop of the tour; null ends it. */
export function setTourPlace(next: number | null): void {
  place = next;
  for (const listener of listeners) listener();
}

/** Stop of the tour that is shown; null while there is none. Lives outside the views, which come and go under it. */
export const useTourPlace = (): number | null => useSyncExternalStore(subscribe, () => place);
