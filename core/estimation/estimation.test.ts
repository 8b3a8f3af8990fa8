import { describe, expect, it } from 'vitest';
import { fieldMatrix } from '../dshell';
import { defaultLibrary, withParameterSet, complexKey } from '../library';
import { cm1PerKilojoulePerMole } from '../units';
import type { Composition } from '../record/composition';
import {
  averageEnvironment,
  differenceSigma,
  distanceFactor,
  donorOverlap,
  estimateField,
  extraPairs,
  jahnTellerExpectation,
  ligandFieldStabilisation,
  nephelauxeticB,
  piRatio,
  publishedProduct,
} from '.';

const complex = (
  metal: string,
  oxidationState: number,
  ligands: Record<string, number>,
  geometry: Composition['geometry'] = 'octahedral',
  isomer: string | null = null,
): Composition => ({ metal, oxidationState, geometry, ligands, isomer });

const fieldOf = (...args: Parameters<typeof complex>) => estimateField(complex(...args), defaultLibrary)!;

// Rules of C. K. Jorgensen, Absorption Spectra and Chemical Bonding in Complexes (1962), with his numbers from memory.
describe('the rules of the trade', () => {
  it('10Dq = f g: 1.25 times 17 400 is 21 750 for ammonia on chromium(III)', () => {
    expect(publishedProduct(1.25, 17_400)).toBe(21_750);
  });

  it('B = B0 (1 - h k): 918 (1 - 1.0 × 0.21) is 725 for water on chromium(III)', () => {
    expect(nephelauxeticB(918, 1.0, 0.21)).toBeCloseTo(725.2, 1);
  });

  it('average environment: five of 21 550 and one of 13 700 make 20 242', () => {
    const parts = [
      { tenDq: 21_550, places: 5 },
      { tenDq: 13_700, places: 1 },
    ];
    expect(averageEnvironment(parts)).toBeCloseTo(20_242, 0);
  });

  it('10Dq falls as r^-5 to r^-6: from 2.0 to 2.2 Å it is 1.61 to 1.77 times weaker (Hauser 2004)', () => {
    expect(distanceFactor(2.2, 2.0, 5)).toBeCloseTo(1.61, 2);
    expect(distanceFactor(2.2, 2.0, 6)).toBeCloseTo(1.77, 2);
  });

  it('e_sigma 7000 and e_pi 900 are 10Dq 17 400, and back (Schäffer 1968)', () => {
    const { eSigma, ePi } = donorOverlap(17_400, 900 / 7000);
    expect(eSigma).toBeCloseTo(7000, 6);
    expect(ePi).toBeCloseTo(900, 6);
    const octahedron = [0, 90, 180, 270].map((phi) => ({ theta: 90, phi }));
    const ligands = [...octahedron, { theta: 0, phi: 0 }, { theta: 180, phi: 0 }].map((place) => ({
      ...place,
      e_sigma: eSigma,
      e_pi_x: ePi,
      e_pi_y: ePi,
    }));
    const V = fieldMatrix({ type: 'aom', ligands });
    expect(V[1]![1]! - V[2]![2]!).toBeCloseTo(17_400, 6);
  });

  it('stabilises aqua nickel(II) by 1.2 × 8500 = 10 200 cm-1 = 122 kJ/mol', () => {
    const energy = ligandFieldStabilisation(6, 2, 8500);
    expect(energy).toBeCloseTo(10_200, 6);
    expect(energy / cm1PerKilojoulePerMole).toBeCloseTo(122, 0);
    expect(extraPairs(6, 0)).toBe(2);
    expect(extraPairs(6, 2)).toBe(0);
  });

  // B. N. Figgis and M. A. Hitchman, Ligand Field Theory and its Applications (2000), from memory.
  it.each([
    [9, 'high', 'strong'],
    [4, 'high', 'strong'],
    [7, 'low', 'strong'],
    [1, 'high', 'weak'],
    [2, 'high', 'weak'],
    [4, 'low', 'weak'],
    [5, 'low', 'weak'],
    [6, 'high', 'weak'],
    [7, 'high', 'weak'],
    [3, 'high', 'none'],
    [5, 'high', 'none'],
    [6, 'low', 'none'],
    [8, 'high', 'none'],
  ] as const)('expects of d%i, %s spin, a Jahn-Teller distortion that is %s', (d, spin, strength) => {
    expect(jahnTellerExpectation(d, spin)).toBe(strength);
  });
});

