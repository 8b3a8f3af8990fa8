import { symmetricEigensystem } from '../../numerics/eigen/symmetric';

export type Vector = readonly [number, number, number];
/** Symmetric 3×3, row by row. */
export type SymmetricTensor = readonly [Vector, Vector, Vector];

/** Builds a symmetric tensor from a function of two axes. */
export function symmetricTensor(element: (a: 0 | 1 | 2, b: 0 | 1 | 2) => number): SymmetricTensor {
  const row = (a: 0 | 1 | 2): Vector => [element(a, 0), element(a, 1), element(a, 2)];
  return [row(0), row(1), row(2)];
}

/** Principal values, ascending, with their unit axes. */
export function principal(tensor: SymmetricTensor): { value: number; axis: Vector }[] {
  const { values, vectors } = symmetricEigensystem(Float64Array.from(tensor.flat()), 3);
  return [0, 1, 2].map((k) => ({
    value: values[k]!,
    axis: [vectors[3 * k]!, vectors[3 * k + 1]!, vectors[3 * k + 2]!],
  }));
}
