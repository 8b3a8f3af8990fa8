/** A measured spectrum from the file to parameters that have learnt from it, and back again. */
import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { readFile } from 'node:fs/promises';
import { test } from '../workbench';
import { arrived, expect } from './steps';

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

/**
 * Absorbance of 50 mM hexaaquachromium(III) in 1 cm: two Gaussians at the maxima that textbooks print, 17 400 and
 * 24 600 cm-1 (C. E. Housecroft, A. G. Sharpe, Inorganic Chemistry), with a ripple in place of noise.
 */
const spectrum = (): string => {
  const lines = ['Wavelength (nm),Absorbance'];
  for (let nm = 330; nm <= 800; nm++) {
    const at = 1e7 / nm;
    const band = (centre: number, width: number, height: number) =>
      height * Math.exp(-4 * Math.LN2 * ((at - centre) / width) ** 2);
    const ripple = 0.004 * (((nm * 7919) % 101) / 101 - 0.5);
    lines.push(`${nm},${(band(17_400, 3600, 0.67) + band(24_600, 4000, 0.77) + ripple).toFixed(5)}`);
  }
  return lines.join('\n');
};

/** Drops a file of that content on the open record. */
async function drop(page: Page, name: string, text: string): Promise<void> {
  const data = await page.evaluateHandle(
    ([fileName, content]) => {
      const transfer = new DataTransfer();
      transfer.items.add(new File([content!], fileName!, { type: 'text/csv' }));
      return transfer;
    },
    [name, text],
  );
  const area = page.locator('.drop-area');
  await area.dispatchEvent('dragover', { dataTransfer: data });
  await area.dispatchEvent('drop', { dataTransfer: data });
}

/** Rows of a table as they are stored. */
const stored = (page: Page, table: string): Promise<Record<string, unknown>[]> =>
  page.evaluate(async (name) => {
    const db = await new Promise<IDBDatabase>((resolve) => {
      const request = indexedDB.open('spinhue');
      request.onsuccess = () => resolve(request.result);
    });
    const rows = await new Promise<Record<string, unknown>[]>((resolve) => {
      const request = db.transaction(name).objectStore(name).getAll();
      request.onsuccess = () => resolve(request.result as Record<string, unknown>[]);
    });
    db.close();
    return rows;
  }, table);

