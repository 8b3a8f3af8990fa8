import { molarAbsorptivityAt } from './gaussian';
import type { SpectralBand } from './spectralBand';

/**
 * Where the summed curve has its maximum near the centre of one band, cm⁻¹: what an instrument reports as the band.
 * Overlap moves it away from the centre. Null where the curve has no maximum within half a width of the centre: the
 * band is only a shoulder.
 */
export function apparentMaximum_cm1(bands: readonly SpectralBand[], of: SpectralBand): number | null {
  const [from, to] = [of.energy_cm1 - of.width_cm1 / 2, of.energy_cm1 + of.width_cm1 / 2];
  const step = of.width_cm1 / 1000;
  let best: number | null = null;
  for (let place = from + step; place < to; place += step) {
    const here = molarAbsorptivityAt(place, bands);
    const isTop =
      here >= molarAbsorptivityAt(place - step, bands) && here > molarAbsorptivityAt(place + step, bands);
    if (isTop && (best === null || Math.abs(place - of.energy_cm1) < Math.abs(best - of.energy_cm1))) {
      best = place;
    }
  }
  return best;
}
