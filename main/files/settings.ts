import { mkdirSync, readFileSync, renameSync } from 'node:fs';
import { join } from 'node:path';
import { z } from 'zod';
import { writeAtomically } from './atomicWrite';

/** Settings of the program itself, outside the page. Nothing here is needed to read the data. */
const fields = {
  theme: z.enum(['system', 'light', 'dark']),
  /** Null: the default folder. */
  mirrorFolder: z.string().nullable(),
  lastFolder: z.string().nullable(),
  window: z
    .strictObject({
      x: z.int(),
      y: z.int(),
      width: z.int().min(400).max(20_000),
      height: z.int().min(300).max(20_000),
      maximised: z.boolean(),
    })
    .nullable(),
};
const settingsSchema = z.strictObject(fields);
export type Settings = z.infer<typeof settingsSchema>;
export const defaultSettings: Settings = {
  theme: 'system',
  mirrorFolder: null,
  lastFolder: null,
  window: null,
};

export class SettingsFile {
  readonly #path: string;
  readonly #log: (line: string) => void;
  #values: Settings;
  #writing: Promise<void> = Promise.resolve();

  constructor(folder: string, log: (line: string) => void) {
    mkdirSync(folder, { recursive: true });
    this.#path = join(folder, 'settings.json');
    this.#log = log;
    this.#values = this.#read();
  }

  get values(): Settings {
    return this.#values;
  }

  /** Writes soon; a setting that cannot be written is no reason to disturb anybody. */
  change(changes: Partial<Settings>): Promise<void> {
    this.#values = { ...this.#values, ...changes };
    const text = `${JSON.stringify(this.#values, null, 2)}\n`;
    this.#writing = this.#writing
      .then(() => writeAtomically(this.#path, text))
      .catch((error: unknown) => this.#log(`settings were not written: ${String(error)}`));
    return this.#writing;
  }

  /** Damaged settings are put aside and each good field is kept. */
  #read(): Settings {
    let text: string;
    try {
      text = readFileSync(this.#path, 'utf8');
    } catch {
      return defaultSettings;
    }
    let raw: unknown;
    try {
      raw = JSON.parse(text);
    } catch {
      raw = null;
    }
    if (settingsSchema.safeParse(raw).success) return raw as Settings;
    this.#log(`settings in ${this.#path} are damaged; what can be read is kept, the rest starts as new`);
    try {
      renameSync(this.#path, `${this.#path}.damaged`);
    } catch {
      // It is replaced with the next change.
    }
    if (typeof raw !== 'object' || raw === null) return defaultSettings;
    const good = Object.entries(fields).flatMap(([name, schema]) => {
      const value = Object.hasOwn(raw, name) ? (raw as Record<string, unknown>)[name] : undefined;
      return schema.safeParse(value).success ? [[name, value]] : [];
    });
    return { ...defaultSettings, ...(Object.fromEntries(good) as Partial<Settings>) };
  }
}
