import { describe, expect, it } from 'vitest';
import { SpinhueError } from '../../errors';
import { isomersOf } from '../isomers/isomersOf';
import { ligandPositions } from '../ligandPositions';
import { angleBetween } from '../polyhedra/direction';
import { polyhedron, vertexAngles } from '../polyhedra/polyhedra';
import { arrangementGroup } from '../../symmetry';
import { distort, type PlacedVertex } from './distort';

/** Point group with bonds of unequal length told apart. */
const group = (vertices: readonly PlacedVertex[]): string =>
  arrangementGroup(
    vertices.map(({ direction }) => direction),
    vertices.map(({ distance }) => distance.toFixed(6)),
  ).name;
const octahedron = polyhedron('octahedral');

describe('distortions of a polyhedron', () => {
  it('lower the symmetry as the textbooks say: elongation D4h, trigonal compression D3d, twist D3, full twist D3h', () => {
    expect(group(distort(octahedron, {}))).toBe('Oh');
    expect(group(distort(octahedron, { axialElongation: 0.1 }))).toBe('D4h');
    expect(group(distort(octahedron, { polarAngle: 60 }))).toBe('D3d');
    expect(group(distort(octahedron, { trigonalTwist: 20 }))).toBe('D3');
    expect(group(distort(octahedron, { trigonalTwist: 60 }))).toBe('D3h');
    expect(group(distort(polyhedron('trigonal-prismatic'), { trigonalTwist: 60 }))).toBe('D3d');
    expect(group(distort(polyhedron('tetrahedral'), { polarAngle: 60 }))).toBe('D2d');
    expect(group(distort(polyhedron('tetrahedral'), { polarAngle: 90 }))).toBe('D4h');
    expect(group(distort(polyhedron('square-pyramidal'), { polarAngle: 103 }))).toBe('C4v');
    expect(group(distort(polyhedron('cubic'), { polarAngle: 57 }))).toBe('D4h');
  });

  it('leave the tetrahedron at half its tetrahedral angle, the octahedron at the magic angle from its threefold axis', () => {
    const magic = Math.acos(1 / Math.sqrt(3)) * (180 / Math.PI);
    expect(group(distort(octahedron, { polarAngle: magic }))).toBe('Oh');
    expect(group(distort(polyhedron('tetrahedral'), { polarAngle: magic }))).toBe('Td');
  });

  it('set the bite of three chelate rings to 80°, keeping D3', () => {
    const [isomer] = isomersOf('octahedral', [{ kind: 'en', denticity: 2, count: 3 }]);
    const rings = isomer!.chelates.map(([a, b]) => [a!, b!] as const);
    const moved = distort(octahedron, { biteAngle: 80 }, rings);
    for (const [a, b] of rings)
      expect(angleBetween(moved[a]!.direction, moved[b]!.direction)).toBeCloseTo(80, 6);
    const inRing = (p: readonly number[]): boolean =>
      rings.every(([a, b]) =>
        rings.some(([c, d]) => (p[a] === c && p[b] === d) || (p[a] === d && p[b] === c)),
      );
    expect(
      arrangementGroup(
        moved.map(({ direction }) => direction),
        [0, 0, 0, 0, 0, 0],
        inRing,
      ).name,
    ).toBe('D3');
  });

  it('set the bite of a meridional chelate with two rings', () => {
    const rings = [
      [0, 2],
      [2, 1],
    ] as const;
    const moved = distort(octahedron, { biteAngle: 78 }, rings).map(({ direction }) => direction);
    const angles = vertexAngles(moved);
    expect(angles[0]![2]).toBeCloseTo(78, 6);
    expect(angles[2]![1]).toBeCloseTo(78, 6);
    expect(angles[0]![1]).toBeCloseTo(156, 6);
  });

  it('lengthen the bonds on the axis and no others', () => {
    const positions = ligandPositions(octahedron, { axialElongation: 0.15 });
    expect(positions.map(({ distance }) => distance)).toEqual([1.15, 1.15, 1, 1, 1, 1]);
    expect(positions[0]).toMatchObject({ theta: 0, phi: 0, psi: 0 });
  });

  it('are refused by name where they make no sense', () => {
    const attempt = (id: Parameters<typeof polyhedron>[0], distortion: Parameters<typeof distort>[1]) => () =>
      distort(polyhedron(id), distortion);
    expect(attempt('linear', { trigonalTwist: 10 })).toThrow(SpinhueError);
    expect(attempt('square-planar', { axialElongation: 0.1 })).toThrow(/no meaning for square-planar/);
    expect(attempt('dodecahedral', { polarAngle: 50 })).toThrow(/no meaning/);
    expect(attempt('octahedral', { biteAngle: 500 })).toThrow(/30 to 180/);
    expect(attempt('octahedral', { axialElongation: NaN })).toThrow(/may be/);
  });
});
