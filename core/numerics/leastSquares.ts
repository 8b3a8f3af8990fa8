import { CholeskyDecomposition, Matrix, SingularValueDecomposition } from 'ml-matrix';

export interface LeastSquaresProblem {
  /** Number of residuals. */
  readonly points: number;
  readonly start: readonly number[];
  readonly lower: readonly number[];
  readonly upper: readonly number[];
  /**
   * Fills the residuals (model minus data, each over its standard deviation where one is known) and, unless null, the
   * Jacobian row by row: `jacobian[i * n + j]` is d residual i / d parameter j.
   */
  readonly evaluate: (
    parameters: Float64Array,
    residuals: Float64Array,
    jacobian: Float64Array | null,
  ) => void;
  readonly maxIterations?: number;
}

export type FitStatus = 'converged' | 'at bound' | 'not identifiable' | 'no convergence';

export interface LeastSquaresResult {
  readonly parameters: readonly number[];
  /** Sum of squared residuals. */
  readonly rss: number;
  readonly iterations: number;
  readonly status: FitStatus;
  /** Parameters that ended on a bound. */
  readonly atBound: readonly boolean[];
  /**
   * Inverse of the normal matrix over the parameters that are free, zero elsewhere; times rss / (points - free) it is the
   * covariance of the parameters. Null where the data leave a direction of the parameters open.
   */
  readonly inverseNormal: readonly (readonly number[])[] | null;
  /** Free parameters that take part in a direction which the data do not determine. */
  readonly undetermined: readonly number[];
}

/** Largest ratio of singular values of the column-scaled Jacobian that still counts as determined. */
const worstCondition = 1e7;

function clampInto(target: Float64Array, lower: readonly number[], upper: readonly number[]): void {
  for (let j = 0; j < target.length; j++) target[j] = Math.min(Math.max(target[j]!, lower[j]!), upper[j]!);
}

const squares = (values: Float64Array): number => {
  let sum = 0;
  for (const value of values) sum += value * value;
  return sum;
};

/** Parameters that may move: not on a bound, or on one from which the gradient leads away. */
function freeIndices(p: Float64Array, gradient: Float64Array, problem: LeastSquaresProblem): number[] {
  const free: number[] = [];
  for (let j = 0; j < p.length; j++) {
    const held =
      problem.lower[j] === problem.upper[j] ||
      (p[j]! <= problem.lower[j]! && gradient[j]! > 0) ||
      (p[j]! >= problem.upper[j]! && gradient[j]! < 0);
    if (!held) free.push(j);
  }
  return free;
}

/**
 * Damped least squares within bounds: Levenberg (Quart. Appl. Math. 2, 164, 1944) and Marquardt (J. Soc. Ind. Appl.
 * Math. 11, 431, 1963) with the scaling by column norms that never shrink of Moré (Lecture Notes in Math. 630, 105,
 * 1978), the damping rule of Nielsen (IMM-REP-1999-05), and steps cut at the bounds; a parameter on a bound is held while
 * the gradient pushes outward.
 */
export function leastSquares(problem: LeastSquaresProblem): LeastSquaresResult {
  const n = problem.start.length;
  const m = problem.points;
  const p = Float64Array.from(problem.start);
  clampInto(p, problem.lower, problem.upper);
  const residuals = new Float64Array(m);
  const trialResiduals = new Float64Array(m);
  const jacobian = new Float64Array(m * n);
  const gradient = new Float64Array(n);
  const scale = new Float64Array(n);
  const normal = new Float64Array(n * n);

  const linearise = () => {
    gradient.fill(0);
    normal.fill(0);
    for (let i = 0; i < m; i++) {
      const row = i * n;
      for (let j = 0; j < n; j++) {
        const a = jacobian[row + j]!;
        if (a === 0) continue;
        gradient[j]! += a * residuals[i]!;
        for (let k = 0; k <= j; k++) normal[j * n + k]! += a * jacobian[row + k]!;
      }
    }
    for (let j = 0; j < n; j++) {
      for (let k = j + 1; k < n; k++) normal[j * n + k] = normal[k * n + j]!;
      scale[j] = Math.max(scale[j]!, normal[j * n + j]!);
    }
  };

  problem.evaluate(p, residuals, jacobian);
  let rss = squares(residuals);
  linearise();
  let damping = 1e-3;
  let growth = 2;
  let iterations = 0;
  let converged = false;
  const limit = problem.maxIterations ?? 500;
  const trial = new Float64Array(n);
  while (iterations < limit && Number.isFinite(rss)) {
    iterations++;
    const free = freeIndices(p, gradient, problem);
    // The gradient is small when the residuals are orthogonal to every column of the Jacobian.
    const orthogonal = free.every(
      (j) => Math.abs(gradient[j]!) <= 1e-10 * Math.sqrt(rss * normal[j * n + j]!) + Number.MIN_VALUE,
    );
    if (free.length === 0 || orthogonal || rss === 0) {
      converged = true;
      break;
    }
    const system = Matrix.zeros(free.length, free.length);
    const right = Matrix.zeros(free.length, 1);
    for (const [a, j] of free.entries()) {
      right.set(a, 0, -gradient[j]!);
      for (const [b, k] of free.entries()) system.set(a, b, normal[j * n + k]!);
      const weight = scale[j]! > 0 ? scale[j]! : 1;
      system.set(a, a, system.get(a, a) + damping * weight);
    }
    const decomposition = new CholeskyDecomposition(system);
    if (!decomposition.isPositiveDefinite()) {
      damping = Math.max(damping, 1e-12) * growth;
      growth *= 2;
      if (damping > 1e20) break;
      continue;
    }
    const step = decomposition.solve(right);
    trial.set(p);
    for (const [a, j] of free.entries()) trial[j] = p[j]! + step.get(a, 0);
    clampInto(trial, problem.lower, problem.upper);
    let promised = 0;
    let longest = 0;
    for (let j = 0; j < n; j++) {
      const by = trial[j]! - p[j]!;
      let curved = 0;
      for (let k = 0; k < n; k++) curved += normal[j * n + k]! * (trial[k]! - p[k]!);
      promised -= by * (2 * gradient[j]! + curved);
      longest = Math.max(longest, Math.abs(by) / (Math.abs(p[j]!) + 1e-300 + 1e-12 * (1 + Math.abs(p[j]!))));
    }
    problem.evaluate(trial, trialResiduals, null);
    const trialRss = squares(trialResiduals);
    const gain = promised > 0 ? (rss - trialRss) / promised : -1;
    if (Number.isFinite(trialRss) && trialRss < rss && gain > 0) {
      const fell = (rss - trialRss) / rss;
      p.set(trial);
      problem.evaluate(p, residuals, jacobian);
      rss = squares(residuals);
      linearise();
      damping *= Math.max(1 / 3, 1 - (2 * gain - 1) ** 3);
      growth = 2;
      if (longest < 1e-10 || (fell < 1e-13 && longest < 1e-6)) {
        converged = true;
        break;
      }
    } else {
      // No lower point within rounding along a step that promised next to nothing: this is the minimum.
      if (longest < 1e-10 || promised <= 1e-14 * rss) {
        converged = true;
        break;
      }
      damping *= growth;
      growth *= 2;
      if (damping > 1e20) break;
    }
  }
  return describe(problem, p, jacobian, rss, iterations, converged);
}

