/** The candidate table: groups, changes in the row, small windows and enlarged text. */
import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { test } from '../workbench';
import { arrived, expect } from './steps';

test.setTimeout(120_000);

async function openDemo(page: Page): Promise<void> {
  await arrived(page);
  await page.getByRole('link', { name: /^Demo: a filter/ }).click();
  await expect(page.getByText('41 candidates')).toBeVisible();
  await expect(page.locator('.cell-waiting')).toHaveCount(0);
}

async function expectNoFinding(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect.soft(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html.slice(0, 200)}`)).toEqual([]);
}

test('a row is changed in place by keys, is left alone by Escape, and undone', async ({
  workbench: page,
}) => {
  await openDemo(page);
  await page.locator('.grid-row[tabindex="0"]').focus();
  await page.keyboard.press('F2');
  const form = page.getByRole('form', { name: /^Change / });
  await expect(form.getByLabel('Name')).toBeFocused();
  await expectNoFinding(page);
  await form.getByLabel('Name').fill('not kept');
  await page.keyboard.press('Escape');
  await expect(form).toBeHidden();
  await expect(page.locator('.grid-row:focus')).toHaveCount(1);
  await expect(page.getByText('not kept')).toHaveCount(0);

  await page.keyboard.press('F2');
  await form.getByLabel('Name').fill('first batch');
  await page.keyboard.press('Tab');
  await page.keyboard.type('to make, #pink');
  await page.keyboard.press('Enter');
  await expect(page.getByText('first batch')).toBeVisible();
  await expect(page.locator('.grid-row:focus .badge').last()).toHaveText('pink');
  await page.keyboard.press('Control+z');
  await expect(page.getByText('first batch')).toHaveCount(0);
});

test('rows stand under headings, keys walk over the headings, and the grouping is remembered', async ({
  workbench: page,
}) => {
  await openDemo(page);
  await page.getByLabel('Grouped by').selectOption('metal');
  await expect(page.locator('.grid-group').first()).toContainText(/^Cr\(III\) \d/);
  await expectNoFinding(page);
  await page.locator('.grid-row[tabindex="0"]').focus();
  await page.keyboard.press('End');
  const rows = Number(await page.getByRole('grid').getAttribute('aria-rowcount'));
  expect(rows).toBeGreaterThan(42);
  await expect(page.locator('.grid-row:focus')).toHaveAttribute('aria-rowindex', String(rows));
  await page.keyboard.press('Home');
  await expect(page.locator('.grid-row:focus')).toHaveAttribute('aria-rowindex', '3');
  await page.reload();
  await expect(page.getByLabel('Grouped by')).toHaveValue('metal');
});

/** 200 % zoom of a window of 1280 x 800 leaves the page 640 x 400. */
for (const { what, width, height } of [
  { what: 'a window 900 px wide', width: 900, height: 700 },
  { what: '200 % zoom', width: 640, height: 400 },
]) {
  test(`${what} loses nothing`, async ({ workbench: page }) => {
    await page.setViewportSize({ width, height });
    await openDemo(page);
    const fits = async (view: string): Promise<void> => {
      const cut = await page.evaluate(() => {
        const root = document.documentElement;
        const out: string[] = [];
        if (root.scrollWidth > root.clientWidth) out.push(`the page is ${root.scrollWidth} px wide`);
        for (const each of document.querySelectorAll<HTMLElement>('button, a[href], input, select')) {
          const { left, right, width: wide } = each.getBoundingClientRect();
          if (
            wide === 0 ||
            each.closest('.grid, .visually-hidden, [aria-hidden="true"], details:not([open])')
          ) {
            continue;
          }
          let scrolls = false;
          for (let up = each.parentElement; up; up = up.parentElement) {
            if (/auto|scroll/.test(getComputedStyle(up).overflowX) && up.scrollWidth > up.clientWidth) {
              scrolls = true;
            }
          }
          if (!scrolls && (left < -1 || right > innerWidth + 1)) {
            out.push(`${each.outerHTML.slice(0, 100)} at ${Math.round(left)} to ${Math.round(right)}`);
          }
        }
        return out;
      });
      expect.soft(cut, view).toEqual([]);
    };
    await fits('candidates');
    // Every column can be brought into sight.
    const last = page.locator('.grid-head [role=columnheader]').last();
    await last.scrollIntoViewIfNeeded();
    await expect(last).toBeInViewport();
    const first = page.locator('.grid-row .cell-complex a').first();
    await first.scrollIntoViewIfNeeded();
    await first.click();
    await expect(page.locator('#sheet-spin')).toBeAttached();
    await fits('sheet');
    for (const name of ['New candidate', 'Level diagrams', 'Library']) {
      const link = page.getByRole('link', { name, exact: true });
      if ((await link.count()) === 0) continue;
      await link.first().click();
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
      await fits(name);
    }
  });
}
