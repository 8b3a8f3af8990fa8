/** Height, full width at half height and centre of one Gaussian in wavenumber. */
export interface GaussianBand {
  readonly centre_cm1: number;
  readonly fwhm_cm1: number;
  readonly height: number;
}

export type BaselineForm = 'none' | 'linear';

const fourLn2 = 4 * Math.LN2;

/** Value of one Gaussian band at a wavenumber. */
export const gaussian = (band: GaussianBand, wavenumber_cm1: number): number => {
  const t = (wavenumber_cm1 - band.centre_cm1) / band.fwhm_cm1;
  return band.height * Math.exp(-fourLn2 * t * t);
};

/** Where the wavenumbers begin and end: the baseline is a straight line b0 + b1 (v - low) / (high - low). */
export interface Span {
  readonly low: number;
  readonly high: number;
}

export const parametersPerBand = 3;

/** Parameter vector: centre, width, height of each band, then b0 and b1 where there is a baseline. */
export const toVector = (bands: readonly GaussianBand[], baseline: readonly number[]): number[] => [
  ...bands.flatMap((band) => [band.centre_cm1, band.fwhm_cm1, band.height]),
  ...baseline,
];

export const toBands = (p: ArrayLike<number>, count: number): GaussianBand[] =>
  Array.from({ length: count }, (_, k) => ({
    centre_cm1: p[3 * k]!,
    fwhm_cm1: p[3 * k + 1]!,
    height: p[3 * k + 2]!,
  }));

/** Sum of the bands and the baseline at one wavenumber; writes the derivatives into `slopes` unless null. */
export function sumOfBands(
  p: ArrayLike<number>,
  bandCount: number,
  span: Span,
  wavenumber: number,
  slopes: Float64Array | null,
  offset = 0,
): number {
  let sum = 0;
  for (let k = 0; k < bandCount; k++) {
    const j = parametersPerBand * k;
    const width = p[j + 1]!;
    const t = (wavenumber - p[j]!) / width;
    const shape = Math.exp(-fourLn2 * t * t);
    const value = p[j + 2]! * shape;
    sum += value;
    if (slopes !== null) {
      slopes[offset + j] = (value * 2 * fourLn2 * t) / width;
      slopes[offset + j + 1] = (value * 2 * fourLn2 * t * t) / width;
      slopes[offset + j + 2] = shape;
    }
  }
  const base = parametersPerBand * bandCount;
  if (p.length > base) {
    const u = (wavenumber - span.low) / (span.high - span.low);
    sum += p[base]! + p[base + 1]! * u;
    if (slopes !== null) {
      slopes[offset + base] = 1;
      slopes[offset + base + 1] = u;
    }
  }
  return sum;
}
