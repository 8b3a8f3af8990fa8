import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../../core/library';
import type { FromSearch } from './protocol';
import { SearchRunner } from './runner';

const wish = {
  name: 'blue or violet',
  ions: ['Ni2+'],
  geometries: ['octahedral'],
  ligands: { allow: ['h2o', 'nh3', 'en'] },
  bands: [{ from_nm: 540, to_nm: 580 }],
};

function start() {
  const posted: FromSearch[] = [];
  let tell: () => void = () => undefined;
  const runner = new SearchRunner(
    (message) => {
      posted.push(message);
      tell();
    },
    () => defaultLibrary,
  );
  const until = (enough: () => boolean): Promise<void> =>
    new Promise((resolve) => {
      tell = () => enough() && resolve();
      tell();
    });
  return { runner, posted, until };
}

const finished = (posted: readonly FromSearch[]) => posted.some((m) => m.kind === 'progress' && m.finished);

describe('the search beside the window', () => {
  it('counts, runs to the end and hands over rows ready to be shown', async () => {
    const { runner, posted, until } = start();
    runner.handle({ kind: 'count', wish, overlay: null });
    runner.handle({ kind: 'start', wish, overlay: null, top: 5 });
    await until(() => finished(posted));
    const counted = posted.find((m) => m.kind === 'counted')!;
    const last = posted.at(-1)!;
    if (last.kind !== 'progress') throw new Error('no progress');
    expect(last.state.count).toBe(counted.count);
    expect(last.state.evaluated + last.state.skipped).toBe(counted.count);
    expect(last.state.results.length).toBeGreaterThan(0);
    expect(last.state.results[0]!.summary.ok).toBe(true);
  });

  it('refuses a wish that contradicts itself before it starts', () => {
    const { runner, posted } = start();
    runner.handle({ kind: 'start', wish: { ...wish, ions: ['Zz9+'] }, overlay: null, top: 5 });
    expect(posted).toMatchObject([{ kind: 'refused', problems: [{ field: 'ions[0]' }] }]);
  });

  it('loses nothing when it is paused and resumed', async () => {
    const { runner, posted, until } = start();
    runner.handle({ kind: 'start', wish, overlay: null, top: 5 });
    runner.handle({ kind: 'pause' });
    await new Promise((resolve) => setTimeout(resolve, 60));
    runner.handle({ kind: 'resume' });
    await until(() => finished(posted));
    const last = posted.at(-1)!;
    expect(last.kind === 'progress' && last.state.evaluated + last.state.skipped).toBe(
      last.kind === 'progress' && last.state.count,
    );
  });
});
