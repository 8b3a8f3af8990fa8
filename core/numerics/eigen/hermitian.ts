import { tridiagonalEigenvalues, tridiagonalEigenvectors } from './tridiagonal';

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
  const u = new Float64Array(2 * n);
  const p = new Float64Array(2 * n);
  for (let i = n - 1; i > 0; i--) {
    const row = 2 * i * n;
    diagonal[i] = a[row + 2 * i]!;
    const lastRe = a[row + 2 * i - 2]!;
    const lastIm = -a[row + 2 * i - 1]!;
    let tail = 0;
    for (let k = 0; k < 2 * i - 2; k++) tail += a[row + k]! * a[row + k]!;
    const last = Math.hypot(lastRe, lastIm);
    if (tail === 0) {
      offDiagonal[i - 1] = last;
      scales[i] = 0;
      phases[2 * i] = last === 0 ? 1 : lastRe / last;
      phases[2 * i + 1] = last === 0 ? 0 : lastIm / last;
      continue;
    }
    const length = Math.sqrt(tail + last * last);
    const phaseRe = last === 0 ? 1 : lastRe / last;
    const phaseIm = last === 0 ? 0 : lastIm / last;
    offDiagonal[i - 1] = length;
    phases[2 * i] = -phaseRe;
    phases[2 * i + 1] = -phaseIm;
    a[row + 2 * i - 2] = lastRe + phaseRe * length;
    a[row + 2 * i - 1] = -(lastIm + phaseIm * length);
    const h = length * (length + last);
    scales[i] = h;
    for (let k = 0; k < i; k++) {
      u[2 * k] = a[row + 2 * k]!;
      u[2 * k + 1] = -a[row + 2 * k + 1]!;
    }
    multiplyLower(a, n, i, u, p);
    let up = 0;
    for (let k = 0; k < 2 * i; k++) up += u[k]! * p[k]!;
    const shift = up / (2 * h * h);
    for (let k = 0; k < 2 * i; k++) p[k] = p[k]! / h - shift * u[k]!;
    subtractRankTwo(a, n, i, u, p);
  }
  diagonal[0] = a[0]!;
  phases[0] = 1;
  phases[1] = 0;
  accumulatePhases(phases, n);
}

/** p = A u over the leading m × m part. */
function multiplyLower(a: Float64Array, n: number, m: number, u: Float64Array, p: Float64Array): void {
  p.fill(0, 0, 2 * m);
  for (let j = 0; j < m; j++) {
    const at = 2 * j * n;
    const ur = u[2 * j]!;
    const ui = u[2 * j + 1]!;
    let sr = a[at + 2 * j]! * ur;
    let si = a[at + 2 * j]! * ui;
    for (let k = 0; k < 2 * j; k += 2) {
      const xr = a[at + k]!;
      const xi = a[at + k + 1]!;
      const vr = u[k]!;
      const vi = u[k + 1]!;
      sr += xr * vr - xi * vi;
      si += xr * vi + xi * vr;
      p[k]! += xr * ur + xi * ui;
      p[k + 1]! += xr * ui - xi * ur;
    }
    p[2 * j]! += sr;
    p[2 * j + 1]! += si;
  }
}

/** A − q u† − u q† over the leading m × m part. */
function subtractRankTwo(a: Float64Array, n: number, m: number, u: Float64Array, q: Float64Array): void {
  for (let j = 0; j < m; j++) {
    const at = 2 * j * n;
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
  const offDiagonal = new Float64Array(n);
  reduce(a, n, values, offDiagonal, new Float64Array(n), new Float64Array(2 * n));
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
  const offDiagonal = new Float64Array(n);
  const scales = new Float64Array(n);
  const phases = new Float64Array(2 * n);
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
