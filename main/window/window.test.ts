import { readdir, readFile, writeFile, mkdir } from 'node:fs/promises';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { commandIds } from '../../renderer/host/commands';
import type { Leaving as LeavingClass } from './leaving';
import { emptyMenuState, menuTemplate } from './menu';
import { bundlesAmong } from './openedFiles';
import { windowPlace } from './place';
import { settled, startProgram, type Program } from '../testing/startProgram';

let program: Program;
beforeEach(async () => {
  program = await startProgram();
});
afterEach(async () => {
  vi.useRealTimers();
  await program.remove();
});

const sent = (channel: string) =>
  program.window.webContents.sent.filter((each) => each.channel === `spinhue:on:${channel}`);

describe('closing the window', () => {
  it('waits for the page to save, then goes', async () => {
    await program.call('pageReady');
    program.window.close();
    await settled();
    expect(program.window.destroyed).toBe(false);
    const { request } = sent('flush')[0]!.value as { request: number };
    await program.call('flushed', { request, answer: { state: 'saved' } });
    await settled();
    expect(program.window.destroyed).toBe(true);
    expect(program.electron.app.quits).toBe(1);
    expect(program.fake.dialogs).toEqual([]);
  });

  it('asks before it loses what cannot be saved, and stays when told so', async () => {
    await program.call('pageReady');
    const close = async (response: number): Promise<void> => {
      program.fake.answers.push({ response });
      program.window.close();
      await settled();
      const { request } = sent('flush').at(-1)!.value as { request: number };
      await program.call('flushed', { request, answer: { state: 'unsaved', what: 'the new candidate' } });
      await settled();
    };
    await close(0);
    expect(program.window.destroyed).toBe(false);
    expect(program.fake.dialogs[0]!.options.message).toBe('Close and lose the new candidate?');
    await close(1);
    expect(program.window.destroyed).toBe(true);
  });

  it('asks when the page does not answer', async () => {
    await program.call('pageReady');
    vi.useFakeTimers({ toFake: ['setTimeout', 'clearTimeout'] });
    program.fake.answers.push({ response: 1 });
    program.window.close();
    await vi.advanceTimersByTimeAsync(11_000);
    expect(program.fake.dialogs[0]!.options.message).toMatch(/does not answer/);
    vi.useRealTimers();
    await settled();
    expect(program.window.destroyed).toBe(true);
  });

  it('an answer to an earlier question does not close the window', async () => {
    await program.call('pageReady');
    program.window.close();
    await settled();
    const { request } = sent('flush')[0]!.value as { request: number };
    await program.call('flushed', { request: request + 7, answer: { state: 'saved' } });
    await settled();
    expect(program.window.destroyed).toBe(false);
  });

  it('closes at once when the page never came up, or crashed', async () => {
    program.window.close();
    await settled();
    expect(program.window.destroyed).toBe(true);
    const crashed = await startProgram();
    crashed.window.webContents.crashed = true;
    crashed.window.close();
    await settled();
    expect(crashed.window.destroyed).toBe(true);
    await crashed.remove();
  });

  it('waits until copies under way are written', async () => {
    const { Leaving } = (await import('./leaving')) as { Leaving: typeof LeavingClass };
    const window = new program.electron.BrowserWindow({ webPreferences: {} });
    let finish = (): void => undefined;
    const leaving = new Leaving();
    leaving.guard(
      window as never,
      (request) => {
        leaving.answered(request, { state: 'saved' });
        return true;
      },
      () => new Promise<void>((resolve) => (finish = resolve)),
    );
    window.close();
    await settled();
    expect(window.destroyed).toBe(false);
    finish();
    await settled();
    expect(window.destroyed).toBe(true);
  });
});

describe('a crash of the page', () => {
  it('is answered in plain words, and the page is loaded again', async () => {
    program.fake.answers.push({ response: 0 });
    program.window.webContents.emit('render-process-gone', {}, { reason: 'crashed', exitCode: 11 });
    await settled();
    const { message, detail } = program.fake.dialogs[0]!.options;
    expect(message).toBe('The window stopped working (crashed).');
    expect(detail).toMatch(/confirmed as saved/);
    expect(program.window.webContents.reloads).toBe(1);
  });

  it('can be answered by quitting; one question at a time; an ordinary end asks nothing', async () => {
    const gone = (reason: string) =>
      program.window.webContents.emit('render-process-gone', {}, { reason, exitCode: 0 });
    gone('clean-exit');
    await settled();
    expect(program.fake.dialogs).toEqual([]);
    program.fake.answers.push({ response: 1 });
    gone('oom');
    gone('oom');
    await settled();
    expect(program.fake.dialogs).toHaveLength(1);
    expect(program.electron.app.exits).toEqual([1]);
  });
});

describe('files given to the program from outside', () => {
  it('picks bundles from a command line and nothing else', () => {
    const words = [
      '/usr/bin/spinhue',
      '--flag',
      'a.spinhue',
      '/x/B.SPINHUE.JSON',
      'notes.txt',
      '--x.spinhue',
      '.',
    ];
    expect(bundlesAmong(words, '/home/me')).toEqual(['/home/me/a.spinhue', '/x/B.SPINHUE.JSON']);
  });

  it('hands a file over once the page listens, also when it came before', async () => {
    const file = join(program.folder, 'a.spinhue');
    await writeFile(file, '{}');
    program.electron.app.emit('open-file', { preventDefault: () => undefined }, file);
    await vi.waitFor(() => expect(program.window.focused).toBeGreaterThan(0));
    expect(sent('fileOpened')).toEqual([]);
    await program.call('pageReady');
    expect(sent('fileOpened')[0]!.value).toMatchObject({
      name: 'a.spinhue',
      bytes: new Uint8Array([123, 125]),
    });
    program.electron.app.emit('second-instance', {}, ['spinhue', 'a.spinhue'], program.folder);
    await vi.waitFor(() => expect(sent('fileOpened')).toHaveLength(2));
  });
});

