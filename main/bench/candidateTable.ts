import { resolve } from 'node:path';
import { type Browser, chromium, type Page } from '@playwright/test';
import { build, isStale } from '../start/buildIfStale';
import { findChromium } from '../start/chromium';
import { startLocalServer } from '../start/localServer';
import { benchProject, manyCandidates } from './manyCandidates';
import { atMost, figure, type Bench } from './report';

/** What one size of project takes, milliseconds; `longest` are the longest tasks of the window's own thread. */
interface Measured {
  readonly ranked: number;
  readonly scroll: { readonly longest: number };
  readonly sort: { readonly shown: number; readonly longest: number };
  readonly filter: { readonly shown: number };
  readonly sheet: { readonly shown: number };
  readonly memory_MB: number;
}

const root = resolve(import.meta.dirname, '../..');

/** Puts the rows into the database past the program, which is not what is measured. */
async function fill(page: Page, count: number): Promise<void> {
  const candidates = manyCandidates(count);
  await page.evaluate(
    async ([project, rows]) => {
      const db = await new Promise<IDBDatabase>((done) => {
        const request = indexedDB.open('spinhue');
        request.onsuccess = () => done(request.result);
      });
      const writing = db.transaction(['projects', 'candidates'], 'readwrite');
      writing.objectStore('projects').put(project);
      for (const each of rows) writing.objectStore('candidates').put(each);
      await new Promise((done) => (writing.oncomplete = done));
      db.close();
    },
    [benchProject, candidates] as const,
  );
}

/** Longest task since it was last asked; `work` runs in between. */
async function longestTask(page: Page, work: () => Promise<unknown>): Promise<number> {
  await page.evaluate(() => {
    const seen = globalThis as unknown as { tasks: number[]; watching?: PerformanceObserver };
    seen.tasks = [];
    seen.watching ??= new PerformanceObserver((list) => {
      for (const { duration } of list.getEntries()) seen.tasks.push(duration);
    });
    seen.watching.observe({ entryTypes: ['longtask'] });
  });
  await work();
  await page.waitForTimeout(300);
  return await page.evaluate(() => Math.max(0, ...(globalThis as unknown as { tasks: number[] }).tasks));
}

/** From an act to the frame in which a condition holds, by the page's own clock. */
const untilShown = (page: Page, act: string, holds: string): Promise<number> =>
  page.evaluate(
    ([doing, condition]) =>
      new Promise<number>((done) => {
        const from = performance.now();
        new Function(doing!)();
        const met = new Function(`return ${condition}`) as () => boolean;
        const look = (): void => {
          if (met()) done(performance.now() - from);
          else requestAnimationFrame(look);
        };
        requestAnimationFrame(look);
      }),
    [act, holds],
  );

async function memoryOf(page: Page): Promise<number> {
  const session = await page.context().newCDPSession(page);
  await session.send('HeapProfiler.collectGarbage');
  await session.send('Performance.enable');
  const { metrics } = await session.send('Performance.getMetrics');
  await session.detach();
  return (metrics.find(({ name }) => name === 'JSHeapUsedSize')?.value ?? 0) / 1e6;
}

const setText = (text: string): string =>
  `const field = document.querySelector('input[type=search]');
   Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value').set.call(field, ${JSON.stringify(text)});
   field.dispatchEvent(new Event('input', { bubbles: true }));`;

