import { describe, expect, it } from 'vitest';
import { type GeometryId } from '../../record/composition';
import { binomial } from '../../symmetry';
import { polyhedra } from '../polyhedra/polyhedra';
import { vertexFrame } from './frame';
import { isomersOf } from './isomersOf';
import { type Site } from './site';

/** `A3 B2 C` as monodentate ligands. */
const monodentate = (formula: string): Site[] =>
  formula.split(' ').map((part) => ({ kind: part[0]!, denticity: 1, count: Number(part.slice(1) || 1) }));
const ligand = (kind: string, denticity: number, count: number, more: Partial<Site> = {}): Site => ({
  kind,
  denticity,
  count,
  ...more,
});
/** Isomers without and with mirror images counted apart. */
const counts = (geometry: GeometryId, sites: readonly Site[]): [number, number] => {
  const isomers = isomersOf(geometry, sites);
  return [isomers.length, isomers.reduce((sum, { chiral }) => sum + (chiral ? 2 : 1), 0)];
};
const names = (geometry: GeometryId, sites: readonly Site[]): (string | null)[] =>
  isomersOf(geometry, sites)
    .map(({ name }) => name)
    .sort();

describe('isomers of octahedral complexes', () => {
  it('number as J. C. Bailar Jr. listed them (J. Chem. Educ. 34, 334, 1957, from memory)', () => {
    const table: [string, number, number][] = [
      ['A6', 1, 1],
      ['A5 B', 1, 1],
      ['A4 B2', 2, 2],
      ['A3 B3', 2, 2],
      ['A4 B C', 2, 2],
      ['A3 B2 C', 3, 3],
      ['A3 B C D', 4, 5],
      ['A2 B2 C2', 5, 6],
      ['A2 B2 C D', 6, 8],
      ['A2 B C D E', 9, 15],
      ['A B C D E F', 15, 30],
    ];
    for (const [formula, distinct, all] of table) {
      expect(counts('octahedral', monodentate(formula)), formula).toEqual([distinct, all]);
    }
  });

  it('with chelates number as in the textbooks (Basolo and Pearson, Mechanisms of Inorganic Reactions, 1967, ch. 4)', () => {
    const gly = (count: number): Site => ligand('gly', 2, count, { donors: ['N', 'O'] });
    const table: [string, Site[], number, number][] = [
      ['M(AA)3', [ligand('en', 2, 3)], 1, 2],
      ['M(AA)2B2', [ligand('en', 2, 2), ligand('cl', 1, 2)], 2, 3],
      ['M(AA)2BC', [ligand('en', 2, 2), ligand('br', 1, 1), ligand('cl', 1, 1)], 2, 3],
      ['M(AA)B2C2', [ligand('en', 2, 1), ligand('br', 1, 2), ligand('cl', 1, 2)], 3, 4],
      ['M(AB)3', [gly(3)], 2, 4],
      ['M(AB)2C2', [gly(2), ligand('cl', 1, 2)], 5, 8],
      ['M(dien)2', [ligand('dien', 3, 2)], 3, 4],
      ['M(trien)B2', [ligand('trien', 4, 1), ligand('cl', 1, 2)], 3, 5],
    ];
    for (const [formula, sites, distinct, all] of table) {
      expect(counts('octahedral', sites), formula).toEqual([distinct, all]);
    }
  });

  it('carry the names of the trade (IUPAC Recommendations 2005, IR-9.3.3)', () => {
    expect(names('octahedral', monodentate('A4 B2'))).toEqual(['cis', 'trans']);
    expect(names('octahedral', monodentate('A3 B3'))).toEqual(['fac', 'mer']);
    expect(names('octahedral', monodentate('A4 B C'))).toEqual(['cis', 'trans']);
    expect(names('octahedral', [ligand('en', 2, 2), ligand('cl', 1, 2)])).toEqual(['cis', 'trans']);
    expect(names('octahedral', [ligand('trien', 4, 1), ligand('cl', 1, 2)])).toEqual([
      'cis-α',
      'cis-β',
      'trans',
    ]);
    expect(names('octahedral', [ligand('dien', 3, 2)])).toEqual(['mer', 's-fac', 'u-fac']);
    expect(names('octahedral', monodentate('A3 B2 C'))).toEqual(['fac', 'mer, cis(B)', 'mer, trans(B)']);
    expect(names('octahedral', monodentate('A2 B2 C2'))).toEqual([
      ...['all-cis', 'all-trans', 'trans(A)', 'trans(B)', 'trans(C)'],
    ]);
    expect(names('octahedral', [ligand('en', 2, 3)])).toEqual([null]);
  });

  it('have the point groups of the textbooks', () => {
    const group = (sites: Site[], name: string | null): string =>
      isomersOf('octahedral', sites).find((isomer) => isomer.name === name)!.pointGroup;
    expect(group(monodentate('A4 B2'), 'trans')).toBe('D4h');
    expect(group(monodentate('A4 B2'), 'cis')).toBe('C2v');
    expect(group(monodentate('A3 B3'), 'fac')).toBe('C3v');
    expect(group(monodentate('A3 B3'), 'mer')).toBe('C2v');
    expect(group([ligand('en', 2, 3)], null)).toBe('D3');
    expect(group([ligand('en', 2, 2), ligand('cl', 1, 2)], 'cis')).toBe('C2');
    expect(group([ligand('en', 2, 2), ligand('cl', 1, 2)], 'trans')).toBe('D2h');
    expect(group([ligand('dien', 3, 2)], 's-fac')).toBe('C2h');
  });

  it('respect how a ligand can lie: terpyridine only mer, a tripod or small ring only fac, a macrocycle flat or folded', () => {
    const terpy = ligand('terpy', 3, 2, { arrangement: 'meridional' });
    const tacn = ligand('tacn', 3, 1, { arrangement: 'facial' });
    const cyclam = ligand('cyclam', 4, 1, {
      rings: [
        [0, 1],
        [1, 2],
        [2, 3],
        [3, 0],
      ],
    });
    expect(counts('octahedral', [terpy])).toEqual([1, 1]);
    expect(names('octahedral', [tacn, ligand('cl', 1, 3)])).toEqual([null]);
    expect(names('octahedral', [cyclam, ligand('cl', 1, 2)])).toEqual(['cis', 'trans']);
  });
});

