import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../library';
import { checkWish } from '../wish/checkWish';
import type { Wish, WishInput } from '../wish/wish';
import { countCandidates, spaceOf } from '../space/space';
import { searchWish, type SearchOptions, type SearchProgress } from './searchWish';

function wished(input: WishInput): Wish {
  const checked = checkWish(input, defaultLibrary);
  if (!checked.ok) throw new Error(checked.problems[0]!.message);
  return checked.value;
}

function finish(wish: Wish, options: SearchOptions): SearchProgress {
  const run = searchWish(wish, defaultLibrary, options);
  let step = run.next();
  while (step.done !== true) step = run.next();
  return step.value;
}

const ions = ['Cr3+', 'Fe2+', 'Co3+', 'Ni2+', 'Mn3+', 'V3+'];
const ligands = ['h2o', 'nh3', 'en', 'ox', 'cl', 'py', 'gly'];
const wishes = fc.record({
  name: fc.constant('any'),
  ions: fc.subarray(ions, { minLength: 1, maxLength: 2 }),
  geometries: fc.constantFrom(['octahedral' as const], ['octahedral' as const, 'tetrahedral' as const]),
  ligands: fc.record({
    allow: fc.subarray(ligands, { minLength: 1, maxLength: 3 }),
    maxKinds: fc.constantFrom(1, 2),
  }),
  bands: fc.option(
    fc.integer({ min: 380, max: 900 }).map((from) => [{ from_nm: from, to_nm: from + 60 }]),
    { nil: undefined },
  ),
  spin: fc.constantFrom(undefined, 'high' as const, 'low' as const),
  unpaired: fc.constantFrom(undefined, { min: 0, max: 1 }, { min: 2, max: 4 }),
  tenDq_cm1: fc.constantFrom(undefined, { min: 8000, max: 15_000 }, { min: 15_000, max: 24_000 }),
});

describe('a search', () => {
  it('gives the list that estimating every candidate gives, ids and order alike', () => {
    fc.assert(
      fc.property(wishes, (input) => {
        const checked = checkWish(input, defaultLibrary);
        fc.pre(checked.ok);
        if (!checked.ok) return;
        const quick = finish(checked.value, { top: 20 });
        const slow = finish(checked.value, { top: 20, brute: true });
        expect(quick.results.map(({ id, probability }) => [id, probability])).toEqual(
          slow.results.map(({ id, probability }) => [id, probability]),
        );
        expect(quick.evaluated + quick.skipped).toBe(quick.count);
        expect(slow.evaluated).toBe(slow.count);
      }),
      { numRuns: 30, seed: 11 },
    );
  }, 120_000);

  it('that goes on from any point ends as one that was never interrupted', () => {
    const wish = wished({
      name: 'w',
      ions: ['Cr3+', 'Ni2+'],
      ligands: { allow: ['h2o', 'nh3', 'en', 'cl'], maxKinds: 2 },
      bands: [{ from_nm: 540, to_nm: 600 }],
    });
    const whole = finish(wish, { top: 8 });
    for (const step of searchWish(wish, defaultLibrary, { top: 8 })) {
      // What is kept of a run has been through a file.
      const from = JSON.parse(JSON.stringify(step)) as SearchProgress;
      expect(from.evaluated + from.skipped).toBeLessThanOrEqual(whole.count);
      expect(JSON.parse(JSON.stringify(finish(wish, { top: 8, from })))).toEqual(
        JSON.parse(JSON.stringify(whole)),
      );
    }
  });

  it('counts the same space that it runs through', () => {
    const wish = wished({ name: 'x', ions: ['Cr3+'], ligands: { allow: ['nh3', 'en', 'cl'], maxKinds: 3 } });
    expect(finish(wish, { top: 1, brute: true }).evaluated).toBe(
      countCandidates(spaceOf(wish, defaultLibrary)),
    );
  });

  it('finds cis and trans as candidates of their own', () => {
    const wish = wished({
      name: 'x',
      ions: ['Co3+'],
      geometries: ['octahedral'],
      ligands: { allow: ['en', 'cl'] },
      charge: { min: 1, max: 1 },
    });
    expect(finish(wish, { top: 10 }).results.map(({ formula, isomer }) => [formula, isomer])).toEqual([
      ['[Co(en)2Cl2]+', 'cis'],
      ['[Co(en)2Cl2]+', 'trans'],
    ]);
  });

  it('for low-spin iron(II) never ranks a hexaaqua ion above one with diimines', () => {
    const wish = wished({
      name: 'x',
      ions: ['Fe2+'],
      geometries: ['octahedral'],
      ligands: { allow: ['h2o', 'bipy'], maxKinds: 1 },
      spin: 'low',
    });
    // [Fe(bpy)3]2+ is low spin, [Fe(H2O)6]2+ high spin (common practice).
    expect(finish(wish, { top: 2 }).results[0]!.ligands).toEqual({ bipy: 3 });
  });

  it('that nothing can meet ends with an empty list, not with padding', () => {
    const wish = wished({
      name: 'x',
      ions: ['Ni2+'],
      geometries: ['octahedral'],
      ligands: { allow: ['h2o'] },
      tenDq_cm1: { min: 40_000, max: 50_000 },
    });
    expect(finish(wish, { top: 5 }).results).toEqual([]);
  });
});
