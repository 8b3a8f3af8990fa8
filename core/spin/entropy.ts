import { avogadro_per_mol, boltzmann_cm1_K, boltzmann_J_K } from '../units';

const gasConstant = boltzmann_J_K * avogadro_per_mol;

/**
 * Softer metal-ligand bonds of the high-spin state, per electron in eg: with the electronic part this gives 50 to
 * 80 J/(K mol) for iron(II), as found by calorimetry (P. Gütlich and H. A. Goodwin, Top. Curr. Chem. 233, 2004, from
 * memory).
 */
const vibrational_J_K_mol = { value: 21, sigma: 5 };

/** Entropy of low spin -> high spin, J/(K mol), from the degeneracies of the terms and the electrons promoted. */
export function spinEntropy(
  degeneracyHigh: number,
  degeneracyLow: number,
  promoted: number,
): { value: number; sigma: number } {
  return {
    value: gasConstant * Math.log(degeneracyHigh / degeneracyLow) + promoted * vibrational_J_K_mol.value,
    sigma: promoted * vibrational_J_K_mol.sigma,
  };
}

/** T ΔS in cm⁻¹. */
export const entropyTerm_cm1 = (entropy_J_K_mol: number, temperature_K: number): number =>
  (temperature_K * entropy_J_K_mol * boltzmann_cm1_K) / gasConstant;
