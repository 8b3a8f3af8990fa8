import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../library';
import { predict, predictMany } from '.';

const candidate = {
  id: 'x',
  metal: 'Cr',
  oxidationState: 3,
  geometry: 'octahedral',
  ligands: { nh3: 5, cl: 1 },
};

/** Paths of all numbers in a value that are not finite. */
function notFinite(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, each]) => notFinite(each, `${path}.${key}`));
}

describe('predict', () => {
  it('answers the same question twice with the same digits, cloud included', () => {
    const ask = () => predict(candidate, { draws: 50 });
    expect(JSON.stringify(ask())).toBe(JSON.stringify(ask()));
  });

  it('draws as many colours as asked for', () => {
    const outcome = predict(candidate, { draws: 200 });
    expect(outcome.ok && outcome.prediction.cloud!.draws).toHaveLength(200);
    const none = predict(candidate);
    expect(none.ok && none.prediction.cloud).toBeNull();
  });

  it('draws relatives together: the same cause of doubt moves both the same way', () => {
    const bands = [
      { ...candidate, ligands: { en: 3 }, metal: 'V', oxidationState: 2 },
      { ...candidate, ligands: { nh3: 6 }, metal: 'V', oxidationState: 2 },
    ].map((input) => predict(input));
    const shares = bands.map((outcome) => (outcome.ok ? outcome.prediction.tenDq.shares! : []));
    const causes = shares.map((list) => new Set(list.map(({ cause }) => cause)));
    expect([...causes[0]!].filter((cause) => causes[1]!.has(cause))).toContain('g:V2+');
  });

  it('keeps the good ones of a list that holds bad ones, each with its place', () => {
    const outcomes = predictMany([candidate, { ...candidate, ligands: { nh3: 5 } }, null]);
    expect(outcomes.map(({ ok }) => ok)).toEqual([true, false, false]);
    const [, second, third] = outcomes;
    expect(second!.ok ? '' : second!.problems[0]!.field).toBe('[1].ligands');
    expect(third!.ok ? '' : third!.problems[0]!.field).toBe('[2]');
  });

  it.each([0, -10, NaN, Infinity])('refuses %f K', (temperature_K) => {
    const outcome = predict(candidate, { temperature_K });
    expect(outcome.ok ? null : outcome.problems[0]!.field).toBe('temperature_K');
  });

  it.each([
    ['concentration_mM', -1],
    ['concentration_mM', NaN],
    ['path_cm', 0],
  ])('refuses %s of %f', (name, value) => {
    const outcome = predict({ ...candidate, [name]: value });
    expect(outcome.ok ? null : outcome.problems[0]!.field).toBe(name);
  });

  it('never holds a number that is not finite, whatever is combined', () => {
    const ions = [...defaultLibrary.ions.values()];
    const ligands = [...defaultLibrary.ligands.values()];
    const single = ligands.filter(({ denticity }) => denticity === 1);
    const places = {
      octahedral: 6,
      tetragonal: 6,
      tetrahedral: 4,
      'square-planar': 4,
      'square-pyramidal': 5,
    };
    const geometries = Object.keys(places) as (keyof typeof places)[];
    fc.assert(
      fc.property(
        fc.constantFrom(...ions),
        fc.constantFrom(...single),
        fc.constantFrom(...single),
        fc.constantFrom(...geometries),
        fc.integer({ min: 0, max: 3 }),
        (ion, one, other, geometry, some) => {
          const total = places[geometry];
          const set =
            some === 0 || one.id === other.id
              ? { [one.id]: total }
              : { [one.id]: total - some, [other.id]: some };
          const outcome = predict(
            { id: 'p', metal: ion.symbol, oxidationState: ion.oxidationState, geometry, ligands: set },
            { draws: 3 },
          );
          expect(outcome.ok).toBe(true);
          if (outcome.ok) expect(notFinite(outcome.prediction)).toEqual([]);
        },
      ),
      { numRuns: 40, seed: 20 },
    );
  });
});
