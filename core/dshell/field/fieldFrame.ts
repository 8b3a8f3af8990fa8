import { symmetricEigensystem } from '../../numerics/eigen/symmetric';
import {
  compose,
  cross,
  dRotation,
  identityRotation,
  rotationAbout,
  rotationToFrame,
  type Quaternion,
  type Vector3,
} from '../../symmetry';
import { fieldComponents, type FieldGroup } from '../adaptation/species';
import { fieldTensors, type FieldMatrix, type FieldTensors } from './tensorComponents';

/** The symmetry of a field and the frame in which it shows. */
export interface FieldFrame {
  readonly group: FieldGroup;
  /** Carries the axes of the laboratory onto those of the frame (z main axis, y twofold axis). */
  readonly rotation: Quaternion;
  /** The field seen from the frame, components foreign to the group left out. */
  readonly tensors: FieldTensors;
}

/** A foreign component up to this size (cm⁻¹, and relative to the whole field) is taken for rounding. */
const absoluteRounding = 1e-7;
const relativeRounding = 1e-11;

/** The 5×5 seen from a turned frame: ⟨R d_a|V|R d_b⟩. */
export function turnedField(V: FieldMatrix, rotation: Quaternion): number[][] {
  const D = dRotation(rotation);
  const indices = [0, 1, 2, 3, 4];
  const VD = V.map((row) => indices.map((b) => row.reduce((sum, value, c) => sum + value * D[c]![b]!, 0)));
  return indices.map((a) => indices.map((b) => indices.reduce((sum, c) => sum + D[c]![a]! * VD[c]![b]!, 0)));
}

const groups: readonly FieldGroup[] = ['SO3', 'O', 'Dinf', 'D4', 'D3', 'D2', 'C2', 'C1'];

/**
 * The largest rotation group that leaves a field unchanged, with its frame. A frame that is nearly but not exactly one of
 * symmetry is never rounded to it: the smaller group is used and the energies stay exact.
 */
export function fieldFrame(V: FieldMatrix): FieldFrame {
  const scale = fieldScale(fieldTensors(V));
  const rounding = Math.max(absoluteRounding, relativeRounding * scale);
  if (scale <= rounding) return inFrame(V, identityRotation, rounding);
  let best = inFrame(V, identityRotation, rounding);
  for (const rotation of candidateFrames(V, scale, rounding)) {
    const candidate = inFrame(V, rotation, rounding);
    if (groups.indexOf(candidate.group) < groups.indexOf(best.group)) best = candidate;
  }
  return best;
}

/** The largest group that shows in the laboratory frame itself. */
export function inStandardFrame(V: FieldMatrix): FieldFrame {
  const scale = fieldScale(fieldTensors(V));
  return inFrame(V, identityRotation, Math.max(absoluteRounding, relativeRounding * scale));
}

/** The largest group whose components, in the frame as it is, are all that the field has. */
function inFrame(V: FieldMatrix, rotation: Quaternion, rounding: number): FieldFrame {
  const tensors = fieldTensors(turnedField(V, rotation));
  const group = groups.find((each) => {
    if (each === 'O' && !isCubic(tensors, rounding)) return false;
    return fieldScale(without(tensors, each)) <= rounding;
  })!;
  return { group, rotation, tensors: subtract(tensors, without(tensors, group)) };
}

/** A cubic field on x, y, z has Re v_44 = √(5/14) v_40. */
function isCubic({ re }: FieldTensors, rounding: number): boolean {
  return Math.abs(re[4][4]! - Math.sqrt(5 / 14) * re[4][0]!) <= rounding;
}

function mapTensors(
  tensors: FieldTensors,
  change: (value: number, k: 2 | 4, q: number, part: 're' | 'im') => number,
): FieldTensors {
  const part = (name: 're' | 'im') => ({
    2: tensors[name][2].map((value, q) => change(value, 2, q, name)),
    4: tensors[name][4].map((value, q) => change(value, 4, q, name)),
  });
  return { trace: tensors.trace, re: part('re'), im: part('im') };
}

/** The components that a field of the group cannot have. */
function without(tensors: FieldTensors, group: FieldGroup): FieldTensors {
  const allowed = fieldComponents[group];
  return mapTensors(tensors, (value, k, q, part) =>
    allowed.some((each) => each.k === k && each.q === q && each.part === part) ? 0 : value,
  );
}

const subtract = (a: FieldTensors, b: FieldTensors): FieldTensors =>
  mapTensors(a, (value, k, q, part) => value - b[part][k][q]!);

