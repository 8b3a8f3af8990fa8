import { describe, expect, it } from 'vitest';
import { findGeometry } from '../../library/geometries';
import { geometryIds } from '../../record/composition';
import { arrangementGroup } from '../../symmetry';
import { angleBetween, anglesOf, direction } from './direction';
import { polyhedra, polyhedron, vertexAngles } from './polyhedra';

describe('ideal polyhedra', () => {
  it('cover every geometry that a complex may name, with its coordination number and point group (IUPAC 2005, IR-9.2)', () => {
    expect(polyhedra.map(({ id }) => id).sort()).toEqual([...geometryIds].sort());
    for (const { id, coordinationNumber, pointGroup, vertices } of polyhedra) {
      const record = findGeometry(id)!;
      expect(coordinationNumber, id).toBe(record.coordinationNumber);
      expect(pointGroup, id).toBe(record.pointGroup);
      for (const vertex of vertices) expect(Math.hypot(...vertex)).toBeCloseTo(1, 12);
    }
  });

  it('have the point group they claim, found from the vertices, in the standard orientation', () => {
    for (const { id, vertices, places, pointGroup } of polyhedra) {
      const found = arrangementGroup(vertices, places);
      expect(found.name, id).toBe(pointGroup);
      expect(Math.abs(found.frame[0]), id).toBeCloseTo(1, 6);
    }
  });

  it('have the angles of the solids: 109.47° in the tetrahedron, 70.53° in the cube, 81.79° in the prism (Kepert 1982)', () => {
    const smallest = (id: (typeof geometryIds)[number]): number =>
      Math.min(...vertexAngles(polyhedron(id).vertices).flatMap((row, i) => row.filter((_, j) => j !== i)));
    expect(smallest('tetrahedral')).toBeCloseTo(109.471, 3);
    expect(smallest('octahedral')).toBeCloseTo(90, 6);
    expect(smallest('cubic')).toBeCloseTo(70.529, 3);
    expect(smallest('trigonal-prismatic')).toBeCloseTo(81.787, 3);
    expect(smallest('square-antiprismatic')).toBeCloseTo(74.858, 3);
    expect(smallest('pentagonal-bipyramidal')).toBeCloseTo(72, 6);
    expect(smallest('linear')).toBeCloseTo(180, 6);
  });

  it('turn into angles and back', () => {
    for (const { vertices } of polyhedra) {
      for (const vertex of vertices) {
        const { theta, phi } = anglesOf(vertex);
        expect(angleBetween(vertex, direction(theta, phi))).toBeLessThan(1e-6);
      }
    }
    expect(anglesOf([0, 0, -2])).toEqual({ theta: 180, phi: 0 });
    expect(anglesOf([0, -1, 0]).phi).toBeCloseTo(270, 9);
  });
});
