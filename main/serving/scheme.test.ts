import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { isOurUrl, startUrl } from '../guard/origin';
import { fake } from '../testing/fakeElectron';
import { contentPolicy } from './contentPolicy';
import { registerScheme, serveScheme } from './scheme';

let folder: string;
beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'spinhue-scheme-'));
  await mkdir(join(folder, 'page', 'assets'), { recursive: true });
  await mkdir(join(folder, 'page-sibling'));
  await writeFile(join(folder, 'page', 'index.html'), '<p>page</p>');
  await writeFile(join(folder, 'page', 'assets', 'a.js'), '1');
  await writeFile(join(folder, 'page', 'private.key'), 'secret');
  await writeFile(join(folder, 'page-sibling', 'index.html'), 'secret');
  await writeFile(join(folder, 'secret.txt'), 'secret');
  fake.reset(folder);
  registerScheme();
  fake.becomeReady();
  serveScheme(join(folder, 'page'));
});
afterEach(() => rm(folder, { recursive: true, force: true }));

const get = (url: string, method = 'GET') =>
  // As the program receives it: the address is not normalised once more by this test.
  fake.schemeHandlers.get('spinhue')!({ url, method } as Request);

describe('the program’s own scheme', () => {
  it('is standard and secure, so that the page has a database, and never bypasses the content policy', () => {
    expect(fake.schemes).toEqual([
      {
        scheme: 'spinhue',
        privileges: { standard: true, secure: true, supportFetchAPI: true, codeCache: true },
      },
    ]);
  });

  it('its name and host are frozen: the records belong to this origin', () => {
    expect(startUrl).toBe('spinhue://workbench/index.html');
  });

  it('serves the files of the page with type, content policy and isolation headers', async () => {
    const page = await get('spinhue://workbench/index.html');
    expect(await page.text()).toBe('<p>page</p>');
    expect(page.headers.get('content-type')).toBe('text/html; charset=utf-8');
    expect(page.headers.get('content-security-policy')).toBe(contentPolicy);
    expect(page.headers.get('cross-origin-opener-policy')).toBe('same-origin');
    expect(page.headers.get('cross-origin-embedder-policy')).toBe('require-corp');
    expect(page.headers.get('x-content-type-options')).toBe('nosniff');
    expect((await get('spinhue://workbench/assets/a.js?v=1#x')).status).toBe(200);
    expect((await get('spinhue://workbench/')).status).toBe(200);
  });

  it('the content policy allows our own files only: no inline script, no eval, no frame, no form', () => {
    expect(contentPolicy).toMatch(/^default-src 'none'; script-src 'self'; style-src 'self';/);
    expect(contentPolicy).not.toMatch(/unsafe|https?:|\*/);
  });

  it.each([
    ['spinhue://workbench/../secret.txt', 400],
    ['spinhue://workbench/assets/../../secret.txt', 400],
    ['spinhue://workbench/%2e%2e/secret.txt', 400],
    ['spinhue://workbench/..%5csecret.txt', 400],
    ['spinhue://workbench/..\\secret.txt', 400],
    ['spinhue://workbench//etc/passwd', 400],
    ['spinhue://workbench/%00', 400],
    ['spinhue://workbench/../page-sibling/index.html', 400],
    ['spinhue://workbench/etc/passwd', 404],
    ['spinhue://workbench/private.key', 404],
    ['spinhue://workbench/assets', 404],
    ['spinhue://workbench/__proto__', 404],
    ['spinhue://other/index.html', 403],
    ['spinhue://workbench.evil/index.html', 403],
    ['spinhue://user@workbench/index.html', 403],
  ])('refuses %s with %i', async (url, status) => {
    const answer = await get(url);
    expect(answer.status).toBe(status);
    expect(await answer.text()).not.toContain('secret');
  });

  it.each(['POST', 'PUT', 'DELETE', 'OPTIONS'])('refuses the method %s', async (method) => {
    expect((await get('spinhue://workbench/index.html', method)).status).toBe(405);
  });

  it('one test decides what is ours, and hostile look-alikes are not', () => {
    const hostile = [
      'spinhue:workbench',
      'spinhue://workbench:80/',
      'spinhue://WORKBENCH.evil/',
      'spinhue://evil/spinhue://workbench/',
      'https://workbench/?spinhue://workbench',
      'file:///spinhue://workbench',
      'null',
      '',
    ];
    expect(hostile.filter(isOurUrl)).toEqual([]);
    expect(isOurUrl(startUrl)).toBe(true);
  });
});
