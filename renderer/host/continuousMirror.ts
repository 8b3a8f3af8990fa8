import type { MirrorReceipt, ProjectCopy } from './bridge';

/** A change is in the folder at the latest this long after it was made, as long as writing itself is quick. */
export const mirrorDelay_ms = 800;
/** After a failure; the status line says what is wrong meanwhile. */
const retryDelay_ms = 5_000;

export interface ContinuousMirrorOptions {
  /** The project as it is in the database now; null where it is gone for good. */
  readonly copyOf: (projectId: string) => Promise<ProjectCopy | null>;
  readonly write: (copy: ProjectCopy) => Promise<MirrorReceipt>;
  readonly onWritten?: (projectId: string, receipt: MirrorReceipt) => void;
  readonly onFailed?: (projectId: string, error: unknown) => void;
}

/**
 * Keeps the folder of open files up with the database: every change marks its project, and a marked project is written
 * soon after, whole. One write at a time; changes that come meanwhile are picked up by the next one.
 */
export class ContinuousMirror {
  readonly #options: ContinuousMirrorOptions;
  readonly #due = new Set<string>();
  #timer: ReturnType<typeof setTimeout> | null = null;
  #running: Promise<void> | null = null;
  #stopped = false;

  constructor(options: ContinuousMirrorOptions) {
    this.#options = options;
  }

  changed(projectId: string): void {
    this.#due.add(projectId);
    this.#schedule(mirrorDelay_ms);
  }

  /** Writes what is due at once; true when nothing is left. */
  async flush(): Promise<boolean> {
    await this.#running;
    await this.#writeDue();
    return this.#due.size === 0;
  }

  stop(): void {
    this.#stopped = true;
    if (this.#timer !== null) clearTimeout(this.#timer);
  }

  /** The first change sets the time: later ones do not push it further away. */
  #schedule(delay_ms: number): void {
    if (this.#timer !== null || this.#stopped || this.#running !== null) return;
    this.#timer = setTimeout(() => {
      this.#timer = null;
      void this.#writeDue();
    }, delay_ms);
  }

  #writeDue(): Promise<void> {
    this.#running ??= this.#writeAll().finally(() => {
      this.#running = null;
    });
    return this.#running;
  }

  async #writeAll(): Promise<void> {
    if (this.#timer !== null) clearTimeout(this.#timer);
    this.#timer = null;
    let failed = false;
    const batch = [...this.#due];
    for (const projectId of batch) {
      this.#due.delete(projectId);
      try {
        const copy = await this.#options.copyOf(projectId);
        if (copy === null) continue;
        const receipt = await this.#options.write(copy);
        this.#options.onWritten?.(projectId, receipt);
      } catch (error) {
        failed = true;
        this.#due.add(projectId);
        this.#options.onFailed?.(projectId, error);
      }
    }
    if (this.#due.size > 0) {
      queueMicrotask(() => queueMicrotask(() => this.#schedule(failed ? retryDelay_ms : mirrorDelay_ms)));
    }
  }
}
