/**
 * Ligand-field stabilisation of an octahedral configuration t2g^t2 eg^e against the unsplit shell, cm⁻¹, a positive
 * number where it is stabilised: 0.4 10Dq for each t2g and -0.6 10Dq for each eg electron.
 */
export const ligandFieldStabilisation = (t2: number, e: number, tenDq_cm1: number): number =>
  (0.4 * t2 - 0.6 * e) * tenDq_cm1;

/** Electron pairs of a configuration beyond those of the same count in an unsplit shell (Hund). */
export function extraPairs(t2: number, e: number): number {
  const pairs = Math.max(0, t2 - 3) + Math.max(0, e - 2);
  return pairs - Math.max(0, t2 + e - 5);
}
