import type { SpinhueError } from '../../../core/errors';
import { StoreError, type StoreErrorCode } from '../storeError';

/** What concerns the storage itself and not one record. */
const troubles: ReadonlySet<StoreErrorCode> = new Set<StoreErrorCode>([
  'storage-full',
  'storage-failed',
  'storage-unavailable',
  'other-window',
]);

/** Whether saving works at present: trouble stays until something was saved again. */
export class SaveHealth {
  #trouble: StoreError | null = null;
  readonly #listeners = new Set<() => void>();

  get trouble(): StoreError | null {
    return this.#trouble;
  }

  subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  failed(error: StoreError | SpinhueError): void {
    if (error instanceof StoreError && troubles.has(error.code)) this.#become(error);
  }

  saved(): void {
    if (this.#trouble !== null) this.#become(null);
  }

  #become(trouble: StoreError | null): void {
    this.#trouble = trouble;
    for (const listener of this.#listeners) listener();
  }
}
