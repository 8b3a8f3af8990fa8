import { describe, expect, it } from 'vitest';
import { levels } from '../../../dshell';
import { fitField } from '../fitField';

const splitting = (fit: ReturnType<typeof fitField>, name: string): number =>
  fit.orbitals!.find((orbital) => orbital.name === name)!.energy_cm1;

describe('orbital energies in geometries without cubic symmetry', () => {
  // Square-planar tetrachlorocuprate(II), bands 12 500 (xy), 14 300 (xz, yz), 17 000 (z2) above x2-y2, as read for its
  // single crystals (P. Cassidy, M. A. Hitchman; from memory). For one hole the bands are orbital differences: arithmetic.
  it('of square-planar copper(II) are the band positions, with z2 lowest', () => {
    const fit = fitField({
      dElectrons: 9,
      geometry: 'square-planar',
      bands: [
        { energy_cm1: 12_500, label: '2B1g -> 2B2g' },
        { energy_cm1: 14_300, label: '2B1g -> 2Eg' },
        { energy_cm1: 17_000, label: '2B1g -> 2A1g' },
      ],
    });
    expect(splitting(fit, 'x2-y2')).toBeCloseTo(14_300, 2);
    expect(splitting(fit, 'xy')).toBeCloseTo(14_300 - 12_500, 2);
    expect(splitting(fit, 'z2')).toBeCloseTo(14_300 - 17_000, 2);
    expect(fit.tenDq.value).toBeCloseTo(12_500, 2);
    expect(fit.groundTerm).toBe('2B1g');
    expect([fit.B.value, fit.C.value]).toEqual([null, null]);
  });

  it('and B of a tetragonal d8 ion are recovered from the exact levels they give', () => {
    const field = { type: 'tetragonal', tenDq: 11_000, Ds: 350, Dt: 250 } as const;
    const exact = levels({ dElectrons: 8, B: 850, C: 3825, field }).levels;
    const triplets = exact.filter((level) => level.multiplicity === 3 && level.energy > 1);
    const fit = fitField({
      dElectrons: 8,
      geometry: 'tetragonal',
      bands: triplets.map((level) => ({
        energy_cm1: level.energy,
        label: `3B1g -> 3${level.label}`,
        se_cm1: 50,
      })),
    });
    expect(fit.rms_cm1).toBeLessThan(1);
    expect(fit.tenDq.value!).toBeCloseTo(11_000, -1);
    expect(fit.B.value!).toBeCloseTo(850, 0);
    // E(x2-y2) - E(z2) = 4 Ds + 5 Dt (C. J. Ballhausen, Introduction to Ligand Field Theory, 1962).
    expect(splitting(fit, 'x2-y2') - splitting(fit, 'z2')).toBeCloseTo(4 * 350 + 5 * 250, -1);
  });

  it('of a trigonal-bipyramidal d9 ion come in two steps, and 10Dq is said to have no meaning', () => {
    const fit = fitField({
      dElectrons: 9,
      geometry: 'trigonal-bipyramidal',
      bands: [{ energy_cm1: 9000 }, { energy_cm1: 13_000 }],
    });
    expect(splitting(fit, 'z2')).toBeCloseTo(13_000, 1);
    expect(splitting(fit, 'x2-y2, xy')).toBeCloseTo(4000, 1);
    expect(fit.notDetermined.join()).toMatch(/10Dq: has no meaning/);
  });

  it('are scaled as a whole where one band is all there is', () => {
    const fit = fitField({
      dElectrons: 8,
      geometry: 'square-planar',
      bands: [{ energy_cm1: 22_472 }],
      groundMultiplicity: 1,
    });
    expect(fit.notDetermined.join()).toMatch(/too few bands/);
    expect(fit.B.status).toBe('held');
    expect(fit.assignment[0]!.residual_cm1).toBeCloseTo(0, 2);
  });

  it('are not made up for a geometry without a pattern', () => {
    expect(() => fitField({ dElectrons: 3, geometry: 'dodecahedral', bands: [{ energy_cm1: 1e4 }] })).toThrow(
      /no field can be fitted/,
    );
  });
});
