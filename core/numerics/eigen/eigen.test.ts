import { EigenvalueDecomposition, Matrix } from 'ml-matrix';
import { describe, expect, it } from 'vitest';
import { seeded } from '../../testing/seeded';
import { hermitianEigensystem, hermitianEigenvalues } from './hermitian';
import { quaternionEigensystem, quaternionEigenvalues } from './quaternion';
import { symmetricEigensystem, symmetricEigenvalues } from './symmetric';
import { largestSize } from './tridiagonal';

const random = seeded(11);
const fractions = (count: number): Float64Array =>
  Float64Array.from({ length: count }, () => random.next() - 0.5);

/** Lower triangle of a random Hermitian matrix with `width` numbers per element. */
function randomHermitian(n: number, width: 1 | 2 | 4): Float64Array {
  const a = fractions(n * n * width);
  for (let i = 0; i < n; i++) for (let c = 1; c < width; c++) a[(i * n + i) * width + c] = 0;
  return a;
}

/** The same as a real symmetric matrix of `width` times the size, each eigenvalue `width` times. */
function asReal(a: Float64Array, n: number, width: 1 | 2 | 4): Matrix {
  const big = Matrix.zeros(width * n, width * n);
  // Left multiplication by a quaternion a0 + a1 i + a2 j + a3 k; a complex number has two of the parts, a real one one.
  const units = [
    [0, 1, 2, 3],
    [1, 0, 3, 2],
    [2, 3, 0, 1],
    [3, 2, 1, 0],
  ];
  const signs = [
    [1, -1, -1, -1],
    [1, 1, -1, 1],
    [1, 1, 1, -1],
    [1, -1, 1, 1],
  ];
  for (let i = 0; i < n; i++)
    for (let j = 0; j <= i; j++)
      for (let r = 0; r < width; r++)
        for (let s = 0; s < width; s++) {
          const value = signs[r]![s]! * a[(i * n + j) * width + units[r]![s]!]!;
          big.set(r * n + i, s * n + j, value);
          big.set(s * n + j, r * n + i, value);
        }
  return big;
}

const reference = (matrix: Matrix): number[] =>
  new EigenvalueDecomposition(matrix, { assumeSymmetric: true }).realEigenvalues.sort((x, y) => x - y);

const largestDifference = (values: ArrayLike<number>, wanted: readonly number[], times: number): number =>
  Math.max(...wanted.map((value, i) => Math.abs(value - values[Math.floor(i / times)]!)));

/** Largest entry of A v − λ v over the real form; vectors laid out part by part. */
function residual(matrix: Matrix, values: Float64Array, vectorOf: (k: number) => number[]): number {
  let largest = 0;
  values.forEach((value, k) => {
    const v = Matrix.columnVector(vectorOf(k));
    const difference = Matrix.sub(matrix.mmul(v), Matrix.mul(v, value));
    largest = Math.max(largest, difference.max(), -difference.min());
  });
  return largest;
}

describe('eigenvalues agree with ml-matrix on the real form of the same matrix', () => {
  it.each([1, 2, 3, 4, 7, 16, 41])('size %i: real, complex, quaternion, with and without vectors', (n) => {
    const kinds = [
      { width: 1, values: symmetricEigenvalues, system: symmetricEigensystem },
      { width: 2, values: hermitianEigenvalues, system: hermitianEigensystem },
      { width: 4, values: quaternionEigenvalues, system: quaternionEigensystem },
    ] as const;
    for (const { width, values, system } of kinds) {
      const a = randomHermitian(n, width);
      const matrix = asReal(a, n, width);
      const wanted = reference(matrix);
      expect(largestDifference(values(a, n), wanted, width)).toBeLessThan(1e-13 * (n + 10));
      const solved = system(a, n);
      expect(largestDifference(solved.values, wanted, width)).toBeLessThan(1e-13 * (n + 10));
      const parts = Array.from({ length: width }, (_, c) => c);
      const vectorOf = (k: number): number[] =>
        parts.flatMap((c) => Array.from({ length: n }, (_, i) => solved.vectors[(k * n + i) * width + c]!));
      expect(residual(matrix, solved.values, vectorOf)).toBeLessThan(1e-13 * (n + 10));
    }
  });
});

describe('special matrices', () => {
  it('diagonal, zero and repeated eigenvalues come out exactly', () => {
    const diagonal = new Float64Array(25);
    [3, -1, 3, 0, 7].forEach((value, i) => (diagonal[6 * i] = value));
    expect(Array.from(symmetricEigenvalues(diagonal, 5))).toEqual([-1, 0, 3, 3, 7]);
    expect(Array.from(symmetricEigenvalues(new Float64Array(16), 4))).toEqual([0, 0, 0, 0]);
    expect(Array.from(hermitianEigenvalues(new Float64Array(32), 4))).toEqual([0, 0, 0, 0]);
    expect(Array.from(quaternionEigenvalues(new Float64Array(64), 4))).toEqual([0, 0, 0, 0]);
  });

  it('a chain of n equal couplings has the eigenvalues 2 cos(kπ/(n + 1)) (closed form)', () => {
    const n = 60;
    const chain = new Float64Array(n * n);
    for (let i = 1; i < n; i++) chain[i * n + i - 1] = 1;
    const values = symmetricEigenvalues(chain, n);
    for (let k = 1; k <= n; k++) expect(values[n - k]).toBeCloseTo(2 * Math.cos((k * Math.PI) / (n + 1)), 12);
  });

  it('widely different scales keep an error of the rounding of the norm', () => {
    const graded = Float64Array.from([1e6, 0, 0, 1, 1e-6, 0, 1e-3, 1e-6, 1]);
    const values = symmetricEigenvalues(graded, 3);
    expect(values[0]! + values[1]! + values[2]!).toBeCloseTo(1e6 + 1e-6 + 1, 8);
  });

  it('the input is left as it was', () => {
    const a = randomHermitian(9, 2);
    const copy = a.slice();
    hermitianEigensystem(a, 9);
    expect(a).toEqual(copy);
  });
});

describe('what cannot be solved', () => {
  it('says so: not a number, infinite, too large', () => {
    const poisoned = (value: number, width: number): Float64Array =>
      new Float64Array(36 * width).fill(1).fill(value, 20 * width, 20 * width + 1);
    for (const value of [Number.NaN, Infinity]) {
      for (const [width, solve] of [
        [1, symmetricEigenvalues],
        [1, symmetricEigensystem],
        [2, hermitianEigenvalues],
        [4, quaternionEigenvalues],
      ] as const) {
        expect(() => solve(poisoned(value, width), 6)).toThrow(
          expect.objectContaining({ code: 'no-convergence' }) as Error,
        );
      }
    }
    const tooLarge = largestSize + 1;
    expect(() => symmetricEigenvalues(new Float64Array(tooLarge ** 2), tooLarge)).toThrow(
      expect.objectContaining({ code: 'too-large' }) as Error,
    );
  });
});
