import {
  diagonal,
  offDiagonal,
  sortEigenvalues,
  tridiagonalEigenvalues,
  tridiagonalEigenvectors,
  vectorColumns,
} from './tridiagonal';
import { SpinhueError } from '../../errors';

/*
 * A Hamiltonian of an odd number of electrons without magnetic field, over states |j⟩ and their time reverses Θ|j⟩, is the
 * 2n × 2n complex matrix [[A, B], [−B*, A*]]. That is an n × n Hermitian matrix of quaternions a + b j, a = ⟨j|H|k⟩,
 * b = ⟨j|H|Θk⟩, whose n eigenvalues are the Kramers doublets: half the work of the complex matrix (A. Bunse-Gerstner,
 * R. Byers and V. Mehrmann, Numer. Math. 55, 83, 1989). Four numbers per element: re a, im a, re b, im b.
 */

/** Doublets of the largest problem of the d shell, and a little room. */
const mostDoublets = 128;
// Constants of the module for the sake of the compiler; see tridiagonal.ts.
const A = new Float64Array(4 * mostDoublets * mostDoublets);
const U = new Float64Array(mostDoublets);
const V = new Float64Array(mostDoublets);
const Q = new Float64Array(4 * mostDoublets);
const P = new Float64Array(4 * mostDoublets);
/** Unit quaternions of the step at hand. */
const F = new Float64Array(4 * mostDoublets);
const scales = new Float64Array(mostDoublets);
/** Householder vectors, row by row. */
const reflectors = new Float64Array(mostDoublets * mostDoublets);

/**
 * Householder reduction of the matrix in A (lower triangle) to a real symmetric tridiagonal one. Before each reflection a
 * diagonal matrix of unit quaternions makes the column real, so that the reflection itself is real: 48 multiplications per
 * element and step instead of 64. Row i of A keeps the phases of step i, row i of `reflectors` its Householder vector.
 */
function reduce(n: number): void {
  U.fill(0, 0, n);
  Q.fill(0, 0, 4 * n);
  P.fill(0, 0, 4 * n);
  for (let i = n - 1; i > 0; i--) {
    const row = 4 * i * n;
    const tail = takeRow(row, i);
    diagonal[i] = A[row + 4 * i]!;
    const last = V[i - 1]!;
    const reflects = tail !== 0;
    const length = Math.sqrt(tail + last * last);
    const h = reflects ? length * (length + last) : 1;
    offDiagonal[i - 1] = reflects ? -length : last;
    scales[i] = reflects ? h : 0;
    if (reflects) V[i - 1] = last + length;
    else V.fill(0, 0, i);
    for (let k = 0; k < i; k++) reflectors[i * n + k] = V[k]!;
    for (let j = 0; j < i; j++) oneRow(4 * j * n, j);
    prepareUpdate(i, h);
  }
  diagonal[0] = A[0]! - 2 * U[0]! * Q[0]!;
}

/**
 * Brings row i up to date (A − q uᵀ − u q†, u real) and splits the column above the diagonal, which is its conjugate, into
 * moduli, V, and unit quaternions, F, kept in the row too. Returns the sum of the squared moduli without the last.
 */
function takeRow(row: number, i: number): number {
  const ui = U[i]!;
  const q0 = Q[4 * i]!;
  const q1 = Q[4 * i + 1]!;
  const q2 = Q[4 * i + 2]!;
  const q3 = Q[4 * i + 3]!;
  let sum = 0;
  let last = 0;
  for (let k = 0, c = 0; k < i; k++, c += 4) {
    const uk = U[k]!;
    const x0 = A[row + c]! - q0 * uk - ui * Q[c]!;
    const x1 = A[row + c + 1]! - q1 * uk + ui * Q[c + 1]!;
    const x2 = A[row + c + 2]! - q2 * uk + ui * Q[c + 2]!;
    const x3 = A[row + c + 3]! - q3 * uk + ui * Q[c + 3]!;
    const square = x0 * x0 + x1 * x1 + x2 * x2 + x3 * x3;
    const modulus = Math.sqrt(square);
    const inverse = modulus === 0 ? 0 : 1 / modulus;
    V[k] = modulus;
    F[c] = modulus === 0 ? 1 : x0 * inverse;
    F[c + 1] = -x1 * inverse;
    F[c + 2] = -x2 * inverse;
    F[c + 3] = -x3 * inverse;
    sum += last;
    last = square;
  }
  A[row + 4 * i]! -= 2 * ui * q0;
  for (let c = 0; c < 4 * i; c++) A[row + c] = F[c]!;
  return sum;
}

