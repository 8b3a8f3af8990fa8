import type { Band } from '../../transitions/types';
import type { BandWindow, ClearWindow } from '../wish/wish';
import { chanceOfAbsorptivity, chanceWithin } from './chance';

const chanceOf = (band: Band, window: BandWindow): number =>
  chanceWithin(band.energy_cm1, band.sigma_cm1, 1e7 / window.to_nm, 1e7 / window.from_nm) *
  chanceOfAbsorptivity(band.molarAbsorptivity, band.molarAbsorptivityRange, window.minMolarAbsorptivity ?? 0);

/** Without a wished strength, spin-forbidden bands are too weak to be meant. */
const counts = (band: Band, window: BandWindow): boolean =>
  window.minMolarAbsorptivity !== undefined || band.kind !== 'spin-forbidden';

/** Chance that some band has its centre in the window: that of the best one, since bands of one complex move together. */
export function bandInWindow(
  bands: readonly Band[],
  window: BandWindow,
): { readonly chance: number; readonly band: Band | null } {
  let best: { chance: number; band: Band | null } = { chance: 0, band: null };
  for (const band of bands) {
    if (!counts(band, window)) continue;
    const chance = chanceOf(band, window);
    if (chance > best.chance || best.band === null) best = { chance, band };
  }
  return best;
}

/**
 * Chance that no band rises above the allowed absorptivity within the window: a Gaussian of height ε stays above `max`
 * within half its width times sqrt(log2(ε/max)) of its centre. Bands count as independent.
 */
export function clearInWindow(bands: readonly Band[], window: ClearWindow): number {
  const low = 1e7 / window.to_nm;
  const high = 1e7 / window.from_nm;
  return bands.reduce((chance, band) => {
    const ratio = band.molarAbsorptivity / window.maxMolarAbsorptivity;
    if (ratio <= 1) return chance;
    const reach = (band.width_cm1 / 2) * Math.sqrt(Math.log2(ratio));
    return chance * (1 - chanceWithin(band.energy_cm1, band.sigma_cm1, low - reach, high + reach));
  }, 1);
}
