import { ErrorBar, ReferenceLine, ScatterChart } from 'recharts';
import { extent, padded, Plot } from '../frame';
import { chartBox, ChartAxes } from '../frame/ChartAxes';
import { markerLegend } from './markers';
import { PairScatter } from './PairScatter';
import { pairReadings, pairTable, pairText } from './pairReadings';
import { grouped, type Pair } from './pairs';
import './agreement.css';

export interface PairPlotProps {
  readonly pairs: readonly Pair[];
  /** `10Dq`, `first spin-allowed band`. */
  readonly quantity: string;
  readonly unit?: string;
  readonly title?: string;
  readonly height?: number;
  /** Opens the record of a pair. */
  readonly onOpen?: (id: string) => void;
  readonly note?: string;
}

export const noPairs = 'No pair yet: a frozen prediction and a measurement of the same complex make one.';

/** Measured against predicted with both uncertainties; on the line, they agree. */
export function ParityPlot(props: PairPlotProps) {
  const { pairs, quantity, unit = 'cm⁻¹', onOpen } = props;
  const { series, ordered } = pairReadings(
    pairs,
    ({ predicted, measured }) => ({ x: predicted, y: measured }),
    (pair) => pairText(pair, unit),
  );
  const domain = padded(
    extent(
      pairs.flatMap(({ predicted, sigma, measured, u }) => [
        predicted - (sigma ?? 0),
        predicted + (sigma ?? 0),
        measured - (u ?? 0),
        measured + (u ?? 0),
      ]),
    ),
  );
  const groups = [...grouped(pairs)];
  return (
    <Plot
      title={props.title ?? `Measured against predicted: ${quantity}`}
      summary={`${pairs.length} pairs of ${quantity}. Points on the diagonal agree.`}
      x={{ label: `Predicted ${quantity} / ${unit}`, domain }}
      y={{ label: `Measured ${quantity} / ${unit}`, domain }}
      height={(width) => props.height ?? Math.min(460, Math.max(300, width * 0.8))}
      read="nearest"
      zoom="xy"
      empty={pairs.length === 0 ? noPairs : null}
      series={series}
      table={pairTable(pairs, unit)}
      legend={[
        ...markerLegend(groups.map(([name]) => name)),
        { text: 'measured = predicted', sample: <path className="parity-line" d="M0 14L32 0" /> },
        { text: 'dashed: 10 % off', sample: <path className="parity-tenth" d="M0 14L32 0" /> },
      ]}
      onOpen={onOpen && (({ index }) => onOpen(ordered[index]!.id))}
      note={props.note}
    >
      {(view) => {
        const [low, high] = [
          Math.max(view.x.domain[0], view.y.domain[0]),
          Math.min(view.x.domain[1], view.y.domain[1]),
        ];
        const ray = (factor: number) => {
          const [from, to] = [view.x.domain[0], view.x.domain[1]];
          return [
            { x: from, y: from * factor },
            { x: to, y: to * factor },
          ] as const;
        };
        return (
          <ScatterChart {...chartBox(view)}>
            <ChartAxes view={view} />
            {low < high && (
              <ReferenceLine segment={[...ray(1)]} className="parity-line" ifOverflow="hidden" />
            )}
            {[0.9, 1.1].map((factor) => (
              <ReferenceLine
                key={factor}
                segment={[...ray(factor)]}
                className="parity-tenth"
                ifOverflow="hidden"
              />
            ))}
            <PairScatter
              pairs={pairs}
              place={({ predicted, sigma, measured, u }) => ({
                x: predicted,
                y: measured,
                sigma: sigma ?? 0,
                u: u ?? 0,
              })}
            >
              <ErrorBar
                dataKey="sigma"
                direction="x"
                width={0}
                stroke="var(--plot-soft)"
                isAnimationActive={false}
              />
              <ErrorBar
                dataKey="u"
                direction="y"
                width={0}
                stroke="var(--plot-soft)"
                isAnimationActive={false}
              />
            </PairScatter>
          </ScatterChart>
        );
      }}
    </Plot>
  );
}
