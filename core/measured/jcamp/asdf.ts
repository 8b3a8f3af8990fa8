import { ReadingError } from '../reading/types';
import type { TextLine } from './labels';
import { printedNumber } from './numbers';

/** One line of packed data: its abscissa as printed and how many points were known before it. */
export interface AbscissaCheck {
  readonly line: number;
  readonly x: number;
  /** One unit in the last printed digit. */
  readonly ulp: number;
  /** Index of the point whose x this is. */
  readonly index: number;
}

export interface AsdfData {
  /** Ordinates before scaling; null where the file says `?`. */
  readonly ordinates: (number | null)[];
  readonly checks: AbscissaCheck[];
  /** Line of the last point. */
  readonly lastLine: number;
  /** Words in the place of numbers (NaN), as found. */
  readonly words: number;
  /** The last line ended in differences and no line repeated its last ordinate. */
  readonly uncheckedEnd: boolean;
}

const token =
  /(?<blank>[ \t,;]+)|(?<affn>[+-]?(?:\d+\.?\d*|\.\d+)(?:[Ee][+-]\d{1,3})?)|(?<sqz>[@A-Ia-i]\d*)|(?<dif>[%J-Rj-r]\d*)|(?<dup>[S-Zs]\d*)|(?<missing>\?)/y;
const abscissa = /^[ \t]*([+-]?(?:\d+\.?\d*|\.\d+)(?:[Ee][+-]\d{1,3})?)/;
const notNumber = /(?<=^|[ \t,;])(?:nan|[+-]?inf(?:inity)?)(?=$|[ \t,;])/gi;

/** Value of a packed number: its first character carries the sign and the first digit. */
function unpack(text: string, plus: string, minus: string): number {
  const head = text[0]!;
  const up = plus.indexOf(head);
  const digit = up >= 0 ? up : minus.indexOf(head) + 1;
  const size = Number(`${digit}${text.slice(1)}`);
  return up >= 0 ? size : -size;
}
const squeezed = (text: string): number => unpack(text, '@ABCDEFGHI', 'abcdefghi');
const difference = (text: string): number => unpack(text, '%JKLMNOPQR', 'jklmnopqr');
const repeats = (text: string): number => Number(`${'STUVWXYZs'.indexOf(text[0]!) + 1}${text.slice(1)}`);

type Previous = { kind: 'none' | 'value' | 'missing' } | { kind: 'difference'; by: number };

/**
 * Decodes `(X++(Y..Y))` data in any mixture of AFFN, PAC, SQZ, DIF and DUP form. A line after one that ended in
 * differences must repeat its last ordinate (the Y check); abscissae are handed back for the X check. Nothing is
 * expanded beyond `limit` ordinates. Throws a ReadingError that names line and column.
 */
export function decodeAsdf(lines: readonly TextLine[], limit: number): AsdfData {
  const ordinates: (number | null)[] = [];
  const checks: AbscissaCheck[] = [];
  let previous: Previous = { kind: 'none' };
  let last: number | null = null;
  let words = 0;
  let lastLine = lines[0]?.number ?? 0;

  const push = (value: number | null, line: number) => {
    if (ordinates.length >= limit) {
      throw new ReadingError(
        'point-count',
        `line ${line}: more than ${limit} ordinates, which is more than the file announces or the program reads`,
      );
    }
    if (value !== null && !Number.isFinite(value)) {
      throw new ReadingError('bad-number', `line ${line}: an ordinate is too large`);
    }
    ordinates.push(value);
    last = value;
  };

  for (const { text: raw, number } of lines) {
    if (raw.trim() === '' || raw.trim() === '\u001a') continue;
    const text = raw.replace(notNumber, () => {
      words++;
      return '?';
    });
    lastLine = number;
    const head = abscissa.exec(text);
    if (head === null) {
      throw new ReadingError('bad-number', `line ${number}: no abscissa at the start of a data line`);
    }
    const mustRepeat = previous.kind === 'difference';
    const checkIndex = mustRepeat ? ordinates.length - 1 : ordinates.length;
    const printed = printedNumber(head[1]!);
    if (printed === null) throw new ReadingError('bad-number', `line ${number}: the abscissa is too large`);
    checks.push({ line: number, x: printed.value, ulp: printed.ulp, index: checkIndex });
    let first = true;
    token.lastIndex = head[0].length;
    while (token.lastIndex < text.length) {
      const at = token.lastIndex;
      const groups: Record<string, string | undefined> | undefined = token.exec(text)?.groups;
      if (groups === undefined) {
        throw new ReadingError(
          'bad-character',
          `line ${number}, column ${at + 1}: "${text.slice(at, at + 8)}" is not an ordinate`,
        );
      }
      if (groups.blank !== undefined) continue;
      const unsigned = groups.affn !== undefined && !/^[+-]/.test(groups.affn);
      if (unsigned && !/[ \t,;]/.test(text[at - 1]!)) {
        throw new ReadingError(
          'bad-character',
          `line ${number}, column ${at + 1}: "${text.slice(at, at + 8)}" runs into the number before it`,
        );
      }
      const plain = groups.affn ?? groups.sqz;
      if (plain !== undefined || groups.missing !== undefined) {
        const value =
          groups.missing !== undefined
            ? null
            : groups.affn !== undefined
              ? Number(groups.affn)
              : squeezed(groups.sqz!);
        if (first && mustRepeat) {
          if (value !== last) {
            throw new ReadingError(
              'y-check',
              `line ${number}: starts with ordinate ${value ?? '?'} where the line before ends at ${last}; a digit is wrong in one of them`,
            );
          }
        } else push(value, number);
        previous = { kind: value === null ? 'missing' : 'value' };
      } else if (first) {
        throw new ReadingError(
          'y-check',
          `line ${number}: the first ordinate of a line may not be a difference or a repeat`,
        );
      } else if (groups.dif !== undefined) {
        if (last === null) {
          throw new ReadingError(
            'y-check',
            `line ${number}, column ${at + 1}: a difference from a missing ordinate`,
          );
        }
        const by = difference(groups.dif);
        push(last + by, number);
        previous = { kind: 'difference', by };
      } else {
        const count = repeats(groups.dup!);
        if (count < 1 || count - 1 > limit - ordinates.length) {
          throw new ReadingError(
            'repeat-count',
            `line ${number}, column ${at + 1}: repeats an ordinate ${count} times, more than the ${limit - ordinates.length + 1} points that are left`,
          );
        }
        for (let k = 1; k < count; k++)
          push(previous.kind === 'difference' ? last! + previous.by : last, number);
      }
      first = false;
    }
    if (first) throw new ReadingError('truncated', `line ${number}: an abscissa without ordinates`);
  }
  return { ordinates, checks, lastLine, words, uncheckedEnd: previous.kind === 'difference' };
}
