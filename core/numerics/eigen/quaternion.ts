import { tridiagonalEigenvalues, tridiagonalEigenvectors } from './tridiagonal';
import { scratchVectors } from './workspace';

/*
 * A Hamiltonian of an odd number of electrons without magnetic field, over states |j⟩ and their time reverses Θ|j⟩, is the
 * 2n × 2n complex matrix [[A, B], [−B*, A*]]. That is an n × n Hermitian matrix of quaternions a + b j, a = ⟨j|H|k⟩,
 * b = ⟨j|H|Θk⟩, whose n eigenvalues are the Kramers doublets: half the work of the complex matrix (A. Bunse-Gerstner,
 * R. Byers and V. Mehrmann, Numer. Math. 55, 83, 1989). Four numbers per element: re a, im a, re b, im b.
 */

const reductionScratch = scratchVectors(4);

/**
 * Householder reduction to a real symmetric tridiagonal matrix. Before each reflection a diagonal matrix of unit quaternions
 * makes the column real, so that the reflection itself is real: 48 multiplications per element and step instead of 64.
 * On return row i of `a` holds the phases of step i; `reflectors`, where given, row i its Householder vector and
 * `scales[i]` half the squared length of that (0 where nothing was reflected).
 */
function reduce(
  a: Float64Array,
  n: number,
  diagonal: Float64Array,
  offDiagonal: Float64Array,
  scales: Float64Array,
  reflectors: Float64Array | null,
): void {
  let [u, q, v, p] = reductionScratch(4 * n) as [Float64Array, Float64Array, Float64Array, Float64Array];
  u.fill(0, 0, n);
  q.fill(0, 0, 4 * n);
  for (let i = n - 1; i > 0; i--) {
    const row = 4 * i * n;
    subtractFromRow(a, row, i, u, q);
    diagonal[i] = a[row + 4 * i]!;
    const tail = phasesOfRow(a, row, i, v);
    const last = v[i - 1]!;
    const length = Math.sqrt(tail + last * last);
    const reflects = tail !== 0;
    const h = reflects ? length * (length + last) : 1;
    scales[i] = reflects ? h : 0;
    offDiagonal[i - 1] = reflects ? -length : last;
    if (reflects) v[i - 1] = last + length;
    else v.fill(0, 0, i);
    if (reflectors !== null) reflectors.set(v.subarray(0, i), i * n);
    p.fill(0, 0, 4 * i);
    updateAndMultiply(a, n, i, u, q, v, p);
    let vp = 0;
    for (let k = 0; k < i; k++) vp += v[k]! * p[4 * k]!;
    const shift = vp / (2 * h * h);
    for (let k = 0; k < 4 * i; k++) p[k] = p[k]! / h - (k % 4 === 0 ? shift * v[k >> 2]! : 0);
    [u, v] = [v, u];
    [q, p] = [p, q];
  }
  diagonal[0] = a[0]! - 2 * u[0]! * q[0]!;
}

/** Row i of A − q uᵀ − u q† up to the diagonal, u real. */
function subtractFromRow(a: Float64Array, row: number, i: number, u: Float64Array, q: Float64Array): void {
  const ui = u[i]!;
  const q0 = q[4 * i]!;
  const q1 = q[4 * i + 1]!;
  const q2 = q[4 * i + 2]!;
  const q3 = q[4 * i + 3]!;
  for (let k = 0, c = 0; k <= i; k++, c += 4) {
    const uk = u[k]!;
    a[row + c]! -= q0 * uk + ui * q[c]!;
    a[row + c + 1]! -= q1 * uk - ui * q[c + 1]!;
    a[row + c + 2]! -= q2 * uk - ui * q[c + 2]!;
    a[row + c + 3]! -= q3 * uk - ui * q[c + 3]!;
  }
}

/**
 * Splits the column above the diagonal (the conjugate of row i) into moduli, `v`, and unit quaternions, left in the row.
 * Returns the sum of the squared moduli without the last.
 */
function phasesOfRow(a: Float64Array, row: number, i: number, v: Float64Array): number {
  let tail = 0;
  for (let k = 0, c = row; k < i; k++, c += 4) {
    const x0 = a[c]!;
    const x1 = a[c + 1]!;
    const x2 = a[c + 2]!;
    const x3 = a[c + 3]!;
    const square = x0 * x0 + x1 * x1 + x2 * x2 + x3 * x3;
    const modulus = Math.sqrt(square);
    v[k] = modulus;
    if (k < i - 1) tail += square;
    const inverse = modulus === 0 ? 0 : 1 / modulus;
    a[c] = modulus === 0 ? 1 : x0 * inverse;
    a[c + 1] = -x1 * inverse;
    a[c + 2] = -x2 * inverse;
    a[c + 3] = -x3 * inverse;
  }
  return tail;
}

/**
 * A ← D† (A − q uᵀ − u q†) D and p += A v in one pass over the leading m × m part; u and v real, the phases D in row m.
 */
