import { describe, expect, it } from 'vitest';
import { type LevelProblem } from '../problem';
import { levels } from './levels';

const free = (dElectrons: number, B: number, zeta: number): LevelProblem => ({
  ...{ dElectrons, B, C: 4.5 * B, zeta },
  field: { type: 'oct', tenDq: 0 },
});

const sets = (problem: LevelProblem) =>
  levels(problem, { labelGroup: null, tolerance: 1e-7 }).levels.map(({ energy, degeneracy }) => ({
    energy,
    degeneracy,
  }));

describe('Lande intervals of the free ion: E(J) − E(J − 1) = λJ, λ = ±ζ/2S (Condon and Shortley 1935)', () => {
  it.each([
    // Ground term, signs by Hund's third rule.
    [2, [2, 3, 4], 1 / 2],
    [3, [1.5, 2.5, 3.5, 4.5], 1 / 3],
    [4, [0, 1, 2, 3, 4], 1 / 4],
    [6, [4, 3, 2, 1, 0], -1 / 4],
    [7, [4.5, 3.5, 2.5, 1.5], -1 / 3],
    [8, [4, 3, 2], -1 / 2],
  ])('d%i', (n, js, perZeta) => {
    // Coupling so weak that second order is 1e-5 of first.
    const zeta = 1;
    const found = sets(free(n, 2000, zeta)).slice(0, js.length);
    expect(found.map(({ degeneracy }) => degeneracy)).toEqual(js.map((J) => 2 * J + 1));
    const lambda = perZeta * zeta;
    const bare = js.map((J) => (lambda / 2) * J * (J + 1));
    found.forEach(({ energy }, i) => expect(energy).toBeCloseTo(bare[i]! - bare[0]!, 2));
  });
});

describe('one electron or hole in an octahedron (J. S. Griffith, The Theory of Transition-Metal Ions, 1961, section 9.4)', () => {
  it('t2 splits by 3ζ/2 into a quartet below a doublet where the field is strong', () => {
    const [quartet, doublet] = sets({
      dElectrons: 1,
      B: 0,
      C: 0,
      zeta: 100,
      field: { type: 'oct', tenDq: 1e8 },
    });
    expect(quartet!.degeneracy).toBe(4);
    expect(doublet).toMatchObject({ degeneracy: 2 });
    expect(doublet!.energy).toBeCloseTo(150, 2);
  });

  it('has the roots of [[−4Dq − ζ/2, √(3/2) ζ], [√(3/2) ζ, 6Dq]] and −4Dq + ζ at any strength', () => {
    const [tenDq, zeta] = [12_000, 1500];
    const [a, b, c] = [-0.4 * tenDq - zeta / 2, 0.6 * tenDq, Math.sqrt(1.5) * zeta];
    const reach = Math.sqrt(((a - b) / 2) ** 2 + c * c);
    const wanted = [(a + b) / 2 - reach, -0.4 * tenDq + zeta, (a + b) / 2 + reach];
    const found = levels({ dElectrons: 1, B: 0, C: 0, zeta, field: { type: 'oct', tenDq } });
    expect(found.levels.map(({ label }) => label)).toEqual(['G8', 'G7', 'G8']);
    found.levels.forEach(({ energy }, i) => expect(energy + found.groundAbsolute).toBeCloseTo(wanted[i]!, 8));
  });

  it('the hole of d9 splits with the order reversed', () => {
    const found = levels({ dElectrons: 9, B: 0, C: 0, zeta: 100, field: { type: 'oct', tenDq: 1e8 } }).levels;
    const [first, second] = found.slice(1);
    expect(first!.label).toBe('G7');
    expect(second!.energy - first!.energy).toBeCloseTo(150, 2);
  });
});

