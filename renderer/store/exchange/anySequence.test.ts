// @vitest-environment node
import { isDeepStrictEqual } from 'node:util';
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readBundle } from '../../../core/record/bundle';
import type { Store } from '../store';
import { hexaammine, testStore } from '../testing/testStore';
import { exportProject } from './exportProject';
import { bringIn, planImport } from './importProject';

/** What a project holds, as plain as can be: candidates by id. */
type Model = Map<string, { notes: string; deleted: boolean }>;

const actions = [
  'add',
  'note',
  'delete',
  'give back',
  'empty the bin',
  'undo',
  'export',
  'import',
  'move to another machine',
  'restart',
] as const;

const copyOf = (model: Model): Model => new Map([...model].map(([id, row]) => [id, { ...row }]));

async function stateOf(store: Store, projectId: string): Promise<Model> {
  const rows = await store.candidates.allOf(projectId);
  return new Map(
    rows
      .sort((a, b) => (a.id < b.id ? -1 : 1))
      .map(({ id, notes, deletedAt }) => [id, { notes, deleted: deletedAt !== null }]),
  );
}

async function takeIn(store: Store, text: string): Promise<void> {
  const reading = readBundle(text);
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
  await bringIn(store.journal, await planImport(store.db, reading.content));
}

describe('any sequence of edits, deletions, exports, imports and restarts', () => {
  it('leaves in the database what a plain list would hold, after each step', async () => {
    const sequence = fc.array(fc.tuple(fc.constantFrom(...actions), fc.nat(50)), { maxLength: 20 });
    await fc.assert(
      fc.asyncProperty(sequence, async (steps) => {
        let test = await testStore();
        let { store } = test;
        const project = await store.projects.create('One');
        let model: Model = new Map();
        /** The model before the last step that can be taken back; null where there is none, or it was something else. */
        let before: Model | null = null;
        let exported: { text: string; model: Model } | null = null;
        for (const [what, pick] of steps) {
          const ids = [...model.keys()];
          const id = ids[pick % Math.max(1, ids.length)];
          const row = id === undefined ? undefined : model.get(id)!;
          const past = copyOf(model);
          if (what === 'add') {
            const [made] = await store.candidates.create(project.id, [hexaammine('Cr')]);
            model.set(made!.id, { notes: '', deleted: false });
            before = past;
          } else if (what === 'note' && row) {
            const stored = (await store.candidates.get(id!))!;
            const notes = `note ${pick}, "µ"\n=1+1`;
            await store.candidates.update(stored, 'note', { notes });
            row.notes = notes;
            before = past;
          } else if (what === 'delete' && row && !row.deleted) {
            await store.candidates.remove(project.id, [id!]);
            row.deleted = true;
            before = past;
          } else if (what === 'give back' && row?.deleted) {
            await store.candidates.restore(project.id, [id!]);
            row.deleted = false;
            before = past;
          } else if (what === 'empty the bin') {
            const gone = await store.bin.empty();
            for (const [each, { deleted }] of [...model]) if (deleted) model.delete(each);
            // Steps about rows that are gone for good cannot be taken back any more.
            if (gone > 0) before = null;
          } else if (what === 'undo' && before !== null) {
            await store.journal.undo(project.id);
            model = before;
            before = null;
          } else if (what === 'export') {
            exported = { text: await exportProject(store.db, project.id), model: copyOf(model) };
          } else if (what === 'import' && exported !== null) {
            await takeIn(store, exported.text);
            // Rows of the file replace those here; rows that only exist here stay.
            model = new Map([...model, ...copyOf(exported.model)]);
            // An import that changes nothing is no step.
            if (!isDeepStrictEqual(model, past)) before = past;
          } else if (what === 'move to another machine') {
            const text = await exportProject(store.db, project.id);
            test = await testStore(store.clock);
            store = test.store;
            await takeIn(store, text);
            before = null;
          } else if (what === 'restart') {
            store = await test.reopen();
          } else continue;
          const sorted = new Map([...model].sort(([a], [b]) => (a < b ? -1 : 1)));
          expect(await stateOf(store, project.id)).toEqual(sorted);
        }
      }),
      { numRuns: 30 },
    );
  });
});
