import { ReadingError, type ReadingWarning } from '../reading/types';
import { isDataRow, readCell, type Cell } from './cells';
import type { Dialect } from './dialect';
import { trimmed, type Row } from './rows';

export interface DataRow {
  readonly line: number;
  readonly cells: readonly Cell[];
}

export interface Table {
  /** Lines before the first row of numbers, blank ones as empty rows, comments left out. */
  readonly head: readonly Row[];
  readonly rows: readonly DataRow[];
  readonly width: number;
}

interface Mark {
  readonly row: Row;
  readonly cells: readonly Cell[];
  readonly kind: 'data' | 'blank' | 'comment' | 'text';
}

function mark(row: Row, decimal: '.' | ','): Mark {
  if (row.comment) return { row, cells: [], kind: 'comment' };
  const texts = trimmed(row.cells);
  if (texts.length === 0) return { row, cells: [], kind: 'blank' };
  const cells = texts.map((text) => readCell(text, decimal));
  return { row, cells, kind: isDataRow(cells) ? 'data' : 'text' };
}

/** Most frequent number of cells; the larger on a tie. */
function usualWidth(rows: readonly DataRow[]): number {
  const counts = new Map<number, number>();
  for (const row of rows) counts.set(row.cells.length, (counts.get(row.cells.length) ?? 0) + 1);
  return [...counts].sort((a, b) => b[1] - a[1] || b[0] - a[0])[0]?.[0] ?? 0;
}

/** A line that starts with a number but holds words among its cells: a damaged row of the table, not a heading. */
const isDamaged = (each: Mark): boolean =>
  each.kind === 'text' && each.cells.length >= 2 && each.cells[0]!.kind === 'number';

/** Two numbers at the start of a line under any dialect: above the table such a line is a row that was not understood. */
const twoNumbers = /^\s*"?[+-]?\d[\d.,]*"?\s*[;,\t ]\s*"?[+-]?\d/;

const someLines = (lines: readonly number[]): string =>
  `line${lines.length === 1 ? '' : 's'} ${lines.slice(0, 5).join(', ')}${lines.length > 5 ? ', …' : ''}`;

/**
 * Finds the one table of the file. It begins at the first row of numbers; a line of words ends it unless the rows after
 * it carry on in the same direction. What follows the table (a list of peaks, say) is left out and reported.
 */
export function findTable(all: readonly Row[], dialect: Dialect, warnings: ReadingWarning[]): Table {
  const marks = all.map((row) => mark(row, dialect.decimal));
  const start = marks.findIndex((each) => each.kind === 'data');
  if (start < 0) throw new ReadingError('no-table', 'no table of numbers was found');
  const rows: DataRow[] = [];
  const skipped: number[] = [];
  const damaged: number[] = [];
  let pending: number[] = [];
  let end = marks.length;
  const xOf = (cells: readonly Cell[]) => (cells[0]?.kind === 'number' ? cells[0].value : Number.NaN);
  for (let i = start; i < marks.length; i++) {
    const each = marks[i]!;
    if (each.kind === 'blank' || each.kind === 'comment') continue;
    if (each.kind === 'text' && !(pending.length === 0 && isDamaged(each))) {
      if (pending.length === 0) end = i;
      pending.push(each.row.line);
      continue;
    }
    if (pending.length > 0) {
      const direction = rows.length > 1 ? Math.sign(xOf(rows.at(-1)!.cells) - xOf(rows[0]!.cells)) : 0;
      const onward = Math.sign(xOf(each.cells) - xOf(rows.at(-1)!.cells));
      const fits =
        each.cells.length === usualWidth(rows) && onward !== 0 && (direction === 0 || onward === direction);
      if (!fits) break;
      skipped.push(...pending);
      pending = [];
      end = marks.length;
    }
    if (each.kind === 'text') damaged.push(each.row.line);
    rows.push({ line: each.row.line, cells: each.cells });
  }
  const unread = marks
    .slice(0, start)
    .filter((each) => each.kind === 'text' && twoNumbers.test(each.row.cells.join(' ')))
    .map((each) => each.row.line);
  if (unread.length > 0) {
    warnings.push({
      code: 'skipped-lines',
      message: `${someLines(unread)} above the table: numbers in another layout than the table's; not read`,
    });
  }
  if (skipped.length > 0) {
    warnings.push({
      code: 'skipped-lines',
      message: `${someLines(skipped)} inside the table: words, no numbers; the rows around are read`,
    });
  }
  if (damaged.length > 0) {
    warnings.push({
      code: 'recovered',
      message: `${someLines(damaged)}: a cell is not a number and is read as missing`,
    });
  }
  if (end < marks.length && marks.slice(end).some((each) => each.kind !== 'blank')) {
    const left = marks.slice(end).filter((each) => each.kind === 'data' || each.kind === 'text').length;
    warnings.push({
      code: 'footer',
      message: `footer ignored: ${left} line${left === 1 ? '' : 's'} from line ${marks[end]!.row.line}`,
    });
  }
  return {
    head: marks
      .slice(0, start)
      .filter((each) => each.kind !== 'comment')
      .map((each) => each.row),
    rows,
    width: usualWidth(rows),
  };
}

/**
 * Rows of a width that the table does not have: a decimal comma among delimiting commas shows up like this. Their
 * ordinates cannot be told apart and become missing.
 */
export function evenRows(table: Table, warnings: ReadingWarning[]): DataRow[] {
  const odd: number[] = [];
  const rows = table.rows.map((row) => {
    if (row.cells.length <= table.width) return row;
    odd.push(row.line);
    return {
      line: row.line,
      cells: [row.cells[0]!, ...Array.from({ length: table.width - 1 }, (): Cell => ({ kind: 'text' }))],
    };
  });
  if (odd.length > 0) {
    warnings.push({
      code: 'recovered',
      message: `${someLines(odd)}: more cells than the other rows have; the ordinates are read as missing`,
    });
  }
  return rows;
}
