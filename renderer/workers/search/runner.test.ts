import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../../core/library';
import type { FromSearch, SearchState, ShownResult, ToSearch } from './protocol';
import { SearchRunner } from './runner';

const wish = {
  name: 'blue or violet',
  ions: ['Ni2+'],
  geometries: ['octahedral'],
  ligands: { allow: ['h2o', 'nh3', 'en'] },
  bands: [{ from_nm: 540, to_nm: 580 }],
};

function runner() {
  const posted: FromSearch[] = [];
  let tell: () => void = () => undefined;
  const running = new SearchRunner(
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
  return { running, posted, until };
}

const startOf = (given: unknown, from: Extract<ToSearch, { kind: 'start' }>['from'] = null): ToSearch => ({
  kind: 'start',
  wish: given,
  overlay: null,
  top: 5,
  from,
});

const states = (posted: readonly FromSearch[]): SearchState[] =>
  posted.flatMap((message) => (message.kind === 'progress' ? [message.state] : []));

const finished = (posted: readonly FromSearch[]) => posted.some((m) => m.kind === 'progress' && m.finished);

/** The last list, put together from all reports. */
function lastList(posted: readonly FromSearch[]): readonly ShownResult[] {
  const known = new Map<string, ShownResult>();
  let list: readonly ShownResult[] = [];
  for (const { results } of states(posted)) {
    if (results === null) continue;
    for (const each of results) if (typeof each !== 'string') known.set(each.id, each);
    list = results.map((each) => (typeof each === 'string' ? known.get(each)! : each));
  }
  return list;
}

describe('the search beside the window', () => {
  it('counts, runs to the end and hands over rows ready to be shown', async () => {
    const { running, posted, until } = runner();
    running.handle({ kind: 'count', job: 7, wish, overlay: null });
    running.handle(startOf(wish));
    await until(() => finished(posted));
    const counted = posted.find((m) => m.kind === 'answer');
    const last = states(posted).at(-1)!;
    expect(counted).toEqual({ kind: 'answer', job: 7, reply: { kind: 'counted', count: last.count } });
    expect(last.evaluated + last.skipped).toBe(last.count);
    expect(lastList(posted).length).toBeGreaterThan(0);
    expect(lastList(posted)[0]!.summary.ok).toBe(true);
  });

  it('refuses a wish that contradicts itself before it starts', () => {
    const { running, posted } = runner();
    running.handle(startOf({ ...wish, ions: ['Zz9+'] }));
    expect(posted).toMatchObject([{ kind: 'refused', problems: [{ field: 'ions[0]' }] }]);
  });

  it('loses nothing when it is paused and resumed', async () => {
    const { running, posted, until } = runner();
    running.handle(startOf(wish));
    running.handle({ kind: 'pause' });
    await new Promise((resolve) => setTimeout(resolve, 60));
    running.handle({ kind: 'resume' });
    await until(() => finished(posted));
    const last = states(posted).at(-1)!;
    expect(last.evaluated + last.skipped).toBe(last.count);
  });

  it('goes on from what another worker left, with the same list at the end', async () => {
    const whole = runner();
    whole.running.handle(startOf(wish));
    await whole.until(() => finished(whole.posted));
    const again = runner();
    const { evaluated, skipped } = states(whole.posted).at(-1)!;
    const left = lastList(whole.posted).map(({ summary: _, ...result }) => result);
    again.running.handle(startOf(wish, { evaluated, skipped, results: left }));
    await again.until(() => finished(again.posted));
    const end = states(again.posted).at(-1)!;
    expect([end.evaluated, end.skipped]).toEqual([evaluated, skipped]);
    expect(lastList(again.posted)).toEqual(lastList(whole.posted));
  });

  it('says of one complex how far it meets the wish, part by part', () => {
    const { running, posted } = runner();
    const composition = {
      metal: 'Ni',
      oxidationState: 2,
      geometry: 'octahedral',
      ligands: { en: 3 },
    } as const;
    running.handle({ kind: 'score', job: 1, wish, overlay: null, composition });
    expect(posted).toMatchObject([
      { kind: 'answer', reply: { kind: 'scored', scored: { score: { parts: [{ part: 'bands[0]' }] } } } },
    ]);
    running.handle({
      kind: 'score',
      job: 3,
      wish: { ...wish, ions: ['Cr3+'], charge: { min: -1, max: 0 } },
      overlay: null,
      composition,
    });
    expect(posted.pop()).toMatchObject({
      reply: { scored: { exclusions: [{ part: 'ions' }, { part: 'charge' }] } },
    });
    running.handle({
      kind: 'score',
      job: 2,
      wish,
      overlay: null,
      composition: { ...composition, ligands: { en: 4 } },
    });
    expect(posted[1]).toMatchObject({
      reply: { kind: 'refused', problems: [{ code: 'coordination-number' }] },
    });
  });

  it('says which part to give up, and which field would do it', () => {
    const { running, posted } = runner();
    const narrow = { ...wish, bands: [{ from_nm: 300, to_nm: 301 }], spin: 'low' };
    running.handle({ kind: 'relax', job: 1, wish: { ...narrow, ions: ['Fe2+'] }, overlay: null });
    expect(posted.pop()).toMatchObject({ reply: { kind: 'advice', relaxations: [{ part: 'bands[0]' }] } });
    running.handle({
      kind: 'needed',
      job: 2,
      wish,
      overlay: null,
      ion: 'Ni2+',
      geometry: 'octahedral',
      band: 0,
    });
    // The second spin-allowed band of nickel(II) with three en lies at 18 350 cm-1, its 10Dq at 11 500
    // (Figgis and Hitchman 2000, from memory): the field asked for includes it.
    const reply = posted.pop();
    if (reply?.kind !== 'answer' || reply.reply.kind !== 'needed') throw new Error('no fields');
    const second = reply.reply.fields.find(({ band, tenDq }) => band === '3T1g' && tenDq[0] > 8000)!;
    expect(second.tenDq[0]).toBeLessThan(11_500);
    expect(second.ligands.map(({ id }) => id)).toContain('en');
  });
});
