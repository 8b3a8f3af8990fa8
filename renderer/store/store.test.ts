// @vitest-environment node
import Dexie from 'dexie';
import { IDBFactory, IDBKeyRange } from 'fake-indexeddb';
import { describe, expect, it } from 'vitest';
import { openDatabase } from './database';
import { openStore } from './store';
import { hexaammine, testClock, testStore } from './testing/testStore';

describe('the database', () => {
  it('gives back after a restart what was saved before', async () => {
    const { store, reopen } = await testStore();
    const project = await store.projects.create('Liquid filter');
    const [first] = await store.candidates.create(project.id, [hexaammine('Cr'), hexaammine('Co')]);
    const later = await reopen();
    expect(await later.projects.list()).toEqual([project]);
    const rows = await later.candidates.allOf(project.id);
    expect(rows.map(({ composition }) => composition.metal).sort()).toEqual(['Co', 'Cr']);
    expect(rows.find(({ id }) => id === first!.id)).toEqual(first);
  });

  it('of a newer version is refused before anything is read or written', async () => {
    const factory = new IDBFactory();
    const options = { indexedDB: factory, IDBKeyRange };
    const newer = new Dexie('spinhue', options);
    newer.version(99).stores({ projects: 'id', somethingNew: 'id' });
    await newer.table('projects').put({ id: 'p', name: 'From the future' });
    newer.close();
    await expect(openDatabase('spinhue', options)).rejects.toMatchObject({ code: 'newer-database' });
    const again = new Dexie('spinhue', options);
    again.version(99).stores({ projects: 'id', somethingNew: 'id' });
    expect(await again.table('projects').toArray()).toEqual([{ id: 'p', name: 'From the future' }]);
    expect(again.backendDB().version).toBe(990);
    again.close();
  });

  it('that cannot be opened at all says so with a way out', async () => {
    const refuse = () => {
      throw new DOMException('no storage here', 'SecurityError');
    };
    const broken = { open: refuse, databases: refuse } as unknown as IDBFactory;
    await expect(openStore({ dexie: { indexedDB: broken, IDBKeyRange } })).rejects.toMatchObject({
      code: 'storage-unavailable',
      remedy: expect.stringMatching(/\w+/) as string,
    });
  });

  it('keeps nothing of a step that fails half way, neither rows nor journal', async () => {
    const { store, reopen } = await testStore();
    const project = await store.projects.create('Liquid filter');
    const attempt = store.journal.record(project.id, 'add five', async (writer) => {
      await writer.create('candidates', [{ ...fullCandidate(project.id), id: 'a' }]);
      await writer.create('candidates', [{ ...fullCandidate(project.id), id: 'b' }]);
      throw new Error('struck by lightning');
    });
    await expect(attempt).rejects.toThrow('struck by lightning');
    const later = await reopen();
    expect(await later.candidates.allOf(project.id)).toEqual([]);
    expect((await later.journal.nextUndo(null))?.label).toBe('create project "Liquid filter"');
  });

  it('tells nobody about a step that failed', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('Liquid filter');
    const told: unknown[] = [];
    store.feed.subscribe((edits) => told.push(edits));
    const attempt = store.candidates.updateMany(project.id, ['x'], 'break', () => {
      throw new Error('no');
    });
    await attempt.catch(() => undefined);
    await store.candidates.create(project.id, [hexaammine('Cr')]);
    expect(told).toHaveLength(1);
  });

  it('reports a full disk as such and leaves the row as it was', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('Liquid filter');
    const [candidate] = await store.candidates.create(project.id, [hexaammine('Cr')]);
    store.db.candidates.hook('updating', () => {
      throw new DOMException('full', 'QuotaExceededError');
    });
    const attempt = store.candidates.update(candidate!, 'write notes', { notes: 'long' });
    await expect(attempt).rejects.toMatchObject({ code: 'storage-full' });
    expect((await store.candidates.get(candidate!.id))?.notes).toBe('');
    expect(store.journal.health.trouble?.code).toBe('storage-full');
    await store.projects.update(project.id, 'rename', { name: 'Still works' });
    expect(store.journal.health.trouble).toBeNull();
  });

  it('does not overwrite what another window saved meanwhile', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('Liquid filter');
    const [seen] = await store.candidates.create(project.id, [hexaammine('Cr')]);
    await store.candidates.update(seen!, 'write notes', { notes: 'from the other window' });
    const late = store.candidates.update(seen!, 'write notes', { notes: 'mine' }, seen!.revision);
    await expect(late).rejects.toMatchObject({ code: 'changed-meanwhile' });
    expect((await store.candidates.get(seen!.id))?.notes).toBe('from the other window');
  });
});

describe('the bin', () => {
  it('lists what was deleted and gives it back', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('Liquid filter');
    const [candidate] = await store.candidates.create(project.id, [hexaammine('Cr')]);
    await store.candidates.remove(project.id, [candidate!.id]);
    expect((await store.bin.content()).candidates).toMatchObject([
      { id: candidate!.id, projectName: 'Liquid filter' },
    ]);
    await store.candidates.restore(project.id, [candidate!.id]);
    expect((await store.bin.content()).candidates).toEqual([]);
  });

  it('lets go after thirty days, with all that belonged to a deleted project, and not a day earlier', async () => {
    const { store } = await testStore(testClock('2026-03-01T00:00:00.000Z'));
    const kept = await store.projects.create('Kept');
    const gone = await store.projects.create('Gone');
    await store.candidates.create(gone.id, [hexaammine('Cr'), hexaammine('Co')]);
    await store.candidates.create(kept.id, [hexaammine('Ni', 2)]);
    await store.projects.remove(gone.id);
    expect(await store.bin.purgeExpired('2026-03-30T00:00:00.000Z')).toBe(0);
    expect(await store.bin.purgeExpired('2026-04-01T00:00:00.000Z')).toBe(3);
    expect(await store.db.candidates.count()).toBe(1);
    expect(await store.db.projects.count()).toBe(1);
  });

  it('once emptied leaves steps about other rows to be undone', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('Liquid filter');
    const [one, two] = await store.candidates.create(project.id, [hexaammine('Cr'), hexaammine('Co')]);
    await store.candidates.updateMany(project.id, [one!.id, two!.id], 'star both', () => ({ starred: true }));
    await store.candidates.remove(project.id, [one!.id]);
    await store.bin.empty();
    expect((await store.journal.undo(project.id))?.label).toBe('star both');
    expect((await store.candidates.get(two!.id))?.starred).toBe(false);
    expect(await store.candidates.get(one!.id)).toBeUndefined();
  });
});

function fullCandidate(projectId: string) {
  return {
    projectId,
    name: '',
    composition: hexaammine('Cr').composition,
    counterIon: null,
    solvate: null,
    concentration_mM: null,
    path_cm: null,
    tags: [],
    starred: false,
    archived: false,
    notes: '',
  };
}
