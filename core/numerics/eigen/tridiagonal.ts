import { SpinhueError } from '../../errors';

/*
 * Why the scratch arrays of these files are constants of the module and the inner loops functions of their own: the just-in-time
 * compiler then knows where the numbers are and keeps a loop's values in registers, which makes the loops two to three times
 * faster than the same loops over arrays handed in. Nothing is called back while they are in use.
 */

/** Largest matrix, real, complex or quaternion: the d shell needs 252. */
export const largestSize = 256;

/** Refuses what does not fit the scratch arrays. */
export function requireSize(size: number): void {
  if (size <= largestSize) return;
  throw new SpinhueError({
    code: 'too-large',
    message: `a matrix of size ${size} is larger than ${largestSize}`,
    field: 'matrix',
  });
}

/** Sweeps allowed for one eigenvalue; the shifted QL iteration needs fewer than two on average. */
const sweepLimit = 60;

function noConvergence(size: number): SpinhueError {
  return new SpinhueError({
    code: 'no-convergence',
    message: `the eigenvalue iteration on a matrix of size ${size} did not converge`,
    field: 'matrix',
    remedy: 'check that every number in the problem is finite and of a reasonable size',
  });
}

/** Diagonal and off-diagonal; `offDiagonal[i]` couples i and i + 1. The reductions leave their result here. */
export const diagonal = new Float64Array(largestSize);
export const offDiagonal = new Float64Array(largestSize + 1);
const D = diagonal;
const E = offDiagonal;

/** Negligible beside the neighbours: the rounding of a double, squared. */
const negligibleSquare = 4.93e-32;
/** Below this a squared quantity is treated as zero, so that its reciprocal stays finite. */
const tiny = 1e-290;

/** First index m ≥ `from` whose coupling to the next is negligible; E holds squares. */
function splitFrom(from: number, size: number): number {
  let m = from;
  for (; m < size - 1; m++) {
    const scale = Math.abs(D[m]!) + Math.abs(D[m + 1]!);
    if (E[m]! <= negligibleSquare * scale * scale) break;
  }
  return m;
}

/** One root-free QL sweep from m up to l. */
function sweep(l: number, m: number, shift: number): void {
  let c = 1;
  let s = 0;
  let gamma = D[m]! - shift;
  let p = gamma * gamma;
  for (let i = m - 1; i >= l; i--) {
    const bb = E[i]!;
    const r = p + bb;
    E[i + 1] = s * r;
    // The two divisions do not wait for one another.
    const inverse = 1 / r;
    const stretch = p > tiny ? r / p : 0;
    const oldC = c;
    c = p * inverse;
    s = bb * inverse;
    const oldGamma = gamma;
    const alpha = D[i]!;
    gamma = c * (alpha - shift) - s * oldGamma;
    D[i + 1] = oldGamma + (alpha - gamma);
    p = stretch !== 0 ? gamma * gamma * stretch : oldC * bb;
  }
  E[l] = s * p;
  D[l] = shift + gamma;
}

/** Wilkinson's shift at l from the coupling `below` to l + 1. */
function shiftAt(l: number, below: number): number {
  const half = (D[l + 1]! - D[l]!) / (2 * below);
  const root = Math.sqrt(half * half + 1);
  return D[l]! - below / (half + (half >= 0 ? root : -root));
}

/**
 * Eigenvalues, ascending, of the symmetric tridiagonal matrix in `diagonal` and `offDiagonal`, into `values`. Root-free QL
 * iteration with implicit shift (Pal, Walker and Kahan; B. N. Parlett, The Symmetric Eigenvalue Problem, SIAM 1998, section
 * 8.15): absolute error of the order of the rounding of the norm. Throws `no-convergence`.
 */
export function tridiagonalEigenvalues(size: number, values: Float64Array): void {
  for (let i = 0; i < size - 1; i++) E[i] = E[i]! * E[i]!;
  for (let l = 0; l < size; l++) {
    for (let count = 0; ; count++) {
      const m = splitFrom(l, size);
      if (m === l) break;
      if (m === l + 1) {
        solvePair(l);
        l++;
        break;
      }
      if (count === sweepLimit) throw noConvergence(size);
      sweep(l, m, shiftAt(l, Math.sqrt(E[l]!)));
      if (Number.isNaN(D[l]!)) throw noConvergence(size);
    }
  }
  for (let i = 0; i < size; i++) values[i] = D[i]!;
  sortAscending(values, size);
}

/** Both eigenvalues of the 2 × 2 matrix at l, which nothing couples to the rest. */
function solvePair(l: number): void {
  const mean = 0.5 * (D[l]! + D[l + 1]!);
  const half = 0.5 * (D[l]! - D[l + 1]!);
  const reach = Math.sqrt(half * half + E[l]!);
  if (Number.isNaN(reach)) throw noConvergence(2);
  D[l] = mean - reach;
  D[l + 1] = mean + reach;
}

