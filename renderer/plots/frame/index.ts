export { Axes, PlotClip } from './Axes';
export { type LegendEntry } from './Legend';
export { areaPath, linePath } from './path';
export { Plot, type PlotProps } from './Plot';
export { PlotSvg } from './PlotSvg';
export { type PlotTableData } from './PlotTable';
export { extent, linearScale, padded, type Interval, type Scale } from './scale';
export { nearestIndex, type ReadPoint, type ReadSeries } from './series';
export { standardMargin, type AxisSpec, type Margin, type PlotView } from './view';
