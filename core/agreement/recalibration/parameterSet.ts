import { complexKey, type ParameterValues } from '../../library';
import { parameterHash } from '../../record/hash';
import type { ParameterSet } from '../../record/project';
import type { Observation } from './observations';
import type { Recalibration } from './recalibrate';

export interface Adoption {
  readonly id: string;
  readonly projectId: string;
  readonly name: string;
  readonly author: string;
  readonly reason: string;
  /** ISO 8601 UTC. */
  readonly at: string;
  readonly libraryVersion: string;
  /** Set in use so far; its values stay where the recalibration says nothing. */
  readonly parent: ParameterSet | null;
  /** Keys that the user took out of the proposal. */
  readonly without?: ReadonlySet<string>;
  /** Whether values measured on the complexes themselves are kept too; they beat every estimate of those complexes. */
  readonly keepMeasuredComplexes: boolean;
}

/** A new parameter set from an approved recalibration. The parent and all predictions made with it stay as they are. */
export function parameterSetFrom(
  recalibration: Recalibration,
  observations: readonly Observation[],
  adoption: Adoption,
): ParameterSet {
  const proposed = {
    ...recalibration.values,
    ...(adoption.keepMeasuredComplexes ? recalibration.measuredComplexes : {}),
  };
  const values: Record<string, ParameterValues['values'][string]> = { ...adoption.parent?.values };
  for (const [key, value] of Object.entries(proposed)) {
    if (adoption.without?.has(key) !== true) values[key] = value;
  }
  const informedBy = new Set(adoption.parent?.informedBy ?? []);
  for (const observation of observations) informedBy.add(complexKey(observation.composition));
  return {
    id: adoption.id,
    revision: 0,
    createdAt: adoption.at,
    updatedAt: adoption.at,
    deletedAt: null,
    projectId: adoption.projectId,
    name: adoption.name,
    author: adoption.author,
    reason: adoption.reason,
    parentId: adoption.parent?.id ?? null,
    hash: parameterHash(values, adoption.libraryVersion),
    values,
    informedBy: [...informedBy].sort(),
  };
}
