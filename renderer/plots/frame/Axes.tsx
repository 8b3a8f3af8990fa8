import { type PlotView } from './view';

interface AxesProps {
  readonly view: PlotView;
  readonly grid?: boolean;
  /** Off where another panel below carries the figures of a shared x axis. */
  readonly xFigures?: boolean;
}

/** Both axes with ticks, figures and labels, and a quiet grid behind the data. */
export function Axes({ view, grid = true, xFigures = true }: AxesProps) {
  const { area, x, y, xTicks, yTicks } = view;
  return (
    <g className="plot-axes">
      {xTicks.values.map((value) => (
        <g key={`x${value}`} transform={`translate(${x(value)} 0)`}>
          {grid && <line className="plot-grid" y1={area.top} y2={area.bottom} />}
          <line className="plot-tick" y1={area.bottom} y2={area.bottom + 5} />
          {xFigures && (
            <text y={area.bottom + 18} textAnchor="middle">
              {xTicks.text(value)}
            </text>
          )}
        </g>
      ))}
      {yTicks.values.map((value) => (
        <g key={`y${value}`} transform={`translate(0 ${y(value)})`}>
          {grid && <line className="plot-grid" x1={area.left} x2={area.right} />}
          <line className="plot-tick" x1={area.left - 5} x2={area.left} />
          <text x={area.left - 8} dy="0.34em" textAnchor="end">
            {yTicks.text(value)}
          </text>
        </g>
      ))}
      <path
        className="plot-frame-line"
        d={`M${area.left} ${area.top}V${area.bottom}H${area.right}`}
        fill="none"
      />
      {xFigures && (
        <text
          className="plot-axis-label"
          x={(area.left + area.right) / 2}
          y={area.bottom + 38}
          textAnchor="middle"
        >
          {view.xLabel}
        </text>
      )}
      <text
        className="plot-axis-label"
        transform={`translate(14 ${(area.top + area.bottom) / 2}) rotate(-90)`}
        textAnchor="middle"
      >
        {view.yLabel}
      </text>
    </g>
  );
}

/** Keeps what is drawn inside it within the axes. */
export function PlotClip({
  view,
  children,
}: {
  readonly view: PlotView;
  readonly children: React.ReactNode;
}) {
  const { area, id } = view;
  return (
    <>
      <clipPath id={`${id}-clip`}>
        <rect x={area.left} y={area.top} width={area.right - area.left} height={area.bottom - area.top} />
      </clipPath>
      <g clipPath={`url(#${id}-clip)`}>{children}</g>
    </>
  );
}
