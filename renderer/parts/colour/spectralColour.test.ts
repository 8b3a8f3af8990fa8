import { describe, expect, it } from 'vitest';
import { matchingFunctions, spectralColour, spectrumGradient } from './spectralColour';

describe('colours that stand for wavelengths', () => {
  // CIE 015:2018, table of the 1931 standard observer; the fit is stated to be good to a few hundredths.
  it.each([
    [450, 0.3362, 0.038, 1.7721],
    [500, 0.0049, 0.323, 0.272],
    [550, 0.4334, 0.995, 0.0087],
    [600, 1.0622, 0.631, 0.0008],
    [650, 0.2835, 0.107, 0.0],
  ])('follow the CIE 1931 observer at %i nm', (nm, x, y, z) => {
    const found = matchingFunctions(nm);
    [x, y, z].forEach((value, index) => expect(Math.abs(found[index]! - value)).toBeLessThan(0.04));
  });

  it('are blue at 450, green at 530, red at 640 nm and stay inside sRGB', () => {
    const channels = (nm: number) => spectralColour(nm).match(/\d+/g)!.map(Number);
    expect(Math.max(...channels(450))).toBe(channels(450)[2]);
    expect(Math.max(...channels(530))).toBe(channels(530)[1]);
    expect(Math.max(...channels(640))).toBe(channels(640)[0]);
    for (let nm = 380; nm <= 780; nm += 5) {
      for (const value of channels(nm)) {
        expect(value).toBeGreaterThanOrEqual(0);
        expect(value).toBeLessThanOrEqual(255);
      }
    }
  });

  it('make one gradient of 41 stops', () => {
    expect(spectrumGradient().match(/rgb/g)).toHaveLength(41);
  });
});
