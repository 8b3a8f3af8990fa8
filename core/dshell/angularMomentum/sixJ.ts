import { factorials as f, isTriangle, parity, triangleFactor } from './factorials';

/** Wigner 6j symbol {a b c; d e g} by Racah's sum (G. Racah, Phys. Rev. 62, 438, 1942). */
export function sixJ(a: number, b: number, c: number, d: number, e: number, g: number): number {
  if (!isTriangle(a, b, c) || !isTriangle(a, e, g) || !isTriangle(d, b, g) || !isTriangle(d, e, c)) return 0;
  const norm = Math.sqrt(
    triangleFactor(a, b, c) * triangleFactor(a, e, g) * triangleFactor(d, b, g) * triangleFactor(d, e, c),
  );
  const from = Math.max(a + b + c, a + e + g, d + b + g, d + e + c);
  const to = Math.min(a + b + d + e, b + c + e + g, a + c + d + g);
  let sum = 0;
  for (let t = from; t <= to; t++) {
    const product =
      f[t - a - b - c]! *
      f[t - a - e - g]! *
      f[t - d - b - g]! *
      f[t - d - e - c]! *
      f[a + b + d + e - t]! *
      f[b + c + e + g - t]! *
      f[a + c + d + g - t]!;
    sum += (parity(t) * f[t + 1]!) / product;
  }
  return norm * sum;
}
