import { convertLrgbToRgb, convertRgbToLrgb, convertXyz65ToRgb } from 'culori/fn';
import { adapt, apply } from './chromaticAdaptation';
import { linearToOklab, oklabToLinear } from './oklab';
import type { Triple } from './tristimulus';

/** White of sRGB, x 0.3127 and y 0.3290 (IEC 61966-2-1), Y = 100. */
export const srgbWhite: Triple = [(100 * 0.3127) / 0.329, 100, (100 * (1 - 0.3127 - 0.329)) / 0.329];

/** Linear channels may leave 0 to 1 by this much and still count as shown: far below one step of a screen. */
const slack = 1e-4;

/** One just noticeable difference in OKLab, as the mapping of CSS Color 4 takes it. */
const noticeable = 0.02;

const clip = (value: number): number => Math.max(0, Math.min(1, value));
const clipped = ([r, g, b]: Triple): Triple => [clip(r), clip(g), clip(b)];
const hexPairs = Array.from({ length: 256 }, (_, value) => value.toString(16).padStart(2, '0'));
const step = (value: number): string => hexPairs[Math.round(255 * clip(value))]!;

/** `#rrggbb` of linear channels, each clipped to 0 to 1. */
function hexOf(linear: Triple): string {
  const [r, g, b] = clipped(linear);
  const rgb = convertLrgbToRgb({ r, g, b });
  return `#${step(rgb.r)}${step(rgb.g)}${step(rgb.b)}`;
}

function adaptedLinear(xyz: Triple, white: Triple): Triple {
  const [x, y, z] = adapt(xyz, white, srgbWhite);
  const { r, g, b } = convertRgbToLrgb(convertXyz65ToRgb({ x: x / 100, y: y / 100, z: z / 100 }));
  return [r, g, b];
}

/** Both steps are linear, so each white has one matrix; its columns are what becomes of X, Y and Z alone. */
const matrices = new WeakMap<Triple, readonly [Triple, Triple, Triple]>();

function matrixFor(white: Triple): readonly [Triple, Triple, Triple] {
  const known = matrices.get(white);
  if (known !== undefined) return known;
  const [X, Y, Z] = [
    adaptedLinear([100, 0, 0], white),
    adaptedLinear([0, 100, 0], white),
    adaptedLinear([0, 0, 100], white),
  ];
  const row = (channel: 0 | 1 | 2): Triple => [X[channel] / 100, Y[channel] / 100, Z[channel] / 100];
  const matrix = [row(0), row(1), row(2)] as const;
  matrices.set(white, matrix);
  return matrix;
}

/** Linear sRGB channels (0 to 1 inside the gamut) of XYZ under any white. */
export const linearSrgb = (xyz: Triple, white: Triple): Triple => apply(matrixFor(white), xyz);

export function isInSrgb([r, g, b]: Triple, within = slack): boolean {
  const [least, most] = [-within, 1 + within];
  return r >= least && r <= most && g >= least && g <= most && b >= least && b <= most;
}

/**
 * The nearest colour a screen can show: chroma in OKLCh is reduced until what clipping would still change cannot be
 * noticed (gamut mapping of CSS Color Module Level 4, section 13.2), so hue and lightness stay.
 */
export function reduceChroma(linear: Triple): Triple {
  if (isInSrgb(linear, 0)) return linear;
  const [lightness, a, b] = linearToOklab(...linear);
  if (lightness >= 1) return [1, 1, 1];
  if (lightness <= 0) return [0, 0, 0];
  const chroma = Math.hypot(a, b);
  let kept = 0;
  let refused = 1;
  while ((refused - kept) * chroma > 2e-4) {
    const share = (kept + refused) / 2;
    const candidate = oklabToLinear(lightness, share * a, share * b);
    const shown = clipped(candidate);
    const [l2, a2, b2] = linearToOklab(...shown);
    const change = (l2 - lightness) ** 2 + (a2 - share * a) ** 2 + (b2 - share * b) ** 2;
    if (change <= noticeable * noticeable) kept = share;
    else refused = share;
  }
  return clipped(oklabToLinear(lightness, kept * a, kept * b));
}

export interface DisplayColour {
  readonly inGamut: boolean;
  /** Chroma reduced where the colour lies outside sRGB. */
  readonly hex: string;
  /** Channels clipped one by one: for comparison with other programs only, since it can change the hue. */
  readonly hexClipped: string;
  readonly linear: Triple;
  readonly oklab: Triple;
}

/** How a screen shows XYZ seen by an eye that is adapted to `white`. */
export function displayColour(xyz: Triple, white: Triple): DisplayColour {
  const linear = linearSrgb(xyz, white);
  const inGamut = isInSrgb(linear);
  const hexClipped = hexOf(linear);
  return {
    inGamut,
    hex: inGamut ? hexClipped : hexOf(reduceChroma(linear)),
    hexClipped,
    linear,
    oklab: linearToOklab(...linear),
  };
}

/** Only the `#rrggbb` and whether it is in gamut, for many draws. */
export function displayHex(xyz: Triple, white: Triple): { readonly hex: string; readonly inGamut: boolean } {
  const linear = linearSrgb(xyz, white);
  const inGamut = isInSrgb(linear);
  return { hex: hexOf(inGamut ? linear : reduceChroma(linear)), inGamut };
}
