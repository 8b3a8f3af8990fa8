// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { noConditions } from '../../../core/record/measurement';
import { hexaammine, testStore } from '../testing/testStore';

async function measured() {
  const test = await testStore();
  const { store } = test;
  store.journal.signAs('MK');
  const project = await store.projects.create('Liquid filter');
  const [candidate] = await store.candidates.create(project.id, [hexaammine('Cr')]);
  const [measurement] = await store.journal.record(project.id, 'note a colour', (writer) =>
    writer.create('measurements', [
      {
        projectId: project.id,
        candidateId: candidate!.id,
        sampleId: null,
        frozenPredictionId: null,
        revisions: [
          {
            number: 0,
            at: writer.now,
            by: 'MK',
            why: '',
            content: {
              kind: 'observed colour',
              conditions: noConditions,
              remark: '',
              attachments: [],
              words: 'yellow',
              lightSource: 'daylight',
              lab: null,
            },
          },
        ],
      },
    ]),
  );
  return { ...test, project, candidate: candidate!, measurement: measurement! };
}

describe('the log of a project', () => {
  it('has a line for each change of a measurement, with who and when, and for taking it back', async () => {
    const { store, project, measurement } = await measured();
    const first = measurement.revisions[0]!;
    await store.journal.record(project.id, 'correct', (writer) =>
      writer.update('measurements', measurement.id, {
        revisions: [first, { ...first, number: 1, why: 'wrong lamp' }],
      }),
    );
    await store.journal.undo(project.id);
    const lines = await store.db.log.toArray();
    expect(lines.map(({ action, by, rowId }) => ({ action, by, rowId }))).toEqual(
      ['created', 'changed', 'changed'].map((action) => ({ action, by: 'MK', rowId: measurement.id })),
    );
    expect(lines[1]!.changes).toEqual([{ field: 'revisions', before: 1, after: 2 }]);
  });

  it('says nothing about stars and tags of candidates', async () => {
    const { store, candidate } = await measured();
    await store.candidates.update(candidate, 'star', { starred: true });
    expect(await store.db.log.count()).toBe(1);
  });

  it('keeps a measurement whose entry was undone in the bin', async () => {
    const { store, project, measurement } = await measured();
    await store.journal.undo(project.id);
    expect((await store.db.measurements.get(measurement.id))?.deletedAt).not.toBeNull();
  });
});
