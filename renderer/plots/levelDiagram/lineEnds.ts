import { type Interval } from '../frame/scale';
import { type LevelLine } from './levelLine';

/** Where a line leaves the shown part: through the right edge or through the top. */
export type LineEnd =
  | { readonly line: LevelLine; readonly edge: 'right'; readonly y: number }
  | { readonly line: LevelLine; readonly edge: 'top'; readonly x: number };

/** Height of a line at `x`, linear between its points; null outside them. */
export function heightAt({ points }: LevelLine, x: number): number | null {
  for (let index = 1; index < points.length; index++) {
    const [one, other] = [points[index - 1]!, points[index]!];
    if (x < one.x || x > other.x) continue;
    const share = other.x === one.x ? 0 : (x - one.x) / (other.x - one.x);
    return one.y + share * (other.y - one.y);
  }
  return points.length === 1 && points[0]!.x === x ? points[0]!.y : null;
}

/** The place at which a line is labelled; null where none of it is shown. */
export function lineEnd(line: LevelLine, shownX: Interval, shownY: Interval): LineEnd | null {
  const last = Math.min(shownX[1], line.points.at(-1)?.x ?? -Infinity);
  const atRight = heightAt(line, last);
  if (atRight === null) return null;
  if (atRight <= shownY[1]) return atRight >= shownY[0] ? { line, edge: 'right', y: atRight } : null;
  for (let index = line.points.length - 1; index > 0; index--) {
    const [one, other] = [line.points[index - 1]!, line.points[index]!];
    if (one.x > last || one.y > shownY[1] === other.y > shownY[1]) continue;
    const x = one.x + ((shownY[1] - one.y) / (other.y - one.y)) * (other.x - one.x);
    if (x >= shownX[0] && x <= last) return { line, edge: 'top', x };
  }
  return null;
}
