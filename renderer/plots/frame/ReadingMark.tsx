import { type ReadSeries } from './series';
import { type PlotView } from './view';

interface ReadingMarkProps {
  readonly view: PlotView;
  readonly series: readonly ReadSeries[];
  readonly alongX: boolean;
  /** Rectangle being dragged out, px. */
  readonly drag: {
    readonly from: { readonly x: number; readonly y: number };
    readonly to: readonly [number, number];
    readonly axes: 'x' | 'xy';
  } | null;
}

/** Laid over the drawing: the point being read and the range being dragged out. Not part of exported figures. */
export function ReadingMark({ view, series, alongX, drag }: ReadingMarkProps) {
  const { active, area } = view;
  const read = active && series[active.series];
  const at = read && ([view.x(read.xs[active.index]!), view.y(read.ys[active.index]!)] as const);
  const inside = at && at[0] >= area.left - 1 && at[0] <= area.right + 1;
  return (
    <svg className="plot-overlay" width={view.width} height={view.height} aria-hidden="true">
      {at && inside && (
        <>
          {alongX && <line className="plot-crosshair" x1={at[0]} x2={at[0]} y1={area.top} y2={area.bottom} />}
          <circle
            className="plot-reading-mark"
            cx={at[0]}
            cy={Math.max(area.top, Math.min(area.bottom, at[1]))}
            r={6}
          />
        </>
      )}
      {drag && (
        <rect
          className="plot-drag"
          x={Math.min(drag.from.x, drag.to[0])}
          width={Math.abs(drag.from.x - drag.to[0])}
          y={drag.axes === 'x' ? area.top : Math.min(drag.from.y, drag.to[1])}
          height={drag.axes === 'x' ? area.bottom - area.top : Math.abs(drag.from.y - drag.to[1])}
        />
      )}
    </svg>
  );
}
