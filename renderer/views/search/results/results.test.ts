// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../../../core/library';
import type { SearchResult } from '../../../../core/search';
import { costOf } from './costs';
import { oneOfEach } from './oneOfEach';
import { partName } from './partNames';

const result = (metal: string, ligands: Record<string, number>, probability = 0.5): SearchResult => ({
  id: `${metal} ${JSON.stringify(ligands)}`,
  metal,
  oxidationState: 3,
  geometry: 'octahedral',
  ligands,
  formula: metal,
  probability,
  parts: [],
});

describe('results', () => {
  it('show the best of each idea and say how many stand behind it', () => {
    const list = [
      result('Cr', { nh3: 5, cl: 1 }, 0.9),
      result('Co', { nh3: 5, cl: 1 }, 0.8),
      result('Cr', { cl: 2, nh3: 4 }, 0.7),
    ];
    expect(oneOfEach(list).map((each) => [each.result, each.variants])).toEqual([
      [list[0], 2],
      [list[1], 1],
    ]);
  });

  it('cost what is not at hand, what is mixed, and what is dangerous', () => {
    const mixed = result('Cr', { nh3: 5, cl: 1 });
    const cost = (kind: Parameters<typeof costOf>[1], each = mixed) =>
      costOf(each, kind, new Set(['cl']), defaultLibrary);
    expect(cost('new')).toBe(1);
    expect(cost('kinds')).toBe(2);
    // Cyanide is fatal if swallowed (H300, CLP Annex VI); water carries no statement.
    expect(cost('cautions', result('Cr', { cn: 6 }))).toBeGreaterThan(
      cost('cautions', result('Cr', { h2o: 6 })),
    );
  });

  it('name their parts as the form does', () => {
    expect(['bands[0]', 'bands[1]', 'tenDq_cm1', 'something'].map(partName)).toEqual([
      'absorbs',
      'absorbs (2)',
      '10Dq',
      'something',
    ]);
  });
});