/** One row of A ← D† (A − q uᵀ − u q†) D, D = diag(F), and its share of p += A v; u and v real. */
function oneRow(at: number, j: number): void {
  const e = 4 * j;
  const uj = U[j]!;
  const vj = V[j]!;
  const q0 = Q[e]!;
  const q1 = Q[e + 1]!;
  const q2 = Q[e + 2]!;
  const q3 = Q[e + 3]!;
  const e0 = F[e]!;
  const e1 = F[e + 1]!;
  const e2 = F[e + 2]!;
  const e3 = F[e + 3]!;
  let s0 = 0;
  let s1 = 0;
  let s2 = 0;
  let s3 = 0;
  for (let k = 0, c = 0; k < j; k++, c += 4) {
    const uk = U[k]!;
    const x0 = A[at + c]! - q0 * uk - uj * Q[c]!;
    const x1 = A[at + c + 1]! - q1 * uk + uj * Q[c + 1]!;
    const x2 = A[at + c + 2]! - q2 * uk + uj * Q[c + 2]!;
    const x3 = A[at + c + 3]! - q3 * uk + uj * Q[c + 3]!;
    const f0 = F[c]!;
    const f1 = F[c + 1]!;
    const f2 = F[c + 2]!;
    const f3 = F[c + 3]!;
    const t0 = x0 * f0 - x1 * f1 - x2 * f2 - x3 * f3;
    const t1 = x0 * f1 + x1 * f0 + x2 * f3 - x3 * f2;
    const t2 = x0 * f2 - x1 * f3 + x2 * f0 + x3 * f1;
    const t3 = x0 * f3 + x1 * f2 - x2 * f1 + x3 * f0;
    const y0 = e0 * t0 + e1 * t1 + e2 * t2 + e3 * t3;
    const y1 = e0 * t1 - e1 * t0 - e2 * t3 + e3 * t2;
    const y2 = e0 * t2 + e1 * t3 - e2 * t0 - e3 * t1;
    const y3 = e0 * t3 - e1 * t2 + e2 * t1 - e3 * t0;
    A[at + c] = y0;
    A[at + c + 1] = y1;
    A[at + c + 2] = y2;
    A[at + c + 3] = y3;
    const vk = V[k]!;
    s0 += y0 * vk;
    s1 += y1 * vk;
    s2 += y2 * vk;
    s3 += y3 * vk;
    P[c]! += y0 * vj;
    P[c + 1]! -= y1 * vj;
    P[c + 2]! -= y2 * vj;
    P[c + 3]! -= y3 * vj;
  }
  const corner = A[at + e]! - 2 * q0 * uj;
  A[at + e] = corner;
  P[e]! += s0 + corner * vj;
  P[e + 1]! += s1;
  P[e + 2]! += s2;
  P[e + 3]! += s3;
}

/** u ← v and q ← p/h − (vᵀp/2h²) v for the next update; p ← 0. */
function prepareUpdate(m: number, h: number): void {
  let vp = 0;
  for (let k = 0; k < m; k++) vp += V[k]! * P[4 * k]!;
  const inverse = 1 / h;
  const shift = 0.5 * vp * inverse * inverse;
  for (let k = 0, c = 0; k < m; k++, c += 4) {
    const v = V[k]!;
    Q[c] = P[c]! * inverse - shift * v;
    Q[c + 1] = P[c + 1]! * inverse;
    Q[c + 2] = P[c + 2]! * inverse;
    Q[c + 3] = P[c + 3]! * inverse;
    U[k] = v;
    P[c] = 0;
    P[c + 1] = 0;
    P[c + 2] = 0;
    P[c + 3] = 0;
  }
}

