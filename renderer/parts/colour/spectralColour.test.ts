import { describe, expect, it } from 'vitest';
import { visibleWavelengths_nm } from '../../../core/library/colourTables';
import { spectralColour, spectrumGradient, visibleFrom_nm, visibleTo_nm } from './spectralColour';

describe('colours that stand for wavelengths', () => {
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

  it('cover the range of the observer tables', () => {
    expect([visibleWavelengths_nm[0], visibleWavelengths_nm.at(-1)]).toEqual([visibleFrom_nm, visibleTo_nm]);
  });

  it('make one gradient of 41 stops', () => {
    expect(spectrumGradient().match(/rgb/g)).toHaveLength(41);
  });
});
