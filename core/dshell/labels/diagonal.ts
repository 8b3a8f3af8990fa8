import { type Quaternion } from '../../symmetry';
import { carriedBy, type Amplitudes } from '../states/amplitudes';

/** ⟨J M′|R|J M⟩, row-major over M = −J … J. */
export interface RotationMatrix {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/** The matrix of a rotation among the states of one J, column by column. */
export function rotationMatrix(J: number, rotation: Quaternion): RotationMatrix {
  const carry = carriedBy(rotation);
  const n = 2 * J + 1;
  const re = new Float64Array(n * n);
  const im = new Float64Array(n * n);
  const multiplets = [{ term: 0, S: 0, L: J, J }];
  for (let j = 0; j < n; j++) {
    const unit = new Float64Array(n).fill(1, j, j + 1);
    const image = carry({ multiplets, re: [unit], im: [new Float64Array(n)] });
    for (let i = 0; i < n; i++) {
      re[i * n + j] = image.re[0]![i]!;
      im[i * n + j] = image.im[0]![i]!;
    }
  }
  return { re, im };
}

/** Real part of ⟨ψ|O|ψ⟩ for an operator that acts on each multiplet by a matrix that depends on its J alone. */
export function diagonal(
  { multiplets, re, im }: Amplitudes,
  matrixOf: (J: number) => RotationMatrix,
): number {
  let sum = 0;
  multiplets.forEach(({ J }, which) => {
    const { re: A, im: B } = matrixOf(J);
    const [x, y] = [re[which]!, im[which]!];
    const n = x.length;
    for (let i = 0, at = 0; i < n; i++) {
      const [xi, yi] = [x[i]!, y[i]!];
      for (let j = 0; j < n; j++, at++) {
        const [a, b] = [A[at]!, B[at]!];
        sum += a * (xi * x[j]! + yi * y[j]!) + b * (yi * x[j]! - xi * y[j]!);
      }
    }
  });
  return sum;
}

/** Remembers the matrix for each J. */
export function remembered(make: (J: number) => RotationMatrix): (J: number) => RotationMatrix {
  const known = new Map<number, RotationMatrix>();
  return (J) => {
    let found = known.get(J);
    if (found === undefined) known.set(J, (found = make(J)));
    return found;
  };
}
