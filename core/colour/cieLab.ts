import type { Triple } from './tristimulus';

/** CIE 15:2004, section 8.2.1: (24/116)³ and 841/108 exactly. */
const threshold = (24 / 116) ** 3;
const slope = 841 / 108;

const compressed = (ratio: number): number =>
  ratio > threshold ? Math.cbrt(ratio) : slope * ratio + 16 / 116;

/** CIE 1976 L*, a*, b* for any white (ISO/CIE 11664-4), into `out` at `at`; nothing is allocated. */
export function labInto(X: number, Y: number, Z: number, white: Triple, out: Float64Array, at = 0): void {
  const fx = compressed(X / white[0]);
  const fy = compressed(Y / white[1]);
  const fz = compressed(Z / white[2]);
  out[at] = 116 * fy - 16;
  out[at + 1] = 500 * (fx - fy);
  out[at + 2] = 200 * (fy - fz);
}

/**
 * CIE 1976 L*, a*, b*. The white must be the sum over the same grid as the sample, else a clear cell is not
 * (100, 0, 0).
 */
export function labFromXYZ([X, Y, Z]: Triple, white: Triple): Triple {
  const out = new Float64Array(3);
  labInto(X, Y, Z, white, out);
  return [out[0]!, out[1]!, out[2]!];
}

/** Chroma and hue angle (degrees, 0 to 360) of L*, a*, b*. */
export function chromaAndHue([, a, b]: Triple): { readonly chroma: number; readonly hue: number } {
  const hue = (Math.atan2(b, a) * 180) / Math.PI;
  return { chroma: Math.hypot(a, b), hue: hue < 0 ? hue + 360 : hue };
}

export const lchFromLab = (lab: Triple): Triple => {
  const { chroma, hue } = chromaAndHue(lab);
  return [lab[0], chroma, hue];
};

/** Smaller angle between two hues, 0 to 180 degrees. */
export function hueDistance(one: number, other: number): number {
  const apart = Math.abs(one - other) % 360;
  return apart > 180 ? 360 - apart : apart;
}
