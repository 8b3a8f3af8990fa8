/**
 * Cells of pasted lines: by tab, semicolon or white space, by comma only where nothing else parts them, so that a decimal
 * comma stays one. Lines without a digit, such as a head, are left out.
 */
export const pastedCells = (text: string): string[][] =>
  text
    .split(/\r\n|\r|\n/)
    .filter((line) => /\d/.test(line))
    .map((line) => {
      const trimmed = line.trim();
      const cells = /[\t;]/.test(trimmed) ? trimmed.split(/[\t;]/) : trimmed.split(/,?\s+/);
      return (cells.length === 1 && (trimmed.match(/,/g)?.length ?? 0) > 0 ? trimmed.split(',') : cells).map(
        (cell) => cell.trim(),
      );
    });
