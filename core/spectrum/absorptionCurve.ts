import { wavelength_nm } from '../units';
import { gaussian, molarAbsorptivityAt } from './gaussian';
import type { SpectralBand } from './spectralBand';

/** Range of the spectrum that is computed and shown: near infrared bands are not cut off at the end of the visible. */
export const spectrumFrom_nm = 200;
export const spectrumTo_nm = 2500;

/** Molar absorptivity along the spectrum, wavelength ascending. */
export interface AbsorptionCurve {
  readonly wavelength_nm: Float64Array;
  readonly wavenumber_cm1: Float64Array;
  /** L mol⁻¹ cm⁻¹ */
  readonly molarAbsorptivity: Float64Array;
}

/** Equal steps in wavenumber, so that a narrow band is met alike wherever it lies; default step 25 cm⁻¹. */
export function spectrumGrid(step_cm1 = 25, from_nm = spectrumFrom_nm, to_nm = spectrumTo_nm): Float64Array {
  const [highest, lowest] = [1e7 / from_nm, 1e7 / to_nm];
  const count = Math.max(1, Math.round((highest - lowest) / step_cm1));
  return Float64Array.from(
    { length: count + 1 },
    (_, index) => highest - ((highest - lowest) * index) / count,
  );
}

/**
 * Absorption curve of a set of bands from 200 to 2500 nm.
 *
 * @param wavenumbers_cm1 - descending, so that wavelength ascends; a grid of `spectrumGrid` by default
 */
export function absorptionCurve(
  bands: readonly SpectralBand[],
  wavenumbers_cm1: Float64Array = spectrumGrid(),
): AbsorptionCurve {
  return {
    wavelength_nm: wavenumbers_cm1.map(wavelength_nm),
    wavenumber_cm1: wavenumbers_cm1,
    molarAbsorptivity: wavenumbers_cm1.map((wavenumber) => molarAbsorptivityAt(wavenumber, bands)),
  };
}

/** The share of one band in the curve, on the same grid. */
export const bandCurve = (band: SpectralBand, wavenumbers_cm1: Float64Array): Float64Array =>
  wavenumbers_cm1.map(
    (wavenumber) => band.molarAbsorptivity * gaussian(wavenumber, band.energy_cm1, band.width_cm1),
  );
