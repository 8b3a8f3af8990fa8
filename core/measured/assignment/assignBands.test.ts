import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { assignBands, priceOfNone, type PredictedBand } from './assignBands';
import { hungarian } from './hungarian';
import { rankedAssignments } from './ranked';

const permutations = (items: number[]): number[][] =>
  items.length === 0
    ? [[]]
    : items.flatMap((item, i) =>
        permutations(items.filter((_, k) => k !== i)).map((rest) => [item, ...rest]),
      );
const matrix = (rows: number, columns: number) =>
  fc.array(fc.array(fc.integer({ min: 0, max: 50 }), { minLength: columns, maxLength: columns }), {
    minLength: rows,
    maxLength: rows,
  });

describe('the cheapest assignment', () => {
  it('is as cheap as the cheapest of all permutations', () => {
    fc.assert(
      fc.property(matrix(4, 5), (cost) => {
        const best = Math.min(
          ...permutations([0, 1, 2, 3, 4]).map((p) => cost.reduce((sum, row, i) => sum + row[p[i]!]!, 0)),
        );
        const found = hungarian(cost)!;
        expect(new Set(found).size).toBe(4);
        expect(found.reduce((sum, j, i) => sum + cost[i]![j]!, 0)).toBe(best);
      }),
      { numRuns: 200 },
    );
  });

  it('and the ones after it come in order, none twice, as a full list of permutations has them', () => {
    fc.assert(
      fc.property(matrix(3, 4), (cost) => {
        const all = [...new Set(permutations([0, 1, 2, 3]).map((p) => p.slice(0, 3).join()))]
          .map((key) => key.split(',').reduce((sum, j, i) => sum + cost[i]![Number(j)]!, 0))
          .sort((a, b) => a - b);
        const ranked = rankedAssignments(cost, 30);
        expect(new Set(ranked.map((each) => each.columns.join())).size).toBe(24);
        expect(ranked.map((each) => each.cost)).toEqual(all);
      }),
      { numRuns: 100 },
    );
  });
});

// Predicted bands of hexaaquanickel(II) with 10Dq 8500, B 940, C 3760, which the level tests check against published
// diagrams; measured maxima as commonly quoted, about 8500, 13 800, 15 200 (weak), 25 300 cm-1.
const predicted: PredictedBand[] = [
  { energy_cm1: 8500, sigma_cm1: 500, label: '3T2g', multiplicity: 3, molarAbsorptivity: 5 },
  { energy_cm1: 14_160, sigma_cm1: 700, label: '3T1g', multiplicity: 3, molarAbsorptivity: 5 },
  { energy_cm1: 14_467, sigma_cm1: 700, label: '1Eg', multiplicity: 1, molarAbsorptivity: 0.1 },
  { energy_cm1: 25_440, sigma_cm1: 900, label: '3T1g', multiplicity: 3, molarAbsorptivity: 5 },
];
const measured = [
  { energy_cm1: 8500, u_cm1: 100, molarAbsorptivity: 2 },
  { energy_cm1: 13_800, u_cm1: 100, molarAbsorptivity: 2 },
  { energy_cm1: 25_300, u_cm1: 100, molarAbsorptivity: 5 },
];

describe('the assignment of bands', () => {
  it('pairs strong bands with spin-allowed transitions, though a spin-forbidden one lies near', () => {
    const { best } = assignBands(measured, predicted)!;
    expect(best.pairs.map((pair) => pair.predicted)).toEqual([0, 1, 3]);
  });

  it('lists the next best with what it costs more', () => {
    const { best, alternatives } = assignBands(measured, predicted)!;
    expect(alternatives[1]!.pairs.map((pair) => pair.predicted)).toEqual([0, 2, 3]);
    expect(alternatives[1]!.cost).toBeGreaterThan(best.cost);
  });

  it('keeps to what the user chose, and says what the choice costs', () => {
    const { best, priceOfChoices } = assignBands(measured, predicted, { fixed: [undefined, 2, undefined] })!;
    expect(best.pairs[1]!.predicted).toBe(2);
    expect(priceOfChoices).toBeGreaterThan(0);
    expect(
      assignBands(measured, predicted, { fixed: [null, undefined, undefined] })!.best.pairs[0]!.predicted,
    ).toBeNull();
  });

  it('leaves a band alone that no prediction comes near', () => {
    const { best } = assignBands([...measured, { energy_cm1: 40_000, u_cm1: 100 }], predicted)!;
    expect(best.pairs[3]).toEqual({ predicted: null, cost: priceOfNone, z: null });
  });

  it('with two choices of one transition does not exist', () => {
    expect(assignBands(measured, predicted, { fixed: [1, 1, undefined] })).toBeNull();
  });

  it('of nothing to nothing is empty', () => {
    expect(assignBands([], predicted)!.best).toEqual({ pairs: [], cost: 0 });
    expect(assignBands(measured, [])!.best.pairs.every((pair) => pair.predicted === null)).toBe(true);
  });
});
