import { describe, expect, it } from 'vitest';
import type { Analysis } from '../analysis';
import { curveRow } from '../curve';
import { bytesOfFile, storeFile } from '../file';
import { noConditions, type Measurement } from '../measurement';
import { missingFields, missingOfSample } from '../missing';
import type { Sample } from '../sample';
import { readBundle, writeBundle, type BundleContent } from './index';

const at = '2026-03-01T09:00:00Z';
const row = (id: string) => ({ id, revision: 0, createdAt: at, updatedAt: at, deletedAt: null });
const rawBytes = new TextEncoder().encode('nm,A\r\n400,0.1\r\n410,Over\r\n420,0.3\r\n');
const raw = storeFile(rawBytes, 'text/csv');
const curve = curveRow({
  kind: 'curve',
  xUnit: 'nm',
  yUnit: 'absorbance',
  x: [400, 410, 420],
  y: [0.1, null, 0.3],
});
const sample: Sample = {
  ...row('s1'),
  projectId: 'p1',
  candidateId: 'c1',
  batch: 'AB-12',
  formula: '[Ni(en)3]Cl2.2H2O',
  counterIon: 'Cl-',
  solvate: '2 H2O',
  molarMass_g_mol: 345.9,
  molarMassBasis: 'computed',
  purity_percent: null,
  purityBasis: null,
  phase: 'solution',
  mass_mg: 12.5,
  madeOn: '2026-02-27',
  operator: 'AB',
  notes: '',
};
const measurement: Measurement = {
  ...row('m1'),
  projectId: 'p1',
  candidateId: 'c1',
  sampleId: 's1',
  frozenPredictionId: 'f1',
  revisions: [
    {
      number: 0,
      at,
      by: 'AB',
      why: '',
      content: {
        kind: 'spectrum',
        conditions: { ...noConditions, solvent: 'water', path_cm: { value: 1, u: 0.005 } },
        remark: '',
        attachments: [{ name: 'page 12.png', fileId: raw.id }],
        curveId: curve.id,
        source: { fileId: raw.id, fileName: 'run 3.csv', index: 0 },
        name: null,
      },
    },
  ],
};
const analysis: Analysis = {
  ...row('a1'),
  projectId: 'p1',
  measurementId: 'm1',
  treatment: [{ op: 'leave out above', absorbance: 2 }],
  bandFit: null,
  assignment: [],
  fieldFit: null,
  notes: '',
};
const content: Partial<BundleContent> = {
  projects: [{ ...row('p1'), name: 'p', notes: '', demo: false, targetLab: null, parameterSetId: null }],
  candidates: [
    {
      ...row('c1'),
      projectId: 'p1',
      name: '',
      composition: { metal: 'Ni', oxidationState: 2, geometry: 'octahedral', ligands: { en: 3 } },
      counterIon: null,
      solvate: null,
      concentration_mM: null,
      path_cm: null,
      tags: [],
      starred: false,
      archived: false,
      notes: '',
    },
  ],
  frozenPredictions: [
    {
      ...row('f1'),
      projectId: 'p1',
      candidateId: 'c1',
      frozenAt: at,
      reason: 'before the first measurement',
      parameterHash: '0'.repeat(64),
      modelVersion: '1',
      prediction: {},
    },
  ],
  samples: [sample],
  measurements: [measurement],
  curves: [curve],
  analyses: [analysis],
  files: [raw],
  log: [
    {
      id: 'l1',
      projectId: 'p1',
      at,
      by: 'AB',
      action: 'created',
      table: 'measurements',
      rowId: 'm1',
      what: 'spectrum run 3.csv added',
      changes: [{ field: 'revisions', before: null, after: [0] }],
    },
  ],
};

/** Problems of a bundle in which one thing was changed. */
function fieldsAfter(edit: (tables: Record<string, Record<string, unknown>[]>) => void): string[] {
  const bundle = JSON.parse(writeBundle(content)) as { content: Parameters<typeof edit>[0] };
  edit(bundle.content);
  const reading = readBundle(JSON.stringify(bundle));
  return reading.ok ? [] : reading.problems.map((problem) => problem.field);
}

describe('a bundle of a lab record', () => {
  it('comes back equal, with the raw file byte for byte', () => {
    const reading = readBundle(writeBundle(content));
    if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
    expect(reading.content).toMatchObject(content);
    expect(bytesOfFile(reading.content.files[0]!)).toEqual(rawBytes);
    expect(writeBundle(reading.content)).toBe(writeBundle(content));
  });

  it('is refused where a curve or a raw file no longer fits its hash', () => {
    expect(fieldsAfter((tables) => ((tables.curves![0] as { y: number[] }).y[0] = 0.2))).toContain(
      'curves[0]',
    );
    expect(fieldsAfter((tables) => (tables.files![0]!.base64 = 'AAAA'))).toContain('files[0]');
  });

  it('is refused where a measurement points to a curve, a sample or an attachment that is not there', () => {
    expect(fieldsAfter((tables) => (tables.curves = []))).toContain(
      'measurements.m1.revisions[0].content.curveId',
    );
    expect(fieldsAfter((tables) => (tables.samples = []))).toContain('measurements.m1.sampleId');
    expect(fieldsAfter((tables) => (tables.files = []))).toContain(
      'measurements.m1.revisions[0].content.source.fileId',
    );
  });

  it('is refused where an attachment is named like a path', () => {
    const fields = fieldsAfter((tables) => {
      const { revisions } = tables.measurements![0] as unknown as Measurement;
      Object.assign(revisions[0]!.content.attachments[0]!, { name: '../../etc/passwd' });
    });
    expect(fields).toContain('measurements[0].revisions[0].content.attachments[0].name');
  });

  it('keeps a listed file whose bytes did not travel', () => {
    const reading = readBundle(writeBundle({ ...content, files: [{ ...raw, base64: null }] }));
    expect(reading.ok && bytesOfFile(reading.content.files[0]!)).toBe('missing');
  });
});

describe('what is missing', () => {
  it('is listed by weight and does not stop anything', () => {
    const missing = missingFields(measurement.revisions[0]!.content, null);
    expect(missing.filter((each) => each.weight === 'needed').map((each) => each.field)).toEqual([
      'sampleId',
      'conditions.concentration_mM',
    ]);
    expect(missing.map((each) => each.label)).toContain('instrument');
    expect(missingOfSample(sample).map((each) => each.field)).toEqual(['purity_percent']);
  });
});
