// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { exportProject } from '../../store';
import { hexaammine, testStore } from '../../store/testing/testStore';
import { bringBackLost, broughtBackWords } from './bringBackLost';

type Given = Parameters<typeof bringBackLost>[1];

const folderWith = (copies: Readonly<Record<string, string>>): Given =>
  ({
    mirror: {
      status: () => Promise.resolve({ state: 'ready' }),
      projects: () => Promise.resolve(Object.keys(copies).map((id) => ({ projectId: id, name: id }))),
      read: (id: string) => Promise.resolve(copies[id]),
    },
  }) as unknown as Given;

async function copyOfOne(): Promise<{ id: string; text: string }> {
  const { store } = await testStore();
  const { id } = await store.projects.create('Filter dyes');
  await store.candidates.create(id, [hexaammine('Cr')]);
  return { id, text: await exportProject(store.db, id) };
}

describe('an empty database beside a folder of copies', () => {
  it('is filled from the copies, which stand for the demo project too', async () => {
    const { id, text } = await copyOfOne();
    const { store } = await testStore();
    expect(await bringBackLost(store, folderWith({ [id]: text }))).toEqual({ projects: 1, unread: [] });
    expect((await store.projects.list()).map(({ name }) => name)).toEqual(['Filter dyes']);
    expect(await store.db.candidates.count()).toBe(1);
    expect((await store.settings.read()).demoLoaded).toBe(true);
  });

  it('says which copy cannot be read and brings the others back', async () => {
    const { id, text } = await copyOfOne();
    const { store } = await testStore();
    const back = await bringBackLost(store, folderWith({ torn: text.slice(0, 100), [id]: text }));
    expect(back).toEqual({ projects: 1, unread: ['torn'] });
    expect(broughtBackWords(back!)).toMatch(/1 project was brought back.*Not readable: torn/);
  });

  it('is left alone where there is no copy, and one with something in it always', async () => {
    const { id, text } = await copyOfOne();
    const { store } = await testStore();
    expect(await bringBackLost(store, folderWith({}))).toBeNull();
    await store.projects.create('Mine');
    expect(await bringBackLost(store, folderWith({ [id]: text }))).toBeNull();
  });
});
