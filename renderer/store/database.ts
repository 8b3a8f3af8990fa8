import Dexie, { type DexieOptions, type EntityTable, type Table } from 'dexie';
import type { Curve } from '../../core/record/curve';
import type { StoredFile } from '../../core/record/file';
import type { LogEntry } from '../../core/record/log';
import type { Change, ChangeEdits, RowOf } from './rows';
import { currentSchemaVersion, nativeVersion, schemaVersions } from './schema/versions';
import { asStoreError, StoreError } from './storeError';
import type { StoredEstimate } from './estimateCache';

/** Never changes: a database belongs to its name as much as to its origin. */
export const databaseName = 'spinhue';

export interface Setting {
  readonly key: string;
  readonly value: unknown;
}

export class SpinhueDatabase extends Dexie {
  declare projects: EntityTable<RowOf['projects'], 'id'>;
  declare candidates: EntityTable<RowOf['candidates'], 'id'>;
  declare parameterSets: EntityTable<RowOf['parameterSets'], 'id'>;
  declare frozenPredictions: EntityTable<RowOf['frozenPredictions'], 'id'>;
  declare samples: EntityTable<RowOf['samples'], 'id'>;
  declare measurements: EntityTable<RowOf['measurements'], 'id'>;
  declare analyses: EntityTable<RowOf['analyses'], 'id'>;
  declare wishes: EntityTable<RowOf['wishes'], 'id'>;
  declare curves: EntityTable<Curve, 'id'>;
  declare files: EntityTable<StoredFile, 'id'>;
  declare log: EntityTable<LogEntry, 'id'>;
  declare changes: Table<Change, number, Omit<Change, 'order'> & { order?: number }>;
  declare edits: EntityTable<ChangeEdits, 'order'>;
  declare settings: EntityTable<Setting, 'key'>;
  declare estimates: EntityTable<StoredEstimate, 'key'>;

  constructor(name: string = databaseName, options: DexieOptions = {}) {
    // A lab record is worth the wait for the disk: without `strict` the last commits may be lost with the power.
    super(name, { chromeTransactionDurability: 'strict', autoOpen: false, ...options });
    for (const { version, stores } of schemaVersions) this.version(version).stores(stores);
  }
}

/**
 * Opens the database, or refuses before any write. Dexie itself opens a database of a newer version without complaint:
 * rows written then would never be upgraded, and tables that the newer version dropped would be put back. So the
 * version is looked up before Dexie touches anything, and once more afterwards.
 *
 * @throws {StoreError} `newer-database`, `storage-unavailable`, `storage-failed`
 */
export async function openDatabase(
  name: string = databaseName,
  options: DexieOptions = {},
): Promise<SpinhueDatabase> {
  let db: SpinhueDatabase | null = null;
  try {
    const factory = (options.indexedDB as IDBFactory | undefined) ?? globalThis.indexedDB;
    const present = await factory.databases();
    refuseNewer(present.find((each) => each.name === name)?.version ?? 0);
    db = new SpinhueDatabase(name, options);
    await db.open();
    refuseNewer(db.backendDB().version);
    return db;
  } catch (error) {
    db?.close();
    throw asStoreError(error);
  }
}

function refuseNewer(native: number): void {
  if (native < nativeVersion(currentSchemaVersion + 1)) return;
  throw new StoreError(
    'newer-database',
    `These data were last used by a newer version of this program (data version ${Math.floor(native / 10)}; ` +
      `this program knows up to ${currentSchemaVersion}).`,
    'Nothing was read or changed. Start the newer version again, or export the project there first.',
  );
}
