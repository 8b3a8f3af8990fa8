/** A project from its creation over a restart to its export and return, as a chemist would do it. */
import { readFile } from 'node:fs/promises';
import type { BrowserContext, Page } from '@playwright/test';
import { expectQuiet, openProfile, test, watch } from '../workbench';
import { addByMouse, arrived, createProject, expect, formulas } from './steps';

test.setTimeout(180_000);

const chromiumAmmine = { metal: 'chromium', state: 'III', ligands: { ammonia: 6 } };

/** Keys only: metal by its letters, state by arrows from the one proposed, ligand by its name. */
async function addByKeyboard(page: Page): Promise<void> {
  await page.keyboard.press('g');
  await page.keyboard.press('n');
  await expect(page.getByRole('heading', { level: 1, name: 'New candidate' })).toBeVisible();
  const metals = page.getByRole('group', { name: 'Metal' });
  await page.keyboard.press('Tab');
  await expect(page.getByLabel('Formula or name')).toBeFocused();
  await page.keyboard.press('Tab');
  await expect(metals.locator(':focus')).toBeVisible();
  await page.keyboard.type('ni');
  await expect(page.getByRole('radio', { name: 'nickel' })).toBeChecked();
  const field = page.getByRole('combobox', { name: 'Add a ligand' });
  for (let tries = 0; tries < 30 && !(await field.evaluate((el) => el === document.activeElement)); tries++) {
    await page.keyboard.press('Tab');
  }
  for (let times = 0; times < 3; times++) {
    await page.keyboard.type('ethane-1,2-diamine');
    await page.keyboard.press('Enter');
  }
  await expect(page.getByText('All 6 places are filled.')).toBeVisible();
  await expect(page.getByRole('button', { name: 'Add to the project' })).toBeEnabled();
  await page.keyboard.press('Control+Enter');
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Ni');
}

async function open(context: BrowserContext, address: string): Promise<Page> {
  const page = context.pages()[0] ?? (await context.newPage());
  await page.goto(address);
  return page;
}

test('three candidates, by mouse and by keyboard, are ranked, opened, and there again after a restart', async ({
  site,
  profileFolder,
}) => {
  const { server } = site;
  let context = await openProfile(profileFolder);
  let seen = watch(context, server.origin);
  let page = await open(context, server.windowAddress());
  await arrived(page);
  await createProject(page, 'Three ammines');
  await addByMouse(page, chromiumAmmine);
  await addByKeyboard(page);
  await addByMouse(page, { metal: 'cobalt', state: 'III', ligands: { ammonia: 6 } });

  await page.getByRole('link', { name: 'Candidates', exact: true }).click();
  await expect.poll(() => formulas(page)).toEqual(['[Cr(NH3)6]3+', '[Ni(en)3]2+', '[Co(NH3)6]3+']);
  await page.getByLabel('Ranked by').selectOption('10Dq');
  await expect.poll(async () => (await formulas(page))[0]).toBe('[Ni(en)3]2+');
  await page.getByRole('columnheader', { name: '10Dq' }).getByRole('button').click();
  await expect.poll(async () => (await formulas(page)).at(-1)).toBe('[Ni(en)3]2+');

  await page.getByRole('link', { name: /^Cr/ }).click();
  await expect(page.getByRole('heading', { name: 'Seen colour' })).toBeVisible();
  await page.getByRole('textbox', { name: 'About this candidate' }).fill('ask for the perchlorate-free salt');
  await page.getByRole('heading', { level: 1 }).click();
  await expect(page.getByText('Saved.', { exact: true })).toBeVisible();
  const address = page.url();
  expectQuiet(seen);
  await context.close();

  context = await openProfile(profileFolder);
  seen = watch(context, server.origin);
  page = await open(context, server.windowAddress());
  await arrived(page);
  await expect(page.getByRole('link', { name: 'Three ammines', exact: true })).toBeVisible();
  await page.goto(address);
  await expect(page.getByRole('textbox', { name: 'About this candidate' })).toHaveValue(
    'ask for the perchlorate-free salt',
  );
  await page.getByRole('link', { name: 'Candidates', exact: true }).click();
  await expect
    .poll(async () => (await formulas(page)).sort())
    .toEqual(['[Co(NH3)6]3+', '[Cr(NH3)6]3+', '[Ni(en)3]2+'].sort());
  // What was done before the restart can still be taken back.
  await expect(page.getByRole('button', { name: 'Undo: write notes' })).toBeEnabled();
  await page.keyboard.press('Control+z');
  await page.goto(address);
  await expect(page.getByRole('textbox', { name: 'About this candidate' })).toHaveValue('');
  expectQuiet(seen);
  await context.close();
});

