import { sourced, type SourcedValue } from '../../library/sourced';

/**
 * Molar diamagnetic susceptibilities in 10⁻⁶ cm³ mol⁻¹ (cgs). The collection meant is G. A. Bain and J. F. Berry, J. Chem.
 * Educ. 85, 532 (2008). `page`: read in an open encyclopaedia's table (article on Pascal's constants) or a course handout that
 * draw on it; `memory`: recalled, not looked up. A species that is not here has no value on file.
 */
export interface PascalTable {
  readonly [species: string]: SourcedValue;
}

const collection = 'Bain and Berry, J. Chem. Educ. 85, 532 (2008)';
const table = 'table of Pascal constants in an open encyclopaedia, citing ' + collection;
const handout = 'course handout on constitutive corrections';

const page = (value: number, source = table, note?: string): SourcedValue =>
  sourced({ value, source, status: 'page', ...(note === undefined ? {} : { note }) });
const memory = (value: number): SourcedValue => sourced({ value, source: collection, status: 'memory' });
/** Read on the page, with the figure of the collection as recalled beside it. */
const both = (value: number, recalled: number): SourcedValue =>
  sourced({
    ...{ value, source: table, status: 'page' },
    alternatives: [{ value: recalled, source: collection, status: 'memory' }],
  });

/** As recalled of the collection; the page's figure does not fit the size of the ion and is kept as the alternative only. */
const doubted = (recalled: number, onPage: number): SourcedValue =>
  sourced({
    ...{ value: recalled, source: collection, status: 'memory' },
    alternatives: [{ value: onPage, source: table, status: 'page' }],
  });

export const cations: PascalTable = {
  ...{ 'Li+': page(-1.0), 'Na+': page(-6.8), 'K+': page(-14.9), 'Rb+': page(-22.5), 'Cs+': page(-35) },
  ...{ 'NH4+': doubted(-13.3, -40), 'Mg2+': page(-5), 'Ca2+': memory(-10.4), 'Ba2+': memory(-26.5) },
  ...{ 'Ti3+': memory(-9), 'V2+': memory(-15), 'V3+': memory(-10), 'V4+': memory(-7) },
  ...{
    'Cr2+': memory(-15),
    'Cr3+': memory(-11),
    'Mn2+': memory(-14),
    'Mn3+': memory(-10),
    'Mn4+': memory(-8),
  },
  ...{ 'Fe2+': both(-12.8, -13), 'Fe3+': memory(-10), 'Co2+': both(-12.8, -12), 'Co3+': memory(-10) },
  ...{ 'Ni2+': both(-12.8, -12), 'Cu2+': both(-12.8, -11), 'Zn2+': page(-15), 'Cd2+': page(-24) },
  ...{ 'Hg2+': page(-40), 'Pb2+': page(-32) },
  ...{ 'Ru3+': memory(-23), 'Rh3+': memory(-22), 'Pd2+': memory(-25), 'Pt2+': memory(-40) },
  ...{ 'Pt4+': memory(-28), 'Ir3+': memory(-35), 'Ag+': memory(-28) },
};

export const anions: PascalTable = {
  ...{ 'F-': page(-9.1), 'Cl-': page(-23.4), 'Br-': page(-34.6), 'I-': page(-50.6), 'OH-': page(-12.0) },
  ...{ 'CN-': page(-13.0), 'NCS-': page(-31.0), 'CO3 2-': both(-29.5, -28.0), 'NO3-': page(-18.9) },
  ...{ 'SO4 2-': page(-40.1), 'ClO3-': page(-30.2), 'ClO4-': page(-32), 'BrO3-': page(-38.8) },
  ...{ 'IO3-': page(-51.4), 'IO4-': page(-51.9), 'NO2-': memory(-10), 'C2H3O2-': memory(-31.5) },
  ...{ 'C2O4 2-': memory(-34), 'BF4-': memory(-37), 'O2-': memory(-12), 'S2-': memory(-30) },
};

/** Keyed by the ligand ids of the library. */
export const ligandConstants: PascalTable = {
  ...{ h2o: page(-13), nh3: page(-18), py: page(-49), en: page(-46.5), bipy: page(-105), phen: page(-128) },
  ...{ acac: page(-52), gly: page(-37), pph3: page(-167) },
  ...{ co: memory(-10), urea: memory(-34) },
  ...{ f: anions['F-']!, cl: anions['Cl-']!, br: anions['Br-']!, i: anions['I-']!, oh: anions['OH-']! },
  ...{ cn: anions['CN-']!, ncs_n: anions['NCS-']!, scn_s: anions['NCS-']!, no3: anions['NO3-']! },
  ...{ co3: anions['CO3 2-']!, so4: anions['SO4 2-']!, no2_n: anions['NO2-']!, ono_o: anions['NO2-']! },
  ...{ ac: anions['C2H3O2-']!, ox: anions['C2O4 2-']!, oxo: anions['O2-']!, s2: anions['S2-']! },
};

/** Atoms in covalent compounds. */
export const atomConstants: PascalTable = {
  ...{ H: page(-2.93), B: page(-7.0), C: page(-6.0), 'C in a ring': page(-6.24) },
  ...{ 'N in a chain': page(-5.57), 'N in a ring': page(-4.61) },
  ...{ 'N of a monoamide': page(-1.54, handout), 'N of a diamide or imide': page(-2.11, handout) },
  ...{ 'O of an alcohol or ether': page(-4.61, handout), 'O of an aldehyde or ketone': page(1.73, handout) },
  ...{ 'O of a carboxyl group': memory(-3.36) },
  ...{ F: page(-6.3), Cl: page(-20.1), Br: page(-30.6), I: page(-44.6) },
  ...{ S: page(-15.0, handout), P: page(-26.3, handout), Se: page(-23.0, handout) },
  ...{ 'As(III)': page(-20.9, handout), 'As(V)': page(-43.0, handout), 'Sb(III)': page(-74.0, handout) },
};

/** Added for each bond or ring of the kind. */
export const bondConstants: PascalTable = {
  ...{ 'C=C': page(5.5), 'C≡C': page(0.8), 'C=N': page(8.15, handout) },
  'C≡N': page(0.8, handout, 'another page has 0.0'),
  ...{ 'N=N': page(1.8, handout), 'N=O': page(1.7, handout), benzene: memory(-1.4), pyridine: memory(0.5) },
};
