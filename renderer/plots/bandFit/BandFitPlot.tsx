import { useMemo } from 'react';
import { fromWavenumber, toWavenumber } from '../../../core/units';
import { formatFigures, unitText, UnitSwitch, useUnit } from '../../parts/number';
import {
  Axes,
  extent,
  linePath,
  padded,
  Plot,
  PlotClip,
  PlotSvg,
  type PlotView,
  type ReadSeries,
} from '../frame';
import { placeText } from '../spectrum/bandText';
import { axisDomain, curveInUnit, type SpectrumCurve } from '../spectrum/spectrumUnits';
import { VisibleBand } from '../spectrum/VisibleBand';
import { ResidualPanel } from './ResidualPanel';
import './BandFitPlot.css';

export interface FittedBand {
  readonly name: string;
  readonly centre_cm1: number;
  /** Standard error of the centre, cm⁻¹; null where the fit could not tell. */
  readonly centreError_cm1: number | null;
  readonly value: ArrayLike<number>;
}

export interface BandFitPlotProps {
  /** Measured points, wavenumber ascending. */
  readonly measured: SpectrumCurve;
  /** Sum of bands and baseline on the same grid; null before a fit. */
  readonly fit: ArrayLike<number> | null;
  readonly bands: readonly FittedBand[];
  readonly baseline?: ArrayLike<number> | null;
  /** Standard deviation of one reading, for the extents behind the residuals; null where unknown. */
  readonly noise?: number | null;
  readonly quantity?: string;
  readonly title?: string;
  readonly note?: string;
  /** Where the next fit starts its bands, cm⁻¹. */
  readonly starts?: readonly number[];
  /** A click on the spectrum, or Enter on the point being read: where somebody takes a band to be. */
  readonly onPick?: (place: { readonly wavenumber_cm1: number; readonly value: number }) => void;
}

/** Room under the spectrum for the residuals and the x axis, px. */
const residualRoom = 178;
const margin = (bottom: number) => ({ top: 12, right: 18, bottom, left: 80 });
/** Room under a spectrum without residuals, px. */
const axisRoom = 54;
const dashes = ['7 3', '2 3', '7 3 2 3', '12 3', '1 2', '12 3 2 3'];

