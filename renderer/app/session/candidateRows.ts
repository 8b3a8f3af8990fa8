import type { Candidate } from '../../../core/record/project';
import { asStoreError, type Store, type StoreError } from '../../store';
import type { SpinhueError } from '../../../core/errors';
import { Observable } from './observable';

/** Read in portions, so that a large project does not freeze the window while it opens. */
const portion = 2000;
/** The first rows are shown at once; a list that is long and still growing is drawn again only now and then. */
const calm_ms = 1000;

type Listener = (rows: readonly Candidate[]) => void;

/** The candidates of one project that are not in the bin, kept in memory and brought up to date by the change feed. */
export class CandidateRows extends Observable {
  readonly projectId: string;
  readonly #store: Store;
  readonly #rows = new Map<string, Candidate>();
  readonly #onRows: Listener;
  #state: 'reading' | 'ready' | 'failed' = 'reading';
  #error: StoreError | SpinhueError | null = null;
  #unreadable = 0;

  /** @param onRows Told of every row that was read or changed. */
  constructor(store: Store, projectId: string, onRows: Listener = () => undefined) {
    super();
    this.projectId = projectId;
    this.#store = store;
    this.#onRows = onRows;
  }

  /** Reads the project and follows its changes until the function that it gives is called. */
  start(): () => void {
    let current = true;
    const unsubscribe = this.#store.feed.subscribe((edits) => {
      const mine = edits.filter(
        (edit) => edit.table === 'candidates' && ownerOf(edit.after ?? edit.before) === this.projectId,
      );
      if (mine.length === 0) return;
      this.#take(mine.map(({ id, after }) => [id, after as Candidate | null] as const));
      this.changed();
    });
    void this.#read(() => current);
    return () => {
      current = false;
      unsubscribe();
      this.stopTelling();
    };
  }

  get state(): 'reading' | 'ready' | 'failed' {
    return this.#state;
  }
  get error(): StoreError | SpinhueError | null {
    return this.#error;
  }
  /** Rows in the database that make no sense; they are left alone and not shown. */
  get unreadable(): number {
    return this.#unreadable;
  }
  get size(): number {
    return this.#rows.size;
  }
  get(id: string): Candidate | undefined {
    return this.#rows.get(id);
  }
  values(): Candidate[] {
    return [...this.#rows.values()];
  }

  async #read(current: () => boolean): Promise<void> {
    this.#state = 'reading';
    this.#error = null;
    this.#unreadable = 0;
    try {
      for await (const rows of this.#store.candidates.inPortions(this.projectId, portion)) {
        if (!current()) return;
        this.#take(rows.map((row) => [row.id, row] as const));
        this.changed(this.#rows.size > portion ? calm_ms : 0);
      }
      this.#state = 'ready';
    } catch (error) {
      this.#state = 'failed';
      this.#error = asStoreError(error);
    }
    this.changed();
  }

  #take(entries: readonly (readonly [id: string, row: Candidate | null])[]): void {
    const shown: Candidate[] = [];
    for (const [id, row] of entries) {
      if (row === null || row.deletedAt !== null) this.#rows.delete(id);
      else if (!makesSense(row)) this.#unreadable += 1;
      else {
        this.#rows.set(id, row);
        shown.push(row);
      }
    }
    if (shown.length > 0) this.#onRows(shown);
  }
}

const ownerOf = (row: object | null): unknown => (row as { projectId?: string } | null)?.projectId;

/** Enough to draw a row without falling over; the full check is made when a record is opened or exported. */
function makesSense(row: Candidate): boolean {
  const { composition, tags } = row as Partial<Candidate>;
  return (
    typeof composition === 'object' &&
    typeof composition.metal === 'string' &&
    typeof composition.ligands === 'object' &&
    Array.isArray(tags)
  );
}
