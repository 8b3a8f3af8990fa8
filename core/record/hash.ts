import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex } from '@noble/hashes/utils.js';
import { canonicalJson } from './canonicalJson';

/** SHA-256 (FIPS 180-4) of bytes, or of the UTF-8 form of a string, as 64 lower-case hexadecimal digits. */
export const sha256Hex = (data: Uint8Array | string): string => bytesToHex(sha256(data));

/** SHA-256 of the canonical JSON of a value: equal values have equal hashes, whatever the order of their keys. */
export const contentHash = (value: unknown): string => sha256Hex(canonicalJson(value));

/** What a parameter set is known by: its values, laid over one version of the library. */
export const parameterHash = (values: unknown, libraryVersion: string): string =>
  contentHash({ libraryVersion, values });
