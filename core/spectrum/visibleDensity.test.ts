import { describe, expect, it } from 'vitest';
import { seeded } from '../testing/seeded';
import { addVisibleBand, densityToTransmittance } from './visibleDensity';
import { visibleCount, visibleTransmission } from './index';

describe('the fast path to transmitted light', () => {
  it('agrees with the exact one to 1e-3 of transmittance, whatever the bands', () => {
    const random = seeded(3);
    for (let round = 0; round < 200; round++) {
      const bands = Array.from({ length: 1 + random.below(8) }, () => ({
        energy_cm1: 5_000 + 45_000 * random.next(),
        width_cm1: 80 + 6_000 * random.next(),
        molarAbsorptivity: 10 ** (5 * random.next() - 1),
      }));
      const density = new Float64Array(visibleCount);
      for (const { energy_cm1, width_cm1, molarAbsorptivity } of bands) {
        addVisibleBand(density, energy_cm1, width_cm1, 0.01 * Math.LN10 * molarAbsorptivity);
      }
      densityToTransmittance(density);
      visibleTransmission(bands, 10, 1).forEach((share, point) =>
        expect(Math.abs(share - density[point]!)).toBeLessThan(1e-3),
      );
    }
  });

  it('lets everything through without bands and nothing through a wall', () => {
    const density = new Float64Array(visibleCount);
    densityToTransmittance(density);
    expect([...density].every((share) => share === 1)).toBe(true);
    density.fill(0);
    addVisibleBand(density, 20_000, 60_000, 1_000);
    densityToTransmittance(density);
    expect(Math.max(...density)).toBe(0);
  });
});
