/**
 * Fundamental constants, CODATA 2018 (E. Tiesinga, P. J. Mohr, D. B. Newell, B. N. Taylor,
 * Rev. Mod. Phys. 93, 025010, 2021). h, c, e, k_B and N_A are exact by definition of the SI (2019).
 */
export const planck_J_s = 6.62607015e-34;
export const speedOfLight_m_s = 299_792_458;
export const elementaryCharge_C = 1.602176634e-19;
export const boltzmann_J_K = 1.380649e-23;
export const avogadro_per_mol = 6.02214076e23;

/** Energy of 1 cm⁻¹ in joule. */
export const wavenumber_J = planck_J_s * speedOfLight_m_s * 100;
/** Boltzmann constant in cm⁻¹ K⁻¹ (0.695034800…). */
export const boltzmann_cm1_K = boltzmann_J_K / wavenumber_J;
/** Bohr magneton in cm⁻¹ T⁻¹; measured, relative uncertainty 3e-10. */
export const bohrMagneton_cm1_T = 0.46686447783;
