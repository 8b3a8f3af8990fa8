import { describe, expect, it } from 'vitest';
import { irrepNamed, pointGroup, pointGroupNames } from './pointGroup';
import { innerProduct } from './representations/character';

/** `A1 1 1 -1`, classes in the order given; ε2 = 2cos72°, ε4 = 2cos144°. */
interface Published {
  readonly source: string;
  readonly classes: string;
  readonly rows: Readonly<Record<string, string>>;
}

const numbers: Readonly<Record<string, number>> = {
  r2: Math.SQRT2,
  '-r2': -Math.SQRT2,
  r3: Math.sqrt(3),
  '-r3': -Math.sqrt(3),
  e2: 2 * Math.cos((2 * Math.PI) / 5),
  e4: 2 * Math.cos((4 * Math.PI) / 5),
};
const value = (text: string): number => numbers[text] ?? Number(text);

const cotton = 'F. A. Cotton, Chemical Applications of Group Theory, 3rd ed. 1990, appendix II (from memory)';
const altmann = 'S. L. Altmann and P. Herzig, Point-Group Theory Tables, 1994 (from memory)';
const published: Readonly<Record<string, Published>> = {
  O: {
    source: cotton,
    classes: "1E 8C3 3C2 6C4 6C2'",
    rows: {
      A1: '1 1 1 1 1',
      A2: '1 1 1 -1 -1',
      E: '2 -1 2 0 0',
      T1: '3 0 -1 1 -1',
      T2: '3 0 -1 -1 1',
    },
  },
  Td: {
    source: cotton,
    classes: '1E 8C3 3C2 6S4 6σd',
    rows: { A1: '1 1 1 1 1', A2: '1 1 1 -1 -1', E: '2 -1 2 0 0', T1: '3 0 -1 1 -1', T2: '3 0 -1 -1 1' },
  },
  D4h: {
    source: cotton,
    classes: "1E 2C4 1C2 2C2' 2C2'' 1i 2S4 1σh 2σv 2σd",
    rows: {
      A2g: '1 1 1 -1 -1 1 1 1 -1 -1',
      B1g: '1 -1 1 1 -1 1 -1 1 1 -1',
      B2g: '1 -1 1 -1 1 1 -1 1 -1 1',
      Eg: '2 0 -2 0 0 2 0 -2 0 0',
      B1u: '1 -1 1 1 -1 -1 1 -1 -1 1',
      Eu: '2 0 -2 0 0 -2 0 2 0 0',
    },
  },
  D2d: {
    source: cotton,
    classes: "1E 2S4 1C2 2C2' 2σd",
    rows: { A2: '1 1 1 -1 -1', B1: '1 -1 1 1 -1', B2: '1 -1 1 -1 1', E: '2 0 -2 0 0' },
  },
  D3h: {
    source: cotton,
    classes: '1E 2C3 3C2 1σh 2S3 3σv',
    rows: {
      "A1'": '1 1 1 1 1 1',
      "A2'": '1 1 -1 1 1 -1',
      "E'": '2 -1 0 2 -1 0',
      "A1''": '1 1 1 -1 -1 -1',
      "A2''": '1 1 -1 -1 -1 1',
      "E''": '2 -1 0 -2 1 0',
    },
  },
  D4d: {
    source: cotton,
    classes: "1E 2S8 2C4 2S8^3 1C2 4C2' 4σd",
    rows: {
      B1: '1 -1 1 -1 1 1 -1',
      B2: '1 -1 1 -1 1 -1 1',
      E1: '2 r2 0 -r2 -2 0 0',
      E2: '2 0 -2 0 2 0 0',
      E3: '2 -r2 0 r2 -2 0 0',
    },
  },
  D5h: {
    source: cotton,
    classes: '1E 2C5 2C5^2 5C2 1σh 2S5 2S5^3 5σv',
    rows: { "E1'": '2 e2 e4 0 2 e2 e4 0', "E2''": '2 e4 e2 0 -2 1.618034 -0.618034 0' },
  },
  C2v: {
    source: cotton,
    classes: '1E 1C2 1σ(xz) 1σ(yz)',
    rows: { A1: '1 1 1 1', A2: '1 1 -1 -1', B1: '1 -1 1 -1', B2: '1 -1 -1 1' },
  },
  D2h: {
    source: cotton,
    classes: '1E 1C2(z) 1C2(y) 1C2(x) 1i 1σ(xy) 1σ(xz) 1σ(yz)',
    rows: { B1g: '1 1 -1 -1 1 1 -1 -1', B2g: '1 -1 1 -1 1 -1 1 -1', B3u: '1 -1 -1 1 -1 1 1 -1' },
  },
  C3v: { source: cotton, classes: '1E 2C3 3σv', rows: { A2: '1 1 -1', E: '2 -1 0' } },
};

