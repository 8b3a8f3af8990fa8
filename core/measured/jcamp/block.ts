import { orderCurve, orderPeaks, tidy } from '../reading/order';
import { ReadingError, readingLimits, type ReadSpectrum, type ReadingWarning } from '../reading/types';
import { xUnitOf, yUnitOf } from '../reading/units';
import { decodeAsdf } from './asdf';
import { axisOf } from './axis';
import { checkDuplicates, recordOf, type Block } from './blocks';
import { valueOf, type LabelledRecord, type TextLine } from './labels';
import { factorLabel, numberLabel, type PrintedNumber } from './numbers';
import { decodePairs } from './pairs';

const longest = 200;
export const shorten = (text: string): string =>
  text.length > longest ? `${text.slice(0, longest)}…` : text;

const bulky = new Set(['XYDATA', 'XYPOINTS', 'PEAKTABLE', 'DATATABLE']);

/** Everything a block says about itself, as written. */
export function metadataOf(block: Block): Record<string, string> {
  const entries = block.records
    .filter((record) => !bulky.has(record.label) && record.written !== '')
    .slice(0, 100)
    .map((record): [string, string] => [
      shorten(record.written),
      shorten(
        record.lines
          .map((line) => line.text.trim())
          .join(' ')
          .trim(),
      ),
    ]);
  return Object.fromEntries(entries.filter(([key]) => key !== '__proto__'));
}

/** What the numbers of one block are scaled and checked with, from its labels or from a page of an n-tuple table. */
export interface Scaling {
  readonly xFactor: number;
  readonly yFactor: number;
  readonly first: PrintedNumber | undefined;
  readonly last: PrintedNumber | undefined;
  readonly delta: PrintedNumber | undefined;
  readonly firstY: PrintedNumber | undefined;
  readonly maxY: PrintedNumber | undefined;
  readonly points: number | undefined;
}

export function pointCount(block: Block): number | undefined {
  const value = numberLabel(block, 'NPOINTS')?.value;
  if (value === undefined) return undefined;
  if (!Number.isInteger(value) || value < 1) {
    throw new ReadingError('bad-number', `NPOINTS=${value} is not a count of points`);
  }
  if (value > readingLimits.points) {
    throw new ReadingError(
      'point-count',
      `NPOINTS=${value}; at most ${readingLimits.points} points are read`,
    );
  }
  return value;
}

export type NumberForm = 'evenly spaced' | { readonly columns: string; readonly peaks: boolean };

/** `(X++(Y..Y))`, `(XY..XY)`, `(XYW..XYW)` and the like. */
export function formOf(record: LabelledRecord): NumberForm {
  const text = valueOf(record).replace(/\s/g, '').toUpperCase();
  if (/^\(X\+\+\(Y\.\.Y\)\)/.test(text)) return 'evenly spaced';
  const columns = /^\(([A-Z]{2,5})\.\.\1\)/.exec(text)?.[1];
  if (columns === undefined || !columns.includes('X') || !columns.includes('Y')) {
    throw new ReadingError(
      'not-supported',
      `line ${record.line}: ##${record.written}=${valueOf(record).slice(0, 40)} is not a form of data that is read`,
    );
  }
  return { columns, peaks: record.label === 'PEAKTABLE' };
}

const dataLine = /^\s*[+-]?\d+(?:\.\d+)?[ ,;+\-@A-Ra-r%?]/;

