import type { Anchor, IonRecord, LigandRecord } from '../library';

/**
 * 10Dq falls with the metal-ligand distance as r^-5 (point charges) to r^-6; A. Hauser, Top. Curr. Chem. 233 (2004)
 * 49, from memory. The middle is used and the half-width kept as its doubt.
 */
export const distanceExponent = { value: 5.5, sigma: 0.5 } as const;

/**
 * What a donor atom adds to the Shannon radius of the metal to give the bond length, pm. Rounded from usual bond
 * lengths to divalent and trivalent 3d ions (common practice): Ni-N 213, Ni-O 206, Cr-F 190, Fe-Cl 238 pm and so on.
 */
const donorRadius_pm: Readonly<Record<string, number>> = {
  F: 129,
  O: 136,
  N: 140,
  C: 136,
  Cl: 176,
  Br: 191,
  I: 212,
  S: 178,
  Se: 190,
  P: 170,
  As: 178,
  H: 105,
};

const meanDonorRadius = (donors: readonly { ligand: LigandRecord; places: number }[]): number => {
  let sum = 0;
  let count = 0;
  for (const { ligand, places } of donors) {
    const each = places / ligand.donorAtoms.length;
    for (const atom of ligand.donorAtoms) {
      sum += (donorRadius_pm[atom] ?? 140) * each;
      count += each;
    }
  }
  return sum / count;
};

/** 10Dq at distance `to` over 10Dq at distance `from` (same unit). */
export const distanceFactor = (from: number, to: number, exponent: number = distanceExponent.value): number =>
  (from / to) ** exponent;

export interface SpinDistances {
  readonly high_pm: number;
  readonly low_pm: number;
}

/** Metal-ligand distances of the two spin states from Shannon's radii; null where he lists only one. */
export function spinDistances(
  ion: IonRecord,
  donors: readonly { ligand: LigandRecord; places: number }[],
): SpinDistances | null {
  const high = ion.shannonRadius_pm.value?.octHS;
  const low = ion.shannonRadius_pm.value?.octLS;
  if (high === undefined || low === undefined) return null;
  const donor = meanDonorRadius(donors);
  return { high_pm: high + donor, low_pm: low + donor };
}

/** Ions whose tabulated g is for the low-spin state although a high-spin one exists. */
const lowSpinTables = new Set(['Co3+', 'Ni3+', 'Ni4+', 'Co4+', 'Cu3+']);

/** The spin state whose metal-ligand distance the tabulated g of an ion goes with. */
export const tableSpin = (ion: IonRecord): 'high' | 'low' => (lowSpinTables.has(ion.ion) ? 'low' : 'high');

/** 10Dq of an anchor brought to the distance the tabulated g of its ion goes with. */
export function onTableScale(anchor: Anchor, ligand: LigandRecord, ion: IonRecord): number {
  const distances = spinDistances(ion, [{ ligand, places: 6 }]);
  if (anchor.spin === null || anchor.spin === tableSpin(ion) || distances === null) return anchor.tenDq;
  const { high_pm, low_pm } = distances;
  return anchor.spin === 'low'
    ? anchor.tenDq * distanceFactor(low_pm, high_pm)
    : anchor.tenDq * distanceFactor(high_pm, low_pm);
}
