/** Each view with the demo and with nothing in it, light and dark: no finding of axe, nothing on the console. */
import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { test } from '../workbench';
import { arrived, createProject, expect } from './steps';

/** Pictures for looking at, where a folder is named: `SCREENSHOTS=folder npx playwright test e2e/workflows/views`. */
const folder = process.env.SCREENSHOTS;

async function examine(page: Page, name: string): Promise<void> {
  if (folder !== undefined) await page.screenshot({ path: `${folder}/${name}.png` });
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
    .analyze();
  const findings = violations.map(
    ({ id, nodes }) => `${id}: ${nodes[0]?.html.slice(0, 200)} (${nodes.length} places)`,
  );
  expect.soft(findings, name).toEqual([]);
}

const settled = async (page: Page): Promise<void> => {
  await expect(page.locator('.cell-waiting')).toHaveCount(0);
};

async function throughTheDemo(page: Page, mode: string): Promise<void> {
  await arrived(page);
  await examine(page, `start-${mode}`);
  await page.getByRole('button', { name: 'New project…' }).click();
  await examine(page, `new-project-${mode}`);
  await page.keyboard.press('Escape');

  await page.getByRole('link', { name: /^Open Demo/ }).click();
  await expect(page.getByText('41 candidates')).toBeVisible();
  await settled(page);
  await examine(page, `table-${mode}`);
  await page.getByRole('checkbox', { name: 'Select [Cr(H2O)6]3+' }).check();
  await page.getByRole('searchbox').fill('Cr(III), 450-600 nm, not low spin');
  await expect(page.getByText(/^Shown: metal Cr 3\+/)).toBeVisible();
  await examine(page, `table-filtered-${mode}`);
  await page.getByText('How to write a filter').click();
  await examine(page, `table-filter-help-${mode}`);
  await page.getByText('How to write a filter').click();
  await page.getByRole('searchbox').fill('nothing of the kind');
  await expect(page.getByRole('heading', { name: 'Nothing passes this filter' })).toBeVisible();
  await examine(page, `table-nothing-${mode}`);
  await page.getByRole('button', { name: 'Clear the filter' }).click();
  await page.getByRole('button', { name: /^Target/ }).click();
  await examine(page, `target-${mode}`);
  await page.keyboard.press('Escape');

  await page.getByRole('link', { name: 'Cr H 2 O 6 charge 3 plus' }).click();
  await expect(page.getByRole('heading', { name: 'Frozen predictions' })).toBeVisible();
  await expect(page.getByRole('heading', { name: /^Levels of d3/ })).toBeVisible();
  await examine(page, `sheet-${mode}`);
  await page.getByRole('button', { name: 'Freeze prediction…' }).click();
  await examine(page, `freeze-${mode}`);
  await page.getByRole('button', { name: 'Freeze', exact: true }).click();
  await expect(page.getByText('before the synthesis')).toBeVisible();
  await page.getByRole('link', { name: 'Change…' }).click();
  await expect(page.getByRole('heading', { name: 'Change the candidate' })).toBeVisible();
  await expect(page.getByText('All 6 places are filled.')).toBeVisible();
  await examine(page, `entry-change-${mode}`);

  await page.keyboard.press('Control+k');
  await page.keyboard.type('en');
  await examine(page, `find-${mode}`);
  await page.keyboard.press('Escape');
  await page.getByRole('heading', { level: 1 }).click();
  await page.keyboard.press('?');
  await examine(page, `shortcuts-${mode}`);
  await page.keyboard.press('Escape');
}

async function throughTheRest(page: Page, mode: string): Promise<void> {
  for (const [link, shown] of [
    ['Library', 'Library'],
    ['Bin', 'The bin is empty'],
    ['Settings', 'Where your data lie'],
  ] as const) {
    await page.getByRole('link', { name: link, exact: true }).click();
    await expect(page.getByRole('heading', { name: shown, exact: true })).toBeVisible();
    await examine(page, `${link.toLowerCase()}-${mode}`);
  }
  await page.goto(page.url().replace(/#.*/, '#/library/ligand.nh3'));
  await expect(page.getByRole('complementary', { name: 'Ligand NH3' })).toBeVisible();
  await examine(page, `library-ligand-${mode}`);
  for (const shelf of ['Metal ions', 'Geometries', 'Series in print']) {
    await page.getByRole('link', { name: shelf }).click();
    await examine(page, `library-${shelf.toLowerCase().replaceAll(' ', '-')}-${mode}`);
  }
  await page.goto(page.url().replace(/#.*/, '#/nowhere'));
  await expect(page.getByRole('heading', { name: 'There is no such view' })).toBeVisible();
  await examine(page, `nowhere-${mode}`);
}

async function throughHelpAndReports(page: Page, mode: string): Promise<void> {
  await page.getByRole('link', { name: 'Methods', exact: true }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'Methods and sources' })).toBeVisible();
  await examine(page, `methods-${mode}`);
  await page.keyboard.press('Control+k');
  await page.keyboard.type('About this program');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { level: 1, name: 'About this program' })).toBeVisible();
  await examine(page, `about-${mode}`);

  await page.getByRole('link', { name: 'Projects', exact: true }).click();
  await page.getByRole('button', { name: 'Take the tour' }).click();
  const tour = page.getByRole('region', { name: 'Tour' });
  for (let stop = 1; stop <= 6; stop++) {
    await expect(tour.getByText(`${stop} of 6`)).toBeVisible();
    await expect(page.getByRole('heading', { level: 1 }).first()).toBeVisible();
    if (stop === 1 || stop === 6) await examine(page, `tour-${stop}-${mode}`);
    // By keyboard: the panel has the focus, its main button is the last.
    if (stop < 6) await tour.getByRole('button', { name: 'Next' }).press('Enter');
  }
  await page.keyboard.press('Escape');
  await expect(tour).toBeHidden();
  await expect(page.getByRole('article', { name: 'Candidate card' })).toBeVisible();
  for (const kind of ['Comparison sheet', 'Order list']) {
    await page.getByRole('radio', { name: kind }).check();
    await expect(page.getByRole('article', { name: kind })).toBeVisible();
    await examine(page, `report-${kind.toLowerCase().replaceAll(' ', '-')}-${mode}`);
  }
  await page.getByRole('radio', { name: 'Agreement report' }).check();
  await expect(page.getByRole('heading', { name: 'No pair that counts yet' })).toBeVisible();
  await examine(page, `report-nothing-${mode}`);
  await page.getByRole('link', { name: 'Projects', exact: true }).click();
  await expect(page.getByRole('button', { name: 'Take the tour' })).toBeHidden();
}

async function throughAnEmptyProject(page: Page, mode: string): Promise<void> {
  await page.getByRole('link', { name: 'Projects', exact: true }).click();
  await createProject(page, 'Nothing in it yet');
  await examine(page, `empty-table-${mode}`);
  await page.getByRole('link', { name: 'New candidate' }).click();
  await expect(page.getByText('Choose a metal to begin with.')).toBeVisible();
  await examine(page, `empty-entry-${mode}`);
}

for (const mode of ['light', 'dark'] as const) {
  test.describe(mode, () => {
    test.use({ colorScheme: mode });
    test.setTimeout(240_000);
    test(`every view can be used without sight of colour or a pointer, ${mode}`, async ({
      workbench: page,
    }) => {
      await throughTheDemo(page, mode);
      await throughTheRest(page, mode);
      await throughHelpAndReports(page, mode);
      await throughAnEmptyProject(page, mode);
    });
  });
}
