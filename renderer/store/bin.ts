import { tableOf } from '../../core/record/bundle/tables';
import type { Measurement } from '../../core/record/measurement';
import type { Candidate, FrozenPrediction, Project } from '../../core/record/project';
import type { Sample } from '../../core/record/sample';
import type { SpinhueDatabase } from './database';
import type { Journal } from './journal/journal';
import {
  type AnyRow,
  type ChangeEdits,
  type Edit,
  ownership,
  projectOf,
  type RecordTable,
  recordTables,
} from './rows';

export const keptInBin_days = 30;

/** A record of the laboratory in the bin, with the candidate that it is about. */
export type BinRecord = (
  | { readonly table: 'measurements'; readonly row: Measurement }
  | { readonly table: 'samples'; readonly row: Sample }
  | { readonly table: 'frozenPredictions'; readonly row: FrozenPrediction }
) & { readonly candidate: Candidate; readonly projectName: string };

const labTables = ['measurements', 'samples', 'frozenPredictions'] as const;
const nounOf = { measurements: 'measurement', samples: 'batch', frozenPredictions: 'frozen prediction' };

export interface BinContent {
  readonly projects: readonly Project[];
  /** Of projects that are not in the bin themselves. */
  readonly candidates: readonly (Candidate & { readonly projectName: string })[];
  /** Of projects that are not in the bin themselves. */
  readonly records: readonly BinRecord[];
}

/** What was deleted and can still be brought back. */
export class Bin {
  readonly #db: SpinhueDatabase;
  readonly #journal: Journal;

  constructor(db: SpinhueDatabase, journal: Journal) {
    this.#db = db;
    this.#journal = journal;
  }

  async content(): Promise<BinContent> {
    const projects = await this.#db.projects.toArray();
    const names = new Map(
      projects.filter((each) => each.deletedAt === null).map((each) => [each.id, each.name]),
    );
    const candidates = await this.#db.candidates.filter((each) => each.deletedAt !== null).toArray();
    return {
      projects: projects.filter((each) => each.deletedAt !== null).sort(latestFirst),
      candidates: candidates
        .filter((each) => names.has(each.projectId))
        .map((each) => ({ ...each, projectName: names.get(each.projectId)! }))
        .sort(latestFirst),
      records: await this.#records(names),
    };
  }

  async #records(names: ReadonlyMap<string, string>): Promise<BinRecord[]> {
    const found = await Promise.all(
      labTables.map(async (table) => {
        // Null is no key, so that this index holds the rows in the bin and no others.
        const rows = await this.#db.table<BinRecord['row']>(table).where('deletedAt').above('').toArray();
        return rows.map((row) => ({ table, row }) as Pick<BinRecord, 'table' | 'row'>);
      }),
    );
    const records = found.flat().filter(({ row }) => names.has(row.projectId));
    const candidates = await this.#db.candidates.bulkGet(records.map(({ row }) => row.candidateId));
    return records
      .map((each, i) => ({ ...each, candidate: candidates[i], projectName: names.get(each.row.projectId)! }))
      .filter((each): each is BinRecord => each.candidate !== undefined)
      .sort((one, other) => latestFirst(one.row, other.row));
  }

  /** Brings a record back, with the candidate, batch and frozen prediction that it rests on, as one step. */
  restore({ table, row }: BinRecord): Promise<void> {
    return this.#journal.record(row.projectId, `bring back a ${nounOf[table]}`, async (writer) => {
      const wanted: { table: RecordTable; row: AnyRow }[] = [{ table, row }];
      for (let next = wanted.pop(); next; next = wanted.pop()) {
        await writer.updateMany(next.table, [next.row.id], () => ({ deletedAt: null }));
        for (const link of tableOf(next.table).links(next.row)) {
          const name = link.table as RecordTable;
          const rests = link.id === null ? undefined : await this.#db.table<AnyRow>(name).get(link.id);
          if (rests && rests.deletedAt !== null) wanted.push({ table: name, row: rests });
        }
      }
    });
  }

  /** Removes for good what has lain in the bin for thirty days; gives how many rows went. */
  purgeExpired(now: string): Promise<number> {
    return this.#purge(new Date(Date.parse(now) - keptInBin_days * 86_400_000).toISOString());
  }

  /** Removes for good all that is in the bin now. */
  empty(): Promise<number> {
    return this.#purge('\uffff');
  }

  /** Projects go with all that belongs to them, candidates with their frozen predictions. */
  #purge(deletedBefore: string): Promise<number> {
    return this.#journal.recordOutside(async (writer, db) => {
      const doomed = new Map<string, { table: RecordTable; row: AnyRow }>();
      let fresh: { table: RecordTable; row: AnyRow }[] = [];
      for (const table of recordTables) {
        const rows = await db.table<AnyRow>(table).where('deletedAt').below(deletedBefore).toArray();
        fresh.push(...rows.map((row) => ({ table, row })));
      }
      while (fresh.length > 0) {
        for (const each of fresh) doomed.set(`${each.table} ${each.row.id}`, each);
        fresh = (await ownedBy(db, fresh)).filter(({ table, row }) => !doomed.has(`${table} ${row.id}`));
      }
      if (doomed.size === 0) return 0;
      await spareWhatIsNeeded(db, doomed);
      for (const { table, row } of doomed.values()) {
        await db.table(table).delete(row.id);
        writer.edits.push({ table, id: row.id, before: row, after: null } as Edit);
      }
      await forgetRows(db, new Set([...doomed.values()].map(({ row }) => row.id)));
      return doomed.size;
    });
  }
}

