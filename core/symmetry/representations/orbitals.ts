import { rotationMatrix, type Matrix3, type Quaternion } from '../rotation';
import { type Operation } from '../groups/operation';
import { type PointGroup } from '../pointGroup';

/** Order of the real d orbitals throughout. */
export const dOrbitals = ['z2', 'x2-y2', 'xy', 'xz', 'yz'] as const;

const third = 1 / Math.sqrt(6);
const half = Math.SQRT1_2;
/** d_a ∝ rᵀ Q_a r with symmetric traceless Q_a of unit norm: [xx, yy, zz, xy, xz, yz]. */
const quadrics: readonly (readonly [number, number, number, number, number, number])[] = [
  [-third, -third, 2 * third, 0, 0, 0],
  [half, -half, 0, 0, 0, 0],
  [0, 0, 0, half, 0, 0],
  [0, 0, 0, 0, half, 0],
  [0, 0, 0, 0, 0, half],
];
const square = ([xx, yy, zz, xy, xz, yz]: (typeof quadrics)[number]): Matrix3 => [
  [xx, xy, xz],
  [xy, yy, yz],
  [xz, yz, zz],
];
const squares = quadrics.map(square);

/**
 * How a rotation acts on the real d orbitals: R d_b = Σ_a d_a D[a][b], D[a][b] = tr(Q_a R Q_b Rᵀ).
 * Orthogonal 5×5, rows and columns in the order of `dOrbitals`. The inversion does nothing to d orbitals.
 */
export function dRotation(rotation: Quaternion): number[][] {
  const r = rotationMatrix(rotation);
  const turned = squares.map((q) => {
    const rq = r.map((row) =>
      [0, 1, 2].map((j) => row[0] * q[0][j]! + row[1] * q[1][j]! + row[2] * q[2][j]!),
    );
    return rq.map((row) =>
      [0, 1, 2].map((j) => row[0]! * r[j]![0] + row[1]! * r[j]![1] + row[2]! * r[j]![2]),
    );
  });
  return squares.map((q) =>
    turned.map((m) =>
      q.reduce((sum, row, i) => sum + row.reduce((s, value, j) => s + value * m[i]![j]!, 0), 0),
    ),
  );
}

/** Rotation of a spin 1/2 in the basis α, β: cos(θ/2) − i n·σ sin(θ/2), as [row][column] = [real, imaginary]. */
export function spinRotation([w, x, y, z]: Quaternion): [number, number][][] {
  return [
    [
      [w, -z],
      [-y, -x],
    ],
    [
      [y, -x],
      [w, z],
    ],
  ];
}

/** Character of an operation on an even function space of angular momentum j (integer or half-integer): sin((2j+1)θ/2)/sin(θ/2). */
export function angularMomentumCharacter(twiceJ: number, { rotation }: Operation): number {
  let total = 0;
  const half = Math.atan2(Math.hypot(rotation[1], rotation[2], rotation[3]), rotation[0]);
  for (let m = -twiceJ; m <= twiceJ; m += 2) total += Math.cos(m * half);
  return total;
}

/** Character of even states of angular momentum j on the classes of a group: how a J level or an L term splits. */
export const angularMomentumRepresentation = (group: PointGroup, twiceJ: number): number[] =>
  group.classes.map(({ representative }) => angularMomentumCharacter(twiceJ, representative));
