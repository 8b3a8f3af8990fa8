import { IDBFactory, IDBKeyRange } from 'fake-indexeddb';
import type { Clock } from '../journal/writer';
import { openStore, type Store } from '../store';
import type { NewCandidate } from '../repositories/candidates';

/** A clock that moves on by a second with each look, and ids that count. */
export function testClock(start = '2026-03-01T09:00:00.000Z'): Clock {
  let seconds = 0;
  let ids = 0;
  return {
    now: () => new Date(Date.parse(start) + 1000 * seconds++).toISOString(),
    newId: () => `id-${String(ids++).padStart(4, '0')}`,
  };
}

export interface TestStore {
  readonly store: Store;
  /** Closes and opens again on the same data, as a restart does. */
  reopen(): Promise<Store>;
  readonly factory: IDBFactory;
}

export async function testStore(clock: Clock = testClock()): Promise<TestStore> {
  const factory = new IDBFactory();
  const options = { dexie: { indexedDB: factory, IDBKeyRange }, clock };
  let store = await openStore(options);
  const reopen = async (): Promise<Store> => {
    store.close();
    store = await openStore(options);
    return store;
  };
  return { store, reopen, factory };
}

export const hexaammine = (metal: string, oxidationState = 3): NewCandidate => ({
  composition: { metal, oxidationState, geometry: 'octahedral', ligands: { nh3: 6 } },
});
