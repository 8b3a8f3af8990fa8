import { describe, expect, it } from 'vitest';
import { statedInput, type StatedComplex } from '../../testing/bandInput';
import { cm1PerElectronvolt } from '../../units';
import {
  assignmentDoubt,
  hiddenBands,
  hushWidth_cm1,
  ligandToMetalEnergy,
  metalPotential_V,
  predictBands,
} from '../index';
import { borrowing } from '../intensity/chargeTransferGain';
import { acceptors } from './acceptor';
import { metalElectronegativity } from './opticalElectronegativity';
import { spinPairing, spinPairingParameter } from './spinPairing';
import { defaultLibrary, findIon } from '../../library';

const predicted = (complex: StatedComplex) => predictBands(statedInput(complex));
const first = (complex: StatedComplex, kind: 'LMCT' | 'MLCT') =>
  predicted(complex).bands.find((band) => band.kind === kind);
const codes = (complex: StatedComplex): string[] => predicted(complex).flags.map(({ code }) => code);
const isDd = ({ kind }: { kind: string }): boolean => kind.startsWith('spin-');

describe('ligand to metal', () => {
  // 30 000 (3.0 - 2.3) + 22 900: found about 43 800 in [Co(NH3)5Cl]2+ (from memory, agreement partly lucky).
  it('into eg of low-spin cobalt(III) adds 10Dq: 43 900 cm-1 from chloride', () => {
    expect(ligandToMetalEnergy(3.0, 2.3, 22_900)).toBeCloseTo(43_900, 6);
    const band = first(
      { metal: 'Co', oxidationState: 3, ligands: { nh3: 5, cl: 1 }, tenDq: 22_900, B: 620, C: 2_700 },
      'LMCT',
    )!;
    expect(band.label).toBe('Cl π -> Co (eg)');
    expect(Math.abs(band.energy_cm1 - 43_800)).toBeLessThan(1_000);
    expect(band.slopeTenDq).toBe(1);
    expect(band.reasons.join(' ')).toMatch(/10Dq added/);
  });

  // Bands of real complexes, from memory of C. K. Jorgensen (1970) and A. B. P. Lever (1984); metal values rest on some.
  it.each([
    [
      '[CoCl4]2-',
      { metal: 'Co', oxidationState: 2, ligands: { cl: 4 }, tenDq: 3_200, B: 710, C: 3_200 },
      42_700,
    ],
    ['[CuCl4]2-, tetrahedral', { metal: 'Cu', oxidationState: 2, ligands: { cl: 4 }, tenDq: 5_000 }, 24_000],
    ['MnO4-', { metal: 'Mn', oxidationState: 7, ligands: { oxo: 4 } }, 18_300],
    ['CrO4 2-', { metal: 'Cr', oxidationState: 6, ligands: { oxo: 4 } }, 26_800],
  ] as const)('gives %s its first band within 1 000 cm-1', (_name, complex, found) => {
    const band = first({ ...complex, geometry: 'tetrahedral' }, 'LMCT')!;
    expect(Math.abs(band.energy_cm1 - found)).toBeLessThan(1_000);
    expect(band.sigma_cm1).toBe(3_000);
    expect(band.multiplicity).toBeNull();
  });

  // [FeCl4]- near 27 500 and [Fe(H2O)6]3+ near 41 700 cm-1 (from memory).
  it.each([
    ['[FeCl4]-', { ligands: { cl: 4 }, geometry: 'tetrahedral' }, 27_500],
    ['[Fe(H2O)6]3+', { ligands: { h2o: 6 }, geometry: 'octahedral' }, 41_700],
    ['[IrCl6]2-', { metal: 'Ir', oxidationState: 4, ligands: { cl: 6 }, geometry: 'octahedral' }, 20_450],
  ] as const)('gives %s its first band within 4 000 cm-1', (_name, complex, found) => {
    const band = first({ metal: 'Fe', oxidationState: 3, ...complex }, 'LMCT')!;
    expect(Math.abs(band.energy_cm1 - found)).toBeLessThan(4_000);
  });

  it('falls from chloride to bromide to iodide', () => {
    const of = (ligand: string): number =>
      first(
        { metal: 'Co', oxidationState: 2, ligands: { [ligand]: 4 }, geometry: 'tetrahedral', tenDq: 3_000 },
        'LMCT',
      )!.energy_cm1;
    expect(of('cl')).toBeGreaterThan(of('br'));
    expect(of('br')).toBeGreaterThan(of('i'));
  });

  it('never mixes the two columns of the metal: the corrected value asks for the spin-pairing term, the other not', () => {
    const chromium = findIon(defaultLibrary, 'Cr', 3)!;
    const cobalt = findIon(defaultLibrary, 'Co', 2)!;
    expect(metalElectronegativity(chromium, 'octahedral')).toMatchObject({
      value: 1.85,
      needsSpinPairing: true,
    });
    expect(metalElectronegativity(cobalt, 'tetrahedral')).toMatchObject({
      value: 1.58,
      needsSpinPairing: false,
    });
    // Without B and C the term cannot be told, so no number is given.
    expect(first({ metal: 'Cr', oxidationState: 3, ligands: { cl: 6 } }, 'LMCT')).toBeUndefined();
  });

  it('takes a value of the other coordination only as an analogy, to 5 000 cm-1', () => {
    const band = first(
      { metal: 'Ni', oxidationState: 2, ligands: { cl: 6 }, tenDq: 6_800, B: 780, C: 3_300 },
      'LMCT',
    )!;
    expect(band.sigma_cm1).toBe(5_000);
    expect(band.reasons.join(' ')).toMatch(/analogy/);
  });

  // Jorgensen's coefficients of D for q = 0 to 10, high spin: 0, 0, -2/3, -2, -4, -20/3, -4, -2, -2/3, 0, 0.
  it('has the spin-pairing energies of Jorgensen', () => {
    const highSpin = [0, 1, 2, 3, 4, 5, 4, 3, 2, 1, 0].map((unpaired) => unpaired / 2);
    const expected = [0, 0, -2 / 3, -2, -4, -20 / 3, -4, -2, -2 / 3, 0, 0];
    highSpin.forEach((spin, q) => expect(spinPairing(q, spin)).toBeCloseTo(expected[q]!, 10));
    expect(spinPairingParameter(600, 2_700)).toBeCloseTo((7 / 6) * 4_200, 8);
  });

  it('knows where the electron may go: t2g or eg in d3, only eg in low-spin d6 with 10Dq', () => {
    const d3 = acceptors({ dElectrons: 3, t2: 3, e: 0, multiplicity: 4, tenDq: 17_400, tetrahedral: false });
    expect(d3.map(({ shell, fieldTerm_cm1, pairing }) => [shell, fieldTerm_cm1, pairing])).toEqual([
      ['t2', 0, 2],
      ['e', 17_400, -2],
    ]);
    const d6 = acceptors({ dElectrons: 6, t2: 6, e: 0, multiplicity: 1, tenDq: 22_900, tetrahedral: false });
    expect(d6.map(({ shell, fieldTerm_cm1 }) => [shell, fieldTerm_cm1])).toEqual([['e', 22_900]]);
  });
});

