import { type ChildProcess, spawn } from 'node:child_process';
import { readFile, rm } from 'node:fs/promises';
import { join } from 'node:path';
import { type Browser, chromium, type Page } from '@playwright/test';
import { findChromium } from '../../main/start/chromium';

export interface KillableBrowser {
  readonly browser: Browser;
  readonly page: Page;
  /** SIGKILL to the browser process; resolves when it is gone. */
  kill(): Promise<void>;
}

const wait = (ms: number): Promise<void> => new Promise((done) => setTimeout(done, ms));

async function portOf(profile: string): Promise<number> {
  for (let tries = 0; tries < 600; tries++) {
    const text = await readFile(join(profile, 'DevToolsActivePort'), 'utf8').catch(() => '');
    const port = Number(text.split('\n')[0]);
    if (port > 0) return port;
    await wait(50);
  }
  throw new Error('Chromium did not open its port');
}

/** Chromium as a process of its own on a lasting profile, so that it can be killed like any program. */
export async function startBrowser(profile: string): Promise<KillableBrowser> {
  await rm(join(profile, 'DevToolsActivePort'), { force: true });
  const child: ChildProcess = spawn(
    findChromium()!,
    [
      ...['--headless=new', '--remote-debugging-port=0', `--user-data-dir=${profile}`],
      ...['--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking'],
      ...[
        '--disable-component-update',
        '--disable-sync',
        '--no-default-browser-check',
        '--window-size=1280,800',
      ],
      ...(process.getuid?.() === 0 ? ['--no-sandbox'] : []),
      'about:blank',
    ],
    { stdio: 'ignore' },
  );
  const gone = new Promise<void>((done) => child.once('exit', () => done()));
  const browser = await chromium.connectOverCDP(`http://127.0.0.1:${await portOf(profile)}`);
  const context = browser.contexts()[0]!;
  const page = context.pages()[0] ?? (await context.newPage());
  return {
    browser,
    page,
    async kill() {
      child.kill('SIGKILL');
      await gone;
      await browser.close().catch(() => undefined);
      // Its helpers notice a moment later; the profile is free when they are gone too.
      await wait(150);
    },
  };
}
