import { describe, expect, it } from 'vitest';
import { computedCases } from '../../testing/levels/computedCases';
import { compose, rotationAbout } from '../../symmetry';
import { turnedField } from '../field/symmetryAxes';
import { fieldMatrix } from '../field/fieldMatrix';
import { type FieldSpec } from '../field/fieldSpec';
import { type LevelProblem } from '../problem';
import { labelLevels, type LabelledLevels } from './labelLevels';

/** The large spaces with spin-orbit coupling are left to the longer checks. */
const named = computedCases().filter(
  ({ labelGroup, zeta = 0, dElectrons: n }) => labelGroup !== null && (zeta === 0 || n < 4 || n > 6),
);

/** `4T2g`, one entry per state, in clusters of levels nearer than 1e-3. */
function clusters(rows: { energy: number; name: string; degeneracy: number }[]): string[] {
  const sorted = [...rows].sort((a, b) => a.energy - b.energy);
  const found: string[][] = [];
  let last = -Infinity;
  for (const { energy, name, degeneracy } of sorted) {
    if (energy - last > 1e-3) found.push([]);
    last = energy;
    found.at(-1)!.push(`${name} x${degeneracy}`);
  }
  return found.map((names) => names.sort().join(' '));
}

describe('labels worked out from eigenvectors by characters', () => {
  it.each(named.map((each) => [`${each.id} in ${each.labelGroup}`, each] as const))(
    'agree with the independently computed case %s',
    (_, expected) => {
      const { levels } = labelLevels(expected, { group: expected.labelGroup! });
      expect(clusters(levels.map((l) => ({ ...l, name: `${l.multiplicity} ${l.irrep}` })))).toEqual(
        clusters(
          expected.levels.map((l) => ({ ...l, energy: l.energy_cm1, name: `${l.multiplicity} ${l.label}` })),
        ),
      );
    },
  );
});

const ligand = (theta: number, phi: number, e_sigma: number, e_pi = 0) => ({
  ...{ theta, phi, psi: 0, e_sigma, e_pi_x: e_pi, e_pi_y: e_pi },
});
const turn = compose(rotationAbout([1, 2, 0.5], 0.9), rotationAbout([0, 1, 1], -1.7));
const problem = (dElectrons: number, field: FieldSpec, zeta = 0): LevelProblem => ({
  ...{ dElectrons, B: 800, C: 3200, zeta, field },
});
const names = ({ levels }: LabelledLevels): string[] =>
  levels.map(({ multiplicity, irrep, degeneracy }) => `${multiplicity ?? ''}${irrep} ${degeneracy}`).sort();

describe('the group of a field', () => {
  const magic = (Math.acos(1 / Math.sqrt(3)) * 180) / Math.PI;
  const ring = (theta: number, n: number, first = 0, e = 5000) =>
    Array.from({ length: n }, (_, i) => ligand(theta, first + (360 / n) * i, e, 400));
  const arrangements: [string, string, FieldSpec][] = [
    ['octahedron', 'Oh', { type: 'oct', tenDq: 12_000 }],
    [
      'octahedron on a face',
      'Oh',
      { type: 'aom', ligands: [...ring(magic, 3), ...ring(180 - magic, 3, 60)] },
    ],
    ['square', 'D4h', { type: 'aom', ligands: ring(90, 4) }],
    ['trigonal antiprism', 'D3d', { type: 'aom', ligands: [...ring(50, 3), ...ring(130, 3, 60)] }],
    ['twisted prism', 'D3d', { type: 'aom', ligands: [...ring(50, 3), ...ring(130, 3, 40)] }],
    [
      'trigonal bipyramid',
      'D∞h',
      { type: 'aom', ligands: [...ring(90, 3), ligand(0, 0, 6000), ligand(180, 0, 6000)] },
    ],
    [
      'three unlike pairs',
      'D2h',
      { type: 'aom', ligands: [...ring(90, 2), ...ring(90, 2, 90, 7000), ...ring(0, 1)] },
    ],
    ['free ion', 'SO3', { type: 'oct', tenDq: 0 }],
  ];
  it.each(arrangements)('of a %s is %s, in any orientation and with the same names', (_, group, field) => {
    const straight = labelLevels(problem(2, field));
    const matrix = turnedField(fieldMatrix(field), turn);
    const turned = labelLevels(problem(2, { type: 'matrix', matrix }));
    expect(straight.group).toBe(group);
    expect(turned.group).toBe(group);
    expect(names(turned)).toEqual(names(straight));
  });

  it('keeps B1g and B2g apart by the ligands when the axes are turned: x2-y2 above xy (common practice)', () => {
    const square = fieldMatrix({ type: 'aom', ligands: ring(90, 4) });
    const matrix = turnedField(square, turn);
    const top = labelLevels(problem(1, { type: 'matrix', matrix })).levels.at(-1)!;
    expect(top.irrep).toBe('B1g');
  });
});

