/**
 * An emission band that is symmetric in energy is not so on a wavelength axis: intensity per nm is intensity per cm⁻¹
 * times dν/dλ = ν²/1e7, so its maximum lies further to the blue. Absorbance is a ratio and needs no such factor.
 */
export const perWavelength = (intensityPerWavenumber: number, wavenumber_cm1: number): number =>
  (intensityPerWavenumber * wavenumber_cm1 * wavenumber_cm1) / 1e7;

export const perWavenumber = (intensityPerWavelength: number, wavenumber_cm1: number): number =>
  (intensityPerWavelength * 1e7) / (wavenumber_cm1 * wavenumber_cm1);

/**
 * Wavelength (nm) at which a Gaussian in wavenumber has its maximum per unit wavelength: where
 * d/dν [ν² exp(-4 ln 2 (ν - ν0)²/w²)] vanishes.
 */
export function emissionMaximum_nm(centre_cm1: number, width_cm1: number): number {
  const variance = width_cm1 ** 2 / (8 * Math.LN2);
  return 1e7 / ((centre_cm1 + Math.sqrt(centre_cm1 ** 2 + 8 * variance)) / 2);
}
