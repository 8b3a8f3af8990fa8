import { dot, normalise, type Vector3 } from '../rotation';
import { type Operation } from '../groups/operation';

const tolerance = 1e-4;

/** Proper rotation axes with their highest order, and normals of mirror planes, S axes and inversion of a set of operations. */
export interface SymmetryElements {
  readonly axes: readonly { readonly direction: Vector3; readonly order: number }[];
  readonly mirrors: readonly Vector3[];
  /** Axes of rotoreflections other than σ and i. */
  readonly rotoreflections: readonly Vector3[];
  readonly inversion: boolean;
}

export const parallel = (a: Vector3, b: Vector3): boolean => Math.abs(Math.abs(dot(a, b)) - 1) < tolerance;
export const perpendicular = (a: Vector3, b: Vector3): boolean => Math.abs(dot(a, b)) < Math.sqrt(tolerance);

/** Axis and smallest turn of a rotation; no axis for the identity. */
function axisOf({ rotation: [w, x, y, z] }: Operation): { direction: Vector3; angle: number } | null {
  const sine = Math.hypot(x, y, z);
  if (sine < 1e-4) return null;
  const half = Math.atan2(sine, Math.abs(w));
  return { direction: normalise([x, y, z]), angle: 2 * half };
}

export function symmetryElements(operations: readonly Operation[]): SymmetryElements {
  const axes: { direction: Vector3; order: number }[] = [];
  const mirrors: Vector3[] = [];
  const rotoreflections: Vector3[] = [];
  let inversion = false;
  for (const operation of operations) {
    const turn = axisOf(operation);
    if (turn === null) {
      inversion ||= operation.parity === -1;
      continue;
    }
    const { direction, angle } = turn;
    const order = Math.round((2 * Math.PI) / angle);
    if (operation.parity === -1) {
      const list = Math.abs(angle - Math.PI) < tolerance ? mirrors : rotoreflections;
      if (!list.some((known) => parallel(known, direction))) list.push(direction);
      continue;
    }
    // Only the generating turn 2π/n counts; its powers belong to the same axis.
    const known = axes.find((axis) => parallel(axis.direction, direction));
    const own = Math.abs(order * angle - 2 * Math.PI) < tolerance * order ? order : 2;
    if (known === undefined) axes.push({ direction, order: own });
    else known.order = Math.max(known.order, own);
  }
  return { axes, mirrors, rotoreflections, inversion };
}
