import { complexKey, type ParameterValues } from '../../library';
import { quantile } from '../summary';
import { evidenceFor, estimateOf, overlaid, type Evidence, type Quantity } from './evidence';
import type { Observation } from './observations';
import { ownValues } from './ownValues';
import { asValues, proposeChanges, type ParameterChange, type Proposal } from './proposal';

/** Relative errors (differences of logarithms) of one quantity. */
export interface ErrorPair {
  readonly n: number;
  /** Root mean square before and after. */
  readonly before: number;
  readonly after: number;
  readonly medianBefore: number;
  readonly medianAfter: number;
}

export interface PartResult {
  readonly quantity: Quantity;
  readonly changes: readonly ParameterChange[];
  readonly outliers: Proposal['outliers'];
  /** Each complex predicted from all others, with the literature alone and with the recalibration. */
  readonly leaveOneOut: ErrorPair | null;
  /** Complexes that had no part in the recalibration. */
  readonly check: ErrorPair | null;
  readonly adopt: boolean;
  /** Why it is proposed or declined, for a person. */
  readonly statement: string;
}

export interface Recalibration {
  readonly parts: readonly PartResult[];
  /** Values of the parts that are proposed, for a new parameter set; empty where both are declined. */
  readonly values: ParameterValues['values'];
  /** Values of the measured complexes themselves, which need no vote: they were measured. */
  readonly measuredComplexes: ParameterValues['values'];
}

export interface RecalibrateOptions {
  /** Observations kept out, to see whether the recalibration helps where it has not looked. */
  readonly check?: readonly Observation[];
  /** Called between complexes of the leave-one-out loop; a throw ends the work. */
  readonly onProgress?: (done: number, of: number) => void;
}

const rms = (values: readonly number[]): number =>
  Math.sqrt(values.reduce((sum, value) => sum + value * value, 0) / values.length);

function errorPair(before: readonly number[], after: readonly number[]): ErrorPair | null {
  if (before.length === 0) return null;
  const size = (values: readonly number[]) => quantile(values.map(Math.abs), 0.5);
  return {
    n: before.length,
    before: rms(before),
    after: rms(after),
    medianBefore: size(before),
    medianAfter: size(after),
  };
}

/** ln measured - ln predicted with a set of values laid over the library. */
function misfitWith(
  observation: Observation,
  quantity: Quantity,
  values: ParameterValues['values'],
): number | null {
  const measured = observation[quantity];
  const estimate = estimateOf(observation, quantity, overlaid(observation.library, values));
  if (measured === null || estimate?.value == null || !(estimate.value > 0)) return null;
  return Math.log(measured.value / estimate.value);
}

/** All copies of one complex are left out together: a duplicate would give the answer away. */
function leaveOneOut(
  evidence: readonly Evidence[],
  quantity: Quantity,
  options: RecalibrateOptions,
): ErrorPair | null {
  const keyOf = (each: Evidence) => complexKey(each.observation.composition);
  const before: number[] = [];
  const after: number[] = [];
  for (const [i, each] of evidence.entries()) {
    options.onProgress?.(i, evidence.length);
    const others = evidence.filter((other) => keyOf(other) !== keyOf(each));
    const values = asValues(proposeChanges(others).changes, 'leave-one-out');
    const misfit = misfitWith(each.observation, quantity, values);
    if (misfit === null) continue;
    before.push(each.misfit);
    after.push(misfit);
  }
  return errorPair(before, after);
}

const percent = (value: number): string => `${(100 * value).toPrecision(3)} %`;
const nameOf = { tenDq: '10Dq', B: 'B' } as const;

/** The error must fall by at least this share: less is not worth a change of parameters. */
const worthwhile = 0.01;

/** Fewest complexes that a recalibration may rest on. */
export const fewestComplexes = 4;

function judge(
  quantity: Quantity,
  count: number,
  loo: ErrorPair | null,
  check: ErrorPair | null,
): { adopt: boolean; statement: string } {
  const name = nameOf[quantity];
  if (count < fewestComplexes || loo === null) {
    return {
      adopt: false,
      statement: `${name}: ${count} ${count === 1 ? 'complex' : 'complexes'} with an estimate; fewer than ${fewestComplexes} decide nothing`,
    };
  }
  const words = `leave-one-out error of ${name} over ${loo.n} complexes ${percent(loo.before)} before, ${percent(loo.after)} after`;
  if (!(loo.after < (1 - worthwhile) * loo.before)) {
    const why =
      loo.after < loo.before
        ? 'too small a gain for a change of parameters'
        : 'the literature predicts these complexes better than the others of the record do';
    return { adopt: false, statement: `declined: ${words}; ${why}` };
  }
  if (check !== null && !(check.after < check.before)) {
    return {
      adopt: false,
      statement: `declined: ${words}, but on ${check.n} complexes kept out the error does not fall (${percent(check.before)} before, ${percent(check.after)} after)`,
    };
  }
  const kept =
    check === null
      ? ''
      : `; on ${check.n} complexes kept out ${percent(check.before)} before, ${percent(check.after)} after`;
  return { adopt: true, statement: `proposed: ${words}${kept}` };
}

function part(
  observations: readonly Observation[],
  quantity: Quantity,
  options: RecalibrateOptions,
): PartResult {
  const evidence = evidenceFor(observations, quantity);
  const { changes, outliers } = proposeChanges(evidence);
  const loo = leaveOneOut(evidence, quantity, options);
  const values = asValues(changes, 'recalibration');
  const kept = evidenceFor(options.check ?? [], quantity).flatMap((each) => {
    const after = misfitWith(each.observation, quantity, values);
    return after === null ? [] : [{ before: each.misfit, after }];
  });
  const check = errorPair(
    kept.map((each) => each.before),
    kept.map((each) => each.after),
  );
  return {
    quantity,
    changes,
    outliers,
    leaveOneOut: loo,
    check,
    ...judge(quantity, evidence.length, loo, check),
  };
}

/**
 * Recalibrates f, g (from 10Dq) and h, k (from B) with the complexes of a record, each part on its own. A part is
 * declined where complexes are not predicted better from each other than from the literature. Nothing is changed: the
 * result is a proposal with the differences to approve.
 */
export function recalibrate(
  observations: readonly Observation[],
  options: RecalibrateOptions = {},
): Recalibration {
  const parts = (['tenDq', 'B'] as const).map((quantity) => part(observations, quantity, options));
  const adopted = parts.filter((each) => each.adopt).flatMap((each) => each.changes);
  return {
    parts,
    values: asValues(adopted, 'recalibration'),
    measuredComplexes: ownValues(observations),
  };
}
