import { parity } from '../angularMomentum/factorials';
import { threeJ } from '../angularMomentum/threeJ';
import { realOrbitals } from './orbitals';

/** Symmetric 5×5 over [z2, x2-y2, xy, xz, yz]. */
export type FieldMatrix = readonly (readonly number[])[];

/**
 * A one-electron field as coefficients of unit tensors: H = trace/5 · N + Σ_k [v_k0 U_0 + Σ_{q>0} Re v_kq (U_q + (−1)^q U_−q)
 * + Im v_kq i(U_q − (−1)^q U_−q)], k = 2, 4. `re[k][q]`, `im[k][q]` for q = 0…k.
 */
export interface FieldTensors {
  readonly trace: number;
  readonly re: Readonly<Record<2 | 4, readonly number[]>>;
  readonly im: Readonly<Record<2 | 4, readonly number[]>>;
}

/** One real component: U_q + (−1)^q U_−q (`re`; U_0 for q = 0) or i(U_q − (−1)^q U_−q) (`im`) of rank k. */
export interface FieldComponent {
  readonly k: 2 | 4;
  readonly q: number;
  readonly part: 're' | 'im';
}

/**
 * Weights of the 25 elements of V in v_kq = (2k + 1) Σ_m (−1)^{2−m} (2 k 2; −m q m−q) ⟨m|V|m−q⟩ (orthogonality of the 3j
 * symbols), real and imaginary part.
 */
function componentWeights(k: number, q: number): { re: Float64Array; im: Float64Array } {
  const re = new Float64Array(25);
  const im = new Float64Array(25);
  for (let m = Math.max(-2, q - 2); m <= Math.min(2, q + 2); m++) {
    const geometry = (2 * k + 1) * parity(2 - m) * threeJ(2, k, 2, -m, q, m - q);
    for (let a = 0; a < 5; a++) {
      for (let b = 0; b < 5; b++) {
        const [xr, xi] = [realOrbitals.re[2 - m]![a]!, realOrbitals.im[2 - m]![a]!];
        const [yr, yi] = [realOrbitals.re[2 - m + q]![b]!, -realOrbitals.im[2 - m + q]![b]!];
        re[5 * a + b]! += geometry * (xr * yr - xi * yi);
        im[5 * a + b]! += geometry * (xr * yi + xi * yr);
      }
    }
  }
  return { re, im };
}

/** The same over the lower triangle of V, which is symmetric: 15 weights per component, one after the other. */
const lowerTriangle = [0, 1, 2, 3, 4].flatMap((a) =>
  [0, 1, 2, 3, 4].slice(0, a + 1).map((b) => [a, b] as const),
);
const folded = (full: Float64Array): number[] =>
  lowerTriangle.map(([a, b]) => (a === b ? full[6 * a]! : full[5 * a + b]! + full[5 * b + a]!));
const components = [
  ...[0, 1, 2].map((q) => componentWeights(2, q)),
  ...[0, 1, 2, 3, 4].map((q) => componentWeights(4, q)),
];
const weights = Float64Array.from(
  [...components.map(({ re }) => re), ...components.map(({ im }) => im)].flatMap(folded),
);
const triangle = new Float64Array(15);
const sums = new Float64Array(16);

/** All component sums at once: re of 2:0…2, 4:0…4, then im in the same order. */
function weighAll(): void {
  for (let c = 0, at = 0; c < 16; c++) {
    let sum = 0;
    for (let e = 0; e < 15; e++) sum += weights[at++]! * triangle[e]!;
    sums[c] = sum;
  }
}

/** Splits a field into its tensor components. Ranks 0, 2 and 4 are all that a real field over d orbitals has. */
export function fieldTensors(V: FieldMatrix): FieldTensors {
  for (let a = 0, at = 0; a < 5; a++) {
    const row = V[a]!;
    for (let b = 0; b <= a; b++) triangle[at++] = row[b]!;
  }
  weighAll();
  const list = (from: number, count: number): number[] => {
    const values: number[] = [];
    for (let c = from; c < from + count; c++) values.push(sums[c]!);
    return values;
  };
  return {
    trace: fieldTrace(V),
    re: { 2: list(0, 3), 4: list(3, 5) },
    im: { 2: list(8, 3), 4: list(11, 5) },
  };
}

export const fieldTrace = (V: FieldMatrix): number =>
  V[0]![0]! + V[1]![1]! + V[2]![2]! + V[3]![3]! + V[4]![4]!;