/** Names records that look like data and are not among those read: a damaged label must not cost points in silence. */
export function reportUnread(
  block: Block,
  read: readonly LabelledRecord[],
  warnings: ReadingWarning[],
): void {
  for (const record of block.records) {
    if (read.includes(record)) continue;
    const rows = record.lines.slice(1).filter((line) => dataLine.test(line.text)).length;
    if (rows < 2 && !(rows > 0 && /^\(\s*X\s*(?:\+\+|Y)/i.test(valueOf(record)))) continue;
    warnings.push({
      code: 'recovered',
      message: `line ${record.line}: ##${shorten(record.written).slice(0, 40)}= is followed by what looks like data and is not read`,
    });
  }
}

/** The lines after the one that names the form. */
export function dataLines(record: LabelledRecord): readonly TextLine[] {
  const form = record.lines.findIndex((line) => line.text.trim() !== '');
  return record.lines.slice(form + 1);
}

const close = (a: number, b: number, tolerance: number): boolean => Math.abs(a - b) <= tolerance;

/** Compares FIRSTY and MAXY with what was read; an unscaled FIRSTY is common and let pass. */
function checkOrdinates(y: readonly (number | null)[], scaling: Scaling, warnings: ReadingWarning[]): void {
  const { firstY, maxY, yFactor } = scaling;
  const first = y[0] ?? null;
  if (firstY !== undefined && first !== null) {
    const fits = (factor: number) =>
      close(first * factor, firstY.value, Math.max(firstY.ulp, Math.abs(yFactor * factor)) * 0.51 + 1e-9);
    if (!fits(1) && !fits(1 / yFactor)) {
      warnings.push({
        code: 'check-value',
        message: `FIRSTY says ${firstY.value}, the first ordinate is ${tidy(first, 6)}`,
      });
    }
  }
  const largest = y.reduce<number>(
    (most, value) => (value !== null && value > most ? value : most),
    -Infinity,
  );
  if (maxY !== undefined && Number.isFinite(largest)) {
    const tolerance = Math.max(maxY.ulp, Math.abs(yFactor)) * 0.51 + 1e-9;
    if (
      !close(largest, maxY.value, tolerance) &&
      !close(largest / yFactor, maxY.value, tolerance / Math.abs(yFactor))
    ) {
      warnings.push({
        code: 'check-value',
        message: `MAXY says ${maxY.value}, the largest ordinate is ${tidy(largest, 6)}`,
      });
    }
  }
}

/** A printed number is taken as it stands; only multiplying brings in digits that the file does not have. */
const scaledBy = (value: number, factor: number): number => (factor === 1 ? value : tidy(value * factor));

function scaleY(ordinates: readonly (number | null)[], factor: number): (number | null)[] {
  return ordinates.map((value) => {
    if (value === null) return null;
    const scaled = scaledBy(value, factor);
    if (!Number.isFinite(scaled)) throw new ReadingError('bad-number', 'an ordinate is too large');
    return scaled === 0 ? 0 : scaled;
  });
}

/** Reads the numbers under one data record. `limit` is what is left of the file's budget of points. */
export function readNumbers(
  record: LabelledRecord,
  scaling: Scaling,
  limit: number,
  name: string,
  warnings: ReadingWarning[],
): Pick<ReadSpectrum, 'kind' | 'x' | 'y' | 'fileOrder'> {
  const form = formOf(record);
  const remark = (words: number, missing: number) => {
    if (words > 0) {
      warnings.push({
        code: 'recovered',
        message: `${words} ordinates of ${name} are words such as NaN, which JCAMP-DX does not know; read as missing`,
      });
    }
    if (missing > words)
      warnings.push({
        code: 'missing',
        message: `${missing - words} ordinates of ${name} are marked as missing (?)`,
      });
  };
  const missingIn = (y: readonly (number | null)[]) => y.filter((value) => value === null).length;

  if (form === 'evenly spaced') {
    // A file that announces too few points is caught by the count; one that repeats a point too often, before expansion.
    const data = decodeAsdf(dataLines(record), Math.min(limit, scaling.points ?? limit));
    const x = axisOf(data, scaling, warnings);
    const y = scaleY(data.ordinates, scaling.yFactor);
    if (data.uncheckedEnd) {
      warnings.push({
        code: 'check-value',
        message: `${name} ends in differences without a line that repeats the last ordinate (line ${data.lastLine})`,
      });
    }
    checkOrdinates(y, scaling, warnings);
    remark(data.words, missingIn(y));
    return { kind: 'curve', ...orderCurve({ x, y }, (i) => `point ${i + 1}`, warnings, name) };
  }

  const data = decodePairs(dataLines(record), form.columns, limit);
  if (data.x.length === 0) throw new ReadingError('too-few-points', `line ${record.line}: no points`);
  const x = data.x.map((value) => scaledBy(value, scaling.xFactor));
  const y = scaleY(data.y, scaling.yFactor);
  if (scaling.points !== undefined && scaling.points !== x.length) {
    const ends =
      scaling.first !== undefined &&
      scaling.last !== undefined &&
      x[0] === scaling.first.value &&
      x.at(-1) === scaling.last.value;
    const message = `NPOINTS says ${scaling.points}, ${name} holds ${x.length} points`;
    if (!ends) throw new ReadingError('point-count', message);
    warnings.push({ code: 'recovered', message: `${message} that begin at FIRSTX and end at LASTX` });
  } else if (!form.peaks) {
    for (const [label, end, found] of [
      ['FIRSTX', scaling.first, x[0]!],
      ['LASTX', scaling.last, x.at(-1)!],
    ] as const) {
      if (end !== undefined && !close(end.value, found, end.ulp)) {
        warnings.push({ code: 'check-value', message: `${label} says ${end.value}, ${name} has ${found}` });
      }
    }
  }
  checkOrdinates(y, { ...scaling, firstY: form.peaks ? undefined : scaling.firstY }, warnings);
  remark(data.words, missingIn(y));
  if (form.peaks) return { kind: 'peaks', ...orderPeaks({ x, y }) };
  return { kind: 'curve', ...orderCurve({ x, y }, (i) => `line ${data.lines[i]}`, warnings, name) };
}

/** The units of a block, applied to x where they are a multiple of nm or cm-1. */
export function withUnits(
  numbers: Pick<ReadSpectrum, 'kind' | 'x' | 'y' | 'fileOrder'>,
  xLabel: string,
  yLabel: string,
): Pick<ReadSpectrum, 'kind' | 'x' | 'y' | 'fileOrder' | 'xUnit' | 'yUnit'> {
  const { unit, factor } = xUnitOf(xLabel);
  const x = numbers.x.map((value) => scaledBy(value, factor));
  return { ...numbers, x, xUnit: unit, yUnit: yUnitOf(yLabel) };
}

/** Reads a block with `XYDATA`, `XYPOINTS` or `PEAK TABLE`. */
export function readBlock(block: Block, limit: number, warnings: ReadingWarning[]): ReadSpectrum {
  checkDuplicates(block);
  const record = ['XYDATA', 'XYPOINTS', 'PEAKTABLE']
    .map((label) => recordOf(block, label))
    .find((each) => each !== undefined);
  if (record === undefined) {
    throw new ReadingError(
      'not-supported',
      `the block at line ${block.line} holds no XYDATA, XYPOINTS or PEAK TABLE`,
    );
  }
  const even = formOf(record) === 'evenly spaced';
  const scaling: Scaling = {
    xFactor: factorLabel(block, 'XFACTOR', even ? undefined : 1),
    yFactor: factorLabel(block, 'YFACTOR', even ? undefined : 1),
    first: numberLabel(block, 'FIRSTX'),
    last: numberLabel(block, 'LASTX'),
    delta: numberLabel(block, 'DELTAX'),
    firstY: numberLabel(block, 'FIRSTY'),
    maxY: numberLabel(block, 'MAXY'),
    points: pointCount(block),
  };
  reportUnread(block, [record], warnings);
  const name = shorten(block.title) || 'the spectrum';
  const numbers = readNumbers(record, scaling, limit, name, warnings);
  const unitText = (label: string) => {
    const found = recordOf(block, label);
    return found === undefined ? '' : valueOf(found);
  };
  return {
    name: block.title === '' ? null : shorten(block.title),
    ...withUnits(numbers, unitText('XUNITS'), unitText('YUNITS')),
    metadata: metadataOf(block),
  };
}
