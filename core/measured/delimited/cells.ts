/** What one cell of a table says. */
export type Cell =
  | { readonly kind: 'number'; readonly value: number; readonly thousands: 'none' | 'clear' | 'doubtful' }
  | { readonly kind: 'saturated' | 'missing' | 'empty' }
  | { readonly kind: 'text' };

const plain = {
  '.': /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d{1,3})?$/,
  ',': /^[+-]?(?:\d+,?\d*|,\d+)(?:[eE][+-]?\d{1,3})?$/,
};
const grouped = {
  '.': /^[+-]?[1-9]\d{0,2}(?:,\d{3})+(\.\d+)?$/,
  ',': /^[+-]?[1-9]\d{0,2}(?:\.\d{3})+(,\d+)?$/,
};
const saturated =
  /^(?:o\.?ve?r?[\s._-]*(?:flo?w|flw|range?|rng|load|scale|fl)?|over|ovl|ofl|o\.?\s?r(?:ange)?\.?|sat(?:\.|urated|uration)?|clipp?(?:ed)?|off[\s-]?scale|out of range|max|\*+|#+|[>≥]+ ?=? ?[\d.,]+|\+?inf(?:inity|inite)?|\+?∞|-{2,})$/i;
const missing = /^(?:nan|n\/?a|null|none|\?|-|–|\.|blank|[<≤]+ ?=? ?-?[\d.,]+|-inf(?:inity)?)$/i;

/** Reads a cell with the given decimal sign. A number may group its thousands with the other sign. */
export function readCell(raw: string, decimal: '.' | ','): Cell {
  const text = raw.trim();
  if (text === '') return { kind: 'empty' };
  if (plain[decimal].test(text)) {
    const value = Number(text.replace(',', '.'));
    return Number.isFinite(value) ? { kind: 'number', value, thousands: 'none' } : { kind: 'text' };
  }
  const groups = grouped[decimal].exec(text);
  if (groups !== null) {
    const value = Number(
      decimal === '.' ? text.replaceAll(',', '') : text.replaceAll('.', '').replace(',', '.'),
    );
    return { kind: 'number', value, thousands: groups[1] === undefined ? 'doubtful' : 'clear' };
  }
  if (saturated.test(text)) return { kind: 'saturated' };
  if (missing.test(text)) return { kind: 'missing' };
  return { kind: 'text' };
}

/**
 * A row of a spectrum table: numbers, or marks that stand for one, and at least two of them. The first cell may be
 * empty where the first of several paired columns is shorter than the others.
 */
export function isDataRow(cells: readonly Cell[]): boolean {
  const first = cells[0]?.kind;
  if (first !== 'number' && first !== 'empty') return false;
  const filled = cells.filter((cell) => cell.kind !== 'empty');
  return (
    filled.length >= 2 &&
    filled.every((cell) => cell.kind !== 'text') &&
    filled.some((cell) => cell.kind === 'number')
  );
}