/** A measured spectrum, the fit with its bands, and what the fit leaves over, on one axis. */
export function BandFitPlot(props: BandFitPlotProps) {
  const { measured, fit, bands, baseline = null, noise = null, starts = [], onPick } = props;
  const { unit } = useUnit();
  const data = useMemo(() => curveInUnit(measured, unit), [measured, unit]);
  const grid = measured.wavenumber_cm1;
  const inUnit = (value: ArrayLike<number>) => curveInUnit({ wavenumber_cm1: grid, value }, unit);
  const fitted = fit && inUnit(fit);
  const residual = fitted && data.ys.map((value, index) => value - fitted.ys[index]!);
  const [low, high] = extent([...data.ys, ...(fitted?.ys ?? [])]);
  const yDomain = [Math.min(0, low), padded([0, Math.max(high, 1e-9)], 0.06)[1]] as const;
  const quantity = props.quantity ?? 'Absorbance';

  const readings: ReadSeries[] = [
    {
      id: 'measured',
      name: 'measured',
      xs: data.xs,
      ys: data.ys,
      text: (index) => {
        const left = residual ? `, residual ${formatFigures(residual[index]!, 2)}` : '';
        return `measured ${formatFigures(data.ys[index]!)} at ${placeText(toWavenumber(data.xs[index]!, unit), unit)}${left}`;
      },
    },
    {
      id: 'bands',
      name: 'fitted bands',
      xs: bands.map(({ centre_cm1 }) => fromWavenumber(centre_cm1, unit)),
      ys: bands.map(({ value }) => Math.max(...Array.from(value))),
      text: (index) => {
        const { name, centre_cm1, centreError_cm1 } = bands[index]!;
        const error =
          centreError_cm1 === null ? '' : `, standard error ${formatFigures(centreError_cm1, 2)} cm⁻¹`;
        return `${name}: centre ${placeText(centre_cm1, unit)}${error}`;
      },
    },
  ];
  return (
    <Plot
      title={props.title ?? 'Band fit'}
      summary={`Measured spectrum with ${bands.length} fitted bands: ${bands.map(({ name, centre_cm1 }) => `${name} at ${placeText(centre_cm1, unit)}`).join(', ') || 'none yet'}; residuals below`}
      x={{
        label: `${unit === 'nm' ? 'Wavelength' : 'Wavenumber'} / ${unitText[unit]}`,
        domain: domainOf(grid, unit),
      }}
      y={{ label: quantity, domain: yDomain }}
      margin={margin(residual ? residualRoom : axisRoom)}
      height={residual ? 480 : 480 - residualRoom + axisRoom}
      zoom="x"
      empty={grid.length === 0 ? 'No spectrum yet: open a file to fit its bands.' : null}
      series={readings}
      {...(onPick && {
        onOpen: ({ series, index }) => {
          const reading = readings[series]!;
          onPick({ wavenumber_cm1: toWavenumber(reading.xs[index]!, unit), value: reading.ys[index]! });
        },
      })}
      table={{
        columns: [
          `position / ${unitText[unit]}`,
          quantity,
          'fit',
          'residual',
          ...(baseline ? ['baseline'] : []),
          ...bands.map(({ name }) => name),
        ],
        rows: Array.from(grid, (at, index) => [
          fromWavenumber(at, unit),
          measured.value[index]!,
          fit ? fit[index]! : null,
          fit ? measured.value[index]! - fit[index]! : null,
          ...(baseline ? [baseline[index]!] : []),
          ...bands.map(({ value }) => value[index]!),
        ]),
      }}
      legend={[
        { text: 'measured', sample: <circle className="fit-measured" cx={16} cy={7} r={2} /> },
        ...(starts.length > 0
          ? [{ text: 'start of a band', sample: <path className="fit-start" d="M11 3h10l-5 8z" /> }]
          : []),
        ...(fit ? [{ text: 'fit', sample: <path className="fit-line" d="M0 7H32" fill="none" /> }] : []),
        ...bands.map(({ name }, index) => ({
          text: name,
          sample: (
            <path
              className="fit-band"
              d="M0 7H32"
              strokeDasharray={dashes[index % dashes.length]}
              fill="none"
            />
          ),
        })),
        ...(baseline
          ? [{ text: 'baseline', sample: <path className="fit-baseline" d="M0 7H32" fill="none" /> }]
          : []),
      ]}
      tools={<UnitSwitch />}
      note={props.note}
    >
      {(view) => (
        <PlotSvg view={view}>
          <Axes view={view} xFigures={!residual} />
          <VisibleBand view={view} unit={unit} />
          <PlotClip view={view}>
            <path className="fit-points" d={dotsPath(data.xs, data.ys, view)} />
            {starts.map((at, index) => {
              const x = view.x(fromWavenumber(at, unit));
              return (
                <path
                  key={index}
                  className="fit-start"
                  d={`M${x} ${view.area.bottom}V${view.area.top + 8}m-5 -8h10l-5 8z`}
                />
              );
            })}
            {bands.map(({ name, value }, index) => {
              const { xs, ys } = inUnit(value);
              return (
                <path
                  key={name}
                  className="fit-band"
                  strokeDasharray={dashes[index % dashes.length]}
                  fill="none"
                  d={linePath(xs, ys, view.x, view.y)}
                />
              );
            })}
            {baseline && (
              <path
                className="fit-baseline"
                fill="none"
                d={linePath(data.xs, inUnit(baseline).ys, view.x, view.y)}
              />
            )}
            {fitted && (
              <path className="fit-line" fill="none" d={linePath(fitted.xs, fitted.ys, view.x, view.y)} />
            )}
          </PlotClip>
          {residual && (
            <ResidualPanel view={view} xs={data.xs} residual={residual} noise={noise} room={residualRoom} />
          )}
        </PlotSvg>
      )}
    </Plot>
  );
}

const domainOf = (
  grid: ArrayLike<number>,
  unit: Parameters<typeof fromWavenumber>[1],
): readonly [number, number] =>
  grid.length === 0 ? [0, 1] : axisDomain([grid[0]!, grid[grid.length - 1]!], unit);

/** Dots as one path of strokes without length: thousands of circles would hold up every move of the pointer. */
const dotsPath = (xs: ArrayLike<number>, ys: ArrayLike<number>, { x, y }: PlotView): string =>
  Array.from(xs, (at, index) => `M${x(at).toFixed(1)} ${y(ys[index]!).toFixed(1)}h0`).join('');
