// @vitest-environment node
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { wishSchema, type WishInput } from '../../../../core/search';
import { geometryIds } from '../../../../core/record/composition';
import { draftOf, freshDraft, wishesAnything, wishOf } from './wishDraft';

const whole = (min: number, max: number) => fc.integer({ min, max });
const pair = (low: number, high: number) =>
  fc
    .tuple(whole(low, high), whole(low, high))
    .map(([a, b]) => ({ min: Math.min(a, b), max: Math.max(a, b) }));
const window_nm = fc
  .tuple(whole(200, 900), whole(1, 500))
  .map(([from, width]) => ({ from_nm: from, to_nm: from + width }));
const maybe = <T>(value: fc.Arbitrary<T>) => fc.option(value, { nil: undefined });

const wishes: fc.Arbitrary<WishInput> = fc.record({
  name: fc.constantFrom('a', 'Green filter'),
  ions: fc.constantFrom('all' as const, ['Cr3+'], ['Fe2+', 'Co3+']),
  geometries: fc.oneof(fc.constant('all' as const), fc.subarray([...geometryIds], { minLength: 1 })),
  ligands: fc.record({
    allow: fc.constantFrom('all' as const, ['h2o', 'en']),
    exclude: fc.constantFrom([], ['cl']),
    maxKinds: whole(1, 4),
    donorAtoms: maybe(fc.constant(['N', 'O'])),
    denticities: maybe(fc.constant([1, 2])),
    onlyShelf: maybe(fc.constant(true)),
  }),
  charge: maybe(pair(-3, 3)),
  bands: maybe(fc.array(window_nm, { minLength: 1, maxLength: 3 })),
  clear: maybe(
    fc.array(
      window_nm.map((each) => ({ ...each, maxMolarAbsorptivity: 7 })),
      { minLength: 1, maxLength: 2 },
    ),
  ),
  colour: maybe(
    fc.constant({
      lab: [60, 30, -25] as [number, number, number],
      tolerance: 12,
      concentration_mM: 10,
      path_cm: 1,
    }),
  ),
  spin: maybe(fc.constantFrom('high' as const, 'low' as const)),
  unpaired: maybe(pair(1, 4)),
  tenDq_cm1: maybe(pair(8000, 30_000)),
  moment_BM: maybe(pair(1, 6)),
  emission: maybe(window_nm),
  exclude: maybe(fc.record({ elements: maybe(fc.constant(['Co'])), hazards: maybe(fc.constant(['H350'])) })),
});

describe('the form of a wish', () => {
  it('keeps every part of a wish that is opened in it', () => {
    fc.assert(
      fc.property(wishes, (wish) => {
        const before = wishSchema.parse(wish);
        const after = wishSchema.parse(wishOf(draftOf(wish), []));
        // An empty exclusion and none are the same wish.
        const plain = (each: typeof before) =>
          JSON.parse(JSON.stringify({ ...each, exclude: { ...each.exclude } }));
        expect(plain(after)).toEqual(plain(before));
      }),
      { numRuns: 200, seed: 11 },
    );
  });

  it('asks for nothing while a window is half filled', () => {
    const draft = { ...freshDraft, absorb: [{ from: 540, to: null, absorptivity: null }] };
    expect(wishesAnything(draft)).toBe(false);
    expect(wishOf(draft, [])).not.toHaveProperty('bands');
    expect(wishesAnything(freshDraft)).toBe(true);
  });

  it('takes an open end of a range as the end of the format', () => {
    const draft = { ...freshDraft, unpaired: { min: 3, max: null }, charge: { min: null, max: 0 } };
    expect(wishOf(draft, [])).toMatchObject({ unpaired: { min: 3, max: 5 }, charge: { min: -20, max: 0 } });
  });

  it('sends the shelf along, so that others count what is new to them', () => {
    expect(wishOf(freshDraft, ['en'])).toMatchObject({ ligands: { shelf: ['en'] } });
  });
});
