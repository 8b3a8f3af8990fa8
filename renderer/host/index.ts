import type { Host } from './bridge';
import { browserHost } from './browserHost';
import { electronHost } from './electronHost';

export type * from './bridge';
export { snapshotReasons } from './bridge';
export { openedFile } from './browserFiles';
export {
  commandIds,
  commandTable,
  menuGroups,
  type Command,
  type CommandId,
  type CommandRow,
} from './commands';
export { HostError, type HostErrorCode } from './hostError';
export { externalLinks, type LinkId } from './links';

let host: Promise<Host> | null = null;

/** The host of this window; to be awaited once before the first view is drawn. */
export function getHost(): Promise<Host> {
  host ??= window.spinhue ? electronHost(window.spinhue) : Promise.resolve(browserHost());
  return host;
}
