import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { emptyContent, writeBundle } from '../../../core/record/bundle';
import type { CommandIo } from '../command';
import { recalibrate } from './recalibrate';

// Published complexes with their sources: core/testing/measured. One in three is enough here and quicker.
const whole = JSON.parse(
  readFileSync(join(import.meta.dirname, '../../../core/testing/measured/data/published.json'), 'utf8'),
) as { complexes: { id: string; useForTuning: boolean }[] };
const published = { ...whole, complexes: whole.complexes.filter((_, i) => i % 3 === 0) };

interface Answer {
  readonly learnedFrom: readonly string[];
  readonly checkedOn: readonly string[];
  readonly adopted: boolean;
  readonly parts: readonly { readonly adopt: boolean; readonly statement: string }[];
  readonly values: Record<string, unknown>;
  readonly hash: string;
}

const run = async (input: unknown, options: Record<string, string | true> = {}): Promise<Answer> => {
  const refuse = () => Promise.reject(new Error('not used'));
  const io: CommandIo = {
    readJson: () => Promise.resolve(input),
    readBytes: refuse,
    readText: refuse,
    note: () => {},
  };
  const asked = { operands: ['record.json'], options: new Map(Object.entries(options)) };
  return (await recalibrate.run(asked, io)) as Answer;
};

describe('recalibrate', () => {
  it('learns from no complex that is held out', async () => {
    const { learnedFrom, checkedOn } = await run(published, { half: true });
    const held = new Set(published.complexes.filter((each) => !each.useForTuning).map(({ id }) => id));
    expect([...learnedFrom, ...checkedOn].filter((id) => held.has(id))).toEqual([]);
    expect(held.size).toBeGreaterThan(5);
    expect(learnedFrom.length).toBeGreaterThan(2);
    expect(learnedFrom.filter((id) => checkedOn.includes(id))).toEqual([]);
  });

  it('draws the same half for the same seed and another for another', async () => {
    const [one, again, other] = await Promise.all(
      ['1', '1', '2'].map((seed) => run(published, { half: true, seed })),
    );
    expect(again).toEqual(one);
    expect(other!.learnedFrom).not.toEqual(one!.learnedFrom);
  });

  it('says of each part why it is proposed or declined, and proposes no value of a declined part', async () => {
    const { parts, adopted, values } = await run(published, { half: true });
    for (const { adopt, statement } of parts) expect(statement).toMatch(adopt ? /^proposed/ : /declined|few/);
    if (!adopted) expect(values).toEqual({});
  });

  it('names an exported project in which nothing was fitted, with the way out', async () => {
    const bundle = JSON.parse(writeBundle(emptyContent())) as unknown;
    await expect(run(bundle)).rejects.toMatchObject({
      message: expect.stringMatching(/record\.json: no measurement .* field fit/) as string,
      remedy: expect.stringContaining('fit the field') as string,
    });
  });

  it('refuses a seed that is no whole number and a file without complexes, naming them', async () => {
    await expect(run(published, { seed: 'x' })).rejects.toMatchObject({ field: '--seed' });
    await expect(run({})).rejects.toMatchObject({
      message: expect.stringContaining('record.json') as string,
    });
  });
});
