import { parameterSetFrom, type Recalibration } from '../../../../core/agreement/recalibration';
import { defaultLibrary } from '../../../../core/library/parameterLibrary';
import type { ParameterSet } from '../../../../core/record/project';
import type { Store } from '../../../store';
import type { PlainObservation } from '../../../../core/agreement/recalibration';

/** What a person says when approving a proposal. */
export interface Approval {
  readonly name: string;
  readonly author: string;
  readonly reason: string;
  /** Keys that were taken out, of parameters and of values measured on complexes. */
  readonly without: ReadonlySet<string>;
}

/** A recalibration with what it was worked out from. */
export interface Proposal {
  readonly value: Recalibration;
  readonly observations: readonly PlainObservation[];
  /** Set that it starts from; null for the library as it is. */
  readonly basis: ParameterSet | null;
}

/** The parameter set that an approved proposal makes. */
export const adoptedSet = (
  { value, observations, basis }: Proposal,
  approval: Approval,
  projectId: string,
  clock: Store['clock'],
): ParameterSet =>
  parameterSetFrom(
    value,
    observations.map((observation) => ({ ...observation, library: defaultLibrary })),
    {
      ...approval,
      id: clock.newId(),
      projectId,
      at: clock.now(),
      libraryVersion: defaultLibrary.version,
      parent: basis,
      keepMeasuredComplexes: true,
    },
  );
