import { parameterSetFrom, type Recalibration } from '../../../../core/agreement/recalibration';
import { defaultLibrary } from '../../../../core/library/parameterLibrary';
import type { ParameterSet } from '../../../../core/record/project';
import type { Store } from '../../../store';
import type { PlainObservation } from '../../../workers/recalibration/protocol';

/** What a person says when approving a proposal. */
export interface Approval {
  readonly name: string;
  readonly author: string;
  readonly reason: string;
  /** Keys that were taken out. */
  readonly without: ReadonlySet<string>;
  readonly keepMeasuredComplexes: boolean;
}

/** The parameter set that an approved proposal makes. */
export const adoptedSet = (
  proposal: Recalibration,
  observations: readonly PlainObservation[],
  approval: Approval,
  projectId: string,
  parent: ParameterSet | null,
  clock: Store['clock'],
): ParameterSet =>
  parameterSetFrom(
    proposal,
    observations.map((observation) => ({ ...observation, library: defaultLibrary })),
    {
      ...approval,
      id: clock.newId(),
      projectId,
      at: clock.now(),
      libraryVersion: defaultLibrary.version,
      parent,
    },
  );
