/** How good the predictions have been, parameters that learn from the record, and the way back. */
import { execFileSync } from 'node:child_process';
import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { test } from '../workbench';
import { arrived, expect } from './steps';

/** The project of that name as a bundle. */
function measuredProject(name: string): string {
  const script = join(import.meta.dirname, 'writeMeasuredProject.ts');
  const words = ['--import', 'tsx', script, name];
  return execFileSync(process.execPath, words, { encoding: 'utf8', maxBuffer: 1e8 });
}

const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

async function accessible(page: Page, state: string): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).withTags(tags).analyze();
  expect
    .soft(
      violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html.slice(0, 200)}`),
      state,
    )
    .toEqual([]);
}

async function imported(page: Page, text: string): Promise<void> {
  const choosing = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Import a project…' }).first().click();
  const buffer = Buffer.from(text);
  await (await choosing).setFiles({ name: 'series.spinhue.json', mimeType: 'application/json', buffer });
  await page.getByRole('button', { name: 'Import', exact: true }).click();
  await expect(page.getByText('9 candidates', { exact: true })).toBeVisible();
}

async function downloaded(page: Page, button: string): Promise<string> {
  const waiting = page.waitForEvent('download');
  await page.getByRole('button', { name: button, exact: true }).click();
  return readFile(await (await waiting).path(), 'utf8');
}

async function exported(page: Page, name: string): Promise<string> {
  await page.getByRole('link', { name: 'Projects', exact: true }).click();
  return downloaded(page, `Export ${name}`);
}

async function toAgreement(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Agreement', exact: true }).click();
  await expect(page.getByRole('heading', { level: 2, name: 'All pairs' })).toBeVisible();
}

/** What the candidate table says of a complex. */
async function rowOf(page: Page, formula: string): Promise<string> {
  await page.getByRole('link', { name: 'Candidates', exact: true }).click();
  const row = page.locator('.grid-row', { has: page.getByRole('checkbox', { name: `Select ${formula}` }) });
  // Estimating is over once a band stands in the row.
  await expect(row).toContainText(/\d\d[\s\u202f]?\d00/);
  return (await row.innerText()).replaceAll('\u202f', '');
}

/** Figures and pairs of the agreement as they can be read. */
const figures = async (page: Page): Promise<string[]> => [
  await page.locator('.agreement-figures').innerText(),
  await page.locator('.pair-table').innerText(),
];

type Content = Record<string, unknown>;
const contentOf = (text: string): Content => (JSON.parse(text) as { content: Content }).content;
/** All that an export holds but the log, in which an import leaves its own lines. */
const withoutLog = (text: string): Content => ({ ...contentOf(text), log: [] });

test('approved parameters change the estimates of a complex and its relatives, never what was frozen; undo takes them back', async ({
  workbench: page,
  site,
}) => {
  test.setTimeout(120_000);
  const name = 'Imidazole series';
  const bundle = measuredProject(name);
  await arrived(page);
  await imported(page, bundle);
  const [own, relative] = ['[Cr(im)6]3+', '[Co(im)6]2+'];
  const before = [await rowOf(page, own), await rowOf(page, relative)];
  await page.keyboard.press('g');
  await page.keyboard.press('a');
  await expect(page.getByRole('heading', { level: 2, name: 'All pairs' })).toBeVisible();
  const stood = await figures(page);
  expect(stood[0]).toMatch(/Pairs counted\s+14/);
  await accessible(page, 'agreement');

  // By keyboard alone.
  await page.getByRole('button', { name: 'Propose new parameters' }).focus();
  await page.keyboard.press('Enter');
  const form = page.getByRole('form', { name: 'Proposed parameters' });
  await expect(form.getByRole('status')).toContainText(
    /10Dq over 6 complexes 8\.\d+ % before, 0\.\d+ % after/,
  );
  await accessible(page, 'proposal');
  const strength = form.getByRole('row', { name: /field factor f of imidazole/ });
  await expect(strength).toContainText(/1\.230 ± 0\.066.*1\.3\d+/);
  await form.getByRole('checkbox', { name: 'Take nephelauxetic factor h of water' }).focus();
  await page.keyboard.press('Space');
  await form.getByLabel('Name of the parameter set').focus();
  await page.keyboard.type('After the series');
  await page.keyboard.press('Enter');
  await expect(form.getByLabel('Approved by')).toBeFocused();
  await page.keyboard.type('MK');
  await page.keyboard.press('Tab');
  await page.keyboard.type('six complexes agree');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('radio', { name: /^After the series/ })).toBeChecked();
  await expect(page.getByText('evidence counts once')).toBeVisible();
  await accessible(page, 'parameters in use');
  expect(await figures(page)).toEqual(stood);

  const after = [await rowOf(page, own), await rowOf(page, relative)];
  expect(before[0]).toContain('21400');
  expect(after[0]).toContain('23900');
  expect(after[1]).not.toBe(before[1]);
  const approved = await exported(page, name);
  expect(contentOf(approved).frozenPredictions).toEqual(contentOf(bundle).frozenPredictions);
  const snapshots = await readdir(site.copies, { recursive: true });
  expect(snapshots.filter((path) => path.includes('before-recalibration'))).not.toEqual([]);

  await page.getByRole('link', { name: `Open ${name}` }).click();
  await page.keyboard.press('Control+z');
  await expect.poll(async () => rowOf(page, own)).toBe(before[0]);
  expect(await rowOf(page, relative)).toBe(before[1]);
  await page.keyboard.press('Control+Shift+z');
  await expect.poll(async () => rowOf(page, own)).toBe(after[0]);
  await toAgreement(page);
  await page.getByRole('radio', { name: 'the library as it is' }).click();
  await expect.poll(async () => rowOf(page, relative)).toBe(before[1]);
});

test('what is exported, deleted for good and imported again agrees to the last digit', async ({
  workbench: page,
}) => {
  test.setTimeout(120_000);
  const name = 'Series to and fro';
  const bundle = measuredProject(name);
  await arrived(page);
  await imported(page, bundle);
  await toAgreement(page);
  const stood = await figures(page);
  const csv = await downloaded(page, 'Pairs as CSV');
  expect(csv.split('\r\n')).toHaveLength(16);
  const pairs = JSON.parse(await downloaded(page, 'Pairs as JSON')) as { residual: number }[];
  expect(pairs).toHaveLength(14);
  expect(csv).toContain(String(pairs[0]!.residual));
  expect(await downloaded(page, 'Bands as text')).toContain('[Cr(im)6]3+');

  const first = await exported(page, name);
  await page.getByRole('button', { name: `Delete ${name}` }).click();
  await page.getByRole('link', { name: 'Bin', exact: true }).click();
  await page.getByRole('button', { name: 'Empty the bin…' }).click();
  await page.getByRole('button', { name: 'Delete for good' }).click();
  await expect(page.getByRole('heading', { name: 'The bin is empty' })).toBeVisible();
  await page.getByRole('link', { name: 'Projects', exact: true }).click();
  await imported(page, first);
  await toAgreement(page);
  expect(await figures(page)).toEqual(stood);
  expect(withoutLog(await exported(page, name))).toEqual(withoutLog(first));
});

test('a deleted measurement is listed in the bin and comes back', async ({ workbench: page }) => {
  const name = 'Series with a slip';
  const bundle = measuredProject(name);
  await arrived(page);
  await imported(page, bundle);
  await page.getByRole('link', { name: 'Lab record', exact: true }).click();
  const candidates = page.getByLabel('Candidate');
  await expect(candidates.locator('option')).toHaveCount(10);
  const names = await candidates.locator('option').allTextContents();
  await candidates.selectOption({ index: names.findIndex((each) => each.includes('[Cr(im)6]3+')) });
  await page.getByRole('button', { name: 'Delete', exact: true }).click();
  await expect(page.getByText('Measurement deleted')).toBeVisible();
  await page.getByRole('link', { name: 'Bin', exact: true }).click();
  await expect(page.getByRole('button', { name: /^Bring back/ })).toBeVisible();
  await accessible(page, 'bin');
  await page.getByRole('button', { name: /^Bring back \[Cr\(im\)6\]3\+ Bands/ }).click();
  await expect(page.getByRole('heading', { name: 'The bin is empty' })).toBeVisible();
  await page.getByRole('link', { name: name }).first().click();
  await toAgreement(page);
  await expect(page.locator('.agreement-figures')).toContainText('14');
});
