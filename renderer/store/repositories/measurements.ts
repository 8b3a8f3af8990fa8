import { SpinhueError } from '../../../core/errors';
import type { Prediction } from '../../../core/prediction/types';
import type { Curve } from '../../../core/record/curve';
import type { StoredFile } from '../../../core/record/file';
import {
  type Measurement,
  type MeasurementContent,
  measurementContentSchema,
} from '../../../core/record/measurement';
import type { Candidate } from '../../../core/record/project';
import { correctMeasurement, currentContent } from '../../../core/record/revisions';
import type { SpinhueDatabase } from '../database';
import type { Journal } from '../journal/journal';
import { counted } from '../words';
import { frozenRow } from './predictions';
import type { NamedBatch, SampleRepository } from './samples';

export interface NewMeasurements {
  readonly candidate: Candidate;
  readonly contents: readonly MeasurementContent[];
  /** Null where nobody named a batch. */
  readonly batch: NamedBatch | null;
  readonly by: string;
  /** What stands predicted now; kept first where no prediction of the candidate was kept yet. Null: not estimated. */
  readonly prediction: Prediction | null;
  readonly curves?: readonly Curve[];
  readonly files?: readonly StoredFile[];
  /** Bracket formula, for the name of the step. */
  readonly formula: string;
}

export interface AddedMeasurements {
  readonly measurements: readonly Measurement[];
  /** Whether the prediction had to be frozen for it. */
  readonly froze: boolean;
}

export interface Correction {
  readonly by: string;
  readonly why: string;
  readonly content: MeasurementContent;
  /** Attachments that come with it. */
  readonly files?: readonly StoredFile[];
  /** For a measurement whose batch nobody had named yet. */
  readonly batch?: { readonly candidate: Candidate; readonly named: NamedBatch } | null;
}

/** Measurements: added and corrected by further revisions, never overwritten. */
export class MeasurementRepository {
  readonly #db: SpinhueDatabase;
  readonly #journal: Journal;
  readonly #samples: SampleRepository;

  constructor(db: SpinhueDatabase, journal: Journal, samples: SampleRepository) {
    this.#db = db;
    this.#journal = journal;
    this.#samples = samples;
  }

  /** Of one candidate, newest first, without those in the bin. */
  async of(candidateId: string): Promise<Measurement[]> {
    return kept(await this.#db.measurements.where('candidateId').equals(candidateId).toArray());
  }

  async ofProject(projectId: string): Promise<Measurement[]> {
    return kept(await this.#db.measurements.where('projectId').equals(projectId).toArray());
  }

  get(id: string): Promise<Measurement | undefined> {
    return this.#db.measurements.get(id);
  }

  async inBinOf(candidateId: string): Promise<Measurement[]> {
    const all = await this.#db.measurements.where('candidateId').equals(candidateId).toArray();
    return all.filter(({ deletedAt }) => deletedAt !== null);
  }

  /** Measurements of the project, outside the bin, whose numbers came from the file of that hash. */
  async fromFile(projectId: string, fileId: string): Promise<Measurement[]> {
    const all = await this.ofProject(projectId);
    return all.filter((each) => {
      const content = currentContent(each);
      return content.kind === 'spectrum' && content.source?.fileId === fileId;
    });
  }

  curve(id: string): Promise<Curve | undefined> {
    return this.#db.curves.get(id);
  }

  file(id: string): Promise<StoredFile | undefined> {
    return this.#db.files.get(id);
  }

  /**
   * Keeps measurements of one candidate as one step. A candidate without a frozen prediction gets one in the same step,
   * before the measurement: what is computed afterwards is no prediction.
   *
   * @throws {SpinhueError} where a measurement is not of the form that the record keeps; nothing is stored then.
   */
  async add(given: NewMeasurements): Promise<AddedMeasurements> {
    const { candidate, batch, by, prediction, curves = [], files = [] } = given;
    const contents = given.contents.map(checked);
    const label = `add ${nameOf(contents)} of ${given.formula}`;
    return await this.#journal.record(candidate.projectId, label, async (writer) => {
      const standing = await this.#standing(candidate.id);
      const froze = standing === null && prediction !== null;
      const frozen = froze
        ? (
            await writer.create('frozenPredictions', [
              frozenRow(candidate, prediction, 'before the first measurement was saved', writer.now),
            ])
          )[0]!.id
        : standing;
      const sample = batch === null ? null : await this.#samples.named(writer, candidate, batch);
      await writer.addMissing('files', files);
      await writer.addMissing('curves', curves);
      const measurements = await writer.create(
        'measurements',
        contents.map((content) => ({
          projectId: candidate.projectId,
          candidateId: candidate.id,
          sampleId: sample?.id ?? null,
          frozenPredictionId: frozen,
          revisions: [{ number: 0, at: writer.now, by, why: '', content }],
        })),
      );
      return { measurements, froze };
    });
  }

