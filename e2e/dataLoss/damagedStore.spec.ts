/** The files of the database overwritten on disk while the program is closed. */
import { cp, mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { MirrorFolder } from '../../main/files/mirror/mirrorFolder';
import { mirrorHandlers } from '../../main/ipc/mirrorHandlers';
import { startLocalServer } from '../../main/start/localServer';
import { test } from '../workbench';
import { expect } from '../workflows/steps';
import { startBrowser } from './killableBrowser';

test('database files that were overwritten on disk: the projects come back from the copies', async ({
  site,
}) => {
  test.setTimeout(120_000);
  // The page was built for this fixture.
  expect(site.server.port).toBeGreaterThan(0);
  const folder = await mkdtemp(join(tmpdir(), 'spinhue-damaged-'));
  const [profile, copies, built] = ['profile', 'copies', 'page'].map((name) => join(folder, name)) as [
    string,
    string,
    string,
  ];
  await cp(resolve(import.meta.dirname, '../../dist/renderer'), built, { recursive: true });
  const mirror = new MirrorFolder({ folder: copies, create: true, stateFile: join(folder, 'written.json') });
  const handlers = { ...mirrorHandlers(() => mirror), openExternal: () => null };
  const server = await startLocalServer(built, handlers, 0);
  let running = await startBrowser(profile);
  try {
    await running.page.goto(server.windowAddress());
    await running.page.getByRole('link', { name: /^Open Demo/ }).click();
    await running.page.getByRole('link', { name: 'Cr H 2 O 6 charge 3 plus' }).click();
    const notes = running.page.getByRole('textbox', { name: 'About this candidate' });
    await notes.fill('before the damage');
    await notes.blur();
    await expect(running.page.getByText('Saved.', { exact: true })).toBeVisible();
    const sheet = running.page.url();
    await running.page.waitForTimeout(2500);
    await running.kill();

    const stores = join(profile, 'Default', 'IndexedDB');
    for (const entry of await readdir(stores, { recursive: true, withFileTypes: true })) {
      if (!entry.isFile()) continue;
      const path = join(entry.parentPath, entry.name);
      const bytes = await readFile(path);
      await writeFile(path, bytes.fill(0x5a));
    }

    running = await startBrowser(profile);
    await running.page.goto(server.windowAddress());
    const projects = running.page.getByRole('heading', { level: 1, name: 'Projects' });
    const again = running.page.getByRole('button', { name: 'Try again' });
    await expect(projects.or(again)).toBeVisible();
    if (await again.isVisible()) await again.click();
    await expect(running.page.getByText(/brought back from the folder of copies/)).toBeVisible();
    await running.page.goto(sheet);
    await expect(running.page.getByRole('textbox', { name: 'About this candidate' })).toHaveValue(
      'before the damage',
    );
  } finally {
    await running.kill();
    await server.close();
    await rm(folder, { recursive: true, force: true, maxRetries: 10 });
  }
});
