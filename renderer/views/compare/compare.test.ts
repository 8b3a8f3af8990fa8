// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { complexKey, defaultLibrary } from '../../../core/library';
import { compareItem, compositionOf, namesIn } from './compareItem';
import { orderCsv, orderList } from './order/orderList';

const composition = {
  metal: 'Co',
  oxidationState: 3,
  geometry: 'octahedral',
  ligands: { en: 2, cn: 2 },
  isomer: 'trans',
} as const;

describe('the address of a comparison', () => {
  it('names complexes so that they come back as they were', () => {
    const names = ['01a2-id', complexKey(composition), complexKey({ ...composition, isomer: null })];
    expect(namesIn(compareItem(names))).toEqual(names);
    expect(compositionOf(names[1]!, defaultLibrary)).toEqual(composition);
    expect(compositionOf(names[2]!, defaultLibrary)).toEqual({ ...composition, isomer: null });
  });

  it('with a name that makes no sense gives nothing', () => {
    for (const name of ['', 'x', 'Co3+;round;en*3;', 'Co3+;octahedral;nothing*6;', 'Co3+;octahedral;en*x;'])
      expect(compositionOf(name, defaultLibrary)).toBeNull();
    expect(namesIn(null)).toEqual([]);
  });
});

describe('an order list', () => {
  const complexes = [
    { formula: '[Co(CN)2(en)2]+', composition },
    { formula: '[Co(en)3]3+', composition: { ...composition, ligands: { en: 3 }, isomer: null } },
  ];
  const list = orderList(complexes, new Set(['en']), defaultLibrary);

  it('names each thing once, what is missing before what is at hand, with what it is for', () => {
    expect(list.lines.map(({ short }) => short)).toEqual(['Co(III)', 'CN', 'en']);
    expect(list.lines.at(-1)).toMatchObject({
      onShelf: true,
      uses: [
        { complex: '[Co(CN)2(en)2]+', count: 2 },
        { complex: '[Co(en)3]3+', count: 3 },
      ],
    });
  });

  it('cannot be had without its cautions', () => {
    // Cyanide: very toxic gas with acids (EUH032, CLP Annex II).
    const csv = orderCsv(list, 'general caution only');
    expect(csv).toContain('EUH032');
    expect(csv).toContain('general caution only');
    const none = orderCsv({ lines: list.lines, cautions: [] }, 'general caution only');
    expect(none).toContain('not assessed, not safe');
  });
});
