import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { callNames, eventFunctions } from '../../renderer/host/contract';
import { startUrl } from '../guard/origin';
import { startProgram, type Program } from '../testing/startProgram';
import { sourceFiles } from './sourceFiles';

let program: Program;
beforeEach(async () => {
  program = await startProgram();
});
afterEach(() => program.remove());

const preferences = () => program.window.options.webPreferences;
const sources = await sourceFiles(['main', 'renderer', 'core']);
const mentioning = (pattern: RegExp): string[] =>
  sources.filter(({ text }) => pattern.test(text)).map(({ path }) => path);

/** Electron's own list for programs that show no remote content, one test per point, against the stand-in. */
describe('security of the desktop host (stand-in for Electron)', () => {
  it('loads nothing remote: the window is given one address of our own scheme, and no source loads another', () => {
    expect(program.window.webContents.mainFrame.url).toBe(startUrl);
    expect(startUrl).toBe('spinhue://workbench/index.html');
    expect(mentioning(/loadURL\((?!startUrl)|loadFile\(/)).toEqual([]);
  });

  it('no Node in pages, workers or frames', () => {
    expect(preferences()).toMatchObject({
      nodeIntegration: false,
      nodeIntegrationInWorker: false,
      nodeIntegrationInSubFrames: false,
    });
  });

  it('context isolation is on', () => {
    expect(preferences().contextIsolation).toBe(true);
  });

  it('the sandbox is on for every process, asked for before the program is ready', () => {
    expect(preferences().sandbox).toBe(true);
    // The stand-in throws where this comes after readiness.
    expect(program.electron.app.sandboxed).toBe(true);
  });

  it('every permission is denied but writing to the clipboard, by all four ways to ask', async () => {
    const { session } = program.electron;
    const asked = [
      'geolocation',
      'notifications',
      'media',
      'clipboard-read',
      'midi',
      'fileSystem',
      'unknown',
    ];
    for (const permission of [
      ...asked,
      'openExternal',
      'hid',
      'usb',
      'serial',
      'pointerLock',
      'display-capture',
    ]) {
      const answer = vi.fn();
      session.defaultSession.permissionRequest!({}, permission, answer);
      expect(answer).toHaveBeenCalledWith(false);
      expect(session.defaultSession.permissionCheck!({}, permission)).toBe(false);
    }
    expect(session.defaultSession.permissionCheck!({}, 'clipboard-sanitized-write')).toBe(true);
    expect(session.defaultSession.devicePermission!()).toBe(false);
    const streams = vi.fn();
    session.defaultSession.displayMedia!({}, streams);
    expect(streams).toHaveBeenCalledWith({});
  });

  it('the same denials hold for any session made later', () => {
    const other = new program.electron.FakeSession();
    program.electron.app.emit('session-created', other);
    expect(other.permissionCheck!({}, 'media')).toBe(false);
    expect(other.beforeRequest).not.toBeNull();
  });

  it('web security stays on', () => {
    expect(preferences().webSecurity).toBe(true);
    expect(mentioning(/webSecurity:\s*false|disable-web-security/)).toEqual([]);
  });

  it('no insecure content', () => {
    expect(preferences().allowRunningInsecureContent).toBe(false);
    expect(mentioning(/allowRunningInsecureContent:\s*true/)).toEqual([]);
  });

  it('no experimental features', () => {
    expect(preferences().experimentalFeatures).toBe(false);
    expect(mentioning(/experimentalFeatures:\s*true|enable-experimental/)).toEqual([]);
  });

  it('no extra features of the engine', () => {
    expect(preferences().enableBlinkFeatures).toBeUndefined();
    expect(mentioning(/enableBlinkFeatures|enable-blink-features/)).toEqual([]);
  });

  it('no webview element', () => {
    expect(preferences().webviewTag).toBe(false);
  });

  it('attaching a webview is refused all the same', () => {
    const prevent = vi.fn();
    program.window.webContents.emit('will-attach-webview', { preventDefault: prevent });
    expect(prevent).toHaveBeenCalledOnce();
  });

  it('no navigation, by link, script, frame or redirect', () => {
    for (const event of ['will-navigate', 'will-frame-navigate', 'will-redirect']) {
      const prevent = vi.fn();
      program.window.webContents.emit(event, { preventDefault: prevent, url: startUrl });
      expect(prevent, event).toHaveBeenCalledOnce();
    }
  });

  it('no new windows, whatever their address', () => {
    for (const url of [startUrl, 'about:blank', 'https://example.invalid', 'javascript:1']) {
      expect(program.window.webContents.windowOpenHandler!({ url })).toEqual({ action: 'deny' });
    }
    const second = new program.electron.FakeContents();
    program.electron.app.emit('web-contents-created', {}, second);
    expect(second.windowOpenHandler!({ url: startUrl })).toEqual({ action: 'deny' });
  });

  it('opens only links of the fixed table, by id', async () => {
    const hostile = [
      'file:///etc/passwd',
      'javascript:alert(1)',
      '\\\\server\\share',
      'https://doi.org.evil.example/',
      'https://evil.example/?https://doi.org/',
      'https://doi.org@evil.example/',
      '__proto__',
      'constructor',
      'toString',
      '',
    ];
    for (const link of hostile) {
      expect((await program.call('openExternal', { link })).ok, link).toBe(false);
    }
    expect(program.fake.opened).toEqual([]);
    expect((await program.call('openExternal', { link: 'ciede2000-2005' })).ok).toBe(true);
    expect(program.fake.opened).toEqual(['https://doi.org/10.1002/col.20070']);
  });

  it('every link of the table is https, without credentials', async () => {
    const { externalLinks } = await import('../../renderer/host/links');
    for (const { url } of Object.values(externalLinks)) {
      const { protocol, username, password, port } = new URL(url);
      expect({ protocol, username, password, port }).toEqual({
        protocol: 'https:',
        username: '',
        password: '',
        port: '',
      });
    }
  });

  it('Electron is pinned to one exact version of a major that was current when it was chosen', async () => {
    const manifest = JSON.parse(await readFile(join(import.meta.dirname, '../../package.json'), 'utf8')) as {
      devDependencies: Record<string, string>;
    };
    const version = manifest.devDependencies.electron!;
    expect(version).toMatch(/^\d+\.\d+\.\d+$/);
    // Electron supports its latest three majors; 45 was the latest in August 2026 (its release page).
    expect(Number(version.split('.')[0])).toBeGreaterThanOrEqual(43);
  });

  it('the page sees exactly the functions of the contract, and no event object of Electron', async () => {
    await import('../preload');
    const api = program.fake.exposed.spinhue!;
    expect(Object.keys(program.fake.exposed)).toEqual(['spinhue']);
    expect(Object.keys(api).sort()).toEqual([...callNames, ...Object.values(eventFunctions)].sort());
    const heard: unknown[][] = [];
    const stop = (api.onTheme as (listener: (...words: unknown[]) => void) => () => void)((...words) =>
      heard.push(words),
    );
    program.window.webContents.send('spinhue:on:theme', { choice: 'dark', dark: true });
    stop();
    program.window.webContents.send('spinhue:on:theme', { choice: 'light', dark: false });
    expect(heard).toEqual([[{ choice: 'dark', dark: true }]]);
    expect(mentioning(/exposeInMainWorld\([^)]*ipcRenderer\b(?!\.)/)).toEqual([]);
  });

  it('nothing leaves the machine: requests outside our scheme are cancelled, names are not resolved, no proxy is asked', () => {
    const { session, app } = program.electron;
    const verdict = (url: string): boolean => {
      const answer = vi.fn();
      session.defaultSession.beforeRequest!({ url }, answer);
      return (answer.mock.calls[0]![0] as { cancel: boolean }).cancel;
    };
    const refused = [
      'https://example.invalid/',
      'http://127.0.0.1:80/',
      'ws://127.0.0.1/',
      'file:///etc/passwd',
      'ftp://example.invalid/',
      'spinhue://workbench.evil/',
      'spinhue://evil/workbench',
      'spinhue://user@workbench/',
      'blob:https://example.invalid/1',
      'chrome://gpu/',
      'about:srcdoc',
    ];
    expect(refused.filter((url) => !verdict(url))).toEqual([]);
    expect([startUrl, 'data:image/png;base64,AA', 'blob:spinhue://workbench/1'].filter(verdict)).toEqual([]);
    expect(app.switches.get('host-resolver-rules')).toBe('MAP * ~NOTFOUND');
    expect(session.defaultSession.proxy).toEqual({ mode: 'direct' });
    expect(preferences().spellcheck).toBe(false);
    expect(mentioning(/autoUpdater|crashReporter\.start|navigator\.sendBeacon/)).toEqual([]);
  });

  it('downloads are refused; files leave through the save dialog', () => {
    const prevent = vi.fn();
    const cancel = vi.fn();
    program.electron.session.defaultSession.emit('will-download', { preventDefault: prevent }, { cancel });
    expect(prevent).toHaveBeenCalled();
    expect(cancel).toHaveBeenCalled();
  });

  it('one instance: a second start opens nothing and quits, the first comes to the front', async () => {
    const second = await startProgram((electron) => {
      electron.app.lock = false;
    });
    expect(second.electron.app.quits).toBe(1);
    expect(second.fake.windows).toEqual([]);
    expect(second.fake.callHandlers.size).toBe(0);
    await second.remove();
    program = await startProgram();
    program.electron.app.emit('second-instance', {}, ['spinhue'], '/');
    expect(program.window.focused).toBe(1);
  });

  it('developer tools are off in the package, and no address of a development server is in the program', async () => {
    const packaged = await startProgram((electron) => {
      electron.app.isPackaged = true;
    });
    expect(packaged.window.options.webPreferences.devTools).toBe(false);
    await packaged.remove();
    const built = mentioning(/localhost|127\.0\.0\.1/).filter((path) => !path.startsWith('main/start/'));
    expect(built).toEqual([]);
    expect(mentioning(/openDevTools|remote-debugging-port/)).toEqual([]);
  });

  it('rendered text is text: no source sets markup from a string', () => {
    const setters =
      /dangerouslySetInnerHTML|\.innerHTML\s*=|\.outerHTML\s*=|insertAdjacentHTML|document\.write/;
    expect(mentioning(setters)).toEqual([]);
    expect(mentioning(/\beval\(|new Function\(/)).toEqual([]);
  });
});