/**
 * A row that one outside the bin points to stays in the bin, with the rows it belongs to: the sample of a measurement,
 * the frozen prediction that it is compared with, the parent of a parameter set.
 */
async function spareWhatIsNeeded(
  db: SpinhueDatabase,
  doomed: Map<string, { table: RecordTable; row: AnyRow }>,
): Promise<void> {
  const projects = [...new Set([...doomed.values()].map(({ row }) => projectOf(row)))];
  const staying: { table: RecordTable; row: AnyRow }[] = [];
  for (const table of recordTables) {
    const rows = await db
      .table<AnyRow>(table)
      .where(table === 'projects' ? 'id' : 'projectId')
      .anyOf(projects)
      .toArray();
    staying.push(...rows.filter(({ id }) => !doomed.has(`${table} ${id}`)).map((row) => ({ table, row })));
  }
  for (let next = staying.pop(); next; next = staying.pop()) {
    for (const { table, id } of tableOf(next.table).links(next.row)) {
      const spared = doomed.get(`${table} ${id}`);
      if (!spared) continue;
      doomed.delete(`${table} ${id}`);
      staying.push(spared);
    }
  }
}

/** Rows that cannot stand without one of `owners`. */
async function ownedBy(
  db: SpinhueDatabase,
  owners: readonly { table: RecordTable; row: AnyRow }[],
): Promise<{ table: RecordTable; row: AnyRow }[]> {
  const found: { table: RecordTable; row: AnyRow }[] = [];
  for (const { table, field, owner } of ownership) {
    const ids = owners.filter((each) => each.table === owner).map(({ row }) => row.id);
    if (ids.length === 0) continue;
    const rows = await db.table<AnyRow>(table).where(field).anyOf(ids).toArray();
    found.push(...rows.map((row) => ({ table, row })));
  }
  return found;
}

const latestFirst = (one: AnyRow, other: AnyRow): number =>
  (other.deletedAt ?? '').localeCompare(one.deletedAt ?? '');

/** Steps about rows that are gone for good cannot be taken back any more. */
async function forgetRows(db: SpinhueDatabase, ids: ReadonlySet<string>): Promise<void> {
  const touched: ChangeEdits[] = await db.edits
    .filter(({ edits }) => edits.some((edit) => ids.has(edit.id)))
    .toArray();
  for (const { order, edits } of touched) {
    const left = edits.filter((edit) => !ids.has(edit.id));
    if (left.length > 0) await db.edits.put({ order, edits: left });
    else {
      await db.edits.delete(order);
      await db.changes.delete(order);
    }
  }
}
