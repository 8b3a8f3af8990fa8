/**
 * Increments of the molar diamagnetic susceptibility, 1e-6 cm3/mol, from memory of the tables of G. A. Bain and
 * J. F. Berry, J. Chem. Educ. 85, 532 (2008). `atom` values already hold for the bonding they name; bond increments are
 * only for bonds that no atom or ligand entry covers.
 */
export interface PascalEntry {
  readonly id: string;
  readonly name: string;
  readonly kind: 'atom' | 'bond' | 'ligand' | 'ion';
  readonly value: number;
}

const entry = (kind: PascalEntry['kind'], id: string, name: string, value: number): PascalEntry => ({
  id,
  name,
  kind,
  value,
});

export const pascalSource = 'G. A. Bain, J. F. Berry, J. Chem. Educ. 85, 532 (2008), from memory';

export const pascalTable: readonly PascalEntry[] = [
  entry('atom', 'H', 'H', -2.93),
  entry('atom', 'C', 'C, open chain', -6.0),
  entry('atom', 'C-ring', 'C, in a ring', -6.24),
  entry('atom', 'N', 'N, open chain', -5.57),
  entry('atom', 'N-ring', 'N, in a ring', -4.61),
  entry('atom', 'O', 'O, ether or alcohol', -4.61),
  entry('atom', 'F', 'F', -6.3),
  entry('atom', 'Cl', 'Cl', -20.1),
  entry('atom', 'Br', 'Br', -30.6),
  entry('atom', 'I', 'I', -44.6),
  entry('atom', 'S', 'S', -15.0),
  entry('atom', 'P', 'P', -26.3),
  entry('bond', 'C=C', 'C=C, open chain', 5.5),
  entry('bond', 'C#C', 'triple bond C-C', 0.8),
  entry('bond', 'C=N', 'C=N', 8.15),
  entry('bond', 'C#N', 'triple bond C-N', 0.8),
  entry('bond', 'N=N', 'N=N', 1.85),
  entry('ligand', 'h2o', 'water', -13),
  entry('ligand', 'nh3', 'ammonia', -18),
  entry('ligand', 'en', 'ethane-1,2-diamine', -46.5),
  entry('ligand', 'py', 'pyridine', -49),
  entry('ligand', 'bpy', "2,2'-bipyridine", -105),
  entry('ligand', 'phen', '1,10-phenanthroline', -128),
  entry('ligand', 'acac', 'acetylacetonate', -52),
  entry('ion', 'F-', 'fluoride', -9.1),
  entry('ion', 'Cl-', 'chloride', -23.4),
  entry('ion', 'Br-', 'bromide', -34.6),
  entry('ion', 'I-', 'iodide', -50.6),
  entry('ion', 'OH-', 'hydroxide', -12),
  entry('ion', 'CN-', 'cyanide', -13),
  entry('ion', 'NCS-', 'thiocyanate', -31),
  entry('ion', 'NO3-', 'nitrate', -18.9),
  entry('ion', 'ClO4-', 'perchlorate', -32),
  entry('ion', 'BF4-', 'tetrafluoroborate', -37),
  entry('ion', 'SO4-2', 'sulfate', -40.1),
  entry('ion', 'C2O4-2', 'oxalate', -34),
  entry('ion', 'Na+', 'sodium', -6.8),
  entry('ion', 'K+', 'potassium', -14.9),
  entry('ion', 'NH4+', 'ammonium', -13.3),
  entry('ion', 'M', 'transition-metal ion of the 3d series (mean)', -12),
];

export interface PascalSum {
  /** Negative, cm3/mol. */
  readonly chi_cm3_mol: number;
  readonly lines: readonly { readonly name: string; readonly count: number; readonly value: number }[];
  readonly unknown: readonly string[];
  readonly remarks: readonly string[];
}

/** Sum of increments for counts of entries. What the table does not list is returned in `unknown` and adds nothing. */
export function pascalSum(counts: Readonly<Record<string, number>>): PascalSum {
  const lines: PascalSum['lines'][number][] = [];
  const unknown: string[] = [];
  for (const [id, count] of Object.entries(counts)) {
    const found = pascalTable.find((each) => each.id === id);
    if (found === undefined) unknown.push(id);
    else lines.push({ name: found.name, count, value: found.value * count });
  }
  const ring = (counts['C-ring'] ?? 0) > 0 || (counts['N-ring'] ?? 0) > 0;
  const bonds = (counts['C=C'] ?? 0) > 0 || (counts['C=N'] ?? 0) > 0;
  return {
    chi_cm3_mol: lines.reduce((sum, line) => sum + line.value, 0) * 1e-6,
    lines,
    unknown,
    remarks:
      ring && bonds
        ? [
            'ring atoms already carry the double bonds of their ring: add bond increments only for bonds outside it',
          ]
        : [],
  };
}

/** The usual estimate where no increments are at hand: half the molar mass, negative, in 1e-6 cm3/mol. */
export const halfMolarMass = (molarMass_g_mol: number): number => -0.5e-6 * molarMass_g_mol;
