import { describe, expect, it } from 'vitest';
import { complexKey } from '../../../core/library/parameterLibrary';
import type { Analysis } from '../../../core/record/analysis';
import { type ListedBand, type Measurement, noConditions } from '../../../core/record/measurement';
import type { FrozenPrediction } from '../../../core/record/project';
import { fieldAgreement, fieldPairsOf } from './fieldPairs';
import { agreementOf, countedPairs, pairsOf } from './recordPairs';

const at = '2026-03-01T09:00:00.000Z';
const row = (id: string) => ({ id, revision: 0, createdAt: at, updatedAt: at, deletedAt: null });
const composition = {
  metal: 'Cr',
  oxidationState: 3,
  geometry: 'octahedral',
  ligands: { h2o: 6 },
  isomer: null,
} as const;

/** Frozen as a spectrum of two bands and a weak one between them, near those of hexaaquachromium(III). */
const frozen: FrozenPrediction = {
  ...row('f'),
  projectId: 'p',
  candidateId: 'c',
  frozenAt: at,
  reason: 'test',
  parameterHash: 'literature',
  modelVersion: '1',
  prediction: {
    composition,
    tenDq: { value: 17_500, sigma: 500 },
    racahB: { value: 700, sigma: 30 },
    bands: [
      ['4T2g', 17_500, 'spin-allowed'],
      ['2Eg', 14_700, 'spin-forbidden'],
      ['4T1g', 24_500, 'spin-allowed'],
    ].map(([label, energy_cm1, kind]) => ({ label, energy_cm1, sigma_cm1: 500, kind, multiplicity: 4 })),
  },
};

const band = (value: number, feature: ListedBand['feature'] = 'maximum'): ListedBand => ({
  energy_cm1: { value, u: 100 },
  feature,
  molarAbsorptivity: null,
  width_cm1: null,
  note: '',
});

function measured(
  lists: readonly (readonly ListedBand[])[],
  date: string | null = '2026-03-10',
): Measurement {
  return {
    ...row('m'),
    projectId: 'p',
    candidateId: 'c',
    sampleId: null,
    frozenPredictionId: 'f',
    revisions: lists.map((bands, number) => ({
      number,
      at,
      by: 'MK',
      why: number === 0 ? '' : 'misread',
      content: {
        kind: 'band list',
        conditions: { ...noConditions, date },
        remark: '',
        attachments: [],
        reportedIn: 'cm-1',
        bands: [...bands],
      },
    })),
  };
}

const analysis = (fields: Partial<Analysis>): Analysis => ({
  ...row('a'),
  projectId: 'p',
  measurementId: 'm',
  treatment: [],
  bandFit: null,
  assignment: [],
  fieldFit: null,
  notes: '',
  ...fields,
});

describe('pairs of a measurement with its frozen prediction', () => {
  it('match strong bands with allowed ones and give residual and score', () => {
    const [first, second] = pairsOf(measured([[band(17_400), band(24_600)]]), frozen);
    expect(first).toMatchObject({ residual: -100, predicted: { label: '4T2g' } });
    expect(second!.score).toBeCloseTo(100 / Math.hypot(500, 100), 12);
  });

  it('count a corrected measurement once, as it was corrected last', () => {
    const pairs = pairsOf(measured([[band(14_700), band(24_600)], [band(17_400)]]), frozen);
    expect(pairs.map(({ measured: value }) => value)).toEqual([17_400]);
  });

  it('keep to the assignment that a person made', () => {
    const swapped = analysis({
      assignment: [
        {
          energy_cm1: { value: 14_900, u: 50 },
          label: '2Eg',
          multiplicity: 2,
          predicted_cm1: 14_700,
          by: 'person',
        },
      ],
    });
    const [pair] = pairsOf(measured([[band(14_900)]]), frozen, swapped);
    expect(pair).toMatchObject({ residual: 200, predicted: { label: '2Eg' } });
  });

  it('show but do not count shoulders, bands from before freezing, and complexes that informed the parameters', () => {
    const informed = new Set([complexKey(composition)]);
    const counts = [
      pairsOf(measured([[band(17_400)]]), frozen),
      pairsOf(measured([[band(17_400, 'shoulder')]]), frozen),
      pairsOf(measured([[band(17_400)]], '2026-02-27'), frozen),
      pairsOf(measured([[band(17_400)]]), frozen, null, informed),
    ].map((pairs) => [pairs.length, countedPairs(pairs).length]);
    expect(counts).toEqual([
      [1, 1],
      [1, 0],
      [1, 0],
      [1, 0],
    ]);
    expect(agreementOf(pairsOf(measured([[band(17_400)]]), frozen, null, informed))).toBeNull();
  });
});

describe('field fits beside predicted parameters', () => {
  const fitted = (value: number, status = 'fitted') => ({ value, se: 20, status });
  const fieldFit: Analysis['fieldFit'] = {
    dElectrons: 3,
    geometry: 'octahedral',
    tenDq: fitted(17_400),
    B: fitted(725, 'held'),
    C: fitted(2900, 'held'),
    rms_cm1: 10,
    notDetermined: [],
    warnings: [],
  };
  const none = new Set<string>();

  it('compare only what was fitted, in shares of the fitted value', () => {
    const pairs = fieldPairsOf(measured([[band(17_400)]]), frozen, analysis({ fieldFit }), none);
    expect(pairs.map(({ quantity }) => quantity)).toEqual(['10Dq']);
    expect(fieldAgreement(pairs, '10Dq')!.errors.bias).toBeCloseTo(100 / 17_400, 12);
    expect(fieldAgreement(pairs, 'B')).toBeNull();
  });

  it('leave out a fit against physics and count none in-sample', () => {
    const against = analysis({ fieldFit: { ...fieldFit, warnings: ['B is above that of the free ion'] } });
    expect(fieldPairsOf(measured([[band(17_400)]]), frozen, against, none)).toEqual([]);
    const informed = new Set([complexKey(composition)]);
    const pairs = fieldPairsOf(measured([[band(17_400)]]), frozen, analysis({ fieldFit }), informed);
    expect([pairs.length, fieldAgreement(pairs, '10Dq')]).toEqual([1, null]);
  });
});
