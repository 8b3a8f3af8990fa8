import { describe, expect, it } from 'vitest';
import { estimate } from '../estimation';
import { statedInput, type StatedComplex } from '../testing/bandInput';
import { fromWavenumber, toWavenumber } from '../units';
import {
  axialComponents,
  commonDoubts,
  predictBands,
  propagatedSigma,
  smallestSigma_cm1,
  type Band,
} from './index';

const bandsOf = (complex: StatedComplex): readonly Band[] => predictBands(statedInput(complex)).bands;
const dd = (complex: StatedComplex): Band[] =>
  bandsOf(complex).filter(({ kind }) => kind === 'spin-allowed' || kind === 'spin-forbidden');
const allowed = (complex: StatedComplex): Band[] => dd(complex).filter(({ kind }) => kind === 'spin-allowed');
const energies = (bands: readonly Band[]): number[] => bands.map(({ energy_cm1 }) => Math.round(energy_cm1));

const chromiumAqua = {
  metal: 'Cr',
  oxidationState: 3,
  ligands: { h2o: 6 },
  tenDq: 17_400,
  B: 725,
  C: 2_900,
  zeta: 230,
} as const;
const nickelAqua = {
  metal: 'Ni',
  oxidationState: 2,
  ligands: { h2o: 6 },
  tenDq: 8_500,
  B: 940,
  C: 3_760,
  zeta: 540,
} as const;

describe('places of bands', () => {
  // Full diagonalisation by an independent program over all microstates, parameters as stated.
  it('of aqua chromium(III): 4T2 at 10Dq, 4T1 at 24 574 and 38 501, 2E at 14 011, 2T1 at 14 676 cm-1', () => {
    expect(energies(allowed(chromiumAqua))).toEqual([17_400, 24_574, 38_501]);
    const byLabel = (label: string): number =>
      energies(dd(chromiumAqua).filter((b) => b.label === label))[0]!;
    expect([byLabel('2Eg'), byLabel('2T1g')]).toEqual([14_011, 14_676]);
  });

  it('of aqua nickel(II): 8 500, 14 160 and 25 440 cm-1, the first shown in the near infrared', () => {
    const bands = allowed(nickelAqua);
    expect(energies(bands)).toEqual([8_500, 14_160, 25_440]);
    expect(Math.round(bands[0]!.wavelength_nm)).toBe(1_176);
  });

  it('of low-spin d6 start below 10Dq: 1T1 at 21 167 for 10Dq 23 000, B 600 and C 2 700', () => {
    const bands = allowed({
      metal: 'Co',
      oxidationState: 3,
      ligands: { nh3: 6 },
      tenDq: 23_000,
      B: 600,
      C: 2_700,
    });
    expect(energies(bands).slice(0, 2)).toEqual([21_167, 29_311]);
    expect(bands[0]!.label).toBe('1T1g');
  });

  it('of d7 with a T ground term give 10Dq as a difference, not as the first band', () => {
    const [first, second, third] = energies(
      allowed({ metal: 'Co', oxidationState: 2, ligands: { h2o: 6 }, tenDq: 9_300, B: 850, C: 3_825 }),
    );
    expect([first, second, third]).toEqual([8_166, 17_466, 19_782]);
    expect(second! - first!).toBe(9_300);
  });

  it('of high-spin d6: one spin-allowed band, at 10Dq', () => {
    const iron = { metal: 'Fe', oxidationState: 2, ligands: { h2o: 6 }, tenDq: 10_400, B: 900, C: 4_050 };
    expect(energies(allowed(iron))).toEqual([10_400]);
  });

  it('of tetrahedral d7 include configuration interaction: 16 568 and not 6/5 Δ + 15 B = 16 260 cm-1', () => {
    const cobalt = {
      metal: 'Co',
      oxidationState: 2,
      ligands: { cl: 4 },
      geometry: 'tetrahedral',
      tenDq: 4_175,
      B: 750,
      C: 3_375,
    } as const;
    expect(energies(allowed(cobalt))).toEqual([4_175, 7_207, 16_568]);
  });

  it('start from the spin state the complex is taken in, where that is not the lowest level', () => {
    const manganese = {
      metal: 'Mn',
      oxidationState: 3,
      ligands: { h2o: 6 },
      tenDq: 21_000,
      B: 748,
      C: 3_500,
    };
    const [first] = allowed({ ...manganese, groundMultiplicity: 5 });
    expect([first!.label, Math.round(first!.energy_cm1)]).toEqual(['5T2g', 21_000]);
  });

  it('are the same in every unit: 17 400 cm-1 is 574.7 nm, 2.157 eV and 208.2 kJ/mol', () => {
    const [first] = allowed(chromiumAqua);
    expect(first!.wavelength_nm).toBeCloseTo(574.7, 1);
    expect(fromWavenumber(first!.energy_cm1, 'eV')).toBeCloseTo(2.157, 3);
    expect(toWavenumber(first!.wavelength_nm, 'nm')).toBeCloseTo(17_400, 6);
  });
});

