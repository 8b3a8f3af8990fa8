import type { Host } from '../../host';
import { type Edit, exportProject, type Store } from '../../store';

/** Edits that follow each other closely go into one copy. */
const gather_ms = 700;

const scopeOf = ({ after, before }: Edit): string | null => {
  const row = (after ?? before) as { id: string; projectId?: string } | null;
  return row === null ? null : (row.projectId ?? row.id);
};

/** Keeps the folder of open files up to date: each changed project is written again shortly after the change. */
export class ProjectMirror {
  readonly #store: Store;
  readonly #host: Pick<Host, 'mirror'>;
  readonly #dirty = new Set<string>();
  readonly #unsubscribe: () => void;
  #timer: ReturnType<typeof setTimeout> | null = null;
  #writing: Promise<void> = Promise.resolve();

  constructor(store: Store, host: Pick<Host, 'mirror'>) {
    this.#store = store;
    this.#host = host;
    this.#unsubscribe = store.feed.subscribe((edits) => {
      for (const edit of edits) {
        const scope = scopeOf(edit);
        if (scope !== null) this.#dirty.add(scope);
      }
      this.#timer ??= setTimeout(() => void this.flush(), gather_ms);
    });
  }

  /** Writes what is waiting; resolves when it lies in the folder. Failures are told by the status of the mirror. */
  flush(): Promise<void> {
    if (this.#timer !== null) clearTimeout(this.#timer);
    this.#timer = null;
    this.#writing = this.#writing.then(() => this.#writeAll());
    return this.#writing;
  }

  dispose(): void {
    this.#unsubscribe();
    if (this.#timer !== null) clearTimeout(this.#timer);
  }

  async #writeAll(): Promise<void> {
    const waiting = [...this.#dirty];
    this.#dirty.clear();
    for (const projectId of waiting) {
      try {
        if ((await this.#host.mirror.status()).state === 'off') return;
        const project = await this.#store.projects.get(projectId);
        if (!project) continue;
        const bundle = await exportProject(this.#store.db, projectId);
        await this.#host.mirror.write({ projectId, projectName: project.name, bundle });
      } catch {
        // It stays to be written with the next change; the folder's own status says what is wrong.
        this.#dirty.add(projectId);
      }
    }
  }
}
