import * as fs from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { HostError } from '../../renderer/host/hostError';
import { writeAtomically, type WriteSystem } from './atomicWrite';

let folder: string;
beforeEach(async () => {
  folder = await fs.mkdtemp(join(tmpdir(), 'spinhue-write-'));
});
afterEach(() => fs.rm(folder, { recursive: true, force: true }));

const errno = (code: string) => Object.assign(new Error(code), { code });

/** A file system on which one operation fails the first `times` times. */
function failing(operation: 'rename' | 'sync' | 'writeFile', code: string, times = Infinity): WriteSystem {
  let left = times;
  const maybeFail = () => {
    if (left-- > 0) throw errno(code);
  };
  return {
    ...fs,
    rename: async (from, to) => {
      if (operation === 'rename') maybeFail();
      return fs.rename(from, to);
    },
    open: async (path, flags, mode) => {
      const handle = await fs.open(path, flags, mode);
      if (operation === 'sync' && flags === 'wx') handle.sync = async () => maybeFail();
      if (operation === 'writeFile') {
        const write = handle.writeFile.bind(handle);
        handle.writeFile = async (data) => {
          // Half of it reaches the disk before the disk is full.
          await write(String(data).slice(0, String(data).length / 2));
          maybeFail();
        };
      }
      return handle;
    },
  } as WriteSystem;
}

describe('atomic write', () => {
  it('replaces the file and leaves nothing else in the folder', async () => {
    const path = join(folder, 'a.json');
    await fs.writeFile(path, 'old');
    await writeAtomically(path, 'new');
    expect(await fs.readFile(path, 'utf8')).toBe('new');
    expect(await fs.readdir(folder)).toEqual(['a.json']);
  });

  it('a write that fails half way leaves the previous file untouched, no temporary file, and a message naming it', async () => {
    const path = join(folder, 'a.json');
    await fs.writeFile(path, 'old');
    const attempt = writeAtomically(path, 'new and long', { system: failing('writeFile', 'ENOSPC') });
    await expect(attempt).rejects.toMatchObject({ code: 'disk-full' });
    await expect(attempt).rejects.toThrow(path);
    expect(await fs.readFile(path, 'utf8')).toBe('old');
    expect(await fs.readdir(folder)).toEqual(['a.json']);
  });

  it('a flush that the disk refuses counts as failure, before the old file is replaced', async () => {
    const path = join(folder, 'a.json');
    await fs.writeFile(path, 'old');
    await expect(writeAtomically(path, 'new', { system: failing('sync', 'EIO') })).rejects.toBeInstanceOf(
      HostError,
    );
    expect(await fs.readFile(path, 'utf8')).toBe('old');
  });

  it('waits for a scanner that holds the target for a moment', async () => {
    const path = join(folder, 'a.json');
    await writeAtomically(path, 'new', { system: failing('rename', 'EPERM', 3), retryDelays_ms: [1, 1, 1] });
    expect(await fs.readFile(path, 'utf8')).toBe('new');
  });

  it('gives up on a target that stays locked: clear error, old file intact', async () => {
    const path = join(folder, 'a.json');
    await fs.writeFile(path, 'old');
    const attempt = writeAtomically(path, 'new', {
      system: failing('rename', 'EACCES'),
      retryDelays_ms: [1, 1],
    });
    await expect(attempt).rejects.toMatchObject({ code: 'locked', remedy: /Close the other program/ });
    expect(await fs.readFile(path, 'utf8')).toBe('old');
    expect(await fs.readdir(folder)).toEqual(['a.json']);
  });

  it('follows a link instead of replacing it, and keeps the permissions of the file', async () => {
    const path = join(folder, 'real.json');
    await fs.writeFile(path, 'old', { mode: 0o600 });
    await fs.symlink(path, join(folder, 'link.json'));
    await writeAtomically(join(folder, 'link.json'), 'new');
    expect((await fs.lstat(join(folder, 'link.json'))).isSymbolicLink()).toBe(true);
    expect(await fs.readFile(path, 'utf8')).toBe('new');
    expect((await fs.stat(path)).mode & 0o777).toBe(0o600);
  });

  it('names a folder that does not exist, and a file that stands where a folder should be', async () => {
    await expect(writeAtomically(join(folder, 'no', 'a'), 'x')).rejects.toMatchObject({ code: 'no-folder' });
    await fs.writeFile(join(folder, 'file'), '');
    await expect(writeAtomically(join(folder, 'file', 'a'), 'x')).rejects.toMatchObject({
      code: 'no-folder',
    });
  });
});
