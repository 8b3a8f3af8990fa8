import { type ReactElement } from 'react';

/** Marker outlines around (0, 0), 5 px in radius, told apart in black and white. */
const outlines = [
  'M5 0A5 5 0 1 1 -5 0A5 5 0 1 1 5 0Z',
  'M-4.5 -4.5H4.5V4.5H-4.5Z',
  'M0 -6L5.6 4.2H-5.6Z',
  'M0 -6.4L6.4 0L0 6.4L-6.4 0Z',
  'M0 6L5.6 -4.2H-5.6Z',
  'M-5 -5L5 5M-5 5L5 -5',
  'M-6 0H6M0 -6V6',
  'M-4.5 -4.5L4.5 -4.5L0 0L4.5 4.5L-4.5 4.5L0 0Z',
] as const;

interface MarkerProps {
  readonly group: number;
  readonly x: number;
  readonly y: number;
  readonly filled?: boolean;
}

/** The marker of a group. Beyond eight groups the shapes return, filled. */
export function Marker({ group, x, y, filled = false }: MarkerProps): ReactElement {
  const solid = filled || group >= outlines.length;
  return (
    <path
      className={solid ? 'marker marker-solid' : 'marker'}
      transform={`translate(${x} ${y})`}
      d={outlines[group % outlines.length]}
    />
  );
}

/** A shape for Recharts' `Scatter`, which passes the place as `cx` and `cy`. */
export const markerShape =
  (group: number) =>
  ({ cx = 0, cy = 0 }: { readonly cx?: number; readonly cy?: number }): ReactElement => (
    <Marker group={group} x={cx} y={cy} />
  );

/** Legend entries for groups; none where there is only one. */
export const markerLegend = (names: readonly string[]) =>
  names.length < 2
    ? []
    : names.map((name, group) => ({ text: name || 'other', sample: <Marker group={group} x={16} y={7} /> }));
