import { describe, expect, it } from 'vitest';
import { fieldMatrix } from '../dshell';
import { type GeometryId } from '../record/composition';
import { ligandPositions } from './ligandPositions';
import { polyhedra, polyhedron } from './polyhedra/polyhedra';

/** Orbital energies [z2, x2-y2, xy, xz, yz] of a polyhedron of like ligands, and the largest element off the diagonal. */
function orbitalEnergies(id: GeometryId, e_sigma: number, e_pi: number): { energies: number[]; off: number } {
  const ligands = ligandPositions(polyhedron(id)).map(({ theta, phi, psi }) => ({
    ...{ theta, phi, psi, e_sigma, e_pi_x: e_pi, e_pi_y: e_pi },
  }));
  const V = fieldMatrix({ type: 'aom', ligands });
  const off = Math.max(...V.flatMap((row, a) => row.filter((_, b) => b !== a).map(Math.abs)));
  return { energies: V.map((row, a) => row[a]!), off };
}

/** In units of e_σ and e_π. */
const table: Partial<Record<GeometryId, { sigma: number[]; pi: number[] }>> = {
  linear: { sigma: [2, 0, 0, 0, 0], pi: [0, 0, 0, 2, 2] },
  'trigonal-planar': { sigma: [3 / 4, 9 / 8, 9 / 8, 0, 0], pi: [0, 3 / 2, 3 / 2, 3 / 2, 3 / 2] },
  tetrahedral: { sigma: [0, 0, 4 / 3, 4 / 3, 4 / 3], pi: [8 / 3, 8 / 3, 8 / 9, 8 / 9, 8 / 9] },
  'square-planar': { sigma: [1, 3, 0, 0, 0], pi: [0, 0, 4, 2, 2] },
  'trigonal-bipyramidal': { sigma: [11 / 4, 9 / 8, 9 / 8, 0, 0], pi: [0, 3 / 2, 3 / 2, 7 / 2, 7 / 2] },
  'square-pyramidal': { sigma: [2, 3, 0, 0, 0], pi: [0, 0, 4, 3, 3] },
  octahedral: { sigma: [3, 3, 0, 0, 0], pi: [0, 0, 4, 4, 4] },
  'pentagonal-bipyramidal': { sigma: [13 / 4, 15 / 8, 15 / 8, 0, 0], pi: [0, 5 / 2, 5 / 2, 9 / 2, 9 / 2] },
  cubic: { sigma: [0, 0, 8 / 3, 8 / 3, 8 / 3], pi: [16 / 3, 16 / 3, 16 / 9, 16 / 9, 16 / 9] },
};

describe('angular overlap orbital energies of the ideal polyhedra', () => {
  it.each(Object.entries(table))(
    'are those of the printed tables for %s (Schäffer 1968; Larsen and La Mar 1974; Burdett 1980; from memory)',
    (id, { sigma, pi }) => {
      const one = orbitalEnergies(id as GeometryId, 1, 0);
      const other = orbitalEnergies(id as GeometryId, 0, 1);
      sigma.forEach((value, a) => expect(one.energies[a]).toBeCloseTo(value, 10));
      pi.forEach((value, a) => expect(other.energies[a]).toBeCloseTo(value, 10));
      expect(Math.max(one.off, other.off)).toBeLessThan(1e-12);
    },
  );

  it('add up to one e_σ and two e_π per ligand (sum rule of Schäffer 1968)', () => {
    for (const { id, coordinationNumber: n } of polyhedra) {
      const sum = (energies: number[]): number => energies.reduce((total, energy) => total + energy, 0);
      expect(sum(orbitalEnergies(id, 1, 0).energies), id).toBeCloseTo(n, 10);
      expect(sum(orbitalEnergies(id, 0, 1).energies), id).toBeCloseTo(2 * n, 10);
    }
  });

  it('follow the angular factors for the antiprism: z2 8P2², e2 3 sin⁴θ, e3 12 sin²θ cos²θ in e_σ (Schäffer 1968)', () => {
    const { energies, off } = orbitalEnergies('square-antiprismatic', 1, 0);
    const theta = Math.atan(2 ** 0.75);
    const [s, c] = [Math.sin(theta), Math.cos(theta)];
    expect(energies[0]).toBeCloseTo(8 * ((3 * c * c - 1) / 2) ** 2, 10);
    expect(energies[1]).toBeCloseTo(3 * s ** 4, 10);
    expect(energies[2]).toBeCloseTo(3 * s ** 4, 10);
    expect(energies[3]).toBeCloseTo(12 * s * s * c * c, 10);
    expect(off).toBeLessThan(1e-12);
  });

  it('give 10Dq = 3e_σ − 4e_π for the octahedron and 4/9 of it for the tetrahedron (Larsen and La Mar 1974)', () => {
    const [, eg, t2g] = orbitalEnergies('octahedral', 7000, 900).energies;
    expect(eg! - t2g!).toBeCloseTo(17_400, 8);
    const [e, , t2] = orbitalEnergies('tetrahedral', 7000, 900).energies;
    expect(t2! - e!).toBeCloseTo((4 / 9) * 17_400, 8);
  });
});
