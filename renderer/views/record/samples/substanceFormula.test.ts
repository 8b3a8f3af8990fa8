import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../../../core/library';
import type { Composition } from '../../../../core/record/composition';
import { molarMass } from '../../../../core/library/molarMass';
import { substanceFormula } from './substanceFormula';

const octahedral = (metal: string, oxidationState: number, ligands: Record<string, number>): Composition => ({
  metal,
  oxidationState,
  geometry: 'octahedral',
  ligands,
  isomer: null,
});
const nickel = octahedral('Ni', 2, { en: 3 });
const ferrocyanide = octahedral('Fe', 2, { cn: 6 });

describe('the formula of a batch', () => {
  // Formulas as suppliers of chemicals print them: common practice.
  it('carries counter-ions to neutrality and solvate', () => {
    expect(substanceFormula(nickel, 'Cl', '2 H2O', defaultLibrary)).toBe('[Ni(en)3]Cl2.2H2O');
    expect(substanceFormula(nickel, 'perchlorate', null, defaultLibrary)).toBe('[Ni(en)3](ClO4)2');
    expect(substanceFormula(ferrocyanide, 'K', '3 H2O', defaultLibrary)).toBe('K4[Fe(CN)6].3H2O');
  });

  it('is none where the charges do not fit', () => {
    expect(substanceFormula(nickel, 'K', null, defaultLibrary)).toBeNull();
    expect(substanceFormula(nickel, null, null, defaultLibrary)).toBeNull();
  });

  // 422.39 g/mol is what suppliers print for potassium ferrocyanide trihydrate, CAS 14459-95-1.
  it('weighs what the bottle says', () => {
    const { value_g_mol } = molarMass(ferrocyanide, defaultLibrary, { counterIon: 'K', solvate: '3 H2O' });
    expect(value_g_mol).toBeCloseTo(422.39, 1);
  });
});
