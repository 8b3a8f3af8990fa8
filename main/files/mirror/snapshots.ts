import { constants } from 'node:fs';
import { copyFile, mkdir, open, readdir, readFile, rename, rm, stat } from 'node:fs/promises';
import { randomBytes } from 'node:crypto';
import { join } from 'node:path';
import type { Snapshot, SnapshotReason } from '../../../renderer/host/bridge';
import { HostError } from '../../../renderer/host/hostError';
import { parseSnapshotFile, snapshotEvery_ms, snapshotFile, snapshotId, superfluous } from './rotation';

/** The snapshots of one project, oldest first. */
export async function listSnapshots(folder: string): Promise<readonly Snapshot[]> {
  const names = await readdir(folder).catch(() => [] as string[]);
  const found = names.flatMap((name) => parseSnapshotFile(name) ?? []).sort((a, b) => (a.id < b.id ? -1 : 1));
  const sizes = await Promise.all(
    found.map(({ id }) =>
      stat(join(folder, snapshotFile(id))).then(
        (stats) => stats.size,
        () => null,
      ),
    ),
  );
  return found.flatMap((each, i) => (sizes[i] === null ? [] : [{ ...each, bytes: sizes[i]! }]));
}

/** Copies a file into the snapshots folder, whole or not at all, and removes those that are no longer kept. */
export async function keepSnapshot(
  folder: string,
  source: string,
  reason: SnapshotReason,
  now: Date,
): Promise<Snapshot> {
  await mkdir(folder, { recursive: true });
  const present = new Set((await listSnapshots(folder)).map(({ id }) => id));
  let at = now;
  while (present.has(snapshotId(at, reason))) at = new Date(at.getTime() + 1);
  const id = snapshotId(at, reason);
  const temporary = join(folder, `.spinhue-${randomBytes(8).toString('hex')}.part`);
  try {
    await copyFile(source, temporary, constants.COPYFILE_FICLONE);
    const handle = await open(temporary, 'r+');
    try {
      await handle.sync();
    } finally {
      await handle.close();
    }
    await rename(temporary, join(folder, snapshotFile(id)));
  } catch (error) {
    await rm(temporary, { force: true }).catch(() => undefined);
    throw error;
  }
  for (const old of superfluous(await listSnapshots(folder))) {
    if (old.id !== id) await rm(join(folder, snapshotFile(old.id)), { force: true }).catch(() => undefined);
  }
  const { size } = await stat(join(folder, snapshotFile(id)));
  return { id, takenAt: at.toISOString(), reason, bytes: size };
}

/** Whether the state on disk is worth keeping before it is replaced; also when the clock went backward. */
export function isSnapshotDue(snapshots: readonly Snapshot[], now: Date): boolean {
  const last = snapshots.filter(({ reason }) => reason === 'continuous').at(-1);
  return last === undefined || Math.abs(now.getTime() - Date.parse(last.takenAt)) >= snapshotEvery_ms;
}

export async function readSnapshot(folder: string, id: string): Promise<string> {
  if (parseSnapshotFile(snapshotFile(id)) === null) {
    throw new HostError({
      code: 'refused',
      message: `"${id.slice(0, 60)}" is not the id of a snapshot.`,
      remedy: 'Choose a snapshot from the list.',
    });
  }
  return readFile(join(folder, snapshotFile(id)), 'utf8');
}
