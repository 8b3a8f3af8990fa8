import {
  compose,
  inverseRotation,
  opposite,
  rotate,
  rotationAbout,
  type Quaternion,
  type Vector3,
} from '../rotation';

/**
 * A symmetry operation: a proper rotation, followed by the inversion where `parity` is −1. The inversion leaves a spin
 * alone, so the quaternion alone says what happens to spins.
 */
export interface Operation {
  readonly rotation: Quaternion;
  readonly parity: 1 | -1;
}

const quarter = Math.PI / 2;
const axes = { x: [1, 0, 0], y: [0, 1, 0], z: [0, 0, 1] } as const;
export type Axis = keyof typeof axes | Vector3;
const vector = (axis: Axis): Vector3 => (typeof axis === 'string' ? axes[axis] : axis);

/** C_n: rotation by 2π/n. */
export const properRotation = (n: number, axis: Axis = 'z'): Operation => ({
  rotation: rotationAbout(vector(axis), (2 * Math.PI) / n),
  parity: 1,
});
/** S_n: rotation by 2π/n, then reflection in the plane across the axis; that reflection is C_2 times the inversion. */
export const rotoreflection = (n: number, axis: Axis = 'z'): Operation => ({
  rotation: rotationAbout(vector(axis), (2 * Math.PI) / n + 2 * quarter),
  parity: -1,
});
/** Reflection in the plane across `normal`. */
export const reflection = (normal: Axis): Operation => ({
  rotation: rotationAbout(vector(normal), 2 * quarter),
  parity: -1,
});
export const inversion: Operation = { rotation: [1, 0, 0, 0], parity: -1 };
export const identity: Operation = { rotation: [1, 0, 0, 0], parity: 1 };

export const multiply = (a: Operation, b: Operation): Operation => ({
  rotation: compose(a.rotation, b.rotation),
  parity: a.parity === b.parity ? 1 : -1,
});
export const invert = (a: Operation): Operation => ({
  rotation: inverseRotation(a.rotation),
  parity: a.parity,
});
/** The same operation in space, turned once more by 2π: other sign on a spin 1/2. */
export const barred = (a: Operation): Operation => ({ rotation: opposite(a.rotation), parity: a.parity });

/** Where the operation takes a point. */
export function carry(a: Operation, point: Vector3): Vector3 {
  const [x, y, z] = rotate(a.rotation, point);
  return [a.parity * x, a.parity * y, a.parity * z];
}

/** The operation seen from a frame turned by `frame`: F a F⁻¹. */
export const turned = (a: Operation, frame: Quaternion): Operation => ({
  rotation: compose(compose(frame, a.rotation), inverseRotation(frame)),
  parity: a.parity,
});

/** Rounded text that is the same for equal operations (as elements of the double group). */
export function operationKey({ rotation, parity }: Operation): string {
  return `${parity}:${rotation.map((c) => (Math.round(c * 1e6) || 0).toString(36)).join(',')}`;
}