describe('names in groups that are asked for', () => {
  const byEnergy = (dElectrons: number, field: FieldSpec, group: string, zeta = 0): string[] =>
    labelLevels(problem(dElectrons, field, zeta), { group }).levels.map(
      ({ multiplicity, irrep }) => `${multiplicity ?? ''}${irrep}`,
    );
  const mer: FieldSpec = {
    type: 'aom',
    ligands: [
      ...[ligand(0, 0, 6000), ligand(180, 0, 6000), ligand(90, 0, 6000)],
      ...[ligand(90, 180, 4000), ligand(90, 90, 4000), ligand(90, 270, 4000)],
    ],
  };

  it('are those of trigonal, rhombic and axial subgroups (descent of 2Eg and 2T2g in the tables of Cotton 1990)', () => {
    const prism: FieldSpec = {
      type: 'aom',
      ligands: [0, 120, 240].flatMap((phi) => [ligand(50, phi, 5000), ligand(130, phi, 5000)]),
    };
    expect(byEnergy(1, prism, 'D3h').sort()).toEqual(["2A1'", "2E'", "2E''"]);
    const cone: FieldSpec = { type: 'aom', ligands: [0, 120, 240].map((phi) => ligand(70, phi, 5000)) };
    expect(byEnergy(1, cone, 'C3v').sort()).toEqual(['2A1', '2E', '2E']);
    expect(byEnergy(1, cone, 'C3').sort()).toEqual(['2A', '2E', '2E']);
    expect(byEnergy(1, mer, 'D2h').sort()).toEqual(['2Ag', '2Ag', '2B1g', '2B2g', '2B3g']);
    expect(byEnergy(1, mer, 'C2v').sort()).toEqual(['2A1', '2A1', '2A2', '2B1', '2B2']);
    const linear: FieldSpec = {
      type: 'aom',
      ligands: [ligand(0, 0, 9000, 1500), ligand(180, 0, 9000, 1500)],
    };
    expect(byEnergy(1, linear, 'D∞h')).toEqual(['2Δg', '2Πg', '2Σg+']);
  });

  it('of double groups: 4A2g of a trigonal d3 splits into E1/2 and E3/2, of a rhombic d1 all are E1/2', () => {
    const trigonal: FieldSpec = { type: 'trigonal', tenDq: 17_000, Dsigma: 300, Dtau: -200 };
    const { levels, group } = labelLevels(problem(3, trigonal, 270));
    expect(group).toBe('D3d');
    expect(
      levels
        .slice(0, 2)
        .map(({ mulliken }) => mulliken)
        .sort(),
    ).toEqual(['E1/2g', 'E3/2g']);
    expect(
      levels
        .slice(0, 2)
        .map(({ irrep }) => irrep)
        .sort(),
    ).toEqual(['G4', 'G5+G6']);
    expect(byEnergy(1, mer, 'D2h', 150)).toEqual(['G5', 'G5', 'G5', 'G5', 'G5']);
  });

  it('can be those of the ligands as they stand: D3h of a bipyramid, C3v of fac, C2v of cis, C4v of a pyramid', () => {
    const named = (ligands: ReturnType<typeof ligand>[]): { group: string; names: string[] } => {
      const { group, levels } = labelLevels(problem(1, { type: 'aom', ligands }), { group: 'ligands' });
      return { group, names: levels.map(({ irrep }) => irrep!).sort() };
    };
    const equator = [0, 120, 240].map((phi) => ligand(90, phi, 5000, 600));
    const octahedron = [
      ...[ligand(0, 0, 5000), ligand(180, 0, 5000), ligand(90, 0, 5000)],
      ...[ligand(90, 90, 5000), ligand(90, 180, 5000), ligand(90, 270, 5000)],
    ];
    const with7 = (...places: number[]) =>
      octahedron.map((each, i) => (places.includes(i) ? { ...each, e_sigma: 7000 } : each));
    const bipyramid = named([...equator, ligand(0, 0, 6000), ligand(180, 0, 6000)]);
    expect(bipyramid).toEqual({ group: 'D3h', names: ["A1'", "E'", "E''"] });
    // A field of three like and three unlike donors in fac places is cubic; its levels still have names in C3v.
    expect(named(with7(0, 2, 3))).toEqual({ group: 'C3v', names: ['A1', 'E', 'E'] });
    expect(named(with7(2, 3)).group).toBe('C2v');
    expect(named(octahedron.slice(0, 5).filter((_, i) => i !== 1)).group).toBe('C2v');
    expect(named([octahedron[0]!, ...octahedron.slice(2)])).toEqual({
      group: 'C4v',
      names: ['A1', 'B1', 'B2', 'E'],
    });
  });

  it('of the free ion are J, in the intervals of Landé: 3F of d2 at 3λ and 4λ, λ = ζ/2 (Condon and Shortley 1935)', () => {
    const { levels } = labelLevels({
      dElectrons: 2,
      B: 900,
      C: 3600,
      zeta: 2,
      field: { type: 'oct', tenDq: 0 },
    });
    expect(levels.slice(0, 3).map(({ irrep }) => irrep)).toEqual(['J=2', 'J=3', 'J=4']);
    expect(levels[1]!.energy).toBeCloseTo(3, 2);
    expect(levels[2]!.energy - levels[1]!.energy).toBeCloseTo(4, 2);
  });

  it('give way to the group of the field when that has no such symmetry', () => {
    expect(labelLevels(problem(1, mer), { group: 'Oh' }).group).toBe('D2h');
    expect(labelLevels(problem(1, mer), { group: 'nonsense' }).group).toBe('D2h');
  });

  it('fill the space: degeneracies add up to C(10, N)', () => {
    for (const dElectrons of [1, 3, 8]) {
      const { levels } = labelLevels(problem(dElectrons, mer, 400));
      const sum = levels.reduce((total, { degeneracy }) => total + degeneracy, 0);
      expect(sum).toBe({ 1: 10, 3: 120, 8: 45 }[dElectrons]);
    }
  });
});
