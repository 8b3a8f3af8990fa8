/** Complexes by formula, one by one and as a pasted list. */
import AxeBuilder from '@axe-core/playwright';
import { test } from '../workbench';
import { arrived, createProject, expect } from './steps';

test('a formula is read as one types, a slip is shown with its place and mended by a suggestion', async ({
  workbench: page,
}) => {
  await arrived(page);
  await createProject(page, 'By formula');
  await page.getByRole('link', { name: 'New candidate' }).click();
  const field = page.getByLabel('Formula or name');
  await field.fill('trans-[Co(enn)2Cl2]+');
  await expect(page.getByText(/“enn” is not a ligand of the library, at character 11/)).toBeVisible();
  await page.getByRole('button', { name: 'en', exact: true }).click();
  await expect(field).toHaveValue('trans-[Co(en)2Cl2]+');
  await expect(page.getByText('All 6 places are filled.')).toBeVisible();
  await expect(page.getByRole('radio', { name: /^III d/ })).toBeChecked();
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect.soft(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html.slice(0, 200)}`)).toEqual([]);
  await page.keyboard.press('Control+Enter');
  await expect(page.getByText('trans, octahedral')).toBeVisible();
});

test('a pasted list is looked at first, added as one step, and a copied table pasted back changes nothing', async ({
  workbench: page,
}) => {
  await arrived(page);
  await createProject(page, 'Pasted');
  await page.getByRole('button', { name: 'Paste…' }).first().click();
  await page
    .getByLabel('One complex a line')
    .fill('[Fe(bpy)3]2+\tred\nhexaamminecobalt(III) chloride\n[Cr(NH3)6]3+\n[Xy(NH3)6]');
  await expect(page.getByText('3 candidates new, 0 changed, 0 as they are, 1 not understood.')).toBeVisible();
  await page.getByRole('button', { name: 'Add 3 candidates' }).click();
  await expect(page.getByText('3 candidates', { exact: true })).toBeVisible();
  await page.evaluate(() => {
    const seen = globalThis as unknown as { copied: string };
    Object.defineProperty(navigator, 'clipboard', {
      value: { writeText: async (text: string) => void (seen.copied = text) },
    });
  });
  await page.locator('.grid-row[tabindex="0"]').focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.press('Control+c');
  await expect(page.getByText('3 candidates copied as a table')).toBeVisible();
  const table = await page.evaluate(() => (globalThis as unknown as { copied: string }).copied);
  await page.keyboard.press('v');
  await page.getByLabel('One complex a line').fill(table);
  await expect(page.getByText('0 candidates new, 0 changed, 3 as they are.')).toBeVisible();
  await page.keyboard.press('Escape');
  await page.keyboard.press('Control+z');
  await expect(page.getByRole('heading', { name: 'No candidates yet' })).toBeVisible();
});
