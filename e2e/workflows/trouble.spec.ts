/** What goes wrong is said with a way out, and nothing that was typed is lost. */
import { openProfile, test, watch } from '../workbench';
import { arrived, createProject, expect } from './steps';

test.setTimeout(180_000);

test('a full disk keeps what was typed on screen, says so until a save succeeds, and then saves', async ({
  workbench: page,
}) => {
  await arrived(page);
  await page.getByRole('link', { name: /^Open Demo/ }).click();
  await page.getByRole('link', { name: 'Cr H 2 O 6 charge 3 plus' }).click();
  const notes = page.getByRole('textbox', { name: 'About this candidate' });
  await expect(notes).toBeVisible();
  await page.evaluate(() => {
    const { put } = IDBObjectStore.prototype;
    const full = globalThis as unknown as { freeTheDisk: () => void };
    IDBObjectStore.prototype.put = () => {
      throw new DOMException('no room', 'QuotaExceededError');
    };
    full.freeTheDisk = () => (IDBObjectStore.prototype.put = put);
  });
  await notes.fill('weighed twice');
  await page.getByRole('heading', { level: 1 }).click();
  const alert = page.getByRole('alert').filter({ hasText: 'Not saved.' });
  await expect(alert).toContainText('full');
  await expect(notes).toHaveValue('weighed twice');
  const download = page.waitForEvent('download');
  await alert.getByRole('button', { name: 'Export this project…' }).click();
  expect((await download).suggestedFilename()).toMatch(/\.spinhue\.json$/);

  await page.evaluate(() => (globalThis as unknown as { freeTheDisk: () => void }).freeTheDisk());
  await notes.focus();
  await page.getByRole('heading', { level: 1 }).click();
  await expect(page.getByText('Saved.', { exact: true })).toBeVisible();
  await expect(alert).toBeHidden();
});

test('what was typed and not saved is there again after the page went down', async ({ workbench: page }) => {
  await arrived(page);
  await createProject(page, 'Cut short');
  await page.getByRole('link', { name: 'New candidate' }).click();
  await page.getByRole('radio', { name: 'nickel', exact: true }).check();
  await page.getByRole('button', { name: 'Add ammonia', exact: true }).click();
  await page.reload();
  await expect(page.getByRole('radio', { name: 'nickel', exact: true })).toBeChecked();
  await expect(page.getByText('1 of 6 places filled, 5 free.')).toBeVisible();
});

test('data of a newer version are not touched, and the window says what to do', async ({
  site,
  profileFolder,
}) => {
  const context = await openProfile(profileFolder);
  const seen = watch(context, site.server.origin);
  const page = context.pages()[0] ?? (await context.newPage());
  await page.goto(`${site.server.origin}/icon.svg`);
  await page.evaluate(
    () =>
      new Promise<void>((done, fail) => {
        const opening = indexedDB.open('spinhue', 990);
        opening.onupgradeneeded = () => opening.result.createObjectStore('projects', { keyPath: 'id' });
        opening.onerror = () => fail(opening.error);
        opening.onsuccess = () => {
          opening.result.close();
          done();
        };
      }),
  );
  await page.goto(site.server.windowAddress());
  await expect(page.getByRole('alert')).toContainText('last used by a newer version');
  const databases = await page.evaluate(() => indexedDB.databases());
  expect(databases.find(({ name }) => name === 'spinhue')?.version).toBe(990);
  expect(seen.violations).toEqual([]);
  await context.close();
});

test('an import shows what it would replace, and can be taken as a second project instead', async ({
  workbench: page,
}) => {
  await arrived(page);
  await createProject(page, 'Shared');
  await page.getByRole('link', { name: 'Projects', exact: true }).click();
  const download = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Export Shared' }).click();
  const path = await (await download).path();
  await page.getByRole('button', { name: 'Rename Shared' }).click();
  await page.getByRole('textbox', { name: 'New name for Shared' }).fill('Shared, mine');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('link', { name: 'Shared, mine', exact: true })).toBeVisible();

  const choosing = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Import a project…' }).first().click();
  await (await choosing).setFiles(path);
  const dialog = page.getByRole('dialog', { name: 'Import “Shared”?' });
  await expect(dialog.getByRole('row', { name: /^projects/ })).toContainText('1');
  await expect(dialog).toContainText('This project is here already.');
  await dialog.getByRole('button', { name: 'Add as a second project' }).click();
  await page.getByRole('link', { name: 'Projects', exact: true }).click();
  await expect(page.getByRole('link', { name: 'Shared (copy)', exact: true })).toBeVisible();
  await expect(page.getByRole('link', { name: 'Shared, mine', exact: true })).toBeVisible();
});