test('a dropped spectrum is kept, treated, fitted, assigned; its field is fitted and the parameters learn', async ({
  workbench: page,
}) => {
  test.setTimeout(180_000);
  await arrived(page);
  await page.getByRole('link', { name: /^Open Demo/ }).click();
  await page.getByText('41 candidates').waitFor();
  await page.keyboard.press('g');
  await page.keyboard.press('r');
  await expect(page.getByRole('heading', { name: 'Nothing measured yet' })).toBeVisible();
  await accessible(page, 'empty record');
  const candidates = page.getByLabel('Candidate');
  const names = await candidates.locator('option').allTextContents();
  await candidates.selectOption({ index: names.findIndex((name) => name.includes('[Cr(H2O)6]3+')) });
  await expect(page.getByRole('button', { name: 'Add measurement…' })).toBeEnabled();

  await drop(page, 'aqua.csv', spectrum());
  const dialog = page.getByRole('dialog', { name: 'Import a spectrum' });
  await expect(dialog.getByText(/471 points, nm, absorbance/)).toBeVisible();
  await expect(dialog.getByText(/No prediction is frozen yet/)).toBeVisible();
  await accessible(page, 'import preview');
  await dialog.getByLabel('Concentration', { exact: true }).fill('50');
  await dialog.getByLabel('Path length', { exact: true }).fill('1');
  await dialog.getByLabel('Initials').fill('MK');
  await dialog.getByRole('button', { name: 'Keep the spectrum' }).click();
  await expect(page.getByText('Prediction frozen, then spectrum kept')).toBeVisible();

  await drop(page, 'again.csv', spectrum());
  await expect(page.getByText(/This file is in the record already/)).toBeVisible();
  await page.keyboard.press('Escape');
  await drop(page, 'bare.txt', '400 0.1\n410 0.2\n420 0.3\n430 0.2\n440 0.1');
  await page.getByRole('button', { name: 'Keep the spectrum' }).click();
  await expect(page.getByText(/The file does not say what/).first()).toBeVisible();
  await page.keyboard.press('Escape');
  await drop(page, 'broken.jdx', '##TITLE=x\n##JCAMP-DX=4.24\n##DATA TYPE=UV-VIS SPECTRUM\n');
  await expect(page.getByText('This file is refused')).toBeVisible();
  await page.keyboard.press('Escape');

  await page.getByRole('link', { name: 'Treat and fit…' }).click();
  await page.getByRole('button', { name: 'Add a step…' }).click();
  await page.getByLabel('Step', { exact: true }).selectOption('to molar absorptivity');
  await page.getByRole('button', { name: 'Add the step' }).click();
  await expect(page.getByRole('listitem').filter({ hasText: 'divided by 50 mM and 1 cm' })).toBeVisible();
  // By keyboard: the curve is read with the arrows, Enter starts a band at the point being read.
  await page.getByRole('application', { name: /^Spectrum and fitted bands/ }).focus();
  await page.keyboard.press('End');
  for (let step = 0; step < 30; step++) await page.keyboard.press('ArrowLeft');
  await page.keyboard.press('Enter');
  await expect(page.getByLabel('Centre / cm⁻¹, band 1')).toHaveValue(/^\d{5}$/);
  await page.getByRole('button', { name: 'Suggest from the curve' }).click();
  await page.getByRole('button', { name: 'Compare one to five bands' }).click();
  await expect(page.getByText('(fewest that will do)')).toBeVisible();
  await page.getByRole('row', { name: /^2/ }).getByRole('button', { name: 'Start from these' }).click();
  await page.getByRole('button', { name: 'Fit', exact: true }).click();
  await expect(page.getByText(/Fitted bands ± standard error; 471 points, status converged/)).toBeVisible();
  await expect(page.getByText('Correlation of the parameters')).toBeVisible();
  await page.getByRole('button', { name: 'Keep this assignment' }).click();
  await page.getByRole('button', { name: 'Fit the field to 2 bands' }).click();
  await expect(page.getByText(/Fitted beside frozen prediction/)).toBeVisible();
  await accessible(page, 'analysis');

  // 10Dq is the first quartet band; B of the hexaaqua ion is 725 cm-1 in textbooks (17 400 and 24 600).
  const [analysis] = (await stored(page, 'analyses')) as [
    { fieldFit: { tenDq: { value: number }; B: { value: number } } },
  ];
  expect(Math.abs(analysis.fieldFit.tenDq.value - 17_400)).toBeLessThan(20);
  expect(Math.abs(analysis.fieldFit.B.value - 725)).toBeLessThan(15);

  await page.keyboard.press('Control+z');
  await expect(page.getByText(/Fitted beside frozen prediction/)).toBeHidden();
  await page.keyboard.press('Control+z');
  await expect(page.getByRole('button', { name: 'Keep this assignment' })).toBeVisible();
  await page.keyboard.press('Control+z');
  await expect(page.getByText(/Fitted bands ± standard error/)).toBeHidden();
  for (let step = 0; step < 3; step++) await page.keyboard.press('Control+Shift+z');
  await expect(page.getByText(/Fitted beside frozen prediction/)).toBeVisible();

  // A fit of other numbers must not stand beside these.
  await page.getByRole('button', { name: 'Take back divided by 50 mM and 1 cm' }).click();
  await expect(page.getByText(/The band fit was made of other numbers/)).toBeVisible();
  await expect(page.getByText(/Fitted bands ± standard error/)).toBeHidden();
  await page.keyboard.press('Control+z');
  await expect(page.getByText(/Fitted beside frozen prediction/)).toBeVisible();

  await page.keyboard.press('g');
  await page.keyboard.press('a');
  await page.getByRole('button', { name: 'Propose new parameters' }).click();
  await page.getByLabel('Name of the parameter set').fill('First lot');
  await page.getByLabel('Approved by').fill('MK');
  await page.getByLabel('Reason').fill('own spectrum');
  await accessible(page, 'agreement with a proposal');
  const frozenBefore = await stored(page, 'frozenPredictions');
  await page.getByRole('button', { name: 'Approve and use' }).click();
  await expect(page.getByRole('radio', { name: /First lot/ })).toBeChecked();
  expect(await stored(page, 'frozenPredictions')).toEqual(frozenBefore);
  await page.getByRole('link', { name: 'Candidates', exact: true }).click();
  await page.getByRole('link', { name: 'Cr H 2 O 6 charge 3 plus' }).click();
  await expect(page.getByText(/^Made with First lot/)).toBeVisible();
  await expect(page.getByText('measured on this very complex').first()).toBeVisible();

  await page.keyboard.press('Control+z');
  await expect(page.getByText(/^Made with library/)).toBeVisible();
  await page.keyboard.press('Control+Shift+z');
  await expect(page.getByText(/^Made with First lot/)).toBeVisible();

  // Out, away, and in again: the same rows, and the raw file byte for byte.
  const tables = ['measurements', 'analyses', 'curves', 'files', 'frozenPredictions', 'parameterSets'];
  const before = await Promise.all(tables.map((table) => stored(page, table)));
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.keyboard.press('Control+Shift+e'),
  ]);
  const bundle = await readFile(await download.path());
  await page.getByRole('link', { name: 'Projects', exact: true }).click();
  await arrived(page);
  await page.evaluate(async (names) => {
    const db = await new Promise<IDBDatabase>((resolve) => {
      const request = indexedDB.open('spinhue');
      request.onsuccess = () => resolve(request.result);
    });
    const all = [...names, 'projects', 'candidates', 'samples', 'changes', 'edits', 'log'];
    const writing = db.transaction(all, 'readwrite');
    for (const name of all) writing.objectStore(name).clear();
    await new Promise((resolve) => (writing.oncomplete = resolve));
    db.close();
  }, tables);
  const [chooser] = await Promise.all([page.waitForEvent('filechooser'), page.keyboard.press('Control+o')]);
  await chooser.setFiles({ name: 'demo.spinhue', mimeType: 'application/json', buffer: bundle });
  await page
    .getByRole('dialog')
    .getByRole('button', { name: /^Import/ })
    .click();
  await expect(page.getByText('41 candidates')).toBeVisible();
  const after = await Promise.all(tables.map((table) => stored(page, table)));
  expect(after).toEqual(before);
  const raw = (after[3]![0] as { base64: string }).base64;
  expect(Buffer.from(raw, 'base64').toString('utf8')).toBe(spectrum());
});

