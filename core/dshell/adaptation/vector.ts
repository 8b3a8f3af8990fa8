import { parity } from '../angularMomentum/factorials';

/** A combination Σ c_M |J M⟩ of the states of one angular momentum, with complex coefficients. */
export interface AdaptedVector {
  readonly M: readonly number[];
  readonly re: readonly number[];
  readonly im: readonly number[];
}

/**
 * Cosine-like real state (|M⟩ + (−1)^{J−M} |−M⟩)/√2, M ≥ 0, or null where it vanishes. A turn by π about y, which acts
 * on |J M⟩ as time reversal does up to complex conjugation, leaves it as it is.
 */
export function cosineState(J: number, M: number): AdaptedVector | null {
  if (M === 0) return J % 2 === 0 ? { M: [0], re: [1], im: [0] } : null;
  return { M: [M, -M], re: [Math.SQRT1_2, parity(J - M) * Math.SQRT1_2], im: [0, 0] };
}

/** Sine-like real state i(|M⟩ − (−1)^{J−M} |−M⟩)/√2, which a turn by π about y reverses. */
export function sineState(J: number, M: number): AdaptedVector | null {
  if (M === 0) return J % 2 === 1 ? { M: [0], re: [0], im: [1] } : null;
  return { M: [M, -M], re: [0, 0], im: [Math.SQRT1_2, -parity(J - M) * Math.SQRT1_2] };
}

export const plainState = (M: number): AdaptedVector => ({ M: [M], re: [1], im: [0] });

/** (|M⟩ + i(−1)^{J+M} |−M⟩)/√2 for half-integer J, which a turn by π about y multiplies by i. */
export const turnedState = (J: number, M: number): AdaptedVector => ({
  M: [M, -M],
  re: [Math.SQRT1_2, 0],
  im: [0, parity(J + M) * Math.SQRT1_2],
});

/** Time reversal: |J M⟩ goes to (−1)^{J−M} |J −M⟩, coefficients to their conjugates. */
export const timeReversed = (J: number, { M, re, im }: AdaptedVector): AdaptedVector => ({
  M: M.map((m) => -m),
  re: re.map((value, i) => parity(J - M[i]!) * value),
  im: im.map((value, i) => -parity(J - M[i]!) * value),
});

/** Σ weights[i] vectors[i] for real weights. */
export function combine(vectors: readonly AdaptedVector[], weights: readonly number[]): AdaptedVector {
  const re = new Map<number, number>();
  const im = new Map<number, number>();
  vectors.forEach((vector, i) =>
    vector.M.forEach((M, j) => {
      re.set(M, (re.get(M) ?? 0) + weights[i]! * vector.re[j]!);
      im.set(M, (im.get(M) ?? 0) + weights[i]! * vector.im[j]!);
    }),
  );
  const M = [...re.keys()];
  return { M, re: M.map((m) => re.get(m)!), im: M.map((m) => im.get(m)!) };
}