  /**
   * A further revision; the former ones stay as they are.
   *
   * @throws {SpinhueError} without a reason, or where the kind would change
   * @throws {StoreError} `changed-meanwhile` where somebody corrected it since it was opened
   */
  async correct(measurement: Measurement, correction: Correction): Promise<Measurement> {
    const { by, why, content, files = [], batch = null } = correction;
    const fresh = checked(content);
    const label = `correct ${nameOf([content])}`;
    return await this.#journal.record(measurement.projectId, label, async (writer) => {
      await writer.addMissing('files', files);
      const isOpen = measurement.sampleId === null;
      const sample =
        isOpen && batch !== null && (await this.#samples.named(writer, batch.candidate, batch.named));
      return await writer.update(
        'measurements',
        measurement.id,
        (row) => ({
          sampleId: row.sampleId ?? (sample ? sample.id : null),
          revisions: correctMeasurement(row, { at: writer.now, by, why: why.trim(), content: fresh })
            .revisions,
        }),
        measurement.revision,
      );
    });
  }

  /** Into the bin. */
  remove(measurement: Measurement): Promise<void> {
    const label = `delete ${nameOf([currentContent(measurement)])}`;
    return this.#journal.record(measurement.projectId, label, (writer) =>
      writer.updateMany('measurements', [measurement.id], () => ({ deletedAt: writer.now })),
    );
  }

  restore(measurement: Measurement): Promise<void> {
    const label = `restore ${nameOf([currentContent(measurement)])}`;
    return this.#journal.record(measurement.projectId, label, (writer) =>
      writer.updateMany('measurements', [measurement.id], () => ({ deletedAt: null })),
    );
  }

  /** The latest prediction kept of a candidate; null where there is none. */
  async #standing(candidateId: string): Promise<string | null> {
    const all = await this.#db.frozenPredictions.where('candidateId').equals(candidateId).toArray();
    const latest = all
      .filter(({ deletedAt }) => deletedAt === null)
      .sort((one, other) => other.frozenAt.localeCompare(one.frozenAt))[0];
    return latest?.id ?? null;
  }
}

const kept = (rows: Measurement[]): Measurement[] =>
  rows
    .filter(({ deletedAt }) => deletedAt === null)
    .sort((one, other) => other.createdAt.localeCompare(one.createdAt));

function nameOf(contents: readonly MeasurementContent[]): string {
  const [first] = contents;
  if (contents.length !== 1) return counted(contents.length, 'measurement');
  return `${/^[aeo]/.test(first!.kind) ? 'an' : 'a'} ${first!.kind}`;
}

function checked(content: MeasurementContent): MeasurementContent {
  const result = measurementContentSchema.safeParse(content);
  if (result.success) return result.data;
  const [issue] = result.error.issues;
  throw new SpinhueError({
    code: 'wrong-type',
    message: `This cannot be kept as a measurement: ${issue!.message}.`,
    field: issue!.path.join('.'),
    remedy: 'Correct the entry; nothing was saved.',
  });
}
