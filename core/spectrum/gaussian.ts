import type { SpectralBand } from './spectralBand';

export const fourLn2 = 4 * Math.LN2;

/** Beyond this many full widths from the centre a Gaussian is below 1e-10 of its height. */
const reach = 2.9;

/**
 * Gaussian of unit height in wavenumber. A band is symmetric in energy, so it is never drawn as a Gaussian in
 * wavelength.
 *
 * @param wavenumber_cm1 - where
 * @param centre_cm1 - centre
 * @param width_cm1 - full width at half height
 */
export function gaussian(wavenumber_cm1: number, centre_cm1: number, width_cm1: number): number {
  const place = (wavenumber_cm1 - centre_cm1) / width_cm1;
  return place > reach || place < -reach ? 0 : Math.exp(-fourLn2 * place * place);
}

/** Molar absorptivity of overlapping bands, L mol⁻¹ cm⁻¹: their sum. */
export function molarAbsorptivityAt(wavenumber_cm1: number, bands: readonly SpectralBand[]): number {
  let sum = 0;
  for (const band of bands) {
    sum += band.molarAbsorptivity * gaussian(wavenumber_cm1, band.energy_cm1, band.width_cm1);
  }
  return sum;
}

/** Area under a Gaussian of height `molarAbsorptivity`, L mol⁻¹ cm⁻². */
export const bandArea = (molarAbsorptivity: number, width_cm1: number): number =>
  molarAbsorptivity * width_cm1 * Math.sqrt(Math.PI / fourLn2);

/**
 * Oscillator strength of a Gaussian band, f = 4.319e-9 times its area (refractive index 1), that is 4.6e-9 times
 * height and width: R. S. Mulliken, J. Chem. Phys. 7, 14 (1939); A. B. P. Lever, Inorganic Electronic Spectroscopy,
 * 2nd ed. (1984), from memory.
 */
export const oscillatorStrength = (molarAbsorptivity: number, width_cm1: number): number =>
  4.319e-9 * bandArea(molarAbsorptivity, width_cm1);
