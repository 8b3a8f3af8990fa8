import { fitField } from '../../measured/fieldFit/fitField';
import type { ParameterLibrary } from '../../library';
import { geometryIds, type Composition } from '../../record/composition';
import type { Uncertain } from '../../record/uncertain';
import type { MeasuredComplex } from '../measuredSet';

/** Field parameters that were found on one complex, and the library with which it is to be estimated. */
export interface Observation {
  readonly id: string;
  readonly composition: Composition;
  /** State that the spectrum belongs to; null where there is no choice or nobody says. */
  readonly spin: 'high' | 'low' | null;
  readonly tenDq: Uncertain | null;
  readonly B: Uncertain | null;
  readonly library: ParameterLibrary;
  readonly source: string;
}

/** Common practice: published 10Dq agree to some 2 %, B to some 5 %. */
export const usual = { tenDq: 0.02, B: 0.05 } as const;
/** Where the cubic level is an envelope of components, or the source says its values are soft. */
const soft = { tenDq: 0.05, B: 0.12 } as const;
const softFlags = ['low-symmetry', 'jahn-teller', 'values-soft', 'CT-masked', 'sources-differ'];

const withUsual = (value: number | null, share: number): Uncertain | null =>
  value === null ? null : { value, u: share * value };

/**
 * 10Dq and B of a published complex: the authors' own values where they gave some, else those of a field fit to its
 * bands. Null where neither can be had, as for charge transfer only.
 */
export function observationOf(complex: MeasuredComplex, dElectrons: number): Observation | null {
  const { metal, oxidationState, geometry, ligands, isomer } = complex.composition;
  if (
    typeof metal !== 'string' ||
    typeof oxidationState !== 'number' ||
    typeof ligands !== 'object' ||
    ligands === null ||
    !(geometryIds as readonly unknown[]).includes(geometry)
  ) {
    return null;
  }
  const composition: Composition = {
    metal,
    oxidationState,
    geometry: geometry as Composition['geometry'],
    ligands: ligands as Record<string, number>,
    isomer: typeof isomer === 'string' ? isomer : null,
  };
  const share = complex.flags.some((flag) => softFlags.includes(flag)) ? soft : usual;
  let tenDq = withUsual(complex.tenDq, share.tenDq);
  let B = withUsual(complex.racahB, share.B);
  // The distance of two components says nothing about repulsion.
  const split = complex.flags.includes('low-symmetry');
  const bands = complex.bands.filter((band) => /^spin-/.test(band.kind) && band.feature === 'max');
  const cubic = geometry === 'octahedral' || geometry === 'tetrahedral';
  if (cubic && bands.length > 0 && (tenDq === null || B === null) && dElectrons >= 1 && dElectrons <= 9) {
    try {
      const fit = fitField({
        dElectrons,
        geometry,
        metal,
        oxidationState,
        bands: bands.map((band) => ({ energy_cm1: band.energy_cm1, label: band.assignment })),
      });
      const usable = fit.warnings.length === 0 && fit.B.status !== 'held';
      if (tenDq === null && usable && fit.tenDq.value !== null) {
        tenDq = { value: fit.tenDq.value, u: Math.max(fit.tenDq.se ?? 0, share.tenDq * fit.tenDq.value) };
      }
      if (B === null && !split && usable && fit.B.status === 'fitted' && fit.B.value !== null) {
        B = { value: fit.B.value, u: Math.max(fit.B.se ?? 0, share.B * fit.B.value) };
      }
    } catch {
      // Bands that no level fits give no parameters; the complex is left out.
    }
  }
  if (tenDq === null && B === null) return null;
  const spin = complex.groundSpin === 'high' || complex.groundSpin === 'low' ? complex.groundSpin : null;
  return { id: complex.id, composition, spin, tenDq, B, library: complex.library, source: complex.formula };
}
