import { effectiveMoment } from '../magneticUnits';

/** Molar susceptibility at one temperature, cgs. No diamagnetic correction is in it. */
export interface SusceptibilityPoint {
  readonly temperature_K: number;
  /** Along x, y and z, cm³ mol⁻¹. */
  readonly chi_xyz: readonly [number, number, number];
  /** Mean of the three: a powder in a weak field. */
  readonly chi: number;
  /** cm³ K mol⁻¹. */
  readonly chiT: number;
  /** Bohr magnetons. */
  readonly muEff: number;
}

export function susceptibilityPoint(
  temperature_K: number,
  chi_xyz: readonly [number, number, number],
): SusceptibilityPoint {
  const chi = (chi_xyz[0] + chi_xyz[1] + chi_xyz[2]) / 3;
  return {
    temperature_K,
    chi_xyz,
    chi,
    chiT: chi * temperature_K,
    muEff: effectiveMoment(chi, temperature_K),
  };
}
