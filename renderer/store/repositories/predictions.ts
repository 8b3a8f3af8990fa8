import type { Prediction } from '../../../core/prediction/types';
import type { Candidate, FrozenPrediction, ParameterSet } from '../../../core/record/project';
import type { SpinhueDatabase } from '../database';
import type { Journal } from '../journal/journal';
import type { NewRow } from '../rows';

/** A prediction as the row that keeps it. */
export const frozenRow = (
  candidate: Candidate,
  prediction: Prediction,
  reason: string,
  frozenAt: string,
): NewRow<'frozenPredictions'> => ({
  projectId: candidate.projectId,
  candidateId: candidate.id,
  frozenAt,
  reason,
  parameterHash: prediction.madeWith.parameterHash,
  modelVersion: prediction.madeWith.modelVersion,
  // Through JSON, so that what is kept is what an export will hold.
  prediction: JSON.parse(JSON.stringify(prediction)) as Record<string, unknown>,
});

/** Predictions as they stood when frozen: added, never edited. */
export class FrozenPredictionRepository {
  readonly #db: SpinhueDatabase;
  readonly #journal: Journal;

  constructor(db: SpinhueDatabase, journal: Journal) {
    this.#db = db;
    this.#journal = journal;
  }

  /** Of one candidate, newest first. */
  async of(candidateId: string): Promise<FrozenPrediction[]> {
    const all = await this.#db.frozenPredictions.where('candidateId').equals(candidateId).toArray();
    return all
      .filter(({ deletedAt }) => deletedAt === null)
      .sort((one, other) => other.frozenAt.localeCompare(one.frozenAt));
  }

  /** Of a whole project, by id, those in the bin too: a measurement keeps to the one it was saved under. */
  async ofProject(projectId: string): Promise<ReadonlyMap<string, FrozenPrediction>> {
    const all = await this.#db.frozenPredictions.where('projectId').equals(projectId).toArray();
    return new Map(all.map((each) => [each.id, each]));
  }

  freeze(
    candidate: Candidate,
    prediction: Prediction,
    reason: string,
    label: string,
  ): Promise<FrozenPrediction> {
    return this.#journal.record(candidate.projectId, label, async (writer) => {
      const [row] = await writer.create('frozenPredictions', [
        frozenRow(candidate, prediction, reason, writer.now),
      ]);
      return row!;
    });
  }
}

/** Parameter sets of a project: added and chosen, never edited. */
export class ParameterSetRepository {
  readonly #db: SpinhueDatabase;
  readonly #journal: Journal;

  constructor(db: SpinhueDatabase, journal: Journal) {
    this.#db = db;
    this.#journal = journal;
  }

  get(id: string): Promise<ParameterSet | undefined> {
    return this.#db.parameterSets.get(id);
  }

  /** Newest first. */
  async of(projectId: string): Promise<ParameterSet[]> {
    const all = await this.#db.parameterSets.where('projectId').equals(projectId).toArray();
    return all
      .filter(({ deletedAt }) => deletedAt === null)
      .sort((one, other) => other.createdAt.localeCompare(one.createdAt));
  }

  /** Keeps a set and lets the project use it, as one step. */
  adopt(set: NewRow<'parameterSets'>, label: string): Promise<ParameterSet> {
    return this.#journal.record(set.projectId, label, async (writer) => {
      const [row] = await writer.create('parameterSets', [set]);
      await writer.update('projects', set.projectId, { parameterSetId: row!.id });
      return row!;
    });
  }
}
