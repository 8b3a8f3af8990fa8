import { cp, mkdtemp, readdir, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import type { Locator, Page } from '@playwright/test';
import { readBundle } from '../../core/record/bundle';
import { seeded } from '../../core/testing/seeded';
import { MirrorFolder } from '../../main/files/mirror/mirrorFolder';
import { mirrorHandlers } from '../../main/ipc/mirrorHandlers';
import { startLocalServer } from '../../main/start/localServer';
import { CopyWatch } from './copyWatch';
import { faultsOf, noteText, numberOf, type Progress } from './killFaults';
import { type KillableBrowser, startBrowser } from './killableBrowser';
import { readStored } from './storedState';

export interface KillReport {
  readonly kills: number;
  /** Edits that the screen confirmed. */
  readonly confirmed: number;
  readonly faults: readonly string[];
  /** From the screen's confirmation to the copy in the folder, for edits that lived long enough. */
  readonly lags_ms: readonly number[];
  /**
   * How often the browser engine found its own store damaged after a kill and threw it away, and how many edits that the
   * screen had confirmed were younger than the copy that it was filled from again.
   */
  readonly rescues: number;
  readonly lostInRescues: number;
  /** From the page's being drawn to a copy that holds everything, after each kill. */
  readonly catchUps_ms: readonly number[];
}

/** Waits for something on screen; where it does not come, says what is there instead. */
async function shown(page: Page, what: Locator): Promise<void> {
  try {
    await what.waitFor({ timeout: 60_000 });
  } catch {
    const text = await page.evaluate(() => document.body.innerText.replace(/\s+/g, ' ').slice(0, 400));
    throw new Error(`${String(what)} did not come within a minute; the page shows "${text}"`);
  }
}
const projectList = (page: Page): Locator => page.getByRole('heading', { level: 1, name: 'Projects' });

async function openSheet(page: Page, origin: string, projectId: string, candidateId: string): Promise<void> {
  await page.goto(`${origin}/#/sheet/in/${projectId}/${candidateId}`);
  await shown(page, page.getByRole('textbox', { name: 'About this candidate' }));
}

/** Writes numbered notes until the browser is gone. */
async function writeNotes(page: Page, progress: Progress, watch: CopyWatch): Promise<void> {
  const field = page.getByRole('textbox', { name: 'About this candidate' });
  const saved = page.getByText('Saved.', { exact: true });
  for (;;) {
    const number = progress.attempted + 1;
    progress.attempted = number;
    await field.fill(noteText(number));
    await field.blur();
    await saved.waitFor({ timeout: 60_000 });
    progress.confirmed = number;
    progress.confirmations += 1;
    watch.confirmed(number);
  }
}

/** Stars and unstars all candidates at once, a step over many rows, until the browser is gone. */
async function starAll(page: Page, origin: string, projectId: string, progress: Progress): Promise<void> {
  await page.goto(`${origin}/#/candidates/in/${projectId}`);
  const first = page.locator('.grid-row .star').first();
  await first.waitFor({ timeout: 60_000 });
  await page.keyboard.press('Control+a');
  const bar = page.getByRole('toolbar', { name: 'With the selected candidates' });
  for (;;) {
    progress.starring = true;
    await bar.getByRole('button', { name: 'Star', exact: true }).click();
    await page
      .locator(`.grid-row .star[aria-pressed="${!progress.starred}"]`)
      .first()
      .waitFor({ timeout: 60_000 });
    progress.starred = !progress.starred;
    progress.starring = false;
    progress.confirmations += 1;
  }
}

/** Ids of the demo project and of one of its candidates, from the database. */
const demoIds = (page: Page): Promise<{ projectId: string; candidateId: string }> =>
  page.evaluate(async () => {
    const db = await new Promise<IDBDatabase>((resolve, reject) => {
      const request = indexedDB.open('spinhue');
      request.onsuccess = () => resolve(request.result);
      request.onerror = () => reject(request.error);
    });
    const rows = await new Promise<{ id: string; projectId: string }[]>((resolve) => {
      const request = db.transaction('candidates').objectStore('candidates').getAll();
      request.onsuccess = () => resolve(request.result as { id: string; projectId: string }[]);
    });
    db.close();
    return { projectId: rows[0]!.projectId, candidateId: rows[0]!.id };
  });

/** The page is drawn, without a failure on the console; whether the database had to be filled from the copies. */
async function cleanStart(running: KillableBrowser, address: string, faults: string[]): Promise<boolean> {
  const { page } = running;
  page.on('console', (message) => {
    if (message.type() === 'error') faults.push(`console: ${message.text()}`);
  });
  // The TypeScript runner marks functions with this helper, which the page does not know.
  await page.addInitScript('globalThis.__name ??= (named) => named');
  page.on('pageerror', (error) => faults.push(`page: ${error.message}`));
  await page.goto(address);
  const again = page.getByRole('button', { name: 'Try again' });
  try {
    await shown(page, projectList(page).or(again));
    if (await again.isVisible()) {
      await again.click();
      await shown(page, projectList(page));
    }
  } catch (error) {
    faults.push((error as Error).message);
    // What follows is compared all the same.
    await page.reload();
    await shown(page, projectList(page));
  }
  return page.getByText('brought back from the folder of copies').isVisible();
}

async function tornSnapshots(copies: string): Promise<string[]> {
  const faults: string[] = [];
  for (const project of await readdir(copies)) {
    const folder = join(copies, project, 'snapshots');
    for (const name of await readdir(folder).catch(() => [] as string[])) {
      if (!name.endsWith('.spinhue')) continue;
      if (!readBundle(await readFile(join(folder, name))).ok) faults.push(`snapshot ${name} is damaged`);
    }
  }
  return faults;
}

/**
 * Kills the browser process at random moments while edits go on, starts it again on the same profile, and looks whether
 * everything that the screen had confirmed is there, whole, and in the folder of copies.
 */
export async function killTest(
  kills: number,
  seed: number,
  onKill: (done: number, faults: readonly string[]) => void = () => undefined,
  /** Leaves profile and copies where something was lost, for looking at. */
  keep = false,
): Promise<KillReport> {
  const folder = await mkdtemp(join(tmpdir(), 'spinhue-kill-'));
  const profile = join(folder, 'profile');
  const copies = join(folder, 'copies');
  const mirror = new MirrorFolder({ folder: copies, create: true, stateFile: join(folder, 'written.json') });
  // A copy of its own: a build meanwhile would take the page away.
  const built = join(folder, 'page');
  await cp(resolve(import.meta.dirname, '../../dist/renderer'), built, { recursive: true });
  const server = await startLocalServer(
    built,
    { ...mirrorHandlers(() => mirror), openExternal: () => null },
    0,
  );
  const random = seeded(seed);
  const faults: string[] = [];
  const catchUps_ms: number[] = [];
  let [rescues, lostInRescues] = [0, 0];
  const progress: Progress = {
    confirmations: 0,
    attempted: 0,
    confirmed: 0,
    starred: false,
    starring: false,
  };
  const watch = new CopyWatch(copies, /"notes":"edit (\d+):/);
  let running = await startBrowser(profile);
  let whole = false;
  try {
    await cleanStart(running, server.windowAddress(), faults);
    await running.page.getByRole('link', { name: /^Demo: a filter/ }).waitFor({ timeout: 60_000 });
    const { projectId, candidateId } = await demoIds(running.page);
    for (let kill = 0; kill < kills; kill++) {
      const { page } = running;
      const notes = kill % 3 !== 2;
      let editing: Promise<void>;
      if (notes) {
        await openSheet(page, server.origin, projectId, candidateId);
        editing = writeNotes(page, progress, watch);
      } else editing = starAll(page, server.origin, projectId, progress);
      const stopped: Promise<string> = editing.then(
        () => 'no error',
        (error: unknown) => String(error),
      );
      const outcome = await Promise.race([
        stopped,
        new Promise<null>((done) => setTimeout(() => done(null), 100 + random.next() * 4000)),
      ]);
      if (outcome !== null) faults.push(`kill ${kill}: editing stopped by itself: ${outcome.slice(0, 300)}`);
      const late = watch.waiting_ms;
      await running.kill();
      await stopped;
      if (late > 2000) faults.push(`kill ${kill}: the copy was ${late} ms behind`);
      watch.forgive();

      running = await startBrowser(profile);
      const startFaults: string[] = [];
      const rescued = await cleanStart(running, server.windowAddress(), startFaults);
      const drawn = Date.now();
      const state = await readStored(running.page, projectId, candidateId);
      if (rescued) {
        rescues += 1;
        lostInRescues += Math.max(0, progress.confirmed - numberOf(state.notes));
        if (numberOf(state.notes) < watch.number) faults.push(`kill ${kill}: older than the copy`);
      }
      const found = rescued ? startFaults : [...startFaults, ...faultsOf(state, progress)];
      faults.push(...found.map((fault) => `kill ${kill}: ${fault}`));
      // What is stored counts from here on, confirmed or not.
      progress.confirmed = numberOf(state.notes);
      progress.starred = state.starred > 0;
      progress.starring = false;
      while (watch.number < progress.confirmed && Date.now() - drawn < 10_000) {
        await new Promise((done) => setTimeout(done, 30));
        await watch.look();
      }
      if (watch.number < progress.confirmed)
        faults.push(`kill ${kill}: the copy did not catch up after the start`);
      catchUps_ms.push(Date.now() - drawn);
      onKill(kill + 1, faults);
    }
    faults.push(...watch.torn, ...(await tornSnapshots(copies)));
    whole = faults.length === 0;
  } finally {
    await running.kill();
    watch.stop();
    await server.close();
    if (whole || !keep) await rm(folder, { recursive: true, force: true, maxRetries: 10 });
    else process.stderr.write(`what is left of it: ${folder}\n`);
  }
  return {
    kills,
    confirmed: progress.confirmations,
    faults,
    rescues,
    lostInRescues,
    lags_ms: watch.lags_ms,
    catchUps_ms,
  };
}
