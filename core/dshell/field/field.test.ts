import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { rotationAbout, type Vector3 } from '../../symmetry';
import { overlapFactors } from './angularOverlap';
import { fieldFrame } from './fieldFrame';
import { fieldMatrix } from './fieldMatrix';
import { type AngularOverlapLigand, type FieldSpec } from './fieldSpec';
import { turnedField } from './symmetryAxes';

const ligand = (theta: number, phi: number, e: Partial<AngularOverlapLigand> = {}): AngularOverlapLigand => ({
  ...{ theta, phi, psi: 0, e_sigma: 7000, e_pi_x: 900, e_pi_y: 900 },
  ...e,
});
const aom = (...ligands: AngularOverlapLigand[]): FieldSpec => ({ type: 'aom', ligands });
const around = (theta: number, count: number, from = 0): AngularOverlapLigand[] =>
  Array.from({ length: count }, (_, i) => ligand(theta, from + (360 * i) / count));

const orbitals = (spec: FieldSpec): number[] => fieldMatrix(spec).map((row, a) => row[a]!);
const near = (found: readonly number[], wanted: readonly number[]): void =>
  wanted.forEach((value, i) => expect(found[i]).toBeCloseTo(value, 6));

const [es, ep] = [7000, 900];
const tetrahedral = (Math.acos(1 / Math.sqrt(3)) * 180) / Math.PI;

describe('angular-overlap energies of the d orbitals in ideal geometries (E. Larsen and G. N. La Mar, J. Chem. Educ. 51, 633, 1974; recalled)', () => {
  it.each<[string, FieldSpec, number[]]>([
    // z2, x2-y2, xy, xz, yz
    [
      'octahedron',
      aom(ligand(0, 0), ligand(180, 0), ...around(90, 4)),
      [3 * es, 3 * es, 4 * ep, 4 * ep, 4 * ep],
    ],
    [
      'tetrahedron',
      aom(...around(tetrahedral, 2, 45), ...around(180 - tetrahedral, 2, 135)),
      [8 / 3, 8 / 3, 0, 0, 0].map((pi, a) => pi * ep + (a < 2 ? 0 : (4 / 3) * es + (8 / 9) * ep)),
    ],
    ['square plane', aom(...around(90, 4)), [es, 3 * es, 4 * ep, 2 * ep, 2 * ep]],
    ['linear', aom(ligand(0, 0), ligand(180, 0)), [2 * es, 0, 0, 2 * ep, 2 * ep]],
    [
      'trigonal bipyramid',
      aom(ligand(0, 0), ligand(180, 0), ...around(90, 3)),
      [(11 / 4) * es, (9 / 8) * es + 1.5 * ep, (9 / 8) * es + 1.5 * ep, 3.5 * ep, 3.5 * ep],
    ],
    ['square pyramid', aom(ligand(0, 0), ...around(90, 4)), [2 * es, 3 * es, 4 * ep, 3 * ep, 3 * ep]],
    [
      'trigonal plane',
      aom(...around(90, 3)),
      [(3 / 4) * es, (9 / 8) * es + 1.5 * ep, (9 / 8) * es + 1.5 * ep, 1.5 * ep, 1.5 * ep],
    ],
    [
      'cube',
      aom(...around(tetrahedral, 4, 45), ...around(180 - tetrahedral, 4, 45)),
      [16 / 3, 16 / 3, 0, 0, 0].map((pi, a) => pi * ep + (a < 2 ? 0 : (8 / 3) * es + (16 / 9) * ep)),
    ],
  ])('%s', (_, spec, expected) => {
    near(orbitals(spec), expected);
    fieldMatrix(spec).forEach((row, a) =>
      row.forEach((value, b) => a !== b && expect(value).toBeCloseTo(0, 6)),
    );
  });

  it('give 10Dq = 3e_σ − 4e_π for six ligands: 17 400 from 7 000 and 900, and 4/9 of that with sign reversed for four', () => {
    const octahedron = orbitals(aom(ligand(0, 0), ligand(180, 0), ...around(90, 4)));
    expect(octahedron[0]! - octahedron[2]!).toBeCloseTo(17_400, 6);
    const four = orbitals(aom(...around(tetrahedral, 2, 45), ...around(180 - tetrahedral, 2, 135)));
    expect(four[0]! - four[2]!).toBeCloseTo(-(4 / 9) * 17_400, 6);
  });

  it('have the factors of a ligand at θ: f(z2) = (1 + 3cos2θ)/4, −(√3/2) sin2θ for π in the plane (Schäffer 1968)', () => {
    for (const theta of [0, 23, 57, 90, 131]) {
      const angle = (theta * Math.PI) / 180;
      const { sigma, piX, piY } = overlapFactors(ligand(theta, 0));
      expect(sigma[0]).toBeCloseTo((1 + 3 * Math.cos(2 * angle)) / 4, 12);
      expect(piX[0]).toBeCloseTo(-(Math.sqrt(3) / 2) * Math.sin(2 * angle), 12);
      expect(piY[0]).toBeCloseTo(0, 12);
    }
  });

  it('lower z2 of a square plane by 4 e_ds and leave an octahedron alone (Vanquickenborne and Ceulemans 1981)', () => {
    const mixing = { e_ds: 1400 };
    const square = orbitals(aom(...around(90, 4).map((each) => ({ ...each, ...mixing }))));
    near(square, [es - 4 * 1400, 3 * es, 4 * ep, 2 * ep, 2 * ep]);
    near(orbitals({ type: 'sqp', e_sigma: es, e_pi_perp: ep, e_pi_par: ep, e_ds: 1400 }), square);
    const six = [ligand(0, 0), ligand(180, 0), ...around(90, 4)].map((each) => ({ ...each, ...mixing }));
    near(orbitals(aom(...six)), [3 * es, 3 * es, 4 * ep, 4 * ep, 4 * ep]);
  });
});