function updateAndMultiply(
  a: Float64Array,
  n: number,
  m: number,
  u: Float64Array,
  q: Float64Array,
  v: Float64Array,
  p: Float64Array,
): void {
  const phases = 4 * m * n;
  for (let j = 0; j < m; j++) {
    const at = 4 * j * n;
    const e = 4 * j;
    const uj = u[j]!;
    const vj = v[j]!;
    const q0 = q[e]!;
    const q1 = q[e + 1]!;
    const q2 = q[e + 2]!;
    const q3 = q[e + 3]!;
    const e0 = a[phases + e]!;
    const e1 = a[phases + e + 1]!;
    const e2 = a[phases + e + 2]!;
    const e3 = a[phases + e + 3]!;
    let s0 = 0;
    let s1 = 0;
    let s2 = 0;
    let s3 = 0;
    for (let k = 0, c = 0; k < j; k++, c += 4) {
      const uk = u[k]!;
      const x0 = a[at + c]! - q0 * uk - uj * q[c]!;
      const x1 = a[at + c + 1]! - q1 * uk + uj * q[c + 1]!;
      const x2 = a[at + c + 2]! - q2 * uk + uj * q[c + 2]!;
      const x3 = a[at + c + 3]! - q3 * uk + uj * q[c + 3]!;
      const f0 = a[phases + c]!;
      const f1 = a[phases + c + 1]!;
      const f2 = a[phases + c + 2]!;
      const f3 = a[phases + c + 3]!;
      const t0 = x0 * f0 - x1 * f1 - x2 * f2 - x3 * f3;
      const t1 = x0 * f1 + x1 * f0 + x2 * f3 - x3 * f2;
      const t2 = x0 * f2 - x1 * f3 + x2 * f0 + x3 * f1;
      const t3 = x0 * f3 + x1 * f2 - x2 * f1 + x3 * f0;
      const y0 = e0 * t0 + e1 * t1 + e2 * t2 + e3 * t3;
      const y1 = e0 * t1 - e1 * t0 - e2 * t3 + e3 * t2;
      const y2 = e0 * t2 + e1 * t3 - e2 * t0 - e3 * t1;
      const y3 = e0 * t3 - e1 * t2 + e2 * t1 - e3 * t0;
      a[at + c] = y0;
      a[at + c + 1] = y1;
      a[at + c + 2] = y2;
      a[at + c + 3] = y3;
      const vk = v[k]!;
      s0 += y0 * vk;
      s1 += y1 * vk;
      s2 += y2 * vk;
      s3 += y3 * vk;
      p[c]! += y0 * vj;
      p[c + 1]! -= y1 * vj;
      p[c + 2]! -= y2 * vj;
      p[c + 3]! -= y3 * vj;
    }
    const corner = a[at + e]! - 2 * q0 * uj;
    a[at + e] = corner;
    p[e]! += s0 + corner * vj;
    p[e + 1]! += s1;
    p[e + 2]! += s2;
    p[e + 3]! += s3;
  }
}

const solutionScratch = scratchVectors(2);

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
  const [offDiagonal, scales] = solutionScratch(n) as [Float64Array, Float64Array];
  reduce(a, n, values, offDiagonal, scales, null);
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
  const [offDiagonal, scales] = solutionScratch(n) as [Float64Array, Float64Array];
  const reflectors = new Float64Array(n * n);
  reduce(a, n, values, offDiagonal, scales, reflectors);
  const real = new Float64Array(n * n);
  for (let i = 0; i < n; i++) real[i * n + i] = 1;
  tridiagonalEigenvectors(values, offDiagonal, real, n, n);
  for (let k = 0; k < n; k++) {
    for (let i = 0; i < n; i++) vectors[4 * (k * n + i)] = real[k * n + i]!;
    const vector = vectors.subarray(4 * k * n, 4 * (k + 1) * n);
    for (let i = 1; i < n; i++) {
      if (scales[i] !== 0) reflect(vector, reflectors.subarray(i * n, i * n + i), scales[i]!);
      turn(vector, a, 4 * i * n, i);
    }
  }
  return { values, vectors };
}

/** z − v (vᵀ z)/h. */
function reflect(z: Float64Array, v: Float64Array, h: number): void {
  for (let c = 0; c < 4; c++) {
    let sum = 0;
    for (let k = 0; k < v.length; k++) sum += v[k]! * z[4 * k + c]!;
    sum /= h;
    for (let k = 0; k < v.length; k++) z[4 * k + c]! -= sum * v[k]!;
  }
}

/** z_k ← d_k z_k for the first `count` entries. */
function turn(z: Float64Array, a: Float64Array, at: number, count: number): void {
  for (let c = 0; c < 4 * count; c += 4) {
    const d0 = a[at + c]!;
    const d1 = a[at + c + 1]!;
    const d2 = a[at + c + 2]!;
    const d3 = a[at + c + 3]!;
    const z0 = z[c]!;
    const z1 = z[c + 1]!;
    const z2 = z[c + 2]!;
    const z3 = z[c + 3]!;
    z[c] = d0 * z0 - d1 * z1 - d2 * z2 - d3 * z3;
    z[c + 1] = d0 * z1 + d1 * z0 + d2 * z3 - d3 * z2;
    z[c + 2] = d0 * z2 - d1 * z3 + d2 * z0 + d3 * z1;
    z[c + 3] = d0 * z3 + d1 * z2 - d2 * z1 + d3 * z0;
  }
}
