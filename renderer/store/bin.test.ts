// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { type MeasurementContent, noConditions } from '../../core/record/measurement';
import { hexaammine, testStore } from './testing/testStore';

const note: MeasurementContent = {
  kind: 'note',
  conditions: noConditions,
  remark: 'yellow powder',
  attachments: [],
};

async function measured() {
  const { store } = await testStore();
  const project = await store.projects.create('Liquid filter');
  const [candidate] = await store.candidates.create(project.id, [hexaammine('Cr')]);
  const { measurements } = await store.measurements.add({
    candidate: candidate!,
    contents: [note],
    batch: { batch: 'MK-12', phase: 'powder' },
    by: 'MK',
    prediction: null,
    formula: '[Cr(NH3)6]3+',
  });
  return { store, project, candidate: candidate!, measurement: measurements[0]! };
}

describe('measurements in the bin', () => {
  it('are listed with their complex, and come back', async () => {
    const { store, project, candidate, measurement } = await measured();
    await store.measurements.remove(measurement);
    const { records } = await store.bin.content();
    expect(records).toMatchObject([
      { table: 'measurements', row: { id: measurement.id }, projectName: 'Liquid filter' },
    ]);
    expect(records[0]!.candidate.id).toBe(candidate.id);
    await store.bin.restore(records[0]!);
    expect((await store.bin.content()).records).toEqual([]);
    expect(await store.measurements.ofProject(project.id)).toHaveLength(1);
  });

  it('whose entry was undone come back with their batch, as one step', async () => {
    const { store, project, candidate } = await measured();
    await store.journal.undo(project.id);
    const { records } = await store.bin.content();
    expect(records.map(({ table }) => table).sort()).toEqual(['measurements', 'samples']);
    await store.bin.restore(records.find(({ table }) => table === 'measurements')!);
    expect((await store.samples.of(candidate.id)).map(({ batch }) => batch)).toEqual(['MK-12']);
    const [back] = await store.measurements.of(candidate.id);
    expect(back!.sampleId).toBe((await store.samples.of(candidate.id))[0]!.id);
    expect((await store.journal.undo(project.id))?.label).toBe('bring back a measurement');
    expect(await store.measurements.of(candidate.id)).toEqual([]);
    expect(await store.samples.of(candidate.id)).toEqual([]);
  });

  it('bring their candidate back with them', async () => {
    const { store, project, candidate, measurement } = await measured();
    await store.measurements.remove(measurement);
    await store.candidates.remove(project.id, [candidate.id]);
    await store.bin.restore((await store.bin.content()).records[0]!);
    expect((await store.candidates.get(candidate.id))?.deletedAt).toBeNull();
  });

  it('of a project in the bin are not listed one by one', async () => {
    const { store, project, measurement } = await measured();
    await store.measurements.remove(measurement);
    await store.projects.remove(project.id);
    const { projects, records } = await store.bin.content();
    expect([projects.length, records.length]).toEqual([1, 0]);
  });
});
