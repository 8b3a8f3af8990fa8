/**
 * Screen colours for wavelengths, for orientation only: no screen can show spectral light. They come from the
 * piecewise Gaussian fit to the CIE 1931 observer of C. Wyman, P.-P. Sloan and P. Shirley, J. Comput. Graph. Tech.
 * 2 (2), 2013, eq. 4, clipped to sRGB. Beyond both ends of what the eye tells apart the hue stays and the light fades.
 */
export const visibleFrom_nm = 380;
export const visibleTo_nm = 780;

const lobe = (nm: number, height: number, peak: number, below: number, above: number): number =>
  height * Math.exp(-0.5 * ((nm - peak) / (nm < peak ? below : above)) ** 2);

/** CIE 1931 colour-matching functions after Wyman et al. */
export const matchingFunctions = (nm: number): readonly [number, number, number] => [
  lobe(nm, 1.056, 599.8, 37.9, 31.0) +
    lobe(nm, 0.362, 442.0, 16.0, 26.7) +
    lobe(nm, -0.065, 501.1, 20.4, 26.2),
  lobe(nm, 0.821, 568.8, 46.9, 40.5) + lobe(nm, 0.286, 530.9, 16.3, 31.1),
  lobe(nm, 1.217, 437.0, 11.8, 36.0) + lobe(nm, 0.681, 459.0, 26.0, 13.8),
];

/** Hue hardly changes beyond these, and the fit above is not made for it. */
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

/** `rgb(r g b)` that stands for light of wavelength `nm`. */
export function spectralColour(nm: number): string {
  const [x, y, z] = matchingFunctions(Math.max(hueFrom_nm, Math.min(hueTo_nm, nm)));
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
