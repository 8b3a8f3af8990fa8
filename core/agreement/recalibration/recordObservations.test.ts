import { describe, expect, it } from 'vitest';
import type { Analysis } from '../../record/analysis';
import { emptyContent, type BundleContent } from '../../record/bundle';
import { noConditions } from '../../record/measurement';
import { bundleObservations } from './index';

const at = '2026-03-01T09:00:00.000Z';
const row = (id: string) => ({ id, revision: 0, createdAt: at, updatedAt: at, deletedAt: null });
const fitted = (value: number, se: number | null, status = 'fitted') => ({ value, se, status });
const fieldFit: NonNullable<Analysis['fieldFit']> = {
  dElectrons: 3,
  geometry: 'octahedral',
  tenDq: fitted(17_400, 20),
  B: fitted(725, 40),
  C: fitted(2900, null, 'held'),
  rms_cm1: 10,
  notDetermined: [],
  warnings: [],
};

/** One measured complex whose fit is as given. */
function project(fit: Analysis['fieldFit'], candidateDeletedAt: string | null = null): BundleContent {
  return {
    ...emptyContent(),
    candidates: [
      {
        ...row('c'),
        deletedAt: candidateDeletedAt,
        projectId: 'p',
        name: '',
        composition: {
          metal: 'Cr',
          oxidationState: 3,
          geometry: 'octahedral',
          ligands: { h2o: 6 },
          isomer: null,
        },
        ...{ counterIon: null, solvate: null, concentration_mM: null, path_cm: null, tags: [] },
        ...{ starred: false, archived: false, notes: '' },
      },
    ],
    measurements: [
      {
        ...row('m'),
        ...{ projectId: 'p', candidateId: 'c', sampleId: null, frozenPredictionId: null },
        revisions: [
          {
            ...{ number: 0, at, by: 'MK', why: '' },
            content: { kind: 'note', conditions: noConditions, remark: '', attachments: [] },
          },
        ],
      },
    ],
    analyses: [
      {
        ...row('a'),
        ...{ projectId: 'p', measurementId: 'm', treatment: [], bandFit: null, assignment: [], notes: '' },
        fieldFit: fit,
      },
    ],
  };
}

describe('evidence of an exported project', () => {
  it('is what was fitted, never taken for surer than repeated spectra are', () => {
    // 20 of 17 400 cm-1 would be 0.1 %; repeated spectra agree to 1 % (common practice).
    expect(bundleObservations(project(fieldFit))).toMatchObject([
      { id: 'm', tenDq: { value: 17_400, u: 174 }, B: { value: 725, u: 40 } },
    ]);
  });

  it('leaves out values that were held', () => {
    const [observation] = bundleObservations(project({ ...fieldFit, B: fitted(700, null, 'held') }));
    expect(observation!.B).toBeNull();
  });

  it('leaves out fits against physics, complexes in the bin and measurements without a fit', () => {
    const against = { ...fieldFit, warnings: ['B is above that of the free ion'] };
    for (const content of [project(against), project(fieldFit, at), project(null)])
      expect(bundleObservations(content)).toEqual([]);
  });
});
