import { visibleWavelengths_nm } from '../library/colourTables';
import { molesPerLitre } from './beerLambert';
import { fourLn2, gaussian } from './gaussian';
import { reflectanceOf } from './kubelkaMunk';
import type { SpectralBand } from './spectralBand';

/** Wavenumbers of the visible grid, 380 to 780 nm in steps of 5 nm. */
export const visibleWavenumbers_cm1 = Float64Array.from(visibleWavelengths_nm, (nm) => 1e7 / nm);
export const visibleCount = visibleWavenumbers_cm1.length;

/**
 * Sum of the bands on the visible grid, into `out`; nothing is allocated, for use on many draws.
 *
 * @param out - of length `visibleCount`
 */
export function visibleMolarAbsorptivity(bands: readonly SpectralBand[], out: Float64Array): Float64Array {
  out.fill(0);
  for (let index = 0; index < bands.length; index++) {
    const { energy_cm1, width_cm1, molarAbsorptivity } = bands[index]!;
    const reach = 2.9 * width_cm1;
    const steepness = fourLn2 / (width_cm1 * width_cm1);
    for (let point = 0; point < visibleCount; point++) {
      const from = visibleWavenumbers_cm1[point]! - energy_cm1;
      if (from <= reach && from >= -reach) {
        out[point] = out[point]! + molarAbsorptivity * Math.exp(-steepness * from * from);
      }
    }
  }
  return out;
}

/**
 * Transmittance (0 to 1) of a solution from 380 to 780 nm in steps of 5 nm: what the transmission strip shows and
 * what the eye weighs.
 */
export function visibleTransmission(
  bands: readonly SpectralBand[],
  concentration_mM: number,
  path_cm: number,
  out: Float64Array = new Float64Array(visibleCount),
): Float64Array {
  const strength = molesPerLitre(concentration_mM) * path_cm * Math.LN10;
  visibleMolarAbsorptivity(bands, out);
  for (let point = 0; point < visibleCount; point++) out[point] = Math.exp(-strength * out[point]!);
  return out;
}

/**
 * Reflectance (0 to 1) of a powder from 380 to 780 nm in steps of 5 nm, F = background + scale times the bands.
 *
 * @param scale - K/S per unit of molar absorptivity; it grows with the share of the pigment and with its grain size
 * @param background - K/S of the white part
 */
export function visibleReflectance(
  bands: readonly SpectralBand[],
  scale: number,
  background: number,
  out: Float64Array = new Float64Array(visibleCount),
): Float64Array {
  visibleMolarAbsorptivity(bands, out);
  for (let point = 0; point < visibleCount; point++)
    out[point] = reflectanceOf(background + scale * out[point]!);
  return out;
}

/** Molar absorptivity at one visible or other wavelength, L mol⁻¹ cm⁻¹. */
export const molarAbsorptivityAtWavelength = (nm: number, bands: readonly SpectralBand[]): number =>
  bands.reduce(
    (sum, band) => sum + band.molarAbsorptivity * gaussian(1e7 / nm, band.energy_cm1, band.width_cm1),
    0,
  );