async function exported(page: Page, project: string): Promise<{ text: string; path: string }> {
  const waiting = page.waitForEvent('download');
  await page.getByRole('button', { name: `Export ${project}` }).click();
  const path = await (await waiting).path();
  return { path, text: await readFile(path, 'utf8') };
}

test('a project that is exported, deleted for good and imported comes back identical', async ({
  workbench: page,
}) => {
  await arrived(page);
  await createProject(page, 'There and back');
  await addByMouse(page, chromiumAmmine);
  await page.getByRole('link', { name: 'Projects', exact: true }).click();
  const first = await exported(page, 'There and back');

  await page.getByRole('button', { name: 'Delete There and back' }).click();
  await page.getByRole('link', { name: 'Bin', exact: true }).click();
  await expect(page.getByText('Project “There and back”')).toBeVisible();
  await page.getByRole('button', { name: 'Empty the bin…' }).click();
  await page.getByRole('button', { name: 'Delete for good' }).click();
  await expect(page.getByRole('heading', { name: 'The bin is empty' })).toBeVisible();

  await page.getByRole('link', { name: 'Projects', exact: true }).click();
  const choosing = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Import a project…' }).first().click();
  await (
    await choosing
  ).setFiles({
    name: 'there-and-back.spinhue.json',
    mimeType: 'application/json',
    buffer: Buffer.from(first.text),
  });
  await expect(page.getByText('This project is not here yet.')).toBeVisible();
  await page.getByRole('button', { name: 'Import', exact: true }).click();
  await expect.poll(() => formulas(page)).toEqual(['[Cr(NH3)6]3+']);
  await page.getByRole('link', { name: 'Projects', exact: true }).click();
  const second = await exported(page, 'There and back');
  expect(second.text).toBe(first.text);
});

test('a damaged file is refused with its place, and nothing changes', async ({ workbench: page }) => {
  await arrived(page);
  const choosing = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Import a project…' }).first().click();
  await (
    await choosing
  ).setFiles({
    name: 'cut.spinhue.json',
    mimeType: 'application/json',
    buffer: Buffer.from('{"format":"spinhue-project","version":1,"content":{"projects":['),
  });
  const dialog = page.getByRole('dialog', { name: 'This file cannot be imported' });
  await expect(dialog).toContainText('cut off or edited');
  await dialog.getByRole('button', { name: 'Close', exact: true }).last().click();
  await expect(page.getByRole('button', { name: /^Open/ })).toHaveCount(0);
  await expect(page.getByRole('link', { name: /^Open/ })).toHaveCount(1);
});

test('deleting can be undone by the message, by the key and from the bin', async ({ workbench: page }) => {
  await arrived(page);
  await page.getByRole('link', { name: /^Open Demo/ }).click();
  await expect(page.getByText('41 candidates')).toBeVisible();
  const box = page.getByRole('checkbox', { name: 'Select [Cr(ox)3]3-' });
  await box.check();
  await page.getByRole('button', { name: 'Delete', exact: true }).click();
  await expect(page.getByText('40 candidates')).toBeVisible();
  await page.getByRole('status', { name: 'Messages' }).getByRole('button', { name: 'Undo' }).click();
  await expect(page.getByText('41 candidates')).toBeVisible();

  await box.check();
  await page.getByRole('button', { name: 'Delete', exact: true }).click();
  await expect(page.getByText('40 candidates')).toBeVisible();
  await page.keyboard.press('Control+z');
  await expect(page.getByText('41 candidates')).toBeVisible();
  await page.keyboard.press('Control+Shift+z');
  await expect(page.getByText('40 candidates')).toBeVisible();
  await page.getByRole('link', { name: 'Bin', exact: true }).click();
  await page.getByRole('button', { name: /^Bring back/ }).click();
  await expect(page.getByRole('heading', { name: 'The bin is empty' })).toBeVisible();
});
