import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

/**
 * Electron's binary, if it is on this machine. The package itself is never loaded: loading it starts a download.
 *
 * @param root folder of the project
 */
export function findElectron(
  root: string,
  environment: Readonly<Record<string, string | undefined>> = process.env,
): string | null {
  const name =
    process.platform === 'win32'
      ? 'electron.exe'
      : process.platform === 'darwin'
        ? 'Electron.app/Contents/MacOS/Electron'
        : 'electron';
  const given = environment.ELECTRON_OVERRIDE_DIST_PATH;
  const candidates: string[] = given ? [join(given, name)] : [];
  const folder = join(root, 'node_modules/electron');
  try {
    candidates.push(join(folder, 'dist', readFileSync(join(folder, 'path.txt'), 'utf8').trim()));
  } catch {
    // Not fetched.
  }
  return candidates.find((path) => existsSync(path)) ?? null;
}
