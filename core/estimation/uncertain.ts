import type { DoubtShare, Estimate, EstimateRoute, Reason } from './types';

/** Root of the sum of squares. */
export const quadrature = (parts: readonly number[]): number =>
  Math.sqrt(parts.reduce((sum, part) => sum + part * part, 0));

/** Adds up shares that name the same cause. */
export function mergeShares(shares: readonly DoubtShare[]): DoubtShare[] {
  const byCause = new Map<string, number>();
  for (const { cause, sigma } of shares) byCause.set(cause, (byCause.get(cause) ?? 0) + sigma);
  return [...byCause].filter(([, sigma]) => sigma !== 0).map(([cause, sigma]) => ({ cause, sigma }));
}

export function estimate(
  value: number,
  shares: readonly DoubtShare[],
  route: EstimateRoute,
  reasons: readonly Reason[],
): Estimate {
  const merged = mergeShares(shares);
  return {
    value,
    sigma: quadrature(merged.map(({ sigma }) => sigma)),
    unit: 'cm-1',
    route,
    reasons,
    shares: merged,
  };
}

export const notEstimated = (because: string, settle?: string): Estimate => ({
  value: null,
  sigma: null,
  unit: 'cm-1',
  route: 'not-estimated',
  reasons: [
    { kind: 'doubt', text: `not estimated, because ${because}` },
    ...(settle === undefined ? [] : [{ kind: 'settle' as const, text: settle }]),
  ],
  shares: [],
});

/** Covariance of two estimates through the causes of doubt they share, cm⁻². */
export function covariance(one: Estimate, other: Estimate): number {
  const byCause = new Map((other.shares ?? []).map(({ cause, sigma }) => [cause, sigma]));
  return (one.shares ?? []).reduce((sum, { cause, sigma }) => sum + sigma * (byCause.get(cause) ?? 0), 0);
}

/** Standard deviation of `one - other`: shared causes cancel, so relatives differ by less than they are uncertain. */
export function differenceSigma(one: Estimate, other: Estimate): number | null {
  if (one.sigma === null || other.sigma === null) return null;
  const variance = one.sigma ** 2 + other.sigma ** 2 - 2 * covariance(one, other);
  return Math.sqrt(Math.max(0, variance));
}

const order: readonly EstimateRoute[] = [
  'measured-complex',
  'measured-relative',
  'metal-specific',
  'published-factors',
  'donor-class',
  'series-place',
  'free-ion',
  'not-estimated',
];

/** The least trusted of several routes. */
export const weakestRoute = (routes: readonly EstimateRoute[]): EstimateRoute =>
  routes.reduce((worst, route) => (order.indexOf(route) > order.indexOf(worst) ? route : worst), order[0]!);