describe('routes, in order of trust', () => {
  it('takes the value measured on the complex itself before any other', () => {
    const composition = complex('Cr', 3, { nh3: 5, cl: 1 });
    const key = `complex.${complexKey(composition)}.tenDq`;
    const { library } = withParameterSet(defaultLibrary, {
      values: { [key]: { value: 20_100, sigma: 60, source: 'own spectrum' } },
    });
    const { fields } = estimateField(composition, library)!;
    expect(fields.high).toMatchObject({ value: 20_100, sigma: 60, route: 'measured-complex' });
  });

  it('takes a homoleptic complex of the same metal before f g', () => {
    const { fields } = fieldOf('Cr', 3, { nh3: 6 });
    expect(fields.high.value).toBe(21_550);
    expect(fields.high.route).toBe('measured-relative');
  });

  it('takes f g where both are in print', () => {
    const { fields } = fieldOf('V', 2, { nh3: 6 });
    expect(fields.high.value).toBe(1.25 * 12_000);
    expect(fields.high.route).toBe('published-factors');
  });

  it('gives a diimine on M(II) the field that its nickel complex shows, not that of its table f', () => {
    const { fields } = fieldOf('Co', 2, { bipy: 3 });
    expect(fields.high.value).toBeGreaterThan(1.4 * 9000);
  });

  it('falls back on the donor class with a wider range that says so', () => {
    const known = fieldOf('Ni', 2, { en: 3 });
    const analogous = fieldOf('Ni', 2, { trien: 1, en: 1 });
    expect(analogous.fields.high.route).toMatch(/donor-class|series-place/);
    expect(analogous.fields.high.sigma!).toBeGreaterThan(known.fields.high.sigma!);
    expect(analogous.flags.map(({ code }) => code)).toContain('analogy');
  });

  it('says "not estimated, because" where nothing is known of a ligand', () => {
    const { fields } = fieldOf('Co', 3, { h: 6 });
    expect(fields.high.value).toBeNull();
    expect(fields.high.reasons[0]!.text).toMatch(/^not estimated, because/);
  });

  it('gives a reason with a source or an assumption for every number it states', () => {
    for (const ligand of ['nh3', 'cl', 'bipy', 'acac', 'dtc', 'ptz', 'pph3']) {
      const denticity = defaultLibrary.ligands.get(ligand)!.denticity;
      const { fields, racahB } = fieldOf('Fe', 3, { [ligand]: 6 / denticity });
      for (const estimate of [fields.high, fields.low, racahB]) {
        expect(estimate.reasons.some(({ kind }) => kind === 'source' || kind === 'assumption')).toBe(true);
        expect(estimate.sigma!).toBeGreaterThan(0);
      }
    }
  });

  it('scales 4d and 5d ions that have no g by charge and row: about 1.45 and 1.75 times (Jorgensen)', () => {
    // Ti4+ is d0; V4+ and Nb4+ have no g of their own.
    const light = fieldOf('V', 4, { f: 6 }).fields.high.value!;
    const heavy = fieldOf('Nb', 4, { f: 6 }).fields.high.value!;
    expect(heavy / light).toBeGreaterThan(1.25);
    expect(heavy / light).toBeLessThan(1.6);
  });
});

describe('doubt', () => {
  it('is known by its causes, whose squares add up', () => {
    const { fields } = fieldOf('Cr', 3, { nh3: 4, cl: 2 }, 'octahedral', 'trans');
    const squares = fields.high.shares!.reduce((sum, { sigma }) => sum + sigma ** 2, 0);
    expect(Math.sqrt(squares)).toBeCloseTo(fields.high.sigma!, 9);
  });

  it('largely cancels in the difference of two relatives that share a ligand', () => {
    const one = fieldOf('V', 3, { py: 4, cl: 2 }, 'octahedral', 'trans').fields.high;
    const other = fieldOf('V', 3, { py: 4, br: 2 }, 'octahedral', 'trans').fields.high;
    const apart = Math.hypot(one.sigma!, other.sigma!);
    expect(differenceSigma(one, other)!).toBeLessThan(0.6 * apart);
    expect(differenceSigma(one, one)).toBeLessThan(1e-3);
  });

  it('is wider for two analogies than for one', () => {
    const none = fieldOf('Cr', 3, { f: 6 }).fields.high;
    const one = fieldOf('V', 4, { f: 6 }).fields.high;
    const two = fieldOf('V', 4, { trien: 1, en: 1 }).fields.high;
    const share = ({ value, sigma }: typeof none): number => sigma! / value!;
    expect(share(one)).toBeGreaterThan(share(none));
    expect(share(two)).toBeGreaterThan(share(one));
  });
});

describe('angular overlap', () => {
  it('gives amines no π interaction, halides a donating and cyanide an accepting one', () => {
    const ion = defaultLibrary.ions.get('Cr3+')!;
    const ratio = (id: string): number => piRatio(defaultLibrary.ligands.get(id)!, ion, defaultLibrary);
    expect(ratio('en')).toBe(0);
    expect(ratio('cl')).toBeGreaterThan(0.1);
    expect(ratio('cn')).toBeLessThan(0);
  });

  it('orders the orbitals of planar tetrachlorocuprate(II) as its polarised spectrum does', async () => {
    // xy, xz/yz, z2 below x2-y2 by 12 500, 14 300 and 17 000: M. A. Hitchman, P. J. Cassidy, Inorg. Chem. 1979 (memory).
    const { fieldLevels } = await import('.');
    const field = fieldOf('Cu', 2, { cl: 4 }, 'square-planar');
    const levels = fieldLevels(field, defaultLibrary, 'high', field.fields.high);
    expect(levels.map(({ label }) => label)).toEqual(['2B1g', '2B2g', '2Eg', '2A1g']);
    [12_500, 14_300, 17_000].forEach((found, i) => {
      expect(Math.abs(levels[i + 1]!.energy / found - 1)).toBeLessThan(0.05);
    });
  });
});
