import { type EnergyUnit } from '../../../core/units';

export const energyUnits = ['nm', 'cm-1', 'eV', 'kJ/mol', 'THz'] as const satisfies readonly EnergyUnit[];

/** As set in print. */
export const unitText: Readonly<Record<EnergyUnit, string>> = {
  nm: 'nm',
  'cm-1': 'cm⁻¹',
  eV: 'eV',
  'kJ/mol': 'kJ/mol',
  THz: 'THz',
};

/** As read aloud, and as the explanation of the switch. */
export const unitSpoken: Readonly<Record<EnergyUnit, string>> = {
  nm: 'nanometres (vacuum wavelength)',
  'cm-1': 'reciprocal centimetres (wavenumber)',
  eV: 'electronvolts',
  'kJ/mol': 'kilojoules per mole',
  THz: 'terahertz (frequency)',
};
