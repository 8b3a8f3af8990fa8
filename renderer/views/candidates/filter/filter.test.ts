import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../../../core/library/parameterLibrary';
import type { Candidate } from '../../../../core/record/project';
import type { CandidateSummary, EstimateSummary } from '../../../workers/estimateSummary';
import type { TableRow } from '../tableRow';
import { termWords } from './condition';
import { rowTest } from './matches';
import { parseFilter } from './parseFilter';

const ligands = [...defaultLibrary.ligands.values()];
const parse = (text: string) => parseFilter(text, ligands);
const only = (text: string) => parse(text)[0]!.anyOf[0]!;

function row(
  composition: Partial<Candidate['composition']>,
  estimate: Partial<EstimateSummary> | null = {},
  candidate: Partial<Candidate> = {},
): TableRow {
  const summary: CandidateSummary | undefined =
    estimate === null
      ? undefined
      : {
          ok: true,
          formula: '[Cr(NH3)6]3+',
          dElectrons: 3,
          groundTerm: '4A2g',
          tenDq: { value: 21_500, sigma: 1300 },
          racahB: { value: 660, sigma: 60 },
          spin: {
            state: 'only',
            probabilityHigh: null,
            words: 'one spin state only',
            unpairedElectrons: 3,
            nearCrossover: false,
          },
          bands: [
            { energy: 21_500, sigma: 1300, label: '4T2g', kind: 'spin-allowed', molarAbsorptivity: 40 },
          ],
          colour: null,
          transmittance: null,
          flags: [],
          ...estimate,
        };
  return {
    candidate: {
      composition: {
        metal: 'Cr',
        oxidationState: 3,
        geometry: 'octahedral',
        ligands: { nh3: 6 },
        ...composition,
      },
      name: '',
      tags: [],
      notes: '',
      starred: false,
      archived: false,
      ...candidate,
    } as unknown as Candidate,
    summary,
    distance: null,
  };
}
const passes = (text: string, ...rows: TableRow[]) => rows.map(rowTest(parse(text)));

describe('the filter', () => {
  it('understands a metal with or without its oxidation state, in all usual spellings', () => {
    for (const text of ['Cr(III)', 'Cr3+', 'cr III', 'chromium(III)']) {
      expect(only(text)).toEqual({ kind: 'ion', metal: 'Cr', oxidationState: 3 });
    }
    expect(only('Mo')).toEqual({ kind: 'ion', metal: 'Mo', oxidationState: null });
  });

  it('tells cobalt from carbon monoxide by the letters typed', () => {
    expect(only('Co')).toMatchObject({ kind: 'ion', metal: 'Co' });
    expect(only('CO')).toMatchObject({ kind: 'ligand', id: 'co' });
  });

  it('reads a window in nm as the same window in wavenumber', () => {
    expect(only('450-520 nm')).toEqual({ kind: 'band', from: 1e7 / 520, to: 1e7 / 450 });
    expect(only('above 20 000 cm-1')).toEqual({ kind: 'band', from: 20_000, to: Infinity });
  });

  it('finds "Cr(III), 450-520 nm, LS excluded" as a chemist means it', () => {
    const text = 'Cr(III), 450-520 nm, LS excluded';
    const low = {
      state: 'low',
      probabilityHigh: 0.01,
      words: '',
      unpairedElectrons: 1,
      nearCrossover: false,
    } as const;
    expect(
      passes(
        text,
        row({}),
        row({ oxidationState: 2 }),
        row(
          {},
          { bands: [{ energy: 15_000, sigma: 0, label: '', kind: 'spin-allowed', molarAbsorptivity: 1 }] },
        ),
        row({}, { spin: low }),
      ),
    ).toEqual([true, false, false, false]);
  });

  it('counts no charge-transfer or spin-forbidden band as a band in the window', () => {
    const forbidden = [
      { energy: 21_000, sigma: 0, label: '2E', kind: 'spin-forbidden', molarAbsorptivity: 1 },
    ] as const;
    expect(passes('450-520 nm', row({}, { bands: forbidden }))).toEqual([false]);
  });

  it('knows quantities, tags, marks, geometries, d counts, ligands and alternatives', () => {
    expect(passes('10Dq > 20000, B 600-700', row({}))).toEqual([true]);
    expect(passes('#order', row({}, {}, { tags: ['Order'] }), row({}))).toEqual([true, false]);
    expect(passes('starred', row({}, {}, { starred: true }), row({}))).toEqual([true, false]);
    expect(passes('tetrahedral or d3', row({}), row({}, { dElectrons: 4 }))).toEqual([true, false]);
    expect(passes('without nh3', row({}), row({ ligands: { en: 3 } }))).toEqual([false, true]);
    expect(passes('unpaired 3', row({}), row({}, null))).toEqual([true, false]);
  });

  it('shows archived candidates only when asked for them', () => {
    const archived = row({}, {}, { archived: true });
    expect(passes('', archived, row({}))).toEqual([false, true]);
    expect(passes('archived', archived, row({}))).toEqual([true, false]);
  });

  it('looks for everything else as text and says how it understood each term', () => {
    expect(passes('filter glass', row({}, {}, { notes: 'for the filter glass' }), row({}))).toEqual([
      true,
      false,
    ]);
    expect(parse('Cr(III), not low spin, 450-520 nm').map(termWords)).toEqual([
      'metal Cr 3+',
      'not low spin',
      'a spin-allowed band at 450 to 520 nm',
    ]);
  });

  it('passes 2 000 rows in less than 100 ms', () => {
    const rows = Array.from({ length: 2000 }, (_, index) => row({ oxidationState: 2 + (index % 2) }));
    const start = performance.now();
    const found = rows.filter(rowTest(parse('Cr(III), 450-520 nm, not low spin, amine or ammonia or [Cr')));
    expect(found).toHaveLength(1000);
    expect(performance.now() - start).toBeLessThan(100);
  });
});
