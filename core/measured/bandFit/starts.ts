import { gaussian, type GaussianBand } from './model';

/** Repeatable fractions between -1 and 1 (multiples of the golden ratio), so that a fit gives the same answer each time. */
const fraction = (i: number): number => 2 * ((i * 0.6180339887498949) % 1) - 1;

/**
 * Further start values around the given ones: centres moved by up to a width, widths by a factor of up to 1.6, heights
 * read from the data at the new centres with what the other bands already account for taken off.
 */
export function otherStarts(
  start: readonly GaussianBand[],
  data: { readonly v: readonly number[]; readonly a: readonly number[] },
  count: number,
): GaussianBand[][] {
  const nearest = (v: number): number => {
    let best = 0;
    for (let i = 1; i < data.v.length; i++) {
      if (Math.abs(data.v[i]! - v) < Math.abs(data.v[best]! - v)) best = i;
    }
    return data.a[best]!;
  };
  return Array.from({ length: count }, (_, s) => {
    const reach = 0.25 + (0.5 * s) / Math.max(1, count - 1);
    const moved = start.map((band, k) => ({
      centre_cm1: band.centre_cm1 + reach * fraction(7 * s + 3 * k + 1) * band.fwhm_cm1,
      fwhm_cm1: band.fwhm_cm1 * 1.6 ** (fraction(5 * s + 2 * k + 2) * reach * 1.3),
      height: band.height,
    }));
    return moved.map((band, k) => {
      const others = moved.reduce(
        (sum, other, j) => (j === k ? sum : sum + gaussian(other, band.centre_cm1)),
        0,
      );
      return {
        ...band,
        height: Math.max(nearest(band.centre_cm1) - 0.5 * others, 0.1 * Math.abs(band.height)),
      };
    });
  });
}
