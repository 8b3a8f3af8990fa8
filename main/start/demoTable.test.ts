import { describe, expect, it } from 'vitest';
import { demoProject } from '../../core/library/demo';
import { demoTable } from './demoTable';

const lines = demoTable().split('\n');

describe('demo project without a window', () => {
  it('ranks every candidate by the distance of its colour from the target', () => {
    const rows = lines.filter((line) => /^\s*\d+ {2}\[/.test(line));
    expect(rows).toHaveLength(demoProject.candidates.length);
    const distances = rows.flatMap((row) => /(\d+\.\d)$/.exec(row)?.[1] ?? []).map(Number);
    expect(distances.length).toBeGreaterThan(30);
    expect(distances).toEqual([...distances].sort((a, b) => a - b));
  });

  it('says what the numbers are worth and does not leave the cautions out', () => {
    expect(lines.join(' ')).toMatch(/± is one standard deviation/);
    expect(lines.join(' ')).toMatch(/Read the current safety data sheets/);
    expect(Math.max(...lines.map((line) => line.length))).toBeLessThanOrEqual(110);
  });
});
