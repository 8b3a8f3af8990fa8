import { withLigandChoices } from './choices';
import ligandFile from './data/ligands.json';
import { sourced, unknownValue, type RawSourced, type SourcedValue, type SourceStatus } from './sourced';

export type PiCharacter = 'donor' | 'acceptor' | 'none';

/** Angular-overlap parameters towards one metal, cm⁻¹. Never to be mixed with sets of another convention. */
export interface AngularOverlapSet {
  readonly metal: string;
  readonly eSigma: number;
  readonly ePi: number;
  /** 1 where only the direction out of the ligand's plane interacts, else 2. */
  readonly piDirections: 1 | 2;
  readonly context: string;
  readonly source: string;
  readonly status: SourceStatus | null;
  readonly confidence: 'high' | 'medium' | 'low' | null;
  readonly note: string | null;
}

/** Observed 10Dq of a complex in which all donors are this ligand. */
export interface Anchor {
  readonly metal: string;
  readonly complex: string;
  readonly tenDq: number;
  /** Spin state it was measured in, where the ion has a choice and this is not the state its g is for. */
  readonly spin: 'high' | 'low' | null;
  /** `square-planar` where 10Dq is x2-y2 above xy in a square; null for six donors. */
  readonly geometry: 'square-planar' | null;
  readonly range: readonly [number, number] | null;
  readonly source: string;
  readonly status: SourceStatus | null;
  readonly confidence: 'high' | 'medium' | 'low' | null;
  readonly note: string | null;
}

/** What is known of a ligand's hazards: main points only, the safety data sheet wins. */
export interface LigandHazard {
  readonly text: string;
  readonly ghs: readonly string[];
  readonly source: string;
}

export type ChargeTransferWarning = 'none' | 'LMCT' | 'MLCT' | 'both' | 'mixed' | 'intraligand';

export interface LigandRecord {
  readonly id: string;
  /** Empirical, with charge, `C2O4 2-`. */
  readonly formula: string;
  readonly commonName: string;
  readonly iupacName: string;
  readonly abbreviation: string;
  readonly charge: number;
  readonly denticity: number;
  readonly donorAtoms: readonly string[];
  readonly piCharacter: PiCharacter;
  readonly piNote: string | null;
  /** 10Dq = f g, water 1.00. */
  readonly f: SourcedValue;
  /** Place in a spectrochemical series, where no f is in print. */
  readonly place: {
    readonly strongerThan: readonly string[];
    readonly weakerThan: readonly string[];
    readonly source: string;
  } | null;
  /** B = B0 (1 - h k), water 1.0. */
  readonly h: SourcedValue;
  /** Optical electronegativity. */
  readonly chiOpt: SourcedValue;
  readonly angularOverlap: readonly AngularOverlapSet[];
  readonly anchors: readonly Anchor[];
  readonly hazards: readonly LigandHazard[];
  readonly chargeTransfer: { readonly hides: ChargeTransferWarning; readonly text: string };
  /** `amine`, `halide`, `heterocycle`, ... */
  readonly class: string;
  readonly flags: readonly string[];
}

interface RawLigand extends Omit<
  LigandRecord,
  'f' | 'h' | 'chiOpt' | 'angularOverlap' | 'anchors' | 'hazards' | 'chargeTransfer' | 'flags' | 'place'
> {
  f: RawSourced & { position?: LigandRecord['place'] };
  h: RawSourced;
  chiOpt: RawSourced;
  aom: (Omit<AngularOverlapSet, 'piDirections' | 'note'> & { piDirections?: number; note?: string })[];
  anchors: (Omit<Anchor, 'note' | 'spin' | 'geometry'> & { note?: string })[];
  hazards: { text: string; ghs: string[]; source: string }[];
  ctNotes: { hidesDd: ChargeTransferWarning; text: string };
  flags?: string[];
}

const readLigand = (raw: RawLigand): LigandRecord => ({
  id: raw.id,
  formula: raw.formula,
  commonName: raw.commonName,
  iupacName: raw.iupacName,
  abbreviation: raw.abbreviation,
  charge: raw.charge,
  denticity: raw.denticity,
  donorAtoms: raw.donorAtoms,
  piCharacter: raw.piCharacter,
  piNote: raw.piNote ?? null,
  f: sourced(raw.f),
  place: raw.f.position ?? null,
  h: sourced(raw.h),
  chiOpt: sourced(raw.chiOpt),
  angularOverlap: raw.aom.map((set) => ({
    metal: set.metal,
    eSigma: set.eSigma,
    ePi: set.ePi,
    piDirections: set.piDirections === 1 ? 1 : 2,
    context: set.context,
    source: set.source,
    status: set.status,
    confidence: set.confidence,
    note: set.note ?? null,
  })),
  anchors: raw.anchors.map((anchor) => ({
    metal: anchor.metal,
    complex: anchor.complex,
    tenDq: anchor.tenDq,
    spin: null,
    geometry: null,
    range: anchor.range,
    source: anchor.source,
    status: anchor.status,
    confidence: anchor.confidence,
    note: anchor.note ?? null,
  })),
  hazards: raw.hazards.map(({ text, ghs, source }) => ({ text, ghs, source })),
  chargeTransfer: { hides: raw.ctNotes.hidesDd, text: raw.ctNotes.text },
  class: raw.class,
  flags: raw.flags ?? [],
});

/** What has to be said of a ligand before anything can be estimated with it. */
export interface LigandFacts {
  readonly id: string;
  readonly name: string;
  readonly formula: string | null;
  readonly abbreviation?: string;
  readonly charge: number;
  readonly denticity: number;
  readonly donorAtoms: readonly string[];
  readonly piCharacter: PiCharacter;
  readonly class: string;
  readonly note?: string;
}

/** A ligand of which only facts are known; every parameter is null. */
export const ligandFromFacts = (facts: LigandFacts): LigandRecord => ({
  id: facts.id,
  formula: facts.formula ?? '',
  commonName: facts.name,
  iupacName: facts.name,
  abbreviation: facts.abbreviation ?? facts.id,
  charge: facts.charge,
  denticity: facts.denticity,
  donorAtoms: facts.donorAtoms,
  piCharacter: facts.piCharacter,
  piNote: facts.note ?? null,
  f: unknownValue,
  place: null,
  h: unknownValue,
  chiOpt: unknownValue,
  angularOverlap: [],
  anchors: [],
  hazards: [],
  chargeTransfer: { hides: 'none', text: 'not assessed' },
  class: facts.class,
  flags: [],
});

export const ligandRecords: readonly LigandRecord[] = (ligandFile.ligands as unknown as RawLigand[])
  .map(readLigand)
  .map(withLigandChoices);

export interface CounterIonHazard {
  readonly text: string;
  readonly ghs: readonly string[];
  readonly about: string;
  readonly source: string;
}

export const counterIonHazards: readonly CounterIonHazard[] = ligandFile.meta.counterIonHazards.map(
  ({ text, ghs, referenceSubstance, source }) => ({ text, ghs, about: referenceSubstance, source }),
);
