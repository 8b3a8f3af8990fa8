import { counterIons } from '../library/counterIons';
import { Unreadable } from './types';

/** Ions that stand outside the brackets. */
export interface OuterIons {
  readonly charge: number;
  /** `3 Cl`, as the field for counter-ions takes it; null for none. */
  readonly text: string | null;
  /** Where the reading stopped. */
  readonly end: number;
}

const spellings = counterIons
  .flatMap((ion) => [ion.formula, ...ion.names].map((spelling) => ({ spelling, ion })))
  .sort((one, other) => other.spelling.length - one.spelling.length);

/** Reads `K3`, `(NH4)2`, `Cl2`, `(ClO4)3` one after the other, up to `to` or to a dot. */
export function readOuterIons(text: string, from: number, to: number): OuterIons {
  let place = from;
  let charge = 0;
  const written: string[] = [];
  while (place < to && text[place] !== '·') {
    if (text[place] === ' ') {
      place += 1;
      continue;
    }
    const open = text[place] === '(' || text[place] === '[' ? 1 : 0;
    const found = spellings.find(({ spelling }) => text.startsWith(spelling, place + open));
    const closing = open === 1 ? 1 : 0;
    if (found === undefined) throw new Unreadable(place, 'This counter-ion is not known');
    let end = place + open + found.spelling.length + closing;
    if (closing === 1 && !/[)\]]/.test(text[end - 1] ?? ''))
      throw new Unreadable(place, 'This parenthesis is not closed');
    const times = /^\d+/.exec(text.slice(end, to))?.[0] ?? '';
    end += times.length;
    const count = times === '' ? 1 : Number(times);
    charge += count * found.ion.charge;
    written.push(count === 1 ? found.ion.formula : `${count} ${found.ion.formula}`);
    place = end;
  }
  return { charge, text: written.length === 0 ? null : written.join(', '), end: place };
}
