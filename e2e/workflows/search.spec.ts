/** A search of the large default space while one works on: fluid, interrupted, taken up again; and by keyboard alone. */
import { readFile } from 'node:fs/promises';
import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { test, openProfile } from '../workbench';
import { arrived, expect } from './steps';

test.setTimeout(180_000);

async function openSearch(page: Page): Promise<void> {
  await arrived(page);
  await page.getByRole('link', { name: /^Open Demo/ }).click();
  // Those of another test of this file may be among them, from the folder of copies.
  await expect(page.getByText(/^4\d candidates/)).toBeVisible();
  await expect(page.locator('.cell-waiting')).toHaveCount(0);
  await page.getByRole('link', { name: 'Find ligands' }).click();
  await expect(page.locator('.search-count')).toHaveText(/^[\d\s]+ candidates/);
}

/** Every ion, every ligand, up to three kinds: more than ten million complexes. */
async function wishLarge(page: Page): Promise<void> {
  await page.getByRole('button', { name: /^Metal ions: all/ }).click();
  await page.getByRole('button', { name: /^Ligands: all/ }).click();
  await page.getByRole('radio', { name: '3', exact: true }).check();
  await expect.poll(() => countShown(page)).toBeGreaterThan(10_000_000);
}

const figures = (text: string | null): number => Number((text ?? '').replace(/\D/g, ''));
const countShown = async (page: Page): Promise<number> =>
  figures(await page.locator('.search-count').textContent());
const doneShown = async (page: Page): Promise<number> =>
  figures((await page.locator('.search-progress .progress-count').textContent())!.split(' of ')[0]!);
const listed = (page: Page): Promise<string[]> => page.locator('.search-results tbody th').allTextContents();

interface Watched {
  longTasks: number[];
}

/** Notes every task of the window that takes longer than 50 ms, as the browser defines a long task. */
const watchTasks = (page: Page): Promise<void> =>
  page.evaluate(() => {
    const seen = globalThis as unknown as Watched;
    seen.longTasks = [];
    new PerformanceObserver((entries) => {
      for (const { duration } of entries.getEntries()) seen.longTasks.push(duration);
    }).observe({ type: 'longtask' });
  });
const longTasks = (page: Page): Promise<number[]> =>
  page.evaluate(() => (globalThis as unknown as Watched).longTasks);

test('a search of more than ten million leaves the window free, and stopping it loses nothing', async ({
  workbench: page,
}) => {
  await openSearch(page);
  await wishLarge(page);
  await page.getByRole('button', { name: 'Start the search' }).click();
  await expect.poll(async () => (await listed(page)).length).toBeGreaterThan(3);

  await watchTasks(page);
  const name = page.getByRole('textbox', { name: 'Name' });
  const main = page.getByRole('main');
  // Other programs on the machine can stretch any task: what is shown is that the window itself needs no such long one.
  let seen: number[] = [];
  for (let round = 0; round < 5; round++) {
    const before = (await longTasks(page)).length;
    await name.fill('A filter');
    await page.keyboard.type(' for the optics bench', { delay: 30 });
    await main.hover();
    for (let i = 0; i < 10; i++) {
      await page.mouse.wheel(0, i < 5 ? 240 : -240);
      await page.waitForTimeout(80);
    }
    await expect(name).toHaveValue('A filter for the optics bench');
    seen = (await longTasks(page)).slice(before);
    if (seen.length === 0) break;
  }
  expect(seen).toEqual([]);

  await page.getByRole('button', { name: 'Pause' }).click();
  await expect(page.getByText('Paused')).toBeVisible();
  await page.waitForTimeout(600);
  const [done, best] = [await doneShown(page), await listed(page)];
  await page.waitForTimeout(600);
  expect(await doneShown(page)).toBe(done);

  // Elsewhere and back: it is still there.
  await page.getByRole('link', { name: 'Candidates', exact: true }).click();
  await page.getByRole('link', { name: 'Find ligands' }).click();
  expect(await listed(page)).toEqual(best);
  await expect(name).toHaveValue(/optics bench$/);

  await page.getByRole('button', { name: 'Go on' }).click();
  await expect.poll(() => doneShown(page)).toBeGreaterThan(done);
  await page.getByRole('button', { name: 'Stop' }).click();
  await expect(page.getByText('Stopped')).toBeVisible();
  const stopped = await doneShown(page);
  const chances = await page.locator('.search-chance').allTextContents();
  await page.getByRole('button', { name: 'Go on' }).click();
  await expect.poll(() => doneShown(page)).toBeGreaterThan(stopped);
  // The best one found can only be overtaken by a better one.
  await expect
    .poll(async () => figures((await page.locator('.search-chance').allTextContents())[0] ?? ''))
    .toBeGreaterThanOrEqual(figures(chances[0] ?? ''));

  // A second one beside it.
  await page.getByRole('button', { name: 'Start another search' }).click();
  await expect(page.getByRole('list', { name: 'Searches' }).getByRole('listitem')).toHaveCount(2);
  await page.getByRole('button', { name: /^Close the search 2/ }).click();
  await expect(page.getByRole('button', { name: /^Close the search/ })).toHaveCount(0);
  expect(await doneShown(page)).toBeGreaterThan(stopped);
});

