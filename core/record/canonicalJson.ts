import { SpinhueError } from '../errors';

const deepest = 200;

function refuse(path: string, what: string): never {
  throw new SpinhueError({
    code: what === 'not finite' ? 'not-finite' : 'wrong-type',
    message: `${path || 'the value'} is ${what} and cannot be written as JSON`,
    field: path,
  });
}

function write(value: unknown, path: string, depth: number): string {
  if (value === null) return 'null';
  switch (typeof value) {
    case 'string':
    case 'boolean':
      return JSON.stringify(value);
    case 'number':
      if (!Number.isFinite(value)) refuse(path, 'not finite');
      return JSON.stringify(value);
    case 'object':
      break;
    default:
      refuse(path, `a ${typeof value}`);
  }
  if (depth > deepest) refuse(path, `nested deeper than ${deepest}`);
  if (Array.isArray(value)) {
    const items = value.map((item: unknown, i) =>
      // Long lists of numbers: their paths are built only where one is refused.
      typeof item === 'number' && Number.isFinite(item)
        ? String(item)
        : write(item, `${path}[${i}]`, depth + 1),
    );
    return `[${items.join(',')}]`;
  }
  const object = value as Record<string, unknown>;
  const parts: string[] = [];
  for (const key of Object.keys(object).sort()) {
    const item = object[key];
    if (item === undefined) continue;
    parts.push(`${JSON.stringify(key)}:${write(item, path === '' ? key : `${path}.${key}`, depth + 1)}`);
  }
  return `{${parts.join(',')}}`;
}

/**
 * JSON with one spelling per value: keys in ascending order of UTF-16 code units, no blanks, numbers as ECMAScript
 * prints them (the rules of RFC 8785, JSON Canonicalization Scheme). Properties that are `undefined` are left out.
 * Throws a SpinhueError that names the path of a NaN, an infinity or a value that JSON cannot hold.
 */
export const canonicalJson = (value: unknown): string => write(value, '', 0);
