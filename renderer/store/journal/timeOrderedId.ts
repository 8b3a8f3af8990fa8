/** Room in the 12 bits beside the time of a version 7 UUID. */
const perMillisecond = 4096;

let last = { at: 0, count: 0 };

/**
 * A version 7 UUID (RFC 9562): unique, and later ones sort behind earlier ones even when thousands are made at once, so
 * that rows come out of the database in the order in which they were entered.
 */
export function timeOrderedId(now = Date.now(), random = crypto.getRandomValues(new Uint8Array(8))): string {
  last = now > last.at ? { at: now, count: 0 } : { at: last.at, count: last.count + 1 };
  if (last.count >= perMillisecond) last = { at: last.at + 1, count: 0 };
  const time = last.at.toString(16).padStart(12, '0');
  const count = last.count.toString(16).padStart(3, '0');
  random[0] = (random[0]! & 0x3f) | 0x80;
  const rest = Array.from(random, (byte) => byte.toString(16).padStart(2, '0')).join('');
  return `${time.slice(0, 8)}-${time.slice(8)}-7${count}-${rest.slice(0, 4)}-${rest.slice(4)}`;
}