function sortAscending(values: Float64Array, size: number): void {
  if (size > 40) {
    values.subarray(0, size).sort();
    return;
  }
  for (let i = 1; i < size; i++) {
    const value = values[i]!;
    let j = i - 1;
    for (; j >= 0 && values[j]! > value; j--) values[j + 1] = values[j]!;
    values[j + 1] = value;
  }
}

/**
 * Eigenvectors of the tridiagonal matrix: entry k of eigenvector j at k · size + j. A sweep then runs along each row, and four
 * rows are turned at once.
 */
export const vectorColumns = new Float64Array(largestSize * largestSize);
const Z = vectorColumns;
/** Cosine and sine of the rotations of the sweep at hand. */
const cosines = new Float64Array(largestSize);
const sines = new Float64Array(largestSize);

/**
 * Eigenvalues into `values` (in the order of the columns, not sorted), normalised eigenvectors into `vectorColumns`. Implicit
 * QL (J. H. Wilkinson and C. Reinsch, Linear Algebra, Springer 1971, contribution II/4). Throws `no-convergence`.
 */
export function tridiagonalEigenvectors(size: number, values: Float64Array): void {
  Z.fill(0, 0, size * size);
  for (let i = 0; i < size; i++) Z[i * size + i] = 1;
  for (let l = 0; l < size; l++) {
    for (let count = 0; ; count++) {
      let m = l;
      for (; m < size - 1; m++) {
        if (Math.abs(E[m]!) <= 1.1e-16 * (Math.abs(D[m]!) + Math.abs(D[m + 1]!))) break;
      }
      if (m === l) break;
      if (count === sweepLimit) throw noConvergence(size);
      const from = sweepWithRotations(l, m);
      let k = 0;
      for (; k + 4 <= size; k += 4) turnFourRows(k * size, size, from, m);
      for (; k < size; k++) turnRow(k * size, from, m);
      if (Number.isNaN(D[l]!)) throw noConvergence(size);
    }
  }
  for (let i = 0; i < size; i++) values[i] = D[i]!;
}

/** One implicit QL sweep from m up to l; its rotations are noted. Returns where it ended, l unless it broke off. */
function sweepWithRotations(l: number, m: number): number {
  let g = D[m]! - shiftAt(l, E[l]!);
  let s = 1;
  let c = 1;
  let p = 0;
  for (let i = m - 1; i >= l; i--) {
    const f = s * E[i]!;
    const b = c * E[i]!;
    const r = Math.sqrt(f * f + g * g);
    E[i + 1] = r;
    if (r === 0) {
      D[i + 1]! -= p;
      E[m] = 0;
      return i + 1;
    }
    s = f / r;
    c = g / r;
    g = D[i + 1]! - p;
    const t = (D[i]! - g) * s + 2 * c * b;
    p = s * t;
    D[i + 1] = g + p;
    g = c * t - b;
    cosines[i] = c;
    sines[i] = s;
  }
  D[l]! -= p;
  E[l] = g;
  E[m] = 0;
  return l;
}

/** The noted rotations from m − 1 up to l on one row. */
function turnRow(at: number, l: number, m: number): void {
  let x = Z[at + m]!;
  for (let i = m - 1; i >= l; i--) {
    const c = cosines[i]!;
    const s = sines[i]!;
    const u = Z[at + i]!;
    Z[at + i + 1] = s * u + c * x;
    x = c * u - s * x;
  }
  Z[at + l] = x;
}

/** The same on four rows, whose chains do not wait for one another. */
function turnFourRows(at: number, size: number, l: number, m: number): void {
  const bt = at + size;
  const ct = bt + size;
  const dt = ct + size;
  let x = Z[at + m]!;
  let y = Z[bt + m]!;
  let z = Z[ct + m]!;
  let w = Z[dt + m]!;
  for (let i = m - 1; i >= l; i--) {
    const c = cosines[i]!;
    const s = sines[i]!;
    const a = Z[at + i]!;
    const b = Z[bt + i]!;
    const d = Z[ct + i]!;
    const e = Z[dt + i]!;
    Z[at + i + 1] = s * a + c * x;
    Z[bt + i + 1] = s * b + c * y;
    Z[ct + i + 1] = s * d + c * z;
    Z[dt + i + 1] = s * e + c * w;
    x = c * a - s * x;
    y = c * b - s * y;
    z = c * d - s * z;
    w = c * e - s * w;
  }
  Z[at + l] = x;
  Z[bt + l] = y;
  Z[ct + l] = z;
  Z[dt + l] = w;
}

/** Sorts the eigenvalues; `order[j]` is the column of the j-th. */
export function sortEigenvalues(values: Float64Array): number[] {
  const order = Array.from(values.keys()).sort((i, j) => values[i]! - values[j]!);
  values.sort();
  return order;
}
