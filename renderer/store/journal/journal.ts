import Dexie from 'dexie';
import type { SpinhueDatabase } from '../database';
import type { ChangeFeed } from '../feed';
import { type Change, contentTables, type Edit, recordTables } from '../rows';
import { asStoreError } from '../storeError';
import { logLines } from './log';
import { SaveHealth } from './saveHealth';
import { type Clock, Writer } from './writer';

/** How many steps per project can be undone. */
export const keptSteps = 500;

const { minKey, maxKey } = Dexie;

/**
 * Every edit goes through here: rows and journal are written in one transaction, so that after a crash either both are
 * there or neither.
 */
export class Journal {
  readonly health = new SaveHealth();
  #author = '';
  readonly #db: SpinhueDatabase;
  readonly #feed: ChangeFeed;
  readonly #clock: Clock;
  readonly #kept: number;

  constructor(db: SpinhueDatabase, feed: ChangeFeed, clock: Clock, kept = keptSteps) {
    this.#kept = kept;
    this.#db = db;
    this.#feed = feed;
    this.#clock = clock;
  }

  /** Initials or name that the log puts beside each line from now on. */
  signAs(author: string): void {
    this.#author = author;
  }

  /** Runs `work` as one undoable step. If it throws, nothing of it is stored. */
  async record<R>(scope: string, label: string, work: (writer: Writer) => Promise<R>): Promise<R> {
    const { edits, result } = await this.#transact(async (writer) => {
      const result = await work(writer);
      if (writer.edits.length === 0) return { edits: [], result };
      await this.#forgetUndone(scope);
      const order = await this.#db.changes.add({
        scope,
        at: writer.now,
        label,
        undone: 0,
        turn: await this.#nextTurn(),
      });
      await this.#db.edits.put({ order, edits: writer.edits });
      await this.#forgetOldest(scope, order);
      return { edits: writer.edits, result };
    });
    if (edits.length > 0) this.#feed.publish(edits);
    return result;
  }

  /** Writes rows without an entry in the journal: for what cannot be taken back, such as emptying the bin. */
  async recordOutside<R>(work: (writer: Writer, db: SpinhueDatabase) => Promise<R>): Promise<R> {
    const { edits, result } = await this.#transact(async (writer) => {
      const result = await work(writer, this.#db);
      return { edits: writer.edits, result };
    });
    if (edits.length > 0) this.#feed.publish(edits);
    return result;
  }

  /** The step that undo would take back, in one project or anywhere. */
  nextUndo(scope: string | null): Promise<Change | undefined> {
    return this.#last(scope, 0);
  }

  nextRedo(scope: string | null): Promise<Change | undefined> {
    return this.#last(scope, 1);
  }

  /** Takes back the last step; gives it, or undefined where there is none. */
  undo(scope: string | null): Promise<Change | undefined> {
    return this.#step(scope, 0);
  }

  redo(scope: string | null): Promise<Change | undefined> {
    return this.#step(scope, 1);
  }

  async #step(scope: string | null, from: 0 | 1): Promise<Change | undefined> {
    const { edits, change } = await this.#transact(async (writer) => {
      const change = await this.#last(scope, from);
      if (!change) return { edits: [], change };
      const stored = (await this.#db.edits.get(change.order))?.edits ?? [];
      const wanted = from === 0 ? [...stored].reverse().map(turnedRound) : stored;
      for (const run of runsOfOneTable(wanted)) await writer.turn(run[0]!.table, run);
      await this.#db.changes.update(change.order, {
        undone: from === 0 ? 1 : 0,
        turn: await this.#nextTurn(),
      });
      return { edits: writer.edits, change };
    });
    if (edits.length > 0) this.#feed.publish(edits);
    return change;
  }

  async #transact<R>(work: (writer: Writer) => Promise<R>): Promise<R> {
    const db = this.#db;
    const tables = [...recordTables, ...contentTables, 'log', 'changes', 'edits'];
    try {
      const result = await db.transaction('rw', tables, async () => {
        const writer = new Writer(db, this.#clock);
        const result = await work(writer);
        await db.log.bulkAdd(logLines(writer.edits, writer.now, this.#author, this.#clock.newId));
        return result;
      });
      this.health.saved();
      return result;
    } catch (error) {
      const known = asStoreError(error);
      this.health.failed(known);
      throw known;
    }
  }

  #last(scope: string | null, undone: 0 | 1): Promise<Change | undefined> {
    const { changes } = this.#db;
    return scope === null
      ? changes.where('[undone+turn]').between([undone, minKey], [undone, maxKey]).last()
      : changes.where('[scope+undone+turn]').between([scope, undone, minKey], [scope, undone, maxKey]).last();
  }

  async #nextTurn(): Promise<number> {
    const last = await Promise.all([this.#last(null, 0), this.#last(null, 1)]);
    return Math.max(0, ...last.map((change) => change?.turn ?? 0)) + 1;
  }

  async #forgetUndone(scope: string): Promise<void> {
    await this.#forget(
      await this.#db.changes
        .where('[scope+undone+order]')
        .between([scope, 1, minKey], [scope, 1, maxKey])
        .primaryKeys(),
    );
  }

  async #forgetOldest(scope: string, newest: number): Promise<void> {
    const older = this.#db.changes
      .where('[scope+undone+order]')
      .between([scope, 0, minKey], [scope, 0, newest], true, true);
    const surplus = (await older.count()) - this.#kept;
    if (surplus > 0) await this.#forget(await older.limit(surplus).primaryKeys());
  }

  async #forget(orders: number[]): Promise<void> {
    if (orders.length === 0) return;
    await this.#db.changes.bulkDelete(orders);
    await this.#db.edits.bulkDelete(orders);
  }
}

const turnedRound = (edit: Edit): Edit => ({ ...edit, before: edit.after, after: edit.before }) as Edit;

/** Neighbouring edits of one table that touch each row once, so that each run is one call to the database. */
function runsOfOneTable(edits: readonly Edit[]): Edit[][] {
  const runs: Edit[][] = [];
  let seen = new Set<string>();
  for (const edit of edits) {
    const run = runs.at(-1);
    if (run && run[0]!.table === edit.table && !seen.has(edit.id)) run.push(edit);
    else {
      runs.push([edit]);
      seen = new Set();
    }
    seen.add(edit.id);
  }
  return runs;
}
