import { useId, useState, type KeyboardEvent, type PointerEvent, type ReactNode } from 'react';
import { Legend, type LegendEntry } from './Legend';
import { PlotTable, type PlotTableData } from './PlotTable';
import { PlotTools } from './PlotTools';
import { ReadingMark } from './ReadingMark';
import { type ReadPoint, type ReadSeries } from './series';
import { usePlotReading } from './usePlotReading';
import { usePlotWidth } from './usePlotWidth';
import { usePlotZoom } from './usePlotZoom';
import { plotView, standardMargin, type AxisSpec, type Margin, type PlotView } from './view';
import './Plot.css';

export interface PlotProps {
  readonly title: string;
  /** What the plot shows, for those who cannot see it: one or two sentences. */
  readonly summary: string;
  readonly x: AxisSpec;
  readonly y: AxisSpec;
  readonly series: readonly ReadSeries[];
  readonly table: PlotTableData;
  /** Height of the drawing, CSS px; a function where it follows the width. */
  readonly height?: number | ((width: number) => number);
  /** Widest the plot may become, CSS px, where more room would stay empty. */
  readonly widest?: number;
  readonly margin?: Margin | ((width: number) => Margin);
  /** Which axes can be zoomed; none by default. */
  readonly zoom?: 'x' | 'xy';
  /** Curves are read along x, clouds of points by plain distance. */
  readonly read?: 'along-x' | 'nearest';
  readonly legend?: readonly LegendEntry[];
  /** Switches that belong to the plot: unit, filter, logarithmic axis. */
  readonly tools?: ReactNode;
  /** Below the drawing, e.g. what it leaves out. */
  readonly note?: ReactNode;
  /** Enter or a click on the point being read. */
  readonly onOpen?: (point: ReadPoint) => void;
  /** Shown in place of the drawing where there is nothing to draw. */
  readonly empty?: string | null;
  /** Draws a whole `svg`; its size is in the view. */
  readonly children: (view: PlotView) => ReactNode;
}

/** Pixels that tell a drag from a click. */
const dragFrom = 6;

/** The surface that all plots share: name, reading, zoom, tools, legend, figure files and the table behind it. */
export function Plot(props: PlotProps) {
  const { title, summary, series, zoom: zoomAxes, onOpen, empty = null } = props;
  const id = useId();
  const [stage, width] = usePlotWidth();
  const [drag, setDrag] = useState<{ readonly x: number; readonly y: number } | null>(null);
  const [pointer, setPointer] = useState<readonly [number, number] | null>(null);
  const [tableShown, setTableShown] = useState(false);
  const reading = usePlotReading(series);
  const zoom = usePlotZoom({ x: props.x.domain, y: props.y.domain }, zoomAxes ?? 'x');
  const height = typeof props.height === 'function' ? props.height(width) : (props.height ?? 340);
  const margin = typeof props.margin === 'function' ? props.margin(width) : (props.margin ?? standardMargin);
  const view = plotView({
    ...{ width, height, margin, id },
    ...{ x: props.x, y: props.y, shown: zoom.shown, active: reading.active },
  });
  const toPixel = (x: number, y: number): readonly [number, number] => [view.x(x), view.y(y)];

  const placeOf = (event: PointerEvent): readonly [number, number] => {
    const box = event.currentTarget.getBoundingClientRect();
    return [event.clientX - box.left, event.clientY - box.top];
  };
  const dataAt = ([px, py]: readonly [number, number]) => ({ x: view.x.invert(px), y: view.y.invert(py) });
  const dragged = (place: readonly [number, number]): boolean =>
    drag !== null && Math.hypot(place[0] - drag.x, place[1] - drag.y) > dragFrom;

  const onPointerMove = (event: PointerEvent): void => {
    const place = placeOf(event);
    setPointer(place);
    if (!dragged(place)) reading.pointAt(toPixel, place, props.read !== 'nearest');
  };
  const onPointerUp = (event: PointerEvent): void => {
    const place = placeOf(event);
    if (zoomAxes && drag && dragged(place)) zoom.to(dataAt([drag.x, drag.y]), dataAt(place));
    else if (drag && reading.active && onOpen) onOpen(reading.active);
    setDrag(null);
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const point = reading.active;
    const about = point && {
      x: series[point.series]!.xs[point.index]!,
      y: series[point.series]!.ys[point.index]!,
    };
    const acts: Partial<Record<string, () => void>> = {
      ...(zoomAxes && {
        '+': () => zoom.by(0.6, about ?? undefined),
        '=': () => zoom.by(0.6, about ?? undefined),
        '-': () => zoom.by(1 / 0.6, about ?? undefined),
        '0': zoom.reset,
      }),
      ...(point && { Escape: reading.clear }),
      ...(point && onOpen && { Enter: () => onOpen(point) }),
    };
    const act = acts[event.key];
    if (act) act();
    else {
      const next = reading.onKey(event);
      if (!next) return;
      const { xs, ys } = series[next.series]!;
      zoom.show({ x: xs[next.index]!, y: ys[next.index]! });
    }
    event.preventDefault();
    event.stopPropagation();
  };

  return (
    <figure
      className="plot"
      aria-labelledby={`${id}-title`}
      style={props.widest === undefined ? undefined : { maxInlineSize: props.widest }}
    >
      <div className="plot-head">
        <h2 id={`${id}-title`} className="plot-title">
          {title}
        </h2>
        <PlotTools
          title={title}
          stage={stage}
          view={view}
          legend={props.legend ?? []}
          zoom={zoomAxes ? zoom : null}
          tableShown={tableShown}
          onTable={() => setTableShown(!tableShown)}
          empty={empty !== null}
        >
          {props.tools}
        </PlotTools>
      </div>
      <div
        ref={stage}
        className="plot-stage"
        role="application"
        aria-roledescription="plot"
        aria-label={`${title}. ${empty ?? summary}`}
        aria-describedby={empty === null ? `${id}-hint` : undefined}
        tabIndex={0}
        data-opens={(onOpen && reading.active !== null) || undefined}
        style={empty === null ? { minBlockSize: height } : undefined}
        onKeyDown={onKeyDown}
        onPointerMove={onPointerMove}
        onPointerLeave={() => {
          setPointer(null);
          setDrag(null);
          reading.clear();
        }}
        onPointerDown={(event) => {
          const [x, y] = placeOf(event);
          if (event.button === 0) setDrag({ x, y });
        }}
        onPointerUp={onPointerUp}
        onDoubleClick={zoomAxes && zoom.reset}
      >
        {empty === null ? props.children(view) : <p className="plot-empty">{empty}</p>}
        {empty === null && (
          <ReadingMark
            view={view}
            series={series}
            alongX={props.read !== 'nearest'}
            drag={
              zoomAxes && drag && pointer && dragged(pointer)
                ? { from: drag, to: pointer, axes: zoomAxes }
                : null
            }
          />
        )}
      </div>
      {empty === null && (
        <>
          <output className="plot-reading" htmlFor={`${id}-title`}>
            {reading.text ?? (
              <span className="plot-hint">Point at the plot, or use the arrow keys, to read its values.</span>
            )}
          </output>
          <p id={`${id}-hint`} className="visually-hidden">
            Arrow keys read point by point, with Shift ten at a time
            {zoomAxes && '; plus and minus zoom, zero shows all'}
            {onOpen && '; Enter opens'}.
          </p>
          <Legend entries={props.legend ?? []} />
        </>
      )}
      {props.note !== undefined && <figcaption className="plot-note">{props.note}</figcaption>}
      {tableShown && <PlotTable caption={title} table={props.table} />}
    </figure>
  );
}
