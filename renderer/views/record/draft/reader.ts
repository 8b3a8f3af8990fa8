import type { Problem } from '../../../../core/errors';
import type { Uncertain } from '../../../../core/record/uncertain';
import { readNumber } from '../../../app/form';

export const words = (text: string): string | null => (text.trim() === '' ? null : text.trim().slice(0, 200));

/** Collects what is wrong while numbers are read, so that all of it is said at once. */
export class Reader {
  readonly problems: Problem[] = [];

  refuse(field: string, message: string, remedy: string): null {
    this.problems.push({ code: 'out-of-range', field, message, remedy });
    return null;
  }

  /** Null for an empty text; a problem for anything that is no number above `above`. */
  number(text: string, field: string, above = 0): number | null {
    if (text.trim() === '') return null;
    const value = readNumber(text);
    if (value === null)
      return this.refuse(field, `“${text}” is not a number.`, 'Enter digits, or leave it empty.');
    if (value <= above)
      return this.refuse(field, `${text} is not above ${above}.`, 'Correct it, or leave it empty.');
    return value;
  }

  /** Like `number`, and a problem where nothing is entered. */
  needed(text: string, field: string, above = 0): number | null {
    return text.trim() === ''
      ? this.refuse(field, `The ${field} is missing.`, 'Enter it.')
      : this.number(text, field, above);
  }

  uncertain(text: string, spread: string, field: string): Uncertain | null {
    const value = this.number(text, field);
    const u = this.number(spread, `uncertainty of the ${field}`, -Number.MIN_VALUE);
    return value === null ? null : { value, u };
  }
}
