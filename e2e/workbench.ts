import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { type BrowserContext, chromium, expect, type Page, test as base } from '@playwright/test';
import { MirrorFolder } from '../main/files/mirror/mirrorFolder';
import { build, isStale } from '../main/start/buildIfStale';
import { type LocalServer, startLocalServer } from '../main/start/localServer';
import { mirrorHandlers } from '../main/ipc/mirrorHandlers';

const root = resolve(import.meta.dirname, '..');

export interface Site {
  readonly server: LocalServer;
  /** Folder of the copies. */
  readonly copies: string;
}

/** What a page must never do: errors on its console, violations of the content policy, requests to elsewhere. */
export interface Watch {
  readonly consoleErrors: string[];
  readonly violations: string[];
  readonly foreignRequests: string[];
}

export function watch(context: BrowserContext, origin: string): Watch {
  const seen: Watch = { consoleErrors: [], violations: [], foreignRequests: [] };
  void context.exposeFunction('reportViolation', (text: string) => seen.violations.push(text));
  void context.addInitScript(() => {
    addEventListener('securitypolicyviolation', (event) => {
      const report = (globalThis as unknown as { reportViolation: (text: string) => void }).reportViolation;
      report(`${event.effectiveDirective} ${event.blockedURI}`);
    });
  });
  const follow = (page: Page): void => {
    page.on('console', (message) => {
      if (message.type() === 'error') seen.consoleErrors.push(message.text());
    });
    page.on('pageerror', (error) => seen.consoleErrors.push(error.message));
  };
  context.pages().forEach(follow);
  context.on('page', follow);
  context.on('request', (request) => {
    if (!new RegExp(`^(${origin}/|data:|blob:${origin}/)`).test(request.url())) {
      seen.foreignRequests.push(request.url());
    }
  });
  return seen;
}

export const expectQuiet = (seen: Watch): void =>
  expect(seen).toEqual({ consoleErrors: [], violations: [], foreignRequests: [] });

/** Opens a browser on a profile of its own that can be closed and opened again. */
export async function openProfile(folder: string): Promise<BrowserContext> {
  const { launchOptions, viewport, locale, timezoneId } = base.info().project.use;
  return chromium.launchPersistentContext(folder, { ...launchOptions, viewport, locale, timezoneId });
}

/**
 * The built program as the start command serves it, with a folder for copies. Every page is watched: a test that used
 * `workbench` fails where the page complained, broke its content policy or asked for anything from elsewhere.
 */
export const test = base.extend<{ workbench: Page; profileFolder: string; site: Site }, { built: void }>({
  built: [
    async ({}, use) => {
      if (isStale(root) && !build(root)) throw new Error('the build failed');
      await use();
    },
    { scope: 'worker' },
  ],
  // One for each test: an empty database is filled from the copies, which must not be those of another test.
  site: async ({ built: _ }, use) => {
    const folder = await mkdtemp(join(tmpdir(), 'spinhue-e2e-'));
    const copies = join(folder, 'copies');
    const mirror = new MirrorFolder({
      folder: copies,
      create: true,
      stateFile: join(folder, 'written.json'),
    });
    const server = await startLocalServer(
      join(root, 'dist/renderer'),
      {
        ...mirrorHandlers(() => mirror),
        openExternal: () => null,
      },
      0,
    );
    await use({ server, copies });
    await server.close();
    await rm(folder, { recursive: true, force: true, maxRetries: 5, retryDelay: 200 });
  },
  workbench: async ({ context, page, site }, use) => {
    const seen = watch(context, site.server.origin);
    await page.goto(site.server.windowAddress());
    await use(page);
    expectQuiet(seen);
  },
  profileFolder: async ({}, use) => {
    const folder = await mkdtemp(join(tmpdir(), 'spinhue-profile-'));
    await use(folder);
    await rm(folder, { recursive: true, force: true, maxRetries: 5 });
  },
});

export { expect };
