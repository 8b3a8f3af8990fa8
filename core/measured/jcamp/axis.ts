import { tidy } from '../reading/order';
import { ReadingError, type ReadingWarning } from '../reading/types';
import type { AsdfData } from './asdf';
import type { PrintedNumber } from './numbers';

export interface AxisLabels {
  readonly first: PrintedNumber | undefined;
  readonly last: PrintedNumber | undefined;
  readonly delta: PrintedNumber | undefined;
  readonly points: number | undefined;
  readonly xFactor: number;
}

interface Misfit {
  readonly line: number;
  readonly expected: number;
  readonly found: number;
}

/** Rounding that the printed end of the axis may carry; a whole number is taken as exact. */
const slack = (end: PrintedNumber): number => (end.ulp < 1 ? end.ulp / 2 : 0);

/**
 * Compares the abscissa of every line with the evenly spaced axis (X check). Returns null where all agree to half a
 * unit of their last digit, `truncated` where all were cut instead of rounded, else the first line that does not fit.
 */
function checkAxis(
  data: AsdfData,
  start: number,
  step: number,
  labels: AxisLabels,
): Misfit | 'truncated' | null {
  const ulp = Math.min(...data.checks.map((check) => check.ulp)) * Math.abs(labels.xFactor);
  const loose =
    1e-6 * Math.abs(step) + (labels.first ? slack(labels.first) : 0) + (labels.last ? slack(labels.last) : 0);
  let rounded: Misfit | null = null;
  let cut: Misfit | null = null;
  for (const check of data.checks) {
    const expected = start + check.index * step;
    const found = check.x * labels.xFactor;
    const off = found - expected;
    if (Math.abs(off) > Math.min(ulp / 2, 0.5 * Math.abs(step)) + loose) {
      rounded ??= { line: check.line, expected, found };
    }
    const short = off * -Math.sign(expected);
    if (short < -loose || short > Math.min(ulp, 0.999 * Math.abs(step)) + loose) {
      cut ??= { line: check.line, expected, found };
    }
  }
  if (rounded === null) return null;
  return cut === null ? 'truncated' : rounded;
}

const misfitError = (misfit: Misfit): ReadingError =>
  new ReadingError(
    'x-check',
    `line ${misfit.line}: x is ${tidy(misfit.found, 8)} where ${tidy(misfit.expected, 8)} is expected: points are missing or too many before this line, or FIRSTX, LASTX or NPOINTS is wrong`,
  );

/**
 * The x axis of `(X++(Y..Y))` data. FIRSTX, LASTX and NPOINTS must agree with the abscissa of every line. What is
 * missing or wrong among them is recovered only where all the lines agree on one axis, and always with a warning.
 */
export function axisOf(data: AsdfData, labels: AxisLabels, warnings: ReadingWarning[]): number[] {
  const count = data.ordinates.length;
  if (count < 2) throw new ReadingError('too-few-points', 'a spectrum needs two or more points');
  const axis = (start: number, step: number) =>
    Array.from({ length: count }, (_, i) => tidy(start + i * step, 13));
  const recovered = (message: string) => warnings.push({ code: 'recovered', message });

  let start = labels.first?.value;
  let end = labels.last?.value;
  if (start === undefined || end === undefined) {
    const [firstLine, lastLine] = [data.checks[0]!, data.checks.at(-1)!];
    if (labels.points !== undefined && labels.points !== count) {
      throw new ReadingError(
        'point-count',
        `NPOINTS says ${labels.points}, the data hold ${count} points, and FIRSTX or LASTX is missing`,
      );
    }
    if (lastLine.index === firstLine.index) {
      throw new ReadingError(
        'missing-label',
        'FIRSTX or LASTX is missing and a single line of data cannot replace it',
      );
    }
    const step = ((lastLine.x - firstLine.x) * labels.xFactor) / (lastLine.index - firstLine.index);
    start ??= firstLine.x * labels.xFactor;
    end ??= start + (count - 1) * step;
    recovered(
      'FIRSTX or LASTX is missing; the axis follows from the abscissae of the data lines, which agree',
    );
  } else if (labels.points === undefined) {
    recovered(`NPOINTS is missing; the ${count} points agree with FIRSTX, LASTX and every line`);
  }
  if (start === end) throw new ReadingError('bad-number', 'FIRSTX and LASTX are equal');

  const step = (end - start) / (count - 1);
  const misfit = checkAxis(data, start, step, labels);
  if (misfit !== null && misfit !== 'truncated') {
    // With points missing, the step that the labels announce leads to the line where they are missing.
    const announced =
      labels.points !== undefined && labels.points > 1 ? (end - start) / (labels.points - 1) : step;
    const place = checkAxis(data, start, announced, labels);
    if (place === null && labels.points !== undefined && count < labels.points) {
      throw new ReadingError(
        'truncated',
        `the data hold ${count} of ${labels.points} points: the file is cut off after line ${data.lastLine}`,
      );
    }
    throw misfitError(place !== null && place !== 'truncated' ? place : misfit);
  }
  if (labels.points !== undefined && labels.points !== count) {
    if (data.checks.length < 2) {
      throw new ReadingError('point-count', `NPOINTS says ${labels.points}, the data hold ${count} points`);
    }
    recovered(
      `NPOINTS says ${labels.points}; the ${count} points of the data agree with FIRSTX, LASTX and every line`,
    );
  }
  if (misfit === 'truncated') {
    warnings.push({
      code: 'check-value',
      message: 'the abscissae of the data lines agree with the axis only if they were cut, not rounded',
    });
  }
  const { delta } = labels;
  if (delta !== undefined && Math.abs(delta.value - step) > delta.ulp / 2 + 1e-3 * Math.abs(step)) {
    if (delta.value === 0) throw new ReadingError('bad-number', 'DELTAX is zero');
    warnings.push({
      code: 'check-value',
      message: `DELTAX says ${delta.value}, the axis has steps of ${tidy(step, 6)}`,
    });
  }
  return axis(start, step);
}
