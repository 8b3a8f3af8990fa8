import { describe, expect, it } from 'vitest';
import { SpinhueError } from '../errors';
import realSolutions from '../testing/colour/realSolutions.json';
import {
  chromaAndHue,
  colourAtThreeStrengths,
  colourInWords,
  colourOfPowder,
  colourOfSolution,
  fullShadeScale,
  viewingWeights,
} from './index';

const band = (energy_cm1: number, width_cm1: number, molarAbsorptivity: number) => ({
  energy_cm1,
  width_cm1,
  molarAbsorptivity,
});

describe('known solutions', () => {
  // Maxima and molar absorptivities from the source named in each case; widths are assumptions, so hue only.
  it.each(realSolutions.cases.map((entry) => [entry.species, entry] as const))(
    '%s has the hue that is reported',
    (_species, { bands, concentration_mM, path_cm, hue: [from, to] }) => {
      const { hue } = chromaAndHue(colourOfSolution(bands, { concentration_mM, path_cm }).lab);
      expect(hue).toBeGreaterThanOrEqual(from!);
      expect(hue).toBeLessThanOrEqual(to!);
    },
  );

  it.each([
    ['r_cu_aq', /blue/],
    ['r_ni_aq', /green/],
    ['r_mno4', /purple|violet/],
    ['r_cro4', /yellow/],
  ])('%s gets the word for it', (id, word) => {
    const { bands, concentration_mM, path_cm } = realSolutions.cases.find((entry) => entry.id === id)!;
    expect(colourOfSolution(bands, { concentration_mM, path_cm }).words).toMatch(word);
  });

  // [Ti(H2O)6]3+ absorbs green light at about 500 nm and is purple: common textbook fact.
  it('a solution that absorbs at 500 nm is seen purple to pink, never green', () => {
    const { lab, words } = colourOfSolution([band(20_000, 4_000, 5)], { concentration_mM: 200, path_cm: 1 });
    const { hue } = chromaAndHue(lab);
    expect(hue > 320 || hue < 30).toBe(true);
    expect(words).not.toMatch(/green/);
  });
});

describe('mistakes with colour', () => {
  it('absorbed light is not seen colour, and two bands do not follow a colour wheel', () => {
    // Bands at both ends of the visible leave the middle: green, though neither complement is green.
    const { lab } = colourOfSolution([band(14_500, 3_500, 14), band(25_000, 4_000, 16)], {
      concentration_mM: 60,
      path_cm: 1,
    });
    const { hue } = chromaAndHue(lab);
    expect(hue).toBeGreaterThan(110);
    expect(hue).toBeLessThan(190);
  });

  // A chromium(III) aqua-like spectrum at absorbance 0.2, 1 and 3 was computed as L* 89, 58 and 22 elsewhere.
  it('one swatch without its strength lies: lightness falls from about 90 to about 20 between A 0.2 and 3', () => {
    const bands = [band(17_400, 3_600, 13), band(24_500, 4_200, 15)];
    const at = (absorbance: number) =>
      colourOfSolution(bands, { concentration_mM: (1000 * absorbance) / 13, path_cm: 1 }).lab[0];
    expect(at(0.2)).toBeGreaterThan(85);
    expect(at(1)).toBeGreaterThan(50);
    expect(at(1)).toBeLessThan(65);
    expect(at(3)).toBeLessThan(30);
  });

  it('hue moves with concentration times path, which is why three strengths are shown', () => {
    // A green and a red window: thin it is yellow-green, thick it is brown.
    const bands = [band(17_200, 2_000, 13), band(23_500, 4_500, 20)];
    const three = colourAtThreeStrengths(bands, { concentration_mM: 160, path_cm: 1 });
    expect(three.map(({ factor }) => factor)).toEqual([1 / 3, 1, 3]);
    const hues = three.map(({ colour }) => chromaAndHue(colour.lab).hue);
    expect(Math.max(...hues) - Math.min(...hues)).toBeGreaterThan(50);
    expect(three[0]!.colour.words).toMatch(/yellow-green/);
    expect(three[2]!.colour.words).toMatch(/brown/);
    const lights = three.map(({ colour }) => colour.lab[0]);
    expect(lights[0]).toBeGreaterThan(lights[1]!);
    expect(lights[1]).toBeGreaterThan(lights[2]!);
  });

  it('millimolar is not molar: a factor of 1000 in strength is a factor of 1000 in density', () => {
    const bands = [band(20_000, 3_000, 10)];
    const thick = colourOfSolution(bands, { concentration_mM: 100, path_cm: 1 });
    const thin = colourOfSolution(bands, { concentration_mM: 0.1, path_cm: 1 });
    expect(thin.words).toBe('colourless');
    expect(thick.words).not.toBe('colourless');
    const long = colourOfSolution(bands, { concentration_mM: 10, path_cm: 10 });
    long.XYZ.forEach((value, index) => expect(value).toBeCloseTo(thick.XYZ[index]!, 10));
  });
});

