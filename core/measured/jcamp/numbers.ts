import { ReadingError } from '../reading/types';
import { recordOf, type Block } from './blocks';
import { valueOf } from './labels';

/** A number with the size of one unit in its last printed digit, which is what a check against it can resolve. */
export interface PrintedNumber {
  readonly value: number;
  readonly ulp: number;
}

/** AFFN: digits with an optional point; an exponent needs its sign, because a bare E is a SQZ digit. */
const affn = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[Ee][+-]?\d{1,3})?$/;

/** A number of a label's value (`E` without sign is allowed there: no packed digits stand in labels). */
export function printedNumber(text: string): PrintedNumber | null {
  const trimmed = text.trim();
  if (!affn.test(trimmed)) return null;
  const value = Number(trimmed);
  if (!Number.isFinite(value)) return null;
  const [mantissa, exponent] = trimmed.split(/[Ee]/) as [string, string | undefined];
  const decimals = mantissa.includes('.') ? mantissa.length - mantissa.indexOf('.') - 1 : 0;
  return { value, ulp: 10 ** (Number(exponent ?? 0) - decimals) };
}

/** The number of a label, undefined where the label is absent. Throws where it is there and not a finite number. */
export function numberLabel(block: Block, label: string): PrintedNumber | undefined {
  const record = recordOf(block, label);
  if (record === undefined) return undefined;
  const number = printedNumber(valueOf(record));
  if (number === null) {
    throw new ReadingError(
      'bad-number',
      `line ${record.line}: ##${record.written}=${valueOf(record).slice(0, 40)} is not a number`,
    );
  }
  return number;
}

/** XFACTOR or YFACTOR: finite and not zero. */
export function factorLabel(block: Block, label: string, fallback?: number): number {
  const factor = numberLabel(block, label)?.value ?? fallback;
  if (factor === undefined) {
    throw new ReadingError(
      'missing-label',
      `the block at line ${block.line} has no ##${label}=, which its data need`,
    );
  }
  if (factor === 0) throw new ReadingError('bad-number', `##${label}= is zero: all values would become zero`);
  return factor;
}
