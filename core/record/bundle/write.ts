import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex } from '@noble/hashes/utils.js';
import { canonicalJson } from '../canonicalJson';
import { bundleFormat, bundleVersion } from './format';
import { rowsOf, tableNames, type AnyRow, type BundleContent } from './tables';

const byId = (a: AnyRow, b: AnyRow): number => (a.id < b.id ? -1 : a.id > b.id ? 1 : 0);

/** The rows of all tables as canonical JSON, in pieces: joined by nothing they are what the checksum is taken of. */
function* contentPieces(content: Partial<BundleContent>): Generator<string> {
  yield '{';
  for (const [t, table] of tableNames.entries()) {
    yield `${t === 0 ? '' : ','}${JSON.stringify(table)}:[`;
    for (const [i, row] of [...rowsOf(content, table)].sort(byId).entries()) {
      yield `${i === 0 ? '' : ','}${canonicalJson(row)}`;
    }
    yield ']';
  }
  yield '}';
}

/** SHA-256 of the canonical JSON of the content, rows in ascending order of id. */
export function contentChecksum(content: Partial<BundleContent>): string {
  const hash = sha256.create();
  for (const piece of contentPieces(content)) hash.update(piece);
  return `sha256:${bytesToHex(hash.digest())}`;
}

/**
 * The bundle as pieces of text: JSON with one row per line, keys in canonical order, rows in order of id. The same
 * content gives the same bytes. Throws a SpinhueError that names the path of a value which JSON cannot hold.
 */
export function* bundlePieces(content: Partial<BundleContent>): Generator<string> {
  const pieces = [...contentPieces(content)];
  const hash = sha256.create();
  for (const piece of pieces) hash.update(piece);
  const checksum = `sha256:${bytesToHex(hash.digest())}`;
  yield `{"format":${JSON.stringify(bundleFormat)},"version":${bundleVersion},"checksum":"${checksum}",\n"content":`;
  for (const piece of pieces) yield startsRow.test(piece) ? `\n${piece}` : piece;
  yield '\n}\n';
}

const startsRow = /^,?[{"]/;

/** The bundle as one string. */
export const writeBundle = (content: Partial<BundleContent>): string => [...bundlePieces(content)].join('');
