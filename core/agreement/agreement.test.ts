import { describe, expect, it } from 'vitest';
import type { Band } from '../prediction';
import { agreementReport, compareComplex, firstAllowed, matchBands, readMeasuredSet } from '.';

// Bands from memory of B. N. Figgis and M. A. Hitchman (2000) and C. K. Jorgensen (1962).
const nickelAqua = {
  id: 'ni-aqua',
  formula: '[Ni(H2O)6]2+',
  metal: 'Ni',
  oxidationState: 2,
  geometry: 'octahedral',
  ligands: { h2o: 6 },
  isomer: null,
  medium: 'water',
  bands: [
    { energy_cm1: 8500, epsilon: 2, assignment: '3A2g -> 3T2g', kind: 'spin-allowed', feature: 'max' },
    { energy_cm1: 13_800, epsilon: 2, assignment: '3A2g -> 3T1g(F)', kind: 'spin-allowed', feature: 'max' },
    { energy_cm1: 25_300, epsilon: 5, assignment: '3A2g -> 3T1g(P)', kind: 'spin-allowed', feature: 'max' },
  ],
  published: { tenDq: 8500, racahB: 907 },
  groundSpin: 'only',
  muEff: { value: 3.2 },
  useForTuning: true,
};
const cobaltAmmine = {
  id: 'co-en',
  metal: 'Co',
  oxidationState: 3,
  geometry: 'octahedral',
  ligands: { en: 3 },
  bands: [
    { energy_cm1: 21_400, epsilon: 84, assignment: '1A1g -> 1T1g', kind: 'spin-allowed', feature: 'max' },
  ],
  published: { tenDq: 23_200 },
  groundSpin: 'low',
  medium: 'water',
};

const read = (input: unknown) => {
  const set = readMeasuredSet(input);
  if (!set.ok) throw new Error(set.problems[0]!.message);
  return set.value;
};

describe('a set of measurements', () => {
  it('is read with the ligands it brings along', () => {
    const set = read({
      meta: {
        newLigands: { zz: { name: 'made-up tripod', charge: 0, donorAtoms: ['N', 'N', 'N'], denticity: 3 } },
      },
      complexes: [{ ...nickelAqua, ligands: { zz: 2 } }],
    });
    const compared = compareComplex(set[0]!);
    expect(compared.problem).toBeNull();
    expect(compared.tenDq!.predicted).toBeGreaterThan(9000);
  });

  it('may say how many donors of a ligand are bound', () => {
    const [complex] = read([{ ...nickelAqua, ligands: { edta: 1, h2o: 1 }, denticityUsed: { edta: 5 } }]);
    expect(compareComplex(complex!).problem).toBeNull();
  });

  it.each([[{}], [{ complexes: 7 }], [[]], [[{ metal: 'Ni' }]], ['x']])(
    'is refused where it is none: %j',
    (input) => {
      expect(readMeasuredSet(input).ok).toBe(false);
    },
  );

  it('keeps a complex that cannot be predicted in the count', () => {
    const [complex] = read([{ ...nickelAqua, ligands: { unobtainium: 6 } }]);
    const compared = compareComplex(complex!);
    expect(compared.problem).toMatch(/unobtainium/);
    expect(compared.notEstimated).toBe(true);
    expect(agreementReport([compared]).notEstimated.hits).toBe(1);
  });
});

describe('predicted beside measured', () => {
  it('pairs bands by the name of their terms and gives relative errors', () => {
    const compared = compareComplex(read([nickelAqua])[0]!);
    expect(compared.bands.map(({ label }) => label)).toEqual(['3T2g', '3T1g', '3T1g']);
    expect(Math.abs(compared.firstBand!.relativeError!)).toBeLessThan(0.03);
    expect(compared.moment).toEqual({ measured: 3.2, inside: true });
    expect(compared.spin).toBeNull();
  });

  it('judges the spin state only where there is a choice', () => {
    const compared = compareComplex(read([cobaltAmmine])[0]!);
    expect(compared.spin).toMatchObject({ found: 'low', predicted: 'low', right: true });
  });

  it('sums up: errors, shares with their intervals, coverage', () => {
    const report = agreementReport(
      read([nickelAqua, cobaltAmmine]).map((complex) => compareComplex(complex)),
    );
    expect(report.complexes).toBe(2);
    expect(report.firstBand.n).toBe(2);
    expect(report.spinRight).toMatchObject({ hits: 1, of: 1 });
    expect(report.bandsWithin95.of).toBe(4);
    expect(report.tenDqEstimated.share).toBe(1);
  });
});

describe('matching', () => {
  const band = (label: string, energy_cm1: number, kind: Band['kind'] = 'spin-allowed'): Band => ({
    energy_cm1,
    sigma_cm1: 400,
    wavelength_nm: 1e7 / energy_cm1,
    multiplicity: 3,
    label,
    kind,
    molarAbsorptivity: 1,
    molarAbsorptivityRange: [0, 10],
    intensityClass: '',
    width_cm1: 3000,
    reasons: [],
  });
  const found = (energy_cm1: number, assignment: string | null, feature = 'max') => ({
    energy_cm1,
    epsilon: null,
    assignment,
    kind: 'spin-allowed',
    feature,
  });

  it('takes the upper of two like terms for a parent P even where the lower was not seen', () => {
    const pairs = matchBands(
      [found(25_000, '3A2g -> 3T1g(P)')],
      [band('3T1g', 24_000), band('3T1g', 26_500)],
    );
    expect(pairs[0]!.predicted.energy_cm1).toBe(26_500);
  });

  it('falls back on the nearest of the same kind where the name says nothing', () => {
    const pairs = matchBands(
      [found(12_000, 'd-d')],
      [band('5Eg', 11_000), band('3T1g', 12_000, 'spin-forbidden')],
    );
    expect(pairs[0]!.predicted.label).toBe('5Eg');
  });

  it('does not take a shoulder for the first band where there is a maximum', () => {
    expect(firstAllowed([found(17_400, null, 'shoulder'), found(20_300, null)])!.energy_cm1).toBe(20_300);
    expect(firstAllowed([found(17_400, null, 'shoulder')])!.energy_cm1).toBe(17_400);
    expect(firstAllowed([])).toBeNull();
  });
});
