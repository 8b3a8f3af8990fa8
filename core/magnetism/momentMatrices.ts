import { angularOperators, matrixBetween, type DeterminantOperator, type SolvedStates } from '../dshell';

/** ⟨n|μ_α|m⟩ in Bohr magnetons, row-major over the bras n and kets m asked for. */
export interface MomentMatrix {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

const axes = [0, 1, 2] as const;

/** kL + g_e S along one axis as one list of entries. */
function momentOperator(electrons: number, k: number, ge: number, axis: 0 | 1 | 2): DeterminantOperator {
  const { L, S } = angularOperators(electrons);
  const [l, s] = [L[axis], S[axis]];
  const joined = <T extends Int32Array | Float64Array>(make: (length: number) => T, a: T, b: T): T => {
    const out = make(a.length + b.length);
    out.set(a);
    out.set(b, a.length);
    return out;
  };
  const scaled = (values: Float64Array, factor: number): Float64Array =>
    values.map((value) => factor * value);
  const whole = (length: number) => new Int32Array(length);
  const real = (length: number) => new Float64Array(length);
  return {
    size: l.size,
    rows: joined(whole, l.rows, s.rows),
    columns: joined(whole, l.columns, s.columns),
    re: joined(real, scaled(l.re, k), scaled(s.re, ge)),
    im: joined(real, scaled(l.im, k), scaled(s.im, ge)),
  };
}

/** Matrices of μ = kL + g_e S along x, y and z between states of one solution. The electron's charge sign is left out. */
export function momentMatrices(
  states: SolvedStates,
  { k, ge }: { readonly k: number; readonly ge: number },
  bras: readonly number[],
  kets: readonly number[],
): readonly [MomentMatrix, MomentMatrix, MomentMatrix] {
  const [x, y, z] = axes.map((axis) =>
    matrixBetween(states, momentOperator(states.basis.electrons, k, ge, axis), bras, kets),
  );
  return [x!, y!, z!];
}

/** ⟨n|μ_α|n⟩ along one direction for the states listed. */
export function momentExpectations(
  states: SolvedStates,
  { k, ge }: { readonly k: number; readonly ge: number },
  direction: readonly [number, number, number],
  list: readonly number[],
): number[] {
  const { count, re, im } = states;
  const sums = list.map(() => 0);
  for (const axis of axes) {
    if (direction[axis] === 0) continue;
    const operator = momentOperator(states.basis.electrons, k, ge, axis);
    list.forEach((n, i) => {
      let sum = 0;
      for (let e = 0; e < operator.rows.length; e++) {
        const [row, column] = [n * count + operator.rows[e]!, n * count + operator.columns[e]!];
        const [ar, ai, br, bi] = [re[row]!, im[row]!, re[column]!, im[column]!];
        sum += operator.re[e]! * (ar * br + ai * bi) - operator.im[e]! * (ar * bi - ai * br);
      }
      sums[i]! += direction[axis] * sum;
    });
  }
  return sums;
}

/** 0, 1, ..., n − 1. */
export const upTo = (n: number): number[] => Array.from({ length: n }, (_, i) => i);
