import Papa from 'papaparse';
import { ReadingError, type TextLayout } from '../reading/types';

export type Delimiter = NonNullable<TextLayout['delimiter']>;

/** One line of the file cut into cells. Line numbers count from 1; a quoted cell with a line break shifts them. */
export interface Row {
  readonly line: number;
  readonly cells: readonly string[];
  readonly comment: boolean;
}

const isComment = (line: string): boolean => /^\s*"?(?:#(?!#)|!|\/\/)/.test(line);

/** Cuts text into rows. Throws a ReadingError where a quotation mark is opened and not closed. */
export function cutRows(text: string, delimiter: Delimiter): Row[] {
  const even = text.replace(/\r\n?/g, '\n').replace(/\u001a\s*$/, '');
  if (delimiter === 'whitespace') {
    return even.split('\n').map((line, i) => ({
      line: i + 1,
      cells: line.trim() === '' ? [] : line.trim().split(/[ \t]+/),
      comment: isComment(line),
    }));
  }
  const parsed = Papa.parse<string[]>(even, { delimiter, newline: '\n', quoteChar: '"' });
  const broken = parsed.errors.find((error) => error.type === 'Quotes');
  if (broken !== undefined) {
    throw new ReadingError(
      'structure',
      `row ${(broken.row ?? 0) + 1}: a quotation mark is opened and not closed, or stands inside a cell`,
    );
  }
  return parsed.data.map((cells, i) => ({
    line: i + 1,
    cells: cells.length === 1 && cells[0]!.trim() === '' ? [] : cells,
    comment: isComment(cells[0] ?? ''),
  }));
}

/** Cells without the empty ones at the end of the line. */
export function trimmed(cells: readonly string[]): readonly string[] {
  let end = cells.length;
  while (end > 0 && cells[end - 1]!.trim() === '') end--;
  return cells.slice(0, end);
}
