import { classMean } from '../../estimation/donorClass';
import type { IonRecord, LigandRecord, ParameterLibrary, SourcedValue } from '../../library';
import type { GeometryId } from '../../record/composition';

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

/** What is added for an ion or ligand without a value in the library, each from one measured band. */
const fromOneBand: Readonly<Record<string, { readonly value: number; readonly from: string }>> = {
  oxo: { value: 3.2, from: 'the value that the figures of the d0 oxo anions in the library rest on' },
  ono_o: { value: 2.57, from: 'the 30 300 cm-1 band of [Co(NH3)5(ONO)]2+ (from memory)' },
  no2_n: { value: 2.57, from: 'its linkage isomer in [Co(NH3)5(ONO)]2+, 30 300 cm-1 (from memory)' },
  cn: {
    value: 2.9,
    from: 'the 23 800 cm-1 band of [Fe(CN)6]3- (J. J. Alexander and H. B. Gray 1968, from memory)',
  },
};

const planarFromOneBand: Readonly<Record<string, { readonly value: number; readonly from: string }>> = {
  'Au3+': { value: 1.93, from: 'the 31 900 cm-1 band of [AuCl4]- (from memory)' },
};
const tetrahedralFromOneBand: Readonly<Record<string, { readonly value: number; readonly from: string }>> = {
  'V4+': { value: 2.17, from: 'the 24 800 cm-1 band of VCl4 (from memory)' },
};

const own = (found: SourcedValue, name: string): Electronegativity | null =>
  found.value === null
    ? null
    : { value: found.value, analogy: false, reason: `chi(${name}) = ${found.value} (${found.source})` };

/** Optical electronegativity of a ligand: its own, else of its donor class; null where nothing is known. */
export function ligandElectronegativity(
  ligand: LigandRecord,
  library: ParameterLibrary,
): Electronegativity | null {
  const known = own(ligand.chiOpt, ligand.abbreviation);
  if (known !== null) return known;
  const band = fromOneBand[ligand.id];
  if (band !== undefined) {
    const reason = `chi(${ligand.abbreviation}) = ${band.value}, ${band.from}`;
    return { value: band.value, analogy: false, reason };
  }
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
  const single = { planar: planarFromOneBand, tet: tetrahedralFromOneBand, oct: {} }[
    coordination
  ] as Readonly<Record<string, { readonly value: number; readonly from: string }>>;
  const band = single[ion.ion];
  if (band !== undefined) {
    const reason = `chi(${ion.ion}) = ${band.value}, ${band.from}`;
    return { value: band.value, analogy: false, needsSpinPairing: false, reason };
  }
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