describe('orientation of octahedral isomers', () => {
  it('puts the odd pair of opposite donors on z, the first two vertices', () => {
    const onAxis = (formula: string, name: string): string[] =>
      isomersOf('octahedral', monodentate(formula))
        .find((isomer) => isomer.name === name)!
        .kinds.slice(0, 2)
        .sort();
    expect(onAxis('A4 B2', 'trans')).toEqual(['B', 'B']);
    expect(onAxis('A4 B2', 'cis')).toEqual(['A', 'A']);
    expect(onAxis('A4 B C', 'trans')).toEqual(['B', 'C']);
    expect(onAxis('A3 B2 C', 'mer, trans(B)')).toEqual(['B', 'B']);
  });

  it('is shared by the drawn-out octahedron', () => {
    const sites = monodentate('A4 B2');
    expect(isomersOf('tetragonal', sites)).toEqual(isomersOf('octahedral', sites));
  });
});

describe('isomers of other geometries', () => {
  it('number as in the textbooks: square MA2B2 2, MABCD 3; tetrahedral none but the mirror image', () => {
    expect(names('square-planar', monodentate('A2 B2'))).toEqual(['cis', 'trans']);
    expect(names('square-planar', monodentate('A2 B C'))).toEqual(['cis', 'trans']);
    expect(counts('square-planar', monodentate('A B C D'))).toEqual([3, 3]);
    expect(counts('tetrahedral', monodentate('A2 B2'))).toEqual([1, 1]);
    expect(counts('tetrahedral', monodentate('A B C D'))).toEqual([1, 2]);
  });

  it('give 10 pairs of mirror images for a bipyramid of five ligands, 15 for the square pyramid (Muetterties 1970)', () => {
    expect(counts('trigonal-bipyramidal', monodentate('A B C D E'))).toEqual([10, 20]);
    expect(counts('square-pyramidal', monodentate('A B C D E'))).toEqual([15, 30]);
    expect(names('trigonal-bipyramidal', monodentate('A3 B2'))).toEqual([
      'axial(A,A)',
      'axial(A,B)',
      'axial(B,B)',
    ]);
  });

  it("number as Burnside's lemma counts colourings, for two kinds on every polyhedron", () => {
    for (const { id, coordinationNumber: n } of polyhedra) {
      if (id === 'tetragonal') continue;
      const { permutations, rotations } = vertexFrame(id);
      for (let b = 1; b < n; b++) {
        const sites = monodentate(`A${n - b} B${b}`);
        expect(counts(id, sites), `${id} B${b}`).toEqual([burnside(permutations, b), burnside(rotations, b)]);
      }
    }
  });

  it('leave out what a chelate cannot span', () => {
    expect(isomersOf('linear', [ligand('en', 2, 1)])).toEqual([]);
    expect(counts('tetrahedral', [ligand('bipy', 2, 2)])).toEqual([1, 1]);
    expect(counts('square-planar', [ligand('en', 2, 2)])).toEqual([1, 1]);
    // Only axial-equatorial edges are near enough in the bipyramid.
    expect(names('trigonal-bipyramidal', [ligand('en', 2, 2), ligand('x', 1, 1)])).toEqual([null]);
  });
});

