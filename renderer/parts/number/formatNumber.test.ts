import { describe, expect, it } from 'vitest';
import { formatFigures, formatGiven, formatShare } from './formatNumber';
import { writeRange } from './formatRange';

const plain = (text: string | null) => text?.replace(/\u202f/g, ' ');

describe('numbers in words for the page', () => {
  it('keep three significant figures at most', () => {
    expect(plain(formatFigures(21_748))).toBe('21 700');
    expect(plain(formatFigures(724.6))).toBe('725');
    expect(plain(formatFigures(2.1573))).toBe('2.16');
    expect(plain(formatFigures(0.004567))).toBe('0.00457');
    expect(plain(formatFigures(1176.4))).toBe('1 180');
  });

  it('round up across a power of ten without gaining a figure', () => {
    expect(plain(formatFigures(9.999))).toBe('10.0');
    expect(plain(formatFigures(99_960))).toBe('100 000');
  });

  it('write a true minus sign, zero, and very large and very small numbers', () => {
    expect(formatFigures(-540)).toBe('−540');
    expect(formatFigures(0)).toBe('0');
    expect(formatFigures(4.61e-9)).toBe('4.61 × 10⁻⁹');
    expect(formatFigures(Infinity)).toBe('∞');
  });

  it('write a number that was set by hand as it was given', () => {
    expect(formatGiven(1)).toBe('1');
    expect(formatGiven(0.05)).toBe('0.05');
    expect(plain(formatGiven(12_500))).toBe('12 500');
  });

  it('write 10Dq of 21 750 with 8 % as 21 800 (20 000–23 500)', () => {
    const { value, range } = writeRange(21_750, 21_750 - 1_740, 21_750 + 1_740);
    expect(plain(value)).toBe('21 800');
    expect(plain(range)).toBe('20 000–23 500');
  });

  it('drop figures that the uncertainty denies', () => {
    const { value, range } = writeRange(14_467, 11_467, 17_467);
    expect(plain(value)).toBe('14 500');
    expect(plain(range)).toBe('11 500–17 500');
    expect(writeRange(1.234, -0.5, 3).value).toBe('1.2');
  });

  it('put "to" in place of a dash where an end is negative, and order the ends', () => {
    expect(plain(writeRange(100, 400, -200).range)).toBe('−200 to 400');
  });

  it('say "above" where the range has no upper end', () => {
    expect(plain(writeRange(600, 500, Infinity).range)).toBe('above 500');
  });

  it('never write a probability as certain unless it is', () => {
    expect(plain(formatShare(0.9996))).toBe('> 99 %');
    expect(plain(formatShare(0.0001))).toBe('< 1 %');
    expect(plain(formatShare(0.86))).toBe('86 %');
    expect(plain(formatShare(1))).toBe('100 %');
  });
});
