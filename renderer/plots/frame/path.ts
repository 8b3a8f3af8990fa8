import { type Scale } from './scale';

const place = (value: number): string => value.toFixed(1);

/** SVG path through the points; values that are not finite lift the pen. */
export function linePath(xs: ArrayLike<number>, ys: ArrayLike<number>, x: Scale, y: Scale): string {
  let path = '';
  let down = false;
  for (let index = 0; index < xs.length; index++) {
    const [px, py] = [x(xs[index]!), y(ys[index]!)];
    if (!Number.isFinite(px) || !Number.isFinite(py)) {
      down = false;
      continue;
    }
    path += `${down ? 'L' : 'M'}${place(px)} ${place(py)}`;
    down = true;
  }
  return path;
}

/** Closed area between two curves over the same x. */
export function areaPath(
  xs: ArrayLike<number>,
  low: ArrayLike<number>,
  high: ArrayLike<number>,
  x: Scale,
  y: Scale,
): string {
  const points: string[] = [];
  for (let index = 0; index < xs.length; index++)
    points.push(`${place(x(xs[index]!))} ${place(y(high[index]!))}`);
  for (let index = xs.length - 1; index >= 0; index--) {
    points.push(`${place(x(xs[index]!))} ${place(y(low[index]!))}`);
  }
  return points.length === 0 ? '' : `M${points.join('L')}Z`;
}
