/**
 * Structures of ligands that no table lists, as counts of atom and bond constants; formulas are the library's. Carbons of an
 * aromatic ring carry the ring constant, which stands for its double bonds.
 */
export const ligandAtoms: Readonly<Record<string, Readonly<Record<string, number>>>> = {
  menh2: { C: 1, H: 5, 'N in a chain': 1 },
  pn: { C: 3, H: 10, 'N in a chain': 2 },
  dien: { C: 4, H: 13, 'N in a chain': 3 },
  trien: { C: 6, H: 18, 'N in a chain': 4 },
  tren: { C: 6, H: 18, 'N in a chain': 4 },
  tetren: { C: 8, H: 23, 'N in a chain': 5 },
  tacn: { 'C in a ring': 6, H: 15, 'N in a ring': 3 },
  cyclam: { 'C in a ring': 10, H: 24, 'N in a ring': 4 },
  im: { 'C in a ring': 3, H: 4, 'N in a ring': 2 },
  pyrazole: { 'C in a ring': 3, H: 4, 'N in a ring': 2 },
  terpy: { 'C in a ring': 15, H: 11, 'N in a ring': 3, pyridine: 3 },
  mecn: { C: 2, H: 3, 'N in a chain': 1, 'C≡N': 1 },
  meoh: { C: 1, H: 4, 'O of an alcohol or ether': 1 },
  etoh: { C: 2, H: 6, 'O of an alcohol or ether': 1 },
  pme3: { C: 3, H: 9, P: 1 },
  dppe: { C: 2, 'C in a ring': 24, H: 24, P: 2, benzene: 4 },
  dth: { C: 4, H: 10, S: 2 },
  mal: { C: 3, H: 2, 'O of a carboxyl group': 4 },
};