test('a search that was under way when the window closed is offered by the next one', async ({
  site,
  profileFolder,
}) => {
  const address = site.server.windowAddress();
  const first = await openProfile(profileFolder);
  const page = await first.newPage();
  await page.goto(address);
  await openSearch(page);
  await wishLarge(page);
  await page.getByRole('button', { name: 'Start the search' }).click();
  await expect.poll(async () => (await listed(page)).length).toBeGreaterThan(3);
  await page.waitForTimeout(4000);
  await first.close();

  const second = await openProfile(profileFolder);
  const again = await second.newPage();
  await again.goto(site.server.windowAddress());
  await openSearch(again);
  await expect(again.getByText(/^The search for “Wish” .* was not finished/)).toBeVisible();
  await again.getByRole('button', { name: 'Go on with it' }).click();
  await expect.poll(async () => (await listed(again)).length).toBeGreaterThan(3);
  await second.close();
});

test('a wish is typed, saved, opened as a file and searched for by keyboard alone', async ({
  workbench: page,
}) => {
  await openSearch(page);
  await page.getByRole('textbox', { name: 'Name' }).focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.type('Green window');
  await page.getByRole('button', { name: 'Save the wish' }).focus();
  await page.keyboard.press('Enter');
  await expect(page.getByText('Saved the wish “Green window”')).toBeVisible();
  const download = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Export', exact: true }).focus();
  await page.keyboard.press('Enter');
  const file = await (await download).path();
  expect(JSON.parse(await readFile(file, 'utf8'))).toMatchObject({
    name: 'Green window',
    bands: [{ from_nm: 540, to_nm: 580 }],
  });

  await page.getByRole('button', { name: 'Ligands: none' }).focus();
  await page.keyboard.press('Enter');
  await expect(page.getByText('no ligand passes every condition of the wish')).toBeVisible();
  await expect(page.getByRole('button', { name: 'Start the search' })).toBeDisabled();
  const add = page.getByRole('combobox', { name: 'Add a ligand', exact: true });
  for (const ligand of ['NCS', 'en']) {
    await add.focus();
    await page.keyboard.type(ligand);
    await page.keyboard.press('Enter');
  }
  await expect(page.getByRole('button', { name: 'Start the search' })).toBeEnabled();
  await page.getByRole('button', { name: 'Start the search' }).focus();
  await page.keyboard.press('Enter');
  await expect(page.getByText(/^All .* combinations were looked at/)).toBeVisible();
  // The first two are in the demo already.
  for (const place of [3, 4]) {
    await page.getByRole('checkbox', { name: new RegExp(`, place ${place}$`) }).focus();
    await page.keyboard.press('Space');
  }
  await page.getByRole('button', { name: 'Add to the project' }).focus();
  await page.keyboard.press('Enter');
  await expect(page.getByText(/frozen with the wish/)).toBeVisible();
  await page.getByRole('link', { name: 'Compare and order' }).focus();
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { name: 'What to have at hand' })).toBeVisible();
  await expect(page.getByRole('region', { name: 'Safety cautions: order list' })).toBeVisible();
});

test('search and comparison have no finding of axe, light and dark', async ({ workbench: page }) => {
  const examine = async (name: string): Promise<void> => {
    for (const colorScheme of ['light', 'dark'] as const) {
      await page.emulateMedia({ colorScheme });
      const { violations } = await new AxeBuilder({ page })
        .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
        .analyze();
      const found = violations.map(
        ({ id, nodes }) => `${id}: ${nodes[0]?.html.slice(0, 200)} (${nodes.length} places)`,
      );
      expect.soft(found, `${name}, ${colorScheme}`).toEqual([]);
    }
  };
  await openSearch(page);
  await page.getByRole('radio', { name: '1', exact: true }).check();
  for (const summary of await page.locator('.wish-more-parts > summary').all()) await summary.click();
  await page.getByRole('button', { name: 'Wish for a seen colour' }).click();
  await page.getByRole('textbox', { name: 'within' }).fill('60');
  await examine('the whole form');
  await page.getByRole('button', { name: 'Start the search' }).click();
  await expect(page.getByText(/^All .* combinations were looked at/)).toBeVisible();
  await page.getByRole('textbox', { name: 'A complex that you expected' }).fill('[Fe(bpy)3]2+');
  await expect(page.getByText('would meet the whole wish with a chance of')).toBeVisible();
  await examine('results');
  await page.getByRole('radio', { name: 'Chance against cost' }).check();
  await examine('chance against cost');
  await page.getByRole('radio', { name: 'List', exact: true }).check();
  for (const place of [1, 2, 3]) {
    await page.getByRole('checkbox', { name: new RegExp(`, place ${place}$`) }).check();
  }
  await page.getByRole('link', { name: 'Compare and order' }).click();
  await expect(page.getByRole('heading', { name: 'What to have at hand' })).toBeVisible();
  await examine('comparison');
});
