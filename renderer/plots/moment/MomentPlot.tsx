import { useState } from 'react';
import { ComposedChart, ErrorBar, Line, Scatter } from 'recharts';
import { formatFigures } from '../../parts/number';
import { extent, Plot } from '../frame';
import { chartBox, ChartAxes } from '../frame/ChartAxes';
import { Marker, markerShape } from '../agreement/markers';
import { chiTToMoment, momentErrorOf, type MomentQuantity } from './momentQuantity';
import '../agreement/agreement.css';
import './MomentPlot.css';

export interface MomentSeries {
  readonly name: string;
  /** Points with an uncertainty, or a computed curve. */
  readonly kind: 'measured' | 'model';
  readonly points: readonly {
    readonly temperature_K: number;
    /** χT, cm³ K mol⁻¹ (cgs). */
    readonly chiT: number;
    /** Standard uncertainty, same unit. */
    readonly u?: number | null;
  }[];
}

export interface MomentPlotProps {
  readonly series: readonly MomentSeries[];
  readonly title?: string;
  readonly height?: number;
  readonly note?: string;
}

const modelDash = [undefined, '8 4', '2 3'];
const names: Readonly<Record<MomentQuantity, readonly [label: string, unit: string]>> = {
  chiT: ['χT / cm³ K mol⁻¹', 'cm³ K mol⁻¹'],
  moment: ['μeff / μB', 'μB'],
};

/** χT or the effective moment against temperature: measured points, computed curves. */
export function MomentPlot({ series, title, height, note }: MomentPlotProps) {
  const [quantity, setQuantity] = useState<MomentQuantity>('chiT');
  const [label, unit] = names[quantity];
  const drawn = series.map(({ name, kind, points }) => ({
    name,
    kind,
    points: [...points]
      .sort((one, other) => one.temperature_K - other.temperature_K)
      .map(({ temperature_K, chiT, u }) => ({
        x: temperature_K,
        y: quantity === 'chiT' ? chiT : chiTToMoment(chiT),
        u: quantity === 'chiT' ? (u ?? 0) : momentErrorOf(chiT, u ?? 0),
      })),
  }));
  const all = drawn.flatMap(({ points }) => points);
  const top = extent(all.map(({ y, u }) => y + u))[1];
  const bottom = extent(all.map(({ y, u }) => y - u))[0];
  const measured = drawn.filter(({ kind }) => kind === 'measured');
  const models = drawn.filter(({ kind }) => kind === 'model');
  return (
    <Plot
      title={title ?? 'Magnetic moment against temperature'}
      summary={`${drawn.map(({ name, kind, points }) => `${name} (${kind}, ${points.length} points)`).join('; ')}`}
      x={{ label: 'Temperature / K', domain: [0, Math.max(1, extent(all.map(({ x }) => x))[1]) * 1.02] }}
      y={{ label, domain: [Math.min(0, bottom) - (top || 1) * 0.03, (top || 1) * 1.1] }}
      height={height ?? 320}
      zoom="xy"
      empty={all.length === 0 ? 'No susceptibility yet: record a moment or a temperature series.' : null}
      series={drawn.map(({ name, points }) => ({
        id: name,
        name,
        xs: points.map(({ x }) => x),
        ys: points.map(({ y }) => y),
        text: (index) => {
          const { x, y, u } = points[index]!;
          return `${name}: ${formatFigures(y)}${u > 0 ? ` ± ${formatFigures(u, 2)}` : ''} ${unit} at ${formatFigures(x, 4)} K`;
        },
      }))}
      table={{
        columns: ['series', 'temperature / K', label, `u / ${unit}`],
        rows: drawn.flatMap(({ name, points }) =>
          points.map(({ x, y, u }) => [name, x, y, u > 0 ? u : null]),
        ),
      }}
      legend={[
        ...measured.map(({ name }, group) => ({ text: name, sample: <Marker group={group} x={16} y={7} /> })),
        ...models.map(({ name }, place) => ({
          text: name,
          sample: <path className="moment-model" d="M0 7H32" strokeDasharray={modelDash[place % 3]} />,
        })),
      ]}
      tools={
        <span className="plot-zoom" role="group" aria-label="Quantity">
          <button type="button" aria-pressed={quantity === 'chiT'} onClick={() => setQuantity('chiT')}>
            χT
          </button>
          <button type="button" aria-pressed={quantity === 'moment'} onClick={() => setQuantity('moment')}>
            μeff
          </button>
        </span>
      }
      note={note}
    >
      {(view) => (
        <ComposedChart {...chartBox(view)}>
          <ChartAxes view={view} />
          {models.map(({ name, points }, place) => (
            <Line
              key={name}
              data={points}
              dataKey="y"
              dot={false}
              activeDot={false}
              isAnimationActive={false}
              className="moment-model"
              strokeDasharray={modelDash[place % 3]}
            />
          ))}
          {measured.map(({ name, points }, group) => (
            <Scatter key={name} data={points} isAnimationActive={false} shape={markerShape(group)}>
              <ErrorBar
                dataKey="u"
                direction="y"
                width={4}
                stroke="var(--plot-soft)"
                isAnimationActive={false}
              />
            </Scatter>
          ))}
        </ComposedChart>
      )}
    </Plot>
  );
}
