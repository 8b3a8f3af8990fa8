import { carry, type Operation } from '../groups/operation';
import {
  compose,
  cross,
  dot,
  inverseRotation,
  normalise,
  rotationToFrame,
  type Quaternion,
  type Vector3,
} from '../rotation';
import { schoenflies, type StandingGroup } from './schoenflies';

const tolerance = 1e-4;

/**
 * Permutations of the vertices that keep every angle and every label: p[i] is where vertex i goes. These are the rigid
 * motions and reflections of the arrangement; `labels` of equal value mark vertices that may change places.
 */
export function rigidPermutations(
  vertices: readonly Vector3[],
  labels: readonly (string | number)[],
): number[][] {
  const gram = vertices.map((a) => vertices.map((b) => dot(a, b)));
  const found: number[][] = [];
  const image: number[] = [];
  const extend = (): void => {
    const i = image.length;
    if (i === vertices.length) {
      found.push([...image]);
      return;
    }
    for (let j = 0; j < vertices.length; j++) {
      if (image.includes(j) || labels[i] !== labels[j]) continue;
      if (image.every((to, from) => Math.abs(gram[i]![from]! - gram[j]![to]!) < tolerance)) {
        image.push(j);
        extend();
        image.pop();
      }
    }
  };
  extend();
  return found;
}

/** Dimension of the space the vertices span (with the metal at the origin): 1 linear, 2 planar, 3. */
export function spannedDimension(vertices: readonly Vector3[]): 1 | 2 | 3 {
  const [first] = vertices;
  const second = vertices.find((v) => Math.hypot(...cross(first!, v)) > tolerance);
  if (second === undefined) return 1;
  const normal = normalise(cross(first!, second));
  return vertices.some((v) => Math.abs(dot(normal, v)) > tolerance) ? 3 : 2;
}

/** Right-handed frame of two vectors that are not parallel. */
function frameOf(a: Vector3, b: Vector3): Quaternion {
  const x = normalise(a);
  const z = normalise(cross(a, b));
  return rotationToFrame(x, cross(z, x), z);
}

/**
 * The operations behind the permutations. A planar arrangement has two for each (with and without reflection in its
 * plane). Not for linear ones, whose group is infinite.
 */
export function operationsOf(
  vertices: readonly Vector3[],
  permutations: readonly (readonly number[])[],
): Operation[] {
  const first = vertices[0]!;
  const other = vertices.findIndex((v) => Math.hypot(...cross(first, v)) > tolerance);
  const source = frameOf(first, vertices[other]!);
  return permutations.flatMap((p) => {
    const image = frameOf(vertices[p[0]!]!, vertices[p[other]!]!);
    const proper: Operation = { rotation: quotient(image, source), parity: 1 };
    // A reflection keeps the two vectors and turns their normal over: inversion times a rotation of the opposite pair.
    const mirrored = frameOf(negative(vertices[p[0]!]!), negative(vertices[p[other]!]!));
    const improper: Operation = { rotation: quotient(mirrored, source), parity: -1 };
    return [proper, improper].filter((operation) => carries(operation, vertices, p));
  });
}

const quotient = (image: Quaternion, source: Quaternion): Quaternion =>
  compose(image, inverseRotation(source));
const negative = ([x, y, z]: Vector3): Vector3 => [-x, -y, -z];

const carries = (operation: Operation, vertices: readonly Vector3[], p: readonly number[]): boolean =>
  vertices.every((vertex, i) => {
    const [x, y, z] = carry(operation, vertex);
    const target = vertices[p[i]!]!;
    return Math.hypot(x - target[0], y - target[1], z - target[2]) < 10 * tolerance;
  });

/**
 * Point group of metal plus donors with the frame it stands in. `labels` tell the donors apart; `keeps` may refuse a
 * permutation that breaks something else, such as the rings of chelates. Linear arrangements are D∞h or C∞v with z along them.
 */
export function arrangementGroup(
  vertices: readonly Vector3[],
  labels: readonly (string | number)[],
  keeps: (permutation: readonly number[]) => boolean = () => true,
): StandingGroup {
  const permutations = rigidPermutations(vertices, labels).filter(keeps);
  if (spannedDimension(vertices) === 1) {
    const z = vertices[0]!;
    const helper: Vector3 = Math.abs(z[0]) < 0.9 ? [1, 0, 0] : [0, 1, 0];
    const y = normalise(cross(z, helper));
    return { name: permutations.length > 1 ? 'D∞h' : 'C∞v', frame: rotationToFrame(cross(y, z), y, z) };
  }
  return schoenflies(operationsOf(vertices, permutations), vertices);
}
