import { describe, expect, it } from 'vitest';
import type { CommandIo } from '../command';
import { estimate } from './estimate';

interface Entry {
  id: string;
  tenDq?: { value: number; sigma: number };
  spin?: { state: string; probabilityHigh: number | null; words: string };
  groundTerm?: string;
  bands?: Record<string, unknown>[];
  colour?: { srgb: string; lab: number[]; words: string };
  flags?: { code: string }[];
  measured?: unknown;
  error?: { code: string; message: string; field: string };
}

const notes: string[] = [];
const run = (input: unknown): Promise<Entry[]> => {
  const refuse = () => Promise.reject(new Error('not used'));
  const io: CommandIo = {
    readJson: () => Promise.resolve(input),
    readBytes: refuse,
    readText: refuse,
    note: (line) => notes.push(line),
  };
  return estimate.run({ operands: ['candidates.json'], options: new Map() }, io) as Promise<Entry[]>;
};

const good = { id: 'a', metal: 'Cr', oxidationState: 3, geometry: 'octahedral', ligands: { h2o: 6 } };

describe('estimate', () => {
  it('gives field, spin, term, bands and colour of each candidate', async () => {
    const [entry] = await run([{ ...good, concentration_mM: 50, path_cm: 1 }]);
    expect(entry!.tenDq!.value).toBeCloseTo(17_400, -2);
    expect(entry!.spin).toMatchObject({ state: 'only', probabilityHigh: null });
    expect(entry!.groundTerm).toBe('4A2g');
    expect(Object.keys(entry!.bands![0]!)).toEqual(
      expect.arrayContaining([
        'energy_cm1',
        'sigma_cm1',
        'wavelength_nm',
        'multiplicity',
        'label',
        'kind',
        'molarAbsorptivity',
        'width_cm1',
      ]),
    );
    expect(entry!.colour!.srgb).toMatch(/^#[0-9a-f]{6}$/);
    expect(entry!.colour!.lab).toHaveLength(3);
  });

  it('answers for one object as for an array of one', async () => {
    expect(await run(good)).toEqual(await run([good]));
  });

  it('names code, message and field of a candidate it cannot take and goes on with the others', async () => {
    const [bad, fine] = await run([{ ...good, ligands: { h2o: 5 } }, good]);
    expect(bad!.id).toBe('a');
    expect(bad!.error).toMatchObject({ code: 'coordination-number', field: '[0].ligands' });
    expect(fine!.error).toBeUndefined();
  });

  it('says "not estimated, because" instead of inventing a number', async () => {
    const [entry] = await run([{ ...good, metal: 'Co', ligands: { h: 6 } }]);
    expect(entry!.error!.code).toBe('not-estimated');
    expect(entry!.error!.message).toMatch(/^not estimated, because/);
  });

  it('answers an empty list with an empty list', async () => {
    expect(await run([])).toEqual([]);
  });

  it.each(['text', 7, null, true])('refuses %j as a whole', async (input) => {
    await expect(run(input)).rejects.toMatchObject({ code: 'wrong-type' });
  });

  it('answers for both of two candidates with one id, and says so', async () => {
    notes.length = 0;
    expect(await run([good, good])).toHaveLength(2);
    expect(notes[0]).toMatch(/more than once: a/);
  });

  it('puts what was measured beside the estimate where the entry is a record of measurements', async () => {
    const entries = await run({ complexes: [{ ...good, published: { tenDq: 17_400 }, bands: [] }] });
    expect(entries[0]!.measured).toMatchObject({ published: { tenDq: 17_400 } });
  });

  it('gives an entry without id its place for a name', async () => {
    const [entry] = await run([{ ...good, id: undefined }]);
    expect(entry).toMatchObject({ id: '[0]', error: { code: 'missing-field', field: '[0].id' } });
  });
});
