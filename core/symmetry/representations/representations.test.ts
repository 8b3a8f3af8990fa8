import { describe, expect, it } from 'vitest';
import { irrepNamed, pointGroup } from '../pointGroup';
import { compose, inverseRotation, rotationAbout, rotationToFrame, type Vector3 } from '../rotation';
import { directProduct, reduce, writeSum } from './character';
import { descend } from './branching';
import { angularMomentumRepresentation, dRotation, spinRotation } from './orbitals';
import { antisymmetrisedPower, symmetrisedPower } from './powers';

const Oh = pointGroup('Oh');
const O = pointGroup('O');
const trigonal = rotationToFrame(
  [1 / Math.SQRT2, -1 / Math.SQRT2, 0],
  [1 / Math.sqrt(6), 1 / Math.sqrt(6), -2 / Math.sqrt(6)],
  [1 / Math.sqrt(3), 1 / Math.sqrt(3), 1 / Math.sqrt(3)],
);

describe('direct products', () => {
  it('agree with the table of O (Cotton 1990, appendix; Griffith 1961, table A 13; from memory)', () => {
    const rows: [string, string, string][] = [
      ['A2', 'T1', 'T2'],
      ['E', 'E', 'A1 + A2 + E'],
      ['E', 'T1', 'T1 + T2'],
      ['T1', 'T1', 'A1 + E + T1 + T2'],
      ['T1', 'T2', 'A2 + E + T1 + T2'],
      ['T2', 'T2', 'A1 + E + T1 + T2'],
      ['E1/2', 'E1/2', 'A1 + T1'],
      ['E1/2', 'E5/2', 'A2 + T2'],
      ['E', 'E1/2', 'F3/2'],
      ['T2', 'E1/2', 'E5/2 + F3/2'],
      ['T1', 'F3/2', 'E1/2 + E5/2 + 2F3/2'],
      ['F3/2', 'F3/2', 'A1 + A2 + E + 2T1 + 2T2'],
    ];
    for (const [a, b, sum] of rows) expect(writeSum(directProduct(O, a, b)), `${a} x ${b}`).toBe(sum);
  });

  it('give t2g x eg = T1g + T2g', () => {
    expect(writeSum(directProduct(Oh, 'T2g', 'Eg'))).toBe('T1g + T2g');
  });
});

describe('powers of a representation', () => {
  it('split the squares as Tisza and Cotton print them: [T2²] = A1 + E + T2, {T2²} = T1, {E²} = A2', () => {
    const of = (power: typeof symmetrisedPower, irrep: string, k: number): string =>
      writeSum(reduce(O, power(O, irrepNamed(O, irrep).characters, k)));
    expect(of(symmetrisedPower, 'T2', 2)).toBe('A1 + E + T2');
    expect(of(antisymmetrisedPower, 'T2', 2)).toBe('T1');
    expect(of(antisymmetrisedPower, 'T2', 3)).toBe('A2');
    expect(of(antisymmetrisedPower, 'E', 2)).toBe('A2');
    expect(of(symmetrisedPower, 'E', 3)).toBe('A1 + A2 + E');
  });
});

describe('descent in symmetry', () => {
  const rows = (subgroup: string, pairs: Record<string, string>, frame?: typeof trigonal): void => {
    for (const [irrep, sum] of Object.entries(pairs)) {
      expect(writeSum(descend(Oh, irrep, pointGroup(subgroup), frame)), `Oh ${irrep} in ${subgroup}`).toBe(
        sum,
      );
    }
  };

  it('agrees with the correlation table of O_h (Wilson, Decius and Cross 1955, table X-14; Cotton; from memory)', () => {
    rows('Td', { A2g: 'A2', T1g: 'T1', T2g: 'T2', T1u: 'T2' });
    rows('D4h', { A2g: 'B1g', Eg: 'A1g + B1g', T1g: 'A2g + Eg', T2g: 'B2g + Eg', T1u: 'A2u + Eu' });
    rows('C4v', { Eg: 'A1 + B1', T1g: 'A2 + E', T2g: 'B2 + E', T1u: 'A1 + E' });
    rows('D3d', { A2g: 'A2g', Eg: 'Eg', T1g: 'A2g + Eg', T2g: 'A1g + Eg' }, trigonal);
    rows('D2h', { Eg: '2Ag', T1g: 'B1g + B2g + B3g', T2g: 'B1g + B2g + B3g' });
    rows('Ci', { T2g: '3Ag', T1u: '3Au' });
  });

  it("agrees for double groups (Griffith 1961; Altmann and Herzig 1994; from memory): U' is E' + E'' in D4", () => {
    rows('D4h', { 'F3/2g': 'E1/2g + E3/2g', 'E5/2g': 'E3/2g' });
    rows('D3d', { 'F3/2g': 'E1/2g + E3/2g', 'E1/2g': 'E1/2g', 'E5/2g': 'E1/2g' }, trigonal);
  });

  it('refuses a subgroup whose operations are not there', () => {
    expect(() => descend(Oh, 'Eg', pointGroup('D3d'))).toThrow(/not within/);
  });
});

