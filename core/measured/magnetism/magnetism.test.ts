import { describe, expect, it } from 'vitest';
import { studentT } from '../../numerics/leastSquaresLine';
import { seeded } from '../../testing/seeded';
import { balanceMoment, chiTFromMoment, concentrationAt, evansMoment, momentFromChi } from './moment';
import { familyTrend } from './family';
import { halfMolarMass, pascalSum } from './pascal';
import {
  cooperativeShare,
  fitVantHoff,
  highSpinShare,
  hysteresisThreshold,
  mixedMoment,
  shareFromMoments,
} from './vantHoff';

const reading = {
  shift_Hz: { value: 150, u: 1 },
  spectrometer_MHz: 400,
  concentration_mM: { value: 10, u: 0.1 },
  temperature_K: { value: 298.15, u: 0.5 },
  field: 'along' as const,
  diamagnetic_cm3_mol: 0,
};

describe("Evans's method", () => {
  // Arithmetic on chi = 3 df / (4 pi f c): 3 x 150 / (4 pi x 400e6 x 1e-5) = 8.952e-3 cm3/mol; 2.828 sqrt(chi T) = 4.62.
  it('150 Hz at 400 MHz, 10.0 mM, 298.15 K: chi 8.95e-3, moment 4.62, with the correction of -250e-6 4.68', () => {
    const plain = evansMoment(reading);
    expect(plain.chi_cm3_mol.value).toBeCloseTo(8.952e-3, 6);
    expect(plain.moment_BM.value).toBeCloseTo(4.62, 2);
    expect(evansMoment({ ...reading, diamagnetic_cm3_mol: -250e-6 }).moment_BM.value).toBeCloseTo(4.68, 2);
  });

  it('with the field across the tube the shift turns its sign and the moment is off by sqrt 2 if the factor is wrong', () => {
    const across = evansMoment({ ...reading, field: 'across', shift_Hz: { value: -150, u: null } });
    expect(across.moment_BM.value / evansMoment(reading).moment_BM.value).toBeCloseTo(Math.SQRT2, 10);
    expect(evansMoment({ ...reading, field: 'across' }).remarks.join()).toMatch(/check the magnet geometry/);
  });

  it('carries half the relative uncertainty of shift, concentration and temperature into the moment', () => {
    const { moment_BM } = evansMoment(reading);
    expect(moment_BM.u! / moment_BM.value).toBeCloseTo(0.5 * Math.hypot(1 / 150, 0.01, 0.5 / 298.15), 8);
  });

  it('takes the solvent that the solute displaces into account', () => {
    const solvent = { chi_cm3_g: -0.72e-6, molarMass_g_mol: 400 };
    expect(evansMoment({ ...reading, solvent }).chi_cm3_mol.value).toBeCloseTo(8.952e-3 - 0.288e-3, 6);
  });

  it('remarks on a positive diamagnetic susceptibility and refuses readings that are not positive', () => {
    expect(evansMoment({ ...reading, diamagnetic_cm3_mol: 250e-6 }).remarks.join()).toMatch(/check the sign/);
    expect(() => evansMoment({ ...reading, concentration_mM: { value: 0, u: null } })).toThrow(
      /concentration_mM/,
    );
  });

  it('needs the concentration at the temperature of the measurement', () => {
    expect(concentrationAt(10, 0.98, 1)).toBeCloseTo(9.8, 10);
  });
});

describe('moments', () => {
  it('follow from chi T with the factor 2.828 (3 k / N mu_B^2, CODATA 2018)', () => {
    expect(momentFromChi(1, 1)).toBeCloseTo(2.8279, 4);
    expect(chiTFromMoment(momentFromChi(0.01, 300))).toBeCloseTo(3, 10);
  });

  it('from a balance use the molar mass with counter-ions and solvate', () => {
    const result = balanceMoment({
      massSusceptibility_cm3_g: { value: 1.15e-5, u: null },
      molarMass_g_mol: 345.9,
      temperature_K: { value: 295, u: null },
      diamagnetic_cm3_mol: halfMolarMass(345.9),
    });
    expect(result.moment_BM.value).toBeCloseTo(Math.sqrt(7.9969 * (1.15e-5 * 345.9 + 172.95e-6) * 295), 3);
  });
});

describe('diamagnetic corrections', () => {
  // Course handout on diamagnetic corrections: pyridine 5 C -30.00, 5 H -14.65, ring N -4.61, ring C -1.20: -50.46e-6;
  // the table's own value for the ligand is -49e-6.
  it('of pyridine from ring increments is -50.46e-6, close to the listed -49e-6', () => {
    const sum = pascalSum({ 'C-ring': 5, H: 5, 'N-ring': 1 });
    expect(sum.chi_cm3_mol * 1e6).toBeCloseTo(-50.46, 6);
    expect(pascalSum({ py: 1 }).chi_cm3_mol * 1e6).toBeCloseTo(-49, 6);
  });

  it('warn where bonds of a ring would be counted twice, and name what the table lacks', () => {
    expect(pascalSum({ 'C-ring': 5, 'C=C': 3 }).remarks).toHaveLength(1);
    expect(pascalSum({ Xx: 1 }).unknown).toEqual(['Xx']);
  });
});

