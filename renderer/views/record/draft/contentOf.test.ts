import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../../../core/library';
import { type MeasurementContent, noConditions } from '../../../../core/record/measurement';
import { contentOf, keepingTheRest } from './contentOf';
import { blankMeasurement, draftOf, type MeasurementDraft } from './measurementDraft';
import { pastedCells } from './pastedCells';
import { substanceOf } from './substance';

const substance = substanceOf(
  {
    composition: {
      metal: 'Ni',
      oxidationState: 2,
      geometry: 'octahedral',
      ligands: { en: 3 },
      isomer: null,
    },
    counterIon: 'Cl',
    solvate: '2 H2O',
  },
  defaultLibrary,
);
const read = (change: Partial<MeasurementDraft>) => {
  const checked = contentOf({ ...blankMeasurement('MK', '2026-03-01'), ...change }, substance);
  if (!checked.ok) throw new Error(checked.problems.map(({ message }) => message).join(' '));
  return checked.value;
};
const refusals = (change: Partial<MeasurementDraft>): string[] => {
  const checked = contentOf({ ...blankMeasurement('MK', '2026-03-01'), ...change }, substance);
  return checked.ok ? [] : checked.problems.map(({ field }) => field);
};

const evans: Partial<MeasurementDraft> = {
  kind: 'moment',
  method: 'Evans',
  shift: '150',
  spectrometer: '400',
  concentration: '10.0',
  temperature: '298.15',
  basis: 'none',
};

describe('a moment worked out from what was read off', () => {
  // chi = 3 df / (4 pi f c), D. F. Evans, J. Chem. Soc. 1959, 2003, by hand: 150 Hz at 400 MHz, 10 mM: 8.95e-3, 4.62.
  it('follows Evans’s method', () => {
    const content = read(evans);
    expect(content.kind === 'moment' && content.moment_BM.value).toBeCloseTo(4.62, 2);
    const withCorrection = read({ ...evans, basis: 'typed', diamagnetism: '-250' });
    expect(withCorrection.kind === 'moment' && withCorrection.moment_BM.value).toBeCloseTo(4.68, 2);
  });

  it('says what it lacks, field by field', () => {
    expect(refusals({ ...evans, temperature: '' })).toEqual(['temperature']);
    expect(refusals({ ...evans, concentration: '' })).toEqual(['concentration']);
    expect(refusals({ ...evans, spectrometer: '' })).toEqual(['spectrometer frequency']);
    expect(refusals({ ...evans, basis: 'typed', diamagnetism: '250' })).toEqual([
      'diamagnetic susceptibility',
    ]);
    expect(refusals({ kind: 'moment' })).toEqual(['moment']);
  });

  // Molar mass of [Ni(en)3]Cl2.2H2O by hand from IUPAC weights: 58.693 + 3 x 60.100 + 2 x 35.45 + 2 x 18.015.
  it('takes the molar mass with counter-ion and solvate', () => {
    expect(substance.molarMass_g_mol).toBeCloseTo(345.92, 1);
    const content = read({
      kind: 'moment',
      method: 'balance',
      massSusceptibility: '12',
      temperature: '295',
      basis: 'half molar mass',
    });
    if (content.kind !== 'moment') throw new Error('no moment');
    expect(content.readings['molarMass_g_mol']).toBeCloseTo(345.92, 1);
    expect(content.diamagnetism.chi_cm3_mol).toBeCloseTo(-172.96e-6, 7);
    // 2.828 sqrt(chi T) with chi = 12e-6 x 345.92 + 173e-6.
    expect(content.moment_BM.value).toBeCloseTo(2.828 * Math.sqrt(4.324e-3 * 295), 2);
  });
});

describe('a correction', () => {
  const contents: MeasurementContent[] = [
    read({ ...evans, shiftU: '2', magnet: 'along', basis: 'typed', diamagnetism: '-250' }),
    read({ ...evans, basis: 'pascal sum' }),
    read({ kind: 'moment', method: 'magnetometer', moment: '3.2', momentUncertainty: '0.1' }),
    read({ kind: 'moment series', series: '100\t1.1\t0.01\n300\t1.2', basis: 'none' }),
    read({
      kind: 'emission',
      bands: [{ position: '690', uncertainty: '2', absorptivity: '', feature: 'maximum' }],
      excitation: '400',
      lifetime: '12',
    }),
    {
      kind: 'band list',
      conditions: {
        ...noConditions,
        concentration_mM: { value: 10, u: 0.1 },
        blank: 'water',
        bandwidth_nm: 2,
      },
      remark: 'fresh',
      attachments: [],
      reportedIn: 'nm',
      bands: [
        {
          energy_cm1: { value: 17_400, u: 50 },
          feature: 'shoulder',
          molarAbsorptivity: { value: 13, u: 0.2 },
          width_cm1: 3000,
          note: 'broad',
        },
      ],
    },
    {
      kind: 'spectrum',
      conditions: noConditions,
      remark: '',
      attachments: [],
      curveId: 'a'.repeat(64),
      source: { fileId: 'b'.repeat(64), fileName: 'run.csv', index: 1 },
      name: 'run',
    },
  ];

  it.each(contents)('that changes nothing loses nothing: $kind', (before) => {
    const checked = contentOf(draftOf(before, null), substance, before);
    if (!checked.ok) throw new Error(checked.problems.map(({ message }) => message).join(' '));
    expect(rounded(keepingTheRest(before, checked.value))).toEqual(rounded(before));
  });

  it('of what stands around a spectrum leaves its numbers alone', () => {
    const before = contents.at(-1)!;
    const checked = contentOf({ ...draftOf(before, null), solvent: 'water' }, substance, before);
    expect(checked.ok && checked.value).toMatchObject({
      curveId: 'a'.repeat(64),
      conditions: { solvent: 'water' },
    });
  });
});

/** Numbers through a form have seven figures. */
const rounded = (value: unknown): unknown =>
  JSON.parse(
    JSON.stringify(value, (_, each: unknown) =>
      typeof each === 'number' ? Number(each.toPrecision(6)) : each,
    ),
  );

describe('pasted lines', () => {
  it('are parted by what parts them, so that a decimal comma stays one', () => {
    expect(pastedCells('nm\tε\n575\t13,2\n408\t15,1\n')).toEqual([
      ['575', '13,2'],
      ['408', '15,1'],
    ]);
    expect(pastedCells('575, 13.2\r\n408 sh')).toEqual([
      ['575', '13.2'],
      ['408', 'sh'],
    ]);
    expect(pastedCells('300;3,87')).toEqual([['300', '3,87']]);
    expect(pastedCells('300,3.87')).toEqual([['300', '3.87']]);
  });
});
