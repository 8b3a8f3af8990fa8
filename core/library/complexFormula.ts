import type { LigandRecord } from './ligands';
import { netCharge, withoutCharge } from './molarMass';
import type { ParameterLibrary } from './parameterLibrary';

/** Ligands written by their formula where that is short; all others by abbreviation. */
const writtenByFormula = /^(halide|O-donor|amine|pseudohalide|C-donor|C\/H-donor|S-donor|Se-donor)$/;

function symbolOf(ligand: LigandRecord): string {
  const atoms = withoutCharge(ligand.formula, ligand.charge);
  if (ligand.id === 'menh2') return 'NH2Me';
  if (ligand.class === 'pseudohalide' || ligand.id === 'ono_o') return ligand.abbreviation;
  const small = /^(?:[A-Z][a-z]?\d*){1,2}$/.test(atoms) && !/C\d/.test(atoms);
  return small && writtenByFormula.test(ligand.class) ? atoms : ligand.abbreviation;
}

const isOneAtom = (symbol: string): boolean => /^[A-Z][a-z]?$/.test(symbol);

const alphabetical = (one: string, other: string): number => {
  const [a, b] = [one.toLowerCase(), other.toLowerCase()];
  return a < b ? -1 : a > b ? 1 : 0;
};

/** oxo first, then neutral, then charged ligands; alphabetical within. */
const rank = (ligand: LigandRecord): number => (ligand.id === 'oxo' ? 0 : ligand.charge === 0 ? 1 : 2);

const chargeText = (charge: number): string =>
  charge === 0 ? '' : `${Math.abs(charge) === 1 ? '' : Math.abs(charge)}${charge > 0 ? '+' : '-'}`;

interface ComplexParts {
  readonly metal: string;
  readonly oxidationState: number;
  readonly ligands: Readonly<Record<string, number>>;
}

/**
 * Bracket formula, `[Cr(NH3)5Cl]2+`: central atom first, polyatomic and abbreviated ligands in parentheses (IUPAC
 * Red Book 2005, IR-4.4 and IR-9.2.3). `customary` order puts neutral ligands before charged ones, as journals mostly
 * do; `alphabetical` is the order of IR-4.4.3.2, `[CrCl(NH3)5]2+`.
 */
export function complexFormula(
  composition: ComplexParts,
  library: ParameterLibrary,
  order: 'customary' | 'alphabetical' = 'customary',
): string {
  const parts = Object.entries(composition.ligands).flatMap(([id, count]) => {
    const ligand = library.ligands.get(id);
    return ligand === undefined ? [] : [{ ligand, symbol: symbolOf(ligand), count }];
  });
  parts.sort((one, other) => {
    const ranks = order === 'customary' ? rank(one.ligand) - rank(other.ligand) : 0;
    return ranks !== 0 ? ranks : alphabetical(one.symbol, other.symbol);
  });
  const text = parts
    .map(({ symbol, count }) => {
      const times = count === 1 ? '' : String(count);
      return isOneAtom(symbol) ? `${symbol}${times}` : `(${symbol})${times}`;
    })
    .join('');
  return `[${composition.metal}${text}]${chargeText(netCharge(composition, library))}`;
}
