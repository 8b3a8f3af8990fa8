import type { Band } from '../types';

const fourLn2 = 4 * Math.LN2;
const isTransfer = ({ kind }: Band): boolean => kind !== 'spin-allowed' && kind !== 'spin-forbidden';

/** Absorption of the charge-transfer bands at a wavenumber, each moved to the red by its own doubt times `toTheRed`. */
const edgeAt = (place: number, transfer: readonly Band[], toTheRed: number): number =>
  transfer.reduce((sum, band) => {
    const from = (place - (band.energy_cm1 - toTheRed * band.sigma_cm1)) / band.width_cm1;
    return sum + band.molarAbsorptivity * Math.exp(-fourLn2 * from * from);
  }, 0);

export interface Hidden {
  readonly band: Band;
  /** `hidden` as predicted; `may be hidden` if the edge lies one standard deviation to the red. */
  readonly how: 'hidden' | 'may be hidden';
}

/**
 * d-d bands under the charge-transfer bands: where these absorb more at the centre than the band itself. Worked out by
 * overlap of the predicted spectra.
 */
export function hiddenBands(bands: readonly Band[]): Hidden[] {
  const transfer = bands.filter(isTransfer);
  if (transfer.length === 0) return [];
  return bands
    .filter((band) => !isTransfer(band))
    .flatMap((band): Hidden[] => {
      const drowned = (toTheRed: number): boolean =>
        edgeAt(band.energy_cm1, transfer, toTheRed) > band.molarAbsorptivity ||
        transfer.some(({ energy_cm1, sigma_cm1 }) => energy_cm1 - toTheRed * sigma_cm1 < band.energy_cm1);
      if (drowned(0)) return [{ band, how: 'hidden' }];
      return drowned(1) ? [{ band, how: 'may be hidden' }] : [];
    });
}
