import { signBefore, spinOrbitalCount } from '../freeIon/microstates';
import { realOrbitals } from '../field/orbitals';
import { remember } from '../remember';
import { sharedSpace } from './determinantBasis';
import { type SolvedStates } from './solveStates';

/** A complex operator on the determinants of real orbitals: ⟨row|O|column⟩ = re + i im for each entry. */
export interface DeterminantOperator {
  readonly size: number;
  readonly rows: Int32Array;
  readonly columns: Int32Array;
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/** Total orbital and spin angular momentum and Σ l·s, in units of ħ (ħ² for `spinOrbit`). */
export interface AngularOperators {
  readonly L: readonly [DeterminantOperator, DeterminantOperator, DeterminantOperator];
  readonly S: readonly [DeterminantOperator, DeterminantOperator, DeterminantOperator];
  readonly spinOrbit: DeterminantOperator;
}

type Complex = readonly [number, number];
type OneElectron = (p: number, q: number) => Complex;

const times = ([a, b]: Complex, [c, d]: Complex): Complex => [a * c - b * d, a * d + b * c];
const plus = ([a, b]: Complex, [c, d]: Complex): Complex => [a + c, b + d];

/** ⟨a|l_axis|b⟩ over the five real orbitals. */
function orbitalMomentum(axis: 0 | 1 | 2, a: number, b: number): Complex {
  let sum: Complex = [0, 0];
  for (let i = 0; i < 5; i++) {
    for (let j = 0; j < 5; j++) {
      const bra: Complex = [realOrbitals.re[i]![a]!, -realOrbitals.im[i]![a]!];
      const ket: Complex = [realOrbitals.re[j]![b]!, realOrbitals.im[j]![b]!];
      sum = plus(sum, times(times(bra, momentum(2, 2 - i, 2 - j, axis)), ket));
    }
  }
  return sum;
}

/** ⟨j m|j_axis|j n⟩. */
function momentum(j: number, m: number, n: number, axis: 0 | 1 | 2): Complex {
  if (axis === 2) return m === n ? [m, 0] : [0, 0];
  if (Math.abs(m - n) !== 1) return [0, 0];
  const half = 0.5 * Math.sqrt(j * (j + 1) - m * n);
  return axis === 0 ? [half, 0] : [0, m > n ? -half : half];
}

const orbital = (p: number): number => p % 5;
const spin = (p: number): number => (p < 5 ? 0.5 : -0.5);

/** L, S and Σ l·s of N electrons over `determinantBasis(N)`; worked out on first use and kept. */
export const angularOperators = remember((electrons: number): AngularOperators => {
  const l = (axis: 0 | 1 | 2): OneElectron => {
    return (p, q) => (spin(p) === spin(q) ? orbitalMomentum(axis, orbital(p), orbital(q)) : [0, 0]);
  };
  const s = (axis: 0 | 1 | 2): OneElectron => {
    return (p, q) => (orbital(p) === orbital(q) ? momentum(0.5, spin(p), spin(q), axis) : [0, 0]);
  };
  const ls: OneElectron = (p, q) =>
    ([0, 1, 2] as const)
      .map((axis) =>
        times(orbitalMomentum(axis, orbital(p), orbital(q)), momentum(0.5, spin(p), spin(q), axis)),
      )
      .reduce(plus);
  return {
    L: [oneElectron(electrons, l(0)), oneElectron(electrons, l(1)), oneElectron(electrons, l(2))],
    S: [oneElectron(electrons, s(0)), oneElectron(electrons, s(1)), oneElectron(electrons, s(2))],
    spinOrbit: oneElectron(electrons, ls),
  };
});

/** Σ t(p, q) a⁺_p a_q over the determinants; spin orbital p = orbital + 5 for spin down. */
export function oneElectron(electrons: number, t: OneElectron): DeterminantOperator {
  const { states, indexOf } = sharedSpace(electrons);
  const table = Array.from({ length: spinOrbitalCount }, (_, q) =>
    Array.from({ length: spinOrbitalCount }, (_, p) => ({ p, value: t(p, q) })).filter(
      ({ value }) => Math.hypot(...value) > 1e-14,
    ),
  );
  const entries = new Map<number, [number, number]>();
  const size = states.length;
  states.forEach((state, column) => {
    for (let q = 0; q < spinOrbitalCount; q++) {
      if ((state & (1 << q)) === 0) continue;
      const without = state & ~(1 << q);
      const sign = signBefore(state, q);
      for (const { p, value } of table[q]!) {
        if ((without & (1 << p)) !== 0) continue;
        const key = indexOf.get(without | (1 << p))! * size + column;
        const both = sign * signBefore(without, p);
        const entry = entries.get(key) ?? [0, 0];
        entries.set(key, [entry[0] + both * value[0], entry[1] + both * value[1]]);
      }
    }
  });
  const kept = [...entries].filter(([, value]) => Math.hypot(...value) > 1e-13);
  return {
    size,
    rows: Int32Array.from(kept, ([key]) => Math.floor(key / size)),
    columns: Int32Array.from(kept, ([key]) => key % size),
    re: Float64Array.from(kept, ([, value]) => value[0]),
    im: Float64Array.from(kept, ([, value]) => value[1]),
  };
}

/** ⟨n|O|m⟩ for the states listed in `bras` and `kets`, row-major. */
export function matrixBetween(
  states: Pick<SolvedStates, 'count' | 're' | 'im'>,
  operator: DeterminantOperator,
  bras: readonly number[],
  kets: readonly number[],
): { readonly re: Float64Array; readonly im: Float64Array } {
  const n = states.count;
  const out = {
    re: new Float64Array(bras.length * kets.length),
    im: new Float64Array(bras.length * kets.length),
  };
  const image = { re: new Float64Array(n), im: new Float64Array(n) };
  kets.forEach((ket, j) => {
    image.re.fill(0);
    image.im.fill(0);
    for (let e = 0; e < operator.rows.length; e++) {
      const [xr, xi] = [operator.re[e]!, operator.im[e]!];
      const from = ket * n + operator.columns[e]!;
      const to = operator.rows[e]!;
      image.re[to]! += xr * states.re[from]! - xi * states.im[from]!;
      image.im[to]! += xr * states.im[from]! + xi * states.re[from]!;
    }
    bras.forEach((bra, i) => {
      let sr = 0;
      let si = 0;
      for (let d = 0, at = bra * n; d < n; d++, at++) {
        sr += states.re[at]! * image.re[d]! + states.im[at]! * image.im[d]!;
        si += states.re[at]! * image.im[d]! - states.im[at]! * image.re[d]!;
      }
      out.re[i * kets.length + j] = sr;
      out.im[i * kets.length + j] = si;
    });
  });
  return out;
}
