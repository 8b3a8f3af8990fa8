import { describe, expect, it } from 'vitest';
import { complexKey, defaultLibrary } from '../../library';
import type { Composition } from '../../record/composition';
import type { ParameterSet } from '../../record/project';
import { basisFor, recalibrate, type Observation } from './index';

const octahedral = (metal: string, ligands: Record<string, number>): Composition => ({
  metal,
  oxidationState: 3,
  geometry: 'octahedral',
  ligands,
  isomer: null,
});
const [chromium, vanadium] = [octahedral('Cr', { im: 6 }), octahedral('V', { im: 6 })];

const set = (id: string, parentId: string | null, informedBy: readonly Composition[]): ParameterSet => ({
  ...{ id, parentId, revision: 0, createdAt: '2026-03-01T09:00:00.000Z', deletedAt: null },
  ...{ updatedAt: '2026-03-01T09:00:00.000Z', projectId: 'p', name: id, author: 'MK', reason: 'test' },
  ...{ hash: id, values: {}, informedBy: informedBy.map(complexKey) },
});

describe('what a recalibration starts from', () => {
  const old = set('old', null, [chromium]);
  const young = set('young', 'old', [chromium, vanadium]);
  const sets = [young, old];
  const evidence = (composition: Composition) => [{ composition }];

  it('is the set in use where its evidence is other than the new one', () => {
    expect(basisFor(evidence(octahedral('Ti', { im: 6 })), young, sets)).toBe(young);
  });

  it('is an ancestor or the library where the same complexes count already', () => {
    expect(basisFor(evidence(vanadium), young, sets)).toBe(old);
    expect(basisFor(evidence(chromium), young, sets)).toBeNull();
    expect(basisFor(evidence(chromium), null, sets)).toBeNull();
  });

  it('ends also where sets name each other as parents', () => {
    const [one, two] = [set('one', 'two', [chromium]), set('two', 'one', [chromium])];
    expect(basisFor(evidence(chromium), one, [one, two])).toBeNull();
  });
});

describe('two measurements of one complex', () => {
  const found = (id: string, value: number, u: number | null): Observation => ({
    id,
    composition: chromium,
    spin: null,
    tenDq: { value, u },
    B: null,
    library: defaultLibrary,
    source: 'test',
  });
  const kept = (...found: Observation[]) =>
    recalibrate(found).measuredComplexes[`complex.${complexKey(chromium)}.tenDq`]!;

  it('are kept as their weighted mean', () => {
    // Weights 1 and 4: (21 000 + 4 x 21 200) / 5; standard deviation 200 / sqrt 5.
    const { value, sigma } = kept(found('a', 21_000, 200), found('b', 21_200, 100));
    expect(value).toBeCloseTo(21_160, 8);
    expect(sigma).toBeCloseTo(200 / Math.sqrt(5), 8);
  });

  it('that disagree are less sure than each of them says', () => {
    // chi squared of 20 000 +- 100 and 22 000 +- 100 is 200 with one degree of freedom: a ratio of 14.1.
    expect(kept(found('a', 20_000, 100), found('b', 22_000, 100)).sigma).toBeCloseTo(1000, 6);
  });

  it('without a stated uncertainty counts with the usual one', () => {
    const { value } = kept(found('a', 21_000, null), found('b', 21_400, 428));
    expect(Math.abs(value - 21_200)).toBeLessThan(5);
  });
});
