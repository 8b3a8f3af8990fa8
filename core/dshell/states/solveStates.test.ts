import { describe, expect, it } from 'vitest';
import { plainHamiltonian } from '../../testing/levels/plainHamiltonian';
import { type LevelProblem } from '../problem';
import { solveStates, type SolvedStates } from './solveStates';

const matrixField = (rows: number[][]): LevelProblem['field'] => ({ type: 'matrix', matrix: rows });
const lowField = matrixField([
  [1052, -141, -1432, -9, -469],
  [-141, 2409, -627, 151, -43],
  [-1432, -627, 1414, 1017, 410],
  [-9, 151, 1017, -3000, 77],
  [-469, -43, 410, 77, 900],
]);
const tilted = (theta: number, phi: number, e_sigma: number) => ({
  theta,
  phi,
  psi: 20,
  e_sigma,
  e_pi_x: 300,
  e_pi_y: -200,
});
/** Three equal ligands about z with a twist: D3 with its twofold axes in no special place. */
const twisted: LevelProblem['field'] = {
  type: 'aom',
  ligands: [0, 120, 240].map((phi) => tilted(54, phi + 13, 7000)),
};
/** One ligand in a skew place: a fivefold-or-higher axis far from z. */
const skewLigand: LevelProblem['field'] = {
  type: 'aom',
  ligands: [{ theta: 37, phi: 61, e_sigma: 9000, e_pi_x: 1200, e_pi_y: 1200 }],
};

/** Largest entry of H ψ − E ψ over all states. */
function residual(problem: LevelProblem, { count, energies, re, im }: SolvedStates): number {
  const { matrix } = plainHamiltonian(problem);
  let largest = 0;
  for (let k = 0; k < count; k++) {
    for (let i = 0; i < count; i++) {
      let sr = -energies[k]! * re[k * count + i]!;
      let si = -energies[k]! * im[k * count + i]!;
      for (let j = 0, at = 2 * i * count; j < count; j++, at += 2) {
        const [hr, hi] = [matrix[at]!, matrix[at + 1]!];
        if (hr === 0 && hi === 0) continue;
        sr += hr * re[k * count + j]! - hi * im[k * count + j]!;
        si += hr * im[k * count + j]! + hi * re[k * count + j]!;
      }
      largest = Math.max(largest, Math.abs(sr), Math.abs(si));
    }
  }
  return largest;
}

describe('every state solves the Hamiltonian written out over determinants of real orbitals', () => {
  const racah = { B: 640, C: 2700 };
  it.each<[string, LevelProblem]>([
    ['d2 in an octahedron', { dElectrons: 2, ...racah, field: { type: 'oct', tenDq: 15_000 } }],
    [
      'd3 with spin-orbit coupling',
      { dElectrons: 3, ...racah, zeta: 270, field: { type: 'oct', tenDq: 17_000 } },
    ],
    ['d2 without symmetry', { dElectrons: 2, ...racah, zeta: 450, field: lowField }],
    ['d3 without symmetry', { dElectrons: 3, ...racah, zeta: 450, field: lowField }],
    ['d3 about a threefold axis', { dElectrons: 3, ...racah, zeta: 450, field: twisted }],
    ['d8 about a threefold axis, no coupling', { dElectrons: 8, ...racah, field: twisted }],
    ['d7 about a skew axis', { dElectrons: 7, ...racah, zeta: 500, field: skewLigand }],
    ['d4 about a skew axis, no coupling', { dElectrons: 4, ...racah, field: skewLigand }],
    [
      'd3 in a magnetic field',
      { dElectrons: 3, ...racah, zeta: 300, field: lowField, zeeman: { B_T: [1, 2, 3], k: 0.8 } },
    ],
    [
      'd3 in a magnetic field across the fourfold axis',
      {
        ...{ dElectrons: 3, ...racah, zeta: 300, zeeman: { B_T: [0, 5, 0] } },
        field: { type: 'tetragonal', tenDq: 17_000, Ds: 200, Dt: 90 },
      },
    ],
    [
      'd2 in a magnetic field along a twofold axis of a trigonal field',
      {
        dElectrons: 2,
        ...racah,
        zeta: 300,
        field: twisted,
        zeeman: { B_T: [Math.cos(0.9), Math.sin(0.9), 0] },
      },
    ],
    ['the free d3 ion', { dElectrons: 3, ...racah, zeta: 300, field: { type: 'oct', tenDq: 0 } }],
  ])('%s', (_, problem) => {
    const states = solveStates(problem);
    expect(residual(problem, states)).toBeLessThan(1e-7);
  });
});

describe('the shares of free-ion terms', () => {
  it('add up to one for every state', () => {
    const { count, termWeights, terms } = solveStates({
      dElectrons: 3,
      B: 700,
      C: 3000,
      zeta: 200,
      field: twisted,
    });
    for (let k = 0; k < count; k++) {
      const share = termWeights.subarray(k * terms.length, (k + 1) * terms.length);
      expect(share.reduce((sum, value) => sum + value, 0)).toBeCloseTo(1, 10);
    }
  });
});
