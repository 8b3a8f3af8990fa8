import { describe, expect, it } from 'vitest';
import type { TableRow } from './tableRow';
import { sortRows } from './sorting';

const row = (id: string, tenDq: number | null): TableRow =>
  ({
    candidate: { id, createdAt: '2026-03-01T09:00:00Z' },
    summary: { ok: true, formula: id, tenDq: tenDq === null ? null : { value: tenDq, sigma: null } },
    distance: null,
  }) as unknown as TableRow;
const ids = (rows: readonly TableRow[]) => rows.map(({ candidate }) => candidate.id).join('');

describe('ranking', () => {
  const rows = [row('d', 20), row('b', null), row('c', 10), row('a', 20)];

  it('puts what has no value last in both directions and equals in the order of entry', () => {
    expect(ids(sortRows(rows, { by: 'tenDq', descending: false }))).toBe('cadb');
    expect(ids(sortRows(rows, { by: 'tenDq', descending: true }))).toBe('adcb');
  });

  it('sorts formulas with their figures as numbers', () => {
    const formulas = [row('[Cr(NH3)10]', 1), row('[Cr(NH3)2]', 1)];
    expect(sortRows(formulas, { by: 'formula', descending: false })[0]!.candidate.id).toBe('[Cr(NH3)2]');
  });

  it('orders 50 000 rows in well under a second', () => {
    const many = Array.from({ length: 50_000 }, (_, index) => row(String(index), (index * 7919) % 50_021));
    const start = performance.now();
    const sorted = sortRows(many, { by: 'tenDq', descending: false });
    expect(performance.now() - start).toBeLessThan(500);
    expect((sorted[0]!.summary as { tenDq: { value: number } }).tenDq.value).toBe(0);
  });
});
