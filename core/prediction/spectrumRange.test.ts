import { describe, expect, it } from 'vitest';
import { spectrumRange } from './spectrumRange';
import { sharedNormals } from './sharedNormals';
import { emptyBandDraws } from '../transitions/bandDraws';

const grid = Float64Array.from({ length: 201 }, (_, index) => 15_000 + 50 * index);

describe('the range of a predicted spectrum', () => {
  it('is the curve itself where nothing is in doubt', () => {
    const draws = emptyBandDraws(3, 1);
    draws.energy.fill(20_000);
    draws.width.fill(3000);
    draws.molarAbsorptivity.fill(50);
    const { low, high } = spectrumRange(draws, grid);
    expect(low).toEqual(high);
    expect(low[100]).toBeCloseTo(50, 10);
    // A Gaussian is at half its height half a full width from the centre.
    expect(low[130]).toBeCloseTo(25, 10);
  });

  it('spans one standard deviation to each side where only the height varies (68-95-99.7 rule)', () => {
    const count = 4000;
    const draws = emptyBandDraws(count, 1);
    const normals = sharedNormals('a height in doubt', count);
    for (let draw = 0; draw < count; draw++) draws.molarAbsorptivity[draw] = 50 * (1 + 0.1 * normals[draw]!);
    draws.energy.fill(20_000);
    draws.width.fill(3000);
    const { low, high } = spectrumRange(draws, grid);
    expect((high[100]! - low[100]!) / 2 / 5).toBeGreaterThan(0.95);
    expect((high[100]! - low[100]!) / 2 / 5).toBeLessThan(1.05);
  });

  it('has nothing to say without draws', () => {
    expect(spectrumRange(emptyBandDraws(0, 2), grid).high.every((value) => value === 0)).toBe(true);
  });
});
