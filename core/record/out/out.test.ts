import { describe, expect, it } from 'vitest';
import { toCsv } from './csv';
import { curveCsv } from './curveCsv';
import { siTable, siTableCsv, siTableText, type SiBand } from './siTable';
import { uncertainText } from './uncertainText';

describe('delimited text', () => {
  it('quotes what RFC 4180 asks for and nothing else', () => {
    expect(toCsv([['a', 'b "c"', 'd,e', 'f\ng', 1.5, null]])).toBe('a,"b ""c""","d,e","f\ng",1.5,\r\n');
  });

  it('does not let a spreadsheet run a cell as a formula, and leaves negative numbers alone', () => {
    for (const text of ['=1+1', '+1', '-1+2', '@SUM(A1)', '\t=1', ' =1', '\r=1']) {
      expect(toCsv([[text]]).replace(/^"/, '')).toMatch(/^'/);
    }
    expect(toCsv([[-0.5, 'x=1']])).toBe('-0.5,x=1\r\n');
  });

  it('writes decimal commas with another delimiter only', () => {
    expect(toCsv([[0.5, 2]], { delimiter: ';', decimal: ',' })).toBe('0,5;2\r\n');
    expect(() => toCsv([[1]], { delimiter: ',', decimal: ',' })).toThrow(RangeError);
  });

  it('of a spectrum names quantity and unit', () => {
    const text = curveCsv({ kind: 'curve', xUnit: 'nm', yUnit: 'absorbance', x: [400, 401], y: [0.1, null] });
    expect(text).toBe('Wavelength (nm),Absorbance\r\n400,0.1\r\n401,\r\n');
  });
});

describe('a value with its uncertainty', () => {
  // GUM (JCGM 100:2008), 7.2.2: 100.021 47(35) g; one digit of the uncertainty, two where it begins with 1.
  it.each([
    [13.0, 0.176, '13.00(18)'],
    [13.0, 0.24, '13.0(2)'],
    [100.02147, 0.00035, '100.0215(4)'],
    [17_423, 140, '17420(140)'],
    [17_423, 300, '17400(300)'],
    [0.0123, null, '0.0123'],
  ])('%d with %d is written %s', (value, u, text) => expect(uncertainText(value, u)).toBe(text));

  it('that is not there is a dash', () => expect(uncertainText(null, 1)).toBe('–'));
});

describe('a table for supporting information', () => {
  const band = (compound: string, energy: number, change: Partial<SiBand> = {}): SiBand => ({
    compound,
    medium: 'water',
    energy_cm1: { value: energy, u: 100 },
    feature: 'maximum',
    molarAbsorptivity: { value: 13.0, u: 0.18 },
    width_cm1: 3600,
    assignment: '4A2g → 4T2g',
    calculated_cm1: 17_300,
    ...change,
  });

  it('keeps compounds together, bands ascending, and converts the uncertainty to nm', () => {
    const { header, rows } = siTable([band('B', 24_500), band('A', 30_000), band('B', 17_400)]);
    expect(rows.map((row) => [row[0], row[3]])).toEqual([
      ['B', '17400(100)'],
      ['B', '24500(100)'],
      ['A', '30000(100)'],
    ]);
    expect(rows[0]![2]).toBe('575(3)');
    expect(header).toHaveLength(rows[0]!.length);
  });

  it('says whether a position is a maximum, a shoulder or a fitted centre', () => {
    expect(siTable([band('A', 17_400, { feature: 'shoulder' })]).rows[0]).toContain('shoulder');
  });

  it('is safe as CSV and aligned as text', () => {
    expect(siTableCsv([band('=cmd', 17_400)])).toContain("'=cmd");
    const lines = siTableText([band('A', 17_400), band('[Cr(H2O)6]3+', 24_500)])
      .trimEnd()
      .split('\n');
    expect(lines).toHaveLength(3);
    expect(new Set(lines.map((line) => line.indexOf('maximum')).slice(1)).size).toBe(1);
  });
});
