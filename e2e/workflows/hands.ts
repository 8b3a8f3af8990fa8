import type { Locator, Page } from '@playwright/test';
import { expect } from './steps';

/** The same act by pointer or by keys, so that a flow is written once and done in both ways. */
export interface Hands {
  readonly name: 'mouse' | 'keyboard';
  /** Presses a button, a link or a box. */
  press(target: Locator): Promise<void>;
  /** Picks one of a strip of choices. */
  pick(radio: Locator): Promise<void>;
  type(field: Locator, text: string): Promise<void>;
  /** Opens a view of the project: by its entry at the side, or by its two letters. */
  view(name: string, keys: string): Promise<void>;
  openDemo(): Promise<void>;
  /** Opens the sheet of a candidate. */
  sheet(formula: string, link: string): Promise<void>;
}

const opened = (page: Page): Promise<void> =>
  expect(page.getByRole('heading', { level: 1, name: 'Candidates' })).toBeVisible();

export const mouse = (page: Page): Hands => ({
  name: 'mouse',
  press: (target) => target.click(),
  pick: (radio) => radio.check(),
  async type(field, text) {
    await field.click();
    await field.fill(text);
  },
  view: (name) => page.getByRole('link', { name, exact: true }).click(),
  async openDemo() {
    await page.getByRole('link', { name: /^Open Demo/ }).click();
    await opened(page);
  },
  sheet: (_, link) => page.getByRole('link', { name: link, exact: true }).click(),
});

/** Goes on with Tab, or back with Shift, until the target has the focus: what cannot be reached so fails. */
async function tabTo(page: Page, target: Locator): Promise<void> {
  await target.waitFor();
  const back = await target.evaluate((element) => {
    const from = document.activeElement ?? document.body;
    return (from.compareDocumentPosition(element) & Node.DOCUMENT_POSITION_PRECEDING) !== 0;
  });
  for (let presses = 0; presses < 150; presses++) {
    if (await target.evaluate((element) => element === document.activeElement)) return;
    await page.keyboard.press(back ? 'Shift+Tab' : 'Tab');
  }
  throw new Error('not reached by 150 presses of Tab');
}

export const keyboard = (page: Page): Hands => ({
  name: 'keyboard',
  async press(target) {
    await tabTo(page, target);
    const box = await target.evaluate((element) => (element as HTMLInputElement).type === 'checkbox');
    await page.keyboard.press(box ? 'Space' : 'Enter');
  },
  async pick(radio) {
    // Tab reaches the one that is checked; arrows go on from there.
    const group = radio.locator('xpath=ancestor::fieldset[1]').locator('input:checked');
    await tabTo(page, group);
    for (let presses = 0; presses < 10 && !(await radio.isChecked()); presses++)
      await page.keyboard.press('ArrowRight');
    await expect(radio).toBeChecked();
  },
  async type(field, text) {
    await tabTo(page, field);
    await page.keyboard.press('Control+a');
    await page.keyboard.type(text);
  },
  async view(_, keys) {
    await page.evaluate(() => (document.activeElement as HTMLElement | null)?.blur());
    for (const key of keys.split(' ')) await page.keyboard.press(key);
  },
  async openDemo() {
    await page.keyboard.press('Control+k');
    await page.keyboard.type('Demo: a filter');
    await page.keyboard.press('Enter');
    await opened(page);
  },
  async sheet(formula) {
    await page.keyboard.press('Control+k');
    await page.keyboard.type(formula);
    await page.keyboard.press('Enter');
  },
});
