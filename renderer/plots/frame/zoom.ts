import { type Interval } from './scale';

/** The part of both axes that is shown. */
export interface Window {
  readonly x: Interval;
  readonly y: Interval;
}

const forwards = ([from, to]: Interval): boolean => from <= to;

/** Keeps `part` inside `whole`, in the direction of `whole`. */
function inside(part: Interval, whole: Interval): Interval {
  const [low, high] = forwards(whole) ? whole : [whole[1], whole[0]];
  const [from, to] = forwards(part) ? part : [part[1], part[0]];
  const length = Math.min(to - from, high - low);
  const start = Math.max(low, Math.min(from, high - length));
  return forwards(whole) ? [start, start + length] : [start + length, start];
}

const scaled = ([from, to]: Interval, about: number, factor: number): Interval => [
  about + (from - about) * factor,
  about + (to - about) * factor,
];

/** The window `factor` times as long, about a point; never beyond the whole. */
export function zoomAbout(
  now: Window,
  whole: Window,
  about: { x: number; y: number },
  factor: number,
  axes: 'x' | 'xy',
): Window {
  return {
    x: inside(scaled(now.x, about.x, factor), whole.x),
    y: axes === 'x' ? now.y : inside(scaled(now.y, about.y, factor), whole.y),
  };
}

/** The window between two corners, in the direction of the axes. */
export function zoomTo(
  whole: Window,
  one: { x: number; y: number },
  other: { x: number; y: number },
  axes: 'x' | 'xy',
): Window {
  return {
    x: inside([one.x, other.x], whole.x),
    y: axes === 'x' ? whole.y : inside([one.y, other.y], whole.y),
  };
}

const follow = (shown: Interval, whole: Interval, value: number): Interval => {
  const [low, high] = forwards(shown) ? shown : [shown[1], shown[0]];
  if (value >= low && value <= high) return shown;
  const half = (shown[1] - shown[0]) / 2;
  return inside([value - half, value + half], whole);
};

/** The window moved, not resized, so that a place comes into sight; y moves only where it can be zoomed. */
export const windowWith = (
  now: Window,
  whole: Window,
  at: { x: number; y: number },
  axes: 'x' | 'xy',
): Window => ({
  x: follow(now.x, whole.x, at.x),
  y: axes === 'x' ? now.y : follow(now.y, whole.y, at.y),
});

/** Whether less than the whole is shown. */
export const isZoomed = (now: Window, whole: Window): boolean =>
  now.x[0] !== whole.x[0] || now.x[1] !== whole.x[1] || now.y[0] !== whole.y[0] || now.y[1] !== whole.y[1];
