/** Going back to an earlier state, and bringing a colleague's copy in. */
import AxeBuilder from '@axe-core/playwright';
import { readFile } from 'node:fs/promises';
import type { Page } from '@playwright/test';
import { expect as quick } from '@playwright/test';
import { test } from '../workbench';

const expect = quick.configure({ timeout: 30_000 });
const notes = (page: Page) => page.getByRole('textbox', { name: 'About this candidate' });

async function openFirstSheet(page: Page): Promise<void> {
  await page.getByRole('link', { name: /^Open Demo/ }).click();
  await page.getByRole('link', { name: 'Cr H 2 O 6 charge 3 plus' }).click();
  await expect(notes(page)).toBeVisible();
}

async function write(page: Page, text: string): Promise<void> {
  await notes(page).fill(text);
  await notes(page).blur();
  await expect(page.getByText('Saved.', { exact: true })).toBeVisible();
}

async function exported(page: Page): Promise<Buffer> {
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.keyboard.press('Control+Shift+E'),
  ]);
  return await readFile(await download.path());
}

async function accessible(page: Page, state: string): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect
    .soft(
      violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html.slice(0, 200)}`),
      state,
    )
    .toEqual([]);
}

test('an earlier state is looked at, then brought back; the state before that is kept', async ({
  workbench: page,
}) => {
  test.setTimeout(120_000);
  await openFirstSheet(page);
  await write(page, 'as it was');
  await page.waitForTimeout(2500);
  await page.getByRole('link', { name: 'Copies and snapshots' }).click();
  await expect(page.getByText('the copy itself')).toBeVisible();
  await accessible(page, 'copies');
  await page
    .getByRole('row', { name: /the copy itself/ })
    .getByRole('button', { name: 'Look at it…' })
    .click();
  await expect(page.getByRole('dialog').getByText(/Nothing has been changed yet/)).toBeVisible();
  await page.keyboard.press('Escape');

  await page.goBack();
  const earlier = await exported(page);
  await write(page, 'spoilt');
  const [chooser] = await Promise.all([page.waitForEvent('filechooser'), page.keyboard.press('Control+o')]);
  await chooser.setFiles({ name: 'earlier.spinhue', mimeType: 'application/json', buffer: earlier });
  await page.getByRole('button', { name: 'Bring the project here up to this' }).click();
  await expect(page.getByText(/^Imported/)).toBeVisible();
  await page.getByRole('link', { name: 'Copies and snapshots' }).click();
  const snapshot = page.getByRole('row', { name: /before an import/ }).first();
  await snapshot.getByRole('button', { name: 'Look at it…' }).click();
  await page.getByRole('button', { name: 'Bring the project here up to this' }).click();
  await page.getByRole('link', { name: 'Cr H 2 O 6 charge 3 plus' }).click();
  await expect(notes(page)).toHaveValue('spoilt');
});

test('a colleague’s copy is merged; what both changed is asked, and one step takes it back', async ({
  workbench: page,
}) => {
  test.setTimeout(120_000);
  await openFirstSheet(page);
  await write(page, 'theirs');
  const theirs = await exported(page);
  await page.keyboard.press('Control+z');
  await write(page, 'mine');

  await page.keyboard.press('Control+k');
  await page.keyboard.type('Merge another copy');
  await page.keyboard.press('Enter');
  const [chooser] = await Promise.all([
    page.waitForEvent('filechooser'),
    page.getByRole('button', { name: 'Choose the other copy…' }).click(),
  ]);
  await chooser.setFiles({ name: 'theirs.spinhue', mimeType: 'application/json', buffer: theirs });
  const row = page.getByRole('row', { name: /\[Cr\(H2O\)6\]3\+, notes/ });
  await expect(row.getByRole('radio', { name: 'mine' })).toBeChecked();
  await accessible(page, 'merge');
  await row.getByRole('radio', { name: 'theirs' }).check();
  await page.getByRole('button', { name: 'Take it over' }).click();
  await page.getByRole('link', { name: 'Cr H 2 O 6 charge 3 plus' }).click();
  await expect(notes(page)).toHaveValue('theirs');
  await page.getByRole('heading', { level: 1 }).click();
  await page.keyboard.press('Control+z');
  await expect(notes(page)).toHaveValue('mine');
});
