/**
 * exp(-4 ln 2 x²) from a table with straight lines between its points: off by less than 1e-6, and several times as
 * fast as the exponential, for the many draws of a cloud.
 */
const perUnit = 1024;
/** Table ends where the Gaussian is below 1e-10. */
export const gaussianReach = 2.9;
const values = Float64Array.from({ length: Math.ceil(gaussianReach * perUnit) + 2 }, (_, index) =>
  Math.exp(-4 * Math.LN2 * (index / perUnit) ** 2),
);

/** @param distance - from the centre in units of the full width at half height, 0 to `gaussianReach` */
export function tabulatedGaussian(distance: number): number {
  const place = distance * perUnit;
  const below = place | 0;
  const before = values[below]!;
  return before + (values[below + 1]! - before) * (place - below);
}
