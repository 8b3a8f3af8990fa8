import { describe, expect, it } from 'vitest';
import type { CommandIo } from '../command';
import { agreement } from './agreement';

const run = (input: unknown, ...flags: string[]): Promise<unknown> => {
  const refuse = () => Promise.reject(new Error('not used'));
  const io: CommandIo = {
    readJson: () => Promise.resolve(input),
    readBytes: refuse,
    readText: refuse,
    note: () => {},
  };
  return agreement.run(
    { operands: ['measured.json'], options: new Map(flags.map((flag) => [flag, true as const])) },
    io,
  );
};

// Bands of the hexaaqua ion from memory of B. N. Figgis and M. A. Hitchman (2000).
const set = {
  complexes: [
    {
      id: 'cr-aqua',
      formula: '[Cr(H2O)6]3+',
      metal: 'Cr',
      oxidationState: 3,
      geometry: 'octahedral',
      ligands: { h2o: 6 },
      bands: [
        { energy_cm1: 17_400, epsilon: 13, assignment: '4A2g -> 4T2g', kind: 'spin-allowed', feature: 'max' },
        {
          energy_cm1: 24_600,
          epsilon: 15,
          assignment: '4A2g -> 4T1g(F)',
          kind: 'spin-allowed',
          feature: 'max',
        },
      ],
      published: { tenDq: 17_400, racahB: 725 },
      groundSpin: 'only',
      medium: 'water',
      useForTuning: false,
    },
  ],
};

describe('agreement', () => {
  it('prints predicted beside measured and the figures for both halves', async () => {
    const text = (await run(set)) as string;
    expect(text).toMatch(/cr-aqua\s+17400\s+17400\s+0.0 %/);
    expect(text).toMatch(/Held out, for testing only: 1 complexes/);
    expect(text).toMatch(/May inform parameters: 0 complexes/);
    expect(text).not.toMatch(/NaN|undefined/);
  });

  it('gives each complex and the reports as data with --json', async () => {
    const { complexes, reports } = (await run(set, 'json')) as {
      complexes: { id: string; bands: unknown[] }[];
      reports: Record<string, { complexes: number }>;
    };
    expect(complexes[0]).toMatchObject({ id: 'cr-aqua' });
    expect(complexes[0]!.bands).toHaveLength(2);
    expect(reports.heldOut!.complexes).toBe(1);
    expect(reports.tuning!.complexes).toBe(0);
  });

  it('refuses a file without complexes, naming it', async () => {
    await expect(run({})).rejects.toMatchObject({
      message: expect.stringContaining('measured.json') as string,
    });
  });
});
