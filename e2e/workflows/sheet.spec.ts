/** A sheet looked at under other strengths, lamps and solvents. */
import { test } from '../workbench';
import { arrived, expect } from './steps';

test('colour and spectrum of a sheet follow strength, lamp and solvent; a kept strength can be undone', async ({
  workbench: page,
}) => {
  await arrived(page);
  await page.getByRole('link', { name: /^Open Demo/ }).click();
  await page.getByRole('link', { name: 'Cr H 2 O 6 charge 3 plus' }).click();
  const colour = page.getByRole('region', { name: 'Seen colour' });
  await expect(colour.getByText('1 × · 20 mM')).toBeVisible();

  // By keyboard: eight of twenty steps to a decade, 20 mM times 10^0.4.
  const slider = page.getByRole('slider', { name: /^Concentration/ });
  await slider.focus();
  for (let step = 0; step < 8; step++) await page.keyboard.press('ArrowRight');
  await expect(colour.getByText('1 × · 50 mM')).toBeVisible();
  await page.getByText('absorbance at 50 mM, 2 cm').click();
  await expect(page.getByText('Absorbance', { exact: true }).first()).toBeVisible();

  await page.getByRole('combobox', { name: 'Light' }).selectOption('A');
  await expect(colour.getByText(/2 cm path, A, CIE 1931/)).toBeVisible();
  await page.getByRole('combobox', { name: 'Solvent' }).selectOption('pyridine');
  await expect(page.getByText('hidden: pyridine absorbs below 330 nm').first()).toBeVisible();

  // The long-wave quartet band of the hexaaqua ion lies near 575 nm (C. E. Housecroft, A. G. Sharpe).
  const chance = page.getByRole('group', { name: 'Chance of a band between' });
  await chance.getByRole('textbox', { name: 'From' }).fill('500');
  await chance.getByRole('textbox', { name: 'to' }).fill('650');
  await expect(chance.getByText(/^(9\d|100)\s% of 200 draws$/)).toBeVisible();
  await chance.getByRole('textbox', { name: 'From' }).fill('900');
  await chance.getByRole('textbox', { name: 'to' }).fill('950');
  await expect(chance.getByText(/^0\s% of 200 draws$/)).toBeVisible();

  await page.getByText('powder', { exact: true }).click();
  await expect(colour.getByText(/second-class estimate/)).toBeVisible();
  await page.getByRole('button', { name: 'As it was' }).click();
  await expect(colour.getByText('1 × · 20 mM')).toBeVisible();

  await slider.focus();
  await page.keyboard.press('End');
  await page.getByRole('button', { name: 'Keep this strength' }).click();
  await expect(page.getByRole('button', { name: 'Keep this strength' })).toBeHidden();
  await page.reload();
  await expect(colour.getByText(/1 × · 1.000 mM/)).toBeVisible();
  await page.keyboard.press('Control+z');
  await expect(colour.getByText('1 × · 20 mM')).toBeVisible();
});
