// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { testStore } from '../testing/testStore';

const wish = { name: 'green filter', bands: [{ from_nm: 560, to_nm: 590 }] };

describe('saved wishes', () => {
  it('come back after a restart, by name, with what they ask for unchanged', async () => {
    const { store, reopen } = await testStore();
    const project = await store.projects.create('Filter');
    await store.wishes.create(project.id, 'green filter', wish);
    await store.wishes.create(project.id, 'a blue one', { name: 'a blue one', spin: 'low' });
    const found = await (await reopen()).wishes.of(project.id);
    expect(found.map(({ name }) => name)).toEqual(['a blue one', 'green filter']);
    expect(found[1]!.wish).toEqual(wish);
  });

  it('that another window saved meanwhile are not overwritten', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('Filter');
    const seen = await store.wishes.create(project.id, 'green filter', wish);
    await store.wishes.replace(seen, 'green filter', { ...wish, spin: 'low' });
    await expect(store.wishes.replace(seen, 'green filter', wish)).rejects.toMatchObject({
      code: 'changed-meanwhile',
    });
  });

  it('that are deleted come back by undo', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('Filter');
    const saved = await store.wishes.create(project.id, 'green filter', wish);
    await store.wishes.remove(saved);
    expect(await store.wishes.of(project.id)).toEqual([]);
    await store.journal.undo(project.id);
    expect((await store.wishes.of(project.id)).map(({ wish: kept }) => kept)).toEqual([wish]);
  });
});
