import { decodeAs, decodeUtf8 } from '../../record/text';
import { ReadingError, readingLimits, type TextLayout } from './types';

export interface DecodedText {
  readonly text: string;
  readonly encoding: TextLayout['encoding'];
  readonly eol: TextLayout['eol'];
}

/** Where UTF-16 came without a mark: nearly every other byte of ordinary text is zero. */
function guessUtf16(bytes: Uint8Array): 'utf-16le' | 'utf-16be' | null {
  const end = Math.min(bytes.length, 4096) & ~1;
  if (end < 8) return null;
  let even = 0;
  let odd = 0;
  for (let i = 0; i < end; i += 2) {
    if (bytes[i] === 0) even++;
    if (bytes[i + 1] === 0) odd++;
  }
  const half = end / 2;
  if (odd > 0.9 * half && even < 0.05 * half) return 'utf-16le';
  if (even > 0.9 * half && odd < 0.05 * half) return 'utf-16be';
  return null;
}

/** Control characters that no text table holds; tab, line feed, form feed, carriage return and Ctrl-Z are let through. */
function looksBinary(text: string): boolean {
  let odd = 0;
  for (let i = 0; i < text.length; i++) {
    const code = text.charCodeAt(i);
    if (code === 0) return true;
    const control = code < 32 && code !== 9 && code !== 10 && code !== 12 && code !== 13 && code !== 26;
    if (control || code === 0xfffd || code === 127) odd++;
  }
  return odd > 2 + text.length / 1000;
}

function endOfLine(text: string): TextLayout['eol'] {
  const pairs = text.match(/\r\n/g)?.length ?? 0;
  const returns = (text.match(/\r/g)?.length ?? 0) - pairs;
  const feeds = (text.match(/\n/g)?.length ?? 0) - pairs;
  const kinds = [pairs, returns, feeds].filter((count) => count > 0).length;
  if (kinds > 1) return 'mixed';
  return pairs > 0 ? 'CRLF' : returns > 0 ? 'CR' : 'LF';
}

/** Bytes of a text file as text. Throws a ReadingError for an empty, too large or binary file. */
export function decodeText(bytes: Uint8Array): DecodedText {
  if (bytes.length === 0) throw new ReadingError('empty', 'the file is empty');
  if (bytes.length > readingLimits.bytes) {
    throw new ReadingError(
      'too-large',
      `the file has ${Math.round(bytes.length / 1e6)} MB; spectra up to ${readingLimits.bytes / 1e6} MB are read`,
    );
  }
  const decoded = decode(bytes);
  if (looksBinary(decoded.text)) {
    throw new ReadingError(
      'binary',
      'the file is not text: export it from the instrument program as text or JCAMP-DX',
    );
  }
  if (decoded.text.trim() === '') throw new ReadingError('empty', 'the file holds nothing but blanks');
  return { ...decoded, eol: endOfLine(decoded.text) };
}

function decode(bytes: Uint8Array): { text: string; encoding: TextLayout['encoding'] } {
  if (bytes[0] === 0xff && bytes[1] === 0xfe)
    return { text: decodeAs(bytes, 'utf-16le'), encoding: 'utf-16le' };
  if (bytes[0] === 0xfe && bytes[1] === 0xff)
    return { text: decodeAs(bytes, 'utf-16be'), encoding: 'utf-16be' };
  const utf16 = guessUtf16(bytes);
  if (utf16 !== null) return { text: decodeAs(bytes, utf16), encoding: utf16 };
  const text = decodeUtf8(bytes);
  if (text === null) return { text: decodeAs(bytes, 'windows-1252'), encoding: 'windows-1252' };
  const marked = bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf;
  return { text, encoding: marked ? 'utf-8-bom' : 'utf-8' };
}
