import { defaultLibrary } from '../../library';
import type { BandInput } from '../bandInput';
import type { GroundState } from '../groundState';
import type { Band } from '../types';
import { acceptors, type Acceptor } from './acceptor';
import { ctBand, ctSigma_cm1 } from './ctBand';
import { donorOrbitals, type DonorOrbital } from './donorOrbitals';
import {
  ligandElectronegativity,
  metalElectronegativity,
  type Electronegativity,
  type MetalElectronegativity,
} from './opticalElectronegativity';
import { spinPairingParameter } from './spinPairing';

/** Energy of one unit of optical electronegativity (C. K. Jorgensen), cm⁻¹. */
export const perUnit_cm1 = 30_000;

/** Bands outside these are not shown, cm⁻¹. */
const [lowest_cm1, highest_cm1] = [3000, 60_000] as const;

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
  readonly places: number;
  readonly chi: Electronegativity;
}

/** Where the electron goes, with everything the metal adds to the energy. */
interface Place {
  readonly name: string;
  readonly chi: MetalElectronegativity;
  readonly fieldTerm_cm1: number;
  readonly pairingTerm_cm1: number;
}

/** The places in order of energy. The uncorrected column holds the pairing of the lower shell already. */
function placesOf(input: BandInput, ground: GroundState, chi: MetalElectronegativity): Place[] | null {
  const { ion, geometry, racahB, racahC, tenDq } = input;
  const tetrahedral = geometry === 'tetrahedral';
  const D =
    racahB.value === null || racahC.value === null ? null : spinPairingParameter(racahB.value, racahC.value);
  if (chi.needsSpinPairing && D === null) return null;
  const shells = acceptors({
    dElectrons: ion.dElectrons,
    t2: ground.t2,
    e: ground.e,
    multiplicity: ground.multiplicity,
    tenDq: tenDq.value,
    tetrahedral,
  });
  const counted = chi.needsSpinPairing ? 0 : (shells[0]?.pairing ?? 0);
  const shellName = ({ shell }: Acceptor): string =>
    geometry === 'square-planar' ? 'x2-y2' : `${shell}${tetrahedral ? '' : 'g'}`;
  return shells
    .map((acceptor) => ({
      name: `${ion.symbol} (${shellName(acceptor)})`,
      chi,
      fieldTerm_cm1: acceptor.fieldTerm_cm1,
      pairingTerm_cm1: (acceptor.pairing - counted) * (D ?? 0),
    }))
    .sort((a, b) => a.fieldTerm_cm1 + a.pairingTerm_cm1 - (b.fieldTerm_cm1 + b.pairingTerm_cm1));
}

function bandInto(donor: Donor, orbital: DonorOrbital, place: Place): Band[] {
  const { chi, fieldTerm_cm1, pairingTerm_cm1 } = place;
  const energy_cm1 = ligandToMetalEnergy(
    donor.chi.value + orbital.below,
    chi.value,
    fieldTerm_cm1,
    pairingTerm_cm1,
  );
  if (energy_cm1 > highest_cm1 || energy_cm1 < lowest_cm1) return [];
  const analogy = donor.chi.analogy || chi.analogy;
  return [
    ctBand({
      kind: 'LMCT',
      energy_cm1,
      sigma_cm1: Math.hypot(analogy ? ctSigma_cm1.analogy : ctSigma_cm1.own, orbital.sigma_cm1),
      label: `${donor.name} ${orbital.name} -> ${place.name}`,
      molarAbsorptivity: orbital.molarAbsorptivity * Math.sqrt(donor.places / 6),
      width_cm1: orbital.width_cm1,
      rule: 'ligand to metal',
      ...(fieldTerm_cm1 > 0 ? { slopeTenDq: 1 } : {}),
      reasons: [
        'nu = 30 000 (chi ligand - chi metal), C. K. Jorgensen; solvent and ion pairing not included',
        chi.reason,
        donor.chi.reason,
        ...(orbital.reason === null ? [] : [orbital.reason]),
        ...(fieldTerm_cm1 > 0 ? ['10Dq added for the upper shell'] : []),
        ...(chi.needsSpinPairing ? ['spin-pairing term added, as this value of the metal asks for'] : []),
        ...(analogy ? ['by analogy: only good to 5000 cm-1'] : []),
      ],
    }),
  ];
}

/** LMCT bands of every kind of donor, lowest first, by optical electronegativities. */
export function ligandToMetalBands(input: BandInput, ground: GroundState): LigandToMetal {
  const { ion, ligands, geometry, library = defaultLibrary } = input;
  if (ion.dElectrons === 10) return { bands: [], withoutNumber: [] };
  const donating = ligands.filter(({ ligand }) =>
    ['LMCT', 'both', 'mixed'].includes(ligand.chargeTransfer.hides),
  );
  const chi = metalElectronegativity(ion, geometry);
  const places = chi === null ? null : placesOf(input, ground, chi);
  if (places === null || places.length === 0) {
    return { bands: [], withoutNumber: donating.map(({ ligand }) => ligand.commonName) };
  }
  const withoutNumber: string[] = [];
  const bands = ligands.flatMap(({ ligand, count }) => {
    const ligandChi = ligandElectronegativity(ligand, library);
    if (ligandChi === null) {
      if (donating.some((each) => each.ligand === ligand)) withoutNumber.push(ligand.commonName);
      return [];
    }
    const donor: Donor = {
      name: ligand.abbreviation,
      places: count * ligand.denticity,
      chi: ligandChi,
    };
    return donorOrbitals(ligand, geometry, ion.dElectrons).flatMap((orbital) =>
      places
        .slice(0, orbital.places)
        .flatMap((place, index) =>
          bandInto(donor, index === 0 ? orbital : { ...orbital, ...intoUpperShell }, place),
        ),
    );
  });
  return { bands: bands.sort((a, b) => a.energy_cm1 - b.energy_cm1), withoutNumber };
}

/** The upper shell points at the donors: its bands are strong and broad whatever orbital the electron leaves. */
const intoUpperShell = { molarAbsorptivity: 14_000, width_cm1: 5000 } as const;