describe('the answer', () => {
  it('names isomers alike whatever the order of the ligands, and points back to the list given', () => {
    const sites = monodentate('B2 A4');
    const trans = isomersOf('octahedral', sites).find(({ name }) => name === 'trans')!;
    expect(trans.sites.filter((site) => site === 0)).toHaveLength(2);
    expect(trans.kinds.filter((kind) => kind === 'B')).toHaveLength(2);
    expect(names('octahedral', sites)).toEqual(names('octahedral', monodentate('A4 B2')));
  });

  it('gives every isomer of a set its own name', () => {
    for (const { id, coordinationNumber: n } of polyhedra) {
      const kinds = ['A2 B2', 'A3 B C', 'A2 B2 C', 'A2 B2 C2', 'A3 B2 C2', 'A4 B4', 'A2 B', 'A B'];
      for (const formula of kinds) {
        const sites = monodentate(formula);
        if (sites.reduce((sum, { count }) => sum + count, 0) !== n) continue;
        const given = names(id, sites);
        expect(new Set(given).size, `${id} ${formula}`).toBe(given.length);
      }
    }
  });

  it('refuses what does not fit, by name', () => {
    const attempt = (sites: Site[]) => () => isomersOf('octahedral', sites);
    expect(attempt(monodentate('A4 B'))).toThrow(/5 donors; octahedral has 6/);
    expect(attempt([ligand('A', 1, 1.5)])).toThrow(/whole number/);
    expect(attempt([ligand('A', 1, 3), ligand('A', 1, 3)])).toThrow(/listed twice/);
    expect(attempt([ligand('A', 2, 3, { donors: ['N'] })])).toThrow(/denticity/);
  });

  it('is remembered by pattern: 100 000 calls take less than a second', () => {
    const start = performance.now();
    for (let i = 0; i < 100_000; i++) {
      isomersOf('octahedral', [ligand(`a${i % 40}`, 1, 4), ligand(`b${i % 30}`, 1, 2)]);
    }
    expect(performance.now() - start).toBeLessThan(1000);
  });
});

/** Colourings with b vertices of the second colour, up to the permutations. */
function burnside(permutations: readonly (readonly number[])[], b: number): number {
  const fixed = permutations.map((p) => {
    // A colouring is kept where whole cycles have one colour: coefficient of y^b in Π (1 + y^length).
    let polynomial = [1];
    for (const length of cycleLengths(p)) {
      const next = new Array<number>(polynomial.length + length).fill(0);
      polynomial.forEach((value, k) => {
        next[k]! += value;
        next[k + length]! += value;
      });
      polynomial = next;
    }
    return polynomial[b]!;
  });
  expect(fixed[0]).toBe(binomial(permutations[0]!.length, b));
  return fixed.reduce((sum, value) => sum + value, 0) / permutations.length;
}

function cycleLengths(p: readonly number[]): number[] {
  const lengths: number[] = [];
  const done = new Set<number>();
  for (let i = 0; i < p.length; i++) {
    let length = 0;
    for (let j = i; !done.has(j); j = p[j]!) {
      done.add(j);
      length++;
    }
    if (length > 0) lengths.push(length);
  }
  return lengths;
}
