/** A number as typed, with decimal point or comma; null for anything else. */
export function readNumber(text: string): number | null {
  const plain = text
    .trim()
    .replace(/[\s\u202f]/g, '')
    .replace(',', '.')
    .replace('−', '-');
  if (!/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(plain)) return null;
  const number = Number(plain);
  return Number.isFinite(number) ? number : null;
}
