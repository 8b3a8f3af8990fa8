import type { SpinhueDatabase } from './database';

/** A computed summary, kept so that a large project opens without computing everything again. */
export interface StoredEstimate {
  /** Hash of composition and conditions, and of what it was made with. */
  readonly key: string;
  /** Parameter hash and model version. */
  readonly madeWith: string;
  readonly summary: unknown;
}

/** Derived data: failures are swallowed, since everything here can be computed again. */
export class EstimateCache {
  readonly #db: SpinhueDatabase;

  constructor(db: SpinhueDatabase) {
    this.#db = db;
  }

  async read(keys: readonly string[]): Promise<(unknown | undefined)[]> {
    try {
      const found = await this.#db.estimates.bulkGet([...keys]);
      return found.map((row) => row?.summary);
    } catch {
      return keys.map(() => undefined);
    }
  }

  async write(rows: readonly StoredEstimate[]): Promise<void> {
    try {
      await this.#db.estimates.bulkPut([...rows]);
    } catch {
      // A full disk must not stop the estimates from being shown.
    }
  }

  /** Drops what was made by another model or with other parameters. */
  async keepOnly(madeWith: readonly string[]): Promise<void> {
    try {
      await this.#db.estimates
        .where('madeWith')
        .noneOf([...madeWith])
        .delete();
    } catch {
      // As above.
    }
  }
}
