import { chromaAndHue } from '../../../core/colour/cieLab';
import { type SeenColour } from '../../../core/colour/types';

const whole = (value: number): string => String(Math.round(value)).replace('-', '−').replace(/^−0$/, '0');

/** L*a*b* and hex as written beside a swatch; whole units, since predictions are no finer. */
export const colourNumbers = (colour: SeenColour): { lab: string; hex: string } => ({
  lab: `L* ${whole(colour.lab[0])} a* ${whole(colour.lab[1])} b* ${whole(colour.lab[2])}`,
  hex: colour.srgb,
});

/** Below this chroma a hue angle is noise. */
const greyBelow = 6;

/** Colours in the order of the hue circle from red on, greys last, darker before lighter. */
export function sortedByHue(colours: readonly SeenColour[]): SeenColour[] {
  const rank = (colour: SeenColour): number => {
    const { hue, chroma } = chromaAndHue(colour.lab);
    return chroma < greyBelow ? 400 : Math.round(hue / 4);
  };
  return [...colours].sort((one, other) => rank(one) - rank(other) || one.lab[0] - other.lab[0]);
}
