import type { Estimate } from '../estimation/types';

export type SpinLabel = 'high' | 'low' | 'intermediate' | 'only';

export interface SpinPrediction {
  /** Ground-state spin at the central estimate; `only` where the d count and geometry leave no choice. */
  readonly state: SpinLabel;
  /** Probability of the high-spin ground state under the stated uncertainties; null for `only`. */
  readonly probabilityHigh: number | null;
  /** `expected`, `likely` or `cannot say`, written out. */
  readonly words: string;
  readonly multiplicity: number;
  readonly unpairedElectrons: number;
  /** E(low) - E(high), cm⁻¹: positive means high spin lies lower; null for `only`. */
  readonly gap: Estimate | null;
  readonly nearCrossover: boolean;
  /** 10Dq / B at which the ground state changes, for this ion's C/B; null for `only`. */
  readonly crossoverTenDqOverB: number | null;
  /** Spin-only moment and the range seen for such ions at room temperature, Bohr magnetons. */
  readonly momentSpinOnly_BM: number;
  readonly momentRange_BM: readonly [number, number] | null;
}
