import { expect as quick, type Page } from '@playwright/test';

/** The machine may be busy with other things. */
export const expect = quick.configure({ timeout: 30_000 });

/** The frame is drawn and the list of projects read. */
export async function arrived(page: Page): Promise<void> {
  await expect(page.getByRole('heading', { level: 1, name: 'Projects' })).toBeVisible();
  await expect(page.getByRole('link', { name: /^Demo: a filter/ })).toBeVisible();
}

export async function createProject(page: Page, name: string): Promise<void> {
  await page.getByRole('button', { name: 'New project…' }).first().click();
  await page.getByRole('textbox', { name: 'Name' }).fill(name);
  await page.getByRole('button', { name: 'Create the project' }).click();
  await expect(page.getByRole('heading', { name: 'No candidates yet' })).toBeVisible();
}

export interface Wanted {
  readonly metal: string;
  /** As on the button: `III`. */
  readonly state: string;
  /** Names on the quick buttons with how many of each. */
  readonly ligands: Readonly<Record<string, number>>;
}

/** Enters a complex with the pointer alone. */
export async function addByMouse(page: Page, { metal, state, ligands }: Wanted): Promise<void> {
  await page.getByRole('link', { name: 'New candidate' }).click();
  await page.getByRole('radio', { name: metal, exact: true }).check();
  await page.getByRole('radio', { name: new RegExp(`^${state} d`) }).check();
  for (const [name, count] of Object.entries(ligands)) {
    for (let times = 0; times < count; times++) {
      await page.getByRole('button', { name: `Add ${name}`, exact: true }).click();
    }
  }
  await page.getByRole('button', { name: 'Add to the project' }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'New candidate' })).toBeHidden();
}

/** Rows of the table from above, each as what stands in its first cell. */
export const formulas = async (page: Page): Promise<string[]> =>
  page.locator('.grid-row .cell-complex a').evaluateAll((links) =>
    [...links]
      .map((link) => ({ link, top: link.getBoundingClientRect().top }))
      .sort((one, other) => one.top - other.top)
      .map(({ link }) => link.querySelector('[aria-hidden]')?.textContent ?? ''),
  );