const spinors: Readonly<Record<string, Published>> = {
  O: {
    source: 'J. S. Griffith, The Theory of Transition-Metal Ions, 1961, table A 15 (from memory)',
    classes: "1E 8C3 3C2 6C4 6C2'",
    rows: { 'E1/2': '2 1 0 r2 0', 'E5/2': '2 1 0 -r2 0', 'F3/2': '4 -1 0 0 0' },
  },
  D4: { source: altmann, classes: '1E 2C4 1C2', rows: { 'E1/2': '2 r2 0', 'E3/2': '2 -r2 0' } },
  D3h: {
    source: altmann,
    classes: '1E 2C3 1σh 2S3',
    rows: { 'E1/2': '2 1 0 r3', 'E3/2': '2 -2 0 0', 'E5/2': '2 1 0 -r3' },
  },
};

function check(name: string, { classes, rows }: Published): void {
  const group = pointGroup(name);
  const places = classes.split(' ').map((text) => {
    const place = group.classes.findIndex((each) => `${each.size}${each.name}` === text);
    expect(place, `${name}: class ${text}`).toBeGreaterThanOrEqual(0);
    return place;
  });
  for (const [irrep, row] of Object.entries(rows)) {
    const { characters } = irrepNamed(group, irrep);
    row.split(' ').forEach((text, i) => {
      expect(characters[places[i]!], `${name} ${irrep} ${classes}`).toBeCloseTo(value(text), 5);
    });
  }
}

describe('character tables worked out from generators', () => {
  for (const [name, table] of Object.entries(published)) {
    it(`give ${name} as in ${table.source}`, () => check(name, table));
  }
  for (const [name, table] of Object.entries(spinors)) {
    it(`give the double group of ${name} as in ${table.source}`, () => check(name, table));
  }

  it('are orthonormal and complete for every group of the catalogue', () => {
    for (const name of pointGroupNames()) {
      const group = pointGroup(name);
      expect(
        group.classes.reduce((total, { size }) => total + size, 0),
        name,
      ).toBe(group.order);
      for (const spinor of [false, true]) {
        const irreps = group.irreps.filter((each) => each.spinor === spinor);
        // A joined pair of complex-conjugate representations has norm 2 and counts half its square.
        const squares = irreps.map(
          ({ dimension, reality }) => dimension ** 2 / (reality === 'complex' ? 2 : 1),
        );
        expect(
          squares.reduce((a, b) => a + b, 0),
          name,
        ).toBeCloseTo(group.order, 9);
        irreps.forEach((a, i) =>
          irreps.forEach((b, j) => {
            const norm = i !== j ? 0 : a.reality === 'complex' ? 2 : 1;
            expect(
              innerProduct(group, a.characters, b.characters),
              `${name} ${a.mulliken} ${b.mulliken}`,
            ).toBeCloseTo(norm, 9);
          }),
        );
      }
      expect(new Set(group.irreps.map(({ mulliken }) => mulliken)).size, name).toBe(group.irreps.length);
    }
  });

  it('make every level of half-integer spin at least a Kramers doublet, in even multiples', () => {
    for (const name of pointGroupNames()) {
      for (const { spinor, degeneracy } of pointGroup(name).irreps) {
        if (spinor) expect(degeneracy % 2).toBe(0);
      }
    }
  });

  it('number by Bethe as in Koster, Dimmock, Wheeler and Statz 1963 (from memory): O and D4', () => {
    const bethe = (group: string): string[] =>
      pointGroup(group).irreps.map(({ mulliken, bethe: number }) => `${mulliken}=${number}`);
    expect(bethe('O')).toEqual('A1=G1 A2=G2 E=G3 T1=G4 T2=G5 E1/2=G6 E5/2=G7 F3/2=G8'.split(' '));
    expect(bethe('D4')).toEqual('A1=G1 A2=G2 B1=G3 B2=G4 E=G5 E1/2=G6 E3/2=G7'.split(' '));
  });

  it('refuse a name that is no point group', () => {
    expect(() => pointGroup('Q7')).toThrow(RangeError);
  });
});
