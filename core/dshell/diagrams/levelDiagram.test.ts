import { describe, expect, it } from 'vitest';
import { cubicLevels } from '../cubic/cubicLevels';
import { groundCrossovers } from '../cubic/groundCrossovers';
import { levels } from '../levels/levels';
import { type LevelProblem } from '../problem';
import { levelDiagram, type LevelDiagram } from './index';

const cubic = (dElectrons: number, extra: Partial<LevelProblem> = {}): LevelProblem => ({
  dElectrons,
  B: 1,
  C: 4.5,
  field: { type: 'oct', tenDq: 0 },
  ...extra,
});

const sorted = (diagram: LevelDiagram, i: number): number[] =>
  diagram.curves
    .flatMap(({ energies, degeneracy }) => new Array<number>(degeneracy).fill(energies[i]!))
    .sort((a, b) => a - b);

describe('a diagram along 10Dq/B', () => {
  it.each([4, 5, 6, 7])('of d%i has its one ground-level change where the exact crossover is', (n) => {
    const diagram = levelDiagram(cubic(n), 'tenDqOverB', { from: 0, to: 40, points: 21 });
    const [exact] = groundCrossovers(n, 4.5);
    expect(diagram.groundChanges).toHaveLength(1);
    expect(Math.abs(diagram.groundChanges[0]!.x - exact!.tenDqOverB)).toBeLessThan(1e-6);
    expect(diagram.groundChanges[0]!.from).toBe(`${exact!.weak.multiplicity}${exact!.weak.irrep}g`);
    expect(diagram.groundChanges[0]!.to).toBe(`${exact!.strong.multiplicity}${exact!.strong.irrep}g`);
  });

  it('follows the two 3T1g of d2, which avoid each other, without a kink', () => {
    const diagram = levelDiagram(cubic(2), 'tenDqOverB', { from: 0, to: 60, points: 241 });
    const [upper] = diagram.curves.filter(({ label }) => label === '3T1g').slice(1);
    const second = upper!.energies
      .slice(2)
      .map((e, i) => e - 2 * upper!.energies[i + 1]! + upper!.energies[i]!);
    expect(Math.max(...second.map(Math.abs))).toBeLessThan(0.01);
    diagram.x.forEach((x, i) => {
      const exact = cubicLevels({ dElectrons: 2, geometry: 'octahedral', tenDq: x, B: 1, C: 4.5 });
      const highest = exact.filter(({ label }) => label === '3T1g').at(-1)!.energy;
      expect(Math.abs(highest - upper!.energies[i]!)).toBeLessThan(1e-9);
    });
  });
});

describe('a diagram along another parameter', () => {
  it('meets the exact levels at every place: axial compression, zeta, pi interaction of one ligand', () => {
    const ligand = (theta: number, phi: number) => ({ theta, phi, e_sigma: 6000, e_pi_x: 900, e_pi_y: 900 });
    const octahedron = [ligand(0, 0), ligand(180, 0), ...[0, 90, 180, 270].map((phi) => ligand(90, phi))];
    const racah = { B: 700, C: 3100 };
    const runs: [LevelProblem, string, number, number][] = [
      [
        { dElectrons: 3, ...racah, field: { type: 'tetragonal', tenDq: 17_000, Ds: 0, Dt: 0 } },
        'field.Dt',
        -500,
        500,
      ],
      [{ dElectrons: 3, ...racah, field: { type: 'oct', tenDq: 17_000 } }, 'zeta', 0, 800],
      [
        { dElectrons: 2, ...racah, zeta: 200, field: { type: 'aom', ligands: octahedron } },
        'field.ligands[2].e_pi_x',
        -500,
        2500,
      ],
    ];
    for (const [problem, parameter, from, to] of runs) {
      const diagram = levelDiagram(problem, parameter, { from, to, points: 7 });
      [0, 3, 6].forEach((i) => {
        const value = diagram.x[i]!;
        const there = { ...problem, ...(parameter === 'zeta' ? { zeta: value } : {}) };
        if (there.field.type === 'tetragonal') Object.assign(there, { field: { ...there.field, Dt: value } });
        if (there.field.type === 'aom')
          Object.assign(there, {
            field: {
              type: 'aom',
              ligands: octahedron.map((each, which) => (which === 2 ? { ...each, e_pi_x: value } : each)),
            },
          });
        const exact = levels(there, { labelGroup: null }).levels.flatMap(({ energy, degeneracy }) =>
          new Array<number>(degeneracy).fill(energy),
        );
        sorted(diagram, i).forEach((energy, k) => expect(Math.abs(energy - exact[k]!)).toBeLessThan(1e-4));
      });
    }
  });

  it('lets levels of one row cross where nothing keeps them apart: one electron, no common frame', () => {
    // Two one-electron levels that do not mix, in rows that the general field leaves together.
    const along = (x: number): LevelProblem => ({
      ...cubic(1),
      field: {
        type: 'matrix',
        matrix: [
          [x, 0, 0, 0, 0],
          [0, 100, 0, 0, 0],
          [0, 0, 250, 0, 0],
          [0, 0, 0, 500, 40],
          [0, 0, 0, 40, 900],
        ],
      },
    });
    const diagram = levelDiagram(along(0), along, { from: 0.5, to: 200.5, points: 6 });
    const straight = diagram.curves.filter(({ energies }) => {
      const slope = (i: number): number =>
        energies[i + 1]! + diagram.ground[i + 1]! - energies[i]! - diagram.ground[i]!;
      return [0, 1, 2, 3, 4].every((i) => Math.abs(slope(i) - 40) < 1e-6);
    });
    expect(straight).toHaveLength(1);
  });

  it('refuses a range that does not ascend and a number that the problem does not have', () => {
    expect(() => levelDiagram(cubic(3), 'tenDqOverB', { from: 3, to: 3 })).toThrow(
      expect.objectContaining({ code: 'out-of-range', field: 'to' }) as Error,
    );
    expect(() => levelDiagram(cubic(3), 'field.Ds', { from: 0, to: 3 })).toThrow(
      expect.objectContaining({ code: 'unknown-field-value', field: 'parameter' }) as Error,
    );
  });
});
