import { counterIonOf } from '../../library/counterIons';
import { massOfFormula, netCharge, withoutCharge } from '../../library/molarMass';
import { type ParameterLibrary } from '../../library/parameterLibrary';
import { type SourceStatus } from '../../library/sourced';
import { anions, atomConstants, bondConstants, cations, ligandConstants } from './pascalConstants';
import { ligandAtoms } from './ligandAtoms';

/** How the susceptibility of one species was come by. */
export type DiamagneticRoute = 'table' | 'atoms' | 'half-mass' | 'unknown';

/** One kind of ion or ligand in the substance. */
export interface DiamagneticItem {
  readonly species: string;
  readonly count: number;
  /** Of one, 10⁻⁶ cm³ mol⁻¹; null where nothing is known. */
  readonly each_1e6: number | null;
  readonly route: DiamagneticRoute;
  readonly source: string;
  readonly status: SourceStatus | null;
}

/** Diamagnetism of a whole substance. */
export interface DiamagneticCorrection {
  /** cm³ mol⁻¹, negative; null where a part is unknown. Subtract it from a measured χ. */
  readonly chi_cm3_mol: number | null;
  /** Standard deviation thought plausible, same unit. */
  readonly sigma_cm3_mol: number | null;
  readonly items: readonly DiamagneticItem[];
}

const halfMassSource = 'rule −0.5 M × 10⁻⁶ (magnetism handouts; common practice)';
/** Uncertainty of each route as a share of its value. */
const spread: Readonly<Record<DiamagneticRoute, number>> = {
  table: 0.05,
  atoms: 0.1,
  'half-mass': 0.3,
  unknown: 1,
};

interface Substance {
  readonly metal: string;
  readonly oxidationState: number;
  readonly ligands: Readonly<Record<string, number>>;
  /** Balances the charge of the complex; none is counted where left out. */
  readonly counterIon?: string | null;
}

/**
 * Pascal sum of metal ion, ligands and counter-ions: from the tables where they list the species, else from its atoms and bonds,
 * else by the half-mass rule. Every item says which.
 */
export function diamagneticCorrection(
  substance: Substance,
  library: ParameterLibrary,
): DiamagneticCorrection {
  const items = [
    ionItem(`${substance.metal}${chargeText(substance.oxidationState)}`, 1, substance.metal),
    ...Object.entries(substance.ligands).map(([id, count]) => ligandItem(id, count, library)),
    ...counterIonItems(substance, library),
  ];
  const known = items.every(({ each_1e6 }) => each_1e6 !== null);
  const sum = items.reduce((total, { each_1e6, count }) => total + count * (each_1e6 ?? 0), 0);
  const variance = items.reduce(
    (total, { each_1e6, count, route }) => total + (count * (each_1e6 ?? 0) * spread[route]) ** 2,
    0,
  );
  return {
    chi_cm3_mol: known ? sum * 1e-6 : null,
    sigma_cm3_mol: known ? Math.sqrt(variance) * 1e-6 : null,
    items,
  };
}

const chargeText = (charge: number): string =>
  `${Math.abs(charge) > 1 ? Math.abs(charge) : ''}${charge < 0 ? '-' : '+'}`;

function ionItem(species: string, count: number, formula: string): DiamagneticItem {
  const entry = cations[species] ?? anions[species] ?? anions[species.replace(/(\d-)$/, ' $1')];
  if (entry !== undefined) {
    const { value, source, status } = entry;
    return { species, count, each_1e6: value, route: 'table', source: source!, status };
  }
  return halfMass(species, count, formula);
}

function ligandItem(id: string, count: number, library: ParameterLibrary): DiamagneticItem {
  const entry = ligandConstants[id];
  if (entry !== undefined) {
    const { value, source, status } = entry;
    return { species: id, count, each_1e6: value, route: 'table', source: source!, status };
  }
  const atoms = ligandAtoms[id];
  if (atoms !== undefined) return atomItem(id, count, atoms);
  const ligand = library.ligands.get(id);
  return halfMass(id, count, ligand === undefined ? '' : withoutCharge(ligand.formula, ligand.charge));
}

function atomItem(id: string, count: number, atoms: Readonly<Record<string, number>>): DiamagneticItem {
  let sum = 0;
  let status: SourceStatus = 'page';
  for (const [name, times] of Object.entries(atoms)) {
    const entry = (atomConstants[name] ?? bondConstants[name])!;
    sum += times * entry.value!;
    if (entry.status === 'memory') status = 'memory';
  }
  const source = `sum of Pascal constants: ${Object.entries(atoms)
    .map(([name, times]) => `${times} ${name}`)
    .join(', ')}`;
  return { species: id, count, each_1e6: sum, route: 'atoms', source, status };
}

function halfMass(species: string, count: number, formula: string): DiamagneticItem {
  const mass = formula === '' ? null : massOfFormula(formula);
  if (mass === null) {
    return { species, count, each_1e6: null, route: 'unknown', source: 'no formula on file', status: null };
  }
  return { species, count, each_1e6: -0.5 * mass, route: 'half-mass', source: halfMassSource, status: 'own' };
}

function counterIonItems(substance: Substance, library: ParameterLibrary): DiamagneticItem[] {
  const text = substance.counterIon?.trim() ?? '';
  const charge = netCharge(substance, library);
  if (text === '' || charge === 0) return [];
  const ion = counterIonOf(text);
  if (ion === undefined || ion.charge * charge > 0) {
    const source = ion === undefined ? 'counter-ion not on file' : `cannot balance a charge of ${charge}`;
    return [{ species: text, count: 1, each_1e6: null, route: 'unknown', source, status: null }];
  }
  return [ionItem(`${ion.formula}${chargeText(ion.charge)}`, -charge / ion.charge, ion.formula)];
}
