import { ReadingError, type ReadSpectrum, type ReadingWarning } from './types';

export interface RawPoints {
  readonly x: readonly number[];
  readonly y: readonly (number | null)[];
}

type Ordered = Pick<ReadSpectrum, 'x' | 'y' | 'fileOrder'>;

/**
 * Puts the points of a curve in ascending x. The file must run one way: a curve that turns back holds two curves or a
 * mistake and is refused with the place named. Equal neighbours are kept and reported.
 * `where(i)` says where point i stands in the file.
 */
export function orderCurve(
  points: RawPoints,
  where: (index: number) => string,
  warnings: ReadingWarning[],
  name: string,
): Ordered {
  const { x, y } = points;
  if (x.length < 2) {
    throw new ReadingError(
      'too-few-points',
      `${name} has ${x.length} point${x.length === 1 ? '' : 's'}: a spectrum needs two or more`,
    );
  }
  const duplicates: number[] = [];
  let direction = 0;
  for (let i = 1; i < x.length; i++) {
    const step = Math.sign(x[i]! - x[i - 1]!);
    if (step === 0) duplicates.push(x[i]!);
    else if (direction === 0) direction = step;
    else if (step !== direction) {
      throw new ReadingError(
        'not-monotonic',
        `${name} runs back from ${x[i - 1]} to ${x[i]} at ${where(i)}: two curves in one column, or a damaged line`,
      );
    }
  }
  if (direction === 0) throw new ReadingError('too-few-points', `${name} has only one value of x`);
  if (duplicates.length > 0) {
    const list = [...new Set(duplicates)].slice(0, 5).join(', ');
    warnings.push({
      code: 'duplicate-x',
      message: `${name} has duplicate x: ${duplicates.length} point${duplicates.length === 1 ? '' : 's'} (${list}); all are kept`,
    });
  }
  if (direction > 0) return { x: [...x], y: [...y], fileOrder: 'ascending' };
  return { x: x.toReversed(), y: y.toReversed(), fileOrder: 'descending' };
}

/** Peaks in ascending x; a peak list has no direction. */
export function orderPeaks(points: RawPoints): Ordered {
  const order = points.x.map((_, i) => i).sort((a, b) => points.x[a]! - points.x[b]!);
  const falling = points.x.length > 1 && order[0] !== 0;
  return {
    x: order.map((i) => points.x[i]!),
    y: order.map((i) => points.y[i]!),
    fileOrder: falling ? 'descending' : 'ascending',
  };
}

/** Digits beyond the precision of the file come from binary arithmetic and are cut off. */
export const tidy = (value: number, digits = 15): number => Number(value.toPrecision(digits));
