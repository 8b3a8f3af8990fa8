import { describe, expect, it } from 'vitest';
import {
  cautionsFor,
  complexFormula,
  defaultLibrary,
  findGeometry,
  findIon,
  ligandKind,
  molarMass,
  netCharge,
  withParameterSet,
} from '.';

const oct = (metal: string, oxidationState: number, ligands: Record<string, number>) => ({
  metal,
  oxidationState,
  geometry: 'octahedral',
  ligands,
});

describe('the library', () => {
  it('holds the 73 ions and the ligands with facts of structure throughout', () => {
    expect(defaultLibrary.ions.size).toBe(73);
    expect(defaultLibrary.ligands.size).toBeGreaterThanOrEqual(69);
    for (const ligand of defaultLibrary.ligands.values()) {
      expect(ligand.donorAtoms.length, ligand.id).toBe(ligand.denticity);
    }
  });

  it('says where every value comes from, or has no value', () => {
    for (const ion of defaultLibrary.ions.values()) {
      for (const entry of [ion.g, ion.k, ion.B0, ion.C0, ion.zeta0]) {
        if (entry.value !== null) expect(entry.source, ion.ion).toMatch(/\S{3}/);
        else expect(entry.source).toBeNull();
      }
    }
    for (const ligand of defaultLibrary.ligands.values()) {
      for (const entry of [ligand.f, ligand.h, ligand.chiOpt]) {
        if (entry.value !== null) expect(entry.source, ligand.id).toMatch(/\S{3}/);
      }
    }
  });

  it.each([
    // d count = group number minus oxidation state.
    ['Fe', 3, 5],
    ['Co', 3, 6],
    ['Ni', 2, 8],
    ['Cr', 3, 3],
    ['Cr', 0, 6],
    ['Zn', 2, 10],
  ] as const)('counts the d electrons of %s(%i) as %i', (metal, state, d) => {
    expect(findIon(defaultLibrary, metal, state)?.dElectrons).toBe(d);
  });

  it('knows no ion with more d electrons than a shell holds or fewer than none', () => {
    expect(findIon(defaultLibrary, 'Ti', 5)).toBeUndefined();
    expect(findIon(defaultLibrary, 'Cu', 0)?.dElectrons).toBeUndefined();
    expect(findIon(defaultLibrary, 'Xx', 2)).toBeUndefined();
  });

  it('understands a geometry by id or by its usual other names', () => {
    expect(findGeometry('Square planar')?.id).toBe('square-planar');
    expect(findGeometry('tetragonal')?.coordinationNumber).toBe(6);
    expect(findGeometry('banana')).toBeUndefined();
  });
});

describe('formula and mass', () => {
  it('writes bracket formulas with the charge of the complex', () => {
    expect(complexFormula(oct('Cr', 3, { cl: 1, nh3: 5 }), defaultLibrary)).toBe('[Cr(NH3)5Cl]2+');
    expect(complexFormula(oct('Fe', 3, { ox: 3 }), defaultLibrary)).toBe('[Fe(ox)3]3-');
    expect(complexFormula(oct('V', 4, { oxo: 1, h2o: 5 }), defaultLibrary)).toBe('[VO(H2O)5]2+');
    expect(complexFormula(oct('Ni', 2, { en: 3 }), defaultLibrary)).toBe('[Ni(en)3]2+');
    expect(complexFormula(oct('Cr', 3, { f: 6 }), defaultLibrary)).toBe('[CrF6]3-');
    expect(complexFormula(oct('Cr', 3, { cl: 3, py: 3 }), defaultLibrary)).toBe('[Cr(py)3Cl3]');
  });

  it('can order the ligands alphabetically instead (Red Book 2005, IR-4.4.3.2)', () => {
    expect(complexFormula(oct('Cr', 3, { nh3: 5, cl: 1 }), defaultLibrary, 'alphabetical')).toBe(
      '[CrCl(NH3)5]2+',
    );
  });

  it('adds up charges', () => {
    expect(netCharge(oct('Co', 3, { edta: 1 }), defaultLibrary)).toBe(-1);
    expect(netCharge(oct('Fe', 2, { cn: 6 }), defaultLibrary)).toBe(-4);
  });

  it('weighs the whole substance, counter-ions and solvate included', () => {
    // [Ni(en)3]Cl2·2H2O with IUPAC abridged standard atomic weights: 345.9 g/mol.
    const mass = molarMass(oct('Ni', 2, { en: 3 }), defaultLibrary, {
      counterIon: 'chloride',
      solvate: '2 H2O',
    });
    expect(mass.value_g_mol).toBeCloseTo(345.9, 1);
  });

  it('refuses a mass rather than leave a part out', () => {
    const mass = molarMass(oct('Ni', 2, { en: 3 }), defaultLibrary, { counterIon: 'unobtainate' });
    expect(mass.value_g_mol).toBeNull();
    expect(mass.notes[0]).toContain('unobtainate');
  });

  it('knows the mass of every ligand whose formula is on file', () => {
    for (const ligand of defaultLibrary.ligands.values()) {
      if (ligand.formula === '' || ligand.id === 'sr') continue;
      const mass = molarMass(oct('Ni', 2, { [ligand.id]: 1 }), defaultLibrary).value_g_mol;
      expect(mass, ligand.id).toBeGreaterThan(58);
    }
  });
});