/** Largest component. */
function fieldScale({ re, im }: FieldTensors): number {
  return Math.max(...[re[2], re[4], im[2], im[4]].flat().map(Math.abs));
}

/** Frames worth trying, from axes that the field itself distinguishes. */
function candidateFrames(V: FieldMatrix, scale: number, rounding: number): Quaternion[] {
  const shape = V.map((row, a) =>
    row.map((value, b) => (value - (a === b ? V.reduce((sum, r, c) => sum + r[c]!, 0) / 5 : 0)) / scale),
  );
  const { axes, values } = principalAxes(covariant(shape));
  const [low, middle, high] = values as [number, number, number];
  const same = 1e-9;
  if (high - low < same) return cubicFrames(shape);
  if (middle - low > same && high - middle > same) {
    const [a, b, c] = axes as [Vector3, Vector3, Vector3];
    return [rotationToFrame(b, c, a), rotationToFrame(c, a, b), rotationToFrame(a, b, c)];
  }
  const main = middle - low > same ? axes[0]! : axes[2]!;
  return axialFrames(V, high - middle > same ? axes[2]! : main, rounding);
}

const quadrics: readonly number[][][] = (() => {
  const t = 1 / Math.sqrt(6);
  const h = Math.SQRT1_2;
  return [
    [
      [-t, 0, 0],
      [0, -t, 0],
      [0, 0, 2 * t],
    ],
    [
      [h, 0, 0],
      [0, -h, 0],
      [0, 0, 0],
    ],
    [
      [0, h, 0],
      [h, 0, 0],
      [0, 0, 0],
    ],
    [
      [0, 0, h],
      [0, 0, 0],
      [h, 0, 0],
    ],
    [
      [0, 0, 0],
      [0, 0, h],
      [0, h, 0],
    ],
  ];
})();

const product = (a: readonly (readonly number[])[], b: readonly (readonly number[])[]): number[][] =>
  a.map((row) => b[0]!.map((_, j) => row.reduce((sum, value, k) => sum + value * b[k]![j]!, 0)));

/**
 * A symmetric 3×3 that turns with the field: Σ f(V)_ab Q_a Q_b with d_a ∝ rᵀ Q_a r and a polynomial f of no special form,
 * so that its axes are axes of the field's symmetry.
 */
function covariant(V: readonly (readonly number[])[]): number[][] {
  const square = product(V, V);
  const cube = product(square, V);
  const fourth = product(square, square);
  const result = [
    [0, 0, 0],
    [0, 0, 0],
    [0, 0, 0],
  ];
  for (let a = 0; a < 5; a++) {
    for (let b = 0; b < 5; b++) {
      const weight = V[a]![b]! + 0.71 * square[a]![b]! + 0.43 * cube[a]![b]! + 0.29 * fourth[a]![b]!;
      const qq = product(quadrics[a]!, quadrics[b]!);
      for (let i = 0; i < 3; i++)
        for (let j = 0; j < 3; j++) result[i]![j]! += weight * 0.5 * (qq[i]![j]! + qq[j]![i]!);
    }
  }
  return result;
}

function principalAxes(matrix: readonly (readonly number[])[]): { values: number[]; axes: Vector3[] } {
  const { values, vectors } = symmetricEigensystem(Float64Array.from(matrix.flat()), 3);
  const axes = [0, 1, 2].map((k): Vector3 => [vectors[3 * k]!, vectors[3 * k + 1]!, vectors[3 * k + 2]!]);
  // A right-handed set.
  const third = cross(axes[0]!, axes[1]!);
  return { values: Array.from(values), axes: [axes[0]!, axes[1]!, third] };
}

/** Fourfold axes of a cubic field: a quadric of the doubly degenerate pair is diagonal in them. */
function cubicFrames(V: readonly (readonly number[])[]): Quaternion[] {
  const { values, vectors } = symmetricEigensystem(Float64Array.from(V.flat()), 5);
  const pair = values[1]! - values[0]! < values[4]! - values[3]! ? [0, 1] : [3, 4];
  const isPair = values[2]! - values[1]! > values[3]! - values[2]! ? [0, 1] : [3, 4];
  return [pair, isPair].map(([first, second]) => {
    const mixed = quadrics[0]!.map((row, i) =>
      row.map((_, j) =>
        quadrics.reduce(
          (sum, Q, a) => sum + (vectors[5 * first! + a]! + 0.3 * vectors[5 * second! + a]!) * Q[i]![j]!,
          0,
        ),
      ),
    );
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
