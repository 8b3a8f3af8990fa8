import { boltzmann_cm1_K } from '../../units';

/**
 * Least full width at half height (cm⁻¹) of an intervalence band at `energy_cm1` between weakly coupled metals:
 * w² = 16 ln 2 k T ν, which is 2310 ν at 298 K. N. S. Hush, Prog. Inorg. Chem. 8, 391 (1967), from memory.
 */
export const hushWidth_cm1 = (energy_cm1: number, temperature_K = 298): number =>
  Math.sqrt(16 * Math.LN2 * boltzmann_cm1_K * temperature_K * energy_cm1);