describe('certainty of bands', () => {
  const input = statedInput(chromiumAqua);
  const doubtful = (value: number, cause: string, sigma: number) =>
    estimate(value, [{ cause, sigma }], 'published-factors', []);

  it('follows 10Dq, B and C through the slopes of each level', () => {
    const { bands } = predictBands({
      ...input,
      tenDq: doubtful(17_400, 'g', 1_000),
      racahB: doubtful(725, 'k', 60),
      racahC: doubtful(2_900, 'C0', 200),
    });
    const sigma = (label: string): number => bands.find((band) => band.label === label)!.sigma_cm1;
    expect(sigma('4T2g')).toBeCloseTo(1_000, 6);
    // 2E lies near 9B + 3C: doubts of B and C make it uncertain, 10Dq hardly.
    expect(sigma('2Eg')).toBeGreaterThan(700);
    expect(sigma('2Eg')).toBeLessThan(1_000);
  });

  it('knows that one cause moves 10Dq and B together', () => {
    const slope = { tenDq: 1, B: 10, C: 0 };
    const sigmaOf = (other: string, sign: number): number =>
      propagatedSigma(
        slope,
        commonDoubts({
          tenDq: doubtful(17_400, 'distance', 500),
          racahB: doubtful(725, other, sign * 30),
          racahC: doubtful(2_900, 'none', 0),
        }),
      );
    expect(sigmaOf('distance', 1)).toBeCloseTo(800, 6);
    expect(sigmaOf('distance', -1)).toBeCloseTo(200, 6);
    expect(sigmaOf('another', 1)).toBeCloseTo(Math.hypot(500, 300), 6);
  });

  it('never falls below 400 cm-1', () => {
    for (const { sigma_cm1 } of predictBands(input).bands) {
      expect(sigma_cm1).toBeGreaterThanOrEqual(smallestSigma_cm1);
    }
  });
});

describe('widths', () => {
  const width = (label: string, complex: StatedComplex = chromiumAqua): number =>
    dd(complex).find((band) => band.label === label)!.width_cm1;

  it('follow the slope against 10Dq: 3 000 to 4 000 cm-1 for 4T2, a line of 50 to 300 for the spin flip 2E', () => {
    expect(width('4T2g')).toBeGreaterThan(3_000);
    expect(width('4T2g')).toBeLessThan(4_000);
    expect(width('2Eg')).toBeGreaterThan(50);
    expect(width('2Eg')).toBeLessThan(300);
    const slopes = dd(chromiumAqua).map(({ label, slopeTenDq }) => [label, slopeTenDq] as const);
    expect(slopes.find(([label]) => label === '4T2g')![1]).toBeCloseTo(1, 6);
    expect(Math.abs(slopes.find(([label]) => label === '2Eg')![1]!)).toBeLessThan(0.05);
  });

  it('shrink in the cold', () => {
    expect(width('4T2g', { ...chromiumAqua, temperature_K: 77 })).toBeLessThan(width('4T2g') * 0.85);
  });
});

