import { describe, expect, it } from 'vitest';
import { leastSquares, type LeastSquaresProblem } from './leastSquares';

const unbounded = (n: number) => ({
  lower: new Array<number>(n).fill(-Infinity),
  upper: new Array<number>(n).fill(Infinity),
});

/** Problem from a model and its derivatives over data points. */
function curve(
  x: readonly number[],
  y: readonly number[],
  start: readonly number[],
  model: (p: Float64Array, x: number) => number,
  slopes: (p: Float64Array, x: number) => readonly number[],
  bounds = unbounded(start.length),
): LeastSquaresProblem {
  return {
    points: x.length,
    start,
    ...bounds,
    evaluate(p, residuals, jacobian) {
      for (let i = 0; i < x.length; i++) {
        residuals[i] = model(p, x[i]!) - y[i]!;
        if (jacobian)
          for (const [j, slope] of slopes(p, x[i]!).entries()) jacobian[i * start.length + j] = slope;
      }
    },
  };
}

describe('damped least squares', () => {
  // NIST Statistical Reference Datasets, nonlinear regression, Misra1a (D. Misra, 1978), certified values as published
  // on itl.nist.gov/div898/strd (from memory): b1 2.3894212918E+02, sd 2.7070075241E+00; b2 5.5015643181E-04, sd
  // 7.2668688436E-06; residual sum of squares 1.2455138894E-01. Start 1 of that page.
  it('reach the certified values of the NIST data set Misra1a from its far start', () => {
    const x = [
      77.6, 114.9, 141.1, 190.8, 239.9, 289.0, 332.8, 378.4, 434.8, 477.3, 536.8, 593.1, 689.1, 760.0,
    ];
    const y = [
      10.07, 14.73, 17.94, 23.93, 29.61, 35.18, 40.02, 44.82, 50.76, 55.05, 61.01, 66.4, 75.47, 81.78,
    ];
    const fit = leastSquares(
      curve(
        x,
        y,
        [500, 0.0001],
        (p, t) => p[0]! * (1 - Math.exp(-p[1]! * t)),
        (p, t) => [1 - Math.exp(-p[1]! * t), p[0]! * t * Math.exp(-p[1]! * t)],
      ),
    );
    expect(fit.status).toBe('converged');
    expect(fit.parameters[0]).toBeCloseTo(238.94212918, 5);
    expect(fit.parameters[1]! * 1e4).toBeCloseTo(5.5015643181, 7);
    expect(fit.rss).toBeCloseTo(0.12455138894, 9);
    const variance = fit.rss / (x.length - 2);
    expect(Math.sqrt(variance * fit.inverseNormal![0]![0]!)).toBeCloseTo(2.7070075241, 6);
    expect(Math.sqrt(variance * fit.inverseNormal![1]![1]!) * 1e6).toBeCloseTo(7.2668688436, 5);
  });

  it('solve a straight line in closed form, with the textbook standard errors', () => {
    // y = 1, 3, 2, 5 at x = 0..3: slope 1.1, intercept 1.1, rss 2.7 (sums done by hand).
    const fit = leastSquares(
      curve(
        [0, 1, 2, 3],
        [1, 3, 2, 5],
        [0, 0],
        (p, x) => p[0]! + p[1]! * x,
        (_, x) => [1, x],
      ),
    );
    expect(fit.parameters[0]).toBeCloseTo(1.1, 10);
    expect(fit.parameters[1]).toBeCloseTo(1.1, 10);
    expect(fit.rss).toBeCloseTo(2.7, 10);
    expect(fit.inverseNormal![1]![1]).toBeCloseTo(1 / 5, 10);
    expect(fit.inverseNormal![0]![0]).toBeCloseTo(1 / 4 + 1.5 ** 2 / 5, 10);
  });

  it('stop at a bound, say so, and still fit the rest', () => {
    const fit = leastSquares(
      curve(
        [0, 1, 2, 3],
        [1, 3, 2, 5],
        [0, 0],
        (p, x) => p[0]! + p[1]! * x,
        (_, x) => [1, x],
        {
          lower: [-Infinity, -1],
          upper: [Infinity, 0.5],
        },
      ),
    );
    expect(fit.status).toBe('at bound');
    expect(fit.atBound).toEqual([false, true]);
    expect(fit.parameters[1]).toBe(0.5);
    // With the slope held at 0.5 the intercept is the mean of y - 0.5 x.
    expect(fit.parameters[0]).toBeCloseTo((1 + 2.5 + 1 + 3.5) / 4, 10);
  });

  it('name the parameters that the data cannot tell apart', () => {
    const fit = leastSquares(
      curve(
        [0, 1, 2, 3],
        [0, 1, 2, 3],
        [1, 1, 1],
        (p, x) => (p[0]! + p[1]!) * x + p[2]!,
        (_, x) => [x, x, 1],
      ),
    );
    expect(fit.status).toBe('not identifiable');
    expect(fit.undetermined).toEqual([0, 1]);
    expect(fit.inverseNormal).toBeNull();
  });

  it('descend the curved valley of Rosenbrock (Comput. J. 3, 175, 1960) from its usual start', () => {
    const fit = leastSquares({
      points: 2,
      start: [-1.2, 1],
      ...unbounded(2),
      evaluate(p, residuals, jacobian) {
        residuals[0] = 10 * (p[1]! - p[0]! ** 2);
        residuals[1] = 1 - p[0]!;
        jacobian?.set([-20 * p[0]!, 10, -1, 0]);
      },
    });
    expect(fit.parameters[0]).toBeCloseTo(1, 8);
    expect(fit.parameters[1]).toBeCloseTo(1, 8);
  });
});
