import { tridiagonalEigenvalues, tridiagonalEigenvectors } from './tridiagonal';
import { scratchVectors } from './workspace';

const reductionScratch = scratchVectors(4);
const solutionScratch = scratchVectors(3);

/**
 * Householder reduction of a Hermitian matrix to real tridiagonal form. `a` is row-major with real and imaginary part side
 * by side; the lower triangle is read. On return `offDiagonal` holds the moduli, row i below the diagonal the conjugate of
 * the Householder vector, `scales[i]` half its squared length, and `phases` (2 numbers per index) the unitary diagonal D with
 * T = D |T| D†.
 */
function reduce(
  a: Float64Array,
  n: number,
  diagonal: Float64Array,
  offDiagonal: Float64Array,
  scales: Float64Array,
  phases: Float64Array,
): void {
  let [u, q, v, p] = reductionScratch(2 * n) as [Float64Array, Float64Array, Float64Array, Float64Array];
  let pending = false;
  for (let i = n - 1; i > 0; i--) {
    const row = 2 * i * n;
    if (pending) subtractFromRow(a, row, i, u, q);
    diagonal[i] = a[row + 2 * i]!;
    const lastRe = a[row + 2 * i - 2]!;
    const lastIm = -a[row + 2 * i - 1]!;
    let tail = 0;
    for (let k = 0; k < 2 * i - 2; k++) tail += a[row + k]! * a[row + k]!;
    const last = Math.hypot(lastRe, lastIm);
    const phaseRe = last === 0 ? 1 : lastRe / last;
    const phaseIm = last === 0 ? 0 : lastIm / last;
    if (tail === 0) {
      offDiagonal[i - 1] = last;
      scales[i] = 0;
      phases[2 * i] = phaseRe;
      phases[2 * i + 1] = phaseIm;
      if (pending) for (let j = 0; j < i; j++) subtractFromRow(a, 2 * j * n, j, u, q);
      pending = false;
      continue;
    }
    const length = Math.sqrt(tail + last * last);
    offDiagonal[i - 1] = length;
    phases[2 * i] = -phaseRe;
    phases[2 * i + 1] = -phaseIm;
    a[row + 2 * i - 2] = lastRe + phaseRe * length;
    a[row + 2 * i - 1] = -(lastIm + phaseIm * length);
    const h = length * (length + last);
    scales[i] = h;
    for (let k = 0; k < 2 * i; k += 2) {
      v[k] = a[row + k]!;
      v[k + 1] = -a[row + k + 1]!;
      p[k] = 0;
      p[k + 1] = 0;
    }
    if (!pending) {
      u.fill(0, 0, 2 * i);
      q.fill(0, 0, 2 * i);
    }
    updateAndMultiply(a, n, i, u, q, v, p);
    let vp = 0;
    for (let k = 0; k < 2 * i; k++) vp += v[k]! * p[k]!;
    const shift = vp / (2 * h * h);
    for (let k = 0; k < 2 * i; k++) p[k] = p[k]! / h - shift * v[k]!;
    [u, v] = [v, u];
    [q, p] = [p, q];
    pending = true;
  }
  if (pending) subtractFromRow(a, 0, 0, u, q);
  diagonal[0] = a[0]!;
  phases[0] = 1;
  phases[1] = 0;
  accumulatePhases(phases, n);
}

/** Row j of A − q u† − u q† up to the diagonal. */
function subtractFromRow(a: Float64Array, at: number, j: number, u: Float64Array, q: Float64Array): void {
  const ur = u[2 * j]!;
  const ui = u[2 * j + 1]!;
  const qr = q[2 * j]!;
  const qi = q[2 * j + 1]!;
  for (let k = 0; k <= 2 * j; k += 2) {
    const vr = u[k]!;
    const vi = u[k + 1]!;
    const wr = q[k]!;
    const wi = q[k + 1]!;
    a[at + k]! -= qr * vr + qi * vi + ur * wr + ui * wi;
    a[at + k + 1]! -= qi * vr - qr * vi + ui * wr - ur * wi;
  }
}

