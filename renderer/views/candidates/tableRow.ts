import type { Candidate } from '../../../core/record/project';
import type { CandidateSummary } from '../../workers/estimateSummary';

/** One line of the table. */
export interface TableRow {
  readonly candidate: Candidate;
  /** Undefined while it is being computed. */
  readonly summary: CandidateSummary | undefined;
  /** CIEDE2000 to the colour that the project aims at; null without a target or a colour. */
  readonly distance: number | null;
}
