import { describe, expect, it } from 'vitest';
import { thermalFactor, thermalWidth, vibronicGain } from './index';

describe('vibrations', () => {
  // coth(hν/2kT) with ν = 250 cm-1: arithmetic.
  it('of 250 cm-1 make a vibronic band 1.86 times its zero-point strength at 300 K and 1.02 at 77 K', () => {
    expect(thermalFactor(250, 300)).toBeCloseTo(1.86, 2);
    expect(thermalFactor(250, 77)).toBeCloseTo(1.02, 2);
    expect(Math.sqrt(thermalFactor(250, 300))).toBeCloseTo(1.37, 1);
  });

  it('are counted from room temperature', () => {
    expect(vibronicGain(298.15)).toBe(1);
    expect(thermalWidth(298.15)).toBe(1);
    expect(vibronicGain(77)).toBeCloseTo(0.55, 2);
    expect(vibronicGain(400)).toBeGreaterThan(1.2);
  });
});
