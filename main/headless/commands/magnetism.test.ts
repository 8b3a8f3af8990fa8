import { describe, expect, it } from 'vitest';
import { jsonIo } from '../../testing/jsonIo';
import { magnetism } from './magnetism';

interface Answer {
  readonly id?: string;
  readonly chi_xyz_cm3_mol: [number, number, number][];
  readonly muEff_BM: number[];
  readonly gPrincipal: [number, number, number] | null;
  readonly zeroFieldSplitting: { D_cm1: number; E_cm1: number } | null;
  readonly error?: { code: string; field: string };
}

const run = async (input: unknown): Promise<Answer[]> =>
  (await magnetism.run({ operands: ['magnetism.json'], options: new Map() }, jsonIo(input))) as Answer[];

const copper = {
  ...{ id: 'cu', dElectrons: 9, zeta: 0, field: { type: 'tetragonal', tenDq: 12_000, Ds: 800, Dt: 300 } },
  ...{ orbitalReduction: 1, ge: 2, temperatures_K: [100, 300] },
};

describe('magnetism', () => {
  it('gives the spin-only moment 1.73 and g = 2 of a d9 ion without spin-orbit coupling (common practice)', async () => {
    const [{ id, muEff_BM, gPrincipal, zeroFieldSplitting, chi_xyz_cm3_mol }] = (await run([copper])) as [
      Answer,
    ];
    expect(id).toBe('cu');
    expect(gPrincipal!.map((g) => g.toFixed(6))).toEqual(['2.000000', '2.000000', '2.000000']);
    // 0.01 of the moment at 300 K is temperature-independent paramagnetism.
    expect(muEff_BM[0]).toBeCloseTo(Math.sqrt(3), 1);
    expect(chi_xyz_cm3_mol).toHaveLength(2);
    expect(zeroFieldSplitting).toBeNull();
  });

  it('gives D of a tetragonal Ni(II) ion and no g for even electrons', async () => {
    const nickel = { ...copper, dElectrons: 8, B: 900, C: 3800, zeta: 600 };
    const [{ gPrincipal, zeroFieldSplitting }] = (await run([nickel])) as [Answer];
    expect(gPrincipal).toBeNull();
    expect(Math.abs(zeroFieldSplitting!.D_cm1)).toBeGreaterThan(0.1);
    expect(zeroFieldSplitting!.E_cm1).toBeCloseTo(0, 6);
  });

  it('measures in a field where one is given', async () => {
    const [weak, strong] = await run([
      { ...copper, temperatures_K: [2] },
      { ...copper, temperatures_K: [2], field_T: 7 },
    ]);
    expect(strong!.chi_xyz_cm3_mol[0]![2]).toBeLessThan(0.6 * weak!.chi_xyz_cm3_mol[0]![2]);
  });

  it('understands the spelling of the computed cases', async () => {
    const { orbitalReduction: _k, ge: _g, temperatures_K: _t, ...plain } = copper;
    const block = { magnetic: { k: 1, ge: 2, T_K: [100, 300] } };
    const [straight, nested] = await run([copper, { ...plain, ...block }]);
    expect(nested!.muEff_BM).toEqual(straight!.muEff_BM);
  });

  it('answers a bad entry with code and field and leaves the others alone', async () => {
    const bad: [Record<string, unknown>, string, string][] = [
      [{ temperatures_K: undefined }, 'missing-field', 'temperatures_K'],
      [{ temperatures_K: [300, -1] }, 'out-of-range', 'temperatures_K[1]'],
      [{ temperatures_K: ['hot'] }, 'wrong-type', 'temperatures_K[0]'],
      [{ ge: 'two' }, 'wrong-type', 'ge'],
      [{ orbitalReduction: -0.5 }, 'out-of-range', 'orbitalReduction'],
      [{ field_T: -1 }, 'out-of-range', 'field_T'],
      [{ dElectrons: 10, B: 900, C: 3800 }, 'out-of-range', 'dElectrons'],
    ];
    const answers = await run([...bad.map(([change]) => ({ ...copper, ...change })), copper]);
    bad.forEach(([, code, field], i) => expect(answers[i]!.error).toMatchObject({ code, field }));
    expect(answers.at(-1)!.muEff_BM).toHaveLength(2);
  });
});