describe('angular momentum in a cubic field', () => {
  it('splits as Bethe found (Ann. Phys. 395, 133, 1929, from memory)', () => {
    const split = (twiceJ: number): string =>
      writeSum(reduce(O, angularMomentumRepresentation(O, twiceJ), twiceJ % 2 === 1));
    expect([0, 2, 4, 6, 8, 10, 12].map(split)).toEqual([
      'A1',
      'T1',
      'E + T2',
      'A2 + T1 + T2',
      'A1 + E + T1 + T2',
      'E + 2T1 + T2',
      'A1 + A2 + E + T1 + 2T2',
    ]);
    expect([1, 3, 5, 7, 9].map(split)).toEqual([
      'E1/2',
      'F3/2',
      'E5/2 + F3/2',
      'E1/2 + E5/2 + F3/2',
      'E1/2 + 2F3/2',
    ]);
  });
});

describe('rotations of orbitals and spins', () => {
  const axis: Vector3 = [0.3, -1.1, 0.7];
  const a = rotationAbout(axis, 1.234);
  const b = rotationAbout([1, 0.2, -0.4], -2.1);
  const times = (m: number[][], n: number[][]): number[][] =>
    m.map((row) => n[0]!.map((_, j) => row.reduce((sum, value, k) => sum + value * n[k]![j]!, 0)));

  it('represent the product of rotations by the product of matrices', () => {
    const together = dRotation(compose(a, b));
    times(dRotation(a), dRotation(b)).forEach((row, i) =>
      row.forEach((value, j) => expect(value).toBeCloseTo(together[i]![j]!, 12)),
    );
    const identity = times(dRotation(a), dRotation(inverseRotation(a)));
    identity.forEach((row, i) => row.forEach((value, j) => expect(value).toBeCloseTo(i === j ? 1 : 0, 12)));
  });

  it('have the trace sin(5θ/2)/sin(θ/2) of L = 2, and 2cos(θ/2) of a spin', () => {
    const d = dRotation(a);
    const trace = d.reduce((sum, row, i) => sum + row[i]!, 0);
    expect(trace).toBeCloseTo(Math.sin((5 * 1.234) / 2) / Math.sin(1.234 / 2), 12);
    const spin = spinRotation(a);
    expect(spin[0]![0]![0] + spin[1]![1]![0]).toBeCloseTo(2 * Math.cos(0.617), 12);
  });

  it('turn dxz into dyz, dz2 into dx2 under the obvious quarter and third turns', () => {
    const quarter = dRotation(rotationAbout([0, 0, 1], Math.PI / 2));
    expect(quarter[4]![3]).toBeCloseTo(1, 12);
    expect(quarter[1]![1]).toBeCloseTo(-1, 12);
    // z → x: dx2 = −½ dz2 + (√3/2) dx2−y2
    const third = dRotation(rotationAbout([1, 1, 1], (2 * Math.PI) / 3));
    expect(third[0]![0]).toBeCloseTo(-0.5, 12);
    expect(third[1]![0]).toBeCloseTo(Math.sqrt(3) / 2, 12);
  });

  it('carry the axes onto a frame', () => {
    const q = rotationToFrame([0, 1, 0], [0, 0, 1], [1, 0, 0]);
    expect(dRotation(q)[0]![0]).toBeCloseTo(-0.5, 12);
  });
});
