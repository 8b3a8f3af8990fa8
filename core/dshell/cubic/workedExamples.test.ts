import { describe, expect, it } from 'vitest';
import { type CubicGeometry } from '../types';
import { cubicLevels } from './cubicLevels';
import { groundCrossovers } from './groundCrossovers';

const solve = (
  dElectrons: number,
  tenDq: number,
  B: number,
  C: number,
  geometry: CubicGeometry = 'octahedral',
) => {
  const levels = cubicLevels({ dElectrons, geometry, tenDq, B, C });
  const of = (label: string): number[] =>
    levels.filter((level) => level.label === label).map(({ energy }) => energy);
  const allowed = levels
    .slice(1)
    .filter(({ multiplicity }) => multiplicity === levels[0]!.multiplicity)
    .map(({ energy }) => energy);
  return { levels, of, allowed };
};

/**
 * Parameter sets of complexes as textbooks work them (A. B. P. Lever, Inorganic Electronic Spectroscopy, 2nd ed. 1984;
 * B. N. Figgis and M. A. Hitchman, Ligand Field Theory and its Applications, 2000). The levels beside them were computed with
 * another program from the same parameters, to the wavenumber.
 */
describe('worked examples', () => {
  it('chromium(III), 17 400/725/2 900: 4T2 17 400, 4T1 24 574 and 38 501, 2E 14 011, 2T1 14 676', () => {
    const { of } = solve(3, 17_400, 725, 2900);
    expect(of('4T2g')[0]).toBeCloseTo(17_400, 6);
    expect(Math.abs(of('4T1g')[0]! - 24_574)).toBeLessThan(0.6);
    expect(Math.abs(of('4T1g')[1]! - 38_501)).toBeLessThan(0.6);
    expect(Math.abs(of('2Eg')[0]! - 14_011)).toBeLessThan(0.6);
    expect(Math.abs(of('2T1g')[0]! - 14_676)).toBeLessThan(0.6);
  });

  it('nickel(II), 8 500/940/3 760: 8 500, 14 160, 25 440, 1E 14 467; measured about 8 500, 13 800, 25 300 (Lever 1984)', () => {
    const { allowed, of } = solve(8, 8500, 940, 3760);
    [8500, 14_160, 25_440].forEach((band, i) => expect(Math.abs(allowed[i]! - band)).toBeLessThan(0.6));
    expect(Math.abs(of('1Eg')[0]! - 14_467)).toBeLessThan(0.6);
    [8500, 13_800, 25_300].forEach((band, i) =>
      expect(Math.abs(allowed[i]! - band) / band).toBeLessThan(0.03),
    );
  });

  it('low-spin d6, 23 000/600/2 700: 1T1 21 167, 1T2 29 311', () => {
    const { levels, of } = solve(6, 23_000, 600, 2700);
    expect(levels[0]!.label).toBe('1A1g');
    expect(Math.abs(of('1T1g')[0]! - 21_167)).toBeLessThan(0.6);
    expect(Math.abs(of('1T2g')[0]! - 29_311)).toBeLessThan(0.6);
  });

  it('high-spin d6, 10 400/900/4 050: one quintet band, at 10Dq', () => {
    const { allowed } = solve(6, 10_400, 900, 4050);
    expect(allowed).toHaveLength(1);
    expect(allowed[0]).toBeCloseTo(10_400, 6);
  });

  it('high-spin d7, 9 300/850/3 825: 8 166, 17 466, 19 782, and 10Dq is a difference, not the first band', () => {
    const { allowed } = solve(7, 9300, 850, 3825);
    [8166, 17_466, 19_782].forEach((band, i) => expect(Math.abs(allowed[i]! - band)).toBeLessThan(0.6));
    expect(allowed[1]! - allowed[0]!).toBeCloseTo(9300, 6);
  });

  it('tetrahedral cobalt(II), 4 175/750, C/B 4.5: 4 175, 7 207, 16 568, where neglect of configuration interaction gives 16 260', () => {
    const { allowed } = solve(7, 4175, 750, 3375, 'tetrahedral');
    [4175, 7207, 16_568].forEach((band, i) => expect(Math.abs(allowed[i]! - band)).toBeLessThan(0.6));
    expect(Math.abs(1.2 * 4175 + 15 * 750 - 16_260)).toBeLessThan(1);
  });

  it('the spin-flip level of d3 near 9B + 3C − 50B²/10Dq: 650/3 120/18 200 gives 14 223, the formula 14 049', () => {
    const { of } = solve(3, 18_200, 650, 3120);
    expect(Math.abs(of('2Eg')[0]! - 14_223)).toBeLessThan(0.6);
    const formula = 9 * 650 + 3 * 3120 - (50 * 650 ** 2) / 18_200;
    expect(Math.abs(formula - 14_049)).toBeLessThan(1);
    expect(Math.abs(of('2Eg')[0]! - formula)).toBeLessThan(200);
  });

  it('ruby parameters, 18 300/732, C/B 4.25 give 2E 14 728, near the R lines at about 14 400 (Sugano, Tanabe and Kamimura 1970)', () => {
    const { of } = solve(3, 18_300, 732, 4.25 * 732);
    expect(Math.abs(of('2Eg')[0]! - 14_728)).toBeLessThan(0.6);
    expect(Math.abs(of('2Eg')[0]! - 14_400) / 14_400).toBeLessThan(0.03);
  });

  it('d3 bands give B back through the closed form B = (2ν₁² + ν₂² − 3ν₁ν₂)/(15ν₂ − 27ν₁)', () => {
    const { allowed } = solve(3, 17_400, 725, 2900);
    const [a, b] = [allowed[0]!, allowed[1]!];
    expect((2 * a * a + b * b - 3 * a * b) / (15 * b - 27 * a)).toBeCloseTo(725, 6);
  });

  it('d8 bands give B back through the sum rule B = (ν₂ + ν₃ − 3ν₁)/15', () => {
    const { allowed } = solve(8, 8500, 940, 3760);
    expect((allowed[1]! + allowed[2]! - 3 * allowed[0]!) / 15).toBeCloseTo(940, 6);
  });

  it('vanadium(III) with 19 100 and B 620 has bands at 17 789 and 25 777; measured 17 800, 25 700 (Figgis and Hitchman 2000)', () => {
    const { allowed } = solve(2, 19_100, 620, 4.5 * 620);
    expect(Math.abs(allowed[0]! - 17_789)).toBeLessThan(1);
    expect(Math.abs(allowed[1]! - 25_777)).toBeLessThan(1);
    [17_800, 25_700].forEach((band, i) => expect(Math.abs(allowed[i]! - band) / band).toBeLessThan(0.01));
  });
});

describe('critical 10Dq/B of the ground-level change', () => {
  it.each([
    // Another program, three digits; at C/B near 4.5 the kinks of the diagrams of Tanabe and Sugano 1954.
    [4, [24.4, 26.8, 29.3]],
    [5, [26.0, 28.4, 30.9]],
    [6, [17.0, 18.9, 20.8]],
    [7, [19.4, 21.2, 23.0]],
  ])('of d%i at C/B = 4.0, 4.5, 5.0', (n, expected) => {
    [4, 4.5, 5].forEach((ratio, i) => {
      const [crossover] = groundCrossovers(n, ratio);
      expect(Math.abs(crossover!.tenDqOverB - expected[i]!)).toBeLessThan(0.06);
    });
  });
});