describe('a ligand that is not in the tables', () => {
  it.each([
    ['2,6-bis(pyrazol-3-yl)pyridine', ['N', 'N', 'N'], 'heterocycle', 'acceptor'],
    ['1,3-diaminopropane', ['N', 'N'], 'amine', 'none'],
    ['catecholate', ['O', 'O'], 'O-chelate', 'donor'],
    ['alaninate', ['N', 'O'], 'N,O-chelate', 'donor'],
    ['triethylphosphane', ['P'], 'P-donor', 'acceptor'],
  ] as const)('is put into a class by name and donors: %s', (name, donors, kind, pi) => {
    expect(ligandKind(name, donors)).toEqual({ class: kind, piCharacter: pi });
  });
});

describe('a parameter set over the library', () => {
  it('replaces single values, keeps what they replace in view and reports keys that fit nothing', () => {
    const laid = withParameterSet(defaultLibrary, {
      values: {
        'ligand.nh3.f': { value: 1.275, sigma: 0.05, source: 'own recalibration' },
        'ion.Cr3+.g': { value: 17_300, sigma: 200, source: 'own recalibration' },
        'ligand.unobtainium.f': { value: 9, sigma: 1, source: 'nowhere' },
      },
    });
    expect(laid.library.ligands.get('nh3')?.f.value).toBe(1.275);
    expect(laid.library.ligands.get('nh3')?.f.note).toContain('1.25');
    expect(laid.library.ions.get('Cr3+')?.g.sigma).toBe(200);
    expect(laid.unused).toEqual(['ligand.unobtainium.f']);
    expect(defaultLibrary.ligands.get('nh3')?.f.value).toBe(1.25);
  });
});

describe('cautions', () => {
  const ids = (ligands: Record<string, number>, metal: string, state: number, anion?: string) =>
    cautionsFor(oct(metal, state, ligands), anion, defaultLibrary).map(({ id }) => id);

  it('warns of perchlorate with an amine', () => {
    expect(ids({ en: 3 }, 'Ni', 2, 'ClO4-')).toContain('oxidising-anion');
    expect(ids({ en: 3 }, 'Ni', 2, 'chloride')).not.toContain('oxidising-anion');
  });

  it('warns of cyanide, azide, nickel, cobalt and chromium(VI)', () => {
    expect(ids({ cn: 6 }, 'Co', 3)).toEqual(
      expect.arrayContaining(['ligand-cn-1', 'acid-waste', 'metal-cobalt']),
    );
    expect(ids({ n3: 6 }, 'Cr', 3)).toContain('ligand-n3-1');
    expect(ids({ h2o: 6 }, 'Ni', 2)).toContain('metal-nickel');
    expect(ids({ oxo: 4 }, 'Cr', 6)).toContain('metal-chromium-vi');
  });

  it('calls what it does not know "not assessed", never safe', () => {
    const all = cautionsFor(oct('Y', 3, { ptz: 6 }), 'unobtainate', defaultLibrary);
    expect(all).toHaveLength(3);
    for (const { text } of all) expect(text).toMatch(/not assessed/);
    for (const { text } of all) expect(text).not.toMatch(/\bsafe\b/);
  });

  it('names a source with each', () => {
    for (const ligand of defaultLibrary.ligands.keys()) {
      for (const caution of cautionsFor(oct('Fe', 2, { [ligand]: 1 }), 'ClO4', defaultLibrary)) {
        expect(caution.source).toMatch(/\S{3}/);
      }
    }
  });
});
