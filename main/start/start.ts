import { spawn, type ChildProcess } from 'node:child_process';
import { mkdirSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { MirrorFolder, tryFolder } from '../files/mirror/mirrorFolder';
import { SettingsFile } from '../files/settings';
import { build, isStale } from './buildIfStale';
import { findChromium, windowFlags } from './chromium';
import { demoTable } from './demoTable';
import { findElectron } from './electronBinary';
import { type LocalServer, defaultPort, serverMark, startLocalServer } from './localServer';
import { mirrorHandlers } from '../ipc/mirrorHandlers';
import { openLink } from './openLink';
import { dataFolder, defaultMirrorFolder } from './places';
import { readWords, type StartWords, usage } from './words';

const root = resolve(import.meta.dirname, '../..');
const say = (line: string): void => void process.stdout.write(`${line}\n`);
const complain = (line: string): void => void process.stderr.write(`spinhue: ${line}\n`);
const asRoot = process.getuid?.() === 0;

const hasDisplay = (): boolean =>
  process.platform !== 'linux' || Boolean(process.env.DISPLAY) || Boolean(process.env.WAYLAND_DISPLAY);

const ended = (child: ChildProcess): Promise<number> =>
  new Promise((done) => {
    child.once('error', (error) => {
      complain(error.message);
      done(1);
    });
    child.once('exit', (code) => done(code ?? 1));
  });

async function startElectron(binary: string, words: StartWords): Promise<number> {
  if (asRoot) say('Running as root: Electron is started without its sandbox.');
  const files = words.files.map((file) => resolve(file));
  return ended(spawn(binary, [...(asRoot ? ['--no-sandbox'] : []), root, ...files], { stdio: 'inherit' }));
}

/** Whether the port is held by an earlier start of this program. */
async function isOurServer(port: number): Promise<boolean> {
  try {
    const answer = await fetch(`http://127.0.0.1:${port}/`, { signal: AbortSignal.timeout(2000) });
    return answer.headers.get('server') === serverMark;
  } catch {
    return false;
  }
}

async function mirrorFor(words: StartWords, data: string): Promise<MirrorFolder> {
  const settings = new SettingsFile(data, complain);
  if (words.mirror !== null) {
    const folder = resolve(words.mirror);
    await tryFolder(folder);
    await settings.change({ mirrorFolder: folder });
  }
  const chosen = settings.values.mirrorFolder;
  return new MirrorFolder({
    folder: chosen ?? (words.profile === null ? defaultMirrorFolder() : join(data, 'copies')),
    create: chosen === null,
    stateFile: join(data, 'written-copies.json'),
  });
}

async function serve(port: number, mirror: MirrorFolder): Promise<LocalServer> {
  return startLocalServer(
    join(root, 'dist/renderer'),
    {
      ...mirrorHandlers(() => mirror),
      openExternal: ({ link }) => {
        openLink(link);
        return null;
      },
    },
    port,
  );
}

const stopped = (): Promise<void> =>
  new Promise((done) => {
    process.once('SIGINT', () => done());
    process.once('SIGTERM', () => done());
  });

async function startBrowser(chromium: string | null, words: StartWords): Promise<number> {
  const port = words.port ?? defaultPort;
  const data = words.profile === null ? dataFolder() : resolve(words.profile);
  const profile = join(data, 'profile');
  mkdirSync(profile, { recursive: true, mode: 0o700 });
  const mirror = await mirrorFor(words, data);
  let server: LocalServer;
  try {
    server = await serve(port, mirror);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'EADDRINUSE') throw error;
    if (chromium !== null && !words.serveOnly && (await isOurServer(port))) {
      say('Spinhue is running already; showing another window of it.');
      return ended(
        spawn(chromium, windowFlags(`http://127.0.0.1:${port}/`, profile, asRoot), { stdio: 'ignore' }),
      );
    }
    complain(`port ${port} is used by another program, and the projects belong to that port.`);
    complain('Close the other program, or start with `npm start -- --port N` (with projects of its own).');
    return 1;
  }
  try {
    if (words.serveOnly) {
      say(server.windowAddress());
      await stopped();
      return 0;
    }
    say(`Copies of the projects are written to ${mirror.folder}.`);
    if (asRoot) say('Running as root: Chromium is started without its sandbox.');
    const began = Date.now();
    const child = spawn(chromium!, windowFlags(server.windowAddress(), profile, asRoot), { stdio: 'ignore' });
    const code = await Promise.race([ended(child), stopped().then(() => 0)]);
    if (code === 0 && child.exitCode !== null && Date.now() - began < 4000) {
      say(
        'The window was opened by a Chromium that runs already. Press Ctrl+C here once you have closed it.',
      );
      await stopped();
    }
    if (child.exitCode === null) child.kill();
    return code;
  } finally {
    await mirror.idle();
    await server.close();
  }
}

async function start(): Promise<number> {
  const words = readWords(process.argv.slice(2));
  if (typeof words === 'string') {
    complain(`${words}\n${usage}`);
    return 2;
  }
  if (words.help) {
    say(usage);
    return 0;
  }
  const electron = words.browser || words.serveOnly ? null : findElectron(root);
  const chromium = findChromium();
  const noWindow =
    words.headless || (!words.serveOnly && (!hasDisplay() || (electron === null && chromium === null)));
  if (noWindow) {
    if (!words.headless) {
      say(
        hasDisplay()
          ? 'Neither Electron nor a Chromium was found: here is the demo project without a window.'
          : 'There is no display: here is the demo project without a window.',
      );
    }
    say(demoTable());
    return 0;
  }
  if (isStale(root)) {
    say('Building …');
    if (!build(root)) {
      complain('the build failed; its own words are above.');
      return 1;
    }
  }
  if (electron !== null) return startElectron(electron, words);
  if (!words.serveOnly) {
    say(
      'Electron’s binary is not here, so the workbench opens in a window of Chromium, on this machine only.',
    );
    say(
      '(`npx install-electron` fetches the binary; projects of the two are kept apart, export moves them.)',
    );
  }
  return startBrowser(chromium, words);
}

process.exitCode = await start();
