import { mkdir, readFile, rm, symlink, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { writeBundle } from '../../core/record/bundle';
import { callChannel, callNames } from '../../renderer/host/contract';
import { startUrl } from '../guard/origin';
import { startProgram, type Program } from '../testing/startProgram';

let program: Program;
beforeEach(async () => {
  program = await startProgram();
});
afterEach(() => program.remove());

const answerTo = (filePath: string) => program.fake.answers.push({ canceled: false, filePath });

describe('messages from the page (stand-in for Electron)', () => {
  it('the sender is checked: forged page, embedded frame, vanished frame and foreign window are rejected with an error', async () => {
    const { FakeFrame, FakeContents } = program.electron;
    const contents = program.window.webContents;
    const foreign = new FakeContents();
    foreign.mainFrame.url = startUrl;
    for (const name of callNames) {
      const call = (from: object) => program.fake.call(callChannel(name), [null], from);
      await expect(call({ frame: new FakeFrame(startUrl) }), name).rejects.toThrow('embedded frame');
      await expect(call({ frame: null }), name).rejects.toThrow('frame is gone');
      await expect(call({ contents: foreign }), name).rejects.toThrow('another window');
    }
    for (const url of [
      'https://workbench/',
      'spinhue://evil/index.html',
      'file:///index.html',
      'about:blank',
      '',
    ]) {
      contents.mainFrame.url = url;
      await expect(program.call('hostInfo'), url).rejects.toThrow('another page');
    }
  });

  it('every call refuses payloads of the wrong type, with extra fields, or more than one value', async () => {
    const wrong: unknown[] = [undefined, 0, 'text', [], [[]], {}, { extra: 1 }, new Map(), new Date(), NaN];
    for (const name of callNames) {
      for (const payload of wrong) {
        const answer = (await program.fake.call(callChannel(name), [payload])) as { ok: boolean };
        expect(answer.ok, `${name} ${String(payload)}`).toBe(false);
      }
      const two = (await program.fake.call(callChannel(name), [null, null])) as { ok: boolean };
      expect(two.ok).toBe(false);
    }
    expect(program.fake.dialogs).toEqual([]);
  });

  it('refuses keys that reach for a prototype', async () => {
    const payload = JSON.parse(
      '{"kind":"csv","suggestedName":"a.csv","data":"x","__proto__":{"many":true}}',
    ) as object;
    expect(Object.hasOwn(payload, '__proto__')).toBe(true);
    expect((await program.call('saveFile', payload)).ok).toBe(false);
    expect((await program.call('setTheme', JSON.parse('{"choice":"dark","constructor":1}'))).ok).toBe(false);
    expect(({} as Record<string, unknown>).many).toBeUndefined();
  });

  it('refuses a file name with a path, a device, a hidden name, or direction tricks, before any dialog', async () => {
    const names = [
      '../a.csv',
      'a/b.csv',
      'a\\b.csv',
      '/etc/passwd',
      'C:a.csv',
      'con.csv',
      'LPT1',
      '.bashrc',
      '-rf',
      ' a',
      'a.',
      'a\u0000.csv',
      'gpj\u202evsc.exe',
      'x'.repeat(200),
      '',
    ];
    for (const suggestedName of names) {
      expect(
        (await program.call('saveFile', { kind: 'csv', suggestedName, data: '' })).ok,
        suggestedName,
      ).toBe(false);
      expect((await program.call('dragOut', { name: suggestedName, data: '' })).ok, suggestedName).toBe(
        false,
      );
    }
    expect(program.fake.dialogs).toEqual([]);
    expect(program.window.webContents.drags).toEqual([]);
  });

  it('refuses a text of hundreds of megabytes where a line is expected', async () => {
    const what = 'x'.repeat(100e6);
    expect((await program.call('setUnsaved', { what })).ok).toBe(false);
    expect((await program.call('mirrorRead', { projectId: what })).ok).toBe(false);
  });

  it('refuses a very deep value without running out of stack', async () => {
    let deep: unknown = 'x';
    for (let i = 0; i < 1000; i++) deep = { a: deep };
    for (const name of callNames) {
      const answer = (await program.fake.call(callChannel(name), [deep])) as { ok: boolean };
      expect(answer.ok, name).toBe(false);
    }
  });

  it('paths come from dialogs only: a handle that no dialog issued is refused', async () => {
    const target = join(program.folder, 'mine.csv');
    await writeFile(target, 'old');
    for (const handle of [target, '00000000-0000-4000-8000-000000000000', '__proto__', '']) {
      const answer = await program.call('saveAgain', { handle, data: 'stolen' });
      expect(answer.ok).toBe(false);
    }
    expect(await readFile(target, 'utf8')).toBe('old');
  });

  it('saves where the dialog said, answers with a name and a handle but no path, and saves there again', async () => {
    const target = join(program.folder, 'spectrum.csv');
    answerTo(target);
    const answer = await program.call('saveFile', { kind: 'csv', suggestedName: 'spectrum.csv', data: 'a' });
    expect(answer).toMatchObject({ ok: true, value: { saved: true, name: 'spectrum.csv' } });
    expect(JSON.stringify(answer)).not.toContain(program.folder);
    const handle = (answer as { value: { handle: string } }).value.handle;
    await program.call('saveAgain', { handle, data: new Uint8Array([98]) });
    expect(await readFile(target, 'utf8')).toBe('b');
  });

  it('a closed dialog is no failure and writes nothing', async () => {
    const answer = await program.call('saveFile', { kind: 'csv', suggestedName: 'a.csv', data: 'a' });
    expect(answer).toEqual({ ok: true, value: { saved: false } });
    expect(await program.call('openFiles', { kind: 'bundle', many: false })).toEqual({ ok: true, value: [] });
  });

  it('a write that fails comes back as a problem with a remedy, not as an exception', async () => {
    answerTo(join(program.folder, 'missing', 'a.csv'));
    const answer = await program.call('saveFile', { kind: 'csv', suggestedName: 'a.csv', data: 'a' });
    expect(answer).toMatchObject({ ok: false, problem: { code: 'no-folder', remedy: /disk is connected/ } });
  });

  it('opens what the dialog named, and refuses folders and absurd sizes', async () => {
    const file = join(program.folder, 'a.csv');
    await writeFile(file, '1,2');
    program.fake.answers.push({ canceled: false, filePaths: [file] });
    const opened = await program.call('openFiles', { kind: 'spectrum', many: true });
    expect(opened.ok && opened.value[0]).toMatchObject({
      name: 'a.csv',
      bytes: new Uint8Array([49, 44, 50]),
    });
    program.fake.answers.push({ canceled: false, filePaths: [program.folder] });
    expect(await program.call('openFiles', { kind: 'any', many: false })).toMatchObject({
      ok: false,
      problem: { code: 'unreadable' },
    });
  });

  it('drags out a file of the given name from a folder of its own', async () => {
    expect((await program.call('dragOut', { name: 'card.svg', data: '<svg/>' })).ok).toBe(false);
    await mkdir(join(program.folder, 'temp'), { recursive: true });
    expect((await program.call('dragOut', { name: 'card.svg', data: '<svg/>' })).ok).toBe(true);
    const { file } = program.window.webContents.drags[0]!;
    expect(file).toMatch(/spinhue-drag-[^/]+\/card\.svg$/);
    expect(await readFile(file, 'utf8')).toBe('<svg/>');
  });

  it('writes a PDF of the page through the save dialog', async () => {
    const target = join(program.folder, 'card.pdf');
    answerTo(target);
    const request = { suggestedName: 'card.pdf', pageSize: 'Letter', landscape: true };
    expect((await program.call('printToPdf', request)).ok).toBe(true);
    expect(await readFile(target, 'latin1')).toMatch(/^%PDF/);
    expect(program.fake.pdfs[0]).toMatchObject({ pageSize: 'Letter', landscape: true });
  });

  it('mirrors a project into the documents folder, and into another one once the user chose it', async () => {
    const bundle = writeBundle({});
    const copy = { projectId: 'p', projectName: 'P', bundle };
    await mkdir(join(program.folder, 'documents'));
    expect((await program.call('mirrorWrite', copy)).ok).toBe(true);
    const status = await program.call('mirrorStatus');
    expect(status).toMatchObject({
      ok: true,
      value: { state: 'ready', folder: join(program.folder, 'documents', 'Spinhue') },
    });
    const other = join(program.folder, 'group');
    await mkdir(other);
    program.fake.answers.push({ canceled: false, filePaths: [other] });
    expect(await program.call('mirrorChooseFolder')).toMatchObject({ ok: true, value: { folder: other } });
    await program.call('mirrorWrite', copy);
    expect(await program.call('mirrorRead', { projectId: 'p' })).toEqual({ ok: true, value: bundle });
    await rm(other, { recursive: true });
    expect(await program.call('mirrorWrite', copy)).toMatchObject({
      ok: false,
      problem: { code: 'no-folder' },
    });
    expect(await program.call('mirrorStatus')).toMatchObject({ ok: true, value: { state: 'failing' } });
  });

  it('a chosen folder that cannot take files is refused by name and the old one kept', async () => {
    const file = join(program.folder, 'file');
    await writeFile(file, '');
    await symlink(join(program.folder, 'gone'), join(program.folder, 'link'));
    for (const folder of [file, join(program.folder, 'link')]) {
      program.fake.answers.push({ canceled: false, filePaths: [folder] });
      const answer = await program.call('mirrorChooseFolder');
      expect(answer.ok).toBe(false);
      expect(JSON.stringify(answer)).toContain(folder);
    }
    expect(await program.call('mirrorStatus')).toMatchObject({
      value: { folder: join(program.folder, 'documents', 'Spinhue') },
    });
  });

  it('refuses names of extra files that leave the folder', async () => {
    const copy = { projectId: 'p', projectName: 'P', bundle: writeBundle({}) };
    const extras = [{ name: '../../outside.csv', data: 'x' }];
    expect((await program.call('mirrorWrite', { ...copy, extras })).ok).toBe(false);
  });
});
