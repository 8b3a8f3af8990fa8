/** A value as it may be quoted in a sentence: short, and telling text from number. */
export function describeValue(value: unknown): string {
  if (value === null) return 'null';
  if (value === undefined) return 'missing';
  if (typeof value === 'string') {
    const text = value.length > 40 ? `${value.slice(0, 40)}…` : value;
    return text === '' ? 'an empty text' : `"${text}"`;
  }
  if (Array.isArray(value)) return 'a list';
  if (typeof value === 'object') return 'an object';
  return String(value);
}
