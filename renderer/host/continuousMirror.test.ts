import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { ProjectCopy } from './bridge';
import { ContinuousMirror } from './continuousMirror';

const receipt = { writtenAt: '2026-01-01T00:00:00.000Z', putAside: null };

function setUp(write: (copy: ProjectCopy) => Promise<typeof receipt>) {
  const state = new Map<string, number>();
  const written: string[] = [];
  const failures: unknown[] = [];
  const mirror = new ContinuousMirror({
    copyOf: async (projectId) => ({
      projectId,
      projectName: projectId,
      bundle: `${projectId}@${state.get(projectId) ?? 0}`,
    }),
    write: async (copy) => {
      const answer = await write(copy);
      written.push(copy.bundle);
      return answer;
    },
    onFailed: (_, error) => failures.push(error),
  });
  const edit = (projectId: string) => {
    state.set(projectId, (state.get(projectId) ?? 0) + 1);
    mirror.changed(projectId);
  };
  return { mirror, edit, written, failures };
}

describe('continuous mirror', () => {
  beforeEach(() => void vi.useFakeTimers());
  afterEach(() => void vi.useRealTimers());

  it('writes a change within two seconds even while edits go on without a pause', async () => {
    const { edit, written } = setUp(async () => receipt);
    for (let i = 0; i < 19; i++) {
      edit('p');
      await vi.advanceTimersByTimeAsync(100);
    }
    expect(written.length).toBeGreaterThanOrEqual(2);
    await vi.advanceTimersByTimeAsync(1000);
    expect(written.at(-1)).toBe('p@19');
  });

  it('picks up changes that come while a write is under way, and never writes twice at once', async () => {
    let open = 0;
    let most = 0;
    const { edit, written } = setUp(async () => {
      most = Math.max(most, ++open);
      await new Promise((resolve) => setTimeout(resolve, 500));
      open--;
      return receipt;
    });
    edit('a');
    await vi.advanceTimersByTimeAsync(1000);
    edit('a');
    edit('b');
    await vi.advanceTimersByTimeAsync(4000);
    expect(written).toEqual(['a@1', 'a@2', 'b@1']);
    expect(most).toBe(1);
  });

  it('keeps a project due after a failure, reports it, and writes it once the disk answers again', async () => {
    let broken = true;
    const { mirror, edit, written, failures } = setUp(async () => {
      if (broken) throw new Error('disk full');
      return receipt;
    });
    edit('p');
    await vi.advanceTimersByTimeAsync(1000);
    expect(failures).toHaveLength(1);
    expect(await mirror.flush()).toBe(false);
    broken = false;
    await vi.advanceTimersByTimeAsync(6000);
    expect(written).toEqual(['p@1']);
    expect(await mirror.flush()).toBe(true);
  });

  it('flushes at once when the window closes', async () => {
    const { mirror, edit, written } = setUp(async () => receipt);
    edit('p');
    expect(await mirror.flush()).toBe(true);
    expect(written).toEqual(['p@1']);
  });
});
