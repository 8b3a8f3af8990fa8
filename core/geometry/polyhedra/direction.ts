import { type Vector3 } from '../../symmetry';

const radian = Math.PI / 180;

/** Unit vector at polar angle `theta` from z and azimuth `phi` from x, both in degrees. */
export function direction(theta: number, phi: number): Vector3 {
  const [t, p] = [theta * radian, phi * radian];
  return [Math.sin(t) * Math.cos(p), Math.sin(t) * Math.sin(p), Math.cos(t)];
}

/** Polar angle and azimuth (0 to 360) of a vector in degrees; azimuth 0 on the z axis. */
export function anglesOf([x, y, z]: Vector3): { theta: number; phi: number } {
  const theta = Math.atan2(Math.hypot(x, y), z) / radian;
  const onAxis = Math.hypot(x, y) < 1e-9 * Math.hypot(x, y, z);
  const phi = onAxis ? 0 : Math.atan2(y, x) / radian;
  return { theta, phi: phi < -1e-9 ? phi + 360 : Math.max(phi, 0) };
}

/** Angle between two vectors in degrees. */
export function angleBetween(a: Vector3, b: Vector3): number {
  const cross = Math.hypot(a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]);
  return Math.atan2(cross, a[0] * b[0] + a[1] * b[1] + a[2] * b[2]) / radian;
}
