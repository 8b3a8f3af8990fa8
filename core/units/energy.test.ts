import { describe, expect, it } from 'vitest';
import { boltzmann_cm1_K, cm1PerElectronvolt, cm1PerKilojoulePerMole } from './index';
import { fromWavenumber, toWavenumber, widthFromWavenumber, type EnergyUnit } from './energy';

describe('energy units', () => {
  it('agree with CODATA 2018: 8065.543937 cm-1 per eV, 83.5935 cm-1 per kJ/mol, k = 0.695034800 cm-1/K', () => {
    expect(cm1PerElectronvolt).toBeCloseTo(8065.543937, 5);
    expect(cm1PerKilojoulePerMole).toBeCloseTo(83.593472, 5);
    expect(boltzmann_cm1_K).toBeCloseTo(0.6950348, 8);
  });

  it('put 17 400 cm-1 at 574.7 nm, 2.157 eV and 208.2 kJ/mol', () => {
    expect(fromWavenumber(17_400, 'nm')).toBeCloseTo(574.71, 2);
    expect(fromWavenumber(17_400, 'eV')).toBeCloseTo(2.157, 3);
    expect(fromWavenumber(17_400, 'kJ/mol')).toBeCloseTo(208.15, 2);
  });

  it('convert a width of 3 600 cm-1 at 17 400 cm-1 to about 120 nm (521 to 641 nm), not linearly', () => {
    expect(widthFromWavenumber(17_400, 3_600, 'nm')).toBeCloseTo(120.18, 1);
  });

  it('go there and back', () => {
    for (const unit of ['cm-1', 'nm', 'eV', 'kJ/mol', 'THz'] satisfies EnergyUnit[]) {
      expect(toWavenumber(fromWavenumber(12_345, unit), unit)).toBeCloseTo(12_345, 8);
    }
  });
});
