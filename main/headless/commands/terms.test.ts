import { describe, expect, it } from 'vitest';
import { jsonIo } from '../../testing/jsonIo';
import { terms } from './terms';

const run = (input: unknown): Promise<unknown> =>
  terms.run({ operands: ['terms.json'], options: new Map() }, jsonIo(input));

interface Answer {
  id?: string;
  microstates: number;
  configurations: {
    configuration: string;
    microstates: number;
    terms: { label: string; microstates: number }[];
  }[];
  error?: { code: string; message: string; field: string };
}

describe('terms', () => {
  it('gives 3T1g, 3T2g, 1T1g, 1T2g and 24 microstates for t2g1 eg1 (common practice)', async () => {
    const { configurations, microstates } = (await run({ dElectrons: 2, t2g: 1, eg: 1 })) as Answer;
    expect(microstates).toBe(24);
    expect(configurations[0]!.terms.map(({ label, microstates: n }) => `${label} ${n}`)).toEqual([
      '3T1g 9',
      '3T2g 9',
      '1T1g 3',
      '1T2g 3',
    ]);
  });

  it('lists every configuration of an ion, adding up to C(10, N)', async () => {
    const { configurations, microstates } = (await run({ dElectrons: 6 })) as Answer;
    expect(microstates).toBe(210);
    expect(configurations.map(({ configuration }) => configuration)).toEqual([
      't2g^6',
      't2g^5 eg^1',
      't2g^4 eg^2',
      't2g^3 eg^3',
      't2g^2 eg^4',
    ]);
  });

  it('answers each entry of an array by itself, a wrong one with its field', async () => {
    const answers = (await run([
      { id: 'a', t2g: 3 },
      { id: 'b', dElectrons: 4, t2g: 1, eg: 1 },
      { id: 'c', t2g: 9, eg: 0 },
      { id: 'd' },
    ])) as Answer[];
    expect(answers[0]).toMatchObject({ id: 'a', dElectrons: 3, microstates: 20 });
    expect(answers.slice(1).map(({ id, error }) => [id, error!.code, error!.field])).toEqual([
      ['b', 'out-of-range', 'dElectrons'],
      ['c', 'out-of-range', 't2g'],
      ['d', 'missing-field', 'dElectrons'],
    ]);
  });

  it('refuses an empty array', async () => {
    await expect(run([])).rejects.toThrow(/no entries/);
  });
});
