import { factorials as f, parity } from './factorials';

/** Wigner's d^j_{mk}(β) = ⟨j m| exp(−iβ J_y) |j k⟩ (E. P. Wigner, Group Theory, 1959, chapter 15). */
export function smallRotation(j: number, m: number, k: number, beta: number): number {
  const c = Math.cos(beta / 2);
  const s = Math.sin(beta / 2);
  const norm = Math.sqrt(f[j + m]! * f[j - m]! * f[j + k]! * f[j - k]!);
  let sum = 0;
  for (let t = Math.max(0, k - m); t <= Math.min(j + k, j - m); t++) {
    const product = f[j + k - t]! * f[t]! * f[m - k + t]! * f[j - m - t]!;
    sum += ((parity(m - k + t) * c ** (2 * j + k - m - 2 * t) * s ** (m - k + 2 * t)) / product) * norm;
  }
  return sum;
}