describe('orbital triplets as if l = 1 (A. Abragam and M. H. L. Pryce, Proc. R. Soc. A 206, 173, 1951; Griffith 1961)', () => {
  // Weak coupling in a strong hierarchy, so that each formula is nearly exact.
  it('5T2 of d6: J = 1, 2, 3 at 3λ, λ, −2λ with λ = −ζ/4', () => {
    const found = sets({ dElectrons: 6, B: 1e5, C: 4.5e5, zeta: 1, field: { type: 'oct', tenDq: 1e4 } });
    const energy = (states: number): number => {
      let seen = 0;
      return found.find(({ degeneracy }) => (seen += degeneracy) >= states)!.energy;
    };
    expect(energy(3)).toBeCloseTo(0, 3);
    expect(energy(3 + 5)).toBeCloseTo(0.5, 3);
    expect(energy(3 + 5 + 7)).toBeCloseTo(1.25, 3);
  });

  it('4T1 of d7 in a weak field: intervals of 3/2 and 5/2 times (3/2)(ζ/3)', () => {
    const found = sets({ dElectrons: 7, B: 1e6, C: 4.5e6, zeta: 1, field: { type: 'oct', tenDq: 1e4 } });
    const at = (states: number): number => {
      let seen = 0;
      return found.find(({ degeneracy }) => (seen += degeneracy) >= states)!.energy;
    };
    expect(at(2)).toBeCloseTo(0, 3);
    expect(at(2 + 4)).toBeCloseTo(0.75, 2);
    expect(at(2 + 4 + 6)).toBeCloseTo(2, 2);
  });

  it('3T1 of t2g2 and 2T2 of t2g5 in a strong field: λ = ζ/2 with J = 2 lowest; doublet below quartet by 3ζ/2', () => {
    const two = sets({ dElectrons: 2, B: 2e3, C: 9e3, zeta: 1, field: { type: 'oct', tenDq: 1e8 } });
    const states = two.flatMap(({ energy, degeneracy }) => new Array<number>(degeneracy).fill(energy));
    // −(λ/2)[J(J + 1) − 4] with λ = ζ/2 and l = −1: J = 2 at −λ, J = 1 at +λ, J = 0 at +2λ.
    [0, 0, 0, 0, 0, 1, 1, 1, 1.5].forEach((energy, i) => expect(states[i]).toBeCloseTo(energy, 3));
    const five = sets({ dElectrons: 5, B: 2e3, C: 9e3, zeta: 1, field: { type: 'oct', tenDq: 1e8 } });
    expect(five[0]!.degeneracy).toBe(2);
    expect(five[1]!.degeneracy).toBe(4);
    expect(five[1]!.energy).toBeCloseTo(1.5, 3);
  });
});

describe('the reduction of spin-orbit coupling', () => {
  it('multiplies ζ only when it is asked for', () => {
    const base: LevelProblem = {
      dElectrons: 3,
      B: 700,
      C: 3000,
      zeta: 300,
      field: { type: 'oct', tenDq: 17_000 },
    };
    const reduced = levels({ ...base, spinOrbitReduction: 0.8 }).levels;
    levels({ ...base, zeta: 240 }).levels.forEach(({ energy }, i) =>
      expect(reduced[i]!.energy).toBeCloseTo(energy, 8),
    );
  });
});

describe('the Zeeman effect', () => {
  it('splits the ground quartet of d3 without coupling by g_e μ_B B (0.46686 cm-1 per tesla, CODATA 2018)', () => {
    const found = levels({
      ...{ dElectrons: 3, B: 700, C: 3000, field: { type: 'oct', tenDq: 17_000 } },
      zeeman: { B_T: [0, 3, 4] },
    }).levels.slice(0, 4);
    found.forEach(({ energy, degeneracy }, i) => {
      expect(degeneracy).toBe(1);
      expect(energy).toBeCloseTo(i * 2.0023 * 0.46686447783 * 5, 7);
    });
  });

  it('of the free 3F2 follows Lande’s g = 2/3 for g_e = 2', () => {
    const found = levels({ ...free(2, 2000, 200), zeeman: { B_T: [0.1, 0, 0], ge: 2 } }).levels.slice(0, 5);
    found.forEach(({ energy }, i) => expect(energy).toBeCloseTo((i * 2 * 0.046686447783) / 3, 4));
  });
});
