import { tridiagonalEigenvalues, tridiagonalEigenvectors } from './tridiagonal';

/**
 * Householder reduction of a symmetric matrix to tridiagonal form, row by row from the last: every inner loop runs over
 * contiguous memory. Only the lower triangle of the row-major `a` is read; on return the rows below the diagonal hold the
 * Householder vectors and `scales[i]` half their squared length (0 where nothing was done). `offDiagonal[i]` couples
 * i and i + 1. (Householder 1958; Wilkinson and Reinsch 1971, contribution II/2.)
 */
function reduce(
  a: Float64Array,
  n: number,
  diagonal: Float64Array,
  offDiagonal: Float64Array,
  scales: Float64Array,
): void {
  const p = new Float64Array(n);
  for (let i = n - 1; i > 0; i--) {
    const row = i * n;
    diagonal[i] = a[row + i]!;
    const last = a[row + i - 1]!;
    let tail = 0;
    for (let k = 0; k < i - 1; k++) tail += a[row + k]! * a[row + k]!;
    if (tail === 0) {
      offDiagonal[i - 1] = last;
      scales[i] = 0;
      continue;
    }
    const length = Math.sqrt(tail + last * last);
    const signed = last >= 0 ? -length : length;
    offDiagonal[i - 1] = signed;
    a[row + i - 1] = last - signed;
    // u = row; half its squared length.
    const h = length * length - last * signed;
    scales[i] = h;
    for (let k = 0; k < i; k++) p[k] = 0;
    for (let j = 0; j < i; j++) {
      const at = j * n;
      const uj = a[row + j]!;
      let sum = a[at + j]! * uj;
      for (let k = 0; k < j; k++) {
        const value = a[at + k]!;
        sum += value * a[row + k]!;
        p[k]! += value * uj;
      }
      p[j]! += sum;
    }
    let up = 0;
    for (let k = 0; k < i; k++) up += p[k]! * a[row + k]!;
    const shift = up / (2 * h * h);
    for (let k = 0; k < i; k++) p[k] = p[k]! / h - shift * a[row + k]!;
    for (let j = 0; j < i; j++) {
      const at = j * n;
      const uj = a[row + j]!;
      const pj = p[j]!;
      for (let k = 0; k <= j; k++) a[at + k]! -= uj * p[k]! + pj * a[row + k]!;
    }
  }
  diagonal[0] = a[0]!;
}

/**
 * Eigenvalues, ascending, of the real symmetric row-major n × n matrix `a`, of which the lower triangle is read and
 * destroyed. Throws `no-convergence`.
 */
export function symmetricEigenvalues(a: Float64Array, n: number, values = new Float64Array(n)): Float64Array {
  if (n === 0) return values;
  const offDiagonal = new Float64Array(n);
  reduce(a, n, values, offDiagonal, new Float64Array(n));
  tridiagonalEigenvalues(values, offDiagonal, n);
  return values;
}

export interface Eigensystem {
  /** Ascending. */
  readonly values: Float64Array;
  /** Row k (of length n) is the normalised eigenvector of `values[k]`. */
  readonly vectors: Float64Array;
}

/** Eigenvalues and eigenvectors; `a` as in `symmetricEigenvalues`. Throws `no-convergence`. */
export function symmetricEigensystem(a: Float64Array, n: number): Eigensystem {
  const values = new Float64Array(n);
  const vectors = new Float64Array(n * n);
  if (n === 0) return { values, vectors };
  const offDiagonal = new Float64Array(n);
  const scales = new Float64Array(n);
  reduce(a, n, values, offDiagonal, scales);
  for (let i = 0; i < n; i++) vectors[i * n + i] = 1;
  tridiagonalEigenvectors(values, offDiagonal, vectors, n, n);
  for (let k = 0; k < n; k++) undoReflections(a, n, scales, vectors, k * n);
  return { values, vectors };
}

/** Takes one eigenvector of the tridiagonal matrix back to the original basis, in place. */
function undoReflections(
  a: Float64Array,
  n: number,
  scales: Float64Array,
  vectors: Float64Array,
  at: number,
): void {
  for (let i = 1; i < n; i++) {
    const h = scales[i]!;
    if (h === 0) continue;
    const row = i * n;
    let sum = 0;
    for (let k = 0; k < i; k++) sum += a[row + k]! * vectors[at + k]!;
    sum /= h;
    for (let k = 0; k < i; k++) vectors[at + k]! -= sum * a[row + k]!;
  }
}
