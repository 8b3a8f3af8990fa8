import { leastSquares } from '../../numerics/leastSquares';

/** A polynomial about a centre, scaled so that its terms are of one size. */
export interface Polynomial {
  readonly centre: number;
  readonly scale: number;
  readonly coefficients: readonly number[];
}

export const polynomialAt = (line: Polynomial, x: number): number => {
  const t = (x - line.centre) / line.scale;
  return line.coefficients.reduceRight((sum, coefficient) => sum * t + coefficient, 0);
};

/** Least-squares polynomial of degree 0 to 2 through points. */
export function fitPolynomial(x: readonly number[], y: readonly number[], degree: number): Polynomial {
  const centre = x.reduce((sum, value) => sum + value, 0) / x.length;
  const scale = Math.max(...x.map((value) => Math.abs(value - centre))) || 1;
  const terms = degree + 1;
  const fit = leastSquares({
    points: x.length,
    start: new Array<number>(terms).fill(0),
    lower: new Array<number>(terms).fill(-Infinity),
    upper: new Array<number>(terms).fill(Infinity),
    evaluate(p, residuals, jacobian) {
      for (let i = 0; i < x.length; i++) {
        const t = (x[i]! - centre) / scale;
        let sum = 0;
        for (let k = 0, power = 1; k < terms; k++, power *= t) {
          sum += p[k]! * power;
          if (jacobian !== null) jacobian[i * terms + k] = power;
        }
        residuals[i] = sum - y[i]!;
      }
    },
  });
  return { centre, scale, coefficients: fit.parameters };
}

/** Apparent absorbance of scattering particles, `at500` (500 nm / lambda)^exponent. */
export interface Scatter {
  readonly at500: number;
  readonly exponent: number;
}

export const scatterAt = (scatter: Scatter, wavelength_nm: number): number =>
  scatter.at500 * (500 / wavelength_nm) ** scatter.exponent;

/**
 * Scatter through points where nothing absorbs. The exponent is 4 for particles much smaller than the wavelength
 * (Rayleigh) and falls towards 0 for large ones; null lets the points decide between 0 and 6.
 */
export function fitScatter(
  wavelength_nm: readonly number[],
  y: readonly number[],
  exponent: number | null,
): Scatter {
  const fit = leastSquares({
    points: y.length,
    start: [Math.max(0, y.reduce((sum, value) => sum + value, 0) / y.length), exponent ?? 4],
    lower: [0, exponent ?? 0],
    upper: [Infinity, exponent ?? 6],
    evaluate(p, residuals, jacobian) {
      for (let i = 0; i < y.length; i++) {
        const ratio = 500 / wavelength_nm[i]!;
        const shape = ratio ** p[1]!;
        residuals[i] = p[0]! * shape - y[i]!;
        if (jacobian !== null) {
          jacobian[2 * i] = shape;
          jacobian[2 * i + 1] = p[0]! * shape * Math.log(ratio);
        }
      }
    },
  });
  return { at500: fit.parameters[0]!, exponent: fit.parameters[1]! };
}