/** A ← A − q u† − u q† and p += A v in one pass over the leading m × m part. */
function updateAndMultiply(
  a: Float64Array,
  n: number,
  m: number,
  u: Float64Array,
  q: Float64Array,
  v: Float64Array,
  p: Float64Array,
): void {
  for (let j = 0; j < m; j++) {
    const at = 2 * j * n;
    const end = 2 * j;
    const ur = u[end]!;
    const ui = u[end + 1]!;
    const qr = q[end]!;
    const qi = q[end + 1]!;
    const vr = v[end]!;
    const vi = v[end + 1]!;
    const corner = a[at + end]! - 2 * (qr * ur + qi * ui);
    a[at + end] = corner;
    let sr = corner * vr;
    let si = corner * vi;
    for (let k = 0; k < end; k += 2) {
      const xu = u[k]!;
      const yu = u[k + 1]!;
      const xq = q[k]!;
      const yq = q[k + 1]!;
      const re = a[at + k]! - (qr * xu + qi * yu + ur * xq + ui * yq);
      const im = a[at + k + 1]! - (qi * xu - qr * yu + ui * xq - ur * yq);
      a[at + k] = re;
      a[at + k + 1] = im;
      const xv = v[k]!;
      const yv = v[k + 1]!;
      sr += re * xv - im * yv;
      si += re * yv + im * xv;
      p[k]! += re * vr + im * vi;
      p[k + 1]! += re * vi - im * vr;
    }
    p[end]! += sr;
    p[end + 1]! += si;
  }
}

/** d_i = conj(t_i) d_{i−1} with t_i the phase of the element above the diagonal. */
function accumulatePhases(phases: Float64Array, n: number): void {
  for (let i = 1; i < n; i++) {
    const [tr, ti] = [phases[2 * i]!, phases[2 * i + 1]!];
    const [dr, di] = [phases[2 * i - 2]!, phases[2 * i - 1]!];
    phases[2 * i] = tr * dr + ti * di;
    phases[2 * i + 1] = tr * di - ti * dr;
  }
}

/**
 * Eigenvalues, ascending, of a Hermitian n × n matrix: row-major, real and imaginary part side by side, lower triangle read
 * and destroyed. Throws `no-convergence`.
 */
export function hermitianEigenvalues(a: Float64Array, n: number, values = new Float64Array(n)): Float64Array {
  if (n === 0) return values;
  const [offDiagonal, scales, phases] = solutionScratch(2 * n) as [Float64Array, Float64Array, Float64Array];
  reduce(a, n, values, offDiagonal, scales, phases);
  tridiagonalEigenvalues(values, offDiagonal, n);
  return values;
}

/**
 * Eigenvalues and eigenvectors; `vectors` has one eigenvector per row, real and imaginary part side by side. `a` as in
 * `hermitianEigenvalues`. Throws `no-convergence`.
 */
export function hermitianEigensystem(
  a: Float64Array,
  n: number,
): { readonly values: Float64Array; readonly vectors: Float64Array } {
  const values = new Float64Array(n);
  const vectors = new Float64Array(2 * n * n);
  if (n === 0) return { values, vectors };
  const [offDiagonal, scales, phases] = solutionScratch(2 * n) as [Float64Array, Float64Array, Float64Array];
  reduce(a, n, values, offDiagonal, scales, phases);
  const real = new Float64Array(n * n);
  for (let i = 0; i < n; i++) real[i * n + i] = 1;
  tridiagonalEigenvectors(values, offDiagonal, real, n, n);
  for (let k = 0; k < n; k++) {
    const at = 2 * k * n;
    for (let i = 0; i < n; i++) {
      vectors[at + 2 * i] = phases[2 * i]! * real[k * n + i]!;
      vectors[at + 2 * i + 1] = phases[2 * i + 1]! * real[k * n + i]!;
    }
    undoReflections(a, n, scales, vectors, at);
  }
  return { values, vectors };
}

function undoReflections(
  a: Float64Array,
  n: number,
  scales: Float64Array,
  z: Float64Array,
  at: number,
): void {
  for (let i = 1; i < n; i++) {
    const h = scales[i]!;
    if (h === 0) continue;
    const row = 2 * i * n;
    let sr = 0;
    let si = 0;
    for (let k = 0; k < 2 * i; k += 2) {
      const [cr, ci, zr, zi] = [a[row + k]!, a[row + k + 1]!, z[at + k]!, z[at + k + 1]!];
      sr += cr * zr - ci * zi;
      si += cr * zi + ci * zr;
    }
    sr /= h;
    si /= h;
    for (let k = 0; k < 2 * i; k += 2) {
      const [cr, ci] = [a[row + k]!, a[row + k + 1]!];
      z[at + k]! -= cr * sr + ci * si;
      z[at + k + 1]! -= cr * si - ci * sr;
    }
  }
}
