import { describe, expect, it } from 'vitest';
import { estimateField } from '../estimation';
import { defaultLibrary } from '../library';
import type { Composition } from '../record/composition';
import {
  crossoverRatio,
  mixedMoment,
  momentRange,
  secondOrderMoment,
  spinEntropy,
  spinOnlyMoment,
  spinState,
  spinWords,
} from '.';

const spinOf = (
  metal: string,
  oxidationState: number,
  ligands: Record<string, number>,
  geometry: Composition['geometry'] = 'octahedral',
  temperature_K?: number,
) => {
  const field = estimateField({ metal, oxidationState, geometry, ligands, isomer: null }, defaultLibrary)!;
  const options = temperature_K === undefined ? {} : { temperature_K };
  return spinState(field, defaultLibrary, options).prediction;
};

// Exact levels of both spins, Y. Tanabe and S. Sugano, J. Phys. Soc. Jpn 9 (1954) 753, 766; digits recomputed by an
// independent full configuration interaction.
describe('the crossover', () => {
  it.each([
    [4, 5, 3, [24.4, 26.8, 29.3]],
    [5, 6, 2, [26.0, 28.4, 30.9]],
    [6, 5, 1, [17.0, 18.9, 20.8]],
    [7, 4, 2, [19.4, 21.2, 23.0]],
  ] as const)('of d%i lies where exact levels cross, for C/B 4, 4.5 and 5', (d, high, low, expected) => {
    [4, 4.5, 5].forEach((ratio, i) => {
      expect(crossoverRatio(d, 'octahedral', ratio, high, low)).toBeCloseTo(expected[i]!, 0.8);
    });
  });

  it('is reported for the C/B of the complex', () => {
    const { crossoverTenDqOverB } = spinOf('Fe', 2, { h2o: 6 });
    expect(crossoverTenDqOverB).toBeGreaterThan(17);
    expect(crossoverTenDqOverB).toBeLessThan(20.8);
  });
});

describe('what is said at a probability', () => {
  it.each([
    [0.99, 'high spin expected'],
    [0.95, 'high spin expected'],
    [0.9, 'high spin likely'],
    [0.79, 'cannot say: near crossover'],
    [0.5, 'cannot say: near crossover'],
    [0.15, 'low spin likely'],
    [0.02, 'low spin expected'],
  ])('P(high) = %f reads "%s"', (probability, words) => {
    expect(spinWords(probability)).toBe(words);
  });
});

describe('moments', () => {
  it('are sqrt(n (n + 2)) by spin alone', () => {
    expect([1, 2, 3, 4, 5].map((n) => spinOnlyMoment(n).toFixed(2))).toEqual([
      '1.73',
      '2.83',
      '3.87',
      '4.90',
      '5.92',
    ]);
  });

  it('of an A2 term grow by spin-orbit coupling: 3.25 for nickel(II) with lambda -315 and 10Dq 8500', () => {
    // B. N. Figgis and J. Lewis, Prog. Inorg. Chem. 6 (1964) 37.
    expect(secondOrderMoment(2, 4, -315, 8500)).toBeCloseTo(3.25, 2);
  });

  it('of a half-and-half mixture of 5.2 and 0 is 3.68', () => {
    expect(mixedMoment(0.5, 5.2, 0)).toBeCloseTo(3.68, 2);
  });

  // Ranges found: Figgis and Lewis 1964; measured p of aqua ions, Ashcroft and Mermin 1976, p. 658 (from memory).
  it.each([
    ['Fe2+', 'octahedral', 6, 4, 5.4],
    ['Cr3+', 'octahedral', 3, 3, 3.8],
    ['Mn2+', 'octahedral', 5, 5, 5.9],
    ['high-spin Co2+', 'octahedral', 7, 3, 4.8],
    ['tetrahedral Co2+', 'tetrahedral', 7, 3, 4.5],
    ['low-spin Fe3+', 'octahedral', 5, 1, 2.3],
  ])('of %s lie in the range that is given', (_, geometry, d, unpaired, found) => {
    const [low, high] = momentRange(geometry, d, unpaired, '3d')!;
    expect(found).toBeGreaterThanOrEqual(low);
    expect(found).toBeLessThanOrEqual(high);
  });
});

describe('the spin state of known complexes', () => {
  // Ground states of textbooks (J. E. Huheey, Inorganic Chemistry; N. N. Greenwood and A. Earnshaw 1997), from memory.
  it.each([
    ['Mn', 2, { h2o: 6 }, 'high'],
    ['Fe', 3, { h2o: 6 }, 'high'],
    ['Fe', 3, { ox: 3 }, 'high'],
    ['Fe', 3, { f: 6 }, 'high'],
    ['Fe', 2, { h2o: 6 }, 'high'],
    ['Co', 2, { h2o: 6 }, 'high'],
    ['Co', 2, { nh3: 6 }, 'high'],
    ['Cr', 2, { h2o: 6 }, 'high'],
    ['Co', 3, { en: 3 }, 'low'],
    ['Co', 3, { ox: 3 }, 'low'],
    ['Fe', 3, { cn: 6 }, 'low'],
    ['Fe', 2, { cn: 6 }, 'low'],
    ['Rh', 3, { nh3: 6 }, 'low'],
    ['Ru', 2, { h2o: 6 }, 'low'],
  ] as const)('%s(%i) %j is %s spin', (metal, state, ligands, expected) => {
    expect(spinOf(metal, state, ligands).state).toBe(expected);
  });

  it('hexafluorocobaltate(III) comes out high spin because its bonds are longer than those its g is for', () => {
    const field = estimateField(
      { metal: 'Co', oxidationState: 3, geometry: 'octahedral', ligands: { f: 6 }, isomer: null },
      defaultLibrary,
    )!;
    // 13 100 cm-1: F. A. Cotton and M. D. Meyers, J. Am. Chem. Soc. 82 (1960) 5023, from memory; f g alone gives 16 380.
    expect(Math.abs(field.fields.high.value! / 13_100 - 1)).toBeLessThan(0.06);
    expect(spinOf('Co', 3, { f: 6 }).probabilityHigh!).toBeGreaterThan(0.5);
  });

  it('planar d8 ions are low spin', () => {
    expect(spinOf('Ni', 2, { cyclam: 1 }, 'square-planar').state).toBe('low');
    expect(spinOf('Pt', 2, { cl: 4 }, 'square-planar').unpairedElectrons).toBe(0);
  });

  it('d3 has no choice in an octahedron', () => {
    expect(spinOf('Cr', 3, { nh3: 6 })).toMatchObject({ state: 'only', probabilityHigh: null, gap: null });
  });
});

describe('temperature', () => {
  it('favours high spin: low-spin to high-spin entropy of iron(II) is 50 to 80 J/(K mol)', () => {
    // Calorimetry, P. Gütlich and H. A. Goodwin, Top. Curr. Chem. 233 (2004), from memory.
    const { value } = spinEntropy(15, 1, 2);
    expect(value).toBeGreaterThan(50);
    expect(value).toBeLessThan(80);
  });

  it('raises the probability of high spin, and nothing else changes', () => {
    const cold = spinOf('Fe', 2, { ptz: 6 }, 'octahedral', 20);
    const warm = spinOf('Fe', 2, { ptz: 6 }, 'octahedral', 400);
    expect(warm.probabilityHigh!).toBeGreaterThan(cold.probabilityHigh!);
    expect(warm.gap!.value).toBe(cold.gap!.value);
  });
});
