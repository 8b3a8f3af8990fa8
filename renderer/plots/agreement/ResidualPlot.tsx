import { ReferenceArea, ReferenceLine, ScatterChart } from 'recharts';
import { formatFigures, formatShare } from '../../parts/number';
import { extent, padded, Plot } from '../frame';
import { chartBox, ChartAxes } from '../frame/ChartAxes';
import { markerLegend } from './markers';
import { PairScatter } from './PairScatter';
import { pairReadings, pairTable, pairText } from './pairReadings';
import { grouped, standardised, type Pair } from './pairs';
import { noPairs, type PairPlotProps } from './ParityPlot';
import './agreement.css';

/** Half-width of the extent that should hold 95 % of normal residuals, in standard deviations. */
const half95 = 1.96;

/** Residuals in units of their joint standard deviation over the extents that should hold 68 and 95 % of them. */
export function ResidualPlot(props: PairPlotProps) {
  const { quantity, unit = 'cm⁻¹', onOpen } = props;
  const drawn = props.pairs.filter((pair) => standardised(pair) !== null);
  const left = props.pairs.length - drawn.length;
  const z = (pair: Pair): number => standardised(pair)!;
  const { series, ordered } = pairReadings(
    drawn,
    (pair) => ({ x: pair.predicted, y: z(pair) }),
    (pair) => `${pairText(pair, unit)}; residual ${formatFigures(z(pair), 2)} σ`,
  );
  const share = (half: number): number => drawn.filter((pair) => Math.abs(z(pair)) <= half).length;
  const coverage = `${share(1)} of ${drawn.length} (${formatShare(share(1) / Math.max(1, drawn.length))}) inside the 68 % extent, ${share(half95)} (${formatShare(share(half95) / Math.max(1, drawn.length))}) inside the 95 % extent`;
  const reach = Math.max(3, ...drawn.map((pair) => Math.abs(z(pair)) * 1.1));
  const groups = [...grouped(drawn)];
  return (
    <Plot
      title={props.title ?? `Residuals: ${quantity}`}
      summary={`Measured minus predicted over the joint standard deviation; ${coverage}.`}
      x={{
        label: `Predicted ${quantity} / ${unit}`,
        domain: padded(extent(drawn.map(({ predicted }) => predicted))),
      }}
      y={{ label: '(measured − predicted) / σ', domain: [-reach, reach] }}
      height={props.height ?? 300}
      read="nearest"
      zoom="xy"
      empty={drawn.length === 0 ? noPairs : null}
      series={series}
      table={pairTable(drawn, unit)}
      legend={[
        ...markerLegend(groups.map(([name]) => name)),
        { text: '68 % extent', sample: <rect className="residual-68" width={32} height={14} /> },
        { text: '95 % extent', sample: <rect className="residual-95" width={32} height={14} /> },
      ]}
      onOpen={onOpen && (({ index }) => onOpen(ordered[index]!.id))}
      note={
        <>
          {coverage}.{left > 0 && ` ${left} without a stated range ${left === 1 ? 'is' : 'are'} not drawn.`}{' '}
          {props.note}
        </>
      }
    >
      {(view) => (
        <ScatterChart {...chartBox(view)}>
          <ReferenceArea y1={-half95} y2={half95} className="residual-95" ifOverflow="hidden" />
          <ReferenceArea y1={-1} y2={1} className="residual-68" ifOverflow="hidden" />
          <ChartAxes view={view} />
          <ReferenceLine y={0} className="parity-line" />
          <PairScatter pairs={drawn} place={(pair) => ({ x: pair.predicted, y: z(pair) })} />
        </ScatterChart>
      )}
    </Plot>
  );
}
