import {
  diagonal,
  largestSize,
  offDiagonal,
  requireSize,
  sortEigenvalues,
  tridiagonalEigenvalues,
  tridiagonalEigenvectors,
  vectorColumns,
} from './tridiagonal';

// Constants of the module for the sake of the compiler; see tridiagonal.ts.
const A = new Float64Array(largestSize * largestSize);
const U = new Float64Array(largestSize);
const Q = new Float64Array(largestSize);
const V = new Float64Array(largestSize);
const P = new Float64Array(largestSize);
/** Half the squared length of each Householder vector, 0 where nothing was reflected. */
const scales = new Float64Array(largestSize);

/**
 * Householder reduction of the matrix in A (row-major n × n, lower triangle) to tridiagonal form, row by row from the last:
 * every inner loop runs over contiguous memory, and the update A − q uᵀ − u qᵀ of one step and the product with the vector of
 * the next share one pass. Row i below the diagonal keeps its Householder vector. (Householder 1958; Wilkinson and
 * Reinsch 1971, contribution II/2.)
 */
function reduce(n: number): void {
  U.fill(0, 0, n);
  Q.fill(0, 0, n);
  P.fill(0, 0, n);
  for (let i = n - 1; i > 0; i--) {
    const row = i * n;
    const tail = takeRow(row, i);
    diagonal[i] = A[row + i]!;
    const last = V[i - 1]!;
    const reflects = tail !== 0;
    const length = Math.sqrt(tail + last * last);
    const signed = last >= 0 ? -length : length;
    const h = reflects ? length * length - last * signed : 1;
    offDiagonal[i - 1] = reflects ? signed : last;
    scales[i] = reflects ? h : 0;
    if (reflects) V[i - 1] = last - signed;
    else V.fill(0, 0, i);
    A[row + i - 1] = V[i - 1]!;
    updateAndMultiply(n, i);
    prepareUpdate(i, h);
  }
  diagonal[0] = A[0]! - 2 * U[0]! * Q[0]!;
}

/** Brings row i up to date and copies it to V; the sum of the squares of all but its last two elements. */
function takeRow(row: number, i: number): number {
  const ui = U[i]!;
  const qi = Q[i]!;
  let sum = 0;
  let last = 0;
  for (let k = 0; k < i; k++) {
    const x = A[row + k]! - ui * Q[k]! - qi * U[k]!;
    A[row + k] = x;
    V[k] = x;
    sum += last;
    last = x * x;
  }
  A[row + i]! -= 2 * ui * qi;
  return sum;
}

/** A ← A − q uᵀ − u qᵀ and p += A v in one pass over the leading m × m part, two rows at a time. */
function updateAndMultiply(n: number, m: number): void {
  let j = 0;
  if (m % 2 === 1) {
    const corner = A[0]! - 2 * U[0]! * Q[0]!;
    A[0] = corner;
    P[0]! += corner * V[0]!;
    j = 1;
  }
  for (; j < m; j += 2) twoRows(j * n, j * n + n, j);
}

function twoRows(at: number, bt: number, j: number): void {
  const u0 = U[j]!;
  const u1 = U[j + 1]!;
  const q0 = Q[j]!;
  const q1 = Q[j + 1]!;
  const v0 = V[j]!;
  const v1 = V[j + 1]!;
  let s0 = 0;
  let s1 = 0;
  for (let k = 0; k < j; k++) {
    const uk = U[k]!;
    const qk = Q[k]!;
    const vk = V[k]!;
    const x = A[at + k]! - u0 * qk - q0 * uk;
    const y = A[bt + k]! - u1 * qk - q1 * uk;
    A[at + k] = x;
    A[bt + k] = y;
    s0 += x * vk;
    s1 += y * vk;
    P[k]! += x * v0 + y * v1;
  }
  const x = A[at + j]! - 2 * u0 * q0;
  const y = A[bt + j]! - u1 * q0 - q1 * u0;
  const z = A[bt + j + 1]! - 2 * u1 * q1;
  A[at + j] = x;
  A[bt + j] = y;
  A[bt + j + 1] = z;
  P[j]! += s0 + x * v0 + y * v1;
  P[j + 1]! += s1 + y * v0 + z * v1;
}

/** u ← v and q ← p/h − (vᵀp/2h²) v for the next update; p ← 0. */
function prepareUpdate(m: number, h: number): void {
  let vp = 0;
  for (let k = 0; k < m; k++) vp += P[k]! * V[k]!;
  const inverse = 1 / h;
  const shift = 0.5 * vp * inverse * inverse;
  for (let k = 0; k < m; k++) {
    const v = V[k]!;
    Q[k] = P[k]! * inverse - shift * v;
    U[k] = v;
    P[k] = 0;
  }
}

function load(a: ArrayLike<number>, n: number): void {
  requireSize(n);
  for (let i = 0; i < n; i++) {
    const row = i * n;
    for (let j = row; j <= row + i; j++) A[j] = a[j]!;
  }
}

/**
 * Eigenvalues, ascending, of the real symmetric row-major n × n matrix `a`, of which only the lower triangle is read.
 * Throws `no-convergence`, `too-large`.
 */
export function symmetricEigenvalues(
  a: ArrayLike<number>,
  n: number,
  values = new Float64Array(n),
): Float64Array {
  if (n === 0) return values;
  if (n === 1 && Number.isFinite(a[0]!)) {
    values[0] = a[0]!;
    return values;
  }
  load(a, n);
  reduce(n);
  tridiagonalEigenvalues(n, values);
  return values;
}

export interface Eigensystem {
  /** Ascending. */
  readonly values: Float64Array;
  /** Row k (of length n) is the normalised eigenvector of `values[k]`. */
  readonly vectors: Float64Array;
}

/** Eigenvalues and eigenvectors; `a` as in `symmetricEigenvalues`. Throws `no-convergence`, `too-large`. */
export function symmetricEigensystem(a: ArrayLike<number>, n: number): Eigensystem {
  const values = new Float64Array(n);
  const vectors = new Float64Array(n * n);
  if (n === 0) return { values, vectors };
  load(a, n);
  reduce(n);
  tridiagonalEigenvectors(n, values);
  sortEigenvalues(values).forEach((column, k) => {
    for (let i = 0; i < n; i++) Z[i] = vectorColumns[i * n + column]!;
    for (let i = 1; i < n; i++) if (scales[i] !== 0) reflect(i * n, i, scales[i]!);
    for (let i = 0; i < n; i++) vectors[k * n + i] = Z[i]!;
  });
  return { values, vectors };
}

/** The eigenvector at hand. */
const Z = new Float64Array(largestSize);

/** z − v (vᵀz)/h with v in row i of A. */
function reflect(row: number, i: number, h: number): void {
  let sum = 0;
  for (let k = 0; k < i; k++) sum += A[row + k]! * Z[k]!;
  sum /= h;
  for (let k = 0; k < i; k++) Z[k]! -= sum * A[row + k]!;
}
