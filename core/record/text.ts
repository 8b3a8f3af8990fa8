/** Part of every JavaScript engine the program runs on, though not of the language's own library. */
declare const TextDecoder: new (
  label: string,
  options?: { fatal?: boolean; ignoreBOM?: boolean },
) => { decode(bytes: Uint8Array): string };

/** Bytes as UTF-8 text without a byte-order mark; null where they are not UTF-8. */
export function decodeUtf8(bytes: Uint8Array): string | null {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return null;
  }
}

/** Bytes as text in an encoding of the WHATWG list, wrong sequences replaced by U+FFFD. */
export const decodeAs = (bytes: Uint8Array, label: string): string => new TextDecoder(label).decode(bytes);
