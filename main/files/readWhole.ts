import { readFile, stat } from 'node:fs/promises';
import { basename } from 'node:path';
import type { FileHandle, OpenedFile } from '../../renderer/host/bridge';
import { HostError } from '../../renderer/host/hostError';
import { asHostError } from './fileProblem';

/** Above the largest file that any reader of the program accepts. */
export const largestFile_bytes = 400e6;

/**
 * Reads an ordinary file that is not absurdly large: no device, no pipe, no folder.
 *
 * @throws {HostError} that names the file
 */
export async function readWhole(
  path: string,
  handle: FileHandle | null,
  limit_bytes = largestFile_bytes,
): Promise<OpenedFile> {
  try {
    const stats = await stat(path);
    // Looked at before it is opened: opening a pipe would wait for ever.
    if (!stats.isFile()) {
      throw new HostError({
        code: 'unreadable',
        message: `${path} is not an ordinary file.`,
        remedy: 'Choose a file.',
      });
    }
    if (stats.size > limit_bytes) {
      throw new HostError({
        code: 'too-large',
        message: `${path} has ${Math.round(stats.size / 1e6)} MB; at most ${Math.round(limit_bytes / 1e6)} MB are read.`,
        remedy: 'Split the file, or export the project without raw files.',
      });
    }
    const bytes = new Uint8Array(await readFile(path));
    return { name: basename(path), bytes, modifiedAt: stats.mtime.toISOString(), handle };
  } catch (error) {
    throw asHostError(error, 'read', path);
  }
}
