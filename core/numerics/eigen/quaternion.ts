import { tridiagonalEigenvalues, tridiagonalEigenvectors } from './tridiagonal';

/*
 * A Hamiltonian of an odd number of electrons without magnetic field, over states |j⟩ and their time reverses Θ|j⟩, is the
 * 2n × 2n complex matrix [[A, B], [−B*, A*]]. That is an n × n Hermitian matrix of quaternions a + b j, a = ⟨j|H|k⟩,
 * b = ⟨j|H|Θk⟩, whose n eigenvalues are the Kramers doublets: half the work of the complex matrix (A. Bunse-Gerstner,
 * R. Byers and V. Mehrmann, Numer. Math. 55, 83, 1989). Four numbers per element: re a, im a, re b, im b.
 */

/** x · y into out[at…at+3] (added). */
function addProduct(
  out: Float64Array,
  at: number,
  [x0, x1, x2, x3]: readonly [number, number, number, number],
  [y0, y1, y2, y3]: readonly [number, number, number, number],
): void {
  out[at]! += x0 * y0 - x1 * y1 - x2 * y2 - x3 * y3;
  out[at + 1]! += x0 * y1 + x1 * y0 + x2 * y3 - x3 * y2;
  out[at + 2]! += x0 * y2 - x1 * y3 + x2 * y0 + x3 * y1;
  out[at + 3]! += x0 * y3 + x1 * y2 - x2 * y1 + x3 * y0;
}

const quaternionAt = (a: Float64Array, at: number): [number, number, number, number] => [
  a[at]!,
  a[at + 1]!,
  a[at + 2]!,
  a[at + 3]!,
];
const conjugate = ([x0, x1, x2, x3]: readonly [number, number, number, number]): [
  number,
  number,
  number,
  number,
] => [x0, -x1, -x2, -x3];

/** Householder reduction to a real symmetric tridiagonal matrix; storage as in the complex routine, four numbers each. */
function reduce(
  a: Float64Array,
  n: number,
  diagonal: Float64Array,
  offDiagonal: Float64Array,
  scales: Float64Array,
  phases: Float64Array,
): void {
  const u = new Float64Array(4 * n);
  const p = new Float64Array(4 * n);
  for (let i = n - 1; i > 0; i--) {
    const row = 4 * i * n;
    const lastAt = row + 4 * (i - 1);
    diagonal[i] = a[row + 4 * i]!;
    let tail = 0;
    for (let k = row; k < lastAt; k++) tail += a[k]! * a[k]!;
    const column = conjugate(quaternionAt(a, lastAt));
    const last = Math.hypot(...column);
    const phase = last === 0 ? ([1, 0, 0, 0] as const) : column.map((value) => value / last);
    const reflects = tail !== 0;
    const length = Math.sqrt(tail + last * last);
    offDiagonal[i - 1] = length;
    for (let c = 0; c < 4; c++) phases[4 * i + c] = reflects ? -phase[c]! : phase[c]!;
    if (!reflects) continue;
    for (let c = 0; c < 4; c++) a[lastAt + c] = (c === 0 ? 1 : -1) * (column[c]! + phase[c]! * length);
    const h = length * (length + last);
    scales[i] = h;
    for (let k = 0; k < 4 * i; k += 4) {
      u[k] = a[row + k]!;
      u[k + 1] = -a[row + k + 1]!;
      u[k + 2] = -a[row + k + 2]!;
      u[k + 3] = -a[row + k + 3]!;
    }
    multiplyLower(a, n, i, u, p);
    let up = 0;
    for (let k = 0; k < 4 * i; k++) up += u[k]! * p[k]!;
    const shift = up / (2 * h * h);
    for (let k = 0; k < 4 * i; k++) p[k] = p[k]! / h - shift * u[k]!;
    subtractRankTwo(a, n, i, u, p);
  }
  diagonal[0] = a[0]!;
  phases[0] = 1;
  for (let i = 1; i < n; i++) {
    const t = conjugate(quaternionAt(phases, 4 * i));
    const before = quaternionAt(phases, 4 * i - 4);
    phases.fill(0, 4 * i, 4 * i + 4);
    addProduct(phases, 4 * i, t, before);
  }
}

