import type { WishInput } from '../../../../core/search';
import { Observable } from '../../../app/session/observable';
import type { Settings } from '../../../store';
import { madeWithName } from '../../../workers/madeWith';
import type { Overlay } from '../../../workers/protocol';
import type { Checkpoint } from '../../../workers/search/protocol';
import { type RunSetup, SearchRun } from './searchRun';

export type OpenSearch = Settings['openSearches'][number];

/** Where a search stood, and with which model and parameters it came there. */
interface Noted extends Checkpoint {
  readonly madeWith: string;
}

/** Where an unfinished search can go on; null where other parameters or another model hold now: it starts again. */
export function goesOnFrom({ checkpoint }: OpenSearch, overlay: Overlay): Checkpoint | null {
  const noted = checkpoint as Noted | null;
  return noted?.madeWith === madeWithName(overlay) ? noted : null;
}

/** Time between two notes of how far the open searches have come, ms. */
const note_ms = 3000;

export interface Notebook {
  read(): Promise<readonly OpenSearch[]>;
  write(open: OpenSearch[]): Promise<void>;
}

/**
 * The searches of this window, whichever view is shown. Open ones are noted down now and then, so that closing the
 * window in the middle of one loses at most the last seconds.
 */
export class SearchRuns extends Observable {
  readonly #make: (setup: RunSetup) => SearchRun;
  #runs: readonly SearchRun[] = [];
  #notebook: Notebook | null = null;
  #left: readonly OpenSearch[] = [];
  #due: ReturnType<typeof setTimeout> | null = null;

  constructor(make: (setup: RunSetup) => SearchRun = (setup) => new SearchRun(setup)) {
    super();
    this.#make = make;
  }

  /** Takes up the notes of earlier windows, once. */
  async open(notebook: Notebook): Promise<void> {
    if (this.#notebook !== null) return;
    this.#notebook = notebook;
    this.#left = await notebook.read();
    this.changed();
  }

  of(projectId: string): readonly SearchRun[] {
    return this.#runs.filter(({ setup }) => setup.projectId === projectId);
  }

  /** Searches that an earlier window did not finish. */
  leftOver(projectId: string): readonly OpenSearch[] {
    return this.#left.filter((each) => each.projectId === projectId);
  }

  start(projectId: string, wish: WishInput, overlay: Overlay): SearchRun {
    return this.#add({
      id: crypto.randomUUID(),
      projectId,
      wish,
      overlay,
      startedAt: new Date().toISOString(),
      from: null,
    });
  }

  /** Goes on with what an earlier window left. */
  takeUp(left: OpenSearch, overlay: Overlay): SearchRun {
    this.#left = this.#left.filter(({ id }) => id !== left.id);
    return this.#add({
      ...left,
      wish: left.wish as WishInput,
      overlay,
      from: goesOnFrom(left, overlay),
    });
  }

  forget(left: OpenSearch): void {
    this.#left = this.#left.filter(({ id }) => id !== left.id);
    this.changed();
    this.#note();
  }

  close(run: SearchRun): void {
    run.dispose();
    this.#runs = this.#runs.filter((each) => each !== run);
    this.changed();
    this.#note();
  }

  #add(setup: RunSetup): SearchRun {
    const run = this.#make(setup);
    this.#runs = [...this.#runs, run];
    run.subscribe(() => this.#noteSoon());
    this.changed();
    this.#note();
    return run;
  }

  #noteSoon(): void {
    this.#due ??= setTimeout(() => this.#note(), note_ms);
  }

  #note(): void {
    if (this.#due !== null) clearTimeout(this.#due);
    this.#due = null;
    const open = this.#runs.flatMap((run): OpenSearch[] => {
      const { id, projectId, startedAt, wish } = run.setup;
      if (!run.open) return [];
      const { checkpoint, state } = run;
      return [
        {
          id,
          projectId,
          startedAt,
          wish: { ...wish },
          done: state === null ? 0 : state.evaluated + state.skipped,
          count: state?.count ?? 0,
          checkpoint:
            checkpoint === null
              ? null
              : ({ ...checkpoint, madeWith: madeWithName(run.setup.overlay) } satisfies Noted),
        },
      ];
    });
    // A note that cannot be written costs no more than the place where the search stood.
    this.#notebook?.write([...this.#left, ...open].slice(-20)).catch(() => undefined);
  }
}

export const searchRuns = new SearchRuns();
