import { describe, expect, it } from 'vitest';
import { isDataRow, readCell } from './cells';

describe('a cell of a spectrum table', () => {
  it.each([
    'Over',
    'OVERFLOW',
    'OVRFLW',
    'over range',
    'OVRNG',
    'SAT',
    'saturated',
    '****',
    '>4.0',
    '> 3,5',
    'inf',
    '---',
    'Off scale',
  ])('that says %s is saturated', (text) => expect(readCell(text, '.').kind).toBe('saturated'));

  it.each(['NaN', 'n/a', '?', '-', '<0.001'])('that says %s is missing', (text) =>
    expect(readCell(text, '.').kind).toBe('missing'),
  );

  it.each(['Oval', 'overview 3', 'A', '1.2.3', '0x1F', '5 nm', '1e999'])('that says %s is text', (text) =>
    expect(readCell(text, '.').kind).toBe('text'),
  );

  it('is a number with the decimal sign of the file only', () => {
    expect(readCell('0,5', ',')).toMatchObject({ value: 0.5 });
    expect(readCell('0,5', '.').kind).toBe('text');
    expect(readCell('1.5e-03', '.')).toMatchObject({ value: 0.0015 });
  });

  it('with grouped thousands is a number, doubtful where it could be a decimal', () => {
    expect(readCell('12.500,0', ',')).toMatchObject({ value: 12_500, thousands: 'clear' });
    expect(readCell('12.500', ',')).toMatchObject({ value: 12_500, thousands: 'doubtful' });
    expect(readCell('0.500', ',').kind).toBe('text');
  });
});

it('a row of a table has two cells that are numbers or stand for one', () => {
  const row = (...cells: string[]) => isDataRow(cells.map((cell) => readCell(cell, '.')));
  expect(row('400', 'Over')).toBe(true);
  expect(row('', '', '400', '0.1')).toBe(true);
  expect(row('400')).toBe(false);
  expect(row('400', 'blue')).toBe(false);
  expect(row('Over', '---')).toBe(false);
});
