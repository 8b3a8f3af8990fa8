import { wavelength_nm } from '../../units';
import { absorptivityRange, intensityWords, roundAbsorptivity } from '../intensity/intensityClass';
import type { Band } from '../types';

interface CtBand {
  readonly kind: 'LMCT' | 'MLCT' | 'intervalence' | 'ligand';
  readonly energy_cm1: number;
  readonly sigma_cm1: number;
  readonly label: string;
  readonly molarAbsorptivity: number;
  readonly width_cm1: number;
  readonly rule: string;
  readonly slopeTenDq?: number;
  readonly reasons: readonly string[];
}

/** A charge-transfer band with its range of strength filled in. */
export function ctBand({ rule, ...band }: CtBand): Band {
  const range = absorptivityRange(band.molarAbsorptivity, band.kind);
  return {
    ...band,
    wavelength_nm: wavelength_nm(band.energy_cm1),
    multiplicity: null,
    molarAbsorptivity: roundAbsorptivity(band.molarAbsorptivity),
    molarAbsorptivityRange: range,
    intensityClass: intensityWords(rule, range),
  };
}

/** Standard deviation of a charge-transfer band, cm⁻¹: with values of its own, and by analogy. */
export const ctSigma_cm1 = { own: 3000, analogy: 5000 } as const;
