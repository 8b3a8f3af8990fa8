import { readBundle } from '../../../core/record/bundle';
import type { Host } from '../../host';
import { bringIn, planImport, type Store } from '../../store';

/** What was brought back from the folder of copies; null where nothing had to be. */
export interface BroughtBack {
  readonly projects: number;
  /** Names of copies that could not be read; they stay in their folder. */
  readonly unread: readonly string[];
}

/**
 * Fills a database that has just been made from the folder of copies. A browser engine that finds its store damaged,
 * after a kill or a failing disk, deletes it without asking and begins an empty one: the copies are then all there is.
 */
export async function bringBackLost(store: Store, host: Pick<Host, 'mirror'>): Promise<BroughtBack | null> {
  if ((await store.settings.read()).demoLoaded || (await store.db.projects.count()) > 0) return null;
  if ((await host.mirror.status()).state !== 'ready') return null;
  const copies = await host.mirror.projects();
  const unread: string[] = [];
  let projects = 0;
  for (const { projectId, name } of copies) {
    const reading = readBundle(await host.mirror.read(projectId));
    if (!reading.ok) {
      unread.push(name);
      continue;
    }
    await bringIn(store.journal, await planImport(store.db, reading.content));
    projects += 1;
  }
  // The demo project is among the copies, or was deleted: it is not put in a second time.
  if (projects > 0) await store.settings.set('demoLoaded', true);
  return projects + unread.length === 0 ? null : { projects, unread };
}

/** For the notice at the start. */
export function broughtBackWords({ projects, unread }: BroughtBack): string {
  const back =
    projects === 0
      ? 'nothing could be brought back from the folder of copies'
      : `${projects === 1 ? '1 project was' : `${projects} projects were`} brought back from the folder of copies`;
  const rest = unread.length === 0 ? '' : ` Not readable: ${unread.join(', ')}; look into their snapshots.`;
  return `The database was empty; ${back}.${rest}`;
}
