import { complexKey } from '../../library';
import type { ParameterSet } from '../../record/project';
import type { Observation } from './observations';

/**
 * The set that a recalibration may start from: the one in use, or the nearest of its ancestors that none of these
 * complexes has informed. Null for the library as it is. A measurement that counted once in the values to start from and
 * again as evidence would count twice.
 */
export function basisFor(
  observations: readonly Pick<Observation, 'composition'>[],
  inUse: ParameterSet | null,
  sets: readonly ParameterSet[],
): ParameterSet | null {
  const keys = new Set(observations.map(({ composition }) => complexKey(composition)));
  const passed = new Set<string>();
  let set = inUse;
  while (set !== null && !passed.has(set.id) && (set.informedBy ?? []).some((key) => keys.has(key))) {
    const { id, parentId } = set;
    passed.add(id);
    set = sets.find((each) => each.id === parentId) ?? null;
  }
  return set === null || passed.has(set.id) ? null : set;
}
