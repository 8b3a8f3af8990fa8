// @vitest-environment node
import { describe, expect, it } from 'vitest';
import type { FromSearch, SearchState, ShownResult, ToSearch } from '../../../workers/search/protocol';
import { SearchRun } from './searchRun';
import { goesOnFrom, type OpenSearch, SearchRuns } from './searchRuns';

class QuietWorker {
  readonly heard: ToSearch[] = [];
  ended = false;
  onmessage: ((event: MessageEvent<FromSearch>) => void) | null = null;
  onerror: ((event: ErrorEvent) => void) | null = null;
  postMessage(message: ToSearch): void {
    this.heard.push(message);
  }
  terminate(): void {
    this.ended = true;
  }
  say(data: FromSearch): void {
    this.onmessage?.({ data } as MessageEvent<FromSearch>);
  }
}

const found = { id: 'a', probability: 0.5 } as unknown as ShownResult;
const state = (evaluated: number, results: SearchState['results']): SearchState => ({
  count: 10,
  evaluated,
  skipped: 0,
  rate: 1,
  results,
});
const wish = { name: 'w', spin: 'low' as const };

function setup() {
  const workers: QuietWorker[] = [];
  const runs = new SearchRuns(
    (given) =>
      new SearchRun(given, () => {
        const worker = new QuietWorker();
        workers.push(worker);
        return worker as never;
      }),
  );
  return { workers, runs };
}

describe('searches of a window', () => {
  it('run beside each other, each with its own results', () => {
    const { runs, workers } = setup();
    const one = runs.start('p', wish, null);
    const other = runs.start('p', wish, null);
    workers[0]!.say({ kind: 'progress', state: state(3, [found]), finished: false });
    workers[1]!.say({ kind: 'progress', state: state(10, []), finished: true });
    expect([one.phase, other.phase]).toEqual(['running', 'finished']);
    expect([one.results.length, other.results.length]).toEqual([1, 0]);
    expect(runs.of('p')).toEqual([one, other]);
    expect(runs.of('q')).toEqual([]);
  });

  it('keep their list where a report brings no new one', () => {
    const { runs, workers } = setup();
    const run = runs.start('p', wish, null);
    workers[0]!.say({ kind: 'progress', state: state(3, [found]), finished: false });
    workers[0]!.say({ kind: 'progress', state: state(6, null), finished: false });
    expect(run.results).toEqual([found]);
    expect(run.state?.evaluated).toBe(6);
    const better = { id: 'b', probability: 0.6 } as unknown as ShownResult;
    workers[0]!.say({ kind: 'progress', state: state(7, [better, 'a']), finished: false });
    expect(run.results).toEqual([better, found]);
  });

  it('go on from where they were stopped, in a worker of their own', () => {
    const { runs, workers } = setup();
    const run = runs.start('p', wish, null);
    workers[0]!.say({ kind: 'progress', state: state(3, [found]), finished: false });
    run.stop();
    expect([run.phase, workers[0]!.ended]).toEqual(['stopped', true]);
    // What was under way when it ended is not heard any more.
    workers[0]!.say({ kind: 'progress', state: state(9, []), finished: false });
    expect(run.state?.evaluated).toBe(3);
    run.resume();
    expect(workers[1]!.heard[0]).toMatchObject({
      kind: 'start',
      from: { evaluated: 3, skipped: 0, results: [{ id: 'a' }] },
    });
  });

  it('that were open when the window closed are offered by the next one', async () => {
    const first = setup();
    let notes: readonly OpenSearch[] = [];
    const notebook = {
      read: () => Promise.resolve(notes),
      write: (open: OpenSearch[]) => {
        notes = JSON.parse(JSON.stringify(open)) as OpenSearch[];
        return Promise.resolve();
      },
    };
    await first.runs.open(notebook);
    first.runs.start('p', wish, null);
    first.workers[0]!.say({ kind: 'progress', state: state(3, [found]), finished: false });
    const finished = first.runs.start('p', { ...wish, name: 'done' }, null);
    first.workers[1]!.say({ kind: 'progress', state: state(10, []), finished: true });
    expect(finished.open).toBe(false);
    first.runs.start('q', { ...wish, name: 'elsewhere' }, null);

    const second = setup();
    await second.runs.open(notebook);
    expect(second.runs.leftOver('p').map((each) => each.wish.name)).toEqual(['w']);
    // The parameters have changed since: what was found with the old ones does not count.
    const other = { name: 'mine', values: { 'ligand.en.f': 1.3 } } as never;
    expect(goesOnFrom(second.runs.leftOver('p')[0]!, other)).toBeNull();
    expect(goesOnFrom(second.runs.leftOver('p')[0]!, null)).toMatchObject({ evaluated: 3 });
    const again = second.runs.takeUp(second.runs.leftOver('p')[0]!, null);
    expect(second.runs.leftOver('p')).toEqual([]);
    expect(again.setup.wish).toEqual(wish);
    expect(second.runs.leftOver('q')).toHaveLength(1);
  });
});