describe('metal to ligand', () => {
  // Lever 1990: 6 x 0.259 V, less the reduction of bipyridine at -1.09 V; found at 452 nm (22 100 cm-1).
  it('puts the band of [Ru(bpy)3]2+ near 21 300 cm-1 and that of [Fe(bpy)3]2+ near its 522 nm', () => {
    const ruthenium = first(
      { metal: 'Ru', oxidationState: 2, ligands: { bipy: 3 }, tenDq: 28_000, B: 500, C: 2_000 },
      'MLCT',
    )!;
    expect(Math.abs(ruthenium.energy_cm1 - 21_300)).toBeLessThan(300);
    expect(Math.abs(ruthenium.energy_cm1 - 22_100)).toBeLessThan(ruthenium.sigma_cm1);
    const iron = first(
      { metal: 'Fe', oxidationState: 2, ligands: { bipy: 3 }, tenDq: 21_000, B: 700, C: 3_000 },
      'MLCT',
    )!;
    expect(Math.abs(iron.energy_cm1 - 1e7 / 522)).toBeLessThan(500);
    // 8 600 L/mol/cm, from memory.
    expect(iron.molarAbsorptivityRange[0]).toBeLessThan(8_600);
    expect(iron.molarAbsorptivityRange[1]).toBeGreaterThan(8_600);
  });

  // 525 nm, from memory: the metal of the ammine is easier to oxidise, but its bipyridine harder to reduce.
  it('moves little when ammonia stands in for bipyridine: [Ru(NH3)4(bpy)]2+ within 1 000 cm-1', () => {
    const ammine = first(
      { metal: 'Ru', oxidationState: 2, ligands: { nh3: 4, bipy: 1 }, tenDq: 28_000, B: 500, C: 2_000 },
      'MLCT',
    )!;
    expect(Math.abs(ammine.energy_cm1 - 1e7 / 525)).toBeLessThan(1_000);
  });

  it('adds up ligand parameters by donor', () => {
    expect(metalPotential_V('Ru2+', [{ id: 'bipy', places: 6 }])).toBeCloseTo(1.55, 2);
    expect(metalPotential_V('Ru2+', [{ id: 'unheard-of', places: 6 }])).toBeNull();
    expect(1.55 + 1.09).toBeCloseTo(21_300 / cm1PerElectronvolt, 2);
  });

  it('is a flag without a number for other metals in low oxidation states, and nothing for chromium(III)', () => {
    expect(
      codes({ metal: 'Cu', oxidationState: 1, ligands: { phen: 2 }, geometry: 'tetrahedral' }),
    ).toContain('mlct-possible');
    expect(
      codes({ metal: 'Co', oxidationState: 2, ligands: { bipy: 3 }, tenDq: 12_900, B: 800, C: 3_600 }),
    ).toContain('mlct-possible');
    const chromium = {
      metal: 'Cr',
      oxidationState: 3,
      ligands: { phen: 3 },
      tenDq: 22_000,
      B: 650,
      C: 3_000,
    };
    expect(codes(chromium)).not.toContain('mlct-possible');
  });
});

