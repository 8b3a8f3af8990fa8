import type { CurveData } from '../../record/curve';

export interface RangeRemark {
  readonly code: 'beyond trust' | 'high' | 'weak';
  readonly message: string;
}

/**
 * What the size of the absorbance says about its worth. Common practice: 1-2 % accuracy between 0.1 and 1, best near 0.4;
 * above 2 less than 1 % of the light comes through and stray light bends the curve.
 */
export function absorbanceSanity(curve: Pick<CurveData, 'x' | 'y' | 'yUnit'>): RangeRemark[] {
  if (curve.yUnit !== 'absorbance') return [];
  const remarks: RangeRemark[] = [];
  const values = curve.y.filter((value) => value !== null);
  const largest = Math.max(...values, -Infinity);
  const count = (low: number, high: number) => values.filter((value) => value > low && value <= high).length;
  const points = (n: number) => `${n} point${n === 1 ? '' : 's'}`;
  const beyond = count(2, Infinity);
  if (beyond > 0) {
    remarks.push({
      code: 'beyond trust',
      message: `${points(beyond)} above absorbance 2 (largest ${largest.toFixed(2)}): stray light and noise; dilute, or leave them out`,
    });
  }
  const high = count(1, 2);
  if (high > 0)
    remarks.push({
      code: 'high',
      message: `${points(high)} between absorbance 1 and 2: less accurate than 1-2 %`,
    });
  if (values.length > 0 && largest < 0.1) {
    remarks.push({
      code: 'weak',
      message: `no absorbance above 0.1 (largest ${largest.toFixed(3)}): a longer path or a stronger solution would help`,
    });
  }
  return remarks;
}
