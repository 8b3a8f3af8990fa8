import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../library/parameterLibrary';
import { diamagneticCorrection } from './diamagneticCorrection';
import { ligandAtoms } from './ligandAtoms';
import { atomConstants, bondConstants, ligandConstants } from './pascalConstants';

const correction = (
  metal: string,
  oxidationState: number,
  ligands: Record<string, number>,
  counterIon?: string,
) =>
  diamagneticCorrection(
    { metal, oxidationState, ligands, ...(counterIon === undefined ? {} : { counterIon }) },
    defaultLibrary,
  );

const sumOf = (atoms: Readonly<Record<string, number>>): number =>
  Object.entries(atoms).reduce(
    (sum, [name, count]) => sum + count * (atomConstants[name] ?? bondConstants[name])!.value!,
    0,
  );

describe('Pascal constants', () => {
  it('sum to −50.46 for pyridine as the worked example of a course handout, near the tabled −49', () => {
    expect(sumOf({ 'C in a ring': 5, H: 5, 'N in a ring': 1 })).toBeCloseTo(-50.46, 2);
    expect(ligandConstants.py!.value).toBe(-49);
  });

  it('sum to the tabled value for ethylenediamine within 1 (atoms against table)', () => {
    expect(Math.abs(sumOf({ C: 2, H: 8, 'N in a chain': 2 }) - ligandConstants.en!.value!)).toBeLessThan(1);
  });

  it('name only ligands of the library, and atoms that have a constant', () => {
    for (const id of [...Object.keys(ligandConstants), ...Object.keys(ligandAtoms)]) {
      expect(defaultLibrary.ligands.has(id), id).toBe(true);
    }
    for (const atoms of Object.values(ligandAtoms)) expect(sumOf(atoms)).toBeLessThan(0);
  });

  it('carry a source and a status each', () => {
    for (const { value, source, status } of Object.values({ ...ligandConstants, ...atomConstants })) {
      expect(value).not.toBeNull();
      expect(source).toMatch(/Bain and Berry|handout/);
      expect(['page', 'memory']).toContain(status);
    }
  });
});

describe('diamagnetic correction of a substance', () => {
  it('adds up metal, ligands and counter-ions: [Ni(en)3]Cl2 is −12.8 − 3 × 46.5 − 2 × 23.4 = −199.1', () => {
    const { chi_cm3_mol, items } = correction('Ni', 2, { en: 3 }, 'Cl');
    expect(chi_cm3_mol).toBeCloseTo(-199.1e-6, 9);
    expect(items.map(({ route }) => route)).toEqual(['table', 'table', 'table']);
    expect(items[2]).toMatchObject({ species: 'Cl-', count: 2 });
  });

  it('falls back to atoms, then to half the molar mass, and says so', () => {
    const { items, sigma_cm3_mol } = correction('Co', 3, { dien: 1, edta: 1 });
    expect(items[1]).toMatchObject({ species: 'dien', route: 'atoms' });
    expect(items[1]!.each_1e6).toBeCloseTo(-78.8, 0);
    expect(items[2]).toMatchObject({ species: 'edta', route: 'half-mass', status: 'own' });
    expect(items[2]!.each_1e6).toBeCloseTo(-144.1, 0);
    expect(sigma_cm3_mol).toBeGreaterThan(40e-6);
  });

  it('is null, not guessed, where a part is unknown', () => {
    const { chi_cm3_mol, items } = correction('Ni', 2, { en: 3 }, 'unobtainide');
    expect(chi_cm3_mol).toBeNull();
    expect(items.at(-1)).toMatchObject({ route: 'unknown', each_1e6: null });
  });

  it('leaves out the counter-ion of a neutral complex', () => {
    expect(correction('Co', 3, { acac: 3 }, 'Cl').items).toHaveLength(2);
  });
});
