import { readdir, rm, stat } from 'node:fs/promises';
import { join } from 'node:path';
import { temporaryName } from '../atomicWrite';

/** A write that takes longer than this has been killed. */
const abandonedAfter_ms = 10 * 60_000;

/** Removes temporary files that a killed program left behind. */
export async function sweep(folders: readonly string[], now: Date): Promise<void> {
  for (const folder of folders) {
    for (const name of await readdir(folder).catch(() => [] as string[])) {
      if (!temporaryName.test(name)) continue;
      const path = join(folder, name);
      const stats = await stat(path).catch(() => null);
      if (stats !== null && now.getTime() - stats.mtimeMs > abandonedAfter_ms) {
        await rm(path, { force: true }).catch(() => undefined);
      }
    }
  }
}
