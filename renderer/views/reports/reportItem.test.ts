import { describe, expect, it } from 'vitest';
import { mostOf, readReportItem, reportItem } from './reportItem';

describe('what a report is about', () => {
  it('comes back from an address as it was written', () => {
    for (const item of [
      { kind: 'card', names: ['a'] },
      { kind: 'comparison', names: ['a', 'Cr3+;octahedral;cl*2,en*2;cis'] },
      { kind: 'agreement', names: [] },
    ] as const)
      expect(readReportItem(reportItem(item))).toEqual(item);
  });

  it('is a candidate card where an address makes no sense', () => {
    expect(readReportItem(null)).toEqual({ kind: 'card', names: [] });
    expect(readReportItem('poster:x')).toEqual({ kind: 'card', names: [] });
  });

  it('never asks for more complexes than a page holds', () => {
    const { names } = readReportItem(`comparison:${Array.from({ length: 9 }, (_, i) => i).join('|')}`);
    expect(names).toHaveLength(mostOf('comparison'));
  });
});
