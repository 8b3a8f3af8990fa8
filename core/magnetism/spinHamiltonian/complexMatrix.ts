import { hermitianEigensystem } from '../../numerics/eigen/hermitian';

/** Square complex matrix, row-major. */
export interface ComplexMatrix {
  readonly size: number;
  readonly re: Float64Array;
  readonly im: Float64Array;
}

export function multiply(A: ComplexMatrix, B: ComplexMatrix): ComplexMatrix {
  const n = A.size;
  const out = { size: n, re: new Float64Array(n * n), im: new Float64Array(n * n) };
  for (let i = 0; i < n; i++) {
    for (let k = 0; k < n; k++) {
      const [x, y] = [A.re[i * n + k]!, A.im[i * n + k]!];
      for (let j = 0; j < n; j++) {
        out.re[i * n + j]! += x * B.re[k * n + j]! - y * B.im[k * n + j]!;
        out.im[i * n + j]! += x * B.im[k * n + j]! + y * B.re[k * n + j]!;
      }
    }
  }
  return out;
}

export function adjoint({ size: n, re, im }: ComplexMatrix): ComplexMatrix {
  const out = { size: n, re: new Float64Array(n * n), im: new Float64Array(n * n) };
  for (let i = 0; i < n; i++) {
    for (let j = 0; j < n; j++) {
      out.re[j * n + i] = re[i * n + j]!;
      out.im[j * n + i] = -im[i * n + j]!;
    }
  }
  return out;
}

/**
 * Power of a positive Hermitian matrix. `matrix` is null where an eigenvalue is below `least`; `smallest` is the smallest
 * eigenvalue.
 */
export function hermitianPower(
  { size: n, re, im }: ComplexMatrix,
  exponent: number,
  least: number,
): { matrix: ComplexMatrix | null; smallest: number } {
  const interleaved = new Float64Array(2 * n * n);
  re.forEach((value, i) => {
    interleaved[2 * i] = value;
    interleaved[2 * i + 1] = im[i]!;
  });
  const { values, vectors } = hermitianEigensystem(interleaved, n);
  const smallest = values[0]!;
  if (!(smallest >= least)) return { matrix: null, smallest };
  const matrix = { size: n, re: new Float64Array(n * n), im: new Float64Array(n * n) };
  for (let k = 0; k < n; k++) {
    const factor = values[k]! ** exponent;
    const at = (i: number): [number, number] => [vectors[2 * (k * n + i)]!, vectors[2 * (k * n + i) + 1]!];
    for (let i = 0; i < n; i++) {
      const [a, b] = at(i);
      for (let j = 0; j < n; j++) {
        const [c, d] = at(j);
        matrix.re[i * n + j]! += factor * (a * c + b * d);
        matrix.im[i * n + j]! += factor * (b * c - a * d);
      }
    }
  }
  return { matrix, smallest };
}
