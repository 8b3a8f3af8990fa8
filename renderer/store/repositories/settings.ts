import { z } from 'zod';
import type { SpinhueDatabase } from '../database';
import { asStoreError } from '../storeError';

const columnIds = z.array(z.string().max(40)).max(40);

/** Each setting falls back on its own default, so that one spoilt value never takes the others along. */
export const settingSchemas = {
  energyUnit: z.enum(['cm-1', 'nm', 'eV', 'kJ/mol', 'THz']).catch('cm-1'),
  concentration_mM: z.number().positive().max(10_000).catch(10),
  path_cm: z.number().positive().max(100).catch(1),
  initials: z.string().max(20).catch(''),
  hiddenColumns: columnIds.catch([]),
  sort: z
    .strictObject({ by: z.string().max(40), descending: z.boolean() })
    .catch({ by: 'added', descending: false }),
  groupBy: z.string().max(40).catch('none'),
  lastProject: z.string().max(100).nullable().catch(null),
  demoLoaded: z.boolean().catch(false),
  singleKeys: z.boolean().catch(true),
  /** Paper of the reports; null for what is usual where one is. */
  paper: z.enum(['A4', 'Letter']).nullable().catch(null),
  /** Whether the tour was taken or turned down. */
  tourDone: z.boolean().catch(false),
  /** Ids of the ligands at hand. */
  shelf: z.array(z.string().max(60)).max(2000).catch([]),
  /** Searches that were under way when they were last heard of, so that closing the window loses none. */
  openSearches: z
    .array(
      z.strictObject({
        id: z.string().max(100),
        projectId: z.string().max(100),
        startedAt: z.string().max(40),
        wish: z.looseObject({ name: z.string().max(200) }),
        /** How far it had come. */
        done: z.number().nonnegative(),
        count: z.number().nonnegative(),
        /** What the search needs to go on from there; null where it starts again. */
        checkpoint: z.unknown().nullable(),
      }),
    )
    .max(20)
    .catch([]),
} as const;

export type Settings = { readonly [K in keyof typeof settingSchemas]: z.infer<(typeof settingSchemas)[K]> };

export function readSettings(stored: ReadonlyMap<string, unknown>): Settings {
  return Object.fromEntries(
    Object.entries(settingSchemas).map(([key, schema]) => [key, schema.parse(stored.get(key))]),
  ) as unknown as Settings;
}

export const defaultSettings: Settings = readSettings(new Map());

export class SettingsRepository {
  readonly #db: SpinhueDatabase;

  constructor(db: SpinhueDatabase) {
    this.#db = db;
  }

  async read(): Promise<Settings> {
    const rows = await this.#db.settings.toArray();
    return readSettings(new Map(rows.map(({ key, value }) => [key, value])));
  }

  async set<K extends keyof Settings>(key: K, value: Settings[K]): Promise<void> {
    try {
      await this.#db.settings.put({ key, value });
    } catch (error) {
      throw asStoreError(error);
    }
  }
}
