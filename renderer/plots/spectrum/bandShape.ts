/** Gaussian in wavenumber with full width at half height `width_cm1`; never drawn in wavelength, where it is skewed. */
export const gaussian = (
  wavenumber_cm1: number,
  centre_cm1: number,
  width_cm1: number,
  height: number,
): number => height * Math.exp(-4 * Math.LN2 * ((wavenumber_cm1 - centre_cm1) / width_cm1) ** 2);

/** The band on a grid, cm⁻¹. */
export const bandCurve = (
  grid: ArrayLike<number>,
  band: { readonly centre: number; readonly width: number; readonly height: number },
): Float64Array => Float64Array.from(grid, (at) => gaussian(at, band.centre, band.width, band.height));
