import type { Candidate } from '../../../core/record/project';
import type { Sample } from '../../../core/record/sample';
import type { SpinhueDatabase } from '../database';
import type { Journal } from '../journal/journal';
import type { Writer } from '../journal/writer';

export type Phase = Sample['phase'];

/** The batch that a measurement was made on, as it is typed. */
export interface NamedBatch {
  readonly batch: string;
  readonly phase: Phase;
}

/** What can be written down about a batch. */
export type SampleFields = Omit<
  Sample,
  'id' | 'revision' | 'createdAt' | 'updatedAt' | 'deletedAt' | 'projectId' | 'candidateId'
>;

/** Batches as they were made. */
export class SampleRepository {
  readonly #db: SpinhueDatabase;

  constructor(db: SpinhueDatabase) {
    this.#db = db;
  }

  /** Of one candidate, in the order in which they were first named. */
  async of(candidateId: string): Promise<Sample[]> {
    const all = await this.#db.samples.where('candidateId').equals(candidateId).toArray();
    return all
      .filter(({ deletedAt }) => deletedAt === null)
      .sort((one, other) => one.createdAt.localeCompare(other.createdAt));
  }

  /**
   * The sample of that batch and phase, made where there is none. One batch measured as powder and in solution is two
   * samples: what was weighed out and what stood in the beam differ. To be called inside a step of the journal.
   */
  async named(writer: Writer, candidate: Candidate, { batch, phase }: NamedBatch): Promise<Sample> {
    const name = batch.trim();
    const known = (await this.of(candidate.id)).filter((each) => each.batch === name);
    const same = known.find((each) => each.phase === phase) ?? (phase === null ? known[0] : undefined);
    if (same) return same;
    const [made] = await writer.create('samples', [
      {
        projectId: candidate.projectId,
        candidateId: candidate.id,
        batch: name,
        formula: null,
        counterIon: candidate.counterIon,
        solvate: candidate.solvate,
        molarMass_g_mol: null,
        molarMassBasis: null,
        purity_percent: null,
        purityBasis: null,
        phase,
        mass_mg: null,
        madeOn: null,
        operator: null,
        notes: '',
      },
    ]);
    return made!;
  }

  /** A batch written down on its own, before or after something was measured on it. */
  async add(journal: Journal, candidate: Candidate, fields: SampleFields): Promise<Sample> {
    const { projectId, id: candidateId } = candidate;
    return await journal.record(projectId, `write down batch ${fields.batch}`, async (writer) => {
      const [made] = await writer.create('samples', [{ ...fields, projectId, candidateId }]);
      return made!;
    });
  }

  /** @throws {StoreError} `changed-meanwhile` where another window saved it since it was opened */
  async change(journal: Journal, sample: Sample, fields: SampleFields): Promise<Sample> {
    return await journal.record(sample.projectId, `change batch ${sample.batch}`, (writer) =>
      writer.update('samples', sample.id, fields, sample.revision),
    );
  }
}
