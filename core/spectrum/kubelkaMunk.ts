/**
 * Diffuse reflectance of a thick powder. P. Kubelka and F. Munk, Z. tech. Phys. 12, 593 (1931); P. Kubelka, J. Opt.
 * Soc. Am. 38, 448 (1948); formulas from memory. Scattering is taken to be the same at every wavelength and specular
 * reflection is left out, so a powder colour is of a second class beside that of a solution.
 */

/** F = K/S of a reflectance R in (0, 1]. */
export const kubelkaMunk = (reflectance: number): number => (1 - reflectance) ** 2 / (2 * reflectance);

/** The reflectance that has a given F = K/S; written so that no digits are lost where F is large. */
export const reflectanceOf = (absorptionOverScattering: number): number =>
  1 /
  (1 +
    absorptionOverScattering +
    Math.sqrt(absorptionOverScattering * absorptionOverScattering + 2 * absorptionOverScattering));
