import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../library';
import { checkWish } from '../wish/checkWish';
import { neededFields } from './neededField';

const wish = (ions: string[]) => {
  const checked = checkWish({ name: 'x', ions }, defaultLibrary);
  if (!checked.ok) throw new Error(checked.problems[0]!.message);
  return checked.value;
};

describe('the field that a window needs', () => {
  it('is the window itself for the first band of octahedral chromium(III), which is 10Dq (Tanabe and Sugano 1954)', () => {
    const fields = neededFields({ from_nm: 550, to_nm: 600 }, 'octahedral', wish(['Cr3+']), defaultLibrary);
    const first = fields.find(({ band }) => band === '4T2g');
    expect(first!.tenDq[0]).toBeGreaterThanOrEqual(1e7 / 600 - 100);
    expect(first!.tenDq[1]).toBeLessThanOrEqual(1e7 / 550 + 100);
    // Five per cent of 10Dq are five per cent of that band.
    expect(first!.fivePercent_cm1 / (0.05 * ((first!.tenDq[0] + first!.tenDq[1]) / 2))).toBeCloseTo(1, 1);
    // Water lies there: 17 400 cm-1 (common practice).
    expect(first!.ligands.map(({ id }) => id)).toContain('h2o');
  });

  it('of titanium(III) has one band, 10Dq itself', () => {
    const fields = neededFields({ from_nm: 480, to_nm: 520 }, 'octahedral', wish(['Ti3+']), defaultLibrary);
    expect(fields.map(({ band }) => band)).toEqual(['2Eg']);
  });
});
