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

// Constants of the module for the sake of the compiler; see tridiagonal.ts. Real and imaginary part side by side.
const A = new Float64Array(2 * largestSize * largestSize);
const U = new Float64Array(2 * largestSize);
const Q = new Float64Array(2 * largestSize);
const V = new Float64Array(2 * largestSize);
const P = new Float64Array(2 * largestSize);
const scales = new Float64Array(largestSize);
/** Unitary diagonal D with T = D |T| D†. */
const phases = new Float64Array(2 * largestSize);

/**
 * Householder reduction of the Hermitian matrix in A (lower triangle) to real tridiagonal form, step for step as in the real
 * case. Row i below the diagonal keeps the conjugate of its Householder vector.
 */
function reduce(n: number): void {
  U.fill(0, 0, 2 * n);
  Q.fill(0, 0, 2 * n);
  P.fill(0, 0, 2 * n);
  for (let i = n - 1; i > 0; i--) {
    const row = 2 * i * n;
    const tail = takeRow(row, i);
    diagonal[i] = A[row + 2 * i]!;
    const lastRe = V[2 * i - 2]!;
    const lastIm = V[2 * i - 1]!;
    const last = Math.sqrt(lastRe * lastRe + lastIm * lastIm);
    const phaseRe = last === 0 ? 1 : lastRe / last;
    const phaseIm = last === 0 ? 0 : lastIm / last;
    const reflects = tail !== 0;
    const length = Math.sqrt(tail + last * last);
    const h = reflects ? length * (length + last) : 1;
    offDiagonal[i - 1] = length;
    scales[i] = reflects ? h : 0;
    phases[2 * i] = reflects ? -phaseRe : phaseRe;
    phases[2 * i + 1] = reflects ? -phaseIm : phaseIm;
    if (reflects) {
      V[2 * i - 2] = lastRe + phaseRe * length;
      V[2 * i - 1] = lastIm + phaseIm * length;
    } else V.fill(0, 0, 2 * i);
    A[row + 2 * i - 2] = V[2 * i - 2]!;
    A[row + 2 * i - 1] = -V[2 * i - 1]!;
    for (let j = 0; j < i; j++) oneRow(2 * j * n, 2 * j);
    prepareUpdate(2 * i, h);
  }
  diagonal[0] = A[0]! - 2 * (Q[0]! * U[0]! + Q[1]! * U[1]!);
  phases[0] = 1;
  phases[1] = 0;
  for (let i = 1; i < n; i++) {
    // d_i = conj(t_i) d_{i−1} with t_i the phase of the element above the diagonal.
    const [tr, ti] = [phases[2 * i]!, phases[2 * i + 1]!];
    const [dr, di] = [phases[2 * i - 2]!, phases[2 * i - 1]!];
    phases[2 * i] = tr * dr + ti * di;
    phases[2 * i + 1] = tr * di - ti * dr;
  }
}

/** Brings row i up to date and copies its conjugate to V; the sum of the squares of all but its last two elements. */
function takeRow(row: number, i: number): number {
  const ur = U[2 * i]!;
  const ui = U[2 * i + 1]!;
  const qr = Q[2 * i]!;
  const qi = Q[2 * i + 1]!;
  let sum = 0;
  let last = 0;
  for (let k = 0; k < 2 * i; k += 2) {
    const vr = U[k]!;
    const vi = U[k + 1]!;
    const wr = Q[k]!;
    const wi = Q[k + 1]!;
    const re = A[row + k]! - (qr * vr + qi * vi + ur * wr + ui * wi);
    const im = A[row + k + 1]! - (qi * vr - qr * vi + ui * wr - ur * wi);
    A[row + k] = re;
    A[row + k + 1] = im;
    V[k] = re;
    V[k + 1] = -im;
    sum += last;
    last = re * re + im * im;
  }
  A[row + 2 * i]! -= 2 * (qr * ur + qi * ui);
  return sum;
}

