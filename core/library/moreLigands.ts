import { ligandFromFacts, type LigandRecord } from './ligands';

/**
 * Ligands of published complexes that the parameter tables do not list. Only facts of structure are given; no
 * spectrochemical value is in print, so every number is estimated by donor class.
 */
export const moreLigands: readonly LigandRecord[] = [
  ligandFromFacts({
    id: 'ptz',
    name: '1-propyltetrazole',
    formula: 'C4H8N4',
    charge: 0,
    denticity: 1,
    donorAtoms: ['N'],
    piCharacter: 'acceptor',
    class: 'heterocycle',
  }),
  ligandFromFacts({
    id: 'hbpz3',
    name: 'hydrotris(pyrazol-1-yl)borate',
    formula: 'C9H10BN6-',
    abbreviation: 'Tp',
    charge: -1,
    denticity: 3,
    donorAtoms: ['N', 'N', 'N'],
    piCharacter: 'donor',
    class: 'heterocycle',
  }),
  ligandFromFacts({
    id: 'bpp1',
    name: '2,6-di(pyrazol-1-yl)pyridine',
    formula: 'C11H9N5',
    abbreviation: 'bpp',
    charge: 0,
    denticity: 3,
    donorAtoms: ['N', 'N', 'N'],
    piCharacter: 'acceptor',
    class: 'heterocycle',
  }),
  ligandFromFacts({
    id: 'tpe',
    name: '1,1,1-tris(pyridin-2-yl)ethane',
    formula: 'C17H15N3',
    charge: 0,
    denticity: 3,
    donorAtoms: ['N', 'N', 'N'],
    piCharacter: 'acceptor',
    class: 'heterocycle',
  }),
  ligandFromFacts({
    id: 'cit_o',
    name: 'oxygen donor of a citrate or hydrate lattice site',
    formula: null,
    abbreviation: 'O(cit)',
    charge: 0,
    denticity: 1,
    donorAtoms: ['O'],
    piCharacter: 'donor',
    class: 'O-donor',
    note: 'stands for a mixed oxygen site of a crystal, not for a substance',
  }),
];
