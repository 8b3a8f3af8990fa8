// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../../../core/library';
import { readComplex } from './readComplex';

const read = (text: string) => readComplex(text, defaultLibrary);

describe('a complex as typed', () => {
  it('is an ion with ligands; geometry follows from the places filled', () => {
    expect(read('fe2+ 3 bipy')).toEqual({
      ok: true,
      value: {
        metal: 'Fe',
        oxidationState: 2,
        geometry: 'octahedral',
        ligands: { bipy: 3 },
        isomer: null,
      },
    });
    expect(read('Co3+ 2 en, 2 Cl trans')).toMatchObject({
      value: { ligands: { en: 2, cl: 2 }, isomer: 'trans', geometry: 'octahedral' },
    });
    expect(read('Co2+ 4 Cl')).toMatchObject({ value: { geometry: 'tetrahedral' } });
    expect(read('Ni2+ 4 cn square-planar')).toMatchObject({ value: { geometry: 'square-planar' } });
  });

  it('that makes no sense is refused with the word that does not', () => {
    for (const [text, word] of [
      ['', '“”'],
      ['Xx3+ 6 nh3', '“Xx3+”'],
      ['Cr3+ 6 nothing', '“nothing”'],
      ['Cr3+', 'no ligand'],
      ['Cr3+ 7 nh3', '7 places'],
    ] as const) {
      const outcome = read(text);
      expect(outcome.ok).toBe(false);
      if (!outcome.ok) expect(outcome.problems[0]!.message).toContain(word);
    }
  });
});
