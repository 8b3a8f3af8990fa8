import { describe, expect, it } from 'vitest';
import { illuminantIds, illuminants, observerIds, observers, visibleWavelengths_nm } from './colourTables';

const total = (column: readonly number[], power: readonly number[]): number =>
  column.reduce((sum, value, index) => sum + value * power[index]!, 0);

describe('observers and illuminants', () => {
  it('cover 380 to 780 nm in steps of 5 nm', () => {
    expect(visibleWavelengths_nm).toHaveLength(81);
    expect([visibleWavelengths_nm[0], visibleWavelengths_nm[80]]).toEqual([380, 780]);
    for (const id of illuminantIds) expect(illuminants[id].power).toHaveLength(81);
    for (const id of observerIds) expect(observers[id].y).toHaveLength(81);
  });

  // Chromaticities of CIE 15:2004 table T.3 (A, D65, D50) and of the FL and LED tables, from memory; 4 or 5 decimals.
  it.each([
    ['D65', '2deg', 0.31272, 0.32903],
    ['D65', '10deg', 0.31381, 0.33098],
    ['A', '2deg', 0.44758, 0.40745],
    ['A', '10deg', 0.45117, 0.40594],
    ['D50', '2deg', 0.34567, 0.35851],
    ['D50', '10deg', 0.34773, 0.35952],
    ['F2', '2deg', 0.3721, 0.3751],
    ['F11', '2deg', 0.3805, 0.3769],
    ['LED-B3', '2deg', 0.3756, 0.3723],
  ] as const)('give %s under the %s observer its published white point', (illuminant, observer, x, y) => {
    const { power } = illuminants[illuminant];
    const { x: xs, y: ys, z: zs } = observers[observer];
    const [X, Y, Z] = [total(xs, power), total(ys, power), total(zs, power)];
    expect(Math.abs(X / (X + Y + Z) - x)).toBeLessThan(6e-5);
    expect(Math.abs(Y / (X + Y + Z) - y)).toBeLessThan(6e-5);
  });

  it('sum to an equal-energy white, as the observers are made (CIE 15:2004)', () => {
    for (const id of observerIds) {
      const flat = visibleWavelengths_nm.map(() => 1);
      const { x, y, z } = observers[id];
      expect(total(x, flat) / total(y, flat)).toBeCloseTo(1, 3);
      expect(total(z, flat) / total(y, flat)).toBeCloseTo(1, 3);
    }
  });
});
