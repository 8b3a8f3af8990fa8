import type { Host, ProjectCopy } from '../../host';
import { ContinuousMirror } from '../../host/continuousMirror';
import { type Edit, exportProject, type Store } from '../../store';

const scopeOf = ({ after, before }: Edit): string | null => {
  const row = (after ?? before) as { id: string; projectId?: string } | null;
  return row === null ? null : (row.projectId ?? row.id);
};

/** Remembered in the database, so that a change made just before the program was killed is copied at the next start. */
interface Mirrored {
  readonly turn: number;
  readonly folder: string | null;
}
const keyOf = (projectId: string): string => `mirrored:${projectId}`;

/** Keeps the folder of open files up to date: each changed project is written again shortly after the change. */
export class ProjectMirror {
  readonly #store: Store;
  readonly #host: Pick<Host, 'mirror'>;
  readonly #mirror: ContinuousMirror;
  readonly #stops: readonly (() => void)[];
  /** State of the journal that the copy under way was made from. */
  readonly #turns = new Map<string, number>();
  #folder: string | null = null;

  constructor(store: Store, host: Pick<Host, 'mirror'>) {
    this.#store = store;
    this.#host = host;
    this.#mirror = new ContinuousMirror({
      copyOf: (projectId) => this.#copyOf(projectId),
      write: (copy) => host.mirror.write(copy),
      onWritten: (projectId) => this.#remember(projectId),
    });
    this.#stops = [
      store.feed.subscribe((edits) => {
        for (const edit of edits) {
          const scope = scopeOf(edit);
          if (scope !== null) this.#mirror.changed(scope);
        }
      }),
      host.mirror.onStatus(({ folder }) => {
        if (folder !== this.#folder) void this.catchUp();
      }),
    ];
  }

  /** Marks every project whose copy is missing or older than the project, as after a crash or with another folder. */
  async catchUp(): Promise<void> {
    const { state, folder } = await this.#host.mirror.status();
    this.#folder = folder;
    if (state === 'off') return;
    const present = new Set((await this.#host.mirror.projects()).map(({ projectId }) => projectId));
    for (const { id } of await this.#store.db.projects.toArray()) {
      const kept = (await this.#store.db.settings.get(keyOf(id)))?.value as Mirrored | undefined;
      const current = kept?.folder === folder && kept.turn === (await this.#turnOf(id));
      if (!current || !present.has(id)) this.#mirror.changed(id);
    }
  }

  /** Writes what is waiting; resolves when it lies in the folder. Failures are told by the status of the mirror. */
  async flush(): Promise<void> {
    await this.#mirror.flush();
  }

  dispose(): void {
    this.#stops.forEach((stop) => stop());
    this.#mirror.stop();
  }

  async #copyOf(projectId: string): Promise<ProjectCopy | null> {
    const { state, folder } = await this.#host.mirror.status();
    const project = await this.#store.projects.get(projectId);
    if (state === 'off' || !project) return null;
    this.#folder = folder;
    // Looked up before the rows are: a change in between is copied once too often, never once too little.
    this.#turns.set(projectId, await this.#turnOf(projectId));
    const bundle = await exportProject(this.#store.db, projectId);
    return { projectId, projectName: project.name, bundle };
  }

  #remember(projectId: string): void {
    const value: Mirrored = { turn: this.#turns.get(projectId) ?? 0, folder: this.#folder };
    // Not remembering costs one copy at the next start.
    this.#store.db.settings.put({ key: keyOf(projectId), value }).catch(() => undefined);
  }

  async #turnOf(projectId: string): Promise<number> {
    const { journal } = this.#store;
    const last = await Promise.all([journal.nextUndo(projectId), journal.nextRedo(projectId)]);
    return Math.max(0, ...last.map((change) => change?.turn ?? 0));
  }
}
