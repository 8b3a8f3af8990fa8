import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cubicLevels } from '../cubic/cubicLevels';
import { bulkBands, bulkRoom, levelSurface, readCurve } from './index';

describe('a level surface', () => {
  it('gives every level within the bound it states, and its derivatives', () => {
    fc.assert(
      fc.property(
        // Building a surface takes a moment: four ions stand for all.
        fc.constantFrom(
          [2, 'octahedral'] as const,
          [3, 'tetrahedral'] as const,
          [5, 'octahedral'] as const,
          [6, 'tetrahedral'] as const,
        ),
        fc.double({ min: 0, max: 60_000, noNaN: true }),
        fc.double({ min: 300, max: 1200, noNaN: true }),
        ([dElectrons, shape], tenDq, B) => {
          const surface = levelSurface(dElectrons, shape, 4.4);
          const exact = cubicLevels({ dElectrons, geometry: shape, tenDq, B, C: 4.4 * B });
          const readings = surface.curves.map((curve, c) => ({ curve, ...readCurve(surface, tenDq, B, c) }));
          readings.sort((a, b) => a.energy - b.energy);
          const ground = readings[0]!;
          const name = (multiplicity: number, irrep: string): string => `${multiplicity}${irrep}`;
          for (const label of new Set(exact.map(({ multiplicity, irrep }) => name(multiplicity, irrep)))) {
            const mine = readings.filter(({ curve }) => name(curve.multiplicity, curve.irrep) === label);
            const theirs = exact.filter(({ multiplicity, irrep }) => name(multiplicity, irrep) === label);
            theirs.forEach((level, k) => {
              const { energy, bound } = mine[k]!;
              const error = Math.abs(energy - ground.energy - level.energy);
              expect(error).toBeLessThanOrEqual(bound + ground.bound + 1e-6);
              expect(bound).toBeLessThan(2.1e-4 * B);
            });
          }
        },
      ),
      { numRuns: 60, seed: 5 },
    );
  });

  it('has slopes close to those of the exact levels away from avoided crossings', () => {
    const surface = levelSurface(3, 'octahedral', 4);
    const exact = cubicLevels({ dElectrons: 3, geometry: 'octahedral', tenDq: 17_400, B: 725, C: 2900 });
    const index = (irrep: string): number =>
      surface.curves.findIndex((c) => c.multiplicity === 4 && c.irrep === irrep && c.order === 0);
    const [first, ground] = ['T1', 'A2'].map((irrep) => readCurve(surface, 17_400, 725, index(irrep)));
    const wanted = exact.find(({ label }) => label === '4T1g')!.slope;
    expect(first!.slope.tenDq - ground!.slope.tenDq).toBeCloseTo(wanted.tenDq, 4);
    expect(first!.slope.B - ground!.slope.B).toBeCloseTo(wanted.B, 3);
    expect(first!.slope.C - ground!.slope.C).toBeCloseTo(wanted.C, 3);
  });
});

describe('bulk bands', () => {
  it('are the ground multiplicity, spin energies and first spin-allowed bands of the exact levels', () => {
    const fields = Array.from({ length: 200 }, (_, i) => 2000 + 150 * i);
    const B = fields.map((_, i) => 500 + 3 * i);
    const surface = levelSurface(6, 'octahedral', 4.6);
    const bulk = bulkBands(surface, fields, B);
    fields.forEach((tenDq, i) => {
      const exact = cubicLevels({ dElectrons: 6, geometry: 'octahedral', tenDq, B: B[i]!, C: 4.6 * B[i]! });
      const tolerance = bulk.bound[i]! + 1e-6;
      expect(tolerance).toBeLessThan(1);
      expect(bulk.groundMultiplicity[i]).toBe(exact[0]!.multiplicity);
      bulk.multiplicities.forEach((multiplicity, m) => {
        const lowest = exact.find((level) => level.multiplicity === multiplicity)!.energy;
        expect(Math.abs(bulk.spinEnergies[3 * i + m]! - lowest)).toBeLessThan(tolerance);
      });
      const allowed = exact.slice(1).filter((level) => level.multiplicity === exact[0]!.multiplicity);
      for (let b = 0; b < bulk.bandCount; b++) {
        const band = bulk.bands[i * bulk.bandCount + b]!;
        if (b >= allowed.length) expect(band).toBeNaN();
        else expect(Math.abs(band - allowed[b]!.energy)).toBeLessThan(tolerance);
      }
    });
  });

  it('computes directly beyond the table, with no interpolation error', () => {
    const surface = levelSurface(6, 'octahedral', 4.6);
    const bulk = bulkBands(surface, [90_000], [300], bulkRoom(surface, 1, 1));
    const exact = cubicLevels({ dElectrons: 6, geometry: 'octahedral', tenDq: 90_000, B: 300, C: 1380 });
    expect(bulk.bound[0]).toBe(0);
    expect(bulk.bands[0]).toBeCloseTo(
      exact.slice(1).find(({ multiplicity }) => multiplicity === 1)!.energy,
      6,
    );
  });
});
