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

/** ⟨m|V|m′⟩ for m, m′ = 2 … −2. */
function overMagneticNumbers(V: FieldMatrix): { re: number[][]; im: number[][] } {
  const re: number[][] = [];
  const im: number[][] = [];
  for (let i = 0; i < 5; i++) {
    re.push([0, 0, 0, 0, 0]);
    im.push([0, 0, 0, 0, 0]);
    for (let j = 0; j < 5; j++) {
      for (let a = 0; a < 5; a++) {
        for (let b = 0; b < 5; b++) {
          const [xr, xi] = [realOrbitals.re[i]![a]!, realOrbitals.im[i]![a]!];
          const [yr, yi] = [realOrbitals.re[j]![b]!, -realOrbitals.im[j]![b]!];
          re[i]![j]! += V[a]![b]! * (xr * yr - xi * yi);
          im[i]![j]! += V[a]![b]! * (xr * yi + xi * yr);
        }
      }
    }
  }
  return { re, im };
}

/** Splits a field into its tensor components (orthogonality of the 3j symbols). Ranks 0, 2 and 4 are all a real field has. */
export function fieldTensors(V: FieldMatrix): FieldTensors {
  const { re, im } = overMagneticNumbers(V);
  const component = (part: readonly number[][], k: number, q: number): number => {
    let sum = 0;
    for (let m = -2; m <= 2; m++) {
      const mPrime = m - q;
      if (Math.abs(mPrime) > 2) continue;
      sum += parity(2 - m) * threeJ(2, k, 2, -m, q, mPrime) * part[2 - m]![2 - mPrime]!;
    }
    return (2 * k + 1) * sum;
  };
  const list = (part: readonly number[][], k: number): number[] =>
    Array.from({ length: k + 1 }, (_, q) => component(part, k, q));
  return {
    trace: V.reduce((sum, row, a) => sum + row[a]!, 0),
    re: { 2: list(re, 2), 4: list(re, 4) },
    im: { 2: list(im, 2), 4: list(im, 4) },
  };
}
