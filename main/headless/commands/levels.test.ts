import { describe, expect, it } from 'vitest';
import type { CommandIo } from '../command';
import { levels } from './levels';

interface Answer {
  readonly id?: string;
  readonly levels?: {
    energy_cm1: number;
    degeneracy: number;
    multiplicity: number | null;
    label: string | null;
  }[];
  readonly error?: { code: string; message: string; field: string };
}

const run = async (input: unknown, ...flags: string[]): Promise<Answer[]> => {
  const refuse = () => Promise.reject(new Error('not used'));
  const io: CommandIo = {
    readJson: () => Promise.resolve(input),
    readBytes: refuse,
    readText: refuse,
    note: () => {},
  };
  const options = new Map(flags.map((flag) => [flag, true] as const));
  return (await levels.run({ operands: ['levels.json'], options }, io)) as Answer[];
};

const chromium = { id: 'cr', dElectrons: 3, B: 725, C: 2900, field: { type: 'oct', tenDq: 17_400 } };

describe('levels', () => {
  it('puts the first spin-allowed band of an octahedral d3 ion at 10Dq (Tanabe and Sugano 1954)', async () => {
    const [answer] = await run([chromium]);
    expect(answer!.id).toBe('cr');
    expect(answer!.levels![0]).toEqual({ energy_cm1: 0, degeneracy: 4, multiplicity: 4, label: 'A2g' });
    expect(
      answer!.levels!.find(({ multiplicity, label }) => multiplicity === 4 && label === 'T2g'),
    ).toMatchObject({
      degeneracy: 12,
      energy_cm1: expect.closeTo(17_400, 6) as number,
    });
  });

  it('names the levels of the double group with spin-orbit coupling, or none on request', async () => {
    const [named, unnamed] = await run({
      cases: [
        { ...chromium, zeta: 270 },
        { ...chromium, zeta: 270, labelGroup: null },
      ],
    });
    expect(named!.levels![0]).toMatchObject({ degeneracy: 4, multiplicity: null, label: 'G8' });
    expect(unnamed!.levels!.every(({ label }) => label === null)).toBe(true);
  });

  it('names the levels of lower groups too, by request or as the field has it', async () => {
    const trigonal = { type: 'trigonal', tenDq: 17_400, Dsigma: 200, Dtau: 100 };
    const [own, asked, foreign] = await run([
      { ...chromium, field: trigonal },
      { ...chromium, field: trigonal, labelGroup: 'C3' },
      { ...chromium, field: trigonal, labelGroup: 'C4v' },
    ]);
    expect(own!.levels![0]).toMatchObject({ degeneracy: 4, multiplicity: 4, label: 'A2g' });
    expect(asked!.levels![0]).toMatchObject({ degeneracy: 4, multiplicity: 4, label: 'A' });
    expect(foreign!.levels!.every(({ label }) => label === null)).toBe(true);
  });

  it('accounts for each level on request: 4T2g of d3 from 4F, one electron from t2g to eg', async () => {
    const [answer] = await run([chromium], 'account');
    const band = answer!.levels!.find(({ multiplicity, label }) => multiplicity === 4 && label === 'T2g');
    expect(band).toMatchObject({
      electronJump: 1,
      freeIon: [{ label: '4F', weight: expect.closeTo(1, 9) as number }],
      cubic: [{ label: '4T2g' }],
      configurations: [{ configuration: 't2g^2 eg^1', weight: expect.closeTo(1, 9) as number }],
    });
  });

  it('answers a bad entry with code and field and leaves the others alone', async () => {
    const ligand = { theta: 0, phi: 0, psi: 0, e_sigma: 1000, e_pi_x: 0, e_pi_y: 0 };
    const bad: [Record<string, unknown>, string, string][] = [
      [{ dElectrons: 10 }, 'out-of-range', 'dElectrons'],
      [{ dElectrons: undefined }, 'missing-field', 'dElectrons'],
      [{ B: -1 }, 'out-of-range', 'B'],
      [{ C: 'much' }, 'wrong-type', 'C'],
      [{ zeta: -5 }, 'out-of-range', 'zeta'],
      [{ field: undefined }, 'missing-field', 'field'],
      [{ labelGroup: 'heptagon' }, 'unknown-field-value', 'labelGroup'],
      [{ field: { type: 'heptagon' } }, 'unknown-field-value', 'field.type'],
      [{ field: { type: 'oct', tenDq: Number.NaN } }, 'not-finite', 'field.tenDq'],
      [{ field: { type: 'aom', ligands: [] } }, 'missing-field', 'field.ligands'],
      [
        { field: { type: 'aom', ligands: [ligand, { ...ligand, theta: 20 }] } },
        'ligands-too-close',
        'field.ligands[1]',
      ],
      [
        {
          field: {
            type: 'matrix',
            matrix: [1, 2, 3, 4, 5].map((a) => [1, 2, 3, 4, 5].map((b) => a * 10 + b)),
          },
        },
        'not-symmetric',
        'field.matrix[1][0]',
      ],
    ];
    const answers = await run([...bad.map(([change]) => ({ ...chromium, ...change })), chromium]);
    bad.forEach(([, code, field], i) => expect(answers[i]!.error).toMatchObject({ code, field }));
    expect(answers.at(-1)!.levels).toHaveLength(20);
  });
});
