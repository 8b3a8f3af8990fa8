/**
 * Optical electronegativities that no list gives, each by arithmetic from the first charge-transfer band of a named
 * complex with the library's value of the partner: chi(metal) = chi(ligand) - nu/30 000 and the reverse. The bands are
 * from memory of usual texts (C. K. Jorgensen 1970, A. B. P. Lever 1984).
 */
export interface FromBand {
  readonly value: number;
  readonly from: string;
}

/** O2- has 3.2, on which the library's figures of the d0 oxo anions rest. */
export const ligandsFromBands: Readonly<Record<string, FromBand>> = {
  oxo: { value: 3.2, from: 'on which the figures of the d0 oxo anions in the library rest' },
  ono_o: { value: 2.57, from: 'from [Co(NH3)5(ONO)]2+, 30 300 cm-1' },
  no2_n: { value: 2.57, from: 'that of its linkage isomer, from [Co(NH3)5(ONO)]2+, 30 300 cm-1' },
  cn: { value: 2.9, from: 'from [Fe(CN)6]3-, 23 800 cm-1' },
  acac: {
    value: 2.78,
    from: 'between what [Fe(acac)3], 23 000, and [Co(acac)3], 30 800 cm-1, ask for; the recalled 2.7 is marked weak',
  },
};

export const planarFromBands: Readonly<Record<string, FromBand>> = {
  'Au3+': { value: 1.93, from: 'from [AuCl4]-, 31 900 cm-1' },
  'Pd2+': { value: 1.8, from: 'from [PdCl4]2-, 35 900 cm-1' },
  'Pt2+': { value: 1.47, from: 'from [PtCl4]2-, 46 000 cm-1' },
};

export const tetrahedralFromBands: Readonly<Record<string, FromBand>> = {
  'V4+': { value: 2.17, from: 'from VCl4, 24 800 cm-1' },
  'Mn6+': { value: 2.65, from: 'from MnO4 2-, 16 500 cm-1' },
  'Fe6+': { value: 2.54, from: 'from FeO4 2-, 19 800 cm-1' },
  'Ru6+': { value: 2.48, from: 'from RuO4 2-, 21 500 cm-1' },
  'Ru7+': { value: 2.33, from: 'from RuO4-, 26 000 cm-1' },
};
