import { chmod, mkdir, mkdtemp, readdir, readFile, rm, symlink, utimes, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { readBundle, writeBundle } from '../../../core/record/bundle';
import type { MirrorStatus } from '../../../renderer/host/bridge';
import { MirrorFolder, tryFolder } from './mirrorFolder';

let base: string;
let now: Date;
beforeEach(async () => {
  base = await mkdtemp(join(tmpdir(), 'spinhue-mirror-'));
  now = new Date('2026-01-05T08:00:00Z');
});
afterEach(() => rm(base, { recursive: true, force: true }));

const row = {
  revision: 0,
  createdAt: '2026-01-01T00:00:00.000Z',
  updatedAt: '2026-01-01T00:00:00.000Z',
  deletedAt: null,
};
const bundle = (id: string, name: string, notes = ''): string =>
  writeBundle({
    projects: [{ ...row, id, name, notes, demo: false, targetLab: null, parameterSetId: null }],
  });
const copy = (notes = '', id = 'p1', name = 'Green filter') => ({
  projectId: id,
  projectName: name,
  bundle: bundle(id, name, notes),
});

const make = (machine = 'a', folder = join(base, 'copies'), onStatus?: (status: MirrorStatus) => void) =>
  new MirrorFolder({
    folder,
    create: true,
    stateFile: join(base, `written-${machine}.json`),
    now: () => now,
    ...(onStatus ? { onStatus } : {}),
  });
const later = (minutes: number): void => {
  now = new Date(now.getTime() + minutes * 60_000);
};
const folderOf = async (): Promise<string> => {
  const names = await readdir(join(base, 'copies'));
  return join(
    base,
    'copies',
    names.find((name) => name.startsWith('Green-filter'))!,
  );
};

describe('folder of open files', () => {
  it('holds the whole project as a bundle that reads back, under a name a person knows', async () => {
    await make().write({ ...copy('one'), extras: [{ name: 'candidates.csv', data: 'name\n' }] });
    const folder = await folderOf();
    const reading = readBundle(await readFile(join(folder, 'project.spinhue')));
    expect(reading.ok && reading.content.projects[0]!.notes).toBe('one');
    expect(await readFile(join(folder, 'tables', 'candidates.csv'), 'utf8')).toBe('name\n');
    expect(await readFile(join(base, 'copies', 'read-me.txt'), 'utf8')).toMatch(/project\.spinhue/);
  });

  it('keeps the state of ten minutes ago as a snapshot, and not one for each edit', async () => {
    const mirror = make();
    for (let i = 0; i < 30; i++) {
      await mirror.write(copy(`edit ${i}`));
      later(1);
    }
    const snapshots = await mirror.snapshots('p1');
    expect(snapshots.length).toBe(3);
    expect(await mirror.readSnapshot('p1', snapshots[0]!.id)).toBe(copy('edit 0').bundle);
  });

  it('takes a snapshot on purpose, of exactly the state handed over', async () => {
    const mirror = make();
    const snapshot = await mirror.takeSnapshot(copy('before the import'), 'before-import');
    await mirror.write(copy('after'));
    expect(await mirror.readSnapshot('p1', snapshot.id)).toBe(copy('before the import').bundle);
    expect(snapshot.reason).toBe('before-import');
  });

  it('two snapshots in the same millisecond, or after the clock went back, do not replace each other', async () => {
    const mirror = make();
    const first = await mirror.takeSnapshot(copy('1'), 'by-hand');
    const second = await mirror.takeSnapshot(copy('2'), 'by-hand');
    later(-60);
    const third = await mirror.takeSnapshot(copy('3'), 'by-hand');
    expect(new Set([first.id, second.id, third.id]).size).toBe(3);
    expect(await mirror.readSnapshot('p1', first.id)).toBe(copy('1').bundle);
  });

  it('a file changed by somebody else is put aside before it is replaced, and said so', async () => {
    const mine = make('a');
    await mine.write(copy('mine'));
    const theirs = make('b');
    const receipt = await theirs.write(copy('theirs'));
    expect(await theirs.readSnapshot('p1', receipt.putAside!)).toBe(copy('mine').bundle);
    const back = await mine.write(copy('mine again'));
    expect(await mine.readSnapshot('p1', back.putAside!)).toBe(copy('theirs').bundle);
  });

  it('knows its own writes again after a restart, even one that was killed between noting and writing', async () => {
    await make().write(copy('one'));
    expect((await make().write(copy('two'))).putAside).toBeNull();
    const folder = await folderOf();
    const killed = make();
    await killed.write(copy('three'));
    // As if the last rename had not happened.
    await writeFile(join(folder, 'project.spinhue'), copy('two').bundle);
    expect((await make().write(copy('four'))).putAside).toBeNull();
  });

  it('finds a project again after it was renamed, and moves its folder', async () => {
    const mirror = make();
    await mirror.write(copy('x'));
    await mirror.write({ ...copy('x'), projectName: 'Blue filter' });
    const names = (await readdir(join(base, 'copies'))).filter((name) => name !== 'read-me.txt');
    expect(names).toHaveLength(1);
    expect(names[0]).toMatch(/^Blue-filter-[0-9a-f]{12}$/);
    expect((await mirror.write({ ...copy('y'), projectName: 'Blue filter' })).putAside).toBeNull();
  });

  it('lists the projects for recovery when the database is lost, leaving out what is no bundle', async () => {
    const mirror = make();
    await mirror.write(copy('x'));
    await mirror.write({ ...copy('y', 'p2', 'Second'), projectName: 'Second' });
    await mkdir(join(base, 'copies', 'holiday pictures'));
    await mkdir(join(base, 'copies', 'torn-000000000000'));
    await writeFile(
      join(base, 'copies', 'torn-000000000000', 'project.spinhue'),
      copy('z').bundle.slice(0, 250),
    );
    const projects = await make('new machine').projects();
    expect(projects.map(({ projectId, name }) => ({ projectId, name }))).toEqual(
      expect.arrayContaining([
        { projectId: 'p1', name: 'Green filter' },
        { projectId: 'p2', name: 'Second' },
      ]),
    );
    expect(projects).toHaveLength(2);
    expect(await mirror.read('p2')).toBe(copy('y', 'p2', 'Second').bundle);
  });

  it('refuses to put anything in place of a project that is not a bundle', async () => {
    const mirror = make();
    await mirror.write(copy('good'));
    await expect(mirror.write({ ...copy(), bundle: '{"broken":' })).rejects.toMatchObject({
      code: 'refused',
    });
    expect(await mirror.read('p1')).toBe(copy('good').bundle);
  });

  it('keeps hostile names of projects inside the folder', async () => {
    const mirror = make();
    for (const name of ['../../outside', '/etc/passwd', 'C:\\Windows', 'con', '..', '   ', '\u202egnp.exe']) {
      await mirror.write({ ...copy('x', `id ${name}`, 'n'), projectName: name });
    }
    expect((await readdir(base)).sort()).toEqual(['copies', 'written-a.json']);
    for (const name of await readdir(join(base, 'copies'))) {
      expect(name).toMatch(/^(read-me\.txt|[\p{L}\p{N}-]+-[0-9a-f]{12})$/u);
    }
  });

  it('refuses a snapshot id that reaches outside', async () => {
    const mirror = make();
    await mirror.write(copy());
    await expect(mirror.readSnapshot('p1', '../project')).rejects.toMatchObject({ code: 'refused' });
  });

  it('says which folder is in the way or missing, fails loudly, and recovers by itself', async () => {
    const seen: MirrorStatus[] = [];
    const folder = join(base, 'copies');
    await writeFile(folder, 'a file where a folder should be');
    const mirror = make('a', folder, (status) => seen.push(status));
    await expect(mirror.write(copy())).rejects.toThrow(folder);
    expect(mirror.status()).toMatchObject({ state: 'failing', folder });
    await rm(folder);
    await mirror.write(copy());
    expect(mirror.status()).toMatchObject({ state: 'ready', problem: null });
    expect(seen.map(({ state }) => state)).toEqual(['failing', 'ready']);
  });

  it('does not make a chosen folder anew whose disk is not connected', async () => {
    const mirror = new MirrorFolder({
      folder: join(base, 'usb', 'copies'),
      create: false,
      stateFile: join(base, 'w.json'),
    });
    await expect(mirror.write(copy())).rejects.toMatchObject({ code: 'no-folder' });
    expect(await readdir(base)).toEqual([]);
  });

  it('sweeps temporary files of a killed run, not those of a running one', async () => {
    await make().write(copy('x'));
    const folder = await folderOf();
    const old = join(folder, '.spinhue-0123456789abcdef.part');
    const fresh = join(folder, '.spinhue-fedcba9876543210.part');
    await writeFile(old, 'half');
    await writeFile(fresh, 'half');
    await utimes(old, new Date(now.getTime() - 3_600_000), new Date(now.getTime() - 3_600_000));
    await utimes(fresh, now, now);
    await make().write(copy('y'));
    const names = await readdir(folder);
    expect(names).toContain('.spinhue-fedcba9876543210.part');
    expect(names).not.toContain('.spinhue-0123456789abcdef.part');
  });

  it.skipIf(process.getuid?.() === 0)('reports a read-only folder', async () => {
    await mkdir(join(base, 'ro'));
    await chmod(join(base, 'ro'), 0o500);
    await expect(tryFolder(join(base, 'ro'))).rejects.toMatchObject({ code: 'unwritable' });
  });

  it('a chosen folder is tried before it is taken', async () => {
    await tryFolder(base);
    expect(await readdir(base)).toEqual([]);
    await writeFile(join(base, 'file'), '');
    await expect(tryFolder(join(base, 'file'))).rejects.toThrow(join(base, 'file'));
    await symlink(join(base, 'nowhere'), join(base, 'dangling'));
    await expect(tryFolder(join(base, 'dangling'))).rejects.toMatchObject({ code: 'no-folder' });
  });
});
