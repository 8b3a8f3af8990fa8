// @vitest-environment node
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Candidate } from '../../../core/record/project';
import { hexaammine, testStore } from '../testing/testStore';
import { Journal, keptSteps } from './journal';

const plain = (rows: readonly Candidate[]) =>
  rows
    .map(({ id, notes, starred, deletedAt }) => ({ id, notes, starred, deleted: deletedAt !== null }))
    .sort((one, other) => one.id.localeCompare(other.id));

describe('undo and redo', () => {
  it('take back and repeat a creation, an edit and a deletion', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('Liquid filter');
    const [candidate] = await store.candidates.create(project.id, [hexaammine('Cr')]);
    await store.candidates.update(candidate!, 'write notes', { notes: 'pale' });
    await store.candidates.remove(project.id, [candidate!.id]);
    const state = async () => plain(await store.candidates.allOf(project.id));
    await store.journal.undo(project.id);
    expect(await state()).toMatchObject([{ notes: 'pale', deleted: false }]);
    await store.journal.undo(project.id);
    expect(await state()).toMatchObject([{ notes: '' }]);
    await store.journal.undo(project.id);
    expect(await state()).toEqual([]);
    await store.journal.redo(project.id);
    await store.journal.redo(project.id);
    expect(await state()).toMatchObject([{ notes: 'pale', deleted: false }]);
  });

  it('still work after a restart', async () => {
    const { store, reopen } = await testStore();
    const project = await store.projects.create('Liquid filter');
    const [candidate] = await store.candidates.create(project.id, [hexaammine('Cr')]);
    await store.candidates.remove(project.id, [candidate!.id]);
    const later = await reopen();
    expect((await later.journal.nextUndo(project.id))?.label).toBe('delete 1 candidate');
    await later.journal.undo(project.id);
    expect((await later.candidates.get(candidate!.id))?.deletedAt).toBeNull();
    const afterwards = await reopen();
    await afterwards.journal.redo(project.id);
    expect((await afterwards.candidates.get(candidate!.id))?.deletedAt).not.toBeNull();
  });

  it('keep the steps of two projects apart', async () => {
    const { store } = await testStore();
    const one = await store.projects.create('One');
    const two = await store.projects.create('Two');
    await store.projects.update(one.id, 'rename', { name: 'First' });
    await store.projects.update(two.id, 'rename', { name: 'Second' });
    await store.journal.undo(one.id);
    expect((await store.projects.get(one.id))?.name).toBe('One');
    expect((await store.projects.get(two.id))?.name).toBe('Second');
    expect((await store.journal.undo(null))?.scope).toBe(two.id);
  });

  it('forget what was undone as soon as something new is done', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('One');
    await store.projects.update(project.id, 'rename', { name: 'Two' });
    await store.journal.undo(project.id);
    await store.projects.update(project.id, 'rename', { name: 'Three' });
    expect(await store.journal.redo(project.id)).toBeUndefined();
    expect((await store.projects.get(project.id))?.name).toBe('Three');
    expect(await store.db.edits.count()).toBe(2);
  });

  it('refuse to go over a change that came from elsewhere, and change nothing', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('One');
    const [candidate] = await store.candidates.create(project.id, [hexaammine('Cr')]);
    await store.candidates.update(candidate!, 'write notes', { notes: 'mine' });
    await store.db.candidates.update(candidate!.id, { notes: 'from elsewhere' });
    await expect(store.journal.undo(project.id)).rejects.toMatchObject({ code: 'changed-meanwhile' });
    expect((await store.candidates.get(candidate!.id))?.notes).toBe('from elsewhere');
  });

  it('never let a frozen prediction vanish: it goes to the bin and comes back', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('One');
    const [candidate] = await store.candidates.create(project.id, [hexaammine('Cr')]);
    const prediction = { madeWith: { parameterSet: 'library', parameterHash: 'h', modelVersion: '1' } };
    await store.frozenPredictions.freeze(candidate!, prediction as never, 'before the synthesis', 'freeze');
    await store.journal.undo(project.id);
    expect(await store.frozenPredictions.of(candidate!.id)).toEqual([]);
    expect(await store.db.frozenPredictions.count()).toBe(1);
    await store.journal.redo(project.id);
    expect(await store.frozenPredictions.of(candidate!.id)).toMatchObject([
      { reason: 'before the synthesis' },
    ]);
  });

  it('reach back a fixed number of steps, at least a hundred, and drop what is older', async () => {
    expect(keptSteps).toBeGreaterThanOrEqual(100);
    const { store } = await testStore();
    const journal = new Journal(store.db, store.feed, store.clock, 10);
    const project = await store.projects.create('0');
    for (let step = 1; step <= 13; step++) {
      await journal.record(project.id, 'rename', (writer) =>
        writer.update('projects', project.id, { name: String(step) }),
      );
    }
    expect(await store.db.changes.count()).toBe(10);
    expect(await store.db.edits.count()).toBe(10);
    for (let step = 0; step < 11; step++) await journal.undo(project.id);
    expect((await store.projects.get(project.id))?.name).toBe('3');
  });

  it('agree with a plain list of states for any sequence of edits, undos, redos and restarts', async () => {
    const action = fc.constantFrom('add', 'note', 'star', 'delete', 'undo', 'redo', 'restart');
    await fc.assert(
      fc.asyncProperty(fc.array(action, { maxLength: 25 }), async (actions) => {
        const test = await testStore();
        let { store } = test;
        const project = await store.projects.create('One');
        const state = async () => plain(await store.candidates.allOf(project.id));
        const past: unknown[] = [];
        let future: unknown[] = [];
        for (const [step, what] of actions.entries()) {
          const before = await state();
          const rows = await store.candidates.allOf(project.id);
          const row = rows[step % Math.max(1, rows.length)];
          if (what === 'restart') store = await test.reopen();
          else if (what === 'undo') {
            if (past.length === 0) continue;
            await store.journal.undo(project.id);
            future.push(before);
            expect(await state()).toEqual(past.pop());
          } else if (what === 'redo') {
            await store.journal.redo(project.id);
            if (future.length === 0) expect(await state()).toEqual(before);
            else {
              past.push(before);
              expect(await state()).toEqual(future.pop());
            }
          } else {
            if (what === 'add') await store.candidates.create(project.id, [hexaammine('Cr')]);
            else if (!row) continue;
            else if (what === 'note') await store.candidates.update(row, 'note', { notes: `note ${step}` });
            else if (what === 'star') await store.candidates.update(row, 'star', { starred: !row.starred });
            else if (row.deletedAt === null) await store.candidates.remove(project.id, [row.id]);
            else continue;
            past.push(before);
            future = [];
          }
        }
      }),
      { numRuns: 25 },
    );
  });
});
