/** Ways to lose data that Chromium alone can show, with the built page. */
import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { Page } from '@playwright/test';
import { test } from '../workbench';
import { addByMouse, arrived, createProject, expect } from '../workflows/steps';

test.setTimeout(180_000);

const notesField = (page: Page) => page.getByRole('textbox', { name: 'About this candidate' });

/** A project with one candidate; leaves the page on the candidate's sheet. */
async function openCandidate(page: Page, project: string): Promise<void> {
  await arrived(page);
  await createProject(page, project);
  await addByMouse(page, { metal: 'nickel', state: 'II', ligands: { ammonia: 6 } });
  await page.getByRole('link', { name: 'Candidates', exact: true }).click();
  await page.locator('.grid-row .cell-complex a').first().click();
  await expect(notesField(page)).toBeVisible();
}

test('the page alone crashes: what was typed and not yet saved is there again', async ({
  context,
  page,
  site,
}) => {
  await page.goto(site.server.windowAddress());
  await openCandidate(page, 'Crash');
  const address = page.url();
  await notesField(page).fill('typed, not saved');
  const devtools = await context.newCDPSession(page);
  const crashed = page.waitForEvent('crash');
  void devtools.send('Page.crash').catch(() => undefined);
  await crashed;
  const again = await context.newPage();
  await again.goto(address);
  await expect(notesField(again)).toHaveValue('typed, not saved');
});

test('closing with something unsaved on screen asks first, and staying keeps it', async ({ page, site }) => {
  await page.goto(site.server.windowAddress());
  await openCandidate(page, 'Closing');
  await notesField(page).pressSequentially('half a thought');
  const asked = page.waitForEvent('dialog');
  await page.close({ runBeforeUnload: true });
  const dialog = await asked;
  expect(dialog.type()).toBe('beforeunload');
  await dialog.dismiss();
  await expect(notesField(page)).toHaveValue('half a thought');
});

test('a database that cannot be opened is said so, with ways out, never shown as an empty list', async ({
  page,
  site,
}) => {
  await page.addInitScript(() => {
    const open = IDBFactory.prototype.open;
    const state = globalThis as unknown as { diskIsBack?: boolean };
    IDBFactory.prototype.open = function (...words) {
      if (!state.diskIsBack) throw new DOMException('Internal error opening backing store', 'UnknownError');
      return open.apply(this, words);
    };
  });
  await page.goto(site.server.windowAddress());
  await expect(page.getByText('Your projects could not be opened')).toBeVisible();
  await expect(page.getByText(/Nothing was deleted/)).toBeVisible();
  await page.evaluate(() => {
    (globalThis as unknown as { diskIsBack?: boolean }).diskIsBack = true;
  });
  await page.getByRole('button', { name: 'Try again' }).click();
  await arrived(page);
});

test('a database of a newer program is refused before any write', async ({ page, site }) => {
  await page.goto(`${site.server.origin}/licences.txt`);
  const version = (): Promise<unknown> =>
    page.evaluate(async () => (await indexedDB.databases()).map(({ name, version }) => `${name} ${version}`));
  await page.evaluate(
    () =>
      new Promise<void>((resolve, reject) => {
        const request = indexedDB.open('spinhue', 9990);
        request.onupgradeneeded = () =>
          request.result.createObjectStore('future', { keyPath: 'id' }).put({ id: 1 });
        request.onsuccess = () => {
          request.result.close();
          resolve();
        };
        request.onerror = () => reject(request.error);
      }),
  );
  const before = await version();
  await page.goto(site.server.windowAddress());
  await expect(page.getByText(/newer version of this program/)).toBeVisible();
  expect(await version()).toEqual(before);
});

test('two windows on one record: the later change does not overwrite the earlier one without a word', async ({
  context,
  page,
  site,
}) => {
  await page.goto(site.server.windowAddress());
  await openCandidate(page, 'Two windows');
  const other = await context.newPage();
  await other.goto(page.url());
  await expect(notesField(other)).toBeVisible();
  await notesField(page).fill('from the first window');
  await notesField(other).fill('from the second window');
  await notesField(other).blur();
  await expect(other.getByText('Saved.', { exact: true })).toBeVisible();
  await notesField(page).blur();
  await expect(page.getByText(/meanwhile|elsewhere|another window/i).first()).toBeVisible();
  await expect(notesField(page)).toHaveValue('from the first window');
  await other.reload();
  await expect(notesField(other)).toHaveValue(/from the second window/);
});

test('an import is preceded by a snapshot of what it changes', async ({ page, site }) => {
  await page.goto(site.server.windowAddress());
  await openCandidate(page, 'Before import');
  const download = page.waitForEvent('download');
  await page.keyboard.press('Control+Shift+E');
  const file = await (await download).path();
  await notesField(page).fill('changed after the export');
  await notesField(page).blur();
  await expect(page.getByText('Saved.', { exact: true })).toBeVisible();
  const chosen = page.waitForEvent('filechooser');
  await page.keyboard.press('Control+o');
  await (
    await chosen
  ).setFiles({ name: 'x.spinhue', mimeType: 'application/json', buffer: await readFile(file) });
  await page.getByRole('dialog').getByRole('button', { name: 'Bring the project here up to this' }).click();
  await expect
    .poll(async () => {
      const folders = await readdir(site.copies);
      const mine = folders.find((name) => name.startsWith('Before-import'));
      if (mine === undefined) return [];
      return readdir(join(site.copies, mine, 'snapshots')).catch(() => []);
    })
    .toContainEqual(expect.stringContaining('before-import'));
});

test('a database that the browser threw away is filled again from the folder of copies', async ({
  page,
  site,
}) => {
  await page.goto(site.server.windowAddress());
  await openCandidate(page, 'Thrown away');
  await notesField(page).fill('written before the loss');
  await notesField(page).blur();
  await expect(page.getByText('Saved.', { exact: true })).toBeVisible();
  const candidate = page.url();
  // The copy is never more than two seconds behind.
  await page.waitForTimeout(2500);
  await page.goto(`${site.server.origin}/licences.txt`);
  await page.evaluate(
    () =>
      new Promise<void>((resolve, reject) => {
        const request = indexedDB.deleteDatabase('spinhue');
        request.onsuccess = () => resolve();
        request.onerror = () => reject(request.error);
      }),
  );
  await page.goto(site.server.windowAddress());
  await expect(page.getByText(/brought back from the folder of copies/)).toBeVisible();
  await page.goto(candidate);
  await expect(notesField(page)).toHaveValue('written before the loss');
});
