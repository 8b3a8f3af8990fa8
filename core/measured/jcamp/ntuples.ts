import { ReadingError, readingLimits, type ReadSpectrum, type ReadingWarning } from '../reading/types';
import { metadataOf, readNumbers, reportUnread, shorten, withUnits } from './block';
import { recordOf, type Block } from './blocks';
import { valueOf, type LabelledRecord } from './labels';
import { printedNumber, type PrintedNumber } from './numbers';

interface Variable {
  readonly symbol: string;
  readonly unit: string;
  readonly first: PrintedNumber | undefined;
  readonly last: PrintedNumber | undefined;
  readonly factor: number;
}

function listOf(block: Block, label: string): string[] {
  const record = recordOf(block, label);
  return record === undefined
    ? []
    : valueOf(record)
        .split(',')
        .map((part) => part.trim());
}

function variables(block: Block): Variable[] {
  const [units, first, last, factors] = ['UNITS', 'FIRST', 'LAST', 'FACTOR'].map((label) =>
    listOf(block, label),
  );
  return listOf(block, 'SYMBOL').map((symbol, i) => {
    const factor = factors![i] === undefined || factors![i] === '' ? 1 : printedNumber(factors![i]!)?.value;
    if (factor === undefined || factor === 0) {
      throw new ReadingError(
        'bad-number',
        `FACTOR of ${symbol.slice(0, 10)} is not a number other than zero`,
      );
    }
    return {
      symbol: symbol.toUpperCase(),
      unit: units![i] ?? '',
      first: printedNumber(first![i] ?? '') ?? undefined,
      last: printedNumber(last![i] ?? '') ?? undefined,
      factor,
    };
  });
}

function countOf(record: LabelledRecord | undefined): number | undefined {
  if (record === undefined) return undefined;
  const value = printedNumber(valueOf(record))?.value;
  if (value === undefined || !Number.isInteger(value) || value < 1) {
    throw new ReadingError('bad-number', `line ${record.line}: NPOINTS is not a count of points`);
  }
  if (value > readingLimits.points) {
    throw new ReadingError(
      'point-count',
      `line ${record.line}: NPOINTS=${value}; at most ${readingLimits.points} points are read`,
    );
  }
  return value;
}

/**
 * Reads the pages of an n-tuple block (JCAMP-DX 5; A. N. Davies and P. Lampen, Appl. Spectrosc. 47, 1093, 1993) as
 * spectra of Y against X. FIRST of the ordinate holds for the first page only.
 */
export function readNtuples(block: Block, limit: number, warnings: ReadingWarning[]): ReadSpectrum[] {
  const rival = ['XYDATA', 'XYPOINTS', 'PEAKTABLE']
    .map((label) => recordOf(block, label))
    .find((each) => each !== undefined);
  if (rival !== undefined) {
    throw new ReadingError(
      'structure',
      `line ${rival.line}: ##${rival.written}= stands in a block of n-tuples`,
    );
  }
  const known = variables(block);
  const x = known.find((each) => each.symbol === 'X');
  const y = known.find((each) => each.symbol === 'Y');
  if (x === undefined || y === undefined) {
    throw new ReadingError(
      'not-supported',
      `the n-tuple block at line ${block.line} has no variables X and Y`,
    );
  }
  const spectra: ReadSpectrum[] = [];
  let page = '';
  let points: LabelledRecord | undefined;
  let left = limit;
  let tableRead = true;
  const reportEmpty = () => {
    if (points !== undefined && !tableRead) {
      warnings.push({
        code: 'recovered',
        message: `page ${shorten(page)} announces points and has no DATA TABLE`,
      });
    }
    tableRead = false;
  };
  for (const record of block.records) {
    if (record.label === 'PAGE') {
      reportEmpty();
      page = valueOf(record);
      points = undefined;
    } else if (record.label === 'NPOINTS') {
      if (points !== undefined && valueOf(points) !== valueOf(record)) {
        throw new ReadingError(
          'duplicate-label',
          `line ${record.line}: a second, different NPOINTS on one page`,
        );
      }
      points = record;
    } else if (record.label === 'DATATABLE') {
      if (tableRead && spectra.length > 0) {
        warnings.push({
          code: 'recovered',
          message: `line ${record.line}: a second table on the page ${shorten(page)}; its own page label may be damaged`,
        });
      }
      tableRead = true;
      const name = shorten([block.title, page].filter((part) => part !== '').join(', ')) || 'the page';
      const scaling = {
        xFactor: x.factor,
        yFactor: y.factor,
        first: x.first,
        last: x.last,
        delta: undefined,
        firstY: spectra.length === 0 ? y.first : undefined,
        maxY: undefined,
        points: countOf(points),
      };
      const numbers = readNumbers(record, scaling, left, name, warnings);
      left -= numbers.x.length;
      spectra.push({ name, ...withUnits(numbers, x.unit, y.unit), metadata: metadataOf(block) });
      if (spectra.length > readingLimits.spectra) throw new ReadingError('too-large', 'too many pages');
    }
  }
  reportEmpty();
  const tables = block.records.filter((record) => record.label === 'DATATABLE');
  reportUnread(block, tables, warnings);
  if (spectra.length === 0)
    throw new ReadingError('not-supported', `the n-tuple block at line ${block.line} has no DATA TABLE`);
  return spectra;
}
