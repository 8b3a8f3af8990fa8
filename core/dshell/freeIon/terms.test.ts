import { describe, expect, it } from 'vitest';
import { symmetricEigenvalues } from '../../numerics/eigen/symmetric';
import { freeIon } from './reducedElements';

const letters = 'SPDFGHIKLMN';

/** Energies of all terms, by name, ascending within a name. */
function termEnergies(electrons: number, B: number, C: number): Record<string, number[]> {
  const { terms, repulsionB, repulsionC } = freeIon(electrons);
  const found: Record<string, number[]> = {};
  const names = terms.map(({ S, L }) => `${2 * S + 1}${letters[L]}`);
  for (const name of new Set(names)) {
    const members = names.flatMap((each, i) => (each === name ? [i] : []));
    const matrix = members.flatMap((i) =>
      members.map((j) => B * repulsionB[i * terms.length + j]! + C * repulsionC[i * terms.length + j]!),
    );
    found[name] = Array.from(symmetricEigenvalues(matrix, members.length));
  }
  return found;
}

type Formula = (B: number, C: number) => number | readonly [centre: number, reach: number];
const root = Math.sqrt;

/**
 * Racah, Phys. Rev. 62, 438 (1942), and Condon and Shortley, The Theory of Atomic Spectra (1935), chapter 5, with A left out; a
 * pair [centre, reach] stands for the two roots centre ± reach of a repeated term. Recalled, not looked up.
 */
const published: Record<number, Record<string, Formula | Formula[]>> = {
  2: {
    '3F': (B) => -8 * B,
    '3P': (B) => 7 * B,
    '1G': (B, C) => 4 * B + 2 * C,
    '1D': (B, C) => -3 * B + 2 * C,
    '1S': (B, C) => 14 * B + 7 * C,
  },
  3: {
    '4F': (B) => -15 * B,
    '4P': () => 0,
    '2H': (B, C) => -6 * B + 3 * C,
    '2P': (B, C) => -6 * B + 3 * C,
    '2G': (B, C) => -11 * B + 3 * C,
    '2F': (B, C) => 9 * B + 3 * C,
    '2D': (B, C) => [5 * B + 5 * C, root(193 * B * B + 8 * B * C + 4 * C * C)],
  },
  4: {
    '5D': (B) => -21 * B,
    '3H': (B, C) => -17 * B + 4 * C,
    '3G': (B, C) => -12 * B + 4 * C,
    '3F': (B, C) => [-5 * B + 5.5 * C, 1.5 * root(68 * B * B + 4 * B * C + C * C)],
    '3D': (B, C) => -5 * B + 4 * C,
    '3P': (B, C) => [-5 * B + 5.5 * C, 0.5 * root(912 * B * B - 24 * B * C + 9 * C * C)],
    '1I': (B, C) => -15 * B + 6 * C,
    '1G': (B, C) => [-5 * B + 7.5 * C, 0.5 * root(708 * B * B - 12 * B * C + 9 * C * C)],
    '1F': (_, C) => 6 * C,
    '1D': (B, C) => [9 * B + 7.5 * C, 1.5 * root(144 * B * B + 8 * B * C + C * C)],
    '1S': (B, C) => [10 * B + 10 * C, 2 * root(193 * B * B + 8 * B * C + 4 * C * C)],
  },
  5: {
    '6S': (B) => -35 * B,
    '4G': (B, C) => -25 * B + 5 * C,
    '4F': (B, C) => -13 * B + 7 * C,
    '4D': (B, C) => -18 * B + 5 * C,
    '4P': (B, C) => -28 * B + 7 * C,
    '2I': (B, C) => -24 * B + 8 * C,
    '2H': (B, C) => -22 * B + 10 * C,
    '2G': [(B, C) => -13 * B + 8 * C, (B, C) => 3 * B + 10 * C],
    '2F': [(B, C) => -9 * B + 8 * C, (B, C) => -25 * B + 10 * C],
    '2D': [(B, C) => -4 * B + 10 * C, (B, C) => [-3 * B + 11 * C, 3 * root(57 * B * B + 2 * B * C + C * C)]],
    '2P': (B, C) => 20 * B + 10 * C,
    '2S': (B, C) => -3 * B + 8 * C,
  },
};

const numbers = (formulas: Formula | Formula[], B: number, C: number): number[] =>
  [formulas]
    .flat()
    .flatMap((formula) => {
      const value = formula(B, C);
      return typeof value === 'number' ? [value] : [value[0] - value[1], value[0] + value[1]];
    })
    .sort((a, b) => a - b);

describe('free-ion terms of d^N have the energies of Racah, Condon and Shortley', () => {
  it.each([2, 3, 4, 5])('d%i, and the same for as many holes up to a common shift', (n) => {
    for (const [B, C] of [
      [766, 3655],
      [1041, 4831],
      [500, 900],
    ] as const) {
      const mine = termEnergies(n, B, C);
      const names = Object.keys(published[n]!);
      expect(Object.keys(mine).sort()).toEqual([...names].sort());
      for (const name of names) {
        numbers(published[n]![name]!, B, C).forEach((energy, i) =>
          expect(mine[name]![i], `${name} of d${n}`).toBeCloseTo(energy, 6),
        );
      }
      const holes = termEnergies(10 - n, B, C);
      const shift = holes[names[0]!]![0]! - mine[names[0]!]![0]!;
      for (const name of names)
        mine[name]!.forEach((energy, i) => expect(holes[name]![i]).toBeCloseTo(energy + shift, 6));
    }
  });

  it('has the terms of d^N with Racah’s seniority, adding up to C(10, N) states', () => {
    const list = (n: number): string[] =>
      freeIon(n).terms.map(({ S, L, seniority }) => `${2 * S + 1}${letters[L]}${seniority}`);
    // G. Racah, Phys. Rev. 63, 367 (1943), table of d^N.
    expect(list(3).sort()).toEqual(['2D1', '2D3', '2F3', '2G3', '2H3', '2P3', '4F3', '4P3']);
    expect(
      list(5)
        .filter((name) => name.startsWith('2D'))
        .sort(),
    ).toEqual(['2D1', '2D3', '2D5']);
    [10, 45, 120, 210, 252, 210, 120, 45, 10].forEach((states, i) => {
      const count = freeIon(i + 1).terms.reduce((sum, { S, L }) => sum + (2 * S + 1) * (2 * L + 1), 0);
      expect(count).toBe(states);
    });
  });
});
