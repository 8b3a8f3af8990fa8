import {
  avogadro_per_mol,
  elementaryCharge_C,
  planck_J_s,
  speedOfLight_m_s,
  wavenumber_J,
} from './constants';

/** Units in which the energy of a transition is shown. Wavenumber (cm⁻¹) is what the core computes in. */
export type EnergyUnit = 'cm-1' | 'nm' | 'eV' | 'kJ/mol' | 'THz';

export const cm1PerElectronvolt = elementaryCharge_C / wavenumber_J;
export const cm1PerKilojoulePerMole = 1000 / (avogadro_per_mol * wavenumber_J);
export const cm1PerTerahertz = (1e12 * planck_J_s) / wavenumber_J;

/** Vacuum wavelength in nm of a wavenumber in cm⁻¹, and back (the same reciprocal both ways). */
export const wavelength_nm = (wavenumber_cm1: number): number => 1e7 / wavenumber_cm1;
export const wavenumberFromWavelength_cm1 = (wavelengthNm: number): number => 1e7 / wavelengthNm;

/** Converts an energy in cm⁻¹ to `unit`. */
export function fromWavenumber(wavenumber_cm1: number, unit: EnergyUnit): number {
  switch (unit) {
    case 'cm-1':
      return wavenumber_cm1;
    case 'nm':
      return wavelength_nm(wavenumber_cm1);
    case 'eV':
      return wavenumber_cm1 / cm1PerElectronvolt;
    case 'kJ/mol':
      return wavenumber_cm1 / cm1PerKilojoulePerMole;
    case 'THz':
      return wavenumber_cm1 / cm1PerTerahertz;
  }
}

/** Converts an energy in `unit` to cm⁻¹. */
export function toWavenumber(value: number, unit: EnergyUnit): number {
  switch (unit) {
    case 'cm-1':
      return value;
    case 'nm':
      return wavenumberFromWavelength_cm1(value);
    case 'eV':
      return value * cm1PerElectronvolt;
    case 'kJ/mol':
      return value * cm1PerKilojoulePerMole;
    case 'THz':
      return value * cm1PerTerahertz;
  }
}

/**
 * A full width at `centre_cm1`, in `unit`. Widths are not values: on a wavelength axis the width is the distance
 * between the two converted half-height points, which is not symmetric about the centre.
 */
export function widthFromWavenumber(centre_cm1: number, width_cm1: number, unit: EnergyUnit): number {
  if (unit !== 'nm') return fromWavenumber(width_cm1, unit);
  return wavelength_nm(centre_cm1 - width_cm1 / 2) - wavelength_nm(centre_cm1 + width_cm1 / 2);
}

export const speedOfLight_nm_THz = speedOfLight_m_s * 1e-3;
