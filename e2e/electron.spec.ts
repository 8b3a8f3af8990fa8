import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { _electron, type ElectronApplication, expect, type Page, test } from '@playwright/test';
import { callNames, eventFunctions } from '../renderer/host/contract';
import { findElectron } from '../main/start/electronBinary';

const root = resolve(import.meta.dirname, '..');
const binary = findElectron(root);

/** What only the real binary can show. Written to be run wherever one is; the same rows run against a stand-in before. */
test.describe('with the real Electron', () => {
  test.skip(binary === null, 'Electron’s binary is not on this machine (`npx install-electron` fetches it)');

  let program: ElectronApplication;
  let page: Page;
  let data: string;
  const launch = (): Promise<ElectronApplication> =>
    _electron.launch({
      executablePath: binary!,
      args: [...(process.getuid?.() === 0 ? ['--no-sandbox'] : []), `--user-data-dir=${data}`, root],
    });
  test.beforeAll(async () => {
    data = await mkdtemp(join(tmpdir(), 'spinhue-electron-'));
    program = await launch();
    page = await program.firstWindow();
    await page.getByRole('heading', { level: 1 }).first().waitFor();
  });
  test.afterAll(async () => {
    await program?.close();
    await rm(data, { recursive: true, force: true, maxRetries: 5 });
  });

  test('loads nothing remote: every request of the page goes to our own scheme', async () => {
    const requests: string[] = [];
    page.on('request', (request) => requests.push(request.url()));
    await page.reload();
    await page.getByRole('heading', { level: 1 }).first().waitFor();
    expect(requests.length).toBeGreaterThan(0);
    expect(requests.filter((url) => !/^(spinhue:\/\/workbench\/|data:|blob:)/.test(url))).toEqual([]);
  });

  test('no Node in the page or in a worker', async () => {
    const types = await page.evaluate(() => [
      typeof (globalThis as Record<string, unknown>).require,
      typeof (globalThis as Record<string, unknown>).process,
      typeof (globalThis as Record<string, unknown>).module,
    ]);
    expect(types).toEqual(['undefined', 'undefined', 'undefined']);
  });

  test('sandbox and context isolation really hold', async () => {
    const preferences = await program.evaluate(({ BrowserWindow }) => {
      const contents = BrowserWindow.getAllWindows()[0]!.webContents as unknown as {
        getLastWebPreferences(): Record<string, unknown>;
      };
      const { sandbox, contextIsolation, nodeIntegration, webSecurity } = contents.getLastWebPreferences();
      return { sandbox, contextIsolation, nodeIntegration, webSecurity };
    });
    expect(preferences).toEqual({
      sandbox: true,
      contextIsolation: true,
      nodeIntegration: false,
      webSecurity: true,
    });
  });

  test('permissions are refused', async () => {
    const answers = await page.evaluate(async () => ({
      notifications: await Notification.requestPermission(),
      clipboard: await navigator.clipboard.readText().then(
        () => 'granted',
        () => 'refused',
      ),
      media: await navigator.mediaDevices.getUserMedia({ audio: true }).then(
        () => 'granted',
        () => 'refused',
      ),
    }));
    expect(answers).toEqual({ notifications: 'denied', clipboard: 'refused', media: 'refused' });
  });

  test('the content policy holds on our scheme, and the page is isolated from other origins', async () => {
    const outcome = await page.evaluate(async () => {
      const inline = document.createElement('script');
      inline.textContent = 'window.ranInline = true';
      document.head.append(inline);
      return {
        inline: (window as unknown as { ranInline?: true }).ranInline,
        isolated: globalThis.crossOriginIsolated,
        fetched: await fetch('https://example.invalid/').catch((error: Error) => error.name),
      };
    });
    expect(outcome).toEqual({ inline: undefined, isolated: true, fetched: 'TypeError' });
  });

  test('a webview element stays inert', async () => {
    const inert = await page.evaluate(() => {
      const element = document.createElement('webview');
      document.body.append(element);
      return !('loadURL' in element);
    });
    expect(inert).toBe(true);
  });

  test('no navigation by link or script, and no second window', async () => {
    const before = page.url();
    await page.evaluate(() => {
      const link = document.createElement('a');
      link.href = 'https://example.invalid/';
      link.target = '_self';
      document.body.append(link);
      link.click();
      open('https://example.invalid/');
      open('about:blank');
      location.href = 'spinhue://workbench/other.html';
    });
    await page.waitForTimeout(500);
    expect(page.url()).toBe(before);
    expect(program.windows()).toHaveLength(1);
  });

  test('the page sees exactly the functions of the contract', async () => {
    const keys = await page.evaluate(() =>
      Object.keys((window as unknown as { spinhue: object }).spinhue).sort(),
    );
    expect(keys).toEqual([...callNames, ...Object.values(eventFunctions)].sort());
  });

  test('a download started by the page leaves no file', async () => {
    const started = await page.evaluate(() => {
      const anchor = document.createElement('a');
      anchor.href = URL.createObjectURL(new Blob(['x']));
      anchor.download = 'x.txt';
      anchor.click();
      return true;
    });
    expect(started).toBe(true);
    await expect(page.waitForEvent('download', { timeout: 1000 })).rejects.toThrow();
  });

  test('a second start ends by itself and leaves the first alone', async () => {
    const second = await launch().catch(() => null);
    if (second !== null) await second.waitForEvent('close', { timeout: 10_000 });
    expect(program.windows()).toHaveLength(1);
  });

  test('the database is on our origin and lasts through a restart', async () => {
    expect(await page.evaluate(() => location.origin)).toBe('spinhue://workbench');
    await page.evaluate(() => localStorage.setItem('spinhue-test', 'kept'));
    await program.close();
    program = await launch();
    page = await program.firstWindow();
    expect(await page.evaluate(() => localStorage.getItem('spinhue-test'))).toBe('kept');
    expect(await page.evaluate(async () => (await indexedDB.databases()).map(({ name }) => name))).toContain(
      'spinhue',
    );
  });

  test('a crash of the page is answered, and the page comes back', async () => {
    await program.evaluate(({ dialog }) => {
      dialog.showMessageBox = (async () => ({ response: 0, checkboxChecked: false })) as never;
    });
    await program.evaluate(({ BrowserWindow }) =>
      BrowserWindow.getAllWindows()[0]!.webContents.forcefullyCrashRenderer(),
    );
    await expect
      .poll(() =>
        program.evaluate(({ BrowserWindow }) => BrowserWindow.getAllWindows()[0]!.webContents.isCrashed()),
      )
      .toBe(false);
  });
});

test.describe('with a packaged program', () => {
  const packaged = process.env.SPINHUE_PACKAGED;
  test.skip(packaged === undefined, 'no packaged program is named in SPINHUE_PACKAGED');

  test('the fuses of the binary are set as listed', async () => {
    const { getCurrentFuseWire } = await import('@electron/fuses');
    const { wantedFuses } = await import('../main/packaging/fuses');
    const wire = (await getCurrentFuseWire(packaged!)) as unknown as Record<string, number>;
    for (const [index, on] of Object.entries(wantedFuses)) {
      // The wire holds the characters 0 and 1.
      expect(String.fromCharCode(wire[index]!), index).toBe(on ? '1' : '0');
    }
  });
});
