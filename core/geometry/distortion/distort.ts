import { SpinhueError } from '../../errors';
import { cross, dot, normalise, rotate, rotationAbout, type Vector3 } from '../../symmetry';
import { angleBetween } from '../polyhedra/direction';
import { type Polyhedron } from '../polyhedra/polyhedra';

/** A donor as the metal sees it. */
export interface PlacedVertex {
  readonly direction: Vector3;
  /** Metal-donor distance relative to the undistorted one, 1 where nothing was moved. */
  readonly distance: number;
}

/** What a user can set. Everything absent or zero leaves the ideal polyhedron. */
export interface Distortion {
  /** Relative lengthening of the bonds on the main axis: 0.1 is 10 % longer, negative is shorter. Angles stay. */
  readonly axialElongation?: number;
  /**
   * Turn of one triangle of donors against the other about the threefold axis, degrees from the ideal polyhedron: 60 takes
   * the octahedron to the trigonal prism and back. Octahedra and prisms only.
   */
  readonly trigonalTwist?: number;
  /**
   * Polar angle of the donors off the main axis, degrees: the threefold axis of octahedra and prisms, the fourfold (or S4)
   * axis of tetrahedra, square pyramids, cubes and antiprisms. For the tetrahedron 90 is square planar.
   */
  readonly polarAngle?: number;
  /** Donor-metal-donor angle of every chelate ring, degrees; needs the rings of an isomer. */
  readonly biteAngle?: number;
}

const range = (field: keyof Distortion, value: number, low: number, high: number): void => {
  if (Number.isFinite(value) && value >= low && value <= high) return;
  throw new SpinhueError({
    code: Number.isFinite(value) ? 'out-of-range' : 'not-finite',
    message: `${field} is ${value}; it may be ${low} to ${high}`,
    field: `distortion.${field}`,
    remedy: `give a number from ${low} to ${high}`,
  });
};

const unfit = (field: keyof Distortion, { id }: Polyhedron): never => {
  throw new SpinhueError({
    code: 'out-of-range',
    message: `${field} has no meaning for ${id}`,
    field: `distortion.${field}`,
    remedy: 'leave it out, or choose another geometry',
  });
};

const trigonal = ['octahedral', 'tetragonal', 'trigonal-prismatic'];
const z: Vector3 = [0, 0, 1];

/** The axis that polar angle and twist refer to. */
function mainAxis({ id }: Polyhedron): Vector3 {
  return id === 'octahedral' || id === 'tetragonal' ? normalise([1, 1, 1]) : z;
}

/** The polyhedron with the distortions applied in the order polar angle, twist, bite, elongation. `rings` are pairs of vertices. */
export function distort(
  shape: Polyhedron,
  distortion: Distortion,
  rings: readonly (readonly [number, number])[] = [],
): PlacedVertex[] {
  const { axialElongation = 0, trigonalTwist = 0, polarAngle, biteAngle } = distortion;
  const axis = mainAxis(shape);
  let directions = [...shape.vertices];
  if (polarAngle !== undefined) {
    range('polarAngle', polarAngle, 5, 120);
    directions = withPolarAngle(shape, directions, axis, polarAngle);
  }
  if (trigonalTwist !== 0) {
    range('trigonalTwist', trigonalTwist, -60, 60);
    if (!trigonal.includes(shape.id)) unfit('trigonalTwist', shape);
    const turn = rotationAbout(axis, (trigonalTwist * Math.PI) / 180);
    directions = directions.map((v) => (dot(v, axis) > 0 ? rotate(turn, v) : v));
  }
  if (biteAngle !== undefined) {
    range('biteAngle', biteAngle, 30, 180);
    directions = withBiteAngle(directions, rings, biteAngle);
  }
  range('axialElongation', axialElongation, -0.5, 1);
  const onAxis = shape.vertices.map((v) => Math.abs(Math.abs(dot(v, z)) - 1) < 1e-6);
  if (axialElongation !== 0 && !onAxis.some(Boolean)) unfit('axialElongation', shape);
  return directions.map((direction, i) => ({ direction, distance: onAxis[i]! ? 1 + axialElongation : 1 }));
}

function withPolarAngle(
  shape: Polyhedron,
  directions: readonly Vector3[],
  axis: Vector3,
  angle: number,
): Vector3[] {
  const offAxis = directions.filter((v) => Math.abs(dot(v, axis)) < 1 - 1e-9);
  const flat = offAxis.every((v) => Math.abs(dot(v, axis)) < 1e-9);
  const oneRing = new Set(offAxis.map((v) => Math.abs(dot(v, axis)).toFixed(6))).size === 1;
  // Rings in the plane of a centre of symmetry would have to choose a side; only the square pyramid has one.
  if (!oneRing || (flat && shape.id !== 'square-pyramidal')) unfit('polarAngle', shape);
  const radian = (angle * Math.PI) / 180;
  return directions.map((v) => {
    const along = dot(v, axis);
    if (Math.abs(along) > 1 - 1e-9) return v;
    const side = along < -1e-9 ? -1 : 1;
    const across = normalise([v[0] - along * axis[0], v[1] - along * axis[1], v[2] - along * axis[2]]);
    const [c, s] = [side * Math.cos(radian), Math.sin(radian)];
    return normalise([c * axis[0] + s * across[0], c * axis[1] + s * across[1], c * axis[2] + s * across[2]]);
  });
}

/**
 * Closes or opens every ring to the angle: the two donors move equally in their common plane, the bisector stays. A donor
 * in several rings is moved by all of them in turn until the angles hold (within 1e-9°) or no longer improve.
 */
function withBiteAngle(
  start: readonly Vector3[],
  rings: readonly (readonly [number, number])[],
  angle: number,
): Vector3[] {
  const directions = [...start];
  for (let round = 0; round < 200; round++) {
    let off = 0;
    for (const [a, b] of rings) {
      const [u, v] = [directions[a]!, directions[b]!];
      const short = angle - angleBetween(u, v);
      off = Math.max(off, Math.abs(short));
      const normal = cross(u, v);
      if (Math.hypot(...normal) < 1e-9) continue;
      const half = (short / 2) * (Math.PI / 180);
      directions[a] = rotate(rotationAbout(normal, -half), u);
      directions[b] = rotate(rotationAbout(normal, half), v);
    }
    if (off < 1e-9) break;
  }
  return directions;
}
