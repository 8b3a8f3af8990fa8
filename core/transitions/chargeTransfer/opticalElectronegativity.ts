import { classMean } from '../../estimation/donorClass';
import type { IonRecord, LigandRecord, ParameterLibrary, SourcedValue } from '../../library';
import type { GeometryId } from '../../record/composition';
import {
  ligandsFromBands,
  planarFromBands,
  tetrahedralFromBands,
  type FromBand,
} from './electronegativityFromBands';

/** An optical electronegativity and whether it belongs to the ion or ligand itself. */
export interface Electronegativity {
  readonly value: number;
  /** Not its own: by analogy. */
  readonly analogy: boolean;
  readonly reason: string;
}

export interface MetalElectronegativity extends Electronegativity {
  /** The spin-pairing term has still to be added: the two columns are never mixed. */
  readonly needsSpinPairing: boolean;
}

const own = (found: SourcedValue, name: string): Electronegativity | null =>
  found.value === null
    ? null
    : { value: found.value, analogy: false, reason: `chi(${name}) = ${found.value} (${found.source})` };

const fromBand = (name: string, { value, from }: FromBand): Electronegativity => ({
  value,
  analogy: false,
  reason: `chi(${name}) = ${value}, ${from}`,
});

/** Optical electronegativity of a ligand: its own, else of its donor class; null where nothing is known. */
export function ligandElectronegativity(
  ligand: LigandRecord,
  library: ParameterLibrary,
): Electronegativity | null {
  const known = own(ligand.chiOpt, ligand.abbreviation);
  const band = ligandsFromBands[ligand.id];
  if (band !== undefined && (known === null || ligand.chiOpt.confidence === 'low')) {
    return fromBand(ligand.abbreviation, band);
  }
  if (known !== null) return known;
  // π acceptors are oxidised at no known energy, and water says nothing of an oxide ion.
  if (ligand.piCharacter === 'acceptor') return null;
  const mean = classMean(ligand, library, (other) => other.chiOpt.value, 1);
  if (mean === null) return null;
  return {
    value: mean.mean,
    analogy: true,
    reason: `chi(${ligand.abbreviation}) = ${mean.mean.toFixed(2)}, taken from ${mean.members.join(', ')}`,
  };
}

type Coordination = 'oct' | 'tet' | 'planar';

const coordinationOf = (geometry: GeometryId): Coordination =>
  geometry === 'tetrahedral' ? 'tet' : geometry === 'square-planar' ? 'planar' : 'oct';

/**
 * Optical electronegativity of an ion for its coordination. Values for four and six donors differ; where only the other
 * is on file it is taken as an analogy. Null where neither is.
 */
export function metalElectronegativity(ion: IonRecord, geometry: GeometryId): MetalElectronegativity | null {
  const coordination = coordinationOf(geometry);
  const table = { planar: planarFromBands, tet: tetrahedralFromBands, oct: undefined }[coordination];
  const band = table?.[ion.ion];
  if (band !== undefined) return { ...fromBand(ion.ion, band), needsSpinPairing: false };
  const first = coordination === 'tet' ? 'tet' : 'oct';
  const second = first === 'tet' ? 'oct' : 'tet';
  const name = `${ion.ion}, ${first === 'tet' ? 'tetrahedral' : 'octahedral'}`;
  const uncorrected = own(ion.chiOpt[first], name);
  if (uncorrected !== null) {
    return { ...uncorrected, analogy: coordination === 'planar', needsSpinPairing: false };
  }
  const corrected = own(ion.chiOptSpinPairingCorrected[first], name);
  if (corrected !== null) {
    return { ...corrected, analogy: coordination === 'planar', needsSpinPairing: true };
  }
  const other = own(ion.chiOpt[second], `${ion.ion}, other coordination`);
  return other === null ? null : { ...other, analogy: true, needsSpinPairing: false };
}
