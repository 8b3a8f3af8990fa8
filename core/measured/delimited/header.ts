import type { XUnitFound } from '../reading/units';
import { xUnitOf, yUnitOf } from '../reading/units';
import type { YUnit } from '../../record/curve';
import { trimmed, type Row } from './rows';

export interface ColumnHeader {
  /** Heading without anything that only names a quantity or a unit; null where nothing else stands there. */
  readonly name: string | null;
  readonly x: XUnitFound;
  readonly y: YUnit;
}

export interface Header {
  /** Null where the file has no headings. */
  readonly columns: readonly ColumnHeader[] | null;
  readonly metadata: Readonly<Record<string, string>>;
}

const unitOnly =
  /^(?:a|a\.?u\.?|abs\.?|absorbance|absorbanz|absorbancia|absorption|extinktion|extinction|e|od|optical density|t|%\s*t|t\s*%|transmittance|transmission|%\s*transmi\w+|ε|epsilon|molar absorptivity|y)\s*(?:[/([].*)?$/i;

const named = (text: string): string | null =>
  text === '' || unitOnly.test(text) ? null : text.slice(0, 200);

function describe(text: string): ColumnHeader {
  return { name: named(text), x: xUnitOf(text), y: yUnitOf(text) };
}
const saysUnit = (text: string): boolean => {
  const { x, y } = describe(text);
  return x.unit !== 'unknown' || y !== 'unknown';
};

/** `Sample: blue salt`, `Solvent = water`, or two cells. */
function entryOf(row: Row): [string, string] | null {
  const cells = row.cells.map((cell) => cell.trim()).filter((cell) => cell !== '');
  const pair = /^([^:=]{1,60}?)\s*[:=]\s*(.+)$/.exec(cells.join(' '));
  if (pair !== null) return [pair[1]!.trim(), pair[2]!.trim().slice(0, 500)];
  return cells.length === 2 ? [cells[0]!.slice(0, 60), cells[1]!.slice(0, 500)] : null;
}

/**
 * Headings and the lines of information above a table. The last line before the table with two or more cells is the
 * heading; where it holds only units and the line right above has as many cells, that one holds the names.
 */
export function readHeader(head: readonly Row[], width: number): Header {
  let last = head.length - 1;
  while (last >= 0 && trimmed(head[last]!.cells).length === 0) last--;
  const line = head[last];
  const isHeading = line !== undefined && trimmed(line.cells).length >= 2;
  let columns: ColumnHeader[] | null = null;
  let above = last;
  if (isHeading) {
    const units = Array.from({ length: width }, (_, i) => (line.cells[i] ?? '').trim());
    const onlyUnits = units.every(
      (text) => text !== '' && saysUnit(text) && named(xUnitOf(text).unit === 'unknown' ? text : '') === null,
    );
    const over = head[last - 1];
    const beyond = head[last - 2];
    const namesAbove =
      onlyUnits &&
      over !== undefined &&
      over.cells.length === line.cells.length &&
      trimmed(over.cells).length > 0 &&
      !over.cells.some((cell) => cell.includes(':')) &&
      !(
        beyond !== undefined &&
        trimmed(beyond.cells).length > 0 &&
        beyond.cells.length === over.cells.length
      );
    columns = units.map((text, i) => {
      const described = describe(text);
      return namesAbove ? { ...described, name: named((over.cells[i] ?? '').trim()) } : described;
    });
    above = last - (namesAbove ? 2 : 1);
  }
  const entries = head
    .slice(0, above + 1)
    .map(entryOf)
    .filter((entry) => entry !== null && entry[0] !== '__proto__' && !/^sep$/i.test(entry[0]))
    .slice(0, 100) as [string, string][];
  return { columns, metadata: Object.fromEntries(entries) };
}
