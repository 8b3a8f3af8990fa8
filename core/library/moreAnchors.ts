import type { Anchor } from './ligands';

type Row = readonly [
  ligand: string,
  metal: string,
  complex: string,
  tenDq: number,
  confidence: 'high' | 'medium' | 'low',
  source: string,
  more?: Partial<Pick<Anchor, 'spin' | 'geometry' | 'range'>>,
];

const lever = 'from memory of A. B. P. Lever, Inorganic Electronic Spectroscopy, 2nd ed. (1984)';
const jorgensen =
  'from memory of C. K. Jorgensen, Absorption Spectra and Chemical Bonding in Complexes (1962)';
const grayBeach = 'from memory of H. B. Gray & N. A. Beach, J. Am. Chem. Soc. 1963, 85, 2922';

/** 10Dq of complexes that the anchors of the ligand table lack; cm⁻¹. */
const rows: readonly Row[] = [
  ['cn', 'Fe3+', '[Fe(CN)6]3-', 35_000, 'medium', grayBeach, { spin: 'low', range: [32_000, 35_000] }],
  ['cn', 'Fe2+', '[Fe(CN)6]4-', 33_800, 'medium', grayBeach, { spin: 'low', range: [31_000, 34_000] }],
  [
    'cn',
    'Ni2+',
    '[Ni(CN)4]2-',
    30_000,
    'low',
    'shoulder near 22 500 cm-1 (from memory of H. B. Gray & C. J. Ballhausen, J. Am. Chem. Soc. 1963, 85, 260) with ' +
      'exact d8 levels; the first-order formulas of that paper gave 24 950',
    { geometry: 'square-planar', range: [24_950, 32_000] },
  ],
  ['en', 'Ni2+', '[Ni(en)3]2+, first maximum in water', 11_200, 'medium', `${lever}; sources differ`],
  ['h2o', 'Ti3+', '[Ti(H2O)6]3+, maximum', 20_300, 'high', lever, { range: [17_400, 20_300] }],
  [
    'h2o',
    'Fe2+',
    '[Fe(H2O)6]2+, maximum',
    10_400,
    'low',
    'maximum of the Jahn-Teller pair, read in a problem text without source; usually quoted as 10Dq',
    { range: [9400, 10_400] },
  ],
  ['h2o', 'V2+', '[V(H2O)6]2+', 12_350, 'medium', lever],
  ['cl', 'Ti3+', '[TiCl6]3-', 12_750, 'low', lever, { range: [12_500, 13_000] }],
  ['cl', 'V3+', '[VCl6]3-', 12_300, 'low', lever, { range: [12_000, 12_650] }],
  ['f', 'Fe3+', '[FeF6]3-', 14_000, 'low', jorgensen],
  [
    'f',
    'Co3+',
    '[CoF6]3-',
    13_100,
    'medium',
    'from memory of F. A. Cotton & M. D. Meyers, J. Am. Chem. Soc. 1960, 82, 5023',
    { spin: 'high' },
  ],
  ['f', 'Ni2+', 'Ni2+ in KNiF3', 7250, 'medium', lever, { range: [7250, 7500] }],
  ['nh3', 'Co2+', '[Co(NH3)6]2+', 10_200, 'medium', jorgensen],
  ['ncs_n', 'Ni2+', '[Ni(NCS)6]4-', 9600, 'medium', jorgensen],
  [
    'nh3',
    'Ru2+',
    '[Ru(NH3)6]2+',
    28_000,
    'low',
    '1T1g near 25 600 cm-1, from memory of T. J. Meyer & H. Taube, Inorg. Chem. 1968, 7, 2369, plus C',
  ],
];

/** Further anchors of a ligand. */
export const moreAnchors = (ligandId: string): Anchor[] =>
  rows
    .filter(([ligand]) => ligand === ligandId)
    .map(([, metal, complex, tenDq, confidence, source, more]) => ({
      metal,
      complex,
      tenDq,
      spin: more?.spin ?? null,
      geometry: more?.geometry ?? null,
      range: more?.range ?? null,
      source,
      status: 'memory',
      confidence,
      note: null,
    }));
