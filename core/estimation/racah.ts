import type { IonRecord, LigandRecord, ParameterLibrary } from '../library';
import { defaultDoubts } from './defaultDoubts';
import { ligandCovalency, metalCovalency } from './nephelauxetic';
import { estimate, notEstimated, weakestRoute } from './uncertain';
import type { DoubtShare, Estimate, Reason } from './types';

export interface DonorShare {
  readonly ligand: LigandRecord;
  /** Number of coordination places it fills. */
  readonly places: number;
}

/** B = B0 (1 - h k), C. K. Jorgensen, Absorption Spectra and Chemical Bonding in Complexes (1962). */
export const nephelauxeticB = (freeIonB: number, h: number, k: number): number => freeIonB * (1 - h * k);

/** Covalency never takes more than this share of the free-ion B in the complexes the factors were fitted to. */
const mostReduction = 0.75;

/**
 * Racah B of a complex (cm⁻¹), h averaged over the donors. Free-ion B is far too large for a complex; where no h or k
 * can be had B is not estimated.
 */
export function racahB(ion: IonRecord, donors: readonly DonorShare[], library: ParameterLibrary): Estimate {
  if (ion.dElectrons < 2 || ion.dElectrons > 8) {
    return notEstimated(`B has no meaning for d${ion.dElectrons}`);
  }
  if (ion.B0.value === null) {
    return notEstimated(`no free-ion B of ${ion.ion} is on file`, 'three bands of any one complex give B');
  }
  const k = metalCovalency(ion, library);
  const parts = donors.map(({ ligand, places }) => ({ ligand, places, h: ligandCovalency(ligand, library) }));
  const missing = parts.filter(({ h }) => h === null).map(({ ligand }) => ligand.commonName);
  if (k === null || missing.length > 0) {
    return notEstimated(`nothing is known of the nephelauxetic effect of ${missing.join(', ') || ion.ion}`);
  }
  const total = parts.reduce((sum, { places }) => sum + places, 0);
  const mean = parts.reduce((sum, { h, places }) => sum + h!.value * places, 0) / total;
  const reduction = Math.min(mean * k.value, mostReduction);
  const value = ion.B0.value * (1 - reduction);
  const slope = ion.B0.value * k.value;
  const shares: DoubtShare[] = parts.map(({ ligand, places, h }) => ({
    cause: `h:${ligand.id}`,
    sigma: ((slope * places) / total) * h!.value * h!.sigma,
  }));
  shares.push(
    { cause: `k:${ion.ion}`, sigma: -slope * mean * k.sigma },
    { cause: `B0:${ion.ion}`, sigma: value * defaultDoubts.freeIonB },
    { cause: `nephelauxetic:${ion.ion}`, sigma: value * defaultDoubts.nephelauxetic },
  );
  const reasons: Reason[] = [
    { kind: 'source', text: `B0(${ion.ion}) = ${ion.B0.value} (${ion.B0.source})` },
    ...k.reasons,
    ...parts.flatMap(({ h }) => h!.reasons),
  ];
  if (mean * k.value > mostReduction) {
    reasons.push({
      kind: 'doubt',
      text: `h k = ${(mean * k.value).toFixed(2)} would leave next to nothing of B; it was held at ${mostReduction}`,
    });
  }
  return estimate(value, shares, weakestRoute([k.route, ...parts.map(({ h }) => h!.route)]), reasons);
}

/** C/B of the free ion; 4 where none is on file, as the literature of the 4d and 5d ions assumes. */
export function ratioCB(ion: IonRecord): { readonly value: number; readonly reason: Reason } {
  if (ion.C0.value !== null && ion.B0.value !== null) {
    const value = ion.C0.value / ion.B0.value;
    return {
      value,
      reason: { kind: 'source', text: `C/B = ${value.toFixed(2)} of the free ion (${ion.C0.source})` },
    };
  }
  return {
    value: 4,
    reason: { kind: 'assumption', text: `C/B = 4, as is usually assumed where no C of ${ion.ion} is known` },
  };
}

export function racahC(ion: IonRecord, B: Estimate): Estimate {
  if (B.value === null) return notEstimated('B is not estimated');
  const ratio = ratioCB(ion);
  const shares = (B.shares ?? []).map(({ cause, sigma }) => ({ cause, sigma: sigma * ratio.value }));
  const doubt = B.value * defaultDoubts.ratioCB;
  return estimate(B.value * ratio.value, [...shares, { cause: `C/B:${ion.ion}`, sigma: doubt }], B.route, [
    ratio.reason,
    { kind: 'doubt', text: 'C/B is taken over from the free ion', sigma: doubt },
  ]);
}
