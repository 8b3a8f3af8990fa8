import { CholeskyDecomposition, Matrix } from 'ml-matrix';

/** What observations say about parameters that were known before to one standard deviation each. */
export interface GaussianUpdate {
  /** Shift of each parameter, in units of its prior standard deviation. */
  readonly shift: readonly number[];
  /** Posterior standard deviation over prior standard deviation. */
  readonly narrowed: readonly number[];
  /** Weight of each observation, 1 for an ordinary one; an outlier counts for less. */
  readonly weights: readonly number[];
}

/** Degrees of freedom of Student's t that stands for the noise: its long tails let outliers be outliers. */
const tails = 4;

/**
 * Least squares with shrinkage: parameters z with prior N(0, 1) each, observations y = A z + noise with variances N.
 * The solution z = A' (A A' + N)^-1 y minimises the weighted squares of the residuals plus the squares of the shifts (the
 * posterior mean of the linear Gaussian model). Noise
 * has long tails: observations far off are given less weight, by turns (K. L. Lange, R. J. A. Little, J. M. G. Taylor,
 * J. Am. Stat. Assoc. 84, 881, 1989). Rows of `design` are observations.
 */
export function gaussianUpdate(
  design: readonly (readonly number[])[],
  observed: readonly number[],
  variances: readonly number[],
): GaussianUpdate {
  const n = design[0]?.length ?? 0;
  let weights = observed.map(() => 1);
  let update = solve(design, observed, variances, n);
  for (let round = 0; round < 8; round++) {
    weights = design.map((row, i) => {
      const fitted = row.reduce((sum, value, j) => sum + value * update.shift[j]!, 0);
      const variance = Math.max(variances[i]!, 1e-12);
      return Math.min(1, (tails + 1) / (tails + (observed[i]! - fitted) ** 2 / variance));
    });
    update = solve(
      design,
      observed,
      variances.map((variance, i) => variance / weights[i]!),
      n,
    );
  }
  return { ...update, weights };
}

function solve(
  design: readonly (readonly number[])[],
  observed: readonly number[],
  variances: readonly number[],
  n: number,
): { shift: number[]; narrowed: number[] } {
  if (design.length === 0 || n === 0) {
    return { shift: new Array<number>(n).fill(0), narrowed: new Array<number>(n).fill(1) };
  }
  const A = new Matrix(design.map((row) => [...row]));
  const S = A.mmul(A.transpose());
  for (let i = 0; i < variances.length; i++) S.set(i, i, S.get(i, i) + Math.max(variances[i]!, 1e-12));
  const chol = new CholeskyDecomposition(S);
  const solved = chol.solve(Matrix.columnVector([...observed]));
  const shift = A.transpose().mmul(solved).to1DArray();
  const gain = chol.solve(A);
  const narrowed = Array.from({ length: n }, (_, j) => {
    let known = 0;
    for (let i = 0; i < design.length; i++) known += A.get(i, j) * gain.get(i, j);
    return Math.sqrt(Math.max(0, 1 - known));
  });
  return { shift, narrowed };
}