describe('native menu', () => {
  const flat = (items: readonly Record<string, unknown>[]): Record<string, unknown>[] =>
    items.flatMap((item) => [item, ...flat((item.submenu as Record<string, unknown>[] | undefined) ?? [])]);

  it('holds every command of the table once, each with its own keys', () => {
    const items = flat(menuTemplate(emptyMenuState, 'linux', () => undefined) as never);
    const ids = items.map(({ id }) => id).filter((id) => commandIds.includes(id as never));
    expect([...ids].sort()).toEqual([...commandIds].sort());
    const keys = items.flatMap(({ accelerator }) => (accelerator === undefined ? [] : [accelerator]));
    expect(new Set(keys).size).toBe(keys.length);
  });

  it('sends the command to the page, once it listens', async () => {
    const item = flat(program.fake.menu).find(({ id }) => id === 'new-project')!;
    (item.click as () => void)();
    expect(sent('command')).toEqual([]);
    await program.call('pageReady');
    (item.click as () => void)();
    expect(sent('command').map(({ value }) => value)).toEqual([{ id: 'new-project' }]);
  });

  it('shows what undo would do, the recent projects, and turns off what needs a project', async () => {
    const item = (id: string) => flat(program.fake.menu).find((each) => each.id === id)!;
    expect(item('export-project').enabled).toBe(false);
    await program.call('setMenuState', {
      projectOpen: true,
      undo: 'delete 3 candidates',
      redo: null,
      recent: [{ projectId: 'p1', name: 'Filters & more' }],
    });
    expect(item('export-project').enabled).toBe(true);
    expect(item('undo').label).toBe('Undo: delete 3 candidates');
    expect(item('redo').label).toBe('Redo');
    const recent = (item('recent').submenu as { label: string; click: () => void }[])[0]!;
    expect(recent.label).toBe('Filters && more');
    await program.call('pageReady');
    recent.click();
    expect(sent('command')[0]!.value).toEqual({ id: 'open-project', projectId: 'p1' });
  });

  it('has the Mac’s own menus on a Mac', () => {
    const roles = menuTemplate(emptyMenuState, 'darwin', () => undefined).map(({ role }) => role);
    expect(roles).toContain('appMenu');
    expect(roles).toContain('windowMenu');
  });
});

describe('appearance and place', () => {
  it('follows the system until the user chooses, and remembers the choice', async () => {
    expect(await program.call('theme')).toMatchObject({ value: { choice: 'system' } });
    await program.call('pageReady');
    await program.call('setTheme', { choice: 'dark' });
    expect(program.electron.nativeTheme.themeSource).toBe('dark');
    program.electron.nativeTheme.emit('updated');
    expect(sent('theme')[0]!.value).toEqual({ choice: 'dark', dark: true });
    await vi.waitFor(async () => {
      const kept = await readFile(join(program.folder, 'appData', 'Spinhue', 'settings.json'), 'utf8');
      expect(JSON.parse(kept)).toMatchObject({ theme: 'dark' });
    });
  });

  it('keeps the window on a screen that exists', () => {
    const screens = [{ x: 0, y: 0, width: 1280, height: 800 }];
    const last = { x: 100, y: 50, width: 900, height: 600, maximised: false };
    expect(windowPlace(last, screens)).toEqual(last);
    expect(windowPlace({ ...last, x: 4000 }, screens)).not.toHaveProperty('x');
    expect(windowPlace({ ...last, y: -500 }, screens)).not.toHaveProperty('x');
    expect(windowPlace(null, screens)).toEqual({ width: 1280, height: 800, maximised: false });
    expect(windowPlace(null, []).width).toBeGreaterThan(0);
  });
});

describe('settings of the program', () => {
  it('damaged settings start as new with a line in the log; each good field is kept, the damaged file too', async () => {
    const other = await startProgram(async (_, folder) => {
      await mkdir(join(folder, 'appData', 'Spinhue'), { recursive: true });
      await writeFile(
        join(folder, 'appData', 'Spinhue', 'settings.json'),
        '{"theme":"dark","mirrorFolder":5,"window":{"x":"left"},"__proto__":{"lastFolder":"/"}}',
      );
    });
    expect(await other.call('theme')).toMatchObject({ value: { choice: 'dark' } });
    const data = join(other.folder, 'appData', 'Spinhue');
    expect(await readdir(data)).toContain('settings.json.damaged');
    expect(await readFile(join(data, 'spinhue.log'), 'utf8')).toMatch(/settings .* are damaged/);
    await other.remove();
    const torn = await startProgram(async (_, folder) => {
      await mkdir(join(folder, 'appData', 'Spinhue'), { recursive: true });
      await writeFile(join(folder, 'appData', 'Spinhue', 'settings.json'), '{"theme":"da');
    });
    expect(await torn.call('theme')).toMatchObject({ value: { choice: 'system' } });
    await torn.remove();
  });

  it('the folder of the database is frozen', () => {
    expect(program.electron.app.paths.userData).toBe(join(program.folder, 'appData', 'Spinhue'));
  });
});
