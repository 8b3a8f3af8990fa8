import { type GeometryId } from '../../record/composition';
import { cross, dot, rigidPermutations } from '../../symmetry';
import { type Polyhedron, polyhedron, vertexAngles } from '../polyhedra/polyhedra';

/** A polyhedron with what the enumeration needs: angles and the permutations of its vertices. */
export interface VertexFrame {
  readonly polyhedron: Polyhedron;
  /** Degrees. */
  readonly angles: readonly (readonly number[])[];
  /** All rigid permutations, reflections included. */
  readonly permutations: readonly (readonly number[])[];
  /** Those of proper rotations. */
  readonly rotations: readonly (readonly number[])[];
  /** Widest angle that counts as an edge a chelate can span. */
  readonly edge: number;
}

/** A chelate spans angles up to 100° (cis), or the smallest angle there is where that is wider (tetrahedron, triangle). */
const widestEdge = 100;
const widestEver = 125;

/** Donors further apart than this are trans, degrees. */
export const opposite = 150;

const frames = new Map<GeometryId, VertexFrame>();

export function vertexFrame(id: GeometryId): VertexFrame {
  let frame = frames.get(id);
  if (frame === undefined) frames.set(id, (frame = build(polyhedron(id))));
  return frame;
}

function build(shape: Polyhedron): VertexFrame {
  const { vertices, places } = shape;
  const angles = vertexAngles(vertices);
  const smallest = Math.min(...angles.flatMap((row, i) => row.filter((_, j) => j !== i)));
  const permutations = rigidPermutations(vertices, places);
  const handed = handedTriple(shape);
  return {
    polyhedron: shape,
    angles,
    permutations,
    // Without three vertices out of one plane every reflection is also a rotation.
    rotations: permutations.filter(
      (p) =>
        handed === null ||
        volume(
          shape,
          handed.map((i) => p[i]!),
        ) > 0,
    ),
    edge: Math.min(Math.max(widestEdge, smallest + 1), widestEver),
  };
}

const volume = ({ vertices }: Polyhedron, [a, b, c]: readonly number[]): number =>
  dot(vertices[a!]!, cross(vertices[b!]!, vertices[c!]!));

function handedTriple(shape: Polyhedron): number[] | null {
  const n = shape.coordinationNumber;
  for (let a = 0; a < n; a++)
    for (let b = 0; b < n; b++)
      for (let c = 0; c < n; c++) if (volume(shape, [a, b, c]) > 0.05) return [a, b, c];
  return null;
}
