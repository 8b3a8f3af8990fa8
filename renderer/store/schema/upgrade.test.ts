// @vitest-environment node
import Dexie from 'dexie';
import { IDBKeyRange } from 'fake-indexeddb';
import { describe, expect, it } from 'vitest';
import { databaseName } from '../database';
import { hexaammine, testStore } from '../testing/testStore';
import { schemaV1 } from './v1';

/** Data of the first version as it was shipped, and the same storage for a later program. */
async function shippedData() {
  const { store, reopen, factory } = await testStore();
  const project = await store.projects.create('Kept through upgrades');
  await store.candidates.create(project.id, [hexaammine('Cr'), hexaammine('Co')]);
  return { store, reopen, options: { indexedDB: factory, IDBKeyRange }, projectId: project.id };
}

/** A later program that has one more version, whose upgrade does what it is told. */
function laterProgram(options: { indexedDB: IDBFactory; IDBKeyRange: unknown }, upgrade: () => void): Dexie {
  const db = new Dexie(databaseName, options as never);
  db.version(1).stores(schemaV1);
  db.version(2).stores({ projects: 'id, deletedAt, name' }).upgrade(upgrade);
  return db;
}

describe('a database of the first version', () => {
  it('opens in the present program with every row as it was', async () => {
    const { store, reopen, projectId } = await shippedData();
    const before = await store.db.candidates.toArray();
    const again = await reopen();
    expect(await again.db.candidates.toArray()).toEqual(before);
    expect((await again.projects.get(projectId))!.name).toBe('Kept through upgrades');
  });

  it('stays whole and opens with the old program where a later upgrade throws', async () => {
    const { store, reopen, options, projectId } = await shippedData();
    const before = await store.db.candidates.toArray();
    store.close();
    const later = laterProgram(options, () => {
      throw new Error('the upgrade failed');
    });
    await expect(later.open()).rejects.toThrow(/upgrade failed/);
    later.close();
    const again = await reopen();
    expect(again.db.verno).toBe(1);
    expect(await again.db.candidates.toArray()).toEqual(before);
    expect(await again.projects.get(projectId)).toBeDefined();
  });

  it('is refused by the present program once a later one has upgraded it, and nothing is written', async () => {
    const { store, reopen, options } = await shippedData();
    store.close();
    const later = laterProgram(options, () => undefined);
    await later.open();
    later.close();
    await expect(reopen()).rejects.toThrow(/newer version of this program/);
  });
});