describe('a clear cell', () => {
  it('is exactly the white of every lamp: L* 100 and no hue', () => {
    for (const illuminant of ['D65', 'A', 'D50', 'F2', 'F11', 'LED-B3'] as const) {
      for (const observer of ['2deg', '10deg'] as const) {
        const clear = colourOfSolution([], { concentration_mM: 10, path_cm: 1, illuminant, observer });
        expect(clear.lab[0]).toBeCloseTo(100, 10);
        expect(Math.hypot(clear.lab[1], clear.lab[2])).toBeLessThan(1e-9);
        expect(clear.srgb).toBe('#ffffff');
        expect(clear).toMatchObject({ illuminant, observer, words: 'colourless', inGamut: true });
      }
    }
  });
});

describe('conditions that cannot be', () => {
  const refusal = (act: () => unknown): SpinhueError => {
    try {
      act();
    } catch (error) {
      if (error instanceof SpinhueError) return error;
    }
    throw new Error('was accepted');
  };
  it.each([
    ['a negative concentration', { concentration_mM: -1, path_cm: 1 }, 'out-of-range', 'concentration_mM'],
    ['a path of 0', { concentration_mM: 1, path_cm: 0 }, 'out-of-range', 'path_cm'],
    [
      'a concentration that is no number',
      { concentration_mM: NaN, path_cm: 1 },
      'not-finite',
      'concentration_mM',
    ],
    ['an infinite path', { concentration_mM: 1, path_cm: Infinity }, 'not-finite', 'path_cm'],
  ] as const)('%s is refused with its field and a remedy', (_what, conditions, code, field) => {
    const error = refusal(() => colourOfSolution([], conditions));
    expect(error).toMatchObject({ code, field });
    expect(error.remedy).toMatch(/give a number/);
  });

  it('a lamp nobody knows is refused with the names of those that are known', () => {
    const candle = 'candle' as 'A';
    const error = refusal(() =>
      colourOfSolution([], { concentration_mM: 1, path_cm: 1, illuminant: candle }),
    );
    expect(error).toMatchObject({ code: 'unknown-field-value', field: 'illuminant' });
    expect(error.remedy).toMatch(/D65/);
  });

  it('a band without width is refused with its place in the list', () => {
    const error = refusal(() => colourOfSolution([band(20_000, 0, 1)], { concentration_mM: 1, path_cm: 1 }));
    expect(error.field).toBe('bands[0].width_cm1');
  });

  it('gives no NaN for a black or an extremely dense solution', () => {
    const { lab, words, srgb } = colourOfSolution([band(20_000, 30_000, 5e4)], {
      concentration_mM: 1e4,
      path_cm: 10,
    });
    expect([...lab].every(Number.isFinite)).toBe(true);
    expect([words, srgb]).toEqual(['black', '#000000']);
  });
});

describe('powders', () => {
  it('are white without bands, and at full shade reflect 15 % where they absorb most', () => {
    expect(colourOfPowder([], { scale: 1 }).words).toBe('white');
    const bands = [band(18_000, 3_000, 40)];
    const scale = fullShadeScale(bands);
    const { lab } = colourOfPowder(bands, { scale });
    expect(lab[0]).toBeLessThan(75);
    expect(fullShadeScale([])).toBe(0);
  });
});

describe('words', () => {
  // Screen primaries and named colours of CSS Color 4 as L*a*b* (D65), rounded.
  it.each([
    ['red', [53, 80, 67], /red/],
    ['orange', [75, 24, 79], /orange/],
    ['yellow', [97, -22, 94], /yellow/],
    ['lime', [88, -86, 83], /green/],
    ['teal', [48, -29, -8], /blue-green|greenish blue/],
    ['deepskyblue', [72, -18, -43], /blue/],
    ['royalblue', [48, 27, -65], /blue/],
    ['blueviolet', [42, 70, -75], /violet/],
    ['purple', [30, 59, -36], /purple/],
    ['hotpink', [65, 64, -11], /pink/],
    ['saddlebrown', [37, 26, 41], /brown/],
    ['grey', [54, 0, 0], /^grey$/],
    ['black', [0, 0, 0], /^black$/],
    ['lavenderblush', [96, 6, -1], /pale pink/],
  ] as const)('call the screen colour %s by its name', (_name, lab, words) => {
    expect(colourInWords(lab)).toMatch(words);
  });

  it('name every colour without gaps', () => {
    for (let L = 0; L <= 100; L += 5) {
      for (let hue = 0; hue < 360; hue += 3) {
        for (const chroma of [0, 5, 15, 40, 90]) {
          const angle = (hue * Math.PI) / 180;
          const words = colourInWords([L, chroma * Math.cos(angle), chroma * Math.sin(angle)]);
          expect(words).toMatch(/^[a-z -]{3,}$/);
        }
      }
    }
  });
});

describe('a weight table', () => {
  it('is made once per lamp and eye', () => {
    expect(viewingWeights({ illuminant: 'F11' })).toBe(
      viewingWeights({ illuminant: 'F11', observer: '2deg' }),
    );
  });
});
