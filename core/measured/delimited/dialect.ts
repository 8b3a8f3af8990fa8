import { ReadingError } from '../reading/types';
import { isDataRow, readCell } from './cells';
import { cutRows, trimmed, type Delimiter, type Row } from './rows';

export interface Dialect {
  readonly delimiter: Delimiter;
  readonly decimal: '.' | ',';
}

const candidates: readonly Dialect[] = (['\t', ';', ',', 'whitespace'] as const).flatMap((delimiter) =>
  (['.', ','] as const).map((decimal) => ({ delimiter, decimal })),
);
const sample = 60_000;

/** How many lines read as rows of a table, and how many of them only with grouped thousands. */
function score(rows: readonly Row[], decimal: '.' | ','): { rows: number; grouped: number } {
  let count = 0;
  let grouped = 0;
  for (const row of rows) {
    if (row.comment) continue;
    const cells = trimmed(row.cells).map((cell) => readCell(cell, decimal));
    if (!isDataRow(cells)) continue;
    count++;
    if (cells.some((cell) => cell.kind === 'number' && cell.thousands !== 'none')) grouped++;
  }
  return { rows: count, grouped };
}

/**
 * The delimiter and decimal sign under which most lines are rows of numbers. Among equals the reading without grouped
 * thousands wins, then tab before semicolon before comma before blanks, and the decimal point before the comma.
 */
export function guessDialect(text: string, fixed: Partial<Dialect> = {}): Dialect {
  const part = text.length > sample ? text.slice(0, text.lastIndexOf('\n', sample) + 1 || sample) : text;
  let best: { dialect: Dialect; rows: number; grouped: number } | null = null;
  let refusal: ReadingError | null = null;
  for (const dialect of candidates) {
    if (fixed.delimiter !== undefined && fixed.delimiter !== dialect.delimiter) continue;
    if (fixed.decimal !== undefined && fixed.decimal !== dialect.decimal) continue;
    let rows: Row[];
    try {
      rows = cutRows(part, dialect.delimiter);
    } catch (error) {
      if (!(error instanceof ReadingError)) throw error;
      refusal ??= error;
      continue;
    }
    const found = { dialect, ...score(rows, dialect.decimal) };
    if (
      best === null ||
      found.rows > best.rows ||
      (found.rows === best.rows && found.grouped < best.grouped)
    ) {
      best = found;
    }
  }
  if (best === null || best.rows === 0) {
    if (refusal !== null && best?.rows !== 0) throw refusal;
    throw new ReadingError('no-table', 'no table of numbers was found: each line needs x and at least one y');
  }
  return best.dialect;
}
