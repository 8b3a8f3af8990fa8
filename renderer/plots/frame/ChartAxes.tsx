import { CartesianGrid, XAxis, YAxis } from 'recharts';
import { type PlotView } from './view';

const figures = { fill: 'var(--plot-ink)', fontSize: 12 };

/** Size and margins with which a Recharts chart covers the same area as the view. */
export const chartBox = ({ width, height, area }: PlotView) => ({
  width,
  height,
  margin: { top: area.top, right: width - area.right, bottom: 0, left: 0 },
  accessibilityLayer: false,
});

/** Axes of a Recharts chart that agree with the view tick by tick, so that pointer and zoom fit. */
export function ChartAxes({ view, y = 'y' }: { readonly view: PlotView; readonly y?: string }) {
  const { area, xTicks, yTicks } = view;
  return (
    <>
      <CartesianGrid stroke="var(--plot-grid)" />
      <XAxis
        type="number"
        dataKey="x"
        height={view.height - area.bottom}
        domain={[view.x.domain[0], view.x.domain[1]]}
        ticks={[...xTicks.values]}
        tickFormatter={xTicks.text}
        interval={0}
        allowDataOverflow
        tick={figures}
        stroke="var(--plot-soft)"
        label={{ value: view.xLabel, position: 'insideBottom', offset: 8, className: 'plot-axis-label' }}
      />
      <YAxis
        type="number"
        dataKey={y}
        width={area.left}
        domain={[view.y.domain[0], view.y.domain[1]]}
        ticks={[...yTicks.values]}
        tickFormatter={yTicks.text}
        interval={0}
        allowDataOverflow
        tick={figures}
        stroke="var(--plot-soft)"
        label={{
          value: view.yLabel,
          angle: -90,
          position: 'insideLeft',
          offset: 10,
          className: 'plot-axis-label',
          style: { textAnchor: 'middle' },
        }}
      />
    </>
  );
}
