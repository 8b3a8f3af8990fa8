// @vitest-environment node
import { describe, expect, it, vi } from 'vitest';
import { readBundle } from '../../../core/record/bundle';
import { hexaammine, testStore } from '../../store/testing/testStore';
import { ProjectMirror } from './projectMirror';

async function setup(write = vi.fn(async (_copy: { projectId: string; bundle: string }) => undefined)) {
  const { store } = await testStore();
  const host = { mirror: { status: async () => ({ state: 'ready' }), write } };
  return { store, write, mirror: new ProjectMirror(store, host as never) };
}

describe('the mirror of projects', () => {
  it('writes each changed project once for a burst of edits, as it stands at the end', async () => {
    const { store, write, mirror } = await setup();
    const project = await store.projects.create('Liquid filter');
    for (const metal of ['Cr', 'Co', 'Ni']) await store.candidates.create(project.id, [hexaammine(metal)]);
    await mirror.flush();
    expect(write).toHaveBeenCalledOnce();
    const reading = readBundle(write.mock.calls[0]![0].bundle);
    expect(reading.ok && reading.content.candidates).toHaveLength(3);
  });

  it('tries again with the next change after a failure', async () => {
    const failing = vi.fn(async () => undefined);
    failing.mockRejectedValueOnce(new Error('folder gone'));
    const { store, write, mirror } = await setup(failing);
    const one = await store.projects.create('One');
    await mirror.flush();
    await store.projects.create('Two');
    await mirror.flush();
    expect(write.mock.calls.map(([copy]) => copy?.projectId).filter((id) => id === one.id)).toHaveLength(2);
  });
});
