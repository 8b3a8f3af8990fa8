import type { Prediction } from '../../../core/prediction/types';
import type { Candidate } from '../../../core/record/project';
import type { Journal } from '../journal/journal';
import { counted } from '../words';
import { blankCandidate, type NewCandidate } from './candidates';
import { frozenRow } from './predictions';

/** A complex that a search found, with what was expected of it at that moment. */
export interface ShortlistEntry {
  readonly composition: NewCandidate['composition'];
  readonly prediction: Prediction;
  /** Why it was taken, for people. */
  readonly reason: string;
  /** The wish as it was searched for, with the score: kept inside the frozen prediction, where nothing edits it. */
  readonly shortlistedFor: {
    readonly wish: object;
    readonly probability: number;
    readonly parts: readonly object[];
  };
}

/** From a search into the project: candidates with their predictions frozen, as one step. */
export class ShortlistRepository {
  readonly #journal: Journal;

  constructor(journal: Journal) {
    this.#journal = journal;
  }

  add(projectId: string, entries: readonly ShortlistEntry[]): Promise<Candidate[]> {
    return this.#journal.record(
      projectId,
      `add ${counted(entries.length, 'candidate')} from a search`,
      async (writer) => {
        const candidates = await writer.create(
          'candidates',
          entries.map(({ composition }) => ({ ...blankCandidate, composition, tags: ['found'], projectId })),
        );
        await writer.create(
          'frozenPredictions',
          entries.map(({ prediction, reason, shortlistedFor }, i) => {
            const row = frozenRow(candidates[i]!, prediction, reason, writer.now);
            const kept = JSON.parse(JSON.stringify({ shortlistedFor })) as Record<string, unknown>;
            return { ...row, prediction: { ...row.prediction, ...kept } };
          }),
        );
        return candidates;
      },
    );
  }
}
