import { useMemo } from 'react';
import { ComposedChart, Line, Scatter } from 'recharts';
import { formatFigures, formatShare } from '../../parts/number';
import { Marker } from '../agreement/markers';
import { extent, Plot } from '../frame';
import type { PlotView } from '../frame/view';
import { chartBox, ChartAxes } from '../frame/ChartAxes';
import { paretoFront, spreadSideways, type ParetoPoint } from './paretoFront';
import '../agreement/agreement.css';
import './ParetoPlot.css';

export interface ParetoPlotProps {
  readonly points: readonly ParetoPoint[];
  /** What the cost counts, `ligands to order`. */
  readonly costName: string;
  readonly title?: string;
  readonly height?: number;
  readonly onOpen?: (id: string) => void;
  readonly note?: string;
}

/** Room for sideways shifts around whole numbers of cost. */
const sideways = 0.3;

/** Probability of meeting the wish against its cost; candidates that no other beats are filled and joined. */
export function ParetoPlot({ points, costName, title, height, onOpen, note }: ParetoPlotProps) {
  const placed = useMemo(() => {
    const whole = points.every(({ cost }) => Number.isInteger(cost));
    const shifts = whole ? spreadSideways(points, sideways) : points.map(() => 0);
    return points
      .map((point, index) => ({ point, x: point.cost + shifts[index]!, y: point.probability }))
      .sort((one, other) => one.x - other.x);
  }, [points]);
  const front = useMemo(() => paretoFront(points), [points]);
  const best = new Set(front);
  const [low, high] = extent(
    points.map(({ cost }) => cost),
    [0, 1],
  );
  const said = ({ name, cost, probability }: ParetoPoint): string =>
    `${name}: probability ${formatShare(probability)}, ${formatFigures(cost)} ${costName}`;
  return (
    <Plot
      title={title ?? 'What it takes to meet the wish'}
      summary={`${points.length} candidates; unbeaten: ${front.slice(0, 6).map(said).join('; ') || 'none'}`}
      x={{
        label: costName[0] ? costName[0].toUpperCase() + costName.slice(1) : '',
        domain: [low - 0.6, high + 0.6],
      }}
      y={{ label: 'Probability of meeting the wish', domain: [-0.03, 1.03] }}
      height={height ?? 320}
      read="nearest"
      zoom="xy"
      empty={points.length === 0 ? 'No candidate to weigh: state a wish and search.' : null}
      series={[
        {
          id: 'candidates',
          name: 'candidates',
          xs: placed.map(({ x }) => x),
          ys: placed.map(({ y }) => y),
          text: (index) => {
            const { point } = placed[index]!;
            return `${said(point)}${best.has(point) ? ' – no other beats it on both' : ''}`;
          },
        },
      ]}
      table={{
        columns: ['candidate', costName, 'probability', 'unbeaten'],
        rows: points.map((point) => [
          point.name,
          point.cost,
          point.probability,
          best.has(point) ? 'yes' : 'no',
        ]),
      }}
      legend={[
        { text: 'no other is better on both counts', sample: <Marker group={0} x={16} y={7} filled /> },
        { text: 'other candidate', sample: <Marker group={0} x={16} y={7} /> },
      ]}
      onOpen={onOpen && (({ index }) => onOpen(placed[index]!.point.id))}
      note={note}
    >
      {(view) => (
        <ComposedChart {...chartBox(view)}>
          <ChartAxes view={whole(view, points)} />
          <Line
            data={front.map(({ cost, probability }) => ({ x: cost, y: probability }))}
            dataKey="y"
            type="stepAfter"
            dot={false}
            activeDot={false}
            isAnimationActive={false}
            className="pareto-front"
          />
          {[false, true].map((unbeaten) => (
            <Scatter
              key={String(unbeaten)}
              data={placed.filter(({ point }) => best.has(point) === unbeaten).map(({ x, y }) => ({ x, y }))}
              isAnimationActive={false}
              shape={({ cx = 0, cy = 0 }: { cx?: number; cy?: number }) => (
                <Marker group={0} x={cx} y={cy} filled={unbeaten} />
              )}
            />
          ))}
        </ComposedChart>
      )}
    </Plot>
  );
}

/** Where costs are whole numbers, no tick stands between them. */
function whole(view: PlotView, points: readonly ParetoPoint[]): PlotView {
  if (!points.every(({ cost }) => Number.isInteger(cost))) return view;
  const values = view.xTicks.values.filter((value) => Math.abs(value - Math.round(value)) < 1e-9);
  return values.length === 0
    ? view
    : { ...view, xTicks: { values, text: (value) => String(Math.round(value)) } };
}
