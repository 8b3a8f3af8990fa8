import { describe, expect, it } from 'vitest';
import { recalibrate } from '../../../../core/agreement/recalibration';
import { defaultLibrary } from '../../../../core/library/parameterLibrary';
import type { PlainObservation } from '../../../../core/agreement/recalibration';
import { ownRows, shareInUse, spoken, subjectOf } from './proposalRows';

describe('lines of a proposal', () => {
  it('name what changes as people say it', () => {
    const names = ['ligand.im.f', 'ion.Cr3+.g', 'ligand.h2o.h', 'anchor.V3+.cl'].map((key) =>
      spoken(subjectOf(key, defaultLibrary)),
    );
    expect(names).toEqual([
      'field factor f of imidazole',
      'field factor g of Cr3+',
      'nephelauxetic factor h of water',
      '10Dq of V3+ with chloride alone',
    ]);
  });

  it('tell how much of a value is still that of the literature', () => {
    // 1.25 +- 8 % and an observation of +- 5.39 %: precisions 156.25 and 344.8, so 31 % is the literature's.
    const change = {
      key: 'ligand.im.f',
      before: { value: 1.25, sigma: 0.1 },
      after: { value: 1.275, sigma: 1.275 * 0.0447 },
      shift: 0.25,
      from: ['a'],
    };
    expect(shareInUse(change)).toBeCloseTo(0.312, 2);
    expect(shareInUse({ ...change, before: { value: 1.25, sigma: 0 } })).toBe(1);
  });

  it('hold a measured complex beside its estimate', () => {
    const observation: PlainObservation = {
      id: 'm1',
      composition: {
        metal: 'Cr',
        oxidationState: 3,
        geometry: 'octahedral',
        ligands: { nh3: 6 },
        isomer: null,
      },
      spin: null,
      tenDq: { value: 21_900, u: 200 },
      B: null,
      source: 'test',
    };
    const value = recalibrate([{ ...observation, library: defaultLibrary }]);
    const [row, ...others] = ownRows(value, [observation], defaultLibrary);
    expect(others).toEqual([]);
    expect(row).toMatchObject({ formula: '[Cr(NH3)6]3+', quantity: '10Dq', measured: { value: 21_900 } });
    // 10Dq of hexaamminechromium(III), 21 550 cm-1, from memory of C. K. Jorgensen (1962).
    expect(Math.abs(row!.estimated!.value / 21_550 - 1)).toBeLessThan(0.02);
  });
});
