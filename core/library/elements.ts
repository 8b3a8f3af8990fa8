import type { TransitionPeriod } from './ions';

/** A transition metal (groups 3 to 12) that may be the centre of a complex. */
export interface TransitionMetal {
  readonly symbol: string;
  readonly name: string;
  readonly group: number;
  readonly period: TransitionPeriod;
  /** Lowest and highest oxidation state known in compounds. */
  readonly oxidationStates: readonly [number, number];
}

const rows: readonly (readonly [string, string, number, TransitionPeriod, number, number])[] = [
  ['Sc', 'scandium', 3, '3d', 0, 3],
  ['Ti', 'titanium', 4, '3d', -2, 4],
  ['V', 'vanadium', 5, '3d', -3, 5],
  ['Cr', 'chromium', 6, '3d', -4, 6],
  ['Mn', 'manganese', 7, '3d', -3, 7],
  ['Fe', 'iron', 8, '3d', -4, 7],
  ['Co', 'cobalt', 9, '3d', -3, 5],
  ['Ni', 'nickel', 10, '3d', -2, 4],
  ['Cu', 'copper', 11, '3d', -2, 4],
  ['Zn', 'zinc', 12, '3d', -2, 2],
  ['Y', 'yttrium', 3, '4d', 0, 3],
  ['Zr', 'zirconium', 4, '4d', -2, 4],
  ['Nb', 'niobium', 5, '4d', -3, 5],
  ['Mo', 'molybdenum', 6, '4d', -4, 6],
  ['Tc', 'technetium', 7, '4d', -1, 7],
  ['Ru', 'ruthenium', 8, '4d', -4, 8],
  ['Rh', 'rhodium', 9, '4d', -3, 7],
  ['Pd', 'palladium', 10, '4d', 0, 4],
  ['Ag', 'silver', 11, '4d', -2, 3],
  ['Cd', 'cadmium', 12, '4d', -2, 2],
  ['La', 'lanthanum', 3, '5d', 0, 3],
  ['Hf', 'hafnium', 4, '5d', -2, 4],
  ['Ta', 'tantalum', 5, '5d', -3, 5],
  ['W', 'tungsten', 6, '5d', -4, 6],
  ['Re', 'rhenium', 7, '5d', -3, 7],
  ['Os', 'osmium', 8, '5d', -4, 8],
  ['Ir', 'iridium', 9, '5d', -3, 9],
  ['Pt', 'platinum', 10, '5d', -3, 6],
  ['Au', 'gold', 11, '5d', -3, 5],
  ['Hg', 'mercury', 12, '5d', -2, 2],
];

/**
 * Groups after the IUPAC periodic table; spans of oxidation states from memory of N. N. Greenwood and A. Earnshaw,
 * Chemistry of the Elements, 2nd ed. (1997).
 */
export const transitionMetals: readonly TransitionMetal[] = rows.map(
  ([symbol, name, group, period, low, high]) => ({
    symbol,
    name,
    group,
    period,
    oxidationStates: [low, high],
  }),
);

const bySymbol = new Map(transitionMetals.map((metal) => [metal.symbol, metal]));

export const findMetal = (symbol: string): TransitionMetal | undefined => bySymbol.get(symbol);

/** Number of d electrons: group minus oxidation state. Outside 0 to 10 there is no such ion. */
export const dElectronCount = (metal: TransitionMetal, oxidationState: number): number =>
  metal.group - oxidationState;
