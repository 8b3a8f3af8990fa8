import Dexie from 'dexie';
import type { Candidate, Row } from '../../../core/record/project';
import type { SpinhueDatabase } from '../database';
import type { Journal } from '../journal/journal';
import type { NewRow } from '../rows';
import { counted } from '../words';

export type CandidateFields = Partial<Omit<Candidate, keyof Row>>;
export type NewCandidate = Pick<Candidate, 'composition'> & CandidateFields;

/** What a candidate is until somebody says more. */
export const blankCandidate = {
  name: '',
  counterIon: null,
  solvate: null,
  concentration_mM: null,
  path_cm: null,
  tags: [],
  starred: false,
  archived: false,
  notes: '',
} satisfies CandidateFields;

export class CandidateRepository {
  readonly #db: SpinhueDatabase;
  readonly #journal: Journal;

  constructor(db: SpinhueDatabase, journal: Journal) {
    this.#db = db;
    this.#journal = journal;
  }

  get(id: string): Promise<Candidate | undefined> {
    return this.#db.candidates.get(id);
  }

  /** All of a project, archived ones and those in the bin too, in no particular order. */
  allOf(projectId: string): Promise<Candidate[]> {
    return this.#db.candidates.where('projectId').equals(projectId).toArray();
  }

  /** The same in portions, in the order of the ids, which is that of entry. */
  async *inPortions(projectId: string, portion: number): AsyncGenerator<Candidate[]> {
    const { candidates } = this.#db;
    let last: string | typeof Dexie.minKey = Dexie.minKey;
    for (;;) {
      const rows: Candidate[] = await candidates
        .where('[projectId+id]')
        .between([projectId, last], [projectId, Dexie.maxKey], false, true)
        .limit(portion)
        .toArray();
      if (rows.length > 0) yield rows;
      if (rows.length < portion) return;
      last = rows.at(-1)!.id;
    }
  }

  async create(projectId: string, given: readonly NewCandidate[], label?: string): Promise<Candidate[]> {
    const rows = given.map((each): NewRow<'candidates'> => ({ ...blankCandidate, ...each, projectId }));
    return this.#journal.record(projectId, label ?? `add ${counted(rows.length, 'candidate')}`, (writer) =>
      writer.create('candidates', rows),
    );
  }

  /** Adds some and changes others as one step. */
  takeOver(
    projectId: string,
    label: string,
    fresh: readonly NewCandidate[],
    changed: readonly { readonly id: string; readonly fields: CandidateFields }[],
  ): Promise<void> {
    const rows = fresh.map((each): NewRow<'candidates'> => ({ ...blankCandidate, ...each, projectId }));
    return this.#journal.record(projectId, label, async (writer) => {
      if (rows.length > 0) await writer.create('candidates', rows);
      for (const { id, fields } of changed) await writer.update('candidates', id, fields);
    });
  }

  update(candidate: Candidate, label: string, fields: CandidateFields, basedOn?: number): Promise<Candidate> {
    return this.#journal.record(candidate.projectId, label, (writer) =>
      writer.update('candidates', candidate.id, fields, basedOn),
    );
  }

  updateMany(
    projectId: string,
    ids: readonly string[],
    label: string,
    change: (candidate: Candidate) => CandidateFields,
  ): Promise<void> {
    return this.#journal.record(projectId, label, (writer) => writer.updateMany('candidates', ids, change));
  }

  /** Into the bin. */
  remove(projectId: string, ids: readonly string[]): Promise<void> {
    return this.#journal.record(projectId, `delete ${counted(ids.length, 'candidate')}`, (writer) =>
      writer.updateMany('candidates', ids, () => ({ deletedAt: writer.now })),
    );
  }

  restore(projectId: string, ids: readonly string[]): Promise<void> {
    return this.#journal.record(projectId, `restore ${counted(ids.length, 'candidate')}`, (writer) =>
      writer.updateMany('candidates', ids, () => ({ deletedAt: null })),
    );
  }
}
