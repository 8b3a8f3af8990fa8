// @vitest-environment node
import { IDBFactory, IDBKeyRange } from 'fake-indexeddb';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { readBundle } from '../../core/record/bundle';
import { toCsv } from '../../core/record/out/csv';
import { exportProject } from './exchange/exportProject';
import { timeOrderedId } from './journal/timeOrderedId';
import { openStore } from './store';
import { hexaammine, testStore } from './testing/testStore';

const zone = process.env.TZ;
afterEach(() => {
  process.env.TZ = zone;
  vi.restoreAllMocks();
});

/** A clock that is set back by two hours after its third look. */
function clockSetBack() {
  let looks = 0;
  const hour = (): number => Date.UTC(2036, 9, 25, looks <= 3 ? 12 : 10, 0, looks);
  return {
    now: () => {
      looks += 1;
      return new Date(hour()).toISOString();
    },
    newId: () => timeOrderedId(hour()),
  };
}

describe('clock, time zone and language of the system', () => {
  it('a clock set back changes neither the order of the rows nor what undo takes back', async () => {
    const dexie = { indexedDB: new IDBFactory(), IDBKeyRange };
    const store = await openStore({ dexie, clock: clockSetBack() });
    const project = await store.projects.create('Clock');
    for (const metal of ['Cr', 'Co', 'Ni', 'Fe'])
      await store.candidates.create(project.id, [hexaammine(metal)]);
    const metals = (await store.candidates.allOf(project.id)).map(({ composition }) => composition.metal);
    expect(metals).toEqual(['Cr', 'Co', 'Ni', 'Fe']);
    await store.journal.undo(project.id);
    const left = await store.candidates.allOf(project.id);
    expect(left.filter(({ deletedAt }) => deletedAt === null)).toHaveLength(3);
    store.close();
  });

  it('times are stored in UTC and read the same wherever the machine is', async () => {
    const { store } = await testStore();
    process.env.TZ = 'Pacific/Auckland';
    const project = await store.projects.create('Zone');
    const text = await exportProject(store.db, project.id);
    expect(project.createdAt).toMatch(/^2026-03-01T09:00:\d\d\.000Z$/);
    process.env.TZ = 'America/St_Johns';
    expect(await exportProject(store.db, project.id)).toBe(text);
    expect(readBundle(text).ok).toBe(true);
  });

  it('a system that writes decimal commas changes no stored and no exported number', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('Comma', { targetLab: [50.25, -3.5, 0.125] });
    // What a system set to German would do with every number that goes through it.
    vi.spyOn(Number.prototype, 'toLocaleString').mockImplementation(function (this: number) {
      return String(this).replace('.', ',');
    });
    expect((50.25).toLocaleString()).toBe('50,25');
    expect(await exportProject(store.db, project.id)).toContain('[50.25,-3.5,0.125]');
    expect(toCsv([['band', 17.5]])).toContain('17.5');
  });
});
