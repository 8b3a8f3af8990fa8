import type { YUnit } from '../../record/curve';
import type { RawPoints } from '../reading/order';
import { xUnitOf, type XUnitFound } from '../reading/units';
import type { Cell } from './cells';
import type { Header } from './header';
import type { DataRow } from './table';

/** One y column with the x column it belongs to. */
export interface Series {
  readonly xColumn: number;
  readonly yColumn: number;
  readonly name: string | null;
  readonly x: XUnitFound;
  readonly y: YUnit;
}

const numberAt = (row: DataRow, column: number): number | null => {
  const cell = row.cells[column];
  return cell?.kind === 'number' ? cell.value : null;
};

function runsOneWay(rows: readonly DataRow[], column: number): boolean {
  const values = rows.map((row) => numberAt(row, column)).filter((value) => value !== null);
  if (values.length < 2) return false;
  const direction = Math.sign(values[1]! - values[0]!);
  return (
    direction !== 0 && values.every((value, i) => i === 0 || Math.sign(value - values[i - 1]!) === direction)
  );
}

/** Whether a column looks like wavelengths or wavenumbers, for tables without headings. */
const looksLikeX = (rows: readonly DataRow[], column: number): boolean =>
  runsOneWay(rows, column) && rows.every((row) => (numberAt(row, column) ?? 500) > 100);

/** Pairs every y column with its x column: the first column, or the one to its left where columns come in pairs. */
export function findSeries(rows: readonly DataRow[], width: number, header: Header): Series[] {
  const { columns } = header;
  const isX = (column: number): boolean => {
    if (column === 0) return true;
    const heading = columns?.[column];
    if (heading !== undefined)
      return heading.x.unit !== 'unknown' && heading.y === 'unknown' && runsOneWay(rows, column);
    return false;
  };
  const pairsWithoutHeadings =
    columns === null &&
    width >= 4 &&
    width % 2 === 0 &&
    Array.from({ length: width }, (_, i) => i).every((i) => looksLikeX(rows, i) === (i % 2 === 0));
  const series: Series[] = [];
  let xColumn = 0;
  for (let column = 1; column < width; column++) {
    if (pairsWithoutHeadings ? column % 2 === 0 : isX(column)) {
      xColumn = column;
      continue;
    }
    const own = columns?.[column];
    const beside = columns?.[xColumn];
    // In paired columns the name may stand over the x column.
    const shared = xColumn > 0 || columns?.some((_, i) => i > 0 && isX(i)) === true;
    const nameOverX =
      shared && beside?.name != null && xUnitOf(beside.name).unit === 'unknown' && own?.name === null
        ? beside.name
        : null;
    series.push({
      xColumn,
      yColumn: column,
      name: own?.name ?? nameOverX,
      x: beside?.x ?? { unit: 'unknown', factor: 1 },
      y: own?.y ?? 'unknown',
    });
  }
  return series;
}

export interface SeriesPoints extends RawPoints {
  readonly lines: readonly number[];
  readonly saturated: number;
  readonly missing: number;
}

const ordinate = (cell: Cell | undefined): number | null => (cell?.kind === 'number' ? cell.value : null);

/** The points of one series: rows where both cells are empty belong to longer neighbours and are no points. */
export function pointsOf(rows: readonly DataRow[], series: Series): SeriesPoints {
  const x: number[] = [];
  const y: (number | null)[] = [];
  const lines: number[] = [];
  let saturated = 0;
  let missing = 0;
  for (const row of rows) {
    const abscissa = numberAt(row, series.xColumn);
    const cell = row.cells[series.yColumn];
    if (abscissa === null) {
      if (cell !== undefined && cell.kind !== 'empty') missing++;
      continue;
    }
    if (cell?.kind === 'saturated') saturated++;
    else if (cell?.kind !== 'number') missing++;
    x.push(abscissa);
    y.push(ordinate(cell));
    lines.push(row.line);
  }
  return { x, y, lines, saturated, missing };
}
