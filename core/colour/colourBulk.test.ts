import { describe, expect, it } from 'vitest';
import { SpinhueError } from '../errors';
import { emptyBandDraws } from '../transitions/bandDraws';
import { seeded } from '../testing/seeded';
import {
  chanceOfBand,
  chanceOfColour,
  colourBulk,
  colourCloud,
  colourOfSolution,
  hueSpread,
  medianDifference,
  tripleAt,
  wordsOfCloud,
} from './index';

const conditions = { concentration_mM: 50, path_cm: 1 };

/** Two bands of an octahedral chromium(III) kind and a third in the ultraviolet, with some spread. */
function draws(count: number, spread = 800) {
  const random = seeded(11);
  const made = emptyBandDraws(count, 3);
  for (let draw = 0; draw < count; draw++) {
    [
      [17_400, 3_600, 13],
      [24_500, 4_000, 15],
      [45_000, 5_000, 4_000],
    ].forEach(([energy, width, height], band) => {
      made.energy[3 * draw + band] = energy! + spread * random.normal();
      made.width[3 * draw + band] = width! * Math.exp(0.15 * random.normal());
      made.molarAbsorptivity[3 * draw + band] = height! * Math.exp(0.3 * random.normal());
    });
  }
  return made;
}

describe('colours of many draws', () => {
  it('are those of the single path, to a hundredth of L*a*b*', () => {
    const many = draws(50);
    const colours = colourBulk(many, conditions);
    for (let draw = 0; draw < many.count; draw++) {
      const bands = [0, 1, 2].map((band) => ({
        energy_cm1: many.energy[3 * draw + band]!,
        width_cm1: many.width[3 * draw + band]!,
        molarAbsorptivity: many.molarAbsorptivity[3 * draw + band]!,
      }));
      const one = colourOfSolution(bands, conditions);
      tripleAt(colours.lab, draw).forEach((value, index) =>
        expect(Math.abs(value - one.lab[index]!)).toBeLessThan(0.02),
      );
    }
  });

  it('are cheap: 200 draws of 3 bands well under a tenth of a second even on a busy machine', () => {
    const many = draws(200);
    colourBulk(many, conditions);
    const before = performance.now();
    for (let i = 0; i < 10; i++) colourBulk(many, conditions);
    expect((performance.now() - before) / 10).toBeLessThan(100);
  });

  it('are refused under conditions that cannot be', () => {
    expect(() => colourBulk(draws(1), { concentration_mM: -1, path_cm: 1 })).toThrow(SpinhueError);
    expect(() => colourBulk(draws(1), { concentration_mM: 1, path_cm: 0 })).toThrow(SpinhueError);
  });
});

describe('a cloud', () => {
  it('has a swatch with words for each draw, and the words by how often they occur', () => {
    const cloud = colourCloud(colourBulk(draws(200), conditions));
    expect(cloud.draws).toHaveLength(200);
    expect(cloud.words.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 10);
    expect(cloud.words.map(({ share }) => share)).toEqual(
      cloud.words.map(({ share }) => share).toSorted((a, b) => b - a),
    );
    for (const { srgb, words } of cloud.draws) {
      expect(srgb).toMatch(/^#[0-9a-f]{6}$/);
      expect(cloud.words.map((entry) => entry.words)).toContain(words);
    }
  });

  it('is wide for a chromium(III) kind of spectrum: one hue word is never the whole truth', () => {
    const wide = colourBulk(draws(200), conditions);
    expect(wordsOfCloud(wide).length).toBeGreaterThan(3);
    const { from, to } = hueSpread(wide)!;
    expect((to - from + 360) % 360).toBeGreaterThan(60);
  });

  it('shrinks with the doubt', () => {
    const arc = (spread: number): number => {
      const { from, to } = hueSpread(colourBulk(draws(200, spread), conditions))!;
      return (to - from + 360) % 360;
    };
    expect(arc(100)).toBeLessThan(arc(800));
  });

  it('of colourless draws has no hue', () => {
    expect(hueSpread(colourBulk(emptyBandDraws(20, 1), conditions))).toBeNull();
  });
});

describe('meeting a target', () => {
  it('is a share of draws: 0.38 for a window of half a standard deviation about the centre', () => {
    const random = seeded(5);
    const many = emptyBandDraws(4_000, 1);
    for (let draw = 0; draw < many.count; draw++) {
      many.energy[draw] = 20_000 + 1_000 * random.normal();
      many.width[draw] = 3_000;
      many.molarAbsorptivity[draw] = 10;
    }
    const chance = chanceOfBand(many, { from_nm: 1e7 / 20_500, to_nm: 1e7 / 19_500 });
    // erf(0.5 / sqrt 2) = 0.383; the standard error of 4 000 draws is 0.008.
    expect(Math.abs(chance - 0.383)).toBeLessThan(0.03);
  });

  it('asks for strength where it is stated', () => {
    const many = draws(100, 0);
    expect(chanceOfBand(many, { from_nm: 550, to_nm: 600 })).toBe(1);
    expect(chanceOfBand(many, { from_nm: 550, to_nm: 600, minMolarAbsorptivity: 1_000 })).toBe(0);
    expect(chanceOfBand(many, { from_nm: 620, to_nm: 640 })).toBe(0);
  });

  it('of a colour counts draws within the tolerance, not the distance of the mean', () => {
    const colours = colourBulk(draws(200), conditions);
    const target = tripleAt(colours.lab, 7);
    const near = chanceOfColour(colours, { lab: target, tolerance: 5 });
    const wide = chanceOfColour(colours, { lab: target, tolerance: 200 });
    expect(near).toBeGreaterThan(0);
    expect(near).toBeLessThan(0.5);
    expect(wide).toBe(1);
    expect(medianDifference(colours, target)).toBeGreaterThan(5);
  });
});
