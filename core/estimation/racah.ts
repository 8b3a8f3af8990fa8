import type { IonRecord, LigandRecord, ParameterLibrary } from '../library';
import { defaultDoubts } from './defaultDoubts';
import { freeIonB } from './freeIonRacah';
import { ligandCovalency, metalCovalency } from './nephelauxetic';
import { estimate, notEstimated, weakestRoute } from './uncertain';
import type { DoubtShare, Estimate, EstimateRoute, Reason } from './types';

export interface DonorShare {
  readonly ligand: LigandRecord;
  /** Number of coordination places it fills. */
  readonly places: number;
}

/** B = B0 (1 - h k), C. K. Jorgensen, Absorption Spectra and Chemical Bonding in Complexes (1962). */
export const nephelauxeticB = (freeIonB: number, h: number, k: number): number => freeIonB * (1 - h * k);

/** Covalency never takes more than this share of the free-ion B in the complexes the factors were fitted to. */
const mostReduction = 0.75;

/** Part of the ligand a donor set takes in h, and of the metal in k. */
interface Covalency {
  readonly hk: number;
  readonly shares: readonly DoubtShare[];
  readonly reasons: readonly Reason[];
  readonly route: EstimateRoute;
}

/** h k of the average environment with the doubt that each part adds to it; a reason why not otherwise. */
function covalency(
  ion: IonRecord,
  donors: readonly DonorShare[],
  library: ParameterLibrary,
): Covalency | string {
  const k = metalCovalency(ion, library);
  const parts = donors.map(({ ligand, places }) => ({ ligand, places, h: ligandCovalency(ligand, library) }));
  const missing = parts.filter(({ h }) => h === null).map(({ ligand }) => ligand.commonName);
  if (k === null || missing.length > 0) return missing.join(', ') || ion.ion;
  const total = parts.reduce((sum, { places }) => sum + places, 0);
  const mean = parts.reduce((sum, { h, places }) => sum + h!.value * places, 0) / total;
  return {
    hk: mean * k.value,
    shares: [
      ...parts.map(({ ligand, places, h }) => ({
        cause: `h:${ligand.id}`,
        sigma: (k.value * h!.value * h!.sigma * places) / total,
      })),
      { cause: `k:${ion.ion}`, sigma: mean * k.value * k.sigma },
    ],
    reasons: [...k.reasons, ...parts.flatMap(({ h }) => h!.reasons)],
    route: weakestRoute([k.route, ...parts.map(({ h }) => h!.route)]),
  };
}

/**
 * How far C falls for each part that B falls. Repulsion within t2g is reduced least, within eg most (Jorgensen's
 * beta55 > beta35 > beta33): the low spin-flip levels are within t2g in d2 and d3,
 * within both halves in d5, and within eg in d8. The sizes are
 * from 2E of six chromium(III) complexes and 1E, 1T2 of nickel(II) ones.
 */
const reductionOfC = (dElectrons: number): number =>
  dElectrons === 2 || dElectrons === 3 || dElectrons === 5 ? 0.75 : dElectrons === 8 ? 1.25 : 1;

/**
 * Four donors hold the electrons tighter than six: B of tetrahedral manganese(II) and cobalt(II) lies below what the h
 * of octahedral complexes says, by 5 % in tetrabromomanganate(II) and 13 % in Co(II)-doped zinc oxide.
 */
const tetrahedralFactor = 0.92;

/** C/B of the free ion; 4 where no C of a 4d or 5d ion is on file, as its literature assumes, 4.5 for a 3d ion. */
export function freeIonRatio(ion: IonRecord): { readonly value: number; readonly reason: Reason } {
  if (ion.C0.value !== null && ion.B0.value !== null) {
    return {
      value: ion.C0.value / ion.B0.value,
      reason: { kind: 'source', text: `C0(${ion.ion}) = ${ion.C0.value} (${ion.C0.source})` },
    };
  }
  return {
    value: ion.period === '3d' ? 4.5 : 4,
    reason: {
      kind: 'assumption',
      text: `C/B = ${ion.period === '3d' ? 4.5 : 4}, as is usually assumed where no C of ${ion.ion} is known`,
    },
  };
}

/**
 * Racah B and C of a complex (cm⁻¹) after the nephelauxetic rule, h averaged over the donors. Free-ion values are far
 * too large for a complex; where no h or k can be had neither is estimated.
 */
export function racahParameters(
  ion: IonRecord,
  donors: readonly DonorShare[],
  geometry: string,
  library: ParameterLibrary,
): { readonly B: Estimate; readonly C: Estimate } {
  const none = (because: string, settle?: string) => ({
    B: notEstimated(because, settle),
    C: notEstimated(because, settle),
  });
  if (ion.dElectrons < 2 || ion.dElectrons > 8) return none(`it has no meaning for d${ion.dElectrons}`);
  const free = freeIonB(ion, library);
  if (free === null) {
    return none(`no free-ion B of ${ion.ion} is on file`, 'three bands of any one complex give B');
  }
  const taken = covalency(ion, donors, library);
  if (typeof taken === 'string') return none(`nothing is known of the nephelauxetic effect of ${taken}`);
  const B0 = free.value;
  const ratio = freeIonRatio(ion);
  const hk = Math.min(taken.hk, mostReduction);
  const inC = reductionOfC(ion.dElectrons);
  const tetrahedral = geometry === 'tetrahedral' ? tetrahedralFactor : 1;
  const of = (start: number, weight: number): { value: number; shares: DoubtShare[] } => {
    const value = start * (1 - weight * hk) * tetrahedral;
    const shares = taken.shares.map(({ cause, sigma }) => ({
      cause,
      sigma: -start * weight * tetrahedral * sigma,
    }));
    shares.push(
      { cause: `B0:${ion.ion}`, sigma: value * free.sigma },
      { cause: `nephelauxetic:${ion.ion}`, sigma: value * defaultDoubts.nephelauxetic },
    );
    if (tetrahedral !== 1) {
      shares.push({ cause: `tetrahedral-B:${ion.ion}`, sigma: value * defaultDoubts.tetrahedralB });
    }
    return { value, shares };
  };
  const reasons: Reason[] = [...free.reasons, ...taken.reasons];
  if (tetrahedral !== 1) {
    reasons.push({ kind: 'assumption', text: `B and C ${tetrahedral} times as large in a tetrahedron` });
  }
  if (taken.hk > mostReduction) {
    const text = `h k = ${taken.hk.toFixed(2)} would leave next to nothing of B; it was held at ${mostReduction}`;
    reasons.push({ kind: 'doubt', text });
  }
  const b = of(B0, 1);
  const c = of(B0 * ratio.value, inC);
  const route = weakestRoute([free.route, taken.route]);
  const doubt = c.value * defaultDoubts.racahC;
  return {
    B: estimate(b.value, b.shares, route, reasons),
    C: estimate(c.value, [...c.shares, { cause: `C0:${ion.ion}`, sigma: doubt }], route, [
      ratio.reason,
      ...reasons.slice(1),
      ...(inC === 1
        ? []
        : [{ kind: 'assumption' as const, text: `C falls ${inC} times as fast as B with covalency` }]),
      { kind: 'doubt', text: 'C0 and its loss are the least known part', sigma: doubt },
    ]),
  };
}
