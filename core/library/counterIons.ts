/** An ion that balances the charge of a complex. */
export interface CounterIon {
  readonly formula: string;
  readonly charge: number;
  readonly names: readonly string[];
  /** Oxidising anions make salts with organic or ammine ligands dangerous. */
  readonly oxidising: boolean;
}

const ion = (formula: string, charge: number, names: readonly string[], oxidising = false): CounterIon => ({
  formula,
  charge,
  names,
  oxidising,
});

export const counterIons: readonly CounterIon[] = [
  ion('ClO4', -1, ['perchlorate'], true),
  ion('ClO3', -1, ['chlorate'], true),
  ion('NO3', -1, ['nitrate'], true),
  ion('MnO4', -1, ['permanganate'], true),
  ion('BF4', -1, ['tetrafluoroborate']),
  ion('PF6', -1, ['hexafluorophosphate']),
  ion('SbF6', -1, ['hexafluoroantimonate']),
  ion('CF3SO3', -1, ['triflate', 'OTf', 'trifluoromethanesulfonate']),
  ion('B(C6H5)4', -1, ['tetraphenylborate', 'BPh4']),
  ion('F', -1, ['fluoride']),
  ion('Cl', -1, ['chloride']),
  ion('Br', -1, ['bromide']),
  ion('I', -1, ['iodide']),
  ion('CN', -1, ['cyanide']),
  ion('N3', -1, ['azide']),
  ion('C2H3O2', -1, ['acetate', 'OAc']),
  ion('NCS', -1, ['thiocyanate', 'SCN']),
  ion('SO4', -2, ['sulfate']),
  ion('C2O4', -2, ['oxalate']),
  ion('PO4', -3, ['phosphate']),
  ion('H', 1, ['hydrogen', 'proton']),
  ion('Li', 1, ['lithium']),
  ion('Na', 1, ['sodium']),
  ion('K', 1, ['potassium']),
  ion('Rb', 1, ['rubidium']),
  ion('Cs', 1, ['caesium', 'cesium']),
  ion('NH4', 1, ['ammonium']),
  ion('(C2H5)4N', 1, ['tetraethylammonium', 'NEt4']),
  ion('(C4H9)4N', 1, ['tetrabutylammonium', 'NBu4', 'TBA']),
  ion('(C6H5)4P', 1, ['tetraphenylphosphonium', 'PPh4']),
  ion('Ba', 2, ['barium']),
  ion('Ca', 2, ['calcium']),
];

/** `2 H2O` -> 2 and `H2O`; `0.5 MeCN`; no number means one. */
export function parseCount(text: string): { readonly count: number; readonly rest: string } {
  const match = /^\s*(\d+(?:\.\d+)?)\s+(\S.*?)\s*$/.exec(text);
  return match ? { count: Number(match[1]), rest: match[2]! } : { count: 1, rest: text.trim() };
}

/** The counter-ion that a person means by `ClO4`, `ClO4-`, `2 ClO4-` or `perchlorate`; undefined where unknown. */
export function counterIonOf(text: string): CounterIon | undefined {
  const { rest } = parseCount(text);
  // `ClO4-` ends in a digit that belongs to the atoms, `SO42-` in one that belongs to the charge.
  const spellings = [rest, rest.replace(/[+-]$/, ''), rest.replace(/\s*\d[+-]$/, '')];
  const lower = rest.toLowerCase();
  return counterIons.find(
    ({ formula, names }) => spellings.includes(formula) || names.some((name) => name.toLowerCase() === lower),
  );
}
