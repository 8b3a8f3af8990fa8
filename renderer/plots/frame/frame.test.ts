import { describe, expect, it } from 'vitest';
import { areaPath, linePath } from './path';
import { extent, linearScale, logScale, padded } from './scale';
import { nearestPoint, stepReading, type ReadSeries } from './series';
import { linearTicks, logTicks, niceStep } from './ticks';
import { isZoomed, windowWith, zoomAbout, zoomTo } from './zoom';

const plain = (texts: readonly string[]) => texts.map((text) => text.replace(/\u202f/g, ' '));

describe('scales', () => {
  it('lead to pixels and back, whichever way the axis runs', () => {
    const down = linearScale([0, 50], [300, 0]);
    expect(down(25)).toBe(150);
    expect(down.invert(150)).toBe(25);
    const log = logScale([0.01, 1000], [0, 500]);
    expect(log(1)).toBeCloseTo(200, 9);
    expect(log.invert(200)).toBeCloseTo(1, 9);
  });

  it('take extents of what is finite only', () => {
    expect(extent([3, NaN, -1, Infinity])).toEqual([-1, 3]);
    expect(extent([], [0, 1])).toEqual([0, 1]);
    expect(padded([4, 4])[0]).toBeLessThan(4);
  });
});

describe('ticks', () => {
  it('are 1, 2 or 5 times a power of ten', () => {
    expect([niceStep(100, 10), niceStep(45_000, 12), niceStep(0.7, 5)]).toEqual([10, 5000, 0.1]);
  });

  it('leave room for their figures along x', () => {
    const { values, text } = linearTicks([5_000, 50_000], 1_000, 'x');
    expect(plain(values.map(text)).slice(0, 3)).toEqual(['5 000', '10 000', '15 000']);
    const narrow = linearTicks([5_000, 50_000], 220, 'x').values;
    expect(narrow.length).toBeLessThan(4);
    expect(narrow.length).toBeGreaterThan(1);
  });

  it('write zero as zero and negative numbers with a true minus', () => {
    const { values, text } = linearTicks([-80, 80], 420, 'x');
    expect(values.map(text)).toContain('0');
    expect(values.map(text)).toContain('−20');
  });

  it('are powers of ten on a logarithmic axis', () => {
    const { values, text } = logTicks([0.01, 12_000], 10);
    expect(values[0]).toBeCloseTo(0.01);
    expect(plain(values.map(text)).at(-1)).toBe('10 000');
  });
});

describe('reading', () => {
  const series: ReadSeries[] = [
    { id: 'low', name: 'low', xs: [0, 1, 2], ys: [0, 1, 2], text: (index) => `low ${index}` },
    { id: 'high', name: 'high', xs: [0, 1, 2], ys: [5, 6, 7], text: (index) => `high ${index}` },
    { id: 'none', name: 'none', xs: [], ys: [], text: () => '' },
  ];
  const same = (x: number, y: number) => [x, y] as const;

  it('settles on the nearest x of each curve first, or on plain distance', () => {
    expect(nearestPoint(series, same, [1.1, 4], true)).toEqual({ series: 1, index: 1 });
    expect(nearestPoint(series, same, [1.9, 2.2], false)).toEqual({ series: 0, index: 2 });
    expect(nearestPoint([series[2]!], same, [0, 0], true)).toBeNull();
  });

  it('moves along a series by arrows and stops at its ends', () => {
    expect(stepReading(series, null, 'ArrowRight', 1)).toEqual({ series: 0, index: 0 });
    expect(stepReading(series, { series: 0, index: 1 }, 'ArrowRight', 10)).toEqual({ series: 0, index: 2 });
    expect(stepReading(series, { series: 0, index: 2 }, 'Home', 1)).toEqual({ series: 0, index: 0 });
  });

  it('changes to the curve above or below at the same place', () => {
    expect(stepReading(series, { series: 0, index: 1 }, 'ArrowUp', 1)).toEqual({ series: 1, index: 1 });
    expect(stepReading(series, { series: 1, index: 2 }, 'ArrowDown', 1)).toEqual({ series: 0, index: 2 });
  });

  it('reads nothing where there is nothing, and leaves other keys alone', () => {
    expect(stepReading([series[2]!], null, 'ArrowRight', 1)).toBeNull();
    expect(stepReading(series, null, 'a', 1)).toBeNull();
  });
});

describe('zoom', () => {
  const whole = { x: [0, 100], y: [0, 10] } as const;

  it('keeps the point it is about in place and never leaves the whole', () => {
    const near = zoomAbout(whole, whole, { x: 25, y: 5 }, 0.5, 'xy');
    expect(near.x).toEqual([12.5, 62.5]);
    expect(near.y).toEqual([2.5, 7.5]);
    expect(zoomAbout(near, whole, { x: 25, y: 5 }, 10, 'xy')).toEqual({ x: [0, 100], y: [0, 10] });
  });

  it('shows the rectangle between two corners, or only its breadth', () => {
    expect(zoomTo(whole, { x: 80, y: 9 }, { x: 20, y: 1 }, 'xy')).toEqual({ x: [20, 80], y: [1, 9] });
    expect(zoomTo(whole, { x: 80, y: 9 }, { x: 20, y: 1 }, 'x').y).toEqual([0, 10]);
    expect(isZoomed(whole, whole)).toBe(false);
  });
});

describe('a zoomed window', () => {
  const whole = { x: [0, 100], y: [0, 10] } as const;
  const part = { x: [10, 30], y: [2, 4] } as const;

  it('follows the point being read, without changing its size or leaving the whole', () => {
    expect(windowWith(part, whole, { x: 50, y: 3 }, 'xy')).toEqual({ x: [40, 60], y: [2, 4] });
    expect(windowWith(part, whole, { x: 100, y: 9.5 }, 'xy')).toEqual({ x: [80, 100], y: [8, 10] });
    expect(windowWith(part, whole, { x: 20, y: 9 }, 'x')).toEqual(part);
  });
});

describe('paths', () => {
  const one = linearScale([0, 1], [0, 1]);

  it('lift the pen where a value is missing', () => {
    expect(linePath([0, 1, 2, 3], [0, NaN, 2, 3], one, one)).toBe('M0.0 0.0M2.0 2.0L3.0 3.0');
  });

  it('close an area between two curves', () => {
    expect(areaPath([0, 1], [0, 0], [1, 1], one, one)).toBe('M0.0 1.0L1.0 1.0L1.0 0.0L0.0 0.0Z');
    expect(areaPath([], [], [], one, one)).toBe('');
  });
});
