import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../library';
import type { Composition } from '../../record/composition';
import { checkWish } from '../wish/checkWish';
import type { Wish, WishInput } from '../wish/wish';
import { relaxations } from './relax';
import { isAnswer, whyNot } from './whyNot';

function wished(input: WishInput): Wish {
  const checked = checkWish(input, defaultLibrary);
  if (!checked.ok) throw new Error(checked.problems[0]!.message);
  return checked.value;
}
const complex = (metal: string, oxidationState: number, ligands: Record<string, number>): Composition => ({
  metal,
  oxidationState,
  geometry: 'octahedral',
  ligands,
});

describe('why a candidate is not in the list', () => {
  it('names every rule that leaves it out, with how far', () => {
    const wish = wished({
      name: 'x',
      ions: ['Fe2+'],
      ligands: { allow: ['nh3', 'h2o'], maxKinds: 1 },
      charge: { min: 3, max: 3 },
    });
    const { exclusions } = whyNot(complex('Co', 3, { nh3: 4, cl: 2 }), wish, defaultLibrary);
    expect(exclusions.map(({ part }) => part)).toEqual(['ions', 'ligands', 'ligands.maxKinds', 'charge']);
    expect(exclusions.at(-1)!.because).toMatch(/charge 1 lies 2 outside/);
  });

  it('names the part that it fails, and what it offers there', () => {
    // [Cr(H2O)6]3+ absorbs near 575 nm (common practice), not near 800.
    const wish = wished({
      name: 'x',
      bands: [{ from_nm: 780, to_nm: 820 }],
      tenDq_cm1: { min: 10_000, max: 25_000 },
    });
    const answer = whyNot(complex('Cr', 3, { h2o: 6 }), wish, defaultLibrary);
    expect(answer.exclusions).toEqual([]);
    expect(answer.weakest!.part).toBe('bands[0]');
    expect(answer.weakest!.because).toMatch(/nm/);
    expect(isAnswer(answer)).toBe(false);
  });
});

describe('advice on a wish without an answer', () => {
  it('says which part to give up, and what that would buy', () => {
    const wish = wished({
      name: 'x',
      ions: ['Cr3+'],
      geometries: ['octahedral'],
      ligands: { allow: ['nh3', 'h2o', 'en'] },
      bands: [{ from_nm: 450, to_nm: 600 }],
      tenDq_cm1: { min: 40_000, max: 50_000 },
    });
    const [first] = relaxations(wish, defaultLibrary);
    expect(first!.part).toBe('tenDq_cm1');
    expect(first!.probability).toBeGreaterThan(0.8);
    expect(first!.offers).toMatch(/10Dq/);
  });
});
