import { avogadro_per_mol, boltzmann_J_K } from '../../units';
import { SpinhueError } from '../../errors';
import type { Uncertain } from '../../record/uncertain';

/** Bohr magneton in erg/G (CODATA 2018), for susceptibilities in the cgs units of the trade. */
const bohrMagneton_erg_G = 9.2740100783e-21;

/** mu_eff^2 / (chi T) = 3 k / (N_A mu_B^2), Bohr magnetons squared per cm3 K/mol: 7.9969, the square of 2.8279. */
export const momentSquaredPerChiT = (3 * boltzmann_J_K * 1e7) / (avogadro_per_mol * bohrMagneton_erg_G ** 2);

/** Effective moment (Bohr magnetons) of a paramagnetic molar susceptibility in cm3/mol; zero where it is not positive. */
export const momentFromChi = (chi_cm3_mol: number, temperature_K: number): number =>
  Math.sqrt(Math.max(0, momentSquaredPerChiT * chi_cm3_mol * temperature_K));

export const chiTFromMoment = (moment_BM: number): number => moment_BM ** 2 / momentSquaredPerChiT;

/** Paramagnetic part: the measured susceptibility less the (negative) diamagnetic one. */
export const corrected = (measured_cm3_mol: number, diamagnetic_cm3_mol: number): number =>
  measured_cm3_mol - diamagnetic_cm3_mol;

export interface MomentResult {
  /** Before the diamagnetic correction, cm3/mol. */
  readonly chi_cm3_mol: Uncertain;
  readonly chiT_cm3K_mol: Uncertain;
  readonly moment_BM: Uncertain;
  readonly remarks: readonly string[];
}

function moment(
  chi: Uncertain,
  temperature_K: Uncertain,
  diamagnetic: number,
  remarks: string[],
): MomentResult {
  const paramagnetic = corrected(chi.value, diamagnetic);
  const T = temperature_K.value;
  const relative =
    chi.u === null && temperature_K.u === null
      ? null
      : Math.hypot((chi.u ?? 0) / Math.abs(paramagnetic), (temperature_K.u ?? 0) / T);
  if (diamagnetic > 0)
    remarks.push('the diamagnetic susceptibility is positive: tables give it negative, check the sign');
  if (diamagnetic === 0) remarks.push('no diamagnetic correction: the moment comes out 1-3 % too low');
  if (paramagnetic <= 0) remarks.push('no paramagnetism is left: a diamagnetic sample, or a sign is wrong');
  const mu = momentFromChi(paramagnetic, T);
  return {
    chi_cm3_mol: chi,
    chiT_cm3K_mol: {
      value: paramagnetic * T,
      u: relative === null ? null : Math.abs(paramagnetic * T) * relative,
    },
    moment_BM: { value: mu, u: relative === null ? null : (mu * relative) / 2 },
    remarks,
  };
}

const positive = (value: number, field: string): void => {
  if (!(value > 0) || !Number.isFinite(value)) {
    throw new SpinhueError({
      code: 'out-of-range',
      field,
      message: `${field} is ${value}; expected a positive number`,
    });
  }
};

export interface EvansReading {
  /** Shift of the reference signal towards high frequency in the sample, against the pure solvent. */
  readonly shift_Hz: Uncertain;
  readonly spectrometer_MHz: number;
  readonly concentration_mM: Uncertain;
  readonly temperature_K: Uncertain;
  /** `along` the tube in superconducting magnets, `across` in old iron magnets. */
  readonly field: 'along' | 'across';
  /** Negative, cm3/mol, as in tables. */
  readonly diamagnetic_cm3_mol: number;
  /** Mass susceptibility of the solvent (cm3/g, negative) and molar mass: the solvent that the solute displaces. */
  readonly solvent?: { readonly chi_cm3_g: number; readonly molarMass_g_mol: number } | undefined;
}

/**
 * Molar susceptibility and moment by Evans's method (D. F. Evans, J. Chem. Soc. 1959, 2003): chi_M = 3 df / (4 pi f c)
 * in cgs units, c in mol/cm3, for a field along the tube (S. K. Sur, J. Magn. Reson. 82, 169, 1989); with the field
 * across it the factor 4 pi / 3 becomes -2 pi / 3. Throws a SpinhueError for a reading that is not positive.
 */
export function evansMoment(reading: EvansReading): MomentResult {
  positive(reading.spectrometer_MHz, 'spectrometer_MHz');
  positive(reading.concentration_mM.value, 'concentration_mM');
  positive(reading.temperature_K.value, 'temperature_K');
  const factor = reading.field === 'along' ? (4 * Math.PI) / 3 : (-2 * Math.PI) / 3;
  const perHz = 1 / (factor * reading.spectrometer_MHz * 1e6 * reading.concentration_mM.value * 1e-6);
  const solvent =
    reading.solvent === undefined ? 0 : reading.solvent.chi_cm3_g * reading.solvent.molarMass_g_mol;
  const shiftPart = reading.shift_Hz.value * perHz;
  const remarks: string[] = [];
  if (shiftPart < 0) {
    remarks.push(
      'the shift has the sign of a diamagnetic sample: check the magnet geometry and which signal is which',
    );
  }
  const known = reading.shift_Hz.u !== null || reading.concentration_mM.u !== null;
  const u = known
    ? Math.hypot(
        (reading.shift_Hz.u ?? 0) * perHz,
        (shiftPart * (reading.concentration_mM.u ?? 0)) / reading.concentration_mM.value,
      )
    : null;
  return moment(
    { value: shiftPart + solvent, u },
    reading.temperature_K,
    reading.diamagnetic_cm3_mol,
    remarks,
  );
}

/**
 * Concentration at another temperature, from the densities of the solvent: without it a variable-temperature moment by
 * Evans's method drifts by about 0.1 % per kelvin in common organic solvents.
 */
export const concentrationAt = (
  concentration_mM: number,
  density: number,
  densityWherePrepared: number,
): number => (concentration_mM * density) / densityWherePrepared;

export interface BalanceReading {
  readonly massSusceptibility_cm3_g: Uncertain;
  /** With counter-ions and solvate: they are in the weighed mass. */
  readonly molarMass_g_mol: number;
  readonly temperature_K: Uncertain;
  readonly diamagnetic_cm3_mol: number;
}

/** Moment from the mass susceptibility that a balance or a magnetometer gives. */
export function balanceMoment(reading: BalanceReading): MomentResult {
  positive(reading.molarMass_g_mol, 'molarMass_g_mol');
  positive(reading.temperature_K.value, 'temperature_K');
  const { value, u } = reading.massSusceptibility_cm3_g;
  const M = reading.molarMass_g_mol;
  return moment(
    { value: value * M, u: u === null ? null : u * M },
    reading.temperature_K,
    reading.diamagnetic_cm3_mol,
    [],
  );
}
