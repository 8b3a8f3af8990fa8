import { type SpectrumCurve } from './spectrumUnits';

/** Below 28 570 cm⁻¹ (above 350 nm) lie the bands that make the colour. */
const colourBelow_cm1 = 28_570;

function highest({ wavenumber_cm1, value }: SpectrumCurve, below: number): number {
  let top = 0;
  for (let index = 0; index < value.length; index++) {
    if (wavenumber_cm1[index]! <= below && value[index]! > top) top = value[index]!;
  }
  return top;
}

/**
 * Top of a linear axis. Charge transfer in the ultraviolet can be a thousand times stronger than the bands that make
 * the colour; the axis then follows the latter and `cutOff` says so. The upper end of the range counts too, up to twice
 * the curves: an extent must not flatten what it belongs to.
 */
export function absorptionTop(
  curves: readonly SpectrumCurve[],
  upper: SpectrumCurve | null = null,
): {
  readonly top: number;
  readonly cutOff: boolean;
} {
  const all = Math.max(0, ...curves.map((curve) => highest(curve, Infinity)));
  const colour = Math.max(0, ...curves.map((curve) => highest(curve, colourBelow_cm1)));
  const cutOff = colour > 0 && all > 4 * colour;
  const drawn = cutOff ? colour : all;
  const extent = upper ? highest(upper, cutOff ? colourBelow_cm1 : Infinity) : 0;
  const top = Math.max(drawn, Math.min(extent, 2 * drawn));
  return { top: top > 0 ? top * 1.12 : 1, cutOff };
}
