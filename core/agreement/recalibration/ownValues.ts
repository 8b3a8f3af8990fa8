import { complexKey, type ParameterValues } from '../../library';
import type { Uncertain } from '../../record/uncertain';
import { usual, type Observation } from './observations';

/**
 * Weighted mean of what was found on one complex. Values that scatter more than their own uncertainties explain make
 * the mean less sure by the ratio of the two (R. T. Birge, Phys. Rev. 40, 207, 1932).
 */
function combined(found: readonly Uncertain[], share: number): { value: number; sigma: number } {
  // Where nobody stated an uncertainty the usual one counts, lest the value outweigh all others.
  const weighed = found.map(({ value, u }) => ({ value, weight: (u || share * value) ** -2 }));
  const total = weighed.reduce((sum, { weight }) => sum + weight, 0);
  const mean = weighed.reduce((sum, { value, weight }) => sum + weight * value, 0) / total;
  const chi2 = weighed.reduce((sum, { value, weight }) => sum + weight * (value - mean) ** 2, 0);
  const birge = found.length > 1 ? Math.sqrt(chi2 / (found.length - 1)) : 1;
  return { value: mean, sigma: Math.max(1, birge) / Math.sqrt(total) };
}

/** What was measured on the complexes themselves: it beats every estimate of the same complex. */
export function ownValues(observations: readonly Observation[]): ParameterValues['values'] {
  const entries: [string, ParameterValues['values'][string]][] = [];
  const keyed = observations.map((each) => ({ ...each, key: complexKey(each.composition) }));
  for (const key of new Set(keyed.map((each) => each.key))) {
    const same = keyed.filter((each) => each.key === key);
    for (const quantity of ['tenDq', 'B'] as const) {
      const found = same.flatMap((each) => (each[quantity] === null ? [] : [each[quantity]]));
      if (found.length === 0) continue;
      const source = [...new Set(same.map((each) => each.source))].join('; ');
      entries.push([`complex.${key}.${quantity}`, { ...combined(found, usual[quantity]), source }]);
    }
  }
  return Object.fromEntries(entries);
}
