import type { XUnit, YUnit } from '../../record/curve';
import type { DecodedText } from '../reading/encoding';
import { orderCurve, tidy } from '../reading/order';
import { plausibility } from '../reading/plausibility';
import {
  ReadingError,
  readingLimits,
  type ReadSpectrum,
  type ReadingWarning,
  type SpectrumReading,
} from '../reading/types';
import { guessDialect, type Dialect } from './dialect';
import { readHeader } from './header';
import { rejoinDecimals } from './rejoin';
import { cutRows } from './rows';
import { findSeries, pointsOf, type Series } from './series';
import { evenRows, findTable, type DataRow } from './table';

/** What the user decided in the preview; everything else is guessed. */
export interface DelimitedChoices extends Partial<Dialect> {
  readonly xUnit?: XUnit;
  readonly yUnit?: YUnit;
}

const plural = (count: number, word: string): string => `${count} ${word}${count === 1 ? '' : 's'}`;

function readSeries(
  rows: readonly DataRow[],
  series: Series,
  title: string,
  choices: DelimitedChoices,
  warnings: ReadingWarning[],
): Omit<ReadSpectrum, 'metadata' | 'name'> {
  const points = pointsOf(rows, series);
  const ordered = orderCurve(points, (i) => `line ${points.lines[i]}`, warnings, title);
  if (points.saturated > 0) {
    warnings.push({
      code: 'saturated',
      message: `${plural(points.saturated, 'point')} of ${title} saturated, beyond the range of the instrument; no value is taken`,
    });
  }
  if (points.missing > 0) {
    warnings.push({
      code: 'missing',
      message: `${plural(points.missing, 'point')} of ${title} without a readable value`,
    });
  }
  const factor = choices.xUnit === undefined ? series.x.factor : 1;
  return {
    ...ordered,
    x: factor === 1 ? ordered.x : ordered.x.map((value) => tidy(value * factor)),
    kind: 'curve',
    xUnit: choices.xUnit ?? series.x.unit,
    yUnit: choices.yUnit ?? series.y,
  };
}

/** Remarks on numbers whose thousands are grouped; doubtful ones could as well be decimals. */
function thousandsIn(rows: readonly DataRow[]): 'none' | 'clear' | 'doubtful' {
  let clear = false;
  let doubtful = false;
  for (const row of rows) {
    for (const cell of row.cells) {
      if (cell.kind !== 'number') continue;
      if (cell.thousands === 'clear') clear = true;
      if (cell.thousands === 'doubtful') doubtful = true;
    }
  }
  return clear ? 'clear' : doubtful ? 'doubtful' : 'none';
}

function read(text: string, choices: DelimitedChoices, warnings: ReadingWarning[]) {
  const dialect = guessDialect(text, choices);
  const cut = cutRows(text, dialect.delimiter);
  const joined = dialect.delimiter === ',' && choices.decimal === undefined ? rejoinDecimals(cut) : null;
  const table = findTable(joined ?? cut, dialect, warnings);
  if (table.rows.length * table.width > 4 * readingLimits.points || table.width > readingLimits.spectra) {
    throw new ReadingError(
      'too-large',
      `the table has ${table.rows.length} rows of ${table.width} cells, more than is read`,
    );
  }
  const rows = evenRows(table, warnings);
  const header = readHeader(table.head, table.width);
  const found = findSeries(rows, table.width, header);
  if (found.length === 0) throw new ReadingError('no-table', 'the table has no column of ordinates');

  let ask = false;
  if (joined !== null) {
    ask = true;
    warnings.push({
      code: 'rejoined',
      message:
        'the comma is both delimiter and decimal sign; the halves of each number were joined: is that right?',
    });
  }
  const thousands = thousandsIn(rows);
  if (thousands === 'doubtful') ask = true;
  if (thousands !== 'none') {
    const sign = dialect.decimal === ',' ? 'point' : 'comma';
    warnings.push({
      code: 'thousands',
      message: `the ${sign} is read as a separator of thousands${thousands === 'doubtful' ? '; it could be a decimal sign: is that right?' : ''}`,
    });
  }

  const assumptions: string[] = [];
  const hasHeadings = header.columns !== null;
  const spectra = found.map((series, i): ReadSpectrum => {
    // A heading that names only the sample: the table of a UV-Vis instrument then holds absorbance.
    const assumed =
      series.y === 'unknown' && hasHeadings && series.x.unit !== 'unknown' && choices.yUnit === undefined;
    if (assumed)
      assumptions.push(
        `column ${series.yColumn + 1}: the heading does not say what y is; taken as absorbance`,
      );
    const title = series.name ?? (found.length > 1 ? `column ${series.yColumn + 1}` : 'the spectrum');
    const spectrum = readSeries(
      rows,
      assumed ? { ...series, y: 'absorbance' } : series,
      title,
      choices,
      warnings,
    );
    return {
      name: series.name ?? (found.length > 1 ? `column ${i + 2}` : null),
      ...spectrum,
      metadata: header.metadata,
    };
  });
  return {
    dialect: joined === null ? dialect : ({ delimiter: ',', decimal: ',' } as const),
    spectra,
    ask,
    assumptions,
  };
}

/** Warnings after which the numbers still are exactly what the file says. */
const harmless = new Set<ReadingWarning['code']>([
  ...(['saturated', 'missing', 'duplicate-x', 'footer', 'units', 'encoding', 'thousands'] as const),
]);

/** Reads a table of numbers: x in one column, one spectrum per further column, or columns in pairs of x and y. */
export function readDelimited(decoded: DecodedText, choices: DelimitedChoices = {}): SpectrumReading {
  const warnings: ReadingWarning[] = [];
  const layout = { encoding: decoded.encoding, eol: decoded.eol };
  try {
    const { dialect, spectra, ask, assumptions } = read(decoded.text, choices, warnings);
    if (spectra.some((each) => each.xUnit === 'unknown' || each.yUnit === 'unknown')) {
      warnings.push({ code: 'units', message: 'the file does not name its units: say what x and y are' });
    }
    warnings.push(...spectra.flatMap(plausibility));
    const outcome = ask ? 'ask' : warnings.every((warning) => harmless.has(warning.code)) ? 'ok' : 'warning';
    return {
      format: 'delimited',
      outcome,
      warnings,
      spectra,
      assumptions,
      layout: { ...layout, ...dialect },
    };
  } catch (error) {
    if (!(error instanceof ReadingError)) throw error;
    return {
      format: 'delimited',
      outcome: 'error',
      warnings,
      error: { code: error.code, message: error.message },
      spectra: [],
      layout,
    };
  }
}
