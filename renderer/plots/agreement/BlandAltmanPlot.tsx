import { LabelList, ReferenceArea, ReferenceLine, ScatterChart } from 'recharts';
import { formatFigures } from '../../parts/number';
import { extent, padded, Plot } from '../frame';
import { chartBox, ChartAxes } from '../frame/ChartAxes';
import { markerLegend } from './markers';
import { PairScatter } from './PairScatter';
import { pairReadings, pairTable, pairText } from './pairReadings';
import { grouped, type Pair } from './pairs';
import { noPairs, type PairPlotProps } from './ParityPlot';
import './agreement.css';

/** Mean difference and limits of agreement, computed with the statistics of the whole set. */
export interface AgreementLimits {
  readonly bias: number;
  readonly lower: number;
  readonly upper: number;
  /** 95 % confidence interval of the bias, drawn as extent; null where too few pairs. */
  readonly biasInterval: readonly [number, number] | null;
}

interface BlandAltmanPlotProps extends PairPlotProps {
  readonly limits: AgreementLimits | null;
}

/**
 * Differences against means after J. M. Bland and D. G. Altman, Lancet 1986, 327, 307: a bias that grows with the size
 * shows as a slope, outliers are named and never removed.
 */
export function BlandAltmanPlot(props: BlandAltmanPlotProps) {
  const { pairs, quantity, unit = 'cm⁻¹', limits, onOpen } = props;
  const difference = ({ measured, predicted }: Pair): number => measured - predicted;
  const mean = ({ measured, predicted }: Pair): number => (measured + predicted) / 2;
  const outside = (pair: Pair): boolean =>
    limits !== null && (difference(pair) < limits.lower || difference(pair) > limits.upper);
  const { series, ordered } = pairReadings(
    pairs,
    (pair) => ({ x: mean(pair), y: difference(pair) }),
    (pair) =>
      `${pairText(pair, unit)}; difference ${formatFigures(difference(pair))} ${unit}${outside(pair) ? ', outside the limits of agreement' : ''}`,
  );
  const account =
    limits &&
    `bias ${formatFigures(limits.bias)} ${unit}, limits of agreement ${formatFigures(limits.lower)} to ${formatFigures(limits.upper)} ${unit}`;
  const [low, high] = extent([...pairs.map(difference), ...(limits ? [limits.lower, limits.upper] : []), 0]);
  const groups = [...grouped(pairs)];
  return (
    <Plot
      title={props.title ?? `Difference against mean: ${quantity}`}
      summary={`${pairs.length} pairs of ${quantity}; ${account ?? 'too few for limits of agreement'}.`}
      x={{ label: `Mean of measured and predicted / ${unit}`, domain: padded(extent(pairs.map(mean)), 0.08) }}
      y={{ label: `Measured − predicted / ${unit}`, domain: padded([low, high], 0.18) }}
      height={props.height ?? 320}
      read="nearest"
      zoom="xy"
      empty={pairs.length === 0 ? noPairs : null}
      series={series}
      table={pairTable(pairs, unit)}
      legend={[
        ...markerLegend(groups.map(([name]) => name)),
        ...(limits
          ? [
              { text: 'bias and its 95 % interval', sample: <path className="agreement-bias" d="M0 7H32" /> },
              { text: 'limits of agreement', sample: <path className="agreement-limit" d="M0 7H32" /> },
            ]
          : []),
      ]}
      onOpen={onOpen && (({ index }) => onOpen(ordered[index]!.id))}
      note={
        <>
          {account && `${account[0]!.toUpperCase()}${account.slice(1)}. `}
          {props.note}
        </>
      }
    >
      {(view) => (
        <ScatterChart {...chartBox(view)}>
          {limits?.biasInterval && (
            <ReferenceArea
              y1={limits.biasInterval[0]}
              y2={limits.biasInterval[1]}
              className="residual-68"
              ifOverflow="hidden"
            />
          )}
          <ChartAxes view={view} />
          <ReferenceLine y={0} stroke="var(--plot-soft)" />
          {limits && <ReferenceLine y={limits.bias} className="agreement-bias" ifOverflow="hidden" />}
          {limits &&
            [limits.lower, limits.upper].map((limit) => (
              <ReferenceLine key={limit} y={limit} className="agreement-limit" ifOverflow="hidden" />
            ))}
          <PairScatter
            pairs={pairs}
            place={(pair) => ({ x: mean(pair), y: difference(pair), label: outside(pair) ? pair.name : '' })}
          >
            <LabelList dataKey="label" position="top" offset={8} />
          </PairScatter>
        </ScatterChart>
      )}
    </Plot>
  );
}
