// @vitest-environment node
import { describe, expect, it } from 'vitest';
import type { Prediction } from '../../../core/prediction/types';
import { bytesOfFile, storeFile } from '../../../core/record/file';
import { type MeasurementContent, noConditions } from '../../../core/record/measurement';
import { currentContent } from '../../../core/record/revisions';
import { hexaammine, testStore } from '../testing/testStore';

const prediction = {
  formula: '[Cr(NH3)6]3+',
  bands: [],
  madeWith: { parameterSet: 'library', parameterHash: 'h', modelVersion: '1' },
} as unknown as Prediction;

const colour = (words: string): MeasurementContent => ({
  kind: 'observed colour',
  conditions: noConditions,
  remark: '',
  attachments: [],
  words,
  lightSource: null,
  lab: null,
});

async function bench() {
  const { store } = await testStore();
  const project = await store.projects.create('Liquid filter');
  const [candidate] = await store.candidates.create(project.id, [hexaammine('Cr')]);
  const add = (words: string, batch: string | null = null) =>
    store.measurements.add({
      candidate: candidate!,
      contents: [colour(words)],
      batch: batch === null ? null : { batch, phase: 'solution' },
      by: 'MK',
      prediction,
      formula: '[Cr(NH3)6]3+',
    });
  return { store, project, candidate: candidate!, add };
}

describe('saving a measurement', () => {
  it('freezes the prediction first where none was frozen, and says so', async () => {
    const { store, candidate, add } = await bench();
    const { measurements, froze } = await add('yellow');
    const [frozen] = await store.frozenPredictions.of(candidate.id);
    expect(froze).toBe(true);
    expect(measurements[0]!.frozenPredictionId).toBe(frozen!.id);
    const log = await store.db.log.toArray();
    expect(log.map(({ action }) => action)).toEqual(['frozen', 'created']);
  });

  it('keeps to the prediction that stands, and to its own when another is frozen later', async () => {
    const { store, candidate, add } = await bench();
    const first = await store.frozenPredictions.freeze(
      candidate,
      prediction,
      'before the synthesis',
      'freeze',
    );
    const { measurements, froze } = await add('yellow');
    expect(froze).toBe(false);
    await store.frozenPredictions.freeze(candidate, prediction, 'second thoughts', 'freeze');
    const [stored] = await store.measurements.of(candidate.id);
    expect(stored!.frozenPredictionId).toBe(first.id);
    expect(measurements[0]!.frozenPredictionId).toBe(first.id);
    expect((await add('orange')).measurements[0]!.frozenPredictionId).not.toBe(first.id);
  });

  it('names a batch once and makes a second sample for another phase', async () => {
    const { store, candidate, add } = await bench();
    await add('yellow', 'MK-1');
    await add('yellow', ' MK-1 ');
    expect(await store.samples.of(candidate.id)).toHaveLength(1);
    await store.measurements.add({
      candidate,
      contents: [colour('ochre')],
      batch: { batch: 'MK-1', phase: 'powder' },
      by: 'MK',
      prediction: null,
      formula: '[Cr(NH3)6]3+',
    });
    expect((await store.samples.of(candidate.id)).map(({ phase }) => phase)).toEqual(['solution', 'powder']);
  });

  it('stores nothing at all where one of several cannot be kept', async () => {
    const { store, project, candidate } = await bench();
    const given = {
      candidate,
      contents: [colour('yellow'), colour('')],
      batch: { batch: 'MK-1', phase: null },
      by: 'MK',
      prediction,
      formula: '[Cr(NH3)6]3+',
    };
    await expect(store.measurements.add(given)).rejects.toMatchObject({ field: 'words' });
    expect(await store.measurements.ofProject(project.id)).toEqual([]);
    expect(await store.frozenPredictions.of(candidate.id)).toEqual([]);
  });
});

describe('a correction', () => {
  it('adds a revision with who, when and why, and leaves the former one as it was', async () => {
    const { store, add } = await bench();
    const [measurement] = (await add('yellow')).measurements;
    const before = structuredClone(measurement!.revisions[0]);
    const after = await store.measurements.correct(measurement!, {
      by: 'AB',
      why: 'seen by lamp light',
      content: colour('orange yellow'),
    });
    expect(after.revisions[0]).toEqual(before);
    expect(after.revisions[1]).toMatchObject({ number: 1, by: 'AB', why: 'seen by lamp light' });
    expect(currentContent(after)).toMatchObject({ words: 'orange yellow' });
  });

  it('brings attachments along and names a batch that nobody had named, never another one', async () => {
    const { store, candidate, add } = await bench();
    const [measurement] = (await add('yellow')).measurements;
    const file = storeFile(new Uint8Array([0, 255, 13]), 'image/png');
    const content = { ...colour('yellow'), attachments: [{ name: 'photo.png', fileId: file.id }] };
    const named = (batch: string) => ({ candidate, named: { batch, phase: null } });
    const correction = { by: 'AB', why: 'photo', content, files: [file] };
    const after = await store.measurements.correct(measurement!, { ...correction, batch: named('MK-1') });
    const [sample] = await store.samples.of(candidate.id);
    expect([after.sampleId, sample!.batch]).toEqual([sample!.id, 'MK-1']);
    expect(bytesOfFile((await store.measurements.file(file.id))!)).toEqual(new Uint8Array([0, 255, 13]));
    const later = await store.measurements.correct(after, { ...correction, batch: named('MK-2') });
    expect(later.sampleId).toBe(sample!.id);
    expect(await store.samples.of(candidate.id)).toHaveLength(1);
  });

  it('is refused without a reason', async () => {
    const { store, candidate, add } = await bench();
    const [measurement] = (await add('yellow')).measurements;
    const correction = { by: 'AB', why: '  ', content: colour('red') };
    await expect(store.measurements.correct(measurement!, correction)).rejects.toMatchObject({
      message: 'a correction needs its reason',
    });
    expect((await store.measurements.of(candidate.id))[0]!.revisions).toHaveLength(1);
  });

  it('is refused where somebody corrected the same entry meanwhile', async () => {
    const { store, add } = await bench();
    const [measurement] = (await add('yellow')).measurements;
    const correction = { by: 'AB', why: 'typing slip', content: colour('red') };
    await store.measurements.correct(measurement!, correction);
    await expect(store.measurements.correct(measurement!, correction)).rejects.toMatchObject({
      code: 'changed-meanwhile',
    });
  });
});

describe('undo', () => {
  it('takes a correction, a deletion and the first saving back, one by one', async () => {
    const { store, project, candidate, add } = await bench();
    const [measurement] = (await add('yellow')).measurements;
    const corrected = await store.measurements.correct(measurement!, {
      by: 'AB',
      why: 'slip',
      content: colour('red'),
    });
    await store.measurements.remove(corrected);
    expect(await store.measurements.of(candidate.id)).toEqual([]);
    expect(await store.measurements.inBinOf(candidate.id)).toHaveLength(1);

    await store.journal.undo(project.id);
    expect(currentContent((await store.measurements.of(candidate.id))[0]!)).toMatchObject({ words: 'red' });
    await store.journal.undo(project.id);
    expect(currentContent((await store.measurements.of(candidate.id))[0]!)).toMatchObject({
      words: 'yellow',
    });
    await store.journal.undo(project.id);
    expect(await store.measurements.of(candidate.id)).toEqual([]);
    expect(await store.measurements.inBinOf(candidate.id)).toHaveLength(1);
    await store.journal.redo(project.id);
    expect(await store.measurements.of(candidate.id)).toHaveLength(1);
  });
});