function load(a: ArrayLike<number>, n: number): void {
  if (n > mostDoublets) {
    throw new SpinhueError({
      code: 'too-large',
      message: `${n} doublets are more than ${mostDoublets}`,
      field: 'matrix',
    });
  }
  for (let i = 0; i < n; i++) {
    const row = 4 * i * n;
    for (let j = row; j < row + 4 * (i + 1); j++) A[j] = a[j]!;
  }
}

/**
 * The n doubly degenerate eigenvalues, ascending, of a Hermitian n × n matrix of quaternions: row-major, only the lower
 * triangle read. Throws `no-convergence`, `too-large`.
 */
export function quaternionEigenvalues(
  a: ArrayLike<number>,
  n: number,
  values = new Float64Array(n),
): Float64Array {
  if (n === 0) return values;
  load(a, n);
  reduce(n);
  tridiagonalEigenvalues(n, values);
  return values;
}

/**
 * Eigenvalues with one eigenvector per doublet, in the rows of `vectors`, four numbers per entry x = α + β j; as a state it is
 * Σ α_j |j⟩ − β_j* Θ|j⟩, and its time reverse is the other. Throws `no-convergence`, `too-large`.
 */
export function quaternionEigensystem(
  a: ArrayLike<number>,
  n: number,
): { readonly values: Float64Array; readonly vectors: Float64Array } {
  const values = new Float64Array(n);
  const vectors = new Float64Array(4 * n * n);
  if (n === 0) return { values, vectors };
  load(a, n);
  reduce(n);
  tridiagonalEigenvectors(n, values);
  sortEigenvalues(values).forEach((column, k) => {
    Z.fill(0, 0, 4 * n);
    for (let i = 0; i < n; i++) Z[4 * i] = vectorColumns[i * n + column]!;
    for (let i = 1; i < n; i++) {
      if (scales[i] !== 0) reflect(i * n, i, scales[i]!);
      turn(4 * i * n, 4 * i);
    }
    for (let i = 0; i < 4 * n; i++) vectors[4 * k * n + i] = Z[i]!;
  });
  return { values, vectors };
}

/** The eigenvector at hand. */
const Z = new Float64Array(4 * mostDoublets);

/** z − v (vᵀz)/h with v in row i of `reflectors`. */
function reflect(row: number, i: number, h: number): void {
  let s0 = 0;
  let s1 = 0;
  let s2 = 0;
  let s3 = 0;
  for (let k = 0, c = 0; k < i; k++, c += 4) {
    const v = reflectors[row + k]!;
    s0 += v * Z[c]!;
    s1 += v * Z[c + 1]!;
    s2 += v * Z[c + 2]!;
    s3 += v * Z[c + 3]!;
  }
  for (let k = 0, c = 0; k < i; k++, c += 4) {
    const v = reflectors[row + k]! / h;
    Z[c]! -= v * s0;
    Z[c + 1]! -= v * s1;
    Z[c + 2]! -= v * s2;
    Z[c + 3]! -= v * s3;
  }
}

/** z_k ← d_k z_k with d in row i of A, up to number `end`. */
function turn(row: number, end: number): void {
  for (let c = 0; c < end; c += 4) {
    const d0 = A[row + c]!;
    const d1 = A[row + c + 1]!;
    const d2 = A[row + c + 2]!;
    const d3 = A[row + c + 3]!;
    const z0 = Z[c]!;
    const z1 = Z[c + 1]!;
    const z2 = Z[c + 2]!;
    const z3 = Z[c + 3]!;
    Z[c] = d0 * z0 - d1 * z1 - d2 * z2 - d3 * z3;
    Z[c + 1] = d0 * z1 + d1 * z0 + d2 * z3 - d3 * z2;
    Z[c + 2] = d0 * z2 - d1 * z3 + d2 * z0 + d3 * z1;
    Z[c + 3] = d0 * z3 + d1 * z2 - d2 * z1 + d3 * z0;
  }
}
