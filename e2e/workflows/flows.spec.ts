/**
 * The main jobs of the people the program is for, each in at most three steps from the start screen, done with the
 * mouse alone and with the keyboard alone. `renderer/WALKTHROUGHS.md` tells them in words.
 */
import { execFileSync } from 'node:child_process';
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { test } from '../workbench';
import { type Hands, keyboard, mouse } from './hands';
import { arrived, expect } from './steps';

test.setTimeout(120_000);

async function accessible(page: Page, state: string): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
    .analyze();
  expect
    .soft(
      violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html.slice(0, 200)}`),
      state,
    )
    .toEqual([]);
}

const search = async (page: Page, hands: Hands): Promise<void> => {
  await hands.press(page.getByRole('button', { name: /^Start (the|another) search/ }));
  await expect(page.getByRole('heading', { name: 'Best', exact: true })).toBeVisible();
  await expect(page.locator('.search-results, .search-table').locator('tbody th').first()).toBeVisible();
};

const flows: readonly (readonly [name: string, (page: Page, hands: Hands) => Promise<void>])[] = [
  [
    'plan a series',
    async (page, hands) => {
      await hands.openDemo();
      await expect(page.locator('.cell-waiting')).toHaveCount(0);
      for (const formula of ['[Cr(H2O)6]3+', '[Cr(NH3)6]3+']) await selectRow(page, hands, formula);
      await hands.press(page.getByRole('link', { name: 'Compare', exact: true }));
      await expect(page.getByRole('region', { name: 'Side by side' })).toBeVisible();
      await expect(page.getByRole('heading', { name: 'What to have at hand' })).toBeVisible();
    },
  ],
  [
    'find ligands for an absorption window',
    async (page, hands) => {
      await hands.openDemo();
      await hands.view('Find ligands', 'g f');
      const window = page.getByRole('group', { name: 'Absorbs between' });
      await hands.type(window.getByRole('textbox', { name: 'from' }), '540');
      await hands.type(window.getByRole('textbox', { name: 'to', exact: true }), '580');
      await search(page, hands);
    },
  ],
  [
    'place a complex near spin crossover',
    async (page, hands) => {
      await hands.openDemo();
      await hands.view('New candidate', 'g n');
      await hands.type(page.getByLabel('Formula or name'), '[Mn(ox)3]3-');
      const estimate = page.getByRole('region', { name: 'Estimate' });
      // Near crossover no state is called certain.
      await expect(estimate.getByText(/cannot say/).first()).toBeVisible();
      await expect(estimate.getByText(/near the spin crossover/i).first()).toBeVisible();
    },
  ],
  [
    'pick a spin-flip emitter',
    async (page, hands) => {
      await hands.openDemo();
      await hands.view('Find ligands', 'g f');
      await hands.press(page.getByText('Unpaired electrons, moment, emission'));
      const window = page.getByRole('group', { name: 'Spin-flip emission between' });
      await hands.type(window.getByRole('textbox', { name: 'from' }), '660');
      await hands.type(window.getByRole('textbox', { name: 'to', exact: true }), '760');
      await search(page, hands);
      await expect(page.getByText('how bright it is cannot be said', { exact: false })).toBeVisible();
    },
  ],
  [
    'record a measured spectrum',
    async (page, hands) => {
      await hands.openDemo();
      await hands.sheet('[Cr(H2O)6]3+', 'Cr H 2 O 6 charge 3 plus');
      await hands.press(page.getByRole('link', { name: 'Record…' }));
      await hands.press(page.getByRole('button', { name: 'Add measurement…' }));
      const position = page.getByLabel('Position of band 1 in nm');
      await hands.type(position, '575');
      if (hands.name === 'mouse') await accessible(page, 'measurement dialog');
      await hands.press(page.getByRole('button', { name: 'Save the measurement' }));
      await expect(page.getByText('Prediction frozen, then measurement saved')).toBeVisible();
      await expect(page.getByRole('heading', { name: 'Measured beside predicted' })).toBeVisible();
    },
  ],
  [
    'hand over a page',
    async (page, hands) => {
      await hands.openDemo();
      await hands.view('Reports', 'g h');
      await expect(page.getByRole('article', { name: 'Candidate card' })).toBeVisible();
      await hands.pick(page.getByRole('radio', { name: 'Comparison sheet' }));
      await expect(page.getByRole('article', { name: 'Comparison sheet' })).toBeVisible();
      const waiting = page.waitForEvent('download');
      await hands.press(page.getByRole('button', { name: 'Save as HTML' }));
      const html = await readFile(await (await waiting).path(), 'utf8');
      expect(html).toContain('Before anything is made');
      expect(html).toMatch(/hash [0-9a-f]{64}/);
      expect(html).not.toMatch(/(src|href)="https?:/);
    },
  ],
];

async function selectRow(page: Page, hands: Hands, formula: string): Promise<void> {
  if (hands.name === 'mouse') {
    await page.getByRole('checkbox', { name: `Select ${formula}`, exact: true }).check();
    return;
  }
  const row = page.locator('.grid-row', {
    has: page.getByRole('checkbox', { name: `Select ${formula}`, exact: true }),
  });
  await page.locator('.grid-row[tabindex="0"]').focus();
  for (let steps = 0; steps < 60; steps++) {
    if (await row.evaluate((element) => element === document.activeElement)) break;
    await page.keyboard.press('ArrowDown');
  }
  await page.keyboard.press('Space');
}

for (const hand of [mouse, keyboard]) {
  for (const [name, flow] of flows) {
    test(`${name}, by ${hand.name}`, async ({ workbench: page }) => {
      await arrived(page);
      await flow(page, hand(page));
      // The states are the same whatever the hand.
      if (hand === mouse) await accessible(page, name);
    });
  }

  test(`see how good the predictions have been, by ${hand.name}`, async ({ workbench: page }) => {
    const script = join(import.meta.dirname, 'writeMeasuredProject.ts');
    const bundle = execFileSync(process.execPath, ['--import', 'tsx', script, `Measured by ${hand.name}`], {
      encoding: 'utf8',
      maxBuffer: 1e8,
    });
    const hands = hand(page);
    await arrived(page);
    const choosing = page.waitForEvent('filechooser');
    await hands.press(page.getByRole('button', { name: 'Import a project…' }).first());
    const buffer = Buffer.from(bundle);
    const file = { name: 'series.spinhue.json', mimeType: 'application/json', buffer };
    await (await choosing).setFiles(file);
    await hands.press(page.getByRole('button', { name: 'Import', exact: true }));
    await expect(page.getByText('9 candidates', { exact: true })).toBeVisible();
    await hands.view('Agreement', 'g a');
    await expect(page.locator('.agreement-figures').first()).toContainText('Pairs counted');
    if (hand === mouse) await accessible(page, 'agreement');
    await hands.view('Reports', 'g h');
    await hands.pick(page.getByRole('radio', { name: 'Agreement report' }));
    const report = page.getByRole('article', { name: 'Agreement report' });
    await expect(report.getByText('Pairs counted')).toBeVisible();
    await hands.pick(page.getByRole('radio', { name: 'Record page' }));
    if (hand === mouse) await accessible(page, 'record page');
  });
}
