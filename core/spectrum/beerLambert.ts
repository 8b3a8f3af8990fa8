/**
 * Beer-Lambert law, decadic: A = ε c l. Concentration in mol/L, path in cm, ε in L mol⁻¹ cm⁻¹; reflection at the
 * cell walls and scattering are left out.
 */
export const absorbance = (molarAbsorptivity: number, concentration_M: number, path_cm: number): number =>
  molarAbsorptivity * concentration_M * path_cm;

export const transmittance = (absorbed: number): number => 10 ** -absorbed;

export const percentTransmittance = (absorbed: number): number => 100 * transmittance(absorbed);

/** The app states concentrations in mmol/L. */
export const molesPerLitre = (concentration_mM: number): number => concentration_mM / 1000;
