import type { CurveData } from '../../record/curve';

/** Points of a curve against wavenumber, ascending; null where a point is missing. */
export interface WavenumberCurve {
  readonly wavenumber_cm1: readonly number[];
  readonly y: readonly (number | null)[];
}

/**
 * A spectrum against wavenumber. Absorbance and molar absorptivity are properties of a wavelength, so the ordinate stays
 * what it is. Null where the unit of x is not known.
 */
export function inWavenumber(curve: Pick<CurveData, 'x' | 'y' | 'xUnit'>): WavenumberCurve | null {
  if (curve.xUnit === 'cm-1') return { wavenumber_cm1: curve.x, y: curve.y };
  if (curve.xUnit !== 'nm') return null;
  return { wavenumber_cm1: curve.x.map((x) => 1e7 / x).toReversed(), y: curve.y.toReversed() };
}

/**
 * An emission spectrum recorded per nm, against wavenumber: intensity per unit of wavenumber is intensity per nm times
 * lambda squared (the Jacobian d lambda / d nu), which moves maxima. Wavelengths in nm, ascending.
 */
export function emissionInWavenumber(
  wavelength_nm: readonly number[],
  intensity: readonly (number | null)[],
): WavenumberCurve {
  return {
    wavenumber_cm1: wavelength_nm.map((x) => 1e7 / x).toReversed(),
    y: intensity
      .map((value, i) => (value === null ? null : value * (wavelength_nm[i]! / 1000) ** 2))
      .toReversed(),
  };
}