describe('strengths', () => {
  const strongest = (complex: StatedComplex): number =>
    Math.max(...allowed(complex).map(({ molarAbsorptivity }) => molarAbsorptivity));

  // Classes of B. N. Figgis and M. A. Hitchman (2000) and A. B. P. Lever (1984), from memory.
  it('with an inversion centre lie between 1 and 30, about 13 in aqua chromium(III)', () => {
    const [first] = allowed(chromiumAqua);
    expect(first!.molarAbsorptivity).toBeGreaterThan(13 / 3);
    expect(first!.molarAbsorptivity).toBeLessThan(13 * 3);
    const [low, high] = first!.molarAbsorptivityRange;
    expect(low).toBeLessThan(13);
    expect(high).toBeGreaterThan(13);
    expect(strongest(nickelAqua)).toBeGreaterThan(1);
    expect(strongest(nickelAqua)).toBeLessThan(30);
  });

  it('in a tetrahedron are 50 to 1 000: the range holds the 600 of tetrachlorocobaltate(II)', () => {
    const cobalt = {
      metal: 'Co',
      oxidationState: 2,
      ligands: { cl: 4 },
      geometry: 'tetrahedral',
      tenDq: 3_200,
      B: 710,
      C: 3_200,
      zeta: 500,
    } as const;
    const third = allowed(cobalt).at(-1)!;
    expect(third.molarAbsorptivityRange[0]).toBeLessThan(600);
    expect(third.molarAbsorptivityRange[1]).toBeGreaterThan(600);
    // 4A2 -> 4T2 is forbidden to the electric dipole in T_d (A2 x T2 = T1).
    expect(allowed(cobalt)[0]!.molarAbsorptivity).toBeLessThan(third.molarAbsorptivity / 10);
  });

  it('of spin-forbidden bands are far below the allowed ones, under 1 in 3d aqua ions', () => {
    for (const complex of [chromiumAqua, nickelAqua]) {
      const forbidden = dd(complex).filter(({ kind }) => kind === 'spin-forbidden');
      expect(forbidden.length).toBeGreaterThan(0);
      for (const { molarAbsorptivity } of forbidden) {
        expect(molarAbsorptivity).toBeLessThan(1);
        expect(molarAbsorptivity).toBeLessThan(strongest(complex) / 3);
      }
    }
  });

  it('of spin-forbidden bands grow with the square of zeta and come from the neighbour, not from a constant', () => {
    const of = (zeta: number): number =>
      dd({ ...chromiumAqua, zeta }).find(({ label }) => label === '2Eg')!.molarAbsorptivity;
    expect(of(460) / of(230)).toBeGreaterThan(3);
    expect(of(460) / of(230)).toBeLessThan(5);
    const farther = dd({ ...chromiumAqua, tenDq: 22_000 }).find(({ label }) => label === '2Eg')!;
    expect(farther.molarAbsorptivity).toBeLessThan(of(230));
  });

  // Aqua manganese(II): 0.01 to 0.03 L/mol/cm, all bands spin-forbidden (usual textbook figure).
  it('of manganese(II) are hundredths: there is no spin-allowed band at all', () => {
    const bands = dd({
      metal: 'Mn',
      oxidationState: 2,
      ligands: { h2o: 6 },
      tenDq: 8_480,
      B: 790,
      C: 3_200,
      zeta: 300,
    });
    expect(bands.every(({ kind }) => kind === 'spin-forbidden')).toBe(true);
    const visible = bands.filter(({ energy_cm1 }) => energy_cm1 < 26_000);
    expect(visible.length).toBeGreaterThanOrEqual(4);
    for (const {
      molarAbsorptivityRange: [low, high],
    } of visible) {
      expect(low).toBeLessThan(0.03);
      expect(high).toBeGreaterThan(0.01);
    }
  });

  it('are never those of a tetrahedron for an octahedron: the same ion with the same donors absorbs tens of times more', () => {
    const cobalt = {
      metal: 'Co',
      oxidationState: 2,
      ligands: { cl: 6 },
      B: 750,
      C: 3_375,
      zeta: 500,
    } as const;
    const six = strongest({ ...cobalt, tenDq: 7_200 });
    const four = strongest({ ...cobalt, ligands: { cl: 4 }, geometry: 'tetrahedral', tenDq: 3_200 });
    expect(six).toBeLessThan(60);
    expect(four / six).toBeGreaterThan(5);
  });

  // The spin-orbit operator transforms as T1: 2A1 cannot mix with 4T2 (A1 x T2 has no T1), 2E can.
  it('of spin-forbidden bands obey the symmetry of spin-orbit coupling', () => {
    const of = (label: string): number =>
      dd(chromiumAqua).find((band) => band.label === label)!.molarAbsorptivity;
    expect(of('2A1g')).toBeLessThan(of('2Eg') / 2);
  });

  it('of a jump of two electrons are small', () => {
    const [first, , third] = allowed(chromiumAqua);
    expect(third!.electronsMoved).toBe(2);
    expect(third!.configuration).toBe('t2g1 eg2');
    expect(third!.molarAbsorptivity).toBeLessThan(first!.molarAbsorptivity);
  });

  it('with an inversion centre fall in the cold, without one they stay', () => {
    const cold = (complex: StatedComplex): number =>
      allowed({ ...complex, temperature_K: 77 })[0]!.molarAbsorptivity /
      allowed(complex)[0]!.molarAbsorptivity;
    expect(cold(chromiumAqua)).toBeLessThan(0.65);
    expect(cold({ ...chromiumAqua, ligands: { ox: 3 } })).toBeCloseTo(1, 1);
  });

  it('are greater in the cis than in the trans isomer', () => {
    const of = (isomer: string): number =>
      allowed({ ...chromiumAqua, ligands: { nh3: 4, cl: 2 }, isomer })[0]!.molarAbsorptivity;
    expect(of('cis')).toBeGreaterThan(of('trans'));
  });

  it('are stated as ranges with their rule, in no more than two figures', () => {
    for (const { molarAbsorptivity, molarAbsorptivityRange, intensityClass } of dd(chromiumAqua)) {
      expect(molarAbsorptivityRange[0]).toBeLessThan(molarAbsorptivity);
      expect(molarAbsorptivityRange[1]).toBeGreaterThan(molarAbsorptivity);
      expect(Number(molarAbsorptivity.toPrecision(2))).toBe(molarAbsorptivity);
      expect(intensityClass).toMatch(/^spin-(allowed|forbidden).*, [\d. ]+-[\d. ]+$/);
    }
  });
});