describe('crystal-field parameters', () => {
  it('tetragonal: z2 6Dq − 2Ds − 6Dt, x2-y2 6Dq + 2Ds − Dt, xy −4Dq + 2Ds − Dt, xz and yz −4Dq − Ds + 4Dt (Ballhausen 1962)', () => {
    const [Dq, Ds, Dt] = [1500, 400, 130];
    near(orbitals({ type: 'tetragonal', tenDq: 10 * Dq, Ds, Dt }), [
      6 * Dq - 2 * Ds - 6 * Dt,
      6 * Dq + 2 * Ds - Dt,
      -4 * Dq + 2 * Ds - Dt,
      -4 * Dq - Ds + 4 * Dt,
      -4 * Dq - Ds + 4 * Dt,
    ]);
  });

  it('trigonal: a1 of t2g at −4Dq − 2Dσ − 6Dτ; e pair with trace 2Dq + Dσ + 3Dτ and coupling −(√2/3)(3Dσ − 5Dτ) (König and Kremer 1977)', () => {
    const [Dq, Ds, Dt] = [1700, 350, -120];
    const V = fieldMatrix({ type: 'trigonal', tenDq: 10 * Dq, Dsigma: Ds, Dtau: Dt });
    expect(V[0]![0]).toBeCloseTo(-4 * Dq - 2 * Ds - 6 * Dt, 6);
    [1, 2, 3, 4].forEach((b) => expect(V[0]![b]).toBeCloseTo(0, 6));
    const low = -4 * Dq + Ds + (2 / 3) * Dt;
    const high = 6 * Dq + (7 / 3) * Dt;
    const coupling = -(Math.SQRT2 / 3) * (3 * Ds - 5 * Dt);
    // Trace and determinant of the pair that x2-y2 and xz form.
    const [p, q, r] = [V[1]![1]!, V[3]![3]!, V[1]![3]!];
    expect(p + q).toBeCloseTo(low + high, 6);
    expect((p * q - r * r) / (low * high - coupling ** 2)).toBeCloseTo(1, 9);
  });

  it('tetrahedron and cube have e below t2 by tenDq', () => {
    for (const type of ['tet', 'cube'] as const)
      near(orbitals({ type, tenDq: 5000 }), [-3000, -3000, 2000, 2000, 2000]);
  });
});

