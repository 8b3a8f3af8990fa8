import { tridiagonalEigenvalues, tridiagonalEigenvectors } from './tridiagonal';
import { scratchVectors } from './workspace';

const reductionScratch = scratchVectors(4);

/**
 * Householder reduction of a symmetric matrix to tridiagonal form, row by row from the last: every inner loop runs over
 * contiguous memory, and the update of one step and the product of the next share one pass. Only the lower triangle of the
 * row-major `a` is read; on return the rows below the diagonal hold the Householder vectors and `scales[i]` half their
 * squared length (0 where nothing was done). `offDiagonal[i]` couples i and i + 1.
 * (Householder 1958; Wilkinson and Reinsch 1971, contribution II/2.)
 */
function reduce(
  a: Float64Array,
  n: number,
  diagonal: Float64Array,
  offDiagonal: Float64Array,
  scales: Float64Array,
): void {
  let [u, q, v, p] = reductionScratch(n) as [Float64Array, Float64Array, Float64Array, Float64Array];
  // Whether A − q uᵀ − u qᵀ of the step before is still to be carried out on the rows above.
  let pending = false;
  for (let i = n - 1; i > 0; i--) {
    const row = i * n;
    if (pending) subtractFromRow(a, row, i + 1, u, q, i);
    diagonal[i] = a[row + i]!;
    const last = a[row + i - 1]!;
    let tail = 0;
    for (let k = 0; k < i - 1; k++) tail += a[row + k]! * a[row + k]!;
    if (tail === 0) {
      offDiagonal[i - 1] = last;
      scales[i] = 0;
      if (pending) for (let j = 0; j < i; j++) subtractFromRow(a, j * n, j + 1, u, q, j);
      pending = false;
      continue;
    }
    const length = Math.sqrt(tail + last * last);
    const signed = last >= 0 ? -length : length;
    offDiagonal[i - 1] = signed;
    a[row + i - 1] = last - signed;
    const h = length * length - last * signed;
    scales[i] = h;
    for (let k = 0; k < i; k++) {
      v[k] = a[row + k]!;
      p[k] = 0;
    }
    if (pending) updateAndMultiply(a, n, i, u, q, v, p);
    else multiply(a, n, i, v, p);
    let vp = 0;
    for (let k = 0; k < i; k++) vp += p[k]! * v[k]!;
    const inverse = 1 / h;
    const shift = 0.5 * vp * inverse * inverse;
    for (let k = 0; k < i; k++) p[k] = p[k]! * inverse - shift * v[k]!;
    [u, v] = [v, u];
    [q, p] = [p, q];
    pending = true;
  }
  if (pending) subtractFromRow(a, 0, 1, u, q, 0);
  diagonal[0] = a[0]!;
}

/** Row j of A − q uᵀ − u qᵀ, first `length` entries. */
function subtractFromRow(
  a: Float64Array,
  at: number,
  length: number,
  u: Float64Array,
  q: Float64Array,
  j: number,
): void {
  const uj = u[j]!;
  const qj = q[j]!;
  for (let k = 0; k < length; k++) a[at + k]! -= uj * q[k]! + qj * u[k]!;
}

/** p += A v over the leading m × m part, from its lower triangle. */
function multiply(a: Float64Array, n: number, m: number, v: Float64Array, p: Float64Array): void {
  for (let j = 0; j < m; j++) {
    const at = j * n;
    const vj = v[j]!;
    let sum = a[at + j]! * vj;
    for (let k = 0; k < j; k++) {
      const x = a[at + k]!;
      sum += x * v[k]!;
      p[k]! += x * vj;
    }
    p[j]! += sum;
  }
}

/** A ← A − q uᵀ − u qᵀ and p += A v in one pass over the leading m × m part, two rows at a time. */
function updateAndMultiply(
  a: Float64Array,
  n: number,
  m: number,
  u: Float64Array,
  q: Float64Array,
  v: Float64Array,
  p: Float64Array,
): void {
  let j = 0;
  if (m % 2 === 1) {
    const corner = a[0]! - 2 * u[0]! * q[0]!;
    a[0] = corner;
    p[0]! += corner * v[0]!;
    j = 1;
  }
  for (; j < m; j += 2) {
    const at = j * n;
    const bt = at + n;
    const u0 = u[j]!;
    const u1 = u[j + 1]!;
    const q0 = q[j]!;
    const q1 = q[j + 1]!;
    const v0 = v[j]!;
    const v1 = v[j + 1]!;
    let s0 = 0;
    let s1 = 0;
    for (let k = 0; k < j; k++) {
      const uk = u[k]!;
      const qk = q[k]!;
      const vk = v[k]!;
      const x = a[at + k]! - u0 * qk - q0 * uk;
      const y = a[bt + k]! - u1 * qk - q1 * uk;
      a[at + k] = x;
      a[bt + k] = y;
      s0 += x * vk;
      s1 += y * vk;
      p[k]! += x * v0 + y * v1;
    }
    const x = a[at + j]! - 2 * u0 * q0;
    const y = a[bt + j]! - u1 * q0 - q1 * u0;
    const z = a[bt + j + 1]! - 2 * u1 * q1;
    a[at + j] = x;
    a[bt + j] = y;
    a[bt + j + 1] = z;
    p[j]! += s0 + x * v0 + y * v1;
    p[j + 1]! += s1 + y * v0 + z * v1;
  }
}

const solutionScratch = scratchVectors(2);

/**
 * Eigenvalues, ascending, of the real symmetric row-major n × n matrix `a`, of which the lower triangle is read and
 * destroyed. Throws `no-convergence`.
 */
export function symmetricEigenvalues(a: Float64Array, n: number, values = new Float64Array(n)): Float64Array {
  if (n === 0) return values;
  const [offDiagonal, scales] = solutionScratch(n) as [Float64Array, Float64Array];
  reduce(a, n, values, offDiagonal, scales);
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
  const [offDiagonal, scales] = solutionScratch(n) as [Float64Array, Float64Array];
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
