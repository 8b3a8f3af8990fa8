import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ligandFromFacts } from '../../library';
import { countByCharge } from './countMultisets';
import { poolOf } from './ligandPool';
import { multisetsOf } from './multisets';
import { patternsFilling } from './pattern';

const ligand = (id: string, denticity: number, charge: number) =>
  ligandFromFacts({
    id,
    name: id,
    formula: 'N',
    charge,
    denticity,
    donorAtoms: Array.from({ length: denticity }, () => 'N'),
    piCharacter: 'none',
    class: 'amine',
  });

const pools = fc
  .array(fc.tuple(fc.integer({ min: 1, max: 3 }), fc.integer({ min: -2, max: 1 })), {
    minLength: 1,
    maxLength: 9,
  })
  .map((kinds) => poolOf(kinds.map(([denticity, charge], i) => ligand(`l${i}`, denticity, charge))));

describe('multisets of ligands', () => {
  it('number C(n, 1) + C(n, 2) x 5 + C(n, 3) x 10 for n monodentate ligands on six places (compositions of six)', () => {
    const pool = poolOf(Array.from({ length: 7 }, (_, i) => ligand(`l${i}`, 1, 0)));
    let visited = 0;
    for (const pattern of patternsFilling(6, pool.shapes, 3))
      visited += [...multisetsOf(pattern, pool)].length;
    expect(visited).toBe(7 + 21 * 5 + 35 * 10);
  });

  it('are each visited once, fill the sphere, and are as many per charge as the count without visiting says', () => {
    fc.assert(
      fc.property(pools, fc.integer({ min: 2, max: 6 }), (pool, places) => {
        const seen = new Set<string>();
        for (const pattern of patternsFilling(places, pool.shapes, 3)) {
          const byCharge = new Map<number, number>();
          for (const picks of multisetsOf(pattern, pool)) {
            const parts = [...picks].map((position, kind) => `${position}x${pattern[kind]!.count}`);
            seen.add(parts.sort().join(' '));
            expect(new Set(picks).size).toBe(picks.length);
            let filled = 0;
            let charge = 0;
            picks.forEach((position, kind) => {
              filled += pool.ligands[position]!.denticity * pattern[kind]!.count;
              charge += pool.ligands[position]!.charge * pattern[kind]!.count;
            });
            expect(filled).toBe(places);
            byCharge.set(charge, (byCharge.get(charge) ?? 0) + 1);
          }
          expect(new Map([...countByCharge(pattern, pool)])).toEqual(byCharge);
        }
        let counted = 0;
        for (const pattern of patternsFilling(places, pool.shapes, 3)) {
          for (const ways of countByCharge(pattern, pool).values()) counted += ways;
        }
        expect(seen.size).toBe(counted);
      }),
      { numRuns: 60, seed: 7 },
    );
  });
});
