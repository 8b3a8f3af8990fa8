import { z } from 'zod';
import { fromBase64, toBase64 } from './base64';
import { sha256Hex } from './hash';
import { sha256Schema } from './uncertain';

/**
 * A raw file, known by the SHA-256 of its bytes. `base64` is null where only its name and hash travel (the bytes then
 * lie beside the bundle or are missing).
 */
export const storedFileSchema = z.strictObject({
  id: sha256Schema,
  size: z.int().nonnegative(),
  mediaType: z.string().max(100),
  base64: z.string().nullable(),
});
export type StoredFile = z.infer<typeof storedFileSchema>;

export const storeFile = (bytes: Uint8Array, mediaType: string): StoredFile => ({
  id: sha256Hex(bytes),
  size: bytes.length,
  mediaType,
  base64: toBase64(bytes),
});

/** The bytes of a stored file, `missing` where they did not travel, `damaged` where they no longer fit the hash. */
export function bytesOfFile(file: StoredFile): Uint8Array | 'missing' | 'damaged' {
  if (file.base64 === null) return 'missing';
  const bytes = fromBase64(file.base64);
  if (bytes === null || bytes.length !== file.size || sha256Hex(bytes) !== file.id) return 'damaged';
  return bytes;
}
