import { symmetricEigensystem } from '../../numerics/eigen/symmetric';
import { smallRotation } from '../angularMomentum/rotation';
import { combine, type AdaptedVector } from './vector';

/**
 * Real part of ⟨u|C₃|v⟩ for the threefold turn x → y → z → x, which is exp(−iπJ_y/2) exp(−iπJ_z/2). For states that
 * belong to one row of the tetragonal subgroup it tells the cubic species apart.
 */
function threefold(J: number, u: AdaptedVector, v: AdaptedVector): number {
  let sum = 0;
  u.M.forEach((m, i) =>
    v.M.forEach((k, j) => {
      const phase = (-Math.PI / 2) * k;
      const re = u.re[i]! * v.re[j]! + u.im[i]! * v.im[j]!;
      const im = u.re[i]! * v.im[j]! - u.im[i]! * v.re[j]!;
      sum += smallRotation(J, m, k, Math.PI / 2) * (re * Math.cos(phase) - im * Math.sin(phase));
    }),
  );
  return sum;
}

/** The combinations of `states` on which the threefold turn has the (symmetrised) diagonal value `wanted`. */
export function withThreefold(J: number, states: readonly AdaptedVector[], wanted: number): AdaptedVector[] {
  const n = states.length;
  const matrix = new Float64Array(n * n);
  for (let i = 0; i < n; i++) {
    for (let j = 0; j < n; j++) {
      matrix[i * n + j] = 0.5 * (threefold(J, states[i]!, states[j]!) + threefold(J, states[j]!, states[i]!));
    }
  }
  const { values, vectors } = symmetricEigensystem(matrix, n);
  const found: AdaptedVector[] = [];
  for (let k = 0; k < n; k++) {
    if (Math.abs(values[k]! - wanted) > 1e-6) continue;
    found.push(combine(states, Array.from(vectors.subarray(k * n, (k + 1) * n))));
  }
  return found;
}
