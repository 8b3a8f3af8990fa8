import type { Row } from './rows';
import { trimmed } from './rows';

/**
 * Where a comma is both delimiter and decimal sign, `400,0,123` has one cell too many under a heading of two. Returns
 * the rows with the halves of each number joined by a point, or null where the file is not like that: every row must
 * have exactly the cells that splitting each y (and perhaps x) in two would give, all of digits only.
 */
export function rejoinDecimals(rows: readonly Row[]): Row[] | null {
  const digits = /^\s*[+-]?\d+\s*$/;
  const data = rows.filter((row) => !row.comment && trimmed(row.cells).length > 0);
  const first = data.findIndex((row) => trimmed(row.cells).every((cell) => digits.test(cell)));
  if (first < 0) return null;
  const body = data.slice(first);
  const width = trimmed(body[0]!.cells).length;
  if (
    width < 3 ||
    !body.every(
      (row) =>
        trimmed(row.cells).length === width &&
        row.cells.every((cell) => cell.trim() === '' || digits.test(cell)),
    )
  ) {
    return null;
  }
  const heading = first > 0 ? trimmed(data[first - 1]!.cells).length : 0;
  const columns = heading >= 2 ? heading : width === 3 || width === 4 ? 2 : 0;
  if (columns === 0 || (width !== 2 * columns - 1 && width !== 2 * columns)) return null;
  // Decimals are printed with as many digits in every row; a column of counts is not.
  const wholeX = width === 2 * columns - 1;
  const isFraction = (column: number) => (wholeX ? column > 0 && column % 2 === 0 : column % 2 === 1);
  for (let column = 0; column < width; column++) {
    if (!isFraction(column)) continue;
    const lengths = new Set(body.map((row) => row.cells[column]!.trim().length));
    if (lengths.size !== 1 || body.some((row) => /[+-]/.test(row.cells[column]!))) return null;
  }
  const inBody = new Set(body);
  return rows.map((row) => {
    if (!inBody.has(row)) return row;
    const cells: string[] = [];
    for (let column = 0; column < width; column++) {
      const text = row.cells[column]!.trim();
      if (isFraction(column)) cells[cells.length - 1] += `.${text}`;
      else cells.push(text);
    }
    return { ...row, cells };
  });
}
