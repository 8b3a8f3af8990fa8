import { describe, expect, it } from 'vitest';
import { ReadingError } from '../reading/types';
import { decodeAsdf } from './asdf';

const decode = (text: string, limit = 1000) =>
  decodeAsdf(
    text.split('\n').map((line, i) => ({ text: line, number: i + 1 })),
    limit,
  );
const refusal = (text: string, limit?: number): ReadingError => {
  try {
    decode(text, limit);
  } catch (error) {
    if (error instanceof ReadingError) return error;
  }
  throw new Error('was accepted');
};

describe('packed ordinates', () => {
  // The five forms of one and the same data, from memory of the example in McDonald and Wilks, Appl. Spectrosc. 42,
  // 151 (1988); characters for the digits are those of that paper: SQZ @ A-I a-i, DIF % J-R j-r, DUP S-Z s.
  const values = [1, 2, 3, 3, 2, 1, 0, -1, -2, -3];
  it.each([
    ['AFFN', '599 1 2 3 3 2 1 0 -1 -2 -3'],
    ['PAC', '599+1+2+3+3+2+1+0-1-2-3'],
    ['SQZ', '599ABCCBA@abc'],
    ['DIF', '599AJJ%jjjjjj'],
    ['DIF with DUP', '599AJT%jX'],
  ])('are the same in %s form', (_, text) => {
    expect(decode(text).ordinates).toEqual(values);
  });

  it('take E for a packed 5 unless a sign follows, which makes it an exponent', () => {
    expect(decode('400E37').ordinates).toEqual([537]);
    expect(decode('400 1.5E+02 1.5E-02').ordinates).toEqual([150, 0.015]);
    expect(decode('4.00E+02 7').checks[0]).toMatchObject({ x: 400, ulp: 1 });
  });

  it('repeat a difference, not the value, after a difference', () => {
    expect(decode('1AJU').ordinates).toEqual([1, 2, 3, 4]);
    expect(decode('1A%U').ordinates).toEqual([1, 1, 1, 1]);
    expect(decode('1 5 T').ordinates).toEqual([5, 5]);
  });

  it('keep a missing ordinate as null', () => {
    expect(decode('1 5 ? 7').ordinates).toEqual([5, null, 7]);
  });

  it('know which point the abscissa of a line after differences belongs to', () => {
    const { ordinates, checks } = decode('1AJJ\n3CJ\n4D');
    expect(ordinates).toEqual([1, 2, 3, 4]);
    expect(checks.map((check) => check.index)).toEqual([0, 2, 3]);
  });

  it('are refused with line and column when they make no sense', () => {
    expect(refusal('1AJJ\n3DJ')).toMatchObject({
      code: 'y-check',
      message: expect.stringContaining('line 2') as string,
    });
    expect(refusal('1 2 3x4')).toMatchObject({
      code: 'bad-character',
      message: expect.stringContaining('column 6') as string,
    });
    expect(refusal('1 12.5.3')).toMatchObject({ code: 'bad-character' });
    expect(refusal('1J')).toMatchObject({ code: 'y-check' });
    expect(refusal('1S5')).toMatchObject({ code: 'y-check' });
    expect(refusal('1 ? J')).toMatchObject({ code: 'y-check' });
    expect(refusal('xyz')).toMatchObject({ code: 'bad-number' });
    expect(refusal('100')).toMatchObject({ code: 'truncated' });
  });

  it('never expand beyond the limit', () => {
    expect(refusal('1AZ99999999', 100)).toMatchObject({ code: 'repeat-count' });
    expect(refusal('1 1 2 3', 2)).toMatchObject({ code: 'point-count' });
    expect(decode('1AZ9', 99).ordinates).toHaveLength(89);
  });
});
