import { describe, expect, it } from 'vitest';
import { smallRotation } from './rotation';
import { sixJ } from './sixJ';
import { clebschGordan, threeJ } from './threeJ';

const range = (from: number, to: number): number[] =>
  Array.from({ length: to - from + 1 }, (_, i) => from + i);

describe('3j symbols', () => {
  it('have the values of Rotenberg, Bivins, Metropolis and Wooten (The 3-j and 6-j Symbols, 1959; recalled)', () => {
    expect(threeJ(2, 2, 2, 0, 0, 0)).toBeCloseTo(-Math.sqrt(2 / 35), 12);
    expect(threeJ(2, 4, 2, 0, 0, 0)).toBeCloseTo(Math.sqrt(2 / 35), 12);
    expect(threeJ(1, 1, 1, 1, -1, 0)).toBeCloseTo(1 / Math.sqrt(6), 12);
    expect(threeJ(0.5, 0.5, 1, 0.5, -0.5, 0)).toBeCloseTo(1 / Math.sqrt(6), 12);
    expect(threeJ(2, 2, 5, 0, 0, 0)).toBe(0);
    expect(threeJ(1, 1, 1, 0, 0, 0)).toBeCloseTo(0, 14);
  });

  it('are orthogonal: coupling two angular momenta is unitary', () => {
    for (const [j1, j2] of [
      [2, 1.5],
      [6, 0.5],
      [5, 2],
    ] as const) {
      const total = (2 * j1 + 1) * (2 * j2 + 1);
      const js = range(0, 2 * Math.min(j1, j2)).map((i) => Math.abs(j1 - j2) + i);
      const states = js.flatMap((j) => range(0, 2 * j).map((i) => [j, i - j] as const));
      expect(states).toHaveLength(total);
      for (const [j, m] of states)
        for (const [k, n] of states.filter(([, other]) => other === m)) {
          const product = range(0, 2 * j1)
            .map((i) => i - j1)
            .reduce(
              (sum, m1) =>
                sum + clebschGordan(j1, m1, j2, m - m1, j, m) * clebschGordan(j1, m1, j2, n - m1, k, n),
              0,
            );
          expect(product).toBeCloseTo(j === k ? 1 : 0, 11);
        }
    }
  });
});

describe('6j symbols', () => {
  it('have the values of Rotenberg et al. 1959 (recalled) and their closed form with a zero', () => {
    expect(sixJ(1, 1, 1, 1, 1, 1)).toBeCloseTo(1 / 6, 12);
    expect(sixJ(2, 2, 2, 2, 2, 2)).toBeCloseTo(-3 / 70, 12);
    expect(sixJ(0.5, 0.5, 1, 0.5, 0.5, 1)).toBeCloseTo(1 / 6, 12);
    for (const [a, b, c] of [
      [2, 3, 4],
      [1.5, 2, 2.5],
    ] as const) {
      const sign = (a + b + c) % 2 === 0 ? 1 : -1;
      expect(sixJ(a, b, c, 0, c, b)).toBeCloseTo(sign / Math.sqrt((2 * b + 1) * (2 * c + 1)), 12);
    }
  });

  it('are orthogonal (Edmonds, Angular Momentum in Quantum Mechanics, 1957, eq. 6.2.9)', () => {
    const [a, b, c, d] = [2, 2.5, 1.5, 3];
    const xs = range(0, 8).map((i) => i / 2);
    for (const p of xs)
      for (const q of xs) {
        const sum = range(0, 20)
          .map((i) => i / 2)
          .reduce(
            (total, x) => total + (2 * x + 1) * (2 * p + 1) * sixJ(a, b, x, c, d, p) * sixJ(a, b, x, c, d, q),
            0,
          );
        const allowed = sixJ(a, b, 3.5, c, d, p) !== 0 || sixJ(a, b, 2.5, c, d, p) !== 0;
        expect(sum).toBeCloseTo(p === q && allowed ? 1 : 0, 11);
      }
  });
});

describe('rotation matrices', () => {
  it('are those of spin 1/2 and 1 (Wigner 1959) and orthogonal for large J', () => {
    const beta = 0.83;
    expect(smallRotation(0.5, 0.5, 0.5, beta)).toBeCloseTo(Math.cos(beta / 2), 12);
    expect(smallRotation(0.5, 0.5, -0.5, beta)).toBeCloseTo(-Math.sin(beta / 2), 12);
    expect(smallRotation(1, 1, 0, beta)).toBeCloseTo(-Math.sin(beta) / Math.SQRT2, 12);
    for (const J of [6, 6.5]) {
      const ms = range(0, 2 * J).map((i) => i - J);
      for (const m of ms)
        for (const n of ms) {
          const sum = ms.reduce(
            (total, k) => total + smallRotation(J, m, k, beta) * smallRotation(J, n, k, beta),
            0,
          );
          expect(sum).toBeCloseTo(m === n ? 1 : 0, 10);
        }
    }
  });
});
