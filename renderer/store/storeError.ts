import { SpinhueError } from '../../core/errors';

export type StoreErrorCode =
  | 'newer-database'
  | 'storage-full'
  | 'storage-unavailable'
  | 'other-window'
  | 'changed-meanwhile'
  | 'not-found'
  | 'read-only'
  | 'storage-failed';

/** What went wrong in the database, with a way out. The interface switches on `code`. */
export class StoreError extends Error {
  override readonly name = 'StoreError';
  readonly code: StoreErrorCode;
  readonly remedy: string;

  constructor(code: StoreErrorCode, message: string, remedy: string, cause?: unknown) {
    super(message, { cause });
    this.code = code;
    this.remedy = remedy;
  }
}

const named = (error: unknown, ...names: string[]): boolean => {
  let current: unknown = error;
  for (let depth = 0; depth < 4 && current instanceof Error; depth++) {
    if (names.includes(current.name)) return true;
    current = (current as { inner?: unknown }).inner ?? current.cause;
  }
  return false;
};

/** Maps whatever the database threw to one of our errors; ours and the core's pass through. */
export function asStoreError(error: unknown): StoreError | SpinhueError {
  if (error instanceof StoreError || error instanceof SpinhueError) return error;
  if (named(error, 'QuotaExceededError')) {
    return new StoreError(
      'storage-full',
      'The disk or the space allowed to this program is full: the change was not saved.',
      'What you typed is still on screen. Export the project, free some space, then save again.',
      error,
    );
  }
  if (named(error, 'MissingAPIError', 'SecurityError', 'InvalidStateError')) {
    return new StoreError(
      'storage-unavailable',
      'The database of this program cannot be opened here.',
      'Private windows and locked-down profiles have no lasting storage. Start the program from an ordinary profile.',
      error,
    );
  }
  if (named(error, 'DatabaseClosedError')) {
    return new StoreError(
      'other-window',
      'The database was closed because another window needs it, perhaps for an update.',
      'Close the other window, then reload this one.',
      error,
    );
  }
  const words = error instanceof Error ? error.message : String(error);
  return new StoreError(
    'storage-failed',
    `The database reported an error: ${words}`,
    'Nothing was changed. Try again; if it happens once more, export the project and restart.',
    error,
  );
}
