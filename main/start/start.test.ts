import { mkdir, mkdtemp, rm, utimes, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { isStale } from './buildIfStale';
import { findChromium, windowFlags } from './chromium';
import { findElectron } from './electronBinary';
import { readWords } from './words';

let folder: string;
beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'spinhue-start-'));
});
afterEach(() => rm(folder, { recursive: true, force: true }));

async function put(path: string, time?: Date): Promise<void> {
  await mkdir(join(folder, path, '..'), { recursive: true });
  await writeFile(join(folder, path), '');
  if (time) await utimes(join(folder, path), time, time);
}

describe('start command', () => {
  it('reads its options and refuses what it does not know', () => {
    expect(readWords(['--headless', '--port', '4000', '--mirror=/a b', 'x.spinhue'])).toMatchObject({
      headless: true,
      port: 4000,
      mirror: '/a b',
      files: ['x.spinhue'],
    });
    expect(readWords(['--hedless'])).toMatch(/unknown option --hedless/);
    expect(readWords(['--port', 'x'])).toMatch(/not a port/);
    expect(readWords(['--port', '70000'])).toMatch(/not a port/);
    expect(readWords(['--mirror'])).toMatch(/needs a value/);
    expect(readWords(['--__proto__'])).toMatch(/unknown option/);
  });

  it.runIf(process.platform === 'linux')(
    'finds Electron only where its binary lies, without loading the package',
    async () => {
      await put('node_modules/electron/index.js');
      expect(findElectron(folder, {})).toBeNull();
      await put('node_modules/electron/dist/electron');
      expect(findElectron(folder, {})).toBeNull();
      await writeFile(join(folder, 'node_modules/electron/path.txt'), 'electron');
      expect(findElectron(folder, {})).toBe(join(folder, 'node_modules/electron/dist/electron'));
      await put('given/electron');
      expect(findElectron(folder, { ELECTRON_OVERRIDE_DIST_PATH: join(folder, 'given') })).toBe(
        join(folder, 'given/electron'),
      );
      expect(findElectron(folder, { ELECTRON_OVERRIDE_DIST_PATH: join(folder, 'none') })).toContain(
        'node_modules',
      );
    },
  );

  it.runIf(process.platform === 'linux')(
    'finds a Chromium on the path, or the one that was named',
    async () => {
      expect(findChromium({ PATH: folder })).toBeNull();
      await put('chromium');
      expect(findChromium({ PATH: folder })).toBe(join(folder, 'chromium'));
      await put('mine/chrome');
      expect(findChromium({ PATH: folder, CHROMIUM: join(folder, 'mine/chrome') })).toBe(
        join(folder, 'mine/chrome'),
      );
    },
  );

  it('opens the browser in a window of its own that resolves no name, with its sandbox unless root', () => {
    const flags = windowFlags('http://127.0.0.1:1/', '/profile', false);
    expect(flags).toContain('--app=http://127.0.0.1:1/');
    expect(flags).toContain('--user-data-dir=/profile');
    expect(flags.some((flag) => flag.startsWith('--host-resolver-rules=MAP * ~NOTFOUND'))).toBe(true);
    expect(flags).not.toContain('--no-sandbox');
    expect(windowFlags('x', 'y', true)).toContain('--no-sandbox');
  });

  it('builds again when a source is newer than the build, and not because of a test', async () => {
    const old = new Date(Date.now() - 60_000);
    for (const path of [
      'dist/renderer/index.html',
      'dist/main/main.js',
      'dist/preload/preload.cjs',
      'package-lock.json',
    ]) {
      await put(path, old);
    }
    await put('core/a.ts', old);
    await put('core/a.test.ts');
    await utimes(join(folder, 'core'), old, old);
    expect(isStale(folder)).toBe(true);
    await put('dist/built', new Date(Date.now() - 30_000));
    expect(isStale(folder)).toBe(false);
    await put('core/a.ts');
    expect(isStale(folder)).toBe(true);
    await utimes(join(folder, 'core/a.ts'), old, old);
    await utimes(join(folder, 'core'), old, old);
    expect(isStale(folder)).toBe(false);
    await rm(join(folder, 'dist/main'), { recursive: true });
    expect(isStale(folder)).toBe(true);
  });
});
