import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { request } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { writeBundle } from '../../core/record/bundle';
import { toWire } from '../../renderer/host/loopback';
import { MirrorFolder } from '../files/mirror/mirrorFolder';
import { contentPolicy } from '../serving/contentPolicy';
import { startLocalServer, type LocalServer } from './localServer';
import { mirrorHandlers } from '../ipc/mirrorHandlers';

let folder: string;
let server: LocalServer;
let cookie: string;
const links: string[] = [];

interface Reply {
  readonly status: number;
  readonly headers: Record<string, string | string[] | undefined>;
  readonly body: string;
}
/** Sends the path as it is: `fetch` would tidy it up first. */
function send(
  path: string,
  { method = 'GET', headers = {}, body = '' }: { method?: string; headers?: object; body?: string } = {},
): Promise<Reply> {
  return new Promise((resolve, reject) => {
    const outgoing = request(
      { host: '127.0.0.1', port: server.port, path, method, headers: headers as Record<string, string> },
      (answer) => {
        let text = '';
        answer.setEncoding('utf8');
        answer.on('data', (chunk: string) => (text += chunk));
        answer.on('end', () => resolve({ status: answer.statusCode!, headers: answer.headers, body: text }));
      },
    );
    outgoing.on('error', reject);
    outgoing.end(body);
  });
}
const call = (name: string, payload: unknown, headers: object = {}) =>
  send(`/host/${name}`, {
    method: 'POST',
    body: typeof payload === 'string' ? payload : JSON.stringify(payload),
    headers: { cookie, origin: server.origin, 'x-spinhue': '1', ...headers },
  });

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'spinhue-server-'));
  await mkdir(join(folder, 'page'));
  await writeFile(join(folder, 'page', 'index.html'), '<html><head></head></html>');
  await writeFile(join(folder, 'secret.txt'), 'secret');
  const mirror = new MirrorFolder({
    folder: join(folder, 'copies'),
    create: true,
    stateFile: join(folder, 'written.json'),
  });
  server = await startLocalServer(
    join(folder, 'page'),
    {
      ...mirrorHandlers(() => mirror),
      openExternal: ({ link }) => {
        links.push(link);
        return null;
      },
    },
    0,
  );
  const opened = await send(new URL(server.windowAddress()).pathname);
  cookie = String(opened.headers['set-cookie']).split(';')[0]!;
});
afterAll(async () => {
  await server.close();
  await rm(folder, { recursive: true, force: true });
});

describe('local server', () => {
  it('serves the page with the content policy and isolation headers', async () => {
    const { status, headers } = await send('/');
    expect(status).toBe(200);
    expect(headers['content-security-policy']).toBe(contentPolicy);
    expect(headers['cross-origin-opener-policy']).toBe('same-origin');
    expect(headers['cross-origin-embedder-policy']).toBe('require-corp');
  });

  it('refuses any other host name, so that no foreign name can point here', async () => {
    for (const host of [
      'evil.example',
      `localhost:${server.port}`,
      '127.0.0.1',
      `127.0.0.1:${server.port}.evil`,
    ]) {
      expect((await send('/', { headers: { host } })).status, host).toBeGreaterThanOrEqual(400);
    }
  });

  it.each([
    ['/../secret.txt', 400],
    ['/%2e%2e/secret.txt', 400],
    ['/..%5csecret.txt', 400],
    ['//etc/passwd', 400],
    ['/secret.txt', 404],
    ['http://127.0.0.1/secret.txt', 404],
  ])('refuses %s', async (path, status) => {
    const answer = await send(path);
    expect(answer.status).toBe(status);
    expect(answer.body).not.toContain('secret\n');
  });

  it('refuses requests made by another page', async () => {
    expect((await send('/', { headers: { 'sec-fetch-site': 'cross-site' } })).status).toBe(403);
  });

  it('only the window that the program opened learns of the copies; its code works once', async () => {
    expect((await send('/', { headers: { cookie } })).body).toContain('spinhue-loopback');
    expect((await send('/')).body).not.toContain('spinhue-loopback');
    const path = new URL(server.windowAddress()).pathname;
    expect((await send(path)).headers['set-cookie']).toBeDefined();
    expect((await send(path)).headers['set-cookie']).toBeUndefined();
    expect((await send('/open/guess')).headers['set-cookie']).toBeUndefined();
  });

  it('calls need the cookie, our origin and our header', async () => {
    expect((await call('mirrorStatus', null)).status).toBe(200);
    expect((await call('mirrorStatus', null, { cookie: 'spinhue=1' })).status).toBe(403);
    expect((await call('mirrorStatus', null, { origin: 'http://evil.example' })).status).toBe(403);
    expect((await call('mirrorStatus', null, { origin: 'null' })).status).toBe(403);
    expect((await call('mirrorStatus', null, { 'x-spinhue': '' })).status).toBe(403);
    expect((await send('/host/mirrorStatus', { headers: { cookie } })).status).toBe(405);
  });

  it('mirrors a project with its extra files, text or bytes, and reads it back', async () => {
    const bundle = writeBundle({});
    const bytes = Uint8Array.from({ length: 70_000 }, (_, i) => i % 256);
    const copy = {
      projectId: 'p',
      projectName: 'P',
      bundle,
      extras: [
        { name: 'a.csv', data: 'x' },
        { name: 'raw.bin', data: bytes },
      ],
    };
    const answer = JSON.parse(
      (await call('mirrorTakeSnapshot', { copy: toWire(copy), reason: 'by-hand' })).body,
    ) as {
      ok: boolean;
      value: { id: string };
    };
    expect(answer.ok).toBe(true);
    const read = JSON.parse(
      (await call('mirrorReadSnapshot', { projectId: 'p', snapshotId: answer.value.id })).body,
    ) as { value: string };
    expect(read.value).toBe(bundle);
  });

  it('refuses payloads that do not fit, unknown calls and broken JSON, with the same checks as the desktop program', async () => {
    const bad: [string, unknown][] = [
      ['mirrorRead', { projectId: 5 }],
      ['mirrorRead', { projectId: 'p', path: '/etc' }],
      [
        'mirrorWrite',
        { projectId: 'p', projectName: 'P', bundle: '{}', extras: [{ name: '../x', data: '' }] },
      ],
      ['mirrorWrite', { projectId: 'p', projectName: 'P', bundle: '{}', extras: [null] }],
      ['mirrorReadSnapshot', { projectId: 'p', snapshotId: '../../secret' }],
      ['openExternal', { link: 'https://evil.example' }],
      ['mirrorStatus', '{"broken'],
      ['saveFile', null],
      ['__proto__', null],
      ['', null],
    ];
    for (const [name, payload] of bad) {
      const { body } = await call(name, payload);
      expect(JSON.parse(body), name).toMatchObject({ ok: false, problem: { code: 'refused' } });
    }
    expect(links).toEqual([]);
  });

  it('says so when the port is taken', async () => {
    await expect(startLocalServer(join(folder, 'page'), {} as never, server.port)).rejects.toMatchObject({
      code: 'EADDRINUSE',
    });
  });
});
