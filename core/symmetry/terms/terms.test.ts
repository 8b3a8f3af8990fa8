import { describe, expect, it } from 'vitest';
import { SpinhueError } from '../../errors';
import { pointGroup } from '../pointGroup';
import { configurationsOf, termsOfConfiguration } from './configurationTerms';
import { splitTerm, termOrigins } from './correlation';
import { termsByDescent } from './descentOfConfiguration';
import { freeIonTerms } from './freeIonTerms';
import { termsOfShells } from './shellTerms';
import { binomial, countMicrostates, type Term } from './term';

const written = (terms: readonly Pick<Term, 'label' | 'times'>[]): string =>
  terms
    .map(({ label, times }) => (times === 1 ? label : `${times}(${label})`))
    .sort()
    .join(' ');

describe('terms of strong-field configurations', () => {
  it('are 3T1g, 3T2g, 1T1g and 1T2g with 24 microstates for t2g1 eg1 (common practice)', () => {
    const { terms, microstates } = termsOfConfiguration({ t2g: 1, eg: 1 });
    expect(written(terms)).toBe('1T1g 1T2g 3T1g 3T2g');
    expect(terms.map((term) => term.microstates).sort()).toEqual([3, 3, 9, 9]);
    expect(microstates).toBe(24);
  });

  it('agree with the table of t2^n and e^n (Griffith 1961, table A 24; Tanabe and Sugano 1954; from memory)', () => {
    const table: [number, number, string][] = [
      [1, 0, '2T2g'],
      [2, 0, '1A1g 1Eg 1T2g 3T1g'],
      [3, 0, '2Eg 2T1g 2T2g 4A2g'],
      [4, 0, '1A1g 1Eg 1T2g 3T1g'],
      [6, 0, '1A1g'],
      [0, 2, '1A1g 1Eg 3A2g'],
      [0, 3, '2Eg'],
      [2, 1, '2(2Eg) 2(2T1g) 2(2T2g) 2A1g 2A2g 4T1g 4T2g'],
    ];
    for (const [t2g, eg, terms] of table) {
      expect(written(termsOfConfiguration({ t2g, eg }).terms), `t2g${t2g} eg${eg}`).toBe(terms);
    }
  });

  it('come out the same by descent to subgroups without degenerate orbitals, for all 35 configurations', () => {
    for (let t2g = 0; t2g <= 6; t2g++) {
      for (let eg = 0; eg <= 4; eg++) {
        expect(written(termsByDescent({ t2g, eg })), `t2g${t2g} eg${eg}`).toBe(
          written(termsOfConfiguration({ t2g, eg }).terms),
        );
      }
    }
  });

  it('are the same for electrons and holes', () => {
    for (let t2g = 0; t2g <= 6; t2g++) {
      for (let eg = 0; eg <= 4; eg++) {
        expect(written(termsOfConfiguration({ t2g, eg }).terms)).toBe(
          written(termsOfConfiguration({ t2g: 6 - t2g, eg: 4 - eg }).terms),
        );
      }
    }
  });

  it('add up to C(10, N) microstates for every d^N', () => {
    for (let n = 0; n <= 10; n++) {
      const total = configurationsOf(n).reduce((sum, { microstates }) => sum + microstates, 0);
      expect(total).toBe(binomial(10, n));
    }
    expect(configurationsOf(5).map(({ microstates }) => microstates)).toEqual([6, 60, 120, 60, 6]);
  });

  it('drop the g and fill e first in T_d', () => {
    const [first] = configurationsOf(7, 'Td');
    expect(first!.label).toBe('e^4 t2^3');
    expect(written(first!.terms)).toBe('2E 2T1 2T2 4A2');
  });

  it('are had for any shells of any group: b1g1 eg3 of D4h gives 3Eg + 1Eg', () => {
    const terms = termsOfShells(pointGroup('D4h'), [
      { irrep: 'B1g', electrons: 1 },
      { irrep: 'Eg', electrons: 3 },
    ]);
    expect(written(terms)).toBe('1Eg 3Eg');
    expect(countMicrostates(terms)).toBe(8);
  });

  it('refuse an over-full shell by name', () => {
    expect(() => termsOfConfiguration({ t2g: 7, eg: 0 })).toThrow(SpinhueError);
    expect(() => termsOfConfiguration({ t2g: 1, eg: 1.5 })).toThrow(/eg = 1.5/);
  });
});

describe('free-ion terms', () => {
  it('agree with Condon and Shortley, The Theory of Atomic Spectra, 1935, table 1^7 (from memory)', () => {
    const table: Record<number, string> = {
      1: '2D',
      2: '1D 1G 1S 3F 3P',
      3: '2(2D) 2F 2G 2H 2P 4F 4P',
      4: '1F 1I 2(1D) 2(1G) 2(1S) 2(3F) 2(3P) 3D 3G 3H 5D',
      5: '2(2F) 2(2G) 2H 2I 2P 2S 3(2D) 4D 4F 4G 4P 6S',
    };
    for (let n = 1; n <= 9; n++) expect(written(freeIonTerms(n)), `d${n}`).toBe(table[Math.min(n, 10 - n)]);
  });

  it('put the ground term first (Hund)', () => {
    const grounds = [1, 2, 3, 4, 5, 6, 7, 8, 9].map((n) => freeIonTerms(n)[0]!.label);
    expect(grounds).toEqual(['2D', '3F', '4F', '5D', '6S', '5D', '4F', '3F', '2D']);
  });
});

describe('correlation of weak and strong field', () => {
  it('splits L terms in O_h as Bethe did (1929; every textbook)', () => {
    const split = (L: number): string =>
      splitTerm(L, 'Oh')
        .map(({ irrep, times }) => (times > 1 ? times : '') + irrep.mulliken)
        .join(' ');
    expect([0, 1, 2, 3, 4].map(split)).toEqual(['A1g', 'T1g', 'Eg T2g', 'A2g T1g T2g', 'A1g Eg T1g T2g']);
  });

  it('finds as many of each term on both sides, for every d^N and both cubic groups', () => {
    for (const group of ['Oh', 'Td'] as const) {
      for (let n = 1; n <= 9; n++) {
        for (const { term, freeIon, configurations } of termOrigins(n, group)) {
          const count = (parents: readonly { times: number }[]): number =>
            parents.reduce((sum, { times }) => sum + times, 0);
          expect(count(freeIon), `d${n} ${term}`).toBe(count(configurations));
        }
      }
    }
  });

  it('traces 3T1g of d2 to 3F and 3P, and to t2g2 and t2g1 eg1 (Tanabe and Sugano 1954)', () => {
    const origin = termOrigins(2).find(({ term }) => term === '3T1g')!;
    expect(origin.freeIon.map(({ label }) => label)).toEqual(['3F', '3P']);
    expect(origin.configurations.map(({ label }) => label)).toEqual(['t2g^2', 't2g^1 eg^1']);
  });
});
