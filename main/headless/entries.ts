import { SpinhueError } from '../../core/errors';

export interface EntryError {
  readonly id?: unknown;
  readonly error: { readonly code: string; readonly message: string; readonly field: string };
}

const isObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/**
 * Runs `work` on each entry of a parsed file: an array, `{"cases": [...]}`, or a single object (whose answer is then a
 * single object too). What an entry is refused for is its own answer, `{id, error}`; the others are unaffected.
 */
export function answerEntries<T>(
  input: unknown,
  work: (entry: Record<string, unknown>) => T,
): (T | EntryError) | (T | EntryError)[] {
  const entries = Array.isArray(input)
    ? input
    : isObject(input) && Array.isArray(input.cases)
      ? input.cases
      : null;
  if (entries === null) return answerOne(input, 'the entry', work);
  if (entries.length === 0) {
    throw new SpinhueError({
      code: 'empty-input',
      message: 'the file holds no entries',
      field: 'file',
      remedy: 'give a JSON array of entries',
    });
  }
  return entries.map((entry, index) => answerOne(entry, `[${index}]`, work));
}

function answerOne<T>(
  entry: unknown,
  place: string,
  work: (entry: Record<string, unknown>) => T,
): T | EntryError {
  const named = isObject(entry) && entry.id !== undefined ? { id: entry.id } : {};
  try {
    if (!isObject(entry)) {
      throw new SpinhueError({
        code: 'wrong-type',
        message: `${place} is ${entry === null ? 'null' : typeof entry}, not an object`,
        field: place,
      });
    }
    return work(entry);
  } catch (error) {
    if (!(error instanceof SpinhueError)) throw error;
    return { ...named, error: { code: error.code, message: error.message, field: error.field } };
  }
}
