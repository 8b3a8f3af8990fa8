import { mkdir, mkdtemp, readdir, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Page } from '@playwright/test';
import { startUrl } from '../../main/guard/origin';
import { fake } from '../../main/testing/fakeElectron';
import { callNames, eventFunctions } from '../../renderer/host/contract';
import { expect, test } from '../workbench';
import { builtMain, builtPreload, useStandIn } from './standInElectron';

/**
 * The built page in Chromium, the built preload script and the built main process, joined: what is missing to the desktop
 * program is Electron itself, whose place a stand-in takes. The page's address is the test server's, so the sender's
 * address is supplied here.
 */
test.describe('page, preload script and main process, all built, joined through a stand-in for Electron', () => {
  let folder: string;

  test.beforeAll(async ({ built: _ }) => {
    folder = await mkdtemp(join(tmpdir(), 'spinhue-join-'));
    await mkdir(join(folder, 'documents'));
    fake.reset(folder);
    useStandIn();
    await import(builtMain);
    fake.becomeReady();
    await expect.poll(() => fake.windows.length).toBe(1);
  });
  test.afterAll(() => rm(folder, { recursive: true, force: true }));

  async function open(page: Page, address: string): Promise<void> {
    fake.windows[0]!.webContents.mainFrame.url = startUrl;
    await page.exposeFunction('standInInvoke', async (channel: string, payload: unknown) =>
      fake.call(channel, [payload]),
    );
    fake.onSend = (channel, value) =>
      void page.evaluate(
        ([channel, value]) =>
          (globalThis as unknown as { standInSend: (channel: unknown, value: unknown) => void }).standInSend(
            channel,
            value,
          ),
        [channel, value] as const,
      );
    const preload = await readFile(builtPreload, 'utf8');
    await page.addInitScript(`(() => {
      const listeners = [];
      globalThis.standInSend = (channel, value) =>
        listeners.filter((each) => each.channel === channel).forEach(({ listener }) => listener({}, value));
      const standIn = {
        contextBridge: { exposeInMainWorld: (name, api) => Object.defineProperty(globalThis, name, { value: api }) },
        ipcRenderer: {
          invoke: (channel, payload) => standInInvoke(channel, payload),
          on: (channel, listener) => listeners.push({ channel, listener }),
          removeListener: (channel, listener) => {
            const at = listeners.findIndex((each) => each.channel === channel && each.listener === listener);
            if (at >= 0) listeners.splice(at, 1);
          },
        },
      };
      const require = (name) => {
        if (name !== 'electron') throw new Error('a sandboxed preload script may not load ' + name);
        return standIn;
      };
      (() => {
${preload}
      })();
    })()`);
    await page.goto(address);
    await page.getByRole('heading', { level: 1 }).first().waitFor();
  }

  test('the page sees exactly the contract, draws itself, and knows that it is the desktop program', async ({
    page,
    site,
  }) => {
    await open(page, site.server.origin);
    const keys = await page.evaluate(() =>
      Object.keys((window as unknown as { spinhue: object }).spinhue).sort(),
    );
    expect(keys).toEqual([...callNames, ...Object.values(eventFunctions)].sort());
  });

  test('our own scheme serves the built page', async () => {
    const answer = await fake.schemeHandlers.get('spinhue')!(new Request(startUrl));
    expect(answer.status).toBe(200);
    expect(await answer.text()).toContain('<div id="root">');
    expect(answer.headers.get('content-security-policy')).toContain("default-src 'none'");
  });

  test('an edit in the page lies in the folder of copies within two seconds', async ({ page, site }) => {
    await open(page, site.server.origin);
    await page
      .getByRole('button', { name: /new project/i })
      .first()
      .click();
    await page.getByRole('textbox').first().fill('Join test');
    await page.getByRole('textbox').first().press('Enter');
    const copies = join(folder, 'documents', 'Spinhue');
    await expect
      .poll(
        async () => (await readdir(copies).catch(() => [])).filter((name) => name.startsWith('Join-test-')),
        {
          timeout: 4000,
        },
      )
      .toHaveLength(1);
  });

  test('a command of the native menu reaches the page', async ({ page, site }) => {
    await open(page, site.server.origin);
    type Item = { id?: string; submenu?: Item[]; click?: () => void };
    const find = (items: readonly Item[], id: string): Item | undefined =>
      items.flatMap((item) => [item, ...(item.submenu ?? [])]).find((item) => item.id === id);
    find(fake.menu as Item[], 'new-project')!.click!();
    await expect(page.getByRole('dialog')).toBeVisible();
  });

  test('a file saved through the save dialog lies on disk, and opens again through the open dialog', async ({
    page,
    site,
  }) => {
    await open(page, site.server.origin);
    const target = join(folder, 'export.json');
    fake.answers.push({ canceled: false, filePath: target });
    const saved = await page.evaluate(() =>
      (
        window as unknown as { spinhue: { saveFile(request: object): Promise<{ ok: boolean }> } }
      ).spinhue.saveFile({ kind: 'json', suggestedName: 'export.json', data: '{"a":1}' }),
    );
    expect(saved).toMatchObject({ ok: true, value: { saved: true, name: 'export.json' } });
    expect(await readFile(target, 'utf8')).toBe('{"a":1}');
    fake.answers.push({ canceled: false, filePaths: [target] });
    const opened = await page.evaluate(async () => {
      const { spinhue } = window as unknown as {
        spinhue: { openFiles(request: object): Promise<{ value: { name: string; bytes: Uint8Array }[] }> };
      };
      const { value } = await spinhue.openFiles({ kind: 'json', many: false });
      return value.map(({ name, bytes }) => ({ name, text: new TextDecoder().decode(bytes) }));
    });
    expect(opened).toEqual([{ name: 'export.json', text: '{"a":1}' }]);
  });

  test('closing waits for the page’s own answer', async ({ page, site }) => {
    await open(page, site.server.origin);
    fake.windows[0]!.close();
    expect(fake.windows[0]!.destroyed).toBe(false);
    await expect.poll(() => fake.windows[0]!.destroyed).toBe(true);
    expect(fake.windows[0]!.webContents.sent.map(({ channel }) => channel)).toContain('spinhue:on:flush');
    expect(fake.dialogs.filter(({ kind }) => kind === 'message')).toEqual([]);
  });
});
