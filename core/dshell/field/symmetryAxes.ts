import { symmetricEigensystem } from '../../numerics/eigen/symmetric';
import {
  compose,
  cross,
  dRotation,
  rotationAbout,
  rotationToFrame,
  type Quaternion,
  type Vector3,
} from '../../symmetry';
import { fieldTensors, fieldTrace, type FieldMatrix } from './tensorComponents';

/** Principal values nearer than this, for a field of unit size, are not told apart. */
const coincident = 1e-9;

/**
 * Frames in which the field may show more symmetry than in any other, from axes that the field itself distinguishes.
 * `scale` is its size, `rounding` what counts as zero.
 */
export function candidateFrames(V: FieldMatrix, scale: number, rounding: number): Quaternion[] {
  const centre = fieldTrace(V) / 5;
  const shape = V.map((row, a) => row.map((value, b) => (a === b ? value - centre : value) / scale));
  const { axes, values } = principalAxes(covariant(shape));
  const [low, middle, high] = [values[0]!, values[1]!, values[2]!];
  if (high - low < coincident) return cubicFrames(shape);
  if (middle - low < coincident) return axialFrames(V, axes[2]!, rounding);
  if (high - middle < coincident) return axialFrames(V, axes[0]!, rounding);
  return twofoldFrames(shape, axes, rounding / scale);
}

type Matrix = readonly (readonly number[])[];

const third = 1 / Math.sqrt(6);
const half = Math.SQRT1_2;
/** d_a ∝ rᵀ Q_a r with symmetric traceless Q_a of unit norm. */
const quadrics: readonly Matrix[] = [
  [
    [-third, 0, 0],
    [0, -third, 0],
    [0, 0, 2 * third],
  ],
  [
    [half, 0, 0],
    [0, -half, 0],
    [0, 0, 0],
  ],
  [
    [0, half, 0],
    [half, 0, 0],
    [0, 0, 0],
  ],
  [
    [0, 0, half],
    [0, 0, 0],
    [half, 0, 0],
  ],
  [
    [0, 0, 0],
    [0, 0, half],
    [0, half, 0],
  ],
];

function product(a: Matrix, b: Matrix): number[][] {
  const n = a.length;
  const out: number[][] = [];
  for (let i = 0; i < n; i++) {
    const row: number[] = [];
    for (let j = 0; j < n; j++) {
      let sum = 0;
      for (let k = 0; k < n; k++) sum += a[i]![k]! * b[k]![j]!;
      row.push(sum);
    }
    out.push(row);
  }
  return out;
}

/** ½(Q_a Q_b + Q_b Q_a), row-major 3×3. */
const quadricProducts: readonly (readonly number[][])[] = quadrics.map((A) =>
  quadrics.map((B) => {
    const [ab, ba] = [product(A, B), product(B, A)];
    return ab.flatMap((row, i) => row.map((value, j) => 0.5 * (value + ba[i]![j]!)));
  }),
);

/**
 * A symmetric 3×3 that turns with the field: Σ f(V)_ab Q_a Q_b with a polynomial f of no special form, so that its axes are
 * axes of the field's symmetry. Row-major.
 */
function covariant(V: Matrix): Float64Array {
  const square = product(V, V);
  const cube = product(square, V);
  const fourth = product(square, square);
  const result = new Float64Array(9);
  for (let a = 0; a < 5; a++) {
    for (let b = 0; b < 5; b++) {
      const weight = V[a]![b]! + 0.71 * square[a]![b]! + 0.43 * cube[a]![b]! + 0.29 * fourth[a]![b]!;
      const qq = quadricProducts[a]![b]!;
      for (let i = 0; i < 9; i++) result[i]! += weight * qq[i]!;
    }
  }
  return result;
}

/** Right-handed axes, ascending by value. */
function principalAxes(matrix: Float64Array): { values: Float64Array; axes: Vector3[] } {
  const { values, vectors } = symmetricEigensystem(matrix, 3);
  const axis = (k: number): Vector3 => [vectors[3 * k]!, vectors[3 * k + 1]!, vectors[3 * k + 2]!];
  const [x, y] = [axis(0), axis(1)];
  return { values, axes: [x, y, cross(x, y)] };
}

/** Fourfold axes of a cubic field: a quadric of the doubly degenerate pair is diagonal in them. */
function cubicFrames(V: Matrix): Quaternion[] {
  const { vectors } = symmetricEigensystem(Float64Array.from(V.flat()), 5);
  return [
    [0, 1],
    [3, 4],
  ].map(([first, second]) => {
    const mixed = new Float64Array(9);
    quadrics.forEach((Q, a) => {
      const weight = vectors[5 * first! + a]! + 0.3 * vectors[5 * second! + a]!;
      Q.flat().forEach((value, i) => (mixed[i]! += weight * value));
    });
    const [x, y, z] = principalAxes(mixed).axes as [Vector3, Vector3, Vector3];
    return rotationToFrame(x, y, z);
  });
}

/** Frames about one axis, turned so that the threefold or fourfold component is real. */
function axialFrames(V: FieldMatrix, axis: Vector3, rounding: number): Quaternion[] {
  const helper: Vector3 = Math.abs(axis[0]) < 0.8 ? [1, 0, 0] : [0, 1, 0];
  const side = cross(axis, helper);
  const length = Math.hypot(...side);
  const x: Vector3 = [side[0] / length, side[1] / length, side[2] / length];
  const standing = rotationToFrame(x, cross(axis, x), axis);
  const { re, im } = fieldTensors(turnedField(V, standing));
  const frames = [standing];
  for (const q of [3, 4]) {
    if (Math.hypot(re[4][q]!, im[4][q]!) <= rounding) continue;
    const phase = Math.atan2(im[4][q]!, re[4][q]!);
    for (const turn of [phase / q, -phase / q])
      frames.push(compose(standing, rotationAbout([0, 0, 1], turn)));
  }
  return frames;
}

/** Orbitals that a turn by π about x, y or z reverses. */
const reversedBy = { x: [2, 3], y: [2, 4], z: [3, 4] } as const;

/** Frames on three distinct axes, with a twofold one, where there is any, as z. `shape` is of unit size. */
function twofoldFrames(shape: Matrix, [x, y, z]: readonly Vector3[], rounding: number): Quaternion[] {
  const seen = turnedField(shape, rotationToFrame(x!, y!, z!));
  const isTwofold = (axis: keyof typeof reversedBy): boolean => {
    const odd: readonly number[] = reversedBy[axis];
    return seen.every((row, a) =>
      row.every((value, b) => odd.includes(a) === odd.includes(b) || Math.abs(value) <= 10 * rounding),
    );
  };
  const frames: Quaternion[] = [];
  if (isTwofold('z')) frames.push(rotationToFrame(x!, y!, z!));
  if (isTwofold('y')) frames.push(rotationToFrame(z!, x!, y!));
  if (isTwofold('x')) frames.push(rotationToFrame(y!, z!, x!));
  return frames;
}

/** The 5×5 seen from a turned frame: ⟨R d_a|V|R d_b⟩. */
export function turnedField(V: FieldMatrix, rotation: Quaternion): number[][] {
  const D = dRotation(rotation);
  const transposed = D.map((_, a) => D.map((row) => row[a]!));
  return product(product(transposed, V), D);
}
