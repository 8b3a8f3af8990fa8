/** The candidate table and the way around it with the keyboard alone. */
import type { Page } from '@playwright/test';
import { test } from '../workbench';
import { arrived, expect, formulas } from './steps';

test.setTimeout(180_000);

const selected = (page: Page) => page.locator('.grid-row[aria-selected="true"]');
const focused = (page: Page) => page.locator('.grid-row:focus');

async function openDemo(page: Page): Promise<void> {
  await arrived(page);
  await page.keyboard.press('Control+k');
  await page.keyboard.type('Demo: a filter');
  await page.keyboard.press('Enter');
  await expect(page.getByText('41 candidates')).toBeVisible();
  await expect(page.locator('.cell-waiting')).toHaveCount(0);
}

test('rows are walked, marked, tagged, starred and opened by keys', async ({ workbench: page }) => {
  await openDemo(page);
  await page.locator('.grid-row[tabindex="0"]').focus();
  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('Shift+ArrowDown');
  await page.keyboard.press('Shift+ArrowDown');
  await expect(selected(page)).toHaveCount(3);
  await page.keyboard.press('t');
  await page.keyboard.type('short list');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('button', { name: 'Undo: tag 3 candidates “short list”' })).toBeVisible();
  await page.keyboard.press('s');
  await expect(page.getByRole('button', { name: 'Undo: star 3 candidates' })).toBeVisible();

  await page.keyboard.press('f');
  await page.keyboard.type('#short list, starred');
  await expect(page.getByText('3 of 41 candidates')).toBeVisible();
  await page.locator('.grid-row[tabindex="0"]').focus();
  await page.keyboard.press('End');
  await expect(focused(page)).toHaveAttribute('aria-rowindex', '4');
  await page.keyboard.press('Enter');
  await expect(page.getByText('3 of 3', { exact: true })).toBeVisible();
  await page.keyboard.press('k');
  await expect(page.getByText('2 of 3', { exact: true })).toBeVisible();
  await page.keyboard.press('u');
  await expect(page.getByText('3 of 41 candidates')).toBeVisible();
});

test('the far end of the table is reached in one key, and the focus goes along', async ({
  workbench: page,
}) => {
  await openDemo(page);
  await page.locator('.grid-row[tabindex="0"]').focus();
  await page.keyboard.press('End');
  await expect(focused(page)).toHaveAttribute('aria-rowindex', '42');
  await page.keyboard.press('Home');
  await expect(focused(page)).toHaveAttribute('aria-rowindex', '2');
});

test('a table copied for a spreadsheet has units in its head and no formula in its cells', async ({
  workbench: page,
}) => {
  await openDemo(page);
  await page.evaluate(() => {
    const seen = globalThis as unknown as { copied: string };
    Object.defineProperty(navigator, 'clipboard', {
      value: { writeText: async (text: string) => void (seen.copied = text) },
    });
  });
  await page.locator('.grid-row[tabindex="0"]').focus();
  await page.keyboard.press('Control+a');
  await expect(page.getByText('41 candidates selected')).toBeVisible();
  await page.getByRole('button', { name: 'Copy as table' }).click();
  await expect(page.getByText('41 candidates copied as a table')).toBeVisible();
  const text = await page.evaluate(() => (globalThis as unknown as { copied: string }).copied);
  const lines = text.split('\n');
  expect(lines).toHaveLength(42);
  expect(lines[0]).toContain('10Dq / cm-1');
  for (const cell of text.split(/[\t\n]/)) expect(cell).not.toMatch(/^[=+@]/);
  // A chemist's formula begins with a bracket and stays what it is.
  expect(lines[1]).toMatch(/^\[Cr/);
});

test('single letters can be switched off, combinations stay', async ({ workbench: page }) => {
  await openDemo(page);
  await page.keyboard.press('Control+,');
  await page.getByRole('checkbox', { name: 'Single letters work as shortcuts' }).uncheck();
  await page.getByRole('heading', { level: 1 }).click();
  await page.keyboard.press('g');
  await page.keyboard.press('c');
  await expect(page.getByRole('heading', { level: 1, name: 'Settings' })).toBeVisible();
  await page.keyboard.press('Control+k');
  await page.keyboard.type('candidates');
  await page.keyboard.press('Enter');
  await expect.poll(async () => (await formulas(page)).length).toBeGreaterThan(5);
});
