import type { Estimate } from '../estimation/types';

export type SpinLabel = 'high' | 'low' | 'intermediate' | 'only';

export interface SpinPrediction {
  /** Ground-state spin at the central estimate; `only` where the d count and geometry leave no choice. */
  readonly state: SpinLabel;
  /**
   * Probability that the high-spin state is the more stable one at `temperature_K` under the stated uncertainties;
   * null for `only`.
   */
  readonly probabilityHigh: number | null;
  /** `expected`, `likely` or `cannot say`, written out. */
  readonly words: string;
  readonly multiplicity: number;
  readonly unpairedElectrons: number;
  /**
   * E(low) - E(high) of the relaxed states, each at its own metal-ligand distance, cm⁻¹: positive means high spin lies
   * lower; null for `only`.
   */
  readonly gap: Estimate | null;
  /** The same without relaxation, both at the high-spin distance; null for `only`. */
  readonly verticalGap_cm1?: number | null;
  /** What temperature adds in favour of high spin, T ΔS in cm⁻¹. */
  readonly entropyTerm_cm1?: number | null;
  readonly temperature_K?: number;
  readonly nearCrossover: boolean;
  /**
   * Near crossover only: the temperatures between which half of the complexes could be high spin, as wide as the
   * uncertainty makes them. Never one temperature.
   */
  readonly temperatureWindow_K?: readonly [number, number] | null;
  /** 10Dq / B at which the ground state changes, for this ion's C/B; null for `only`. */
  readonly crossoverTenDqOverB: number | null;
  /** Spin-only moment and the range seen for such ions at room temperature, Bohr magnetons. */
  readonly momentSpinOnly_BM: number;
  readonly momentRange_BM: readonly [number, number] | null;
}
