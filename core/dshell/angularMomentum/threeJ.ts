import { factorials as f, isTriangle, parity, triangleFactor } from './factorials';

/**
 * Wigner 3j symbol (j1 j2 j3; m1 m2 m3) by Racah's sum (G. Racah, Phys. Rev. 62, 438, 1942). Integer or half-integer
 * arguments; zero where the selection rules fail.
 */
export function threeJ(j1: number, j2: number, j3: number, m1: number, m2: number, m3: number): number {
  if (m1 + m2 + m3 !== 0 || !isTriangle(j1, j2, j3)) return 0;
  if (Math.abs(m1) > j1 || Math.abs(m2) > j2 || Math.abs(m3) > j3) return 0;
  const from = Math.max(0, j2 - j3 - m1, j1 - j3 + m2);
  const to = Math.min(j1 + j2 - j3, j1 - m1, j2 + m2);
  let sum = 0;
  for (let t = from; t <= to; t++) {
    const product =
      f[t]! *
      f[j3 - j2 + t + m1]! *
      f[j3 - j1 + t - m2]! *
      f[j1 + j2 - j3 - t]! *
      f[j1 - t - m1]! *
      f[j2 - t + m2]!;
    sum += parity(t) / product;
  }
  const norm =
    triangleFactor(j1, j2, j3) *
    f[j1 + m1]! *
    f[j1 - m1]! *
    f[j2 + m2]! *
    f[j2 - m2]! *
    f[j3 + m3]! *
    f[j3 - m3]!;
  return parity(j1 - j2 - m3) * Math.sqrt(norm) * sum;
}

/** Clebsch-Gordan coefficient ⟨j1 m1 j2 m2 | j m⟩ with the phases of Condon and Shortley. */
export function clebschGordan(j1: number, m1: number, j2: number, m2: number, j: number, m: number): number {
  return parity(j1 - j2 + m) * Math.sqrt(2 * j + 1) * threeJ(j1, j2, j, m1, m2, -m);
}
