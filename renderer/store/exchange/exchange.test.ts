// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { readBundle } from '../../../core/record/bundle';
import { hexaammine, testStore } from '../testing/testStore';
import { exportProject, fileNameFor } from './exportProject';
import { bringIn, bringInAsCopy, planImport } from './importProject';

const contentOf = (text: string) => {
  const reading = readBundle(text);
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
  return reading.content;
};

async function filled() {
  const test = await testStore();
  const project = await test.store.projects.create('Liquid filter', { targetLab: [50, 30, -20] });
  const rows = await test.store.candidates.create(project.id, [hexaammine('Cr'), hexaammine('Co')]);
  await test.store.candidates.update(rows[0]!, 'write notes', { notes: 'µ, "quoted", 分光' });
  return { ...test, project, rows };
}

describe('export and import', () => {
  it('give identical text after export, deletion and import', async () => {
    const { store, project } = await filled();
    const text = await exportProject(store.db, project.id);
    await store.projects.remove(project.id);
    await store.bin.empty();
    await bringIn(store.journal, await planImport(store.db, contentOf(text)));
    expect(await exportProject(store.db, project.id)).toBe(text);
  });

  it('say before anything is changed what is new, what differs and what is only here', async () => {
    const { store, project, rows } = await filled();
    const text = await exportProject(store.db, project.id);
    await store.candidates.update(rows[1]!, 'write notes', { notes: 'changed here' });
    await store.candidates.create(project.id, [hexaammine('V')]);
    const plan = await planImport(store.db, contentOf(text));
    expect(plan).toMatchObject({ known: true, projectName: 'Liquid filter' });
    const candidates = plan.tables.find(({ table }) => table === 'candidates')!;
    expect(candidates).toMatchObject({ added: [], same: 1, onlyHere: 1 });
    expect(candidates.changed.map(({ here }) => here.id)).toEqual([rows[1]!.id]);
    expect((await store.candidates.get(rows[1]!.id))?.notes).toBe('changed here');
  });

  it('can be taken back as one step', async () => {
    const { store, project, rows } = await filled();
    const text = await exportProject(store.db, project.id);
    await store.candidates.update(rows[1]!, 'write notes', { notes: 'changed here' });
    await bringIn(store.journal, await planImport(store.db, contentOf(text)));
    expect((await store.candidates.get(rows[1]!.id))?.notes).toBe('');
    await store.journal.undo(project.id);
    expect((await store.candidates.get(rows[1]!.id))?.notes).toBe('changed here');
  });

  it('can put a second copy beside the first, with ids of its own and links intact', async () => {
    const { store, project } = await filled();
    const plan = await planImport(store.db, contentOf(await exportProject(store.db, project.id)));
    const copy = await bringInAsCopy(store.journal, plan, store.clock.newId);
    expect(copy).not.toBe(project.id);
    expect((await store.projects.get(copy))?.name).toBe('Liquid filter (copy)');
    expect(await store.candidates.allOf(copy)).toHaveLength(2);
    expect(await store.candidates.allOf(project.id)).toHaveLength(2);
  });

  it('refuse a file whose records belong to another project here', async () => {
    const { store, project, rows } = await filled();
    const content = contentOf(await exportProject(store.db, project.id));
    const foreign = {
      ...content,
      projects: content.projects.map((row) => ({ ...row, id: 'other' })),
      candidates: content.candidates.map((row) => ({ ...row, projectId: 'other' })),
    };
    await expect(planImport(store.db, foreign)).rejects.toThrow(rows[0]!.id);
  });
});

describe('the suggested file name', () => {
  it('holds nothing that a file system refuses', () => {
    expect(fileNameFor('Filter 540–580 nm: "no Co"/Cr(VI)', '2026-03-01T09:00:00Z')).toBe(
      'Filter-540-580-nm-no-Co-Cr-VI-2026-03-01.spinhue.json',
    );
    expect(fileNameFor('???', '2026-03-01T09:00:00Z')).toBe('project-2026-03-01.spinhue.json');
  });
});
