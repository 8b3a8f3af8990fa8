import { describe, expect, it } from 'vitest';
import { compose, rotationAbout } from '../../symmetry';
import { turnedField } from '../field/symmetryAxes';
import { fieldMatrix } from '../field/fieldMatrix';
import { type FieldSpec } from '../field/fieldSpec';
import { cubicFrame } from './cubicFrame';
import { labelLevels } from './labelLevels';
import { levelAccount } from './levelAccount';

const turn = compose(rotationAbout([1, 2, 0.5], 0.9), rotationAbout([0, 1, 1], -1.7));
const octahedral = (tenDq: number): FieldSpec => ({ type: 'oct', tenDq });
const solve = (dElectrons: number, field: FieldSpec, zeta = 0, B = 800, C = 3200) =>
  labelLevels({ dElectrons, B, C, zeta, field });
const find = (labelled: ReturnType<typeof solve>, name: string, which = 0): number => {
  const all = labelled.levels.flatMap(({ multiplicity, irrep }, i) =>
    `${multiplicity}${irrep}` === name ? [i] : [],
  );
  return all[which]!;
};

describe('parentage', () => {
  it('mixes t2g2 and t2g1 eg1 in 3T1g of d2 as the matrix of Tanabe and Sugano (1954) does', () => {
    // (−5B, 6B; 6B, 4B + 10Dq) over t2², t2 e.
    const [B, tenDq] = [800, 17_000];
    const angle = 0.5 * Math.atan2(12 * B, tenDq + 9 * B);
    const labelled = solve(2, octahedral(tenDq));
    const { configurations } = labelled.parentage(find(labelled, '3T1g'));
    expect(configurations[0]).toMatchObject({ t2: 2, e: 0 });
    expect(configurations[0]!.weight).toBeCloseTo(Math.cos(angle) ** 2, 8);
  });

  it('mixes 3F and 3P in 3T1g of d2 as the weak-field matrix does (Ballhausen 1962: −6Dq, 15B, 4Dq)', () => {
    const [B, Dq] = [800, 500];
    const angle = 0.5 * Math.atan2(2 * 4 * Dq, 15 * B + 6 * Dq);
    const labelled = solve(2, octahedral(10 * Dq));
    const { freeIon } = labelled.parentage(find(labelled, '3T1g'));
    expect(freeIon[0]).toMatchObject({ label: '3F', rank: 1, of: 1 });
    expect(freeIon[0]!.weight).toBeCloseTo(Math.cos(angle) ** 2, 8);
  });

  it('adds up to one in every view, with and without spin-orbit coupling, in any field', () => {
    const matrix = turnedField(fieldMatrix({ type: 'tetragonal', tenDq: 14_000, Ds: 900, Dt: 300 }), turn);
    for (const zeta of [0, 500]) {
      const labelled = solve(7, { type: 'matrix', matrix }, zeta);
      labelled.levels.forEach((_, i) => {
        for (const weights of Object.values(labelled.parentage(i))) {
          expect(
            weights.reduce((sum: number, { weight }: { weight: number }) => sum + weight, 0),
          ).toBeCloseTo(1, 7);
        }
      });
    }
  });

  it('names the free-ion term and the cubic term that a level becomes in the limits', () => {
    const weak = solve(8, octahedral(10));
    expect(weak.parentage(0).freeIon[0]).toMatchObject({ label: '3F' });
    expect(weak.parentage(0).freeIon[0]!.weight).toBeGreaterThan(0.9999);
    const twoOf = solve(3, octahedral(1), 0, 800, 3200).levels.flatMap((_, i) => {
      const [first] = solveOnce.parentage(i).freeIon;
      return first!.label === '2D' ? [first!.rank] : [];
    });
    expect(new Set(twoOf)).toEqual(new Set([1, 2]));
    const tetragonal = solve(8, { type: 'tetragonal', tenDq: 9000, Ds: 50, Dt: 20 });
    const at = find(tetragonal, '3Eg');
    expect(tetragonal.parentage(at).cubic[0]).toMatchObject({ label: '3T2g' });
    expect(tetragonal.parentage(at).cubic[0]!.weight).toBeGreaterThan(0.999);
  });

  it('counts one- and two-electron jumps as the textbooks do (Figgis and Hitchman 2000; Lever 1984)', () => {
    const chromium = solve(3, octahedral(17_400));
    const jump = (name: string, which = 0): number | null =>
      levelAccount(chromium, find(chromium, name, which), 3).electronJump;
    expect(jump('2Eg')).toBe(0);
    expect(jump('4T2g')).toBe(1);
    expect(jump('4T1g')).toBe(1);
    expect(jump('4T1g', 1)).toBe(2);
  });

  it('gives the account of a band: 4T2g of d3 from 4F, t2g2 eg1, spin-allowed, microstates adding up', () => {
    const chromium = solve(3, octahedral(17_400));
    const account = levelAccount(chromium, find(chromium, '4T2g'), 3);
    expect(account.name).toBe('4T2g');
    expect(account.spinAllowed).toBe(true);
    expect(account.freeIon[0]!.label).toBe('4F');
    expect(account.configurations[0]).toMatchObject({ label: 't2g^2 eg^1', microstates: 60 });
    expect(account.origin!.freeIon.map(({ label }) => label)).toEqual(['4F']);
    expect(levelAccount(chromium, find(chromium, '2Eg'), 3).spinAllowed).toBe(false);
  });
});

const solveOnce = solve(3, octahedral(1), 0, 800, 3200);

describe('cubic axes of a field', () => {
  it('are found in any orientation, with the sign of the splitting', () => {
    const turned = (tenDq: number, type: 'oct' | 'tet') => turnedField(fieldMatrix({ type, tenDq }), turn);
    expect(cubicFrame(turned(12_000, 'oct')).tenDq).toBeCloseTo(12_000, 4);
    expect(cubicFrame(turned(5_000, 'tet')).tenDq).toBeCloseTo(-5_000, 4);
  });

  it('are all of an octahedral field and less than half of that of a trigonal bipyramid', () => {
    expect(cubicFrame(fieldMatrix(octahedral(12_000))).share).toBeCloseTo(1, 9);
    const ligand = (theta: number, phi: number) => ({ theta, phi, e_sigma: 5000 });
    const ligands = [ligand(0, 0), ligand(180, 0), ligand(90, 0), ligand(90, 120), ligand(90, 240)];
    const bipyramid = labelLevels({ dElectrons: 9, B: 0, C: 0, field: { type: 'aom', ligands } });
    expect(bipyramid.cubicShare).toBeLessThan(0.6);
    expect(levelAccount(bipyramid, 1, 9).electronJump).toBeNull();
  });

  it('are the laboratory axes where those serve', () => {
    const V = fieldMatrix({ type: 'tetragonal', tenDq: 12_000, Ds: 700, Dt: -200 });
    expect(cubicFrame(V).rotation).toEqual([1, 0, 0, 0]);
  });
});
