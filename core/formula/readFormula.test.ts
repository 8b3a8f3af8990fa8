import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { complexFormula, defaultLibrary } from '../library';
import { readFormula } from '.';
import type { ReadFormula } from './types';

function read(text: string): ReadFormula {
  const reading = readFormula(text);
  if (!reading.ok) throw new Error(`${reading.problem.message} at ${reading.problem.at}`);
  return reading.value;
}
const problem = (text: string) => {
  const reading = readFormula(text);
  if (reading.ok) throw new Error('it was read');
  return reading.problem;
};
const parts = (text: string) => {
  const { composition, charge } = read(text);
  return [composition.metal, composition.oxidationState, composition.ligands, charge];
};

describe('a formula', () => {
  // Formulas as the IUPAC Red Book 2005 prints them in IR-4.4 and IR-9.2, and in customary order.
  it.each([
    ['[Co(NH3)6]Cl3', ['Co', 3, { nh3: 6 }, 3]],
    ['[CoCl(NH3)5]Cl2', ['Co', 3, { cl: 1, nh3: 5 }, 2]],
    ['K3[Fe(CN)6]', ['Fe', 3, { cn: 6 }, -3]],
    ['K4[Fe(CN)6]', ['Fe', 2, { cn: 6 }, -4]],
    ['[PtCl2(NH3)2]', ['Pt', 2, { cl: 2, nh3: 2 }, 0]],
    ['[Co(en)2Cl2]+', ['Co', 3, { en: 2, cl: 2 }, 1]],
    ['(NH4)2[NiCl4]', ['Ni', 2, { cl: 4 }, -2]],
    ['[Cr(ox)3]3-', ['Cr', 3, { ox: 3 }, -3]],
    ['[Fe(bpy)3]2+', ['Fe', 2, { bipy: 3 }, 2]],
    ['[VO(H2O)5]2+', ['V', 4, { oxo: 1, h2o: 5 }, 2]],
    ['[Fe(phen)2(NCS)2]', ['Fe', 2, { phen: 2, ncs_n: 2 }, 0]],
  ] as const)('%s is taken apart', (text, expected) => {
    expect(parts(text)).toEqual(expected);
  });

  it.each([
    '[Cr(NH3)6]3+',
    '[Cr(NH3)6]+3',
    '[Cr(NH3)6]^3+',
    '[Cr(NH3)6](3+)',
    '[Cr(NH3)6]+++',
    '[Cr(NH₃)₆]³⁺',
    ' [Cr(NH3)6] 3+ ',
  ])('has its charge in any writing: %s', (text) => {
    expect(parts(text)).toEqual(['Cr', 3, { nh3: 6 }, 3]);
  });

  it.each(['CoCl4^2-', 'CoCl₄²⁻', 'CoCl4 2-', 'CoCl4(2−)'])('needs no brackets: %s', (text) => {
    expect(parts(text)).toEqual(['Co', 2, { cl: 4 }, -2]);
    expect(read(text).composition.geometry).toBe('tetrahedral');
  });

  it('carries isomer, counter-ions and solvent of crystallisation along', () => {
    const { composition, counterIon, solvate } = read('trans-[CrCl2(NH3)4]Cl·2H2O');
    expect(composition.isomer).toBe('trans');
    expect(counterIon).toBe('Cl');
    expect(solvate).toBe('2 H2O');
    expect(read('[Ni(H2O)6](ClO4)2').counterIon).toBe('2 ClO4');
  });

  it('says what it took for granted', () => {
    expect(read('[Cr(CO)6]').assumed).toEqual([expect.stringMatching(/neutral/)]);
    expect(read('[PdCl4]2-').composition.geometry).toBe('square-planar');
    expect(read('[PdCl4]2-').assumed).toEqual([expect.stringMatching(/square planar/)]);
  });

  it('that the program writes is read back, whatever the ligands', () => {
    const ids = [...defaultLibrary.ligands.values()]
      .filter(({ id, denticity }) => denticity <= 3 && !['cit_o'].includes(id))
      .map(({ id }) => id);
    fc.assert(
      fc.property(
        fc.constantFrom(...ids),
        fc.constantFrom(...ids),
        fc.constantFrom('Cr', 'Ru', 'Ni'),
        (one, other, metal) => {
          const ligands = one === other ? { [one]: 2 } : { [one]: 1, [other]: 1 };
          const text = complexFormula({ metal, oxidationState: 3, ligands }, defaultLibrary);
          const reading = readFormula(text);
          // A set that no polyhedron holds is refused for that reason alone.
          if (!reading.ok) expect(reading.problem.message).toMatch(/So many donors/);
          else expect(reading.value.composition.ligands).toEqual(ligands);
        },
      ),
      { numRuns: 600, seed: 3 },
    );
  });
});

describe('a name', () => {
  // Additive names as in the IUPAC Red Book 2005, IR-9.2.2, and the older spellings.
  it.each([
    ['hexaamminecobalt(III) chloride', ['Co', 3, { nh3: 6 }, 3]],
    ['pentaamminechloridocobalt(III)', ['Co', 3, { nh3: 5, cl: 1 }, 2]],
    ['tris(ethane-1,2-diamine)cobalt(III) ion', ['Co', 3, { en: 3 }, 3]],
    ['hexacyanidoferrate(II)', ['Fe', 2, { cn: 6 }, -4]],
    ['hexacyanoferrate(III)', ['Fe', 3, { cn: 6 }, -3]],
    ['tetrachloridocobaltate(II)', ['Co', 2, { cl: 4 }, -2]],
    ['hexaaquachromium(III)', ['Cr', 3, { h2o: 6 }, 3]],
    ['trans-tetraamminedichloridochromium(III)', ['Cr', 3, { nh3: 4, cl: 2 }, 1]],
  ] as const)('%s is understood', (text, expected) => {
    expect(parts(text)).toEqual(expected);
  });
});

describe('what cannot be read', () => {
  it.each([
    ['[Co(enn)2Cl2]+', 4, /enn/, 'en'],
    ['[Xx(NH3)6]', 1, /begins with its metal/, undefined],
    ['[Co(NH3)6', 0, /not closed/, undefined],
    ['[Co(NH3', 0, /not closed/, undefined],
    ['[Co(NH3)6]3+Cl2', 10, /does not balance/, undefined],
    ['[Cr(NH3)6]9+', 10, /oxidation state/, undefined],
    ['hexaaminecobalt(III)', 4, /amine/, 'ammine'],
    ['', 0, /Nothing/, undefined],
  ] as const)('%s is answered with the place', (text, at, message, suggestion) => {
    const found = problem(text);
    expect(found.at).toBe(at);
    expect(found.message).toMatch(message);
    if (suggestion !== undefined) expect(found.suggestions.join()).toContain(suggestion);
  });

  it('never throws, whatever is typed', () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 60, unit: 'binary' }), (text) => {
        readFormula(text);
        readFormula(`[${text}]3+`);
      }),
      { numRuns: 500, seed: 5 },
    );
  });
});
