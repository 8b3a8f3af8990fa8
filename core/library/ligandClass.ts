import type { PiCharacter } from './ligands';

/** What a ligand's donors and name say about its kind, for a ligand that is not in the tables. */
export interface LigandKind {
  readonly class: string;
  readonly piCharacter: PiCharacter;
}

const nitrogenHeterocycle =
  /pyrid|pyraz|imidaz|triazol|tetrazol|quinol|thiazol|oxazol|phenanthrol|pyrimid|phthalaz|bpy|phen\b|terpy|tpy|porphyr|azole/i;

/** Kind of donor atom in the words of the ligand tables; nomenclature is enough to tell it (IUPAC 2005). */
export function ligandKind(name: string, donorAtoms: readonly string[]): LigandKind {
  const atoms = [...new Set(donorAtoms)].sort().join(',');
  switch (atoms) {
    case 'N':
      if (nitrogenHeterocycle.test(name)) return { class: 'heterocycle', piCharacter: 'acceptor' };
      if (/nitrile|cyan/i.test(name)) return { class: 'N-donor', piCharacter: 'acceptor' };
      return { class: 'amine', piCharacter: 'none' };
    case 'O':
      return { class: donorAtoms.length > 1 ? 'O-chelate' : 'O-donor', piCharacter: 'donor' };
    case 'N,O':
      return { class: 'N,O-chelate', piCharacter: 'donor' };
    case 'C':
      return { class: 'C-donor', piCharacter: 'acceptor' };
    case 'P':
    case 'As':
      return { class: `${atoms}-donor`, piCharacter: 'acceptor' };
    case 'F':
    case 'Cl':
    case 'Br':
    case 'I':
      return { class: 'halide', piCharacter: 'donor' };
    default:
      return { class: `${atoms}-donor`, piCharacter: 'donor' };
  }
}