describe('intervalence', () => {
  // Hush 1967: w² = 2310 ν, his constant being rounded; 4 806 cm-1.
  it('has the width of Hush for a band at 10 000 cm-1 and 298 K to half a per cent', () => {
    expect(Math.abs(hushWidth_cm1(10_000, 298) / 4_806 - 1)).toBeLessThan(0.005);
  });

  it('is flagged for cyanides of iron, of which Prussian blue is made', () => {
    expect(
      codes({ metal: 'Fe', oxidationState: 3, ligands: { cn: 6 }, tenDq: 35_000, B: 600, C: 2_500 }),
    ).toContain('intervalence-possible');
  });
});

describe('mistakes with charge transfer', () => {
  it('d0 and d10 get no d-d band but a notice: permanganate, titanium(IV), zinc(II), copper(I)', () => {
    const cases = [
      { metal: 'Mn', oxidationState: 7, ligands: { oxo: 4 }, geometry: 'tetrahedral' },
      { metal: 'Ti', oxidationState: 4, ligands: { cl: 6 } },
      { metal: 'Zn', oxidationState: 2, ligands: { h2o: 6 } },
      { metal: 'Cu', oxidationState: 1, ligands: { phen: 2 }, geometry: 'tetrahedral' },
    ] as const;
    for (const complex of cases) {
      const { bands, flags } = predicted(complex);
      expect(bands.filter(isDd)).toEqual([]);
      expect(flags.map(({ code }) => code)).toContain('no-dd-bands');
    }
  });

  it('a full shell without charge transfer is colourless, one with it is not told', () => {
    const zinc = predicted({ metal: 'Zn', oxidationState: 2, ligands: { h2o: 6 } });
    expect([zinc.bands.length, zinc.complete]).toEqual([0, true]);
    const copper = predicted({
      metal: 'Cu',
      oxidationState: 1,
      ligands: { phen: 2 },
      geometry: 'tetrahedral',
    });
    expect([copper.bands.length, copper.complete]).toEqual([0, false]);
    // Not a single level: nothing can be said of a d3 ion.
    expect(predicted({ metal: 'V', oxidationState: 2, ligands: { h2o: 6 } }).complete).toBe(false);
  });

  it('a band of 8 000 L/mol/cm is not d-d, and one of 5 is not charge transfer', () => {
    expect(assignmentDoubt('spin-allowed', 8_000, 'octahedral')).toMatch(/too strong/);
    expect(assignmentDoubt('spin-allowed', 600, 'tetrahedral')).toBeNull();
    expect(assignmentDoubt('spin-allowed', 13, 'octahedral')).toBeNull();
    expect(assignmentDoubt('spin-forbidden', 100, 'octahedral')).toMatch(/too strong/);
    expect(assignmentDoubt('LMCT', 5, 'octahedral')).toMatch(/too weak/);
  });

  it('charge transfer that buries the d-d bands is told by overlap: all of them in hexachloroiridate(IV)', () => {
    const { bands, flags } = predicted({
      metal: 'Ir',
      oxidationState: 4,
      ligands: { cl: 6 },
      tenDq: 27_000,
      B: 350,
      C: 1_400,
    });
    const hidden = hiddenBands(bands).map(({ band }) => band.kind);
    expect(hidden).toContain('spin-allowed');
    expect(flags.map(({ code }) => code)).toContain('charge-transfer-hides-dd');
  });

  it('and hides nothing where it lies far in the ultraviolet: aqua nickel(II)', () => {
    const nickel = { metal: 'Ni', oxidationState: 2, ligands: { h2o: 6 }, tenDq: 8_500, B: 940, C: 3_760 };
    expect(hiddenBands(predicted(nickel).bands).filter(({ band }) => band.kind === 'spin-allowed')).toEqual(
      [],
    );
    expect(codes(nickel)).toEqual([]);
  });

  it('a d-d band borrows from charge transfer by the inverse square of the gap: half the gap, four times', () => {
    expect(borrowing(20_000, 30_000) / borrowing(20_000, 40_000)).toBeCloseTo(4, 10);
  });

  it('charge-transfer bands are said to leave out the solvent', () => {
    expect(
      predicted({ metal: 'Cu', oxidationState: 2, ligands: { cl: 4 }, geometry: 'tetrahedral' }).leftOut,
    ).toContain('Solvent and ion-pair shifts of charge-transfer bands.');
  });

  it('no band is anything but finite, even where next to nothing is known', () => {
    const rare: StatedComplex[] = [
      { metal: 'Re', oxidationState: 5, ligands: { oxo: 1, pph3: 2, cl: 3 } },
      { metal: 'Cu', oxidationState: 3, ligands: { f: 6 } },
      { metal: 'Os', oxidationState: 8, ligands: { oxo: 4 }, geometry: 'tetrahedral' },
    ];
    for (const complex of rare) {
      for (const band of predicted(complex).bands) {
        expect(
          [band.energy_cm1, band.width_cm1, band.molarAbsorptivity, band.sigma_cm1].every(Number.isFinite),
        ).toBe(true);
      }
    }
  });
});
