import type { Host, SnapshotReason } from '../../host';
import { exportProject, type Store } from '../../store';

/** Keeps the project as it stands as a snapshot of its own, where copies are kept; without a folder there is none. */
export async function snapshotBefore(
  host: Host,
  store: Store,
  project: { readonly id: string; readonly name: string },
  reason: SnapshotReason,
): Promise<void> {
  if ((await host.mirror.status()).state !== 'ready') return;
  const bundle = await exportProject(store.db, project.id);
  await host.mirror.takeSnapshot({ projectId: project.id, projectName: project.name, bundle }, reason);
}
