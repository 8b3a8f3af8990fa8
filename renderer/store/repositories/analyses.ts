import type { Analysis } from '../../../core/record/analysis';
import type { Measurement } from '../../../core/record/measurement';
import type { SpinhueDatabase } from '../database';
import type { Journal } from '../journal/journal';

export type AnalysisFields = Partial<
  Pick<Analysis, 'treatment' | 'bandFit' | 'assignment' | 'fieldFit' | 'notes'>
>;

const blank = { treatment: [], bandFit: null, assignment: [], fieldFit: null, notes: '' };

/** What was made of a measurement: one row each, redone at will; the measurement itself stays as it is. */
export class AnalysisRepository {
  readonly #db: SpinhueDatabase;
  readonly #journal: Journal;

  constructor(db: SpinhueDatabase, journal: Journal) {
    this.#db = db;
    this.#journal = journal;
  }

  async of(measurementId: string): Promise<Analysis | null> {
    const all = await this.#db.analyses.where('measurementId').equals(measurementId).toArray();
    return all.find(({ deletedAt }) => deletedAt === null) ?? null;
  }

  /** Of a whole project, by the id of the measurement. */
  async ofProject(projectId: string): Promise<ReadonlyMap<string, Analysis>> {
    const all = await this.#db.analyses.where('projectId').equals(projectId).toArray();
    return new Map(all.flatMap((each) => (each.deletedAt === null ? [[each.measurementId, each]] : [])));
  }

  /**
   * Changes parts of the analysis of a measurement, begun where there is none yet.
   *
   * @param before What the person saw; where another window saved meanwhile, nothing is overwritten.
   * @throws {StoreError} `changed-meanwhile`
   */
  save(
    measurement: Measurement,
    before: Analysis | null,
    fields: AnalysisFields,
    label: string,
  ): Promise<Analysis> {
    return this.#journal.record(measurement.projectId, label, async (writer) => {
      if (before !== null) return await writer.update('analyses', before.id, fields, before.revision);
      const [row] = await writer.create('analyses', [
        { projectId: measurement.projectId, measurementId: measurement.id, ...blank, ...fields },
      ]);
      return row!;
    });
  }
}
