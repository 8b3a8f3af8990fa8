/**
 * A proper rotation as a unit quaternion [w, x, y, z] = [cos(θ/2), n sin(θ/2)]. The sign is kept: q and −q are the same
 * rotation in space and opposite rotations of a spin 1/2, which is all a double group needs.
 */
export type Quaternion = readonly [number, number, number, number];
export type Vector3 = readonly [number, number, number];
export type Matrix3 = readonly [Vector3, Vector3, Vector3];

export const identityRotation: Quaternion = [1, 0, 0, 0];

/** Right-handed rotation by `angle` (radian) about `axis` (any length but zero). */
export function rotationAbout(axis: Vector3, angle: number): Quaternion {
  const scale = Math.sin(angle / 2) / Math.hypot(...axis);
  return [Math.cos(angle / 2), axis[0] * scale, axis[1] * scale, axis[2] * scale];
}

/** `a` after `b`. */
export function compose(a: Quaternion, b: Quaternion): Quaternion {
  const [aw, ax, ay, az] = a;
  const [bw, bx, by, bz] = b;
  return [
    aw * bw - ax * bx - ay * by - az * bz,
    aw * bx + ax * bw + ay * bz - az * by,
    aw * by - ax * bz + ay * bw + az * bx,
    aw * bz + ax * by - ay * bx + az * bw,
  ];
}

export const inverseRotation = ([w, x, y, z]: Quaternion): Quaternion => [w, -x, -y, -z];
export const opposite = ([w, x, y, z]: Quaternion): Quaternion => [-w, -x, -y, -z];

/** The 3×3 matrix that rotates vectors: v' = R v. */
export function rotationMatrix([w, x, y, z]: Quaternion): Matrix3 {
  return [
    [1 - 2 * (y * y + z * z), 2 * (x * y - w * z), 2 * (x * z + w * y)],
    [2 * (x * y + w * z), 1 - 2 * (x * x + z * z), 2 * (y * z - w * x)],
    [2 * (x * z - w * y), 2 * (y * z + w * x), 1 - 2 * (x * x + y * y)],
  ];
}

export function rotate(q: Quaternion, [x, y, z]: Vector3): Vector3 {
  const m = rotationMatrix(q);
  return [
    m[0][0] * x + m[0][1] * y + m[0][2] * z,
    m[1][0] * x + m[1][1] * y + m[1][2] * z,
    m[2][0] * x + m[2][1] * y + m[2][2] * z,
  ];
}

export const dot = (a: Vector3, b: Vector3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
export const cross = (a: Vector3, b: Vector3): Vector3 => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
export function normalise(v: Vector3): Vector3 {
  const length = Math.hypot(...v);
  return [v[0] / length, v[1] / length, v[2] / length];
}

/** The rotation whose matrix has the columns x, y, z (a right-handed orthonormal frame): it carries the axes onto them. */
export function rotationToFrame(x: Vector3, y: Vector3, z: Vector3): Quaternion {
  const trace = x[0] + y[1] + z[2];
  // The largest of the four squares is taken as pivot, so that nothing is divided by a small number (Shepperd 1978).
  const squares = [trace, x[0], y[1], z[2]];
  const pivot = squares.indexOf(Math.max(...squares));
  let q: Quaternion;
  if (pivot === 0) q = [1 + trace, y[2] - z[1], z[0] - x[2], x[1] - y[0]];
  else if (pivot === 1) q = [y[2] - z[1], 1 + 2 * x[0] - trace, x[1] + y[0], z[0] + x[2]];
  else if (pivot === 2) q = [z[0] - x[2], x[1] + y[0], 1 + 2 * y[1] - trace, y[2] + z[1]];
  else q = [x[1] - y[0], z[0] + x[2], y[2] + z[1], 1 + 2 * z[2] - trace];
  const length = Math.hypot(...q);
  return [q[0] / length, q[1] / length, q[2] / length, q[3] / length];
}
