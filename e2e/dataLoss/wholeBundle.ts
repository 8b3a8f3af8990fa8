import { type BundleContent, writeBundle } from '../../core/record/bundle';
import { curveRow } from '../../core/record/curve';
import { storeFile } from '../../core/record/file';
import { type Measurement, noConditions } from '../../core/record/measurement';

const at = '2026-03-01T09:00:00.000Z';
const row = (id: string) => ({ id, revision: 0, createdAt: at, updatedAt: at, deletedAt: null });
const file = storeFile(new TextEncoder().encode('nm,A\n400,0.1\n500,0.4\n600,0.2\n'), 'text/csv');
const curve = curveRow({
  kind: 'curve',
  xUnit: 'nm',
  yUnit: 'absorbance',
  x: [400, 500, 600],
  y: [0.1, 0.4, null],
});

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
        conditions: { ...noConditions, solvent: 'water', concentration_mM: { value: 20, u: 0.2 } },
        remark: '',
        attachments: [{ name: 'raw.csv', fileId: file.id }],
        curveId: curve.id,
        source: { fileId: file.id, fileName: 'raw.csv', index: 0 },
        name: 'first run',
      },
    },
  ],
};

/** A made-up project with rows in every table, so that a mutation can hit each of them. */
export const wholeContent: Partial<BundleContent> = {
  projects: [
    {
      ...row('p1'),
      name: 'Filter µ, Größe "A"',
      notes: 'line one\nline two',
      demo: false,
      targetLab: [60, 20, -30],
      parameterSetId: 'set1',
    },
  ],
  candidates: ['c1', 'c2', 'c3'].map((id, i) => ({
    ...row(id),
    projectId: 'p1',
    name: `number ${i}`,
    composition: {
      metal: 'Ni',
      oxidationState: 2,
      geometry: 'octahedral',
      ligands: { nh3: 6 - i, h2o: i || 1 },
    },
    counterIon: 'Cl-',
    solvate: null,
    concentration_mM: 20,
    path_cm: 1,
    tags: ['first round'],
    starred: i === 0,
    archived: false,
    notes: '',
  })),
  parameterSets: [
    {
      ...row('set1'),
      projectId: 'p1',
      name: 'after March',
      author: 'AB',
      reason: 'ammines came out high',
      parentId: null,
      hash: '0'.repeat(64),
      values: { 'ligand.nh3.f': { value: 1.24, sigma: 0.02, source: 'own' } },
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
      prediction: { tenDq: { value: 10_900, sigma: 650 } },
    },
  ],
  samples: [
    {
      ...row('s1'),
      ...{ projectId: 'p1', candidateId: 'c1', batch: 'AB-1', formula: '[Ni(NH3)6]Cl2', counterIon: 'Cl-' },
      ...{ solvate: null, molarMass_g_mol: 231.8, molarMassBasis: 'computed' as const, purity_percent: 98 },
      ...{
        purityBasis: null,
        phase: 'solution' as const,
        mass_mg: 12,
        madeOn: '2026-02-27',
        operator: 'AB',
        notes: '',
      },
    },
  ],
  measurements: [measurement],
  curves: [curve],
  files: [file],
  analyses: [
    {
      ...row('a1'),
      projectId: 'p1',
      measurementId: 'm1',
      treatment: [{ op: 'merge equal x', keep: 'mean' }],
      bandFit: null,
      assignment: [],
      fieldFit: null,
      notes: '',
    },
  ],
  wishes: [{ ...row('w1'), projectId: 'p1', name: 'violet', wish: { name: 'violet' } }],
  log: [
    {
      id: 'l1',
      projectId: 'p1',
      at,
      by: 'AB',
      action: 'created',
      table: 'measurements',
      rowId: 'm1',
      what: 'measurement added',
      changes: [{ field: 'notes', before: null, after: 'x' }],
    },
  ],
};

export const wholeBundle = writeBundle(wholeContent);
