import { homedir } from 'node:os';
import { join } from 'node:path';

/** Where this machine keeps the browser's profile (with the database in it) and the settings of the start command. */
export function dataFolder(environment: Readonly<Record<string, string | undefined>> = process.env): string {
  if (process.platform === 'win32')
    return join(environment.LOCALAPPDATA ?? join(homedir(), 'AppData/Local'), 'Spinhue-browser');
  if (process.platform === 'darwin') return join(homedir(), 'Library/Application Support/Spinhue-browser');
  return join(environment.XDG_DATA_HOME ?? join(homedir(), '.local/share'), 'spinhue-browser');
}

export const defaultMirrorFolder = (): string => join(homedir(), 'Documents', 'Spinhue');
