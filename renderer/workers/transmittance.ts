import type { Band } from '../../core/transitions/types';

/** Shares of light from 0 to 1 at 380, 385, ... 780 nm. */
export type Transmittance = readonly number[];

export const transmittanceSteps = 81;
const from_nm = 380;
const step_nm = 5;

const fourLn2 = 4 * Math.LN2;

/**
 * Share of light that passes: 10^(-A), A = sum of Gaussian bands in wavenumber times concentration and path
 * (Beer-Lambert). Three decimals, since a strip shows no more.
 */
export function visibleTransmittance(
  bands: readonly Pick<Band, 'energy_cm1' | 'width_cm1' | 'molarAbsorptivity'>[],
  concentration_mM: number,
  path_cm: number,
): Transmittance {
  return Array.from({ length: transmittanceSteps }, (_, index) => {
    const wavenumber = 1e7 / (from_nm + step_nm * index);
    let absorptivity = 0;
    for (const { energy_cm1, width_cm1, molarAbsorptivity } of bands) {
      absorptivity += molarAbsorptivity * Math.exp(-fourLn2 * ((wavenumber - energy_cm1) / width_cm1) ** 2);
    }
    const passed = 10 ** (-absorptivity * concentration_mM * 1e-3 * path_cm);
    return Math.round(passed * 1000) / 1000;
  });
}
