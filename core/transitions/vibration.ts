import { boltzmann_cm1_K } from '../units';

/** Skeletal mode that makes a centrosymmetric complex absorb and that broadens every band, cm⁻¹; a usual size. */
export const skeletalMode_cm1 = 250;

const room_K = 298.15;

/** coth(hν / 2kT): how much a mode's mean square amplitude exceeds that of its zero point. */
export const thermalFactor = (mode_cm1: number, temperature_K: number): number =>
  1 / Math.tanh(mode_cm1 / (2 * boltzmann_cm1_K * temperature_K));

/**
 * Intensity of a vibronic band relative to that at room temperature: it goes as coth(hν/2kT). C. J. Ballhausen,
 * Introduction to Ligand Field Theory (1962), from memory.
 */
export const vibronicGain = (temperature_K: number): number =>
  thermalFactor(skeletalMode_cm1, temperature_K) / thermalFactor(skeletalMode_cm1, room_K);

/** Width relative to that at room temperature: the square root of the same. */
export const thermalWidth = (temperature_K: number): number => Math.sqrt(vibronicGain(temperature_K));
