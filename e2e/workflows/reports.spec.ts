/** Pages to hand over: one sheet of paper each, on A4 and Letter, with cautions, parameters and version on it. */
import { test } from '../workbench';
import { arrived, expect } from './steps';

/** Size of the first page in points as the file says it: A4 is 595 × 842, Letter 612 × 792 (ISO 216, ANSI Y14.1). */
const sizes = { A4: [595, 842], Letter: [612, 792] } as const;

test('each page is one sheet, whatever the paper, and leaves nothing out that belongs on it', async ({
  workbench: page,
}) => {
  test.setTimeout(90_000);
  await arrived(page);
  await page.getByRole('link', { name: /^Open Demo/ }).click();
  await page.getByRole('link', { name: 'Reports', exact: true }).click();
  for (const [paper, [width, height]] of Object.entries(sizes)) {
    await page.getByRole('radio', { name: paper, exact: true }).check();
    for (const kind of ['Candidate card', 'Comparison sheet', 'Order list']) {
      await page.getByRole('radio', { name: kind, exact: true }).check();
      const sheet = page.getByRole('article', { name: kind });
      await expect(sheet.getByText('General caution only.', { exact: false })).toBeVisible();
      await expect(sheet.getByText(/hash [0-9a-f]{64}; model version/)).toBeVisible();
      await expect(sheet.getByText(/Spinhue \d+\.\d+/)).toBeVisible();
      const pdf = (await page.pdf({ preferCSSPageSize: true })).toString('latin1');
      expect(pdf.match(/\/Type\s*\/Page\b(?!s)/g), `${kind} on ${paper}`).toHaveLength(1);
      const box = /\/MediaBox\s*\[([^\]]*)\]/.exec(pdf)![1]!.trim().split(/\s+/).map(Number);
      expect(Math.abs(box[2]! - width!)).toBeLessThan(1);
      expect(Math.abs(box[3]! - height!)).toBeLessThan(1);
    }
  }
});
