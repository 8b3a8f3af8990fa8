// @vitest-environment node
import { describe, expect, it, vi } from 'vitest';
import { readBundle } from '../../../core/record/bundle';
import type { MirrorStatus, ProjectCopy } from '../../host';
import type { Store } from '../../store';
import { hexaammine, testStore } from '../../store/testing/testStore';
import { ProjectMirror } from './projectMirror';

/** A folder that keeps what was written last, and can be out of reach. */
class FakeFolder {
  readonly written: ProjectCopy[] = [];
  readonly files = new Map<string, string>();
  failing = false;
  folder = '/copies';
  listeners = new Set<(status: MirrorStatus) => void>();
  status = async () =>
    ({ state: 'ready', folder: this.folder, lastWrittenAt: null, problem: null }) as MirrorStatus;
  projects = async () => [...this.files.keys()].map((projectId) => ({ projectId }));
  write = async (copy: ProjectCopy) => {
    if (this.failing) throw new Error('folder gone');
    this.written.push(copy);
    this.files.set(copy.projectId, copy.bundle);
    return { writtenAt: '', putAside: null };
  };
  onStatus = (listener: (status: MirrorStatus) => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };
  async choose(folder: string): Promise<void> {
    this.folder = folder;
    this.files.clear();
    const status = await this.status();
    this.listeners.forEach((listener) => listener(status));
  }
}

const mirrorOf = (store: Store, folder: FakeFolder) => new ProjectMirror(store, { mirror: folder } as never);

describe('the mirror of projects', () => {
  it('writes each changed project once for a burst of edits, as it stands at the end', async () => {
    const { store } = await testStore();
    const folder = new FakeFolder();
    const mirror = mirrorOf(store, folder);
    const project = await store.projects.create('Liquid filter');
    for (const metal of ['Cr', 'Co', 'Ni']) await store.candidates.create(project.id, [hexaammine(metal)]);
    await mirror.flush();
    expect(folder.written).toHaveLength(1);
    const reading = readBundle(folder.written[0]!.bundle);
    expect(reading.ok && reading.content.candidates).toHaveLength(3);
  });

  it('tries again after a failure', async () => {
    const { store } = await testStore();
    const folder = new FakeFolder();
    folder.failing = true;
    const mirror = mirrorOf(store, folder);
    const { id } = await store.projects.create('One');
    await mirror.flush();
    expect(folder.written).toEqual([]);
    folder.failing = false;
    await mirror.flush();
    expect(folder.written.map(({ projectId }) => projectId)).toEqual([id]);
  });

  it('copies at the next start what was changed just before the program was killed, an undo too, and nothing else', async () => {
    const { store } = await testStore();
    const folder = new FakeFolder();
    const first = mirrorOf(store, folder);
    const one = await store.projects.create('One');
    const two = await store.projects.create('Two');
    await first.flush();
    await vi.waitFor(async () => expect(await store.db.settings.count()).toBe(2));
    first.dispose();
    await store.projects.update(two.id, 'write notes', { notes: 'late' });
    await store.journal.undo(one.id);
    await store.journal.redo(one.id);

    const next = mirrorOf(store, folder);
    folder.written.length = 0;
    await next.catchUp();
    await next.flush();
    expect(folder.written.map(({ projectId }) => projectId).sort()).toEqual([one.id, two.id].sort());
    folder.written.length = 0;
    await vi.waitFor(async () => {
      await next.catchUp();
      await next.flush();
      const count = folder.written.length;
      folder.written.length = 0;
      expect(count).toBe(0);
    });
  });

  it('writes everything again when a copy is gone or another folder was chosen', async () => {
    const { store } = await testStore();
    const folder = new FakeFolder();
    const mirror = mirrorOf(store, folder);
    await store.projects.create('One');
    await store.projects.create('Two');
    await mirror.flush();
    await mirror.catchUp();
    folder.files.clear();
    await mirror.catchUp();
    await mirror.flush();
    expect(folder.files.size).toBe(2);
    await folder.choose('/elsewhere');
    await vi.waitFor(async () => {
      await mirror.flush();
      expect(folder.files.size).toBe(2);
    });
  });
});
