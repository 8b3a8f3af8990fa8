import { estimateField, type Estimate } from '../../estimation';
import { withParameterSet, type ParameterLibrary, type ParameterValues } from '../../library';
import type { Uncertain } from '../../record/uncertain';
import type { Observation } from './observations';

export type Quantity = 'tenDq' | 'B';

/** One observation as the update sees it, in logarithms. */
export interface Evidence {
  readonly observation: Observation;
  readonly measured: Uncertain;
  readonly predicted: number;
  /** ln measured - ln predicted. */
  readonly misfit: number;
  /** Relative variance of the measured value. */
  readonly variance: number;
  /** Change of ln predicted per prior standard deviation of each cause of doubt. */
  readonly sensitivity: ReadonlyMap<string, number>;
}

export const overlaid = (library: ParameterLibrary, values: ParameterValues['values']): ParameterLibrary =>
  Object.keys(values).length === 0 ? library : withParameterSet(library, { values }).library;

/** The estimate that a measured value is to be compared with: of the spin state it was found in. */
export function estimateOf(
  observation: Observation,
  quantity: Quantity,
  library: ParameterLibrary,
): Estimate | null {
  const field = estimateField(observation.composition, library);
  if (field === null) return null;
  if (quantity === 'B') return field.racahB;
  return observation.spin === null ? field.fields.middle : field.fields[observation.spin];
}

/** Evidence of all observations that have the quantity and an estimate of it. */
export function evidenceFor(observations: readonly Observation[], quantity: Quantity): Evidence[] {
  return observations.flatMap((observation): Evidence[] => {
    const measured = observation[quantity];
    if (measured === null || !(measured.value > 0)) return [];
    const estimate = estimateOf(observation, quantity, observation.library);
    if (estimate?.value == null || !(estimate.value > 0)) return [];
    const predicted = estimate.value;
    return [
      {
        observation,
        measured,
        predicted,
        misfit: Math.log(measured.value / predicted),
        variance: ((measured.u ?? 0) / measured.value) ** 2,
        sensitivity: new Map((estimate.shares ?? []).map(({ cause, sigma }) => [cause, sigma / predicted])),
      },
    ];
  });
}
