import { avogadro_per_mol, bohrMagneton_cm1_T, boltzmann_cm1_K, wavenumber_J } from '../units';

/** N_A μ_B in emu mol⁻¹ (erg G⁻¹ mol⁻¹): 5584.94. One joule per tesla is 10³ erg per gauss. */
export const avogadroMagneton_emu = avogadro_per_mol * bohrMagneton_cm1_T * wavenumber_J * 1e3;

/** μ_B in cm⁻¹ per gauss. */
const magneton_cm1_G = bohrMagneton_cm1_T * 1e-4;

/** N_A μ_B² in cm³ mol⁻¹ cm⁻¹ (cgs): 0.26074, the factor of the Van Vleck sum over energies in cm⁻¹. */
export const vanVleckFactor = avogadroMagneton_emu * magneton_cm1_G;

/** 3k/(N_A μ_B²) = 7.9968 in cgs, whose root is the 2.828 of the textbooks. */
export const momentSquaredPerChiT = (3 * boltzmann_cm1_K) / vanVleckFactor;

/** Effective moment in Bohr magnetons of a molar susceptibility (cgs); 0 where χ is negative. */
export const effectiveMoment = (chi_cm3_mol: number, temperature_K: number): number =>
  Math.sqrt(Math.max(0, momentSquaredPerChiT * chi_cm3_mol * temperature_K));

/** χ in the SI, m³ mol⁻¹, from cgs cm³ mol⁻¹: 4π × 10⁻⁶. */
export const siSusceptibility = (chi_cm3_mol: number): number => 4e-6 * Math.PI * chi_cm3_mol;
