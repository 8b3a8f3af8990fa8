import { convertLab65ToRgb, convertRgbToLab65, parseHex, serializeHex } from 'culori/fn';

type Lab = readonly [number, number, number];

const clip = (value: number): number => Math.max(0, Math.min(1, value));

/** `#rrggbb` of L*a*b* under D65, channels cut to what a screen shows. */
export function screenColour([l, a, b]: Lab): string {
  const rgb = convertLab65ToRgb({ l, a, b });
  return serializeHex({ mode: 'rgb', r: clip(rgb.r), g: clip(rgb.g), b: clip(rgb.b) });
}

/** L*a*b* under D65 of a colour that a screen shows; null for anything that is no `#rrggbb`. */
export function labOfScreenColour(hex: string): [number, number, number] | null {
  const rgb = parseHex(hex);
  if (!rgb) return null;
  const { l, a, b } = convertRgbToLab65(rgb);
  return [l, a, b].map((value) => Number(value.toFixed(2))) as [number, number, number];
}
