const digits = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789+/';
const valueOf = new Int8Array(128).fill(-1);
for (let i = 0; i < digits.length; i++) valueOf[digits.charCodeAt(i)] = i;

/** Bytes as base64 (RFC 4648, section 4, padded). */
export function toBase64(bytes: Uint8Array): string {
  const pieces: string[] = [];
  for (let start = 0; start < bytes.length; start += 3 * 4096) {
    const end = Math.min(start + 3 * 4096, bytes.length);
    let piece = '';
    for (let i = start; i < end; i += 3) {
      const triple = (bytes[i]! << 16) | ((bytes[i + 1] ?? 0) << 8) | (bytes[i + 2] ?? 0);
      piece += digits[triple >> 18]! + digits[(triple >> 12) & 63]!;
      piece += i + 1 < bytes.length ? digits[(triple >> 6) & 63]! : '=';
      piece += i + 2 < bytes.length ? digits[triple & 63]! : '=';
    }
    pieces.push(piece);
  }
  return pieces.join('');
}

/** Base64 back to bytes; null where the text is not padded base64 in its one canonical spelling. */
export function fromBase64(text: string): Uint8Array | null {
  if (text.length % 4 !== 0) return null;
  const padding = text.endsWith('==') ? 2 : text.endsWith('=') ? 1 : 0;
  const bytes = new Uint8Array((text.length / 4) * 3 - padding);
  let out = 0;
  for (let i = 0; i < text.length; i += 4) {
    let word = 0;
    for (let k = 0; k < 4; k++) {
      const isPadding = i + k >= text.length - padding;
      const code = text.charCodeAt(i + k);
      const value = isPadding ? 0 : code < 128 ? valueOf[code]! : -1;
      if (value < 0) return null;
      word = (word << 6) | value;
    }
    const left = Math.min(3, bytes.length - out);
    for (let k = 0; k < 3; k++) {
      const byte = (word >> (16 - 8 * k)) & 255;
      if (k < left) bytes[out++] = byte;
      else if (byte !== 0) return null;
    }
  }
  return bytes;
}