/** p = A u over the leading m × m part. */
function multiplyLower(a: Float64Array, n: number, m: number, u: Float64Array, p: Float64Array): void {
  p.fill(0, 0, 4 * m);
  for (let j = 0; j < m; j++) {
    const at = 4 * j * n;
    const u0 = u[4 * j]!;
    const u1 = u[4 * j + 1]!;
    const u2 = u[4 * j + 2]!;
    const u3 = u[4 * j + 3]!;
    const d = a[at + 4 * j]!;
    let s0 = d * u0;
    let s1 = d * u1;
    let s2 = d * u2;
    let s3 = d * u3;
    for (let k = 0; k < 4 * j; k += 4) {
      const x0 = a[at + k]!;
      const x1 = a[at + k + 1]!;
      const x2 = a[at + k + 2]!;
      const x3 = a[at + k + 3]!;
      const v0 = u[k]!;
      const v1 = u[k + 1]!;
      const v2 = u[k + 2]!;
      const v3 = u[k + 3]!;
      s0 += x0 * v0 - x1 * v1 - x2 * v2 - x3 * v3;
      s1 += x0 * v1 + x1 * v0 + x2 * v3 - x3 * v2;
      s2 += x0 * v2 - x1 * v3 + x2 * v0 + x3 * v1;
      s3 += x0 * v3 + x1 * v2 - x2 * v1 + x3 * v0;
      p[k]! += x0 * u0 + x1 * u1 + x2 * u2 + x3 * u3;
      p[k + 1]! += x0 * u1 - x1 * u0 - x2 * u3 + x3 * u2;
      p[k + 2]! += x0 * u2 + x1 * u3 - x2 * u0 - x3 * u1;
      p[k + 3]! += x0 * u3 - x1 * u2 + x2 * u1 - x3 * u0;
    }
    p[4 * j]! += s0;
    p[4 * j + 1]! += s1;
    p[4 * j + 2]! += s2;
    p[4 * j + 3]! += s3;
  }
}

/** A − q u† − u q† over the leading m × m part. */
function subtractRankTwo(a: Float64Array, n: number, m: number, u: Float64Array, q: Float64Array): void {
  for (let j = 0; j < m; j++) {
    const at = 4 * j * n;
    const u0 = u[4 * j]!;
    const u1 = u[4 * j + 1]!;
    const u2 = u[4 * j + 2]!;
    const u3 = u[4 * j + 3]!;
    const q0 = q[4 * j]!;
    const q1 = q[4 * j + 1]!;
    const q2 = q[4 * j + 2]!;
    const q3 = q[4 * j + 3]!;
    for (let k = 0; k <= 4 * j; k += 4) {
      const v0 = u[k]!;
      const v1 = u[k + 1]!;
      const v2 = u[k + 2]!;
      const v3 = u[k + 3]!;
      const w0 = q[k]!;
      const w1 = q[k + 1]!;
      const w2 = q[k + 2]!;
      const w3 = q[k + 3]!;
      a[at + k]! -= q0 * v0 + q1 * v1 + q2 * v2 + q3 * v3 + u0 * w0 + u1 * w1 + u2 * w2 + u3 * w3;
      a[at + k + 1]! -= q1 * v0 - q0 * v1 + q3 * v2 - q2 * v3 + u1 * w0 - u0 * w1 + u3 * w2 - u2 * w3;
      a[at + k + 2]! -= q2 * v0 - q3 * v1 - q0 * v2 + q1 * v3 + u2 * w0 - u3 * w1 - u0 * w2 + u1 * w3;
      a[at + k + 3]! -= q3 * v0 + q2 * v1 - q1 * v2 - q0 * v3 + u3 * w0 + u2 * w1 - u1 * w2 - u0 * w3;
    }
  }
}

/**
 * The n doubly degenerate eigenvalues, ascending, of a Hermitian n × n matrix of quaternions: row-major, lower triangle read
 * and destroyed. Throws `no-convergence`.
 */
export function quaternionEigenvalues(
  a: Float64Array,
  n: number,
  values = new Float64Array(n),
): Float64Array {
  if (n === 0) return values;
  const offDiagonal = new Float64Array(n);
  reduce(a, n, values, offDiagonal, new Float64Array(n), new Float64Array(4 * n));
  tridiagonalEigenvalues(values, offDiagonal, n);
  return values;
}

/**
 * Eigenvalues with one eigenvector per doublet, in the rows of `vectors`, four numbers per entry x = α + β j; as a state it is
 * Σ α_j |j⟩ − β_j* Θ|j⟩, and its time reverse is the other. Throws `no-convergence`.
 */
export function quaternionEigensystem(
  a: Float64Array,
  n: number,
): { readonly values: Float64Array; readonly vectors: Float64Array } {
  const values = new Float64Array(n);
  const vectors = new Float64Array(4 * n * n);
  if (n === 0) return { values, vectors };
  const offDiagonal = new Float64Array(n);
  const scales = new Float64Array(n);
  const phases = new Float64Array(4 * n);
  reduce(a, n, values, offDiagonal, scales, phases);
  const real = new Float64Array(n * n);
  for (let i = 0; i < n; i++) real[i * n + i] = 1;
  tridiagonalEigenvectors(values, offDiagonal, real, n, n);
  for (let k = 0; k < n; k++) {
    const at = 4 * k * n;
    for (let i = 0; i < n; i++)
      for (let c = 0; c < 4; c++) vectors[at + 4 * i + c] = phases[4 * i + c]! * real[k * n + i]!;
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
  const sum = new Float64Array(4);
  for (let i = 1; i < n; i++) {
    const h = scales[i]!;
    if (h === 0) continue;
    const row = 4 * i * n;
    sum.fill(0);
    for (let k = 0; k < 4 * i; k += 4) addProduct(sum, 0, quaternionAt(a, row + k), quaternionAt(z, at + k));
    const scaled = quaternionAt(sum, 0).map((value) => -value / h) as [number, number, number, number];
    for (let k = 0; k < 4 * i; k += 4) addProduct(z, at + k, conjugate(quaternionAt(a, row + k)), scaled);
  }
}
