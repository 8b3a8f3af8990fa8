import type { LigandRecord } from '../../library';
import { cm1PerElectronvolt } from '../../units';
import type { BandInput } from '../bandInput';
import type { GroundState } from '../groundState';
import type { Band } from '../types';
import { ctBand } from './ctBand';
import { backDonation, ligandElectrochemical, ligandReduction_V, metalCouples } from './leverParameters';

/** What the difference of redox potentials leaves out (reorganisation, solvation, pairing of the two charges), cm⁻¹. */
const redoxSigma_cm1 = 1800;
/** Per diimine, L mol⁻¹ cm⁻¹: 8700 in [Fe(bpy)3]2+, 14 000 in [Ru(bpy)3]2+ (from memory). */
const perAcceptor = 3500;

/**
 * Potential of the metal couple by summing ligand parameters over the donors, V against the normal hydrogen electrode;
 * null where the metal or a ligand has no published parameter.
 */
export function metalPotential_V(
  ion: string,
  donors: readonly { id: string; places: number }[],
): number | null {
  const couple = metalCouples[ion];
  if (couple === undefined) return null;
  let sum = 0;
  for (const { id, places } of donors) {
    const parameter = ligandElectrochemical[id];
    if (parameter === undefined) return null;
    sum += parameter * places;
  }
  return couple.slope * sum + couple.intercept;
}

export interface MetalToLigand {
  readonly bands: readonly Band[];
  /** Acceptors towards which such bands are likely but no number can be told. */
  readonly withoutNumber: readonly string[];
}

const takesElectrons = ({ piCharacter, chargeTransfer }: LigandRecord): boolean =>
  piCharacter === 'acceptor' && (chargeTransfer.hides === 'MLCT' || chargeTransfer.hides === 'both');

/** Metals that give an electron away easily: low oxidation state with electrons in the shell that points at π*. */
const isDonor = ({ oxidationState, dElectrons }: BandInput['ion']): boolean =>
  dElectrons > 0 && (oxidationState <= 1 || (oxidationState === 2 && dElectrons <= 7));

/**
 * MLCT bands towards diimines by the difference of redox potentials, hν = E(metal oxidised) - E(ligand reduced):
 * low-spin d6 ions with published ligand parameters only; for the others the likelihood alone is told.
 */
export function metalToLigandBands(input: BandInput, ground: GroundState): MetalToLigand {
  const { ion, ligands } = input;
  const takers = ligands.filter(({ ligand }) => takesElectrons(ligand));
  if (takers.length === 0 || !isDonor(ion)) return { bands: [], withoutNumber: [] };
  const donors = ligands.map(({ ligand, count }) => ({ id: ligand.id, places: count * ligand.denticity }));
  const potential =
    ion.dElectrons === 6 && (ground.lowSpin || ion.period !== '3d')
      ? metalPotential_V(ion.ion, donors)
      : null;
  const bands: Band[] = [];
  const withoutNumber: string[] = [];
  for (const { ligand, count } of takers) {
    const alike = ligandReduction_V[ligand.id];
    const six = metalPotential_V(ion.ion, [{ id: ligand.id, places: 6 }]);
    if (potential === null || alike === undefined || six === null) {
      withoutNumber.push(ligand.commonName);
      continue;
    }
    const reduction = alike - backDonation * Math.max(0, six - potential);
    bands.push(
      ctBand({
        kind: 'MLCT',
        energy_cm1: (potential - reduction) * cm1PerElectronvolt,
        sigma_cm1: redoxSigma_cm1,
        label: `${ion.symbol} (t2g) -> ${ligand.abbreviation} π*`,
        molarAbsorptivity: perAcceptor * count * (ligand.denticity > 2 ? 1.6 : 1),
        width_cm1: 4000,
        rule: 'metal to ligand',
        reasons: [
          `oxidation of the metal at ${potential.toFixed(2)} V by ligand electrochemical parameters (A. B. P. Lever 1990, from memory)`,
          `reduction of ${ligand.commonName} at ${reduction.toFixed(2)} V`,
          'solvent shifts and the pairing of the two charges are not included',
        ],
      }),
    );
  }
  return { bands: bands.sort((a, b) => a.energy_cm1 - b.energy_cm1), withoutNumber };
}
