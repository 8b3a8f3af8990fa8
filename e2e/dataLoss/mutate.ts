import { contentChecksum, type BundleContent } from '../../core/record/bundle';
import type { Seeded } from '../../core/testing/seeded';

type Json = null | boolean | number | string | Json[] | { [key: string]: Json };
const isObject = (value: Json): value is { [key: string]: Json } =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const deep = (levels: number): Json => {
  let value: Json = 'bottom';
  for (let i = 0; i < levels; i++) value = i % 2 === 0 ? [value] : { a: value };
  return value;
};

/** Stands for a number too large for a double: JSON can hold it, a double cannot. */
const tooLarge = '@@1e999@@';

const hostile: readonly ((random: Seeded) => Json)[] = [
  () => null,
  () => true,
  () => -1,
  () => 0,
  () => 1.5,
  () => 1e308,
  () => tooLarge,
  () => '',
  () => 'NaN',
  () => [],
  () => ({}),
  () => [[]],
  () => '../../etc/passwd',
  () => '..\\..\\windows\\system32',
  () => '/etc/passwd',
  () => '=HYPERLINK("http://example.invalid","x")',
  () => '@SUM(1+1)',
  () => '<img src=x onerror=alert(1)>',
  () => '\u202egnp.exe',
  () => '\u0000',
  () => '\ud800',
  () => '__proto__',
  () => '9999-99-99T99:99:99Z',
  (random) => 'x'.repeat(1 + random.below(300_000)),
  (random) => deep(10 + random.below(1000)),
  (random) => Array.from({ length: random.below(3000) }, (_, i) => i),
];

/** Every place in a value: its container and key. */
function places(root: Json): { holder: Json[] | { [key: string]: Json }; key: string | number }[] {
  const found: ReturnType<typeof places> = [];
  const visit = (value: Json): void => {
    if (Array.isArray(value)) {
      value.forEach((child, key) => {
        found.push({ holder: value, key });
        visit(child);
      });
    } else if (isObject(value)) {
      for (const key of Object.keys(value)) {
        found.push({ holder: value, key });
        visit(value[key]!);
      }
    }
  };
  visit(root);
  return found;
}

function changeOnce(root: Json, random: Seeded): void {
  const all = places(root);
  const { holder, key } = all[random.below(all.length)]!;
  const value = (holder as Record<string | number, Json>)[key]!;
  const put = (next: Json): void => {
    (holder as Record<string | number, Json>)[key] = next;
  };
  switch (random.below(8)) {
    case 0:
      if (Array.isArray(holder)) holder.splice(Number(key), 1);
      else delete holder[key];
      return;
    case 1:
      // A key of its own, reaching for the prototype as often as not.
      if (isObject(value)) {
        const name = ['__proto__', 'constructor', 'prototype', 'extra', 'toString'][random.below(5)]!;
        Object.defineProperty(value, name, {
          value: { polluted: true },
          enumerable: true,
          configurable: true,
          writable: true,
        });
      } else put(hostile[random.below(hostile.length)]!(random));
      return;
    case 2:
      if (Array.isArray(value) && value.length > 0) {
        for (let i = 0; i <= random.below(3); i++)
          value.push(structuredClone(value[random.below(value.length)]!));
      } else put([value]);
      return;
    case 3: {
      const other = all[random.below(all.length)]!;
      put(structuredClone((other.holder as Record<string | number, Json>)[other.key]!));
      return;
    }
    case 4:
      if (typeof value === 'number') put(value * (random.next() < 0.5 ? -1 : 1e6));
      else if (typeof value === 'string') put(value.slice(0, random.below(value.length + 1)));
      else put(value === null ? 'null' : typeof value);
      return;
    default:
      put(hostile[random.below(hostile.length)]!(random));
  }
}

const numbersOut = (text: string): string => text.replaceAll(`"${tooLarge}"`, '1e999');

/** A JSON text with one to four structural changes; the bundle's checksum is renewed now and then. */
export function mutateJson(text: string, random: Seeded): string {
  const root = JSON.parse(text) as { [key: string]: Json };
  const renew = 'checksum' in root && random.next() < 0.6;
  for (let i = 0; i <= random.below(4); i++) changeOnce(renew ? root.content! : root, random);
  if (renew) {
    try {
      root.checksum = contentChecksum(root.content as unknown as BundleContent);
    } catch {
      // Not a content any more.
    }
  }
  return numbersOut(JSON.stringify(root));
}

/** A text with bytes flipped, cut out, doubled, inserted, or the end missing; not always UTF-8 afterwards. */
export function mutateBytes(text: string, random: Seeded): Uint8Array {
  const bytes = new TextEncoder().encode(text);
  const at = random.below(bytes.length);
  const length = 1 + random.below(random.next() < 0.5 ? 4 : 400);
  switch (random.below(6)) {
    case 0:
      return bytes.slice(0, at);
    case 1:
      return Uint8Array.from([...bytes.slice(0, at), ...bytes.slice(at + length)]);
    case 2:
      return Uint8Array.from([...bytes.slice(0, at + length), ...bytes.slice(at)]);
    case 3: {
      const noise = Array.from({ length }, () => random.below(256));
      return Uint8Array.from([...bytes.slice(0, at), ...noise, ...bytes.slice(at)]);
    }
    case 4: {
      // The text in another encoding.
      const wide = new Uint8Array(Buffer.from(`\ufeff${text}`, 'utf16le'));
      return random.next() < 0.5 ? wide : Uint8Array.from([0xef, 0xbb, 0xbf, ...bytes]);
    }
    default: {
      const flipped = bytes.slice();
      for (let i = 0; i < length && at + i < flipped.length; i++) flipped[at + i]! ^= 1 << random.below(8);
      return flipped;
    }
  }
}
