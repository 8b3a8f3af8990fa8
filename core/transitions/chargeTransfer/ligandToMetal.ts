import { defaultLibrary } from '../../library';
import type { BandInput } from '../bandInput';
import type { GroundState } from '../groundState';
import type { Band } from '../types';
import { acceptors, type Acceptor } from './acceptor';
import { ctBand, ctSigma_cm1 } from './ctBand';
import {
  ligandElectronegativity,
  metalElectronegativity,
  type Electronegativity,
  type MetalElectronegativity,
} from './opticalElectronegativity';
import { spinPairingParameter } from './spinPairing';

/** Energy of one unit of optical electronegativity (C. K. Jorgensen), cm⁻¹. */
export const perUnit_cm1 = 30_000;

/** σ orbitals of the halides lie this much below their π orbitals (F 4.4 and 3.9, Cl 3.4 and 3.0, Br 3.3 and 2.8). */
const sigmaBelowPi = 0.45;
/** Second band of the tetraoxo anions of d0 metals above the first: 26 900 and 36 500 in chromate, cm⁻¹. */
const secondOfOxo_cm1 = 9600;

/** Bands beyond this lie outside the range shown, cm⁻¹. */
const highest_cm1 = 60_000;

/** nu = 30 000 (chi of the ligand - chi of the metal) + 10Dq for the upper shell + spin-pairing term, cm⁻¹. */
export const ligandToMetalEnergy = (
  ligandChi: number,
  metalChi: number,
  fieldTerm_cm1 = 0,
  pairingTerm_cm1 = 0,
): number => perUnit_cm1 * (ligandChi - metalChi) + fieldTerm_cm1 + pairingTerm_cm1;

export interface LigandToMetal {
  readonly bands: readonly Band[];
  /** Ligands that may give such bands of which no number can be told. */
  readonly withoutNumber: readonly string[];
}

interface Donor {
  readonly name: string;
  readonly halide: boolean;
  readonly oxo: boolean;
  readonly places: number;
  readonly chi: Electronegativity;
}

interface Metal {
  readonly name: string;
  readonly chi: MetalElectronegativity;
  /** D, cm⁻¹; null where B or C is not estimated. */
  readonly D: number | null;
  readonly even: string;
  readonly planar: boolean;
}

/** A π level hits the metal weakly, a σ level and the upper shell strongly; strength grows with the number of donors. */
const weak = 3500;
const strong = 14_000;
const width_cm1 = 5000;

function bandInto(
  donor: Donor,
  metal: Metal,
  acceptor: Acceptor,
  orbital: 'π' | 'σ',
  first: boolean,
): Band | null {
  const { chi } = metal;
  if (chi.needsSpinPairing && metal.D === null) return null;
  const pairing = chi.needsSpinPairing ? acceptor.pairing * metal.D! : 0;
  const ligandChi = donor.chi.value + (orbital === 'σ' ? sigmaBelowPi : 0);
  const energy = ligandToMetalEnergy(ligandChi, chi.value, acceptor.fieldTerm_cm1, pairing);
  if (energy > highest_cm1 || energy < 3000) return null;
  const analogy = donor.chi.analogy || chi.analogy;
  return ctBand({
    kind: 'LMCT',
    energy_cm1: energy,
    sigma_cm1: analogy ? ctSigma_cm1.analogy : ctSigma_cm1.own,
    label: `${donor.name} ${orbital} -> ${metal.name} (${metal.planar ? 'x2-y2' : `${acceptor.shell}${metal.even}`})`,
    molarAbsorptivity: (first && orbital === 'π' ? weak : strong) * Math.sqrt(donor.places / 6),
    width_cm1,
    rule: 'ligand to metal',
    ...(acceptor.fieldTerm_cm1 > 0 ? { slopeTenDq: 1 } : {}),
    reasons: [
      'nu = 30 000 (chi ligand - chi metal), C. K. Jorgensen; solvent and ion pairing not included',
      chi.reason,
      donor.chi.reason,
      ...(acceptor.fieldTerm_cm1 > 0 ? ['10Dq added for the upper shell'] : []),
      ...(chi.needsSpinPairing ? ['spin-pairing term added, as this value of the metal asks for'] : []),
      ...(analogy ? ['by analogy: only good to 5000 cm-1'] : []),
    ],
  });
}

function bandsOfDonor(donor: Donor, metal: Metal, places: readonly Acceptor[]): Band[] {
  const pairing = (acceptor: Acceptor): number =>
    acceptor.fieldTerm_cm1 + (metal.chi.needsSpinPairing ? acceptor.pairing * (metal.D ?? 0) : 0);
  const [lowest, next] = places.toSorted((a, b) => pairing(a) - pairing(b));
  if (lowest === undefined) return [];
  const bands = [bandInto(donor, metal, lowest, 'π', true)];
  if (next !== undefined) bands.push(bandInto(donor, metal, next, 'π', false));
  if (donor.halide) bands.push(bandInto(donor, metal, lowest, 'σ', false));
  return bands.filter((band) => band !== null);
}

/** d0 ions have no 10Dq on file: the second band of oxo anions is put where chromate has it. */
function secondOxo(first: Band): Band {
  return ctBand({
    kind: 'LMCT',
    energy_cm1: first.energy_cm1 + secondOfOxo_cm1,
    sigma_cm1: 4000,
    label: `${first.label}, second`,
    molarAbsorptivity: first.molarAbsorptivity,
    width_cm1,
    rule: 'ligand to metal',
    reasons: [...first.reasons, 'second band as far above the first as in chromate (9600 cm-1)'],
  });
}

/** LMCT bands of every kind of donor, lowest first, by optical electronegativities. */
export function ligandToMetalBands(input: BandInput, ground: GroundState): LigandToMetal {
  const { ion, ligands, geometry, racahB, racahC, library = defaultLibrary } = input;
  const chi = metalElectronegativity(ion, geometry);
  const donating = ligands.filter(({ ligand }) =>
    ['LMCT', 'both', 'mixed'].includes(ligand.chargeTransfer.hides),
  );
  if (ion.dElectrons === 10) return { bands: [], withoutNumber: [] };
  if (chi === null) {
    return { bands: [], withoutNumber: donating.map(({ ligand }) => ligand.commonName) };
  }
  const tetrahedral = geometry === 'tetrahedral';
  const metal: Metal = {
    name: ion.symbol,
    chi,
    D:
      racahB.value === null || racahC.value === null
        ? null
        : spinPairingParameter(racahB.value, racahC.value),
    even: tetrahedral ? '' : 'g',
    planar: geometry === 'square-planar',
  };
  const places = acceptors({
    dElectrons: ion.dElectrons,
    t2: ground.t2,
    e: ground.e,
    multiplicity: ground.multiplicity,
    tenDq: input.tenDq.value,
    tetrahedral,
  });
  const withoutNumber: string[] = [];
  const bands = ligands.flatMap(({ ligand, count }) => {
    const ligandChi = ligandElectronegativity(ligand, library);
    if (ligandChi === null) {
      if (donating.some((each) => each.ligand === ligand)) withoutNumber.push(ligand.commonName);
      return [];
    }
    const donor: Donor = {
      name: ligand.abbreviation,
      halide: ligand.class === 'halide',
      oxo: ligand.id === 'oxo',
      places: count * ligand.denticity,
      chi: ligandChi,
    };
    const own = bandsOfDonor(donor, metal, places);
    return donor.oxo && ion.dElectrons === 0 && own[0] !== undefined ? [...own, secondOxo(own[0])] : own;
  });
  return { bands: bands.sort((a, b) => a.energy_cm1 - b.energy_cm1), withoutNumber };
}
