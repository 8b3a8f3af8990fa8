import { rankedAssignments } from './ranked';

export interface MeasuredBand {
  readonly energy_cm1: number;
  /** Standard uncertainty of the position. */
  readonly u_cm1: number;
  readonly molarAbsorptivity?: number | null;
}

/** What the matching needs of a predicted transition. */
export interface PredictedBand {
  readonly energy_cm1: number;
  readonly sigma_cm1: number;
  readonly label: string;
  readonly multiplicity: number | null;
  readonly molarAbsorptivity?: number | null;
}

export interface AssignedPair {
  /** Index among the predicted bands; null where the measured band is left without a partner. */
  readonly predicted: number | null;
  /** What the pair adds to the cost. */
  readonly cost: number;
  /** (measured - predicted) / combined standard deviation; null without a partner. */
  readonly z: number | null;
}

export interface BandAssignment {
  /** One entry per measured band. */
  readonly pairs: readonly AssignedPair[];
  /** Sum of z squared, of the misfit in strength, and of a fixed price for each band left alone. */
  readonly cost: number;
}

export interface AssignmentResult {
  /** The cheapest that keeps to what the user fixed; first of `alternatives`. */
  readonly best: BandAssignment;
  /** Cheapest first. */
  readonly alternatives: readonly BandAssignment[];
  /** What the user's choices cost above the cheapest assignment without them; zero where nothing is fixed. */
  readonly priceOfChoices: number;
}

export interface AssignmentOptions {
  /** Per measured band: a predicted index, null to leave it alone, undefined to let the matching decide. */
  readonly fixed?: readonly (number | null | undefined)[];
  /** How many alternatives to list; default 5. */
  readonly count?: number;
}

/** Leaving a band alone costs as much as being three standard deviations off. */
export const priceOfNone = 9;
/** Standard deviation of the decadic logarithm of a predicted molar absorptivity: a factor of five. */
const strengthSpread = 0.7;

function pairCost(measured: MeasuredBand, predicted: PredictedBand): { cost: number; z: number } {
  const z = (measured.energy_cm1 - predicted.energy_cm1) / Math.hypot(measured.u_cm1, predicted.sigma_cm1, 1);
  const [a, b] = [measured.molarAbsorptivity, predicted.molarAbsorptivity];
  const strength = a != null && b != null && a > 0 && b > 0 ? Math.log10(a / b) / strengthSpread : 0;
  return { cost: z * z + Math.min(strength * strength, 2 * priceOfNone), z };
}

function rank(
  measured: readonly MeasuredBand[],
  predicted: readonly PredictedBand[],
  fixed: AssignmentOptions['fixed'],
  count: number,
): BandAssignment[] {
  const costs = measured.map((band) => predicted.map((transition) => pairCost(band, transition)));
  const matrix = measured.map((_, i) => {
    const choice = fixed?.[i];
    const allowed = (j: number | null) => choice === undefined || choice === j;
    // A choice of the user stands whatever it costs: another row may not take its partner.
    const row = predicted.map((_, j) => (allowed(j) ? costs[i]![j]!.cost : Infinity));
    const alone = measured.map((_, k) => (k === i && allowed(null) ? priceOfNone : Infinity));
    return [...row, ...alone];
  });
  return rankedAssignments(matrix, count).map(({ columns, cost }) => ({
    cost,
    pairs: columns.map((j, i) =>
      j < predicted.length
        ? { predicted: j, cost: costs[i]![j]!.cost, z: costs[i]![j]!.z }
        : { predicted: null, cost: priceOfNone, z: null },
    ),
  }));
}

/**
 * Matches measured bands with predicted transitions one to one, so that the sum of squared deviations (positions in units
 * of their combined uncertainty, strengths as logarithms) is smallest, and lists the next best. Both users' choices and
 * bands without partner are respected. Two choices of one transition contradict each other: null comes back.
 */
export function assignBands(
  measured: readonly MeasuredBand[],
  predicted: readonly PredictedBand[],
  options: AssignmentOptions = {},
): AssignmentResult | null {
  const count = options.count ?? 5;
  const alternatives = rank(measured, predicted, options.fixed, count);
  const best = alternatives[0];
  if (best === undefined) return null;
  const free = options.fixed === undefined ? best : rank(measured, predicted, undefined, 1)[0]!;
  return { best, alternatives, priceOfChoices: Math.max(0, best.cost - free.cost) };
}
