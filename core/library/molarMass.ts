import { atomicWeights } from './atomicWeights';
import { counterIonOf, parseCount } from './counterIons';
import type { ParameterLibrary } from './parameterLibrary';

/** `C2O4 2-` with charge -2 -> `C2O4`; `S2-` with charge -2 -> `S`; `N3-` with charge -1 -> `N3`. */
export function withoutCharge(formula: string, charge: number): string {
  if (charge === 0) return formula;
  const sign = charge < 0 ? '-' : '+';
  const size = Math.abs(charge);
  const ending = size === 1 ? sign : `${size}${sign}`;
  return formula.endsWith(ending) ? formula.slice(0, -ending.length).trimEnd() : formula;
}

/**
 * Atoms of a formula such as `C2H8N2`, `B(C6H5)4` or `(C4H9)4N`. Null where it is not a formula of elements.
 */
export function atomsOf(formula: string): ReadonlyMap<string, number> | null {
  const stack: Map<string, number>[] = [new Map()];
  const token = /([A-Z][a-z]?)(\d*)|(\()|(\))(\d*)/y;
  while (token.lastIndex < formula.length) {
    const match = token.exec(formula);
    if (match === null) return null;
    const [, element, count, open, close, times] = match;
    const top = stack.at(-1)!;
    if (element !== undefined) {
      top.set(element, (top.get(element) ?? 0) + (count === '' ? 1 : Number(count)));
    } else if (open !== undefined) {
      stack.push(new Map());
    } else if (close !== undefined) {
      if (stack.length < 2) return null;
      const inner = stack.pop()!;
      const factor = times === '' || times === undefined ? 1 : Number(times);
      const outer = stack.at(-1)!;
      for (const [atom, n] of inner) outer.set(atom, (outer.get(atom) ?? 0) + n * factor);
    }
  }
  return stack.length === 1 ? stack[0]! : null;
}

/** g/mol; null where an element is unknown or has no standard atomic weight. */
export function massOfFormula(formula: string): number | null {
  const atoms = atomsOf(formula);
  if (atoms === null || atoms.size === 0) return null;
  let mass = 0;
  for (const [element, count] of atoms) {
    const weight = atomicWeights[element];
    if (weight === undefined) return null;
    mass += weight * count;
  }
  return mass;
}

interface ComplexParts {
  readonly metal: string;
  readonly oxidationState: number;
  readonly ligands: Readonly<Record<string, number>>;
}

/** Charge of the complex: oxidation state plus the charges of its ligands. */
export function netCharge(composition: ComplexParts, library: ParameterLibrary): number {
  let charge = composition.oxidationState;
  for (const [id, count] of Object.entries(composition.ligands)) {
    charge += (library.ligands.get(id)?.charge ?? 0) * count;
  }
  return charge;
}

const solvates: Readonly<Record<string, string>> = {
  H2O: 'H2O',
  water: 'H2O',
  MeOH: 'CH4O',
  EtOH: 'C2H6O',
  MeCN: 'C2H3N',
  DMF: 'C3H7NO',
  DMSO: 'C2H6OS',
  CH2Cl2: 'CH2Cl2',
  THF: 'C4H8O',
  acetone: 'C3H6O',
};

export interface MolarMass {
  readonly value_g_mol: number | null;
  /** What was counted, and what could not be. */
  readonly notes: readonly string[];
}

/**
 * Molar mass of the substance: complex, counter-ions to neutrality, and solvate (`2 H2O`). Null, with the reason in
 * `notes`, where a part is not known: a missing solvate would make every molar absorptivity wrong unseen.
 */
export function molarMass(
  composition: ComplexParts,
  library: ParameterLibrary,
  extra: { readonly counterIon?: string | null; readonly solvate?: string | null } = {},
): MolarMass {
  const notes: string[] = [];
  const missing = (what: string): MolarMass => ({
    value_g_mol: null,
    notes: [`no molar mass: ${what}`],
  });
  const metal = atomicWeights[composition.metal];
  if (metal === undefined) return missing(`${composition.metal} has no standard atomic weight`);
  let mass = metal;
  for (const [id, count] of Object.entries(composition.ligands)) {
    const ligand = library.ligands.get(id);
    const each = ligand && massOfFormula(withoutCharge(ligand.formula, ligand.charge));
    if (each == null) return missing(`the formula of ligand ${id} is not on file`);
    mass += each * count;
  }
  const charge = netCharge(composition, library);
  if (extra.counterIon != null && extra.counterIon.trim() !== '') {
    const ion = counterIonOf(extra.counterIon);
    if (ion === undefined) return missing(`counter-ion ${extra.counterIon} is not on file`);
    const each = massOfFormula(ion.formula);
    if (each === null || charge * ion.charge >= 0) {
      return missing(`${ion.formula} cannot balance a charge of ${charge}`);
    }
    const count = -charge / ion.charge;
    mass += each * count;
    notes.push(`${Number(count.toFixed(3))} ${ion.formula} per complex for neutrality`);
  } else if (charge !== 0) {
    notes.push(`the complex ion alone (charge ${charge}); no counter-ion given`);
  }
  if (extra.solvate != null && extra.solvate.trim() !== '') {
    const { count, rest } = parseCount(extra.solvate);
    const each = massOfFormula(solvates[rest] ?? rest);
    if (each === null) return missing(`solvate ${extra.solvate} is not understood`);
    mass += each * count;
  }
  return { value_g_mol: mass, notes };
}
