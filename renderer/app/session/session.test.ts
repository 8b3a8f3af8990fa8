// @vitest-environment node
import { describe, expect, it, vi } from 'vitest';
import type { CandidateInput } from '../../../core/record/composition';
import { hexaammine, testStore } from '../../store/testing/testStore';
import type { CandidateSummary } from '../../workers/estimateSummary';
import { CandidateRows } from './candidateRows';
import { Estimates } from './estimates';

const until = (condition: () => boolean): Promise<void> =>
  vi.waitFor(() => {
    if (!condition()) throw new Error('not yet');
  });

async function project(count: number) {
  const { store } = await testStore();
  const { id } = await store.projects.create('Liquid filter');
  const rows = await store.candidates.create(
    id,
    Array.from({ length: count }, () => hexaammine('Cr')),
  );
  return { store, id, rows };
}

describe('the rows of a project', () => {
  it('are read whole and follow edits, deletions and undo without being read again', async () => {
    const { store, id, rows: made } = await project(5);
    const rows = new CandidateRows(store, id);
    const stop = rows.start();
    await until(() => rows.state === 'ready');
    expect(rows.values().map((row) => row.id)).toEqual(made.map((row) => row.id));
    const reading = vi.spyOn(store.candidates, 'inPortions');
    await store.candidates.update(made[0]!, 'star', { starred: true });
    expect(rows.get(made[0]!.id)?.starred).toBe(true);
    await store.candidates.remove(id, [made[1]!.id]);
    expect(rows.size).toBe(4);
    await store.journal.undo(id);
    expect(rows.size).toBe(5);
    expect(reading).not.toHaveBeenCalled();
    stop();
  });

  it('leave out what makes no sense, count it, and leave it in the database', async () => {
    const { store, id, rows: made } = await project(2);
    await store.db.candidates.update(made[0]!.id, { composition: 'damaged' as never });
    const rows = new CandidateRows(store, id);
    const stop = rows.start();
    await until(() => rows.state === 'ready');
    expect(rows.size).toBe(1);
    expect(rows.unreadable).toBe(1);
    expect(await store.db.candidates.count()).toBe(2);
    stop();
  });

  it('say why when they cannot be read', async () => {
    const { store, id } = await project(1);
    store.db.candidates.hook('reading', () => {
      throw new Error('bad sector');
    });
    const rows = new CandidateRows(store, id);
    const stop = rows.start();
    await until(() => rows.state !== 'reading');
    expect(rows.state).toBe('failed');
    expect(rows.error?.message).toContain('bad sector');
    stop();
  });
});

const refusal: CandidateSummary = { ok: false, problems: [] };

function setup(stored: (key: string) => CandidateSummary | undefined = () => undefined) {
  const asked: string[] = [];
  const written: string[] = [];
  const pool = {
    many: async (
      inputs: readonly CandidateInput[],
      _overlay: unknown,
      take: (all: [string, CandidateSummary][]) => void,
    ) => {
      asked.push(...inputs.map(({ id }) => id));
      take(inputs.map(({ id }) => [id, refusal]));
    },
  };
  const cache = {
    read: async (keys: readonly string[]) => keys.map(stored),
    write: async (rows: readonly { key: string }[]) => void written.push(...rows.map(({ key }) => key)),
  };
  const estimates = new Estimates({
    pool: pool as never,
    cache,
    conditions: { concentration_mM: 10, path_cm: 1 },
    overlay: null,
    madeWith: 'model 1',
  });
  return { estimates, asked, written };
}

describe('estimates of a project', () => {
  it('ask once for like candidates, and again where composition or strength changed', async () => {
    const { rows } = await project(3);
    const { estimates, asked, written } = setup();
    estimates.want(rows);
    await until(() => estimates.progress === null);
    expect(asked).toHaveLength(1);
    expect(written).toEqual(asked);
    expect(rows.every(({ id }) => estimates.of(id) === refusal)).toBe(true);
    estimates.want([{ ...rows[0]!, concentration_mM: 50 }]);
    await until(() => estimates.progress === null);
    expect(asked).toHaveLength(2);
    estimates.want(rows);
    expect(asked).toHaveLength(2);
  });

  it('take what the cache holds and compute nothing for it', async () => {
    const { rows } = await project(1);
    const { estimates, asked } = setup(() => refusal);
    estimates.want(rows);
    await until(() => estimates.of(rows[0]!.id) !== undefined);
    expect(asked).toEqual([]);
  });

  it('name the model in every key, so that another model never answers', async () => {
    const { rows } = await project(1);
    const { estimates, asked } = setup();
    estimates.want(rows);
    await until(() => estimates.progress === null);
    expect(asked[0]).toContain('model 1');
  });
});
