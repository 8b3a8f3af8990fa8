import { readdir, readFile, stat } from 'node:fs/promises';
import { join } from 'node:path';
import { readBundle } from '../../core/record/bundle';

/** How far the copy in the folder is behind what the screen confirmed, and whether it was ever torn. */
export class CopyWatch {
  readonly torn: string[] = [];
  readonly lags_ms: number[] = [];
  readonly #folder: string;
  readonly #mark: RegExp;
  /** Confirmed and not yet seen in the copy. */
  #pending: { number: number; at: number }[] = [];
  #seen = '';
  #number = 0;
  #timer: NodeJS.Timeout | undefined;
  #busy = false;

  /** @param mark finds the number of the last edit in the text of the bundle */
  constructor(folder: string, mark: RegExp) {
    this.#folder = folder;
    this.#mark = mark;
    this.#timer = setInterval(() => void this.look(), 40);
  }

  get number(): number {
    return this.#number;
  }

  confirmed(number: number): void {
    this.#pending.push({ number, at: Date.now() });
  }

  /** Oldest confirmed edit that the copy lacks: how long it has been waiting. */
  get waiting_ms(): number {
    return this.#pending[0] === undefined ? 0 : Date.now() - this.#pending[0].at;
  }

  /** The program was killed: what it had not copied yet is owed by its next start. */
  forgive(): void {
    this.#pending = [];
  }

  async look(): Promise<void> {
    if (this.#busy) return;
    this.#busy = true;
    try {
      for (const name of await readdir(this.#folder)) {
        const path = join(this.#folder, name, 'project.spinhue');
        const stats = await stat(path).catch(() => null);
        if (stats === null || !name.startsWith('Demo')) continue;
        const state = `${stats.ino} ${stats.mtimeMs} ${stats.size}`;
        if (state === this.#seen) continue;
        const text = await readFile(path, 'utf8');
        const reading = readBundle(text);
        if (!reading.ok) this.torn.push(`${path}: ${reading.problems[0]!.message}`);
        this.#seen = state;
        this.#number = Number(this.#mark.exec(text)?.[1] ?? 0);
        const now = Date.now();
        while (this.#pending[0] !== undefined && this.#pending[0].number <= this.#number) {
          this.lags_ms.push(now - this.#pending.shift()!.at);
        }
      }
    } catch {
      // The folder is not there yet.
    } finally {
      this.#busy = false;
    }
  }

  stop(): void {
    clearInterval(this.#timer);
  }
}