describe('the symmetry found in a field', () => {
  const axis = fc
    .tuple(fc.double({ min: 0, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true }))
    .map(([u, v]): Vector3 => {
      const z = 2 * u - 1;
      const r = Math.sqrt(1 - z * z);
      return [r * Math.cos(2 * Math.PI * v), r * Math.sin(2 * Math.PI * v), z];
    });
  const turn = fc.tuple(axis, fc.double({ min: -3, max: 3, noNaN: true }));
  const skew = (theta: number, phi: number): AngularOverlapLigand =>
    ligand(theta, phi, { psi: 20, e_pi_x: 300, e_pi_y: -200 });

  it.each<[string, FieldSpec]>([
    ['SO3', { type: 'oct', tenDq: 0 }],
    ['O', { type: 'oct', tenDq: 17_000 }],
    ['O', { type: 'trigonal', tenDq: 17_000, Dsigma: 0, Dtau: 0 }],
    ['Dinf', aom(ligand(0, 0), ligand(180, 0), ...around(90, 3))],
    ['D4', { type: 'tetragonal', tenDq: 17_000, Ds: 300, Dt: 80 }],
    ['D3', { type: 'trigonal', tenDq: 17_000, Dsigma: 300, Dtau: 80 }],
    ['D3', aom(...[0, 120, 240].map((phi) => skew(54, phi)))],
    [
      'D2',
      aom(
        ligand(0, 0),
        ligand(180, 0),
        ligand(90, 0, { e_sigma: 5000 }),
        ligand(90, 180, { e_sigma: 5000 }),
        ligand(90, 90, { e_sigma: 3000 }),
        ligand(90, 270, { e_sigma: 3000 }),
      ),
    ],
    ['C2', aom(...[30, 210].map((phi) => skew(70, phi)), ...[100, 280].map((phi) => skew(40, phi)))],
    ['C1', aom(skew(10, 20), skew(70, 100), skew(130, 200))],
  ])('%s, however it is turned', (group, spec) => {
    fc.assert(
      fc.property(turn, ([about, angle]) => {
        const V = turnedField(fieldMatrix(spec), rotationAbout(about, angle));
        expect(fieldFrame(V).group).toBe(group);
      }),
      { numRuns: 25, seed: 3 },
    );
  });

  it('is not claimed for a field that is a little off', () => {
    const V = fieldMatrix({ type: 'oct', tenDq: 17_000 });
    V[2]![2]! += 1e-3;
    expect(fieldFrame(V).group).toBe('D4');
  });
});

describe('bad fields', () => {
  const expectCode = (spec: FieldSpec, code: string, field: string): void =>
    expect(() => fieldMatrix(spec)).toThrow(expect.objectContaining({ code, field }) as Error);

  it('are refused with the place of the fault', () => {
    expectCode(aom(), 'missing-field', 'field.ligands');
    expectCode(aom(ligand(0, 0), ligand(25, 0)), 'ligands-too-close', 'field.ligands[1]');
    expectCode(aom(ligand(0, 0), ligand(Number.NaN, 0)), 'not-finite', 'field.ligands[1].theta');
    expectCode(aom(ligand(0, 0, { e_ds: -1 })), 'out-of-range', 'field.ligands[0].e_ds');
    expectCode({ type: 'oct', tenDq: -1 }, 'out-of-range', 'field.tenDq');
    expectCode({ type: 'tetragonal', tenDq: 1, Ds: Infinity, Dt: 0 }, 'not-finite', 'field.Ds');
    const lopsided = [0, 1, 2, 3, 4].map((a) => [0, 1, 2, 3, 4].map((b) => (a === 3 && b === 1 ? 9 : a + b)));
    expectCode({ type: 'matrix', matrix: lopsided }, 'not-symmetric', 'field.matrix[3][1]');
    expectCode({ type: 'matrix', matrix: [[1]] }, 'wrong-type', 'field.matrix');
    expectCode({ type: 'heptagon' } as unknown as FieldSpec, 'unknown-field-value', 'field.type');
  });

  it('two ligands 30 degrees apart are just allowed', () => {
    expect(() => fieldMatrix(aom(ligand(0, 0), ligand(30, 0)))).not.toThrow();
  });
});
