/** A spin multiplicity with an irreducible representation, as many `times` as it occurs. */
export interface Term {
  /** `3T1g`. */
  readonly label: string;
  /** 2S + 1. */
  readonly multiplicity: number;
  readonly irrep: string;
  readonly times: number;
  /** (2S + 1) × dimension × times. */
  readonly microstates: number;
}

export const term = (multiplicity: number, irrep: string, dimension: number, times: number): Term => ({
  label: `${multiplicity}${irrep}`,
  multiplicity,
  irrep,
  times,
  microstates: multiplicity * dimension * times,
});

export const countMicrostates = (terms: readonly Term[]): number =>
  terms.reduce((sum, { microstates }) => sum + microstates, 0);

/** Number of ways to put `k` electrons into `n` spin orbitals. */
export function binomial(n: number, k: number): number {
  if (k < 0 || k > n) return 0;
  let result = 1;
  for (let i = 1; i <= k; i++) result = (result * (n - k + i)) / i;
  return Math.round(result);
}