test('a moment from what was read off, its correction, its batch and what is attached', async ({
  workbench: page,
}) => {
  await arrived(page);
  await page.getByRole('link', { name: /^Open Demo/ }).click();
  await page.getByText('41 candidates').waitFor();
  await page.keyboard.press('g');
  await page.keyboard.press('r');
  const candidates = page.getByLabel('Candidate');
  await expect(candidates.locator('option')).toHaveCount(42);
  const names = await candidates.locator('option').allTextContents();
  await candidates.selectOption({ index: names.findIndex((name) => name.includes('[Ni(NH3)6]2+')) });
  const add = page.getByRole('button', { name: 'Add measurement…' });
  await expect(add).toBeEnabled();
  await add.focus();
  await page.keyboard.press('Enter');
  const dialog = page.getByRole('dialog');
  await dialog.getByRole('radio', { name: 'Bands' }).focus();
  await page.keyboard.press('ArrowRight');
  await expect(dialog.getByRole('radio', { name: 'Moment', exact: true })).toBeChecked();
  await dialog.getByRole('button', { name: 'Save the measurement' }).click();
  await expect(dialog.getByText('The moment is missing.')).toBeVisible();

  // chi = 3 df / (4 pi f c), D. F. Evans, J. Chem. Soc. 1959, 2003, by hand: 150 Hz at 400 MHz and 10 mM, 4.62.
  await dialog.getByLabel('Shift', { exact: true }).fill('150');
  await dialog.getByLabel('Spectrometer frequency').fill('400');
  await dialog.getByLabel('Correction for diamagnetism').selectOption('none');
  await expect(dialog.getByText(/Not worked out yet: A moment needs the temperature/)).toBeVisible();
  await dialog.getByLabel('Temperature', { exact: true }).fill('298.15');
  await dialog.getByLabel('Concentration', { exact: true }).fill('10');
  await expect(dialog.getByText(/Effective moment 4\.62/)).toBeVisible();
  await dialog.getByLabel('Batch').fill('MK-17');
  const attachment = Buffer.from([0, 1, 2, 250, 255, 13, 10]);
  await dialog
    .getByLabel('Attach files')
    .setInputFiles({ name: 'fid.bin', mimeType: 'application/octet-stream', buffer: attachment });
  await expect(dialog.getByText('fid.bin')).toBeVisible();
  await accessible(page, 'form of a moment');
  await dialog.getByRole('button', { name: 'Save the measurement' }).click();
  await expect(page.getByText('Moment 4.62 μB (Evans)')).toBeVisible();

  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save attachment fid.bin' }).click(),
  ]);
  expect(await readFile(await download.path())).toEqual(attachment);

  await page.getByRole('button', { name: 'Edit… batch MK-17' }).click();
  await dialog.getByLabel('Counter-ion').fill('Cl');
  // [Ni(NH3)6]Cl2 weighs 231.78 g/mol, as on the bottle (CAS 10534-88-0).
  await expect(dialog.getByText(/^empty: 231\.78/)).toBeVisible();
  await accessible(page, 'form of a batch');
  await dialog.getByRole('button', { name: 'Save the batch' }).click();
  await expect(page.getByText(/231\.78 g\/mol \(computed\)/)).toBeVisible();

  await page.getByRole('button', { name: 'Correct…' }).click();
  await dialog.getByLabel('Correction for diamagnetism').selectOption('a value of your own');
  await dialog.getByLabel('Diamagnetic susceptibility').fill('-250');
  await dialog.getByRole('button', { name: 'Save as a new revision' }).click();
  await expect(dialog.getByText('A correction needs its reason.')).toBeVisible();
  await expect(dialog.getByText('A correction is signed.')).toBeVisible();
  await dialog.getByLabel('Why it is corrected').fill('diamagnetism was left out');
  await dialog.getByLabel('Your initials').fill('AB');
  await dialog.getByRole('button', { name: 'Save as a new revision' }).click();
  await expect(page.getByText('Moment 4.68 μB (Evans)').first()).toBeVisible();
  await page.getByText('Corrected once').click();
  await expect(page.getByText(/AB: Moment 4\.68 μB \(Evans\) \(diamagnetism was left out\)/)).toBeVisible();
  await accessible(page, 'record of a candidate');
  const rows = (await stored(page, 'measurements')) as {
    revisions: { by: string; why: string; content: { kind: string } }[];
  }[];
  const moment = rows.find(({ revisions }) => revisions[0]!.content.kind === 'moment')!;
  expect(moment.revisions.map(({ by, why }) => [by, why])).toEqual([
    ['', ''],
    ['AB', 'diamagnetism was left out'],
  ]);

  await page.keyboard.press('Control+z');
  await expect(page.getByText('Moment 4.62 μB (Evans)')).toBeVisible();
  await page.keyboard.press('Control+z');
  await expect(page.getByText(/231\.78 g\/mol/)).toBeHidden();
  await page.keyboard.press('Control+z');
  await expect(page.getByText('Nothing measured yet.')).toBeVisible();
});
