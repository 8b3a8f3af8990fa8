import type { SpinhueDatabase } from '../database';
import type { TableRow } from '../../../core/record/bundle';
import {
  type AnyRow,
  appendOnlyTables,
  type ContentTable,
  type Edit,
  type NewRow,
  type RecordTable,
  type RowOf,
} from '../rows';
import { sameContent } from '../sameContent';
import { StoreError } from '../storeError';
import { timeOrderedId } from './timeOrderedId';

export interface Clock {
  /** ISO 8601, UTC. */
  now(): string;
  newId(): string;
}

export const systemClock: Clock = {
  now: () => new Date().toISOString(),
  newId: () => timeOrderedId(),
};

/** Writes rows inside one transaction and remembers what each was before. */
export class Writer {
  readonly edits: Edit[] = [];
  readonly #db: SpinhueDatabase;
  readonly #clock: Clock;
  readonly #now: string;

  constructor(db: SpinhueDatabase, clock: Clock) {
    this.#db = db;
    this.#clock = clock;
    this.#now = clock.now();
  }

  get now(): string {
    return this.#now;
  }

  #table<T extends RecordTable>(table: T) {
    return this.#db.table<RowOf[T], string>(table);
  }

  async create<T extends RecordTable>(table: T, fields: readonly NewRow<T>[]): Promise<RowOf[T][]> {
    const rows = fields.map(
      (given) =>
        ({
          ...given,
          id: given.id ?? this.#clock.newId(),
          revision: 0,
          createdAt: this.#now,
          updatedAt: this.#now,
          deletedAt: null,
        }) as unknown as RowOf[T],
    );
    await this.#table(table).bulkAdd(rows);
    for (const row of rows) this.edits.push({ table, id: row.id, before: null, after: row });
    return rows;
  }

  /**
   * Replaces fields of one row.
   *
   * @param basedOn Revision that the person saw; where another has been saved meanwhile, nothing is overwritten.
   * @throws {StoreError} `not-found`, `changed-meanwhile`
   */
  async update<T extends RecordTable>(
    table: T,
    id: string,
    patch: Partial<RowOf[T]> | ((row: RowOf[T]) => Partial<RowOf[T]>),
    basedOn?: number,
  ): Promise<RowOf[T]> {
    const before = await this.#table(table).get(id);
    if (!before) {
      throw new StoreError(
        'not-found',
        'This record no longer exists.',
        'Look into the bin, or undo the deletion.',
      );
    }
    if (basedOn !== undefined && before.revision !== basedOn) {
      throw new StoreError(
        'changed-meanwhile',
        'This record was changed in another window after you opened it. Nothing was overwritten.',
        'Copy what you typed, reload the record and enter it again.',
      );
    }
    const after = {
      ...before,
      ...(typeof patch === 'function' ? patch(before) : patch),
      id,
      revision: before.revision + 1,
      createdAt: before.createdAt,
      updatedAt: this.#now,
    };
    await this.#table(table).put(after);
    this.edits.push({ table, id, before, after });
    return after;
  }

  /** The same patch on many rows in two calls to the database; ids that no longer exist are passed over. */
  async updateMany<T extends RecordTable>(
    table: T,
    ids: readonly string[],
    patch: (row: RowOf[T]) => Partial<RowOf[T]>,
  ): Promise<void> {
    const found = await this.#table(table).bulkGet([...ids]);
    const edits = found
      .filter((row) => row !== undefined)
      .map((before) => ({
        table,
        id: before.id,
        before,
        after: { ...before, ...patch(before), revision: before.revision + 1, updatedAt: this.#now },
      }))
      .filter(({ before, after }) => !sameContent(before, after));
    await this.#table(table).bulkPut(edits.map(({ after }) => after));
    this.edits.push(...edits);
  }

  /** Adds rows that are known by their content, or lines of the log; those that are here already stay as they are. */
  async addMissing<T extends ContentTable | 'log'>(table: T, rows: readonly TableRow<T>[]): Promise<void> {
    const here = await this.#db.table(table).bulkGet(rows.map(({ id }) => id));
    const missing = rows.filter((_, index) => here[index] === undefined);
    // The same curve may be named twice in one call.
    await this.#db.table(table).bulkPut(missing);
  }

  /** Takes rows as they are, revision and times included: for import and restoring. */
  async putAsGiven<T extends RecordTable>(table: T, rows: readonly RowOf[T][]): Promise<void> {
    const before = await this.#table(table).bulkGet(rows.map(({ id }) => id));
    await this.#table(table).bulkPut([...rows]);
    rows.forEach((after, index) => {
      this.edits.push({ table, id: after.id, before: before[index] ?? null, after });
    });
  }

  /**
   * Brings rows of one table from their state `before` to their state `after` (null: no row), provided that each still
   * says what `before` says. Revisions go on growing, so that a copy elsewhere sees the change.
   *
   * @throws {StoreError} `changed-meanwhile`
   */
  async turn<T extends RecordTable>(table: T, wanted: readonly Edit<T>[]): Promise<void> {
    const found = await this.#table(table).bulkGet(wanted.map(({ id }) => id));
    const edits = wanted.map(({ id, before, after }, index): Edit<T> => {
      const current = found[index] ?? null;
      if (!standsAs(current, before)) throw changedElsewhere();
      const goal =
        after ?? (appendOnlyTables.has(table) && current ? { ...current, deletedAt: this.#now } : null);
      const revision = (current?.revision ?? after?.revision ?? -1) + 1;
      return {
        table,
        id,
        before: current,
        after: goal === null ? null : { ...goal, revision, updatedAt: this.#now },
      };
    });
    await this.#table(table).bulkDelete(edits.filter(({ after }) => after === null).map(({ id }) => id));
    await this.#table(table).bulkPut(edits.map(({ after }) => after).filter((row) => row !== null));
    this.edits.push(...(edits as readonly Edit[]));
  }
}

/** An append-only row whose creation was undone still exists, in the bin. */
const standsAs = (current: AnyRow | null, expected: AnyRow | null): boolean =>
  sameContent(current, expected) || (expected === null && current !== null && current.deletedAt !== null);

const changedElsewhere = (): StoreError =>
  new StoreError(
    'changed-meanwhile',
    'A record of this step was changed from elsewhere since: the step cannot be taken back safely.',
    'Nothing was changed. Edit the record by hand instead.',
  );
