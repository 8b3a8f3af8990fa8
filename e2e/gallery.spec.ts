/**
 * Parts and plots by themselves, in Chromium under the content policy of the program: names, contrast, reading by
 * keyboard, figure files. The page is built for the test only and is not part of the application.
 */
import { createServer, type Server } from 'node:http';
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { extname, join, normalize, resolve } from 'node:path';
import AxeBuilder from '@axe-core/playwright';
import { chromium, expect, test, type Browser, type Page } from '@playwright/test';
import react from '@vitejs/plugin-react';
import { build } from 'vite';
import { contentPolicy } from '../main/serving/contentPolicy';

const root = resolve(import.meta.dirname, '../renderer/parts/gallery');
const types: Readonly<Record<string, string>> = {
  '.html': 'text/html',
  '.js': 'text/javascript',
  '.css': 'text/css',
};

let folder: string;
let server: Server;
let browser: Browser;
let address: string;

test.beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'gallery-'));
  await build({
    ...{ root, base: './', configFile: false, publicDir: false, logLevel: 'error', plugins: [react()] },
    build: {
      ...{ outDir: folder, emptyOutDir: true, assetsInlineLimit: 0, chunkSizeWarningLimit: 4000 },
      modulePreload: { polyfill: false },
    },
  });
  server = createServer((request, response) => {
    const path = new URL(request.url ?? '/', 'http://localhost').pathname;
    const file = join(folder, normalize(path === '/' ? '/index.html' : path));
    readFile(file).then(
      (content) => {
        response.writeHead(200, {
          'content-security-policy': contentPolicy,
          'content-type': types[extname(file)] ?? 'text/plain',
        });
        response.end(content);
      },
      () => response.writeHead(path === '/favicon.ico' ? 204 : 404).end(),
    );
  });
  await new Promise<void>((ready) => server.listen(0, '127.0.0.1', ready));
  const at = server.address();
  address = `http://127.0.0.1:${typeof at === 'object' && at ? at.port : 0}/`;
  browser = await chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-quic', '--no-first-run', '--disable-background-networking'],
  });
});

test.afterAll(async () => {
  await browser?.close();
  server?.close();
  await rm(folder, { recursive: true, force: true });
});

async function open(
  part: 'parts' | 'plots',
  theme: 'light' | 'dark',
  width = 1280,
): Promise<[Page, string[]]> {
  const context = await browser.newContext({ viewport: { width, height: 900 } });
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('console', (message) => {
    if (['error', 'warning'].includes(message.type())) complaints.push(message.text());
  });
  page.on('pageerror', (error) => complaints.push(error.message));
  await page.goto(`${address}?theme=${theme}#${part}`);
  await page.locator('.gallery-section').last().waitFor();
  return [page, complaints];
}

for (const part of ['parts', 'plots'] as const) {
  for (const theme of ['light', 'dark'] as const) {
    test(`${part} have no axe finding and break no policy, ${theme}`, async () => {
      const [page, complaints] = await open(part, theme);
      const { violations } = await new AxeBuilder({ page })
        .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
        .analyze();
      const found = violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`);
      expect(found).toEqual([]);
      expect(complaints).toEqual([]);
      await page.context().close();
    });
  }

  test(`${part} lose nothing sideways in a window of 640 px (1280 px at 200 %)`, async () => {
    const [page] = await open(part, 'light', 640);
    const overflow = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    );
    expect(overflow).toBeLessThanOrEqual(0);
    await page.context().close();
  });
}

test('a dialog keeps the focus, closes on Escape and gives the focus back', async () => {
  const [page] = await open('parts', 'light');
  const opener = page.getByRole('button', { name: 'Open dialog' });
  await opener.click();
  const dialog = page.getByRole('dialog', { name: 'Empty the bin?' });
  await expect(dialog).toBeVisible();
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id }) => id)).toEqual([]);
  await page.keyboard.press('Escape');
  await expect(dialog).toBeHidden();
  await expect(opener).toBeFocused();
  await page.context().close();
});

test('a combobox is filled by keyboard, and its open list has no axe finding', async () => {
  const [page] = await open('parts', 'light');
  const field = page.getByRole('combobox', { name: 'Ligand' });
  await field.focus();
  await page.keyboard.type('dia');
  await expect(page.getByRole('option')).toHaveCount(1);
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id }) => id)).toEqual([]);
  await page.keyboard.press('Enter');
  await expect(field).toHaveValue('en');
  await page.context().close();
});

test('a toast offers undo and is announced', async () => {
  const [page] = await open('parts', 'light');
  await page.getByRole('button', { name: 'Show toast' }).click();
  await expect(page.getByRole('status').getByText('Deleted one candidate')).toBeVisible();
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(page.getByText('Deleted one candidate')).toBeHidden();
  await page.context().close();
});

test('every plot is read by keyboard alone', async () => {
  const [page] = await open('plots', 'light');
  const stages = page.getByRole('application');
  const count = await stages.count();
  expect(count).toBeGreaterThan(8);
  let read = 0;
  for (let index = 0; index < count; index++) {
    const stage = stages.nth(index);
    const output = stage.locator('xpath=following-sibling::output');
    if ((await output.count()) === 0) continue;
    await stage.focus();
    await page.keyboard.press('ArrowRight');
    await expect(output).not.toHaveText(/arrow keys/);
    read++;
  }
  expect(read).toBeGreaterThan(6);
  await page.context().close();
});

test('the pointer reads the point of a chart that lies under it', async () => {
  const [page] = await open('plots', 'light');
  const plot = page.locator('figure.plot', { hasText: 'Measured against predicted: 10Dq' });
  const marker = plot.locator('.plot-stage path.marker').nth(3);
  await marker.scrollIntoViewIfNeeded();
  const box = (await marker.boundingBox())!;
  await page.mouse.move(box.x + box.width / 2, box.y + box.height / 2);
  const mark = (await plot.locator('.plot-reading-mark').boundingBox())!;
  expect(Math.abs(mark.x + mark.width / 2 - box.x - box.width / 2)).toBeLessThan(1.5);
  expect(Math.abs(mark.y + mark.height / 2 - box.y - box.height / 2)).toBeLessThan(1.5);
  await page.context().close();
});

test('a figure is saved as SVG that needs nothing else, and as PNG at 300 dpi', async () => {
  const [page, complaints] = await open('plots', 'dark');
  const saved = async (name: RegExp): Promise<Buffer> => {
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('button', { name }).first().click(),
    ]);
    return readFile(await download.path());
  };
  const svg = (await saved(/^Save Absorption spectrum as SVG/)).toString('utf8');
  expect(svg).not.toMatch(/class=|var\(|color\(/);
  expect(svg).toMatch(/Molar absorptivity/);
  const png = await saved(/^Save Absorption spectrum as PNG/);
  const [width, height] = [png.readUInt32BE(16), png.readUInt32BE(20)];
  const drawn = /width="(\d+)" height="(\d+)"/.exec(svg)!;
  expect(width).toBe(Math.round((Number(drawn[1]) * 300) / 96));
  expect(height).toBe(Math.round((Number(drawn[2]) * 300) / 96));
  expect(png.subarray(37, 41).toString('latin1')).toBe('pHYs');
  expect(png.readUInt32BE(41)).toBe(11_811);
  expect(complaints).toEqual([]);
  await page.context().close();
});
