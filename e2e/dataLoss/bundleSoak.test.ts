import { beforeAll, describe, expect, it } from 'vitest';
import { bundleLimits, readBundle, writeBundle } from '../../core/record/bundle';
import type { Store } from '../../renderer/store';
import { testStore } from '../../renderer/store/testing/testStore';
import { readImport } from '../../renderer/app/exchange/readImport';
import { soakBundles } from './bundleSoak';
import { wholeBundle, wholeContent } from './wholeBundle';

let store: Store;
beforeAll(async () => {
  ({ store } = await testStore());
  await store.projects.create('Here already');
});

const refused = (text: string) => {
  const reading = readBundle(text);
  return reading.ok ? [] : reading.problems.map(({ code, field }) => `${code} at ${field}`);
};
const edited = (edit: (bundle: { content: Record<string, Record<string, unknown>[]> }) => void): string => {
  const bundle = JSON.parse(wholeBundle) as Parameters<typeof edit>[0];
  edit(bundle);
  return JSON.stringify(bundle);
};

describe('hostile project bundles', () => {
  it('the bundle that is mutated is itself whole, with rows in every table', () => {
    const reading = readBundle(wholeBundle);
    expect(reading.ok).toBe(true);
    expect(Object.values(wholeContent).every((rows) => rows.length > 0)).toBe(true);
  });

  it('2 000 mutated bundles and wishes change nothing, throw nothing, and every refusal names its place (sample of the long run)', async () => {
    const report = await soakBundles(2000, 1, store);
    expect(report.faults).toEqual([]);
    expect(report.refused).toBeGreaterThan(1000);
    expect(report.accepted).toBeGreaterThan(10);
  }, 120_000);

  it('a bundle cut at every kilobyte is refused', () => {
    for (let at = 0; at < wholeBundle.length - 2; at += 1000) {
      expect(readBundle(wholeBundle.slice(0, at)).ok, `cut at ${at}`).toBe(false);
    }
  });

  it('a bundle above the limit is refused before it is parsed', () => {
    const reading = readBundle(' '.repeat(20_000), { ...bundleLimits, bytes: 10_000 });
    expect(reading).toMatchObject({ ok: false, problems: [{ code: 'too-large' }] });
  });

  it('nesting of 1 000 levels is refused at its place, without running out of stack', () => {
    let deep: unknown = 1;
    for (let i = 0; i < 1000; i++) deep = [deep];
    const text = edited(({ content }) => (content.wishes![0]!.wish = { deep }));
    expect(refused(text)[0]).toMatch(/^too-large at content\.wishes\[0\]\.wish\.deep/);
  });

  it('an id that occurs twice, and a link that leads nowhere, are named', () => {
    expect(refused(edited(({ content }) => content.candidates!.push(content.candidates![0]!)))).toContain(
      'integrity at candidates[3].id',
    );
    expect(refused(edited(({ content }) => (content.samples![0]!.candidateId = 'gone')))).toContain(
      'integrity at samples.s1.candidateId',
    );
  });

  it('keys that reach for a prototype are refused and change no object', () => {
    const text = wholeBundle.replace('"wish":{', '"wish":{"__proto__":{"polluted":true},');
    expect(refused(text)[0]).toMatch(/__proto__/);
    expect(({} as Record<string, unknown>).polluted).toBeUndefined();
  });

  it('a path in the name of an attachment is refused', () => {
    for (const name of ['../../x.csv', '/etc/passwd', 'C:\\x.csv', 'a\u0000b']) {
      const text = edited(({ content }) => {
        const revisions = content.measurements![0]!.revisions as {
          content: { attachments: { name: string }[] };
        }[];
        revisions[0]!.content.attachments[0]!.name = name;
      });
      expect(refused(text)[0], name).toContain('measurements[0].revisions[0].content.attachments[0].name');
    }
  });

  it('negative, absurd and not finite numbers are refused by name', () => {
    expect(refused(edited(({ content }) => (content.candidates![0]!.path_cm = -1)))).toContain(
      'out-of-range at candidates[0].path_cm',
    );
    const infinite = wholeBundle.replace('"path_cm":1,', '"path_cm":1e999,');
    expect(refused(infinite)[0]).toBe('not-finite at content.candidates[0].path_cm');
  });

  it('a damaged bundle is offered for import only after its problems, and looking at it changes nothing', async () => {
    const rows = await store.db.projects.toArray();
    const text = edited(({ content }) => (content.candidates![0]!.notes = 5));
    const offer = await readImport(store, { name: 'x', bytes: new TextEncoder().encode(text) });
    expect(offer.problems[0]!.field).toBe('candidates[0].notes');
    expect(await store.db.projects.toArray()).toEqual(rows);
  });

  it('a large bundle (30 MB here) reads back equal in seconds', () => {
    const notes = 'x'.repeat(99_000);
    const many = writeBundle({
      ...wholeContent,
      candidates: Array.from({ length: 300 }, (_, i) => ({
        ...wholeContent.candidates![i % 3]!,
        id: `c${i}`,
        notes,
      })),
    });
    expect(many.length).toBeGreaterThan(29e6);
    const reading = readBundle(many);
    expect(reading.ok && reading.content.candidates).toHaveLength(300);
  });
});
