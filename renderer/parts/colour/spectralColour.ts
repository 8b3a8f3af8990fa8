import { observers, visibleWavelengths_nm } from '../../../core/library/colourTables';

/** Ends of the strip; the tables of the standard observer begin and end there. */
export const visibleFrom_nm = 380;
export const visibleTo_nm = 780;

const { x: xBar, y: yBar, z: zBar } = observers['2deg'];
const step_nm = visibleWavelengths_nm[1]! - visibleWavelengths_nm[0]!;

/** Hue hardly changes beyond these, and a hue made of almost no light is noise. */
const hueFrom_nm = 420;
const hueTo_nm = 660;

/** The eye fades at both ends; a floor keeps the ends of the strip legible. */
const fade = (nm: number): number =>
  Math.max(0.35, Math.min(1, 0.35 + (nm - visibleFrom_nm) / 60, 0.35 + (visibleTo_nm - nm) / 110));

/** A little of the surround in every colour, so that a table of strips does not glare. */
const calm = 149;
const calming = 0.14;

const encoded = (linear: number): number =>
  Math.round(255 * (linear <= 0.0031308 ? 12.92 * linear : 1.055 * linear ** (1 / 2.4) - 0.055));

/**
 * `rgb(r g b)` that stands for light of wavelength `nm`, for orientation only: no screen can show spectral light. Hue of
 * the CIE 1931 observer, clipped to sRGB; beyond both ends of what the eye tells apart the hue stays and the light fades.
 */
export function spectralColour(nm: number): string {
  const at = Math.round((Math.max(hueFrom_nm, Math.min(hueTo_nm, nm)) - visibleFrom_nm) / step_nm);
  const [x, y, z] = [xBar[at]!, yBar[at]!, zBar[at]!];
  // IEC 61966-2-1, XYZ to linear sRGB.
  const rgb = [
    3.2406 * x - 1.5372 * y - 0.4986 * z,
    -0.9689 * x + 1.8758 * y + 0.0415 * z,
    0.0557 * x - 0.204 * y + 1.057 * z,
  ];
  const peak = Math.max(...rgb);
  const shown = rgb.map((value) => encoded((Math.max(0, value) / peak) * fade(nm)));
  return `rgb(${shown.map((value) => Math.round(value + (calm - value) * calming)).join(' ')})`;
}

/** The whole visible range from violet to red as a CSS gradient. */
export function spectrumGradient(direction = 'to right', step = 10): string {
  const stops: string[] = [];
  for (let nm = visibleFrom_nm; nm <= visibleTo_nm; nm += step) stops.push(spectralColour(nm));
  return `linear-gradient(${direction}, ${stops.join(', ')})`;
}