describe('splitting by unlike ligands', () => {
  const donor = (name: string, tenDq: number) => ({ name, tenDq });
  const [N, Cl] = [donor('NH3', 21_550), donor('Cl', 13_700)];

  // Wentworth and Piper 1965: trans (ΔA - ΔB)/2 = 3 925; cis a quarter of ΔA - ΔB the other way.
  it('puts the components of trans-[CrN4Cl2] at 17 625 (two) and 21 550 cm-1', () => {
    const mean = (4 * 21_550 + 2 * 13_700) / 6;
    const parts = axialComponents([Cl, Cl, N, N, N, N]);
    expect(parts.map(({ shift_cm1, count }) => [Math.round(mean + shift_cm1), count])).toEqual([
      [17_625, 2],
      [21_550, 1],
    ]);
  });

  it('splits the cis isomer half as far and the other way round', () => {
    // Vertices: +z, -z, +x, +y, -x, -y; the chlorides at +x and +y.
    const cis = axialComponents([N, N, Cl, Cl, N, N]);
    const trans = axialComponents([Cl, Cl, N, N, N, N]);
    const size = (parts: typeof cis): number => parts.at(-1)!.shift_cm1 - parts[0]!.shift_cm1;
    expect(size(cis) / size(trans)).toBeCloseTo(0.5, 10);
    expect(cis.map(({ count }) => count)).toEqual([1, 2]);
    expect(trans.map(({ count }) => count)).toEqual([2, 1]);
  });

  const donorStrengths = [
    { ligand: { id: 'nh3' }, tenDq: 21_550 },
    { ligand: { id: 'cl' }, tenDq: 13_700 },
  ];
  const trans = {
    ...chromiumAqua,
    ligands: { nh3: 4, cl: 2 },
    isomer: 'trans',
    tenDq: 18_933,
    B: 650,
    donorStrengths,
  };

  it('shows two bands for trans-[Cr(NH3)4Cl2]+, each half as uncertain as it is shifted, with a caveat', () => {
    const parts = allowed(trans).filter(({ component }) => component !== undefined);
    expect(energies(parts)).toEqual([17_625, 21_550]);
    expect(parts[1]!.component).toBe('in the plane of 4 NH3');
    expect(parts[1]!.sigma_cm1).toBeGreaterThan(0.5 * (21_550 - 18_933));
    expect(parts[0]!.reasons.join(' ')).toMatch(/not always predictable/);
    expect(predictBands(statedInput(trans)).leftOut.join(' ')).not.toMatch(/mean of its components/);
  });

  it('claims no splitting from the average alone, and says so', () => {
    const { donorStrengths: _none, ...average } = trans;
    const { bands, leftOut } = predictBands(statedInput(average));
    expect(bands.filter(({ component }) => component !== undefined)).toEqual([]);
    expect(leftOut.join(' ')).toMatch(/mean of its components/);
  });
});
