import { randomBytes } from 'node:crypto';
import * as fs from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { asHostError } from './fileProblem';

/** The part of the file system that a write needs; tests hand in one that fails. */
export type WriteSystem = Pick<typeof fs, 'open' | 'rename' | 'rm' | 'realpath' | 'stat'>;

export interface AtomicWriteOptions {
  readonly system?: WriteSystem;
  /** How long to wait before each further try when the target is held by another program. */
  readonly retryDelays_ms?: readonly number[];
}

/** A virus scanner or a synchronising client may hold a file for a moment. */
const isHeld = (error: unknown): boolean =>
  ['EBUSY', 'EPERM', 'EACCES'].includes((error as NodeJS.ErrnoException).code ?? '');

export const temporaryName = /^\.spinhue-[0-9a-f]{16}\.part$/;

/**
 * Writes through a temporary file in the same folder, flushed and renamed: a reader sees the old file or the new one,
 * never half of one, and after a power cut too. A link is followed, so that what it points to is replaced.
 *
 * @throws {HostError} that names the file; the old file is then untouched and no temporary file is left
 */
export async function writeAtomically(
  path: string,
  data: string | Uint8Array,
  { system = fs, retryDelays_ms = [20, 60, 150, 400, 800] }: AtomicWriteOptions = {},
): Promise<void> {
  const target = await system.realpath(path).catch(() => path);
  const temporary = join(dirname(target), `.spinhue-${randomBytes(8).toString('hex')}.part`);
  try {
    const mode = await system.stat(target).then(
      (stats) => stats.mode & 0o777,
      () => undefined,
    );
    const handle = await system.open(temporary, 'wx', mode);
    try {
      await handle.writeFile(data);
      await handle.sync();
    } finally {
      await handle.close();
    }
    await renamePatiently(system, temporary, target, retryDelays_ms);
  } catch (error) {
    await system.rm(temporary, { force: true }).catch(() => undefined);
    throw asHostError(error, 'write', path);
  }
  await flushFolder(system, dirname(target));
}

async function renamePatiently(
  system: WriteSystem,
  from: string,
  to: string,
  delays_ms: readonly number[],
): Promise<void> {
  for (const delay_ms of delays_ms) {
    try {
      return await system.rename(from, to);
    } catch (error) {
      if (!isHeld(error)) throw error;
      await new Promise((resolve) => setTimeout(resolve, delay_ms));
    }
  }
  try {
    await system.rename(from, to);
  } catch (error) {
    if (isHeld(error)) throw Object.assign(new Error('held', { cause: error }), { code: 'EBUSY' });
    throw error;
  }
}

/** Makes the rename itself lasting; Windows cannot open folders, and some file systems refuse. */
async function flushFolder(system: WriteSystem, folder: string): Promise<void> {
  try {
    const handle = await system.open(folder, 'r');
    try {
      await handle.sync();
    } finally {
      await handle.close();
    }
  } catch {
    // The file's own content is flushed already.
  }
}
