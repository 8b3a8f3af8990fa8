import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';

const names: Partial<Record<NodeJS.Platform, readonly string[]>> = {
  linux: ['chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome', 'microsoft-edge'],
  darwin: [
    '/Applications/Chromium.app/Contents/MacOS/Chromium',
    '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
    '/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge',
  ],
  win32: [
    'C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe',
    'C:\\Program Files (x86)\\Google\\Chrome\\Application\\chrome.exe',
    'C:\\Program Files (x86)\\Microsoft\\Edge\\Application\\msedge.exe',
  ],
};

/** A browser of the Chromium family on this machine; `CHROMIUM` names one to prefer. */
export function findChromium(
  environment: Readonly<Record<string, string | undefined>> = process.env,
): string | null {
  const folders = (environment.PATH ?? '').split(delimiter).filter((folder) => folder !== '');
  const wanted = [environment.CHROMIUM ?? '', ...(names[process.platform] ?? [])].filter(
    (name) => name !== '',
  );
  for (const name of wanted) {
    if (/[\\/]/.test(name)) {
      if (existsSync(name)) return name;
      continue;
    }
    const found = folders.map((folder) => join(folder, name)).find((path) => existsSync(path));
    if (found !== undefined) return found;
  }
  return null;
}

/** Flags for a window of its own that stays on this machine. */
export function windowFlags(address: string, profile: string, asRoot: boolean): string[] {
  return [
    `--app=${address}`,
    `--user-data-dir=${profile}`,
    '--window-size=1360,880',
    '--no-first-run',
    '--no-default-browser-check',
    '--disable-background-networking',
    '--disable-component-update',
    '--disable-sync',
    '--disable-quic',
    '--disable-features=Translate,OptimizationHints,MediaRouter',
    '--no-pings',
    '--proxy-server=direct://',
    '--host-resolver-rules=MAP * ~NOTFOUND , EXCLUDE 127.0.0.1',
    // Chromium's own sandbox refuses to run as root.
    ...(asRoot ? ['--no-sandbox', '--test-type'] : []),
  ];
}
