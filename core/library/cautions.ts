import { counterIonOf } from './counterIons';
import { counterIonHazards, type LigandRecord } from './ligands';
import { metalCautions } from './metalCautions';
import type { ParameterLibrary } from './parameterLibrary';

/** A general caution about a substance in play. It informs; it never hides a result. */
export interface Caution {
  readonly id: string;
  /** Ligand, ion or counter-ion it is about. */
  readonly about: string;
  readonly text: string;
  /** GHS hazard statement codes, where known. */
  readonly codes: readonly string[];
  readonly source: string;
}

/** Printed on every card, whatever the list below it says. */
export const standingCaution =
  'General caution only. Read the current safety data sheets, do the local risk assessment, follow local rules; ' +
  'some work needs a licence or supervision.';

const fromMemory =
  'from memory of CLP Annex VI entries and supplier safety data sheets; check the current sheet';

const perchlorateSource =
  "W. R. Robinson, J. Chem. Educ. letter 'Perchlorate salts of metal ion complexes: potential explosives' (copy)";

interface InPlay {
  readonly metal: string;
  readonly oxidationState: number;
  readonly ligands: Readonly<Record<string, number>>;
}

const isFuel = (ligand: LigandRecord): boolean =>
  ligand.donorAtoms.some((atom) => atom === 'N' || atom === 'P' || atom === 'As') ||
  /C\d|CH/.test(ligand.formula);

function anionCautions(counterIon: string, ligands: readonly LigandRecord[]): Caution[] {
  const ion = counterIonOf(counterIon);
  if (ion === undefined) {
    return [
      {
        id: 'anion-not-assessed',
        about: counterIon,
        text: 'This counter-ion is not on file: not assessed.',
        codes: [],
        source: 'no entry in the library',
      },
    ];
  }
  const found: Caution[] = [];
  const fuels = ligands.filter(isFuel).map(({ abbreviation }) => abbreviation);
  if (ion.oxidising && fuels.length > 0) {
    found.push({
      id: 'oxidising-anion',
      about: `${ion.formula} with ${fuels.join(', ')}`,
      text:
        `Salts of oxidising anions with ammine, hydrazine or organic ligands are potential explosives; sensitivity ` +
        `cannot be predicted and earlier harmless samples prove nothing. Never heat, scrape or evaporate to dryness. ` +
        `Ask a safety adviser, and ask whether another anion (PF6, BF4, triflate, tetraphenylborate) serves.`,
      codes: ['H271', 'H272'],
      source: `${perchlorateSource}; CRC Handbook of Chemistry and Physics, section 16, handling of hazardous chemicals (table seen)`,
    });
  }
  if (ion.formula === 'BF4' || ion.formula === 'PF6' || ion.formula === 'SbF6') {
    const hazard = counterIonHazards.find(({ text }) => text.startsWith('Tetrafluoroborate'));
    found.push({
      id: 'fluoroanion-hydrolysis',
      about: ion.formula,
      text: hazard?.text ?? 'May hydrolyse to hydrogen fluoride.',
      codes: [],
      source: hazard?.source ?? fromMemory,
    });
  }
  if (ion.formula === 'CN' || ion.formula === 'N3' || ion.formula === 'F') {
    const id = { CN: 'cn', N3: 'n3', F: 'f' }[ion.formula];
    found.push({
      id: `anion-${id}`,
      about: ion.formula,
      text: 'As for the same ion as a ligand: poisonous, and acid sets free a very poisonous gas.',
      codes: [],
      source: fromMemory,
    });
  }
  return found;
}

function ligandCautions(ligand: LigandRecord): Caution[] {
  if (ligand.hazards.length === 0) {
    return [
      {
        id: `ligand-${ligand.id}-not-assessed`,
        about: ligand.commonName,
        text: 'No hazard information is on file for this ligand: not assessed. Treat it as toxic until its sheet says otherwise.',
        codes: [],
        source: 'no entry in the library',
      },
    ];
  }
  return ligand.hazards.map(({ text, ghs, source }, index) => ({
    id: `ligand-${ligand.id}-${index + 1}`,
    about: ligand.commonName,
    text,
    codes: ghs,
    source,
  }));
}

function combinations(composition: InPlay, ligands: readonly LigandRecord[]): Caution[] {
  const found: Caution[] = [];
  const has = (id: string): boolean => ligands.some((ligand) => ligand.id === id);
  const amine = ligands.some(({ class: kind }) => kind === 'amine');
  if ((composition.metal === 'Ag' || composition.metal === 'Au') && amine) {
    found.push({
      id: 'fulminating-silver',
      about: `${composition.metal} with ammine ligands`,
      text: 'Ammine solutions of silver and gold leave contact explosives on standing. Do not store them.',
      codes: [],
      source: 'G. P. Haight Jr., letter on the diamminesilver hazard, J. Chem. Educ.; gold from memory',
    });
  }
  if (has('co') || has('no_plus')) {
    found.push({
      id: 'toxic-gas-ligand',
      about: 'carbonyl or nitrosyl',
      text: 'Work that sets free or uses CO or NO needs gas-tight apparatus, a detector and trained people; volatile carbonyls (nickel, iron) are extremely toxic.',
      codes: ['H330', 'H331', 'H360D', 'H372'],
      source: 'Safe Work Australia HCIS entry for carbon monoxide (copy); carbonyls from memory',
    });
  }
  if (has('cn') || has('n3') || has('s2')) {
    found.push({
      id: 'acid-waste',
      about: 'waste',
      text: 'Never let cyanide, azide or sulfide waste meet acid; keep it apart from oxidisers and, for azide, from heavy-metal drains and chlorinated solvents.',
      codes: ['EUH032'],
      source: fromMemory,
    });
  }
  if (has('h')) {
    found.push({
      id: 'hydride',
      about: 'hydride',
      text: 'Metal hydrides may catch fire or explode on shock or in air.',
      codes: ['H260'],
      source: fromMemory,
    });
  }
  return found;
}

/**
 * The cautions that apply to a complex and the salt it is made as, keyed on ligand, metal, oxidation state and anion.
 * What is not on file is said to be "not assessed", never left out as if it were harmless.
 */
export function cautionsFor(
  composition: InPlay,
  counterIon: string | null | undefined,
  library: ParameterLibrary,
): readonly Caution[] {
  const ligands = Object.keys(composition.ligands).flatMap((id) => library.ligands.get(id) ?? []);
  const anion =
    counterIon != null && counterIon.trim() !== '' ? anionCautions(counterIon.trim(), ligands) : [];
  return [
    ...anion,
    ...combinations(composition, ligands),
    ...metalCautions(composition.metal, composition.oxidationState),
    ...ligands.flatMap(ligandCautions),
  ];
}
