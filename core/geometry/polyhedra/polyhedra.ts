import { type GeometryId } from '../../record/composition';
import { type Vector3 } from '../../symmetry';
import { angleBetween, direction } from './direction';

/** Names of inequivalent places: apical and basal, axial and equatorial, A and B of the dodecahedron. */
export type Place = 'all' | 'apical' | 'basal' | 'axial' | 'equatorial' | 'A' | 'B';

export interface Polyhedron {
  readonly id: GeometryId;
  readonly coordinationNumber: number;
  /** Unit vectors from the metal to the donors, in the standard orientation of the point group. */
  readonly vertices: readonly Vector3[];
  /** One per vertex. */
  readonly places: readonly Place[];
  /** Schoenflies symbol with like ligands; D∞h for the linear one. */
  readonly pointGroup: string;
}

const ring = (theta: number, count: number, first = 0): Vector3[] =>
  Array.from({ length: count }, (_, i) => direction(theta, first + (360 / count) * i));
const up = direction(0, 0);
const down = direction(180, 0);

const alike = (id: GeometryId, pointGroup: string, vertices: readonly Vector3[]): Polyhedron => ({
  id,
  coordinationNumber: vertices.length,
  vertices,
  places: vertices.map(() => 'all'),
  pointGroup,
});

const twoKinds = (
  id: GeometryId,
  pointGroup: string,
  [firstPlace, first]: [Place, readonly Vector3[]],
  [secondPlace, second]: [Place, readonly Vector3[]],
): Polyhedron => ({
  id,
  coordinationNumber: first.length + second.length,
  vertices: [...first, ...second],
  places: [...first.map(() => firstPlace), ...second.map(() => secondPlace)],
  pointGroup,
});

const degree = 180 / Math.PI;
/** Magic angle, half the tetrahedral one: cos²θ = 1/3. */
const magic = Math.acos(1 / Math.sqrt(3)) * degree;
/** All nine edges of the trigonal prism equal: tan θ = 2/√3. */
const prismAngle = Math.atan(2 / Math.sqrt(3)) * degree;
/** All sixteen edges of the square antiprism equal: tan θ = 2^(3/4). */
const antiprismAngle = Math.atan(2 ** 0.75) * degree;
/** Most favourable dodecahedron of J. L. Hoard and J. V. Silverton, Inorg. Chem. 2, 235 (1963), from memory. */
const dodecahedronA = 36.9;
const dodecahedronB = 69.5;

/** Ideal polyhedra of coordination numbers 2 to 8. The octahedron starts with the pair on z, then +x, +y, −x, −y. */
export const polyhedra: readonly Polyhedron[] = [
  alike('linear', 'D∞h', [up, down]),
  alike('trigonal-planar', 'D3h', ring(90, 3)),
  alike('tetrahedral', 'Td', [...ring(magic, 2, 45), ...ring(180 - magic, 2, 135)]),
  alike('square-planar', 'D4h', ring(90, 4)),
  twoKinds('square-pyramidal', 'C4v', ['apical', [up]], ['basal', ring(90, 4)]),
  twoKinds('trigonal-bipyramidal', 'D3h', ['axial', [up, down]], ['equatorial', ring(90, 3)]),
  alike('octahedral', 'Oh', [up, down, ...ring(90, 4)]),
  twoKinds('tetragonal', 'D4h', ['axial', [up, down]], ['equatorial', ring(90, 4)]),
  alike('trigonal-prismatic', 'D3h', [...ring(prismAngle, 3), ...ring(180 - prismAngle, 3)]),
  twoKinds('pentagonal-bipyramidal', 'D5h', ['axial', [up, down]], ['equatorial', ring(90, 5)]),
  alike('cubic', 'Oh', [...ring(magic, 4, 45), ...ring(180 - magic, 4, 45)]),
  alike('square-antiprismatic', 'D4d', [
    ...ring(antiprismAngle, 4, 22.5),
    ...ring(180 - antiprismAngle, 4, -22.5),
  ]),
  twoKinds(
    'dodecahedral',
    'D2d',
    ['A', [...ring(dodecahedronA, 2, 45), ...ring(180 - dodecahedronA, 2, 135)]],
    ['B', [...ring(dodecahedronB, 2, 135), ...ring(180 - dodecahedronB, 2, 45)]],
  ),
];

/** The polyhedron of a geometry. */
export const polyhedron = (id: GeometryId): Polyhedron => polyhedra.find((each) => each.id === id)!;

/** Angles between all pairs of vertices, degrees. */
export const vertexAngles = (vertices: readonly Vector3[]): number[][] =>
  vertices.map((a) => vertices.map((b) => angleBetween(a, b)));