function describe(
  problem: LeastSquaresProblem,
  p: Float64Array,
  jacobian: Float64Array,
  rss: number,
  iterations: number,
  converged: boolean,
): LeastSquaresResult {
  const n = p.length;
  const m = problem.points;
  const held = problem.lower.map((low, j) => low === problem.upper[j]);
  const atBound = Array.from(
    p,
    (value, j) => !held[j] && (value <= problem.lower[j]! || value >= problem.upper[j]!),
  );
  const free = Array.from(p, (_, j) => j).filter((j) => !held[j] && !atBound[j]);
  const norms = free.map((j) => {
    let sum = 0;
    for (let i = 0; i < m; i++) sum += jacobian[i * n + j]! ** 2;
    return Math.sqrt(sum);
  });
  const silent = free.filter((_, a) => !(norms[a]! > 0));
  const undetermined = new Set(silent);
  let inverseNormal: number[][] | null = null;
  if (free.length === 0) inverseNormal = Array.from({ length: n }, () => new Array<number>(n).fill(0));
  else if (free.length > m) for (const j of free) undetermined.add(j);
  else if (silent.length === 0) {
    const scaled = Matrix.zeros(m, free.length);
    for (let i = 0; i < m; i++) {
      for (const [a, j] of free.entries()) scaled.set(i, a, jacobian[i * n + j]! / norms[a]!);
    }
    const svd = new SingularValueDecomposition(scaled, { computeLeftSingularVectors: false });
    const values = svd.diagonal;
    const vectors = svd.rightSingularVectors;
    const largest = Math.max(...values);
    for (const [k, value] of values.entries()) {
      if (value * worstCondition > largest) continue;
      for (const [a, j] of free.entries()) if (Math.abs(vectors.get(a, k)) > 0.1) undetermined.add(j);
    }
    if (undetermined.size === 0) {
      inverseNormal = Array.from({ length: n }, () => new Array<number>(n).fill(0));
      for (const [a, j] of free.entries()) {
        for (const [b, k] of free.entries()) {
          let sum = 0;
          for (let q = 0; q < values.length; q++)
            sum += (vectors.get(a, q) * vectors.get(b, q)) / values[q]! ** 2;
          inverseNormal[j]![k] = sum / (norms[a]! * norms[b]!);
        }
      }
    }
  }
  let status: FitStatus = 'converged';
  if (!converged) status = 'no convergence';
  else if (undetermined.size > 0) status = 'not identifiable';
  else if (atBound.includes(true)) status = 'at bound';
  return {
    parameters: Array.from(p),
    rss,
    iterations,
    status,
    atBound,
    inverseNormal,
    undetermined: [...undetermined].sort((a, b) => a - b),
  };
}

/** Correlation matrix of a covariance (or inverse normal) matrix; rows of parameters without variance are zero. */
export function correlationOf(covariance: readonly (readonly number[])[]): number[][] {
  return covariance.map((row, i) =>
    row.map((value, j) => {
      const size = Math.sqrt(covariance[i]![i]! * covariance[j]![j]!);
      if (i === j) return 1;
      return size > 0 ? value / size : 0;
    }),
  );
}
