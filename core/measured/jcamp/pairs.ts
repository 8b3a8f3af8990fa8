import { ReadingError } from '../reading/types';
import type { RawPoints } from '../reading/order';
import type { TextLine } from './labels';
import { printedNumber } from './numbers';

export interface PairData extends RawPoints {
  /** Line of each point. */
  readonly lines: readonly number[];
  readonly words: number;
}

const isWord = (text: string): boolean => /^(nan|[+-]?inf(inity)?)$/i.test(text);

/**
 * Decodes `(XY..XY)` data, and lists with more columns such as `(XYW..XYW)`: groups of numbers, the members of a group
 * joined by commas or blanks, groups separated by semicolons, line ends or blanks. Throws a ReadingError that names the
 * line.
 */
export function decodePairs(lines: readonly TextLine[], columns: string, limit: number): PairData {
  const width = columns.length;
  const [xAt, yAt] = [columns.indexOf('X'), columns.indexOf('Y')];
  const x: number[] = [];
  const y: (number | null)[] = [];
  const lineOf: number[] = [];
  let words = 0;
  for (const { text, number } of lines) {
    for (const piece of text.split(';')) {
      const trimmed = piece.trim();
      if (trimmed === '' || trimmed === '\u001a') continue;
      if (/,\s*,|^,|,$/.test(trimmed)) {
        throw new ReadingError('bad-number', `line ${number}: a number is missing beside a comma`);
      }
      const parts = trimmed.split(/\s*,\s*|\s+/);
      if (parts.length % width !== 0) {
        throw new ReadingError(
          'truncated',
          `line ${number}: ${parts.length} numbers cannot be groups of ${width}: one is missing or too many`,
        );
      }
      for (let i = 0; i < parts.length; i += width) {
        const group = parts.slice(i, i + width).map((part) => {
          if (part === '?') return null;
          if (isWord(part)) {
            words++;
            return null;
          }
          const value = printedNumber(part)?.value;
          if (value === undefined) {
            throw new ReadingError('bad-number', `line ${number}: "${part.slice(0, 20)}" is not a number`);
          }
          return value;
        });
        const abscissa = group[xAt]!;
        if (abscissa === null) throw new ReadingError('bad-number', `line ${number}: a point without x`);
        if (x.length >= limit)
          throw new ReadingError('point-count', `line ${number}: more than ${limit} points`);
        x.push(abscissa);
        y.push(group[yAt]!);
        lineOf.push(number);
      }
    }
  }
  return { x, y, lines: lineOf, words };
}
