import { type ReadPoint } from './series';
import { linearScale, logScale, type Interval, type Scale } from './scale';
import { linearTicks, logTicks, type Ticks } from './ticks';

export interface AxisSpec {
  /** Quantity and unit, `Energy / cm⁻¹`. */
  readonly label: string;
  readonly domain: Interval;
  readonly log?: boolean;
}

export interface Margin {
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
  readonly left: number;
}

export const standardMargin: Margin = { top: 12, right: 16, bottom: 46, left: 80 };

/** Everything a drawing needs to know about the surface it is drawn on. */
export interface PlotView {
  readonly width: number;
  readonly height: number;
  readonly area: {
    readonly left: number;
    readonly right: number;
    readonly top: number;
    readonly bottom: number;
  };
  readonly x: Scale;
  readonly y: Scale;
  readonly xTicks: Ticks;
  readonly yTicks: Ticks;
  readonly xLabel: string;
  readonly yLabel: string;
  readonly active: ReadPoint | null;
  /** Id unique to this plot, for clip paths and patterns. */
  readonly id: string;
}

const scaleOf = (axis: AxisSpec, shown: Interval, range: Interval): Scale =>
  axis.log ? logScale(shown, range) : linearScale(shown, range);
const ticksOf = (axis: AxisSpec, shown: Interval, pixels: number, along: 'x' | 'y'): Ticks =>
  axis.log ? logTicks(shown, Math.floor(pixels / 40)) : linearTicks(shown, pixels, along);

export function plotView(options: {
  readonly width: number;
  readonly height: number;
  readonly margin: Margin;
  readonly x: AxisSpec;
  readonly y: AxisSpec;
  readonly shown: { readonly x: Interval; readonly y: Interval };
  readonly active: ReadPoint | null;
  readonly id: string;
}): PlotView {
  const { width, height, margin, x, y, shown, active, id } = options;
  const area = {
    left: margin.left,
    right: width - margin.right,
    top: margin.top,
    bottom: height - margin.bottom,
  };
  return {
    ...{ width, height, area, active, id },
    x: scaleOf(x, shown.x, [area.left, area.right]),
    y: scaleOf(y, shown.y, [area.bottom, area.top]),
    xTicks: ticksOf(x, shown.x, area.right - area.left, 'x'),
    yTicks: ticksOf(y, shown.y, area.bottom - area.top, 'y'),
    xLabel: x.label,
    yLabel: y.label,
  };
}
