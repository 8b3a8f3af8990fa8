/** A cell of a table that is written out: numbers stay numbers, null is an empty cell. */
export type CsvCell = string | number | null;

export interface CsvStyle {
  readonly delimiter: ',' | ';' | '\t';
  readonly decimal: '.' | ',';
}
const plainStyle: CsvStyle = { delimiter: ',', decimal: '.' };

/** Beginnings that a spreadsheet would run as a formula. */
const formula = /^[\s]*[=+\-@]|^[\t\r\n]/;

function cellText(cell: CsvCell, style: CsvStyle): string {
  if (cell === null) return '';
  if (typeof cell === 'number') {
    if (!Number.isFinite(cell)) return '';
    return style.decimal === ',' ? String(cell).replace('.', ',') : String(cell);
  }
  // An apostrophe makes a spreadsheet show the text as it is; reading it back takes the apostrophe off.
  const safe = formula.test(cell) ? `'${cell}` : cell;
  const quoted = safe.includes(style.delimiter) || /["\r\n]/.test(safe) || safe !== safe.trim();
  return quoted ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/**
 * Rows as delimited text (RFC 4180 quoting, CRLF line ends). Text that a spreadsheet would take for a formula is written
 * with an apostrophe in front. Throws for a decimal comma with commas as delimiter.
 */
export function toCsv(rows: readonly (readonly CsvCell[])[], style: CsvStyle = plainStyle): string {
  if (style.delimiter === style.decimal)
    throw new RangeError('the comma cannot be both delimiter and decimal sign');
  return rows.map((row) => `${row.map((cell) => cellText(cell, style)).join(style.delimiter)}\r\n`).join('');
}
