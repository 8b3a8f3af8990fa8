/** A charge as people write it, and how many characters it takes; null where there is none. */
export function readCharge(
  text: string,
  from: number,
): { readonly charge: number; readonly length: number } | null {
  const match = /^\s*\^?\s*\(?\{?(?:(\d+)([+-])|([+-])(\d+)|([+-]+))\}?\)?/.exec(text.slice(from));
  if (match === null) return null;
  const [all, before, sign, signFirst, after, row] = match;
  const size = row === undefined ? Number(before ?? after) : row.length;
  const direction = (sign ?? signFirst ?? row![0]) === '+' ? 1 : -1;
  return { charge: direction * size, length: all.length };
}

/** `III`, `0`, `-I` as a number; null where it is none. */
export function readRoman(text: string): number | null {
  if (text === '0') return 0;
  const negative = text.startsWith('-');
  const place = ['I', 'II', 'III', 'IV', 'V', 'VI', 'VII', 'VIII'].indexOf(negative ? text.slice(1) : text);
  return place < 0 ? null : (negative ? -1 : 1) * (place + 1);
}
