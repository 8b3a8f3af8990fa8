import { fourLn2 } from '../spectrum/gaussian';
import type { BandDraws } from '../transitions/bandDraws';

/** Beyond this many full widths from its centre a Gaussian is below 1e-10 of its height. */
const reach = 2.9;
const tail = 0.16;

/**
 * Between which molar absorptivities (L mol⁻¹ cm⁻¹) the middle 68 % of the draws lie, point by point.
 *
 * @param wavenumbers_cm1 - ascending, in any steps
 */
export function spectrumRange(
  draws: BandDraws,
  wavenumbers_cm1: Float64Array,
): { readonly low: Float64Array; readonly high: Float64Array } {
  const { count, bandCount, energy, width, molarAbsorptivity } = draws;
  const points = wavenumbers_cm1.length;
  const curves = new Float64Array(count * points);
  for (let draw = 0; draw < count; draw++) {
    for (let band = draw * bandCount; band < (draw + 1) * bandCount; band++) {
      const [centre, fullWidth, height] = [energy[band]!, width[band]!, molarAbsorptivity[band]!];
      const steepness = fourLn2 / (fullWidth * fullWidth);
      const end = centre + reach * fullWidth;
      for (
        let point = firstAtLeast(wavenumbers_cm1, centre - reach * fullWidth);
        point < points && wavenumbers_cm1[point]! <= end;
        point++
      ) {
        const away = wavenumbers_cm1[point]! - centre;
        curves[point * count + draw]! += height * Math.exp(-steepness * away * away);
      }
    }
  }
  const [low, high] = [new Float64Array(points), new Float64Array(points)];
  if (count === 0) return { low, high };
  for (let point = 0; point < points; point++) {
    const sorted = curves.subarray(point * count, (point + 1) * count).sort();
    low[point] = sorted[Math.round(tail * (count - 1))]!;
    high[point] = sorted[Math.round((1 - tail) * (count - 1))]!;
  }
  return { low, high };
}

function firstAtLeast(ascending: Float64Array, value: number): number {
  let [from, to] = [0, ascending.length];
  while (from < to) {
    const middle = (from + to) >> 1;
    if (ascending[middle]! < value) from = middle + 1;
    else to = middle;
  }
  return from;
}
