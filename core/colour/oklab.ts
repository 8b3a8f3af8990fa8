import type { Triple } from './tristimulus';

/**
 * OKLab of linear sRGB channels, which may lie outside 0 to 1 (B. Ottosson, A perceptual color space for image
 * processing, 2020; matrices to the digits of CSS Color Module Level 4). Own code because gamut mapping runs it a dozen
 * times for each of the draws of a cloud.
 */
export function linearToOklab(r: number, g: number, b: number): Triple {
  const l = Math.cbrt(0.412221469470763 * r + 0.5363325372617348 * g + 0.0514459932675022 * b);
  const m = Math.cbrt(0.2119034958178252 * r + 0.6806995506452344 * g + 0.1073969535369406 * b);
  const s = Math.cbrt(0.0883024591900564 * r + 0.2817188391361215 * g + 0.6299787016738222 * b);
  return [
    0.210454268309314 * l + 0.7936177747023054 * m - 0.0040720430116193 * s,
    1.9779985324311684 * l - 2.4285922420485799 * m + 0.450593709617411 * s,
    0.0259040424655478 * l + 0.7827717124575296 * m - 0.8086757549230774 * s,
  ];
}

export function oklabToLinear(lightness: number, a: number, b: number): Triple {
  const l = cube(lightness + 0.3963377773761749 * a + 0.2158037573099136 * b);
  const m = cube(lightness - 0.1055613458156586 * a - 0.0638541728258133 * b);
  const s = cube(lightness - 0.0894841775298119 * a - 1.2914855480194092 * b);
  return [
    4.0767416360759574 * l - 3.3077115392580616 * m + 0.2309699031821044 * s,
    -1.2684379732850317 * l + 2.6097573492876887 * m - 0.3413193760026573 * s,
    -0.0041960761386756 * l - 0.7034186179359362 * m + 1.7076146940746117 * s,
  ];
}

const cube = (x: number): number => x * x * x;
