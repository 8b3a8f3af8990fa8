import { SpinhueError } from '../../errors';

/** Sweeps allowed for one eigenvalue; the shifted QL iteration needs fewer than two on average. */
export const sweepLimit = 60;

export function noConvergence(size: number): SpinhueError {
  return new SpinhueError({
    code: 'no-convergence',
    message: `the eigenvalue iteration on a matrix of size ${size} did not converge`,
    field: 'matrix',
    remedy: 'check that every number in the problem is finite and of a reasonable size',
  });
}

/**
 * First index m ≥ `from` at which the off-diagonal element below it is negligible beside its two neighbours.
 * `squares[i]` couples i and i + 1.
 */
function splitFrom(from: number, size: number, diagonal: Float64Array, squares: Float64Array): number {
  let m = from;
  while (m < size - 1) {
    const scale = Math.abs(diagonal[m]!) + Math.abs(diagonal[m + 1]!);
    if (squares[m]! <= 4.93e-32 * scale * scale) break;
    m++;
  }
  return m;
}

/** Below this a squared quantity is treated as zero, so that its reciprocal stays finite. */
const tiny = 1e-290;

/**
 * Eigenvalues of a symmetric tridiagonal matrix, ascending, in place of `diagonal`. `offDiagonal[i]` couples i and i + 1
 * and is destroyed. Root-free QL iteration with implicit shift (Pal, Walker and Kahan; B. N. Parlett, The Symmetric
 * Eigenvalue Problem, SIAM 1998, section 8.15): absolute error of the order of the rounding of the norm.
 * Throws `no-convergence`.
 */
export function tridiagonalEigenvalues(
  diagonal: Float64Array,
  offDiagonal: Float64Array,
  size = diagonal.length,
): void {
  const squares = offDiagonal;
  for (let i = 0; i < size - 1; i++) squares[i] = offDiagonal[i]! * offDiagonal[i]!;
  for (let l = 0; l < size; l++) {
    for (let sweep = 0; ; sweep++) {
      const m = splitFrom(l, size, diagonal, squares);
      if (m === l) break;
      if (m === l + 1) {
        solvePair(diagonal, squares, l);
        l++;
        break;
      }
      if (sweep === sweepLimit) throw noConvergence(size);
      const below = Math.sqrt(squares[l]!);
      const half = (diagonal[l + 1]! - diagonal[l]!) / (2 * below);
      const root = Math.sqrt(half * half + 1);
      const shift = diagonal[l]! - below / (half + (half >= 0 ? root : -root));
      let c = 1;
      let s = 0;
      let gamma = diagonal[m]! - shift;
      let p = gamma * gamma;
      for (let i = m - 1; i >= l; i--) {
        const bb = squares[i]!;
        const r = p + bb;
        squares[i + 1] = s * r;
        const inverse = 1 / r;
        // The two divisions do not wait for one another.
        const stretch = p > tiny ? r / p : 0;
        const oldC = c;
        c = p * inverse;
        s = bb * inverse;
        const oldGamma = gamma;
        const alpha = diagonal[i]!;
        gamma = c * (alpha - shift) - s * oldGamma;
        diagonal[i + 1] = oldGamma + (alpha - gamma);
        p = stretch !== 0 ? gamma * gamma * stretch : oldC * bb;
      }
      squares[l] = s * p;
      diagonal[l] = shift + gamma;
      if (Number.isNaN(diagonal[l]!)) throw noConvergence(size);
    }
  }
  sortAscending(diagonal, size);
}

/** Both eigenvalues of the 2 × 2 matrix at l, which nothing couples to the rest. */
function solvePair(diagonal: Float64Array, squares: Float64Array, l: number): void {
  const mean = 0.5 * (diagonal[l]! + diagonal[l + 1]!);
  const half = 0.5 * (diagonal[l]! - diagonal[l + 1]!);
  const reach = Math.sqrt(half * half + squares[l]!);
  if (Number.isNaN(reach)) throw noConvergence(2);
  diagonal[l] = mean - reach;
  diagonal[l + 1] = mean + reach;
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
 * Eigenvalues (ascending, in place of `diagonal`) and the product of all rotations applied to the rows of `rows`:
 * on entry the row-major size × width matrix W, on return Zᵀ W where T = Z Λ Zᵀ. Rows are kept so that each rotation runs
 * over two contiguous stretches of memory. Implicit QL (J. H. Wilkinson and C. Reinsch, Linear Algebra, Springer 1971,
 * contribution II/4). Throws `no-convergence`.
 */
export function tridiagonalEigenvectors(
  diagonal: Float64Array,
  offDiagonal: Float64Array,
  rows: Float64Array,
  width: number,
  size = diagonal.length,
): void {
  for (let l = 0; l < size; l++) {
    for (let sweep = 0; ; sweep++) {
      let m = l;
      while (m < size - 1) {
        const scale = Math.abs(diagonal[m]!) + Math.abs(diagonal[m + 1]!);
        if (Math.abs(offDiagonal[m]!) <= 1.1e-16 * scale) break;
        m++;
      }
      if (m === l) break;
      if (sweep === sweepLimit) throw noConvergence(size);
      const half = (diagonal[l + 1]! - diagonal[l]!) / (2 * offDiagonal[l]!);
      const root = Math.sqrt(half * half + 1);
      let g = diagonal[m]! - diagonal[l]! + offDiagonal[l]! / (half + (half >= 0 ? root : -root));
      let s = 1;
      let c = 1;
      let p = 0;
      let i = m - 1;
      for (; i >= l; i--) {
        const f = s * offDiagonal[i]!;
        const b = c * offDiagonal[i]!;
        const r = Math.sqrt(f * f + g * g);
        if (i + 1 < size - 1 || i + 1 < m) offDiagonal[i + 1] = r;
        if (r === 0) {
          diagonal[i + 1]! -= p;
          offDiagonal[m] = 0;
          break;
        }
        s = f / r;
        c = g / r;
        g = diagonal[i + 1]! - p;
        const t = (diagonal[i]! - g) * s + 2 * c * b;
        p = s * t;
        diagonal[i + 1] = g + p;
        g = c * t - b;
        rotateRows(rows, width, i, c, s);
      }
      if (i >= l) continue;
      diagonal[l]! -= p;
      offDiagonal[l] = g;
      if (m < size - 1) offDiagonal[m] = 0;
      if (Number.isNaN(diagonal[l]!)) throw noConvergence(size);
    }
  }
  sortRows(diagonal, rows, width, size);
}

function rotateRows(rows: Float64Array, width: number, i: number, c: number, s: number): void {
  const upper = i * width;
  const lower = upper + width;
  for (let k = 0; k < width; k++) {
    const f = rows[lower + k]!;
    const u = rows[upper + k]!;
    rows[lower + k] = s * u + c * f;
    rows[upper + k] = c * u - s * f;
  }
}

function sortRows(values: Float64Array, rows: Float64Array, width: number, size: number): void {
  for (let i = 0; i < size - 1; i++) {
    let least = i;
    for (let j = i + 1; j < size; j++) if (values[j]! < values[least]!) least = j;
    if (least === i) continue;
    const value = values[i]!;
    values[i] = values[least]!;
    values[least] = value;
    for (let k = 0; k < width; k++) {
      const entry = rows[i * width + k]!;
      rows[i * width + k] = rows[least * width + k]!;
      rows[least * width + k] = entry;
    }
  }
}
