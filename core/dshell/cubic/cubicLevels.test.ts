import { describe, expect, it } from 'vitest';
import { SpinhueError } from '../../errors';
import { levels as allLevels } from '../levels/levels';
import { cubicLevels } from './cubicLevels';
import { cubicBlocks } from './cubicBlocks';
import { groundCrossovers } from './groundCrossovers';

const octahedral = (dElectrons: number, tenDq: number, B: number, C: number) =>
  cubicLevels({ dElectrons, geometry: 'octahedral', tenDq, B, C });
const energies = (levels: ReturnType<typeof cubicLevels>, label: string): number[] =>
  levels.filter((level) => level.label === label).map((level) => level.energy);

describe('the strong-field matrices', () => {
  it('are those of Tanabe and Sugano for d2: 3T1 has -5B, 4B on the diagonal and 6B off it (J. Phys. Soc. Jpn 9, 753, 1954)', () => {
    const block = cubicBlocks(2).find(({ S, irrep }) => S === 1 && irrep === 'T1')!;
    expect(block.eCount).toEqual([0, 1]);
    expect(block.repulsionB[0]).toBeCloseTo(-5, 10);
    expect(block.repulsionB[3]).toBeCloseTo(4, 10);
    expect(Math.abs(block.repulsionB[1]!)).toBeCloseTo(6, 10);
  });

  it('are nowhere larger than 10 x 10 and hold every one of the C(10, N) states once', () => {
    const binomial = [1, 10, 45, 120, 210, 252, 210, 120, 45, 10];
    for (let n = 1; n <= 9; n++) {
      const blocks = cubicBlocks(n);
      expect(Math.max(...blocks.map(({ size }) => size))).toBeLessThanOrEqual(10);
      expect(blocks.reduce((sum, { size, degeneracy }) => sum + size * degeneracy, 0)).toBe(binomial[n]);
    }
  });
});

describe('levels of chromium(III) at 10Dq 17 400, B 725, C 2 900 cm-1', () => {
  const levels = octahedral(3, 17_400, 725, 2_900);

  it('satisfy the closed form of the three quartet bands: 10Dq and the roots of the 4T1 quadratic', () => {
    // Tanabe and Sugano 1954: the two 4T1g lie at (15B + 3·10Dq ∓ √((10Dq)² − 18·B·10Dq + 225B²))/2.
    const root = Math.sqrt(17_400 ** 2 - 18 * 725 * 17_400 + 225 * 725 ** 2);
    expect(energies(levels, '4T2g')[0]).toBeCloseTo(17_400, 6);
    expect(energies(levels, '4T1g')[0]).toBeCloseTo((15 * 725 + 3 * 17_400 - root) / 2, 6);
    expect(energies(levels, '4T1g')[1]).toBeCloseTo((15 * 725 + 3 * 17_400 + root) / 2, 6);
  });

  it('start from t2g3 and lift one electron in the first band', () => {
    expect(levels[0]).toMatchObject({ label: '4A2g', energy: 0, degeneracy: 4 });
    expect(levels[0]!.configurations[0]).toMatchObject({ t2: 3, e: 0 });
    expect(levels.find(({ label }) => label === '4T2g')!.configurations[0]).toMatchObject({ t2: 2, e: 1 });
  });

  it('have slopes that agree with differences of energies', () => {
    const step = 1e-2;
    const shifted = [
      octahedral(3, 17_400 + step, 725, 2_900),
      octahedral(3, 17_400, 725 + step, 2_900),
      octahedral(3, 17_400, 725, 2_900 + step),
    ];
    levels.forEach((level, i) => {
      const [byDq, byB, byC] = shifted.map((other) => (other[i]!.energy - level.energy) / step);
      expect(level.slope.tenDq).toBeCloseTo(byDq!, 3);
      expect(level.slope.B).toBeCloseTo(byB!, 3);
      expect(level.slope.C).toBeCloseTo(byC!, 3);
    });
  });
});

describe('ground-level changes', () => {
  it.each([
    // Read off the diagrams of Tanabe and Sugano 1954 at C/B = 4.5 to the precision of a diagram.
    [4, 27],
    [5, 28.4],
    [6, 19],
    [7, 21.2],
  ])('of d%i lie near 10Dq/B = %f', (n, expected) => {
    const [crossover, ...others] = groundCrossovers(n, 4.5);
    expect(others).toEqual([]);
    expect(Math.abs(crossover!.tenDqOverB - expected)).toBeLessThan(0.3);
    const x = crossover!.tenDqOverB;
    expect(octahedral(n, x - 1e-6, 1, 4.5)[0]!.multiplicity).toBe(crossover!.weak.multiplicity);
    expect(octahedral(n, x + 1e-6, 1, 4.5)[0]!.multiplicity).toBe(crossover!.strong.multiplicity);
  });

  it('do not exist for d1, d2, d3, d8 and d9 in an octahedral field', () => {
    for (const n of [1, 2, 3, 8, 9]) expect(groundCrossovers(n, 4.5)).toEqual([]);
  });
});

describe('the Trees correction', () => {
  it('agrees with the general engine and shifts each free-ion term by αL(L + 1) (R. E. Trees, Phys. Rev. 83, 756, 1951)', () => {
    const problem = { dElectrons: 4, tenDq: 12_000, B: 800, C: 3300, alpha: 70 };
    const general = allLevels({ ...problem, field: { type: 'oct', tenDq: 12_000 } }).levels;
    cubicLevels({ ...problem, geometry: 'octahedral' }).forEach(({ energy }, i) =>
      expect(energy).toBeCloseTo(general[i]!.energy, 6),
    );
    const free = cubicLevels({ ...problem, dElectrons: 2, tenDq: 0, geometry: 'octahedral' });
    const triplets = free.filter(({ multiplicity }) => multiplicity === 3);
    // 3P above 3F by 15B, less α(12 − 2).
    expect(triplets.at(-1)!.energy - triplets[0]!.energy).toBeCloseTo(15 * 800 - 700, 6);
  });
});

describe('bad input', () => {
  it.each([
    [{ dElectrons: 0 }, 'out-of-range', 'dElectrons'],
    [{ dElectrons: 2.5 }, 'out-of-range', 'dElectrons'],
    [{ tenDq: Number.NaN }, 'not-finite', 'tenDq'],
    [{ B: -1 }, 'out-of-range', 'B'],
    [{ C: Infinity }, 'not-finite', 'C'],
  ])('%j is refused as %s', (change, code, field) => {
    const problem = { dElectrons: 3, geometry: 'octahedral' as const, tenDq: 1e4, B: 700, C: 3e3, ...change };
    expect(() => cubicLevels(problem)).toThrow(SpinhueError);
    expect(() => cubicLevels(problem)).toThrow(expect.objectContaining({ code, field }) as Error);
  });
});
