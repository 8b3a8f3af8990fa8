/** Spin-only moment of n unpaired electrons, Bohr magnetons: sqrt(n (n + 2)). */
export const spinOnlyMoment = (unpaired: number): number => Math.sqrt(unpaired * (unpaired + 2));

/**
 * Moment of an A or E ground term with spin-orbit coupling to the next level, mu_so (1 - alpha lambda / 10Dq), alpha 4
 * for A2 and 2 for E (B. N. Figgis and J. Lewis, Prog. Inorg. Chem. 6, 1964, 37). There is no such formula for a T term.
 */
export const secondOrderMoment = (
  unpaired: number,
  alpha: 2 | 4,
  lambda_cm1: number,
  tenDq_cm1: number,
): number => spinOnlyMoment(unpaired) * (1 - (alpha * lambda_cm1) / tenDq_cm1);

/** mu of a mixture of spin states: mu^2 adds up by share. */
export const mixedMoment = (shareHigh: number, high: number, low: number): number =>
  Math.sqrt(shareHigh * high * high + (1 - shareHigh) * low * low);

type Range = readonly [number, number];

/**
 * Moments found near room temperature for 3d ions, Bohr magnetons; from memory of B. N. Figgis and J. Lewis (1964) and
 * B. N. Figgis, Introduction to Ligand Fields (1966). Key: geometry, d count, unpaired electrons. T terms (no simple
 * formula, temperature dependent) are given the wider ranges that are found.
 */
const found: Readonly<Record<string, Range>> = {
  'octahedral d1 1': [1.6, 1.8],
  'octahedral d2 2': [2.6, 2.9],
  'octahedral d3 3': [3.7, 3.9],
  'octahedral d4 4': [4.7, 5.0],
  'octahedral d4 2': [3.1, 3.6],
  'octahedral d5 5': [5.7, 6.1],
  'octahedral d5 1': [1.8, 2.5],
  'octahedral d6 4': [5.1, 5.7],
  'octahedral d6 0': [0, 0.5],
  'octahedral d7 3': [4.7, 5.2],
  'octahedral d7 1': [1.8, 2.0],
  'octahedral d8 2': [2.9, 3.4],
  'octahedral d9 1': [1.7, 2.2],
  'tetrahedral d1 1': [1.6, 1.8],
  'tetrahedral d2 2': [2.6, 2.8],
  'tetrahedral d3 3': [3.7, 4.0],
  'tetrahedral d4 4': [4.7, 5.0],
  'tetrahedral d5 5': [5.7, 6.1],
  'tetrahedral d6 4': [5.0, 5.3],
  'tetrahedral d7 3': [4.3, 4.7],
  'tetrahedral d8 2': [3.2, 4.1],
  'tetrahedral d9 1': [1.8, 2.2],
  'square-planar d7 1': [1.8, 2.9],
  'square-planar d8 0': [0, 0.5],
  'square-planar d9 1': [1.7, 2.2],
};

/** Range of moments found for such an ion at room temperature; null where spin-orbit coupling rules (4d, 5d). */
export function momentRange(
  geometry: string,
  dElectrons: number,
  unpaired: number,
  period: string,
): Range | null {
  if (unpaired === 0) return [0, 0.5];
  if (period !== '3d') return null;
  const shape = geometry === 'tetrahedral' || geometry === 'square-planar' ? geometry : 'octahedral';
  return found[`${shape} d${dElectrons} ${unpaired}`] ?? null;
}
