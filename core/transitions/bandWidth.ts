import { thermalWidth } from './vibration';

/** Line width left where the level does not move with 10Dq, cm⁻¹. */
const lineWidth_cm1 = 120;
/** Width of a band of slope 1 at 10Dq = 15 000 cm⁻¹ and room temperature, cm⁻¹. */
const unitWidth_cm1 = 3300;
/** Slopes beyond this (jumps of two electrons) are not followed: their bands were never resolved so wide. */
const steepest = 1.25;

export interface WidthParts {
  /** Derivative of the energy with respect to 10Dq. */
  readonly slopeTenDq: number;
  /** cm⁻¹ */
  readonly tenDq: number;
  /** Unresolved splitting of the levels on either side, cm⁻¹. */
  readonly splitting_cm1: number;
  readonly temperature_K: number;
}

/**
 * Full width at half height (cm⁻¹). A level that runs steeply against 10Dq samples the spread of metal-ligand distances
 * in the zero-point and thermal motion; one that runs flat gives a line (C. K. Jorgensen 1962; B. N. Figgis and
 * M. A. Hitchman 2000, from memory). The spread grows with the root of 10Dq.
 */
export function bandWidth({ slopeTenDq, tenDq, splitting_cm1, temperature_K }: WidthParts): number {
  const steepness = Math.min(steepest, Math.abs(slopeTenDq));
  const motion = steepness * unitWidth_cm1 * Math.sqrt(Math.max(0, tenDq) / 15_000);
  return Math.hypot(lineWidth_cm1, motion * thermalWidth(temperature_K), splitting_cm1);
}
