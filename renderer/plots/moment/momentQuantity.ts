import { avogadro_per_mol, bohrMagneton_cm1_T, boltzmann_J_K, wavenumber_J } from '../../../core/units';

export type MomentQuantity = 'chiT' | 'moment';

/**
 * 3 k_B / (N_A μ_B²) in cgs (mol K⁻¹ cm⁻³): μ_eff² = 7.9968 χT, whose root is the 2.828 of the textbooks. One tesla is
 * 10⁴ gauss and one joule 10⁷ erg.
 */
const momentSquaredPerChiT = (() => {
  const magneton_erg_G = bohrMagneton_cm1_T * wavenumber_J * 1e7 * 1e-4;
  return (3 * boltzmann_J_K * 1e7) / (avogadro_per_mol * magneton_erg_G ** 2);
})();

/** Effective moment in Bohr magnetons from χT in cm³ K mol⁻¹ (cgs); 0 for a negative χT. */
export const chiTToMoment = (chiT: number): number => Math.sqrt(Math.max(0, momentSquaredPerChiT * chiT));

/** Standard uncertainty of the moment from that of χT, to first order. */
export const momentErrorOf = (chiT: number, u: number): number =>
  chiT > 0 ? (momentSquaredPerChiT * u) / (2 * chiTToMoment(chiT)) : 0;