async function measured(browser: Browser, address: string, origin: string, count: number): Promise<Measured> {
  const context = await browser.newContext({ viewport: { width: 1280, height: 800 }, bypassCSP: true });
  // The TypeScript runner marks functions with this helper, which the page does not know.
  await context.addInitScript('globalThis.__name ??= (named) => named');
  const page = await context.newPage();
  await page.goto(address);
  await page.getByRole('heading', { level: 1, name: 'Projects' }).waitFor();
  await fill(page, count);
  const from = Date.now();
  await page.goto(`${origin}/#/candidates/in/${benchProject.id}`);
  await page.reload();
  await page.locator('.grid-row').first().waitFor();
  const ranked = Date.now() - from;
  // The bar comes half a second after the estimates begin: what is measured starts when they have ended.
  await page.waitForTimeout(2000);
  await page.waitForFunction(
    () =>
      document.querySelector('.progress') === null && document.querySelectorAll('.cell-waiting').length === 0,
    undefined,
    { timeout: 1_200_000 },
  );
  await page.waitForTimeout(1500);
  const scroller = page.locator('.grid');
  await scroller.hover();
  const scrolling = await longestTask(page, async () => {
    for (let turn = 0; turn < 40; turn++) {
      await page.mouse.wheel(0, 700);
      await page.waitForTimeout(30);
    }
  });
  const firstRow = `document.querySelector('.grid-row .cell-complex')?.textContent`;
  let sorted = 0;
  const sorting = await longestTask(page, async () => {
    sorted = await untilShown(
      page,
      `document.querySelector('.grid').scrollTop = 0;
       [...document.querySelectorAll('[role=columnheader] button')].find((each) => /10Dq/.test(each.textContent)).click();
       globalThis.before = ${firstRow};`,
      `${firstRow} !== globalThis.before`,
    );
  });
  const filtered = await untilShown(
    page,
    setText('Cr(III), low spin'),
    `/ of /.test(document.querySelector('.view-header')?.textContent ?? '')`,
  );
  await untilShown(
    page,
    setText(''),
    `!/ of /.test(document.querySelector('.view-header')?.textContent ?? '')`,
  );
  const opened = await untilShown(
    page,
    `document.querySelector('.grid-row .cell-complex a').click();`,
    `document.querySelector('#sheet-spin') !== null`,
  );
  const memory_MB = await memoryOf(page);
  await context.close();
  return {
    ranked,
    scroll: { longest: scrolling },
    sort: { shown: sorted, longest: sorting },
    filter: { shown: filtered },
    sheet: { shown: opened },
    memory_MB,
  };
}

export const candidateTable: Bench = {
  name: 'candidate-table',
  group: 'ui',
  async run({ quick }) {
    if (isStale(root) && !build(root)) throw new Error('the page could not be built');
    const off = new Proxy({}, { get: () => () => ({ state: 'off' }) });
    const server = await startLocalServer(resolve(root, 'dist/renderer'), off as never, 0);
    const browser = await chromium.launch({
      executablePath: findChromium() ?? undefined,
      args: ['--no-sandbox', '--disable-gpu'],
    });
    const many = quick ? 5000 : 50_000;
    try {
      const few = await measured(browser, server.windowAddress(), server.origin, 500);
      const all = await measured(browser, server.windowAddress(), server.origin, many);
      const timing = (what: string, milliseconds: number) => ({ what, milliseconds, repeats: 1 });
      const count = many.toLocaleString('en');
      const ratio = (what: string, of: (each: Measured) => number) =>
        figure(`${what}, ${count} candidates over 500`, of(all) / Math.max(1, of(few)), 'times');
      return {
        title: `the table of candidates in Chromium, ${count} candidates against 500`,
        timings: [
          timing(`first rows on screen, ${count}`, all.ranked),
          timing('first rows on screen, 500', few.ranked),
          timing(`sorted by 10Dq, ${count}`, all.sort.shown),
          timing(`filter shown, ${count}`, all.filter.shown),
          timing(`sheet opened, ${count}`, all.sheet.shown),
        ],
        figures: [
          figure(`longest task while scrolling, ${count}`, all.scroll.longest, 'ms', atMost(50)),
          figure(`longest task beside the sort, ${count}`, all.sort.longest, 'ms'),
          figure(`filter shown, ${count}`, all.filter.shown, 'ms', atMost(100)),
          figure(`sheet opened, ${count}`, all.sheet.shown, 'ms', atMost(100)),
          figure(`memory, ${count}`, all.memory_MB, 'MB', atMost(400)),
          ratio('first rows', ({ ranked }) => ranked),
          ratio('sort', ({ sort }) => sort.shown),
          ratio('filter', ({ filter }) => filter.shown),
          ratio('sheet', ({ sheet }) => sheet.shown),
          ratio('memory', ({ memory_MB }) => memory_MB),
        ],
        skipped: [],
      };
    } finally {
      await browser.close();
      await server.close();
    }
  },
};