describe('spin equilibria', () => {
  // Arithmetic: dH 20 kJ/mol, T_half 250 K: x(300 K) = 0.833. Half of 5.2 and 0: 3.68. 2 R x 250 K = 4.16 kJ/mol.
  it('agree with hand-made numbers', () => {
    expect(highSpinShare(20_000, 250, 300)).toBeCloseTo(0.833, 3);
    expect(mixedMoment(0.5, 5.2, 0)).toBeCloseTo(3.68, 2);
    expect(shareFromMoments(3.677, 5.2, 0)).toBeCloseTo(0.5, 3);
    expect(hysteresisThreshold(250) / 1000).toBeCloseTo(4.16, 2);
  });

  it('without cooperativity are those of the cooperative model, and half of it is high spin at T_half', () => {
    expect(cooperativeShare(20_000, 250, 0, 300)).toBeCloseTo(highSpinShare(20_000, 250, 300), 8);
    expect(cooperativeShare(15_000, 200, 2500, 200)).toBeCloseTo(0.5, 6);
    const slope = (gamma: number) =>
      cooperativeShare(15_000, 200, gamma, 202) - cooperativeShare(15_000, 200, gamma, 198);
    expect(slope(2500)).toBeGreaterThan(1.5 * slope(0));
  });

  it('are recovered from a noisy curve within three standard errors', () => {
    const random = seeded(11);
    const points = Array.from({ length: 31 }, (_, i) => {
      const temperature_K = 100 + 10 * i;
      const x = highSpinShare(18_000, 240, temperature_K);
      return { temperature_K, chiT: 3.4 * x + 0.1 * (1 - x) + 0.01 * random.normal() };
    });
    const fit = fitVantHoff(points);
    expect(fit.status).toBe('converged');
    expect(Math.abs(fit.half_K.value - 240)).toBeLessThan(3 * fit.half_K.se!);
    expect(Math.abs(fit.enthalpy_kJ_mol.value - 18)).toBeLessThan(3 * fit.enthalpy_kJ_mol.se!);
    expect(fit.entropy_J_molK.value).toBeCloseTo((fit.enthalpy_kJ_mol.value * 1000) / fit.half_K.value, 8);
    expect(fit.rSquared).toBeGreaterThan(0.99);
    expect(fit.remarks).toEqual([]);
  });

  it('say when a plateau is not reached', () => {
    const points = Array.from({ length: 12 }, (_, i) => {
      const temperature_K = 200 + 5 * i;
      const x = highSpinShare(18_000, 300, temperature_K);
      return { temperature_K, chiT: 3.4 * x };
    });
    expect(fitVantHoff(points, { chiTLow: 0 }).remarks.join()).toMatch(/high-spin plateau is not reached/);
    expect(() => fitVantHoff(points.slice(0, 3))).toThrow(/cannot determine/);
  });
});

describe('a family of compounds', () => {
  // Transition temperatures of [Fe(X-pybox)2](ClO4)2, X = Cl, Ph, SCH3: 310, 230, 330 K; OCH3 stays high-spin (Inorganics
  // 2017, 5, 52, abstract). Three finite temperatures are no trend. Substituent constants from memory of Hammett tables.
  it('with three finite transition temperatures gets no line', () => {
    const trend = familyTrend([
      { name: 'Cl', sigma: 0.23, half_K: 310 },
      { name: 'Ph', sigma: -0.01, half_K: 230 },
      { name: 'SCH3', sigma: 0, half_K: 330 },
      { name: 'OCH3', sigma: -0.27, half_K: null },
    ]);
    expect(trend).toMatchObject({ ok: false, problems: [{ field: 'members' }] });
  });

  it('with four gets one, with an interval for a new member that is wider than the scatter', () => {
    const trend = familyTrend(
      [0, 1, 2, 3].map((i) => ({ name: `R${i}`, sigma: i / 10, half_K: 200 + 20 * i + (i % 2) * 4 })),
    );
    if (!trend.ok) throw new Error('refused');
    expect(trend.value.line.predict(0.4, 0.95).half).toBeGreaterThan(trend.value.line.residual_sd * 4);
  });

  it("uses Student's t as tables have it: 12.706, 4.303, 2.228, 1.960 for 95 % (Fisher and Yates)", () => {
    for (const [nu, t] of [
      [1, 12.706],
      [2, 4.303],
      [10, 2.228],
      [1e6, 1.96],
    ] as const)
      expect(studentT(0.95, nu)).toBeCloseTo(t, 3);
  });
});
