import { complexKey } from '../../../core/library/parameterLibrary';
import type { CandidateInput } from '../../../core/record/composition';
import type { Candidate } from '../../../core/record/project';

export interface Conditions {
  readonly concentration_mM: number;
  readonly path_cm: number;
}

/** What the engine is asked about a candidate; where it names no conditions of its own, those of the settings hold. */
export const inputOf = (candidate: Candidate, fallback: Conditions): CandidateInput => ({
  ...candidate.composition,
  id: candidate.id,
  concentration_mM: candidate.concentration_mM ?? fallback.concentration_mM,
  path_cm: candidate.path_cm ?? fallback.path_cm,
});

/** One spelling per question: two candidates with the same key have the same answer. */
export const estimateKey = (input: CandidateInput, madeWith: string): string =>
  `${complexKey(input)}|${input.concentration_mM}|${input.path_cm}|${madeWith}`;
