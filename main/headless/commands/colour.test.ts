import { describe, expect, it } from 'vitest';
import pipeline from '../../../core/testing/colour/pipeline.json';
import type { CommandIo } from '../command';
import { colour } from './colour';

const run = (content: unknown): Promise<unknown> => {
  const io: CommandIo = {
    readBytes: () => Promise.reject(new Error('not used')),
    readText: () => Promise.reject(new Error('not used')),
    readJson: () => Promise.resolve(content),
    note: () => undefined,
  };
  return colour.run({ operands: ['bands.json'], options: new Map() }, io);
};

const views = ['D65', 'A', 'D50', 'F11', 'LED-B3'].flatMap((lamp) => [`${lamp}_2deg`, `${lamp}_10deg`]);

describe('colour', () => {
  it('answers every case under five lamps and two observers, whether bare or in an object', async () => {
    const cases = pipeline.cases.map(({ case: entry }) => entry);
    const answer = (await run(cases)) as {
      id: string;
      results: Record<string, { XYZ: number[]; hex: string }>;
    }[];
    expect(answer.map(({ id }) => id)).toEqual(cases.map(({ id }) => id));
    for (const { results } of answer) expect(Object.keys(results)).toEqual(views);
    const [{ expected }] = pipeline.cases as unknown as [{ expected: Record<string, { XYZ: number[] }> }];
    answer[0]!.results.D65_2deg!.XYZ.forEach((value, index) =>
      expect(value).toBeCloseTo(expected.D65_2deg!.XYZ[index]!, 3),
    );
    expect(await run({ cases })).toEqual(answer);
  });

  const good = { id: 'good', kind: 'solution', bands: [], conc: 1, path_cm: 1 };
  const band = { centre_cm1: 20_000, fwhm_cm1: 3_000, eps: 10 };
  it.each([
    ['a negative concentration', { conc: -0.1 }, 'out-of-range', 'conc'],
    ['a path of 0', { path_cm: 0 }, 'out-of-range', 'path_cm'],
    ['no path', { path_cm: undefined }, 'missing-field', 'path_cm'],
    ['a concentration in words', { conc: '10 mM' }, 'wrong-type', 'conc'],
    ['a number beyond all bounds', { conc: Infinity }, 'not-finite', 'conc'],
    ['a width of 0', { bands: [band, { ...band, fwhm_cm1: 0 }] }, 'out-of-range', 'bands[1].fwhm_cm1'],
    ['a negative absorptivity', { bands: [{ ...band, eps: -1 }] }, 'out-of-range', 'bands[0].eps'],
    ['bands that are no list', { bands: 'none' }, 'wrong-type', 'bands'],
    ['an unknown kind', { kind: 'film' }, 'unknown-field-value', 'kind'],
    ['too many bands', { bands: Array.from({ length: 1001 }, () => band) }, 'too-large', 'bands'],
    ['a powder without scale', { kind: 'powder' }, 'missing-field', 'scale'],
  ])('answers %s with an error of that entry only', async (_what, change, code, field) => {
    const answer = (await run([{ ...good, id: 'bad', ...change }, good])) as Record<string, unknown>[];
    expect(answer[0]).toEqual({
      id: 'bad',
      error: { code, field, message: expect.any(String) as string },
    });
    expect(answer[1]).toHaveProperty('results.D65_2deg.hex', '#ffffff');
  });

  it('refuses an empty list', async () => {
    await expect(run([])).rejects.toMatchObject({ code: 'empty-input' });
  });
});
