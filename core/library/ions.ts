import metals from './data/metals.json';
import { withChoices } from './choices';
import { sourced, unknownValue, type RawSourced, type SourcedValue } from './sourced';

export type TransitionPeriod = '3d' | '4d' | '5d';

/** Effective ionic radii by coordination and spin, pm. */
export interface IonicRadii {
  readonly oct?: number;
  readonly octHS?: number;
  readonly octLS?: number;
  readonly tet?: number;
  readonly squarePlanar?: number;
}

/** Parameters of one metal ion. Energies in cm⁻¹. */
export interface IonRecord {
  readonly symbol: string;
  readonly oxidationState: number;
  /** `Fe2+` */
  readonly ion: string;
  readonly dElectrons: number;
  readonly period: TransitionPeriod;
  /** 10Dq = f g */
  readonly g: SourcedValue;
  /** The same for x2-y2 above xy in a square plane of four donors. */
  readonly gSquarePlanar: SourcedValue;
  /** B = B0 (1 - h k) */
  readonly k: SourcedValue;
  readonly B0: SourcedValue;
  readonly C0: SourcedValue;
  /** One-electron spin-orbit parameter of the free ion. */
  readonly zeta0: SourcedValue;
  /** Optical electronegativity without the spin-pairing term, by coordination. */
  readonly chiOpt: { readonly oct: SourcedValue; readonly tet: SourcedValue };
  /** The same with the spin-pairing term taken out; never to be mixed with `chiOpt`. */
  readonly chiOptSpinPairingCorrected: { readonly oct: SourcedValue; readonly tet: SourcedValue };
  readonly shannonRadius_pm: { readonly value: IonicRadii | null; readonly source: string | null };
  readonly pairingEnergy: SourcedValue;
  readonly note: string | null;
}

interface RawIon {
  symbol: string;
  oxidationState: number;
  ion: string;
  dElectrons: number;
  period: string;
  g: RawSourced | null;
  k: RawSourced | null;
  B0: RawSourced | null;
  C0: RawSourced | null;
  zeta0: RawSourced | null;
  chiOptUncorrected: { oct: RawSourced | null; tet: RawSourced | null } | null;
  chiOptSpinPairingCorrected?: { oct: RawSourced | null; tet: RawSourced | null } | null;
  shannonRadius_pm: { value: IonicRadii; source: string } | null;
  pairingEnergy: RawSourced | null;
  note?: string;
}

/** `Fe`, 2 -> `Fe2+`; `Cr`, 0 -> `Cr(0)`. */
export const ionName = (symbol: string, oxidationState: number): string =>
  oxidationState > 0 ? `${symbol}${oxidationState}+` : `${symbol}(${oxidationState})`;

const byCoordination = (raw: { oct: RawSourced | null; tet: RawSourced | null } | null | undefined) => ({
  oct: sourced(raw?.oct),
  tet: sourced(raw?.tet),
});

const readIon = (raw: RawIon): IonRecord => ({
  symbol: raw.symbol,
  oxidationState: raw.oxidationState,
  ion: raw.ion,
  dElectrons: raw.dElectrons,
  period: raw.period as TransitionPeriod,
  g: sourced(raw.g),
  gSquarePlanar: unknownValue,
  k: sourced(raw.k),
  B0: sourced(raw.B0),
  C0: sourced(raw.C0),
  zeta0: sourced(raw.zeta0),
  chiOpt: byCoordination(raw.chiOptUncorrected),
  chiOptSpinPairingCorrected: byCoordination(raw.chiOptSpinPairingCorrected),
  shannonRadius_pm: {
    value: raw.shannonRadius_pm?.value ?? null,
    source: raw.shannonRadius_pm?.source ?? null,
  },
  pairingEnergy: sourced(raw.pairingEnergy),
  note: raw.note ?? null,
});

export const ionRecords: readonly IonRecord[] = (metals.ions as unknown as RawIon[])
  .map(readIon)
  .map(withChoices);

/** An ion of which nothing but its d count is known. */
export const bareIon = (
  symbol: string,
  oxidationState: number,
  dElectrons: number,
  period: TransitionPeriod,
): IonRecord => ({
  symbol,
  oxidationState,
  ion: ionName(symbol, oxidationState),
  dElectrons,
  period,
  g: unknownValue,
  gSquarePlanar: unknownValue,
  k: unknownValue,
  B0: unknownValue,
  C0: unknownValue,
  zeta0: unknownValue,
  chiOpt: byCoordination(null),
  chiOptSpinPairingCorrected: byCoordination(null),
  shannonRadius_pm: { value: null, source: null },
  pairingEnergy: unknownValue,
  note: null,
});
