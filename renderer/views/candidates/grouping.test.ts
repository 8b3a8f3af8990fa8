import { describe, expect, it } from 'vitest';
import { groupRows, TableLines } from './grouping';
import type { TableRow } from './tableRow';

const row = (id: string, metal: string, oxidationState: number, tags: string[] = []): TableRow =>
  ({
    candidate: { id, tags, composition: { metal, oxidationState, geometry: 'octahedral' } },
    summary: undefined,
  }) as unknown as TableRow;

const rows = [row('a', 'Fe', 3), row('b', 'Co', 3, ['made']), row('c', 'Fe', 2), row('d', 'Co', 3)];
const told = (by: 'metal' | 'tag' | 'spin') => {
  const { rows: grouped, groups } = groupRows(rows, by);
  return groups.map(({ label, start, count }) => [
    label,
    grouped
      .slice(start, start + count)
      .map(({ candidate }) => candidate.id)
      .join(''),
  ]);
};

describe('grouping', () => {
  it('keeps the order of the rows within a group and loses none', () => {
    expect(told('metal')).toEqual([
      ['Co(III)', 'bd'],
      ['Fe(II)', 'c'],
      ['Fe(III)', 'a'],
    ]);
  });

  it('puts what has no value last and says so', () => {
    expect(told('tag')).toEqual([
      ['made', 'b'],
      ['no tag', 'acd'],
    ]);
    expect(told('spin')).toEqual([['no spin state', 'abcd']]);
  });

  it('leaves the list as it is without a grouping', () => {
    expect(groupRows(rows, 'none')).toEqual({ rows, groups: [] });
  });

  it('finds line and row of each other, with headings and without', () => {
    for (const by of ['none', 'metal', 'tag'] as const) {
      const { groups } = groupRows(rows, by);
      const lines = new TableLines(rows.length, groups);
      const seen = Array.from({ length: lines.count }, (_, line) => lines.at(line));
      expect(seen.filter((line) => 'group' in line)).toHaveLength(groups.length);
      expect(seen.flatMap((line) => ('place' in line ? [line.place] : []))).toEqual([0, 1, 2, 3]);
      for (let place = 0; place < rows.length; place++) {
        expect(lines.at(lines.ofRow(place))).toEqual({ place });
      }
    }
  });
});
