/** Student's t for a two-sided probability, by bisection on its distribution function (continued fraction after Lentz). */
export function studentT(probability: number, degreesOfFreedom: number): number {
  let [low, high] = [0, 1e4];
  for (let i = 0; i < 200; i++) {
    const middle = (low + high) / 2;
    if (twoSided(middle, degreesOfFreedom) < probability) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/** Probability that |t| stays below a value. */
function twoSided(t: number, nu: number): number {
  return 1 - regularisedBeta(nu / (nu + t * t), nu / 2, 0.5);
}

function logGamma(z: number): number {
  // C. Lanczos, SIAM J. Numer. Anal. B 1, 86 (1964), g = 7, n = 9.
  const c = [
    0.99999999999980993, 676.5203681218851, -1259.1392167224028, 771.32342877765313, -176.61502916214059,
    12.507343278686905, -0.13857109526572012, 9.9843695780195716e-6, 1.5056327351493116e-7,
  ];
  if (z < 0.5) return Math.log(Math.PI / Math.sin(Math.PI * z)) - logGamma(1 - z);
  const x = z - 1;
  const t = x + 7.5;
  const sum = c.reduce((total, value, i) => total + (i === 0 ? value : value / (x + i)), 0);
  return 0.5 * Math.log(2 * Math.PI) + (x + 0.5) * Math.log(t) - t + Math.log(sum);
}

/** Regularised incomplete beta function I_x(a, b) (Abramowitz and Stegun 26.5.8). */
export function regularisedBeta(x: number, a: number, b: number): number {
  if (x <= 0) return 0;
  if (x >= 1) return 1;
  if (x > (a + 1) / (a + b + 2)) return 1 - regularisedBeta(1 - x, b, a);
  const front =
    Math.exp(logGamma(a + b) - logGamma(a) - logGamma(b) + a * Math.log(x) + b * Math.log(1 - x)) / a;
  let [f, c, d] = [1, 1, 0];
  for (let i = 0; i <= 400; i++) {
    const m = Math.floor(i / 2);
    let numerator: number;
    if (i === 0) numerator = 1;
    else if (i % 2 === 0) numerator = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m));
    else numerator = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
    d = 1 / (1 + numerator * d || 1e-300);
    c = 1 + numerator / c || 1e-300;
    f *= c * d;
    if (Math.abs(1 - c * d) < 1e-14) break;
  }
  return front * (f - 1);
}

export interface LineFit {
  readonly slope: number;
  readonly intercept: number;
  readonly slopeSe: number;
  readonly interceptSe: number;
  readonly residual_sd: number;
  readonly rSquared: number;
  /** Value on the line, and half the width of the interval that a single new observation falls into. */
  readonly predict: (x: number, probability: number) => { readonly value: number; readonly half: number };
}

/** Straight line through at least three points by ordinary least squares; null for fewer or for equal x. */
export function fitLine(x: readonly number[], y: readonly number[]): LineFit | null {
  const n = x.length;
  if (n < 3) return null;
  const mx = x.reduce((sum, value) => sum + value, 0) / n;
  const my = y.reduce((sum, value) => sum + value, 0) / n;
  const sxx = x.reduce((sum, value) => sum + (value - mx) ** 2, 0);
  if (sxx === 0) return null;
  const sxy = x.reduce((sum, value, i) => sum + (value - mx) * (y[i]! - my), 0);
  const slope = sxy / sxx;
  const intercept = my - slope * mx;
  const rss = x.reduce((sum, value, i) => sum + (y[i]! - intercept - slope * value) ** 2, 0);
  const syy = y.reduce((sum, value) => sum + (value - my) ** 2, 0);
  const sd = Math.sqrt(rss / (n - 2));
  return {
    slope,
    intercept,
    slopeSe: sd / Math.sqrt(sxx),
    interceptSe: sd * Math.sqrt(1 / n + mx ** 2 / sxx),
    residual_sd: sd,
    rSquared: syy > 0 ? 1 - rss / syy : 1,
    predict: (at, probability) => ({
      value: intercept + slope * at,
      half: studentT(probability, n - 2) * sd * Math.sqrt(1 + 1 / n + (at - mx) ** 2 / sxx),
    }),
  };
}
