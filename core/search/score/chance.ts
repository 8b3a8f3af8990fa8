import { normalCdf } from '../../spin';

/** Probability that a normally distributed quantity lies between two values. A sigma of 0 makes it a plain test. */
export function chanceWithin(value: number, sigma: number, low: number, high: number): number {
  if (sigma === 0) return value >= low && value <= high ? 1 : 0;
  return Math.max(0, normalCdf((high - value) / sigma) - normalCdf((low - value) / sigma));
}

/** The stated range of an absorptivity is read as holding 90 % of a log-normal distribution. */
const rangeInSigmas = 2 * 1.6448536;

/** Probability that a molar absorptivity given by its typical value and range is at least `least`. */
export function chanceOfAbsorptivity(
  typical: number,
  [low, high]: readonly [number, number],
  least: number,
): number {
  if (least <= 0) return 1;
  if (typical <= 0) return 0;
  const sigma = Math.log(high / low) / rangeInSigmas;
  if (!(sigma > 0)) return typical >= least ? 1 : 0;
  return normalCdf(Math.log(typical / least) / sigma);
}