/** One row of A ← A − q u† − u q† and its share of p += A v. */
function oneRow(at: number, end: number): void {
  const ur = U[end]!;
  const ui = U[end + 1]!;
  const qr = Q[end]!;
  const qi = Q[end + 1]!;
  const vr = V[end]!;
  const vi = V[end + 1]!;
  let sr = 0;
  let si = 0;
  for (let k = 0; k < end; k += 2) {
    const xu = U[k]!;
    const yu = U[k + 1]!;
    const xq = Q[k]!;
    const yq = Q[k + 1]!;
    const re = A[at + k]! - (qr * xu + qi * yu + ur * xq + ui * yq);
    const im = A[at + k + 1]! - (qi * xu - qr * yu + ui * xq - ur * yq);
    A[at + k] = re;
    A[at + k + 1] = im;
    const xv = V[k]!;
    const yv = V[k + 1]!;
    sr += re * xv - im * yv;
    si += re * yv + im * xv;
    P[k]! += re * vr + im * vi;
    P[k + 1]! += re * vi - im * vr;
  }
  const corner = A[at + end]! - 2 * (qr * ur + qi * ui);
  A[at + end] = corner;
  P[end]! += sr + corner * vr;
  P[end + 1]! += si + corner * vi;
}

/** u ← v and q ← p/h − (v†p/2h²) v for the next update; p ← 0. `length` counts numbers. */
function prepareUpdate(length: number, h: number): void {
  let vp = 0;
  for (let k = 0; k < length; k++) vp += V[k]! * P[k]!;
  const inverse = 1 / h;
  const shift = 0.5 * vp * inverse * inverse;
  for (let k = 0; k < length; k++) {
    const v = V[k]!;
    Q[k] = P[k]! * inverse - shift * v;
    U[k] = v;
    P[k] = 0;
  }
}

function load(a: ArrayLike<number>, n: number): void {
  requireSize(n);
  for (let i = 0; i < n; i++) {
    const row = 2 * i * n;
    for (let j = row; j <= row + 2 * i + 1; j++) A[j] = a[j]!;
  }
}

/**
 * Eigenvalues, ascending, of a Hermitian n × n matrix: row-major, real and imaginary part side by side, only the lower
 * triangle read. Throws `no-convergence`, `too-large`.
 */
export function hermitianEigenvalues(
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
 * Eigenvalues and eigenvectors; `vectors` has one eigenvector per row, real and imaginary part side by side. `a` as in
 * `hermitianEigenvalues`. Throws `no-convergence`, `too-large`.
 */
export function hermitianEigensystem(
  a: ArrayLike<number>,
  n: number,
): { readonly values: Float64Array; readonly vectors: Float64Array } {
  const values = new Float64Array(n);
  const vectors = new Float64Array(2 * n * n);
  if (n === 0) return { values, vectors };
  load(a, n);
  reduce(n);
  tridiagonalEigenvectors(n, values);
  sortEigenvalues(values).forEach((column, k) => {
    for (let i = 0; i < n; i++) {
      const entry = vectorColumns[i * n + column]!;
      Z[2 * i] = phases[2 * i]! * entry;
      Z[2 * i + 1] = phases[2 * i + 1]! * entry;
    }
    for (let i = 1; i < n; i++) if (scales[i] !== 0) reflect(2 * i * n, 2 * i, scales[i]!);
    for (let i = 0; i < 2 * n; i++) vectors[2 * k * n + i] = Z[i]!;
  });
  return { values, vectors };
}

/** The eigenvector at hand. */
const Z = new Float64Array(2 * largestSize);

/** z − v (v†z)/h, with v† in row i of A. */
function reflect(row: number, end: number, h: number): void {
  let sr = 0;
  let si = 0;
  for (let k = 0; k < end; k += 2) {
    const cr = A[row + k]!;
    const ci = A[row + k + 1]!;
    const zr = Z[k]!;
    const zi = Z[k + 1]!;
    sr += cr * zr - ci * zi;
    si += cr * zi + ci * zr;
  }
  sr /= h;
  si /= h;
  for (let k = 0; k < end; k += 2) {
    const cr = A[row + k]!;
    const ci = A[row + k + 1]!;
    Z[k]! -= cr * sr + ci * si;
    Z[k + 1]! -= cr * si - ci * sr;
  }
}
