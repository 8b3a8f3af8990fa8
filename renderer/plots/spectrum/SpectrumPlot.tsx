import { useMemo, useState } from 'react';
import { bandCurve } from '../../../core/spectrum';
import { type Band } from '../../../core/transitions/types';
import { fromWavenumber, toWavenumber } from '../../../core/units';
import { formatFigures, unitText, UnitSwitch, useUnit } from '../../parts/number';
import { areaPath, Axes, linePath, Plot, PlotClip, PlotSvg, type ReadSeries } from '../frame';
import { absorptionTop } from './absorptionTop';
import { BandMarks, bandRail } from './BandMarks';
import { bandText, placeText } from './bandText';
import { bandDash, measuredDash } from './lineDash';
import { spectrumLegend } from './spectrumLegend';
import { axisDomain, curveInUnit, shownRange_cm1, type SpectrumCurve } from './spectrumUnits';
import { spectrumTable } from './spectrumTable';
import { VisibleBand } from './VisibleBand';
import './SpectrumPlot.css';

export interface SpectrumPlotProps {
  /** Predicted curve; null where none could be estimated. */
  readonly predicted: SpectrumCurve | null;
  /** Lower and upper 68 % curve on the grid of `predicted`. */
  readonly range?: { readonly low: ArrayLike<number>; readonly high: ArrayLike<number> } | null;
  readonly bands?: readonly Band[];
  /** Multiplies the molar absorptivity of a band into the quantity of the axis (c × l for absorbance). */
  readonly bandFactor?: number;
  readonly quantity?: 'molar-absorptivity' | 'absorbance';
  /** Name of the y axis where it holds neither of the two. */
  readonly yLabel?: string;
  readonly measured?: readonly (SpectrumCurve & { readonly name: string })[];
  /** The curves of `measured` are predictions of several complexes, laid over each other. */
  readonly allPredicted?: boolean;
  readonly title?: string;
  readonly height?: number;
  readonly note?: string;
}

const axisName = {
  'molar-absorptivity': 'Molar absorptivity / L mol⁻¹ cm⁻¹',
  absorbance: 'Absorbance',
} as const;
const margin = { top: bandRail + 6, right: 18, bottom: 46, left: 80 };

/** The predicted spectrum with its bands and ranges on an axis of choice, measured spectra laid over it. */
export function SpectrumPlot(props: SpectrumPlotProps) {
  const {
    predicted,
    range = null,
    bands = [],
    measured = [],
    quantity = 'molar-absorptivity',
    bandFactor = 1,
  } = props;
  const { unit } = useUnit();
  const [log, setLog] = useState(false);
  const [bandsShown, setBandsShown] = useState(true);

  const curves = useMemo(() => [...(predicted ? [predicted] : []), ...measured], [predicted, measured]);
  const { top, cutOff } = useMemo(
    () => absorptionTop(curves, predicted && range ? { ...predicted, value: range.high } : null),
    [curves, predicted, range],
  );
  const drawn = useMemo(() => curves.map((curve) => curveInUnit(curve, unit)), [curves, unit]);
  const highest = useMemo(
    () => Math.max(top, ...curves.flatMap(({ value }) => Array.from(value))),
    [curves, top],
  );
  const floor = quantity === 'absorbance' ? 1e-3 : 1e-2;
  const yDomain = log ? ([floor, Math.max(10 * floor, highest * 1.5)] as const) : ([0, top] as const);
  const lifted = (value: number): number => (log ? Math.max(value, floor / 10) : value);
  const name = (place: number): string =>
    predicted && place === 0 ? 'predicted' : (measured[place - (predicted ? 1 : 0)]?.name ?? 'measured');

  const series: ReadSeries[] = drawn.map(({ xs, ys }, place) => ({
    id: name(place),
    name: name(place),
    xs,
    ys: ys.map(lifted),
    text: (index) =>
      `${name(place)}: ${formatFigures(ys[index]!)} at ${placeText(toWavenumber(xs[index]!, unit), unit)}`,
  }));
  const inOrder = [...bands].sort(
    (one, other) => (one.energy_cm1 - other.energy_cm1) * (unit === 'nm' ? -1 : 1),
  );
  if (bandsShown && inOrder.length > 0) {
    series.push({
      id: 'bands',
      name: 'bands',
      xs: inOrder.map(({ energy_cm1 }) => fromWavenumber(energy_cm1, unit)),
      ys: inOrder.map(({ molarAbsorptivity }) => lifted(molarAbsorptivity * bandFactor)),
      text: (index) => bandText(inOrder[index]!, unit),
    });
  }

  return (
    <Plot
      title={props.title ?? 'Absorption spectrum'}
      summary={
        bands.length === 0
          ? 'Absorption against energy'
          : `Bands: ${bands.map((band) => bandText(band, unit)).join('; ')}`
      }
      x={{
        label:
          unit === 'nm'
            ? 'Wavelength / nm'
            : `${unit === 'THz' ? 'Frequency' : unit === 'cm-1' ? 'Wavenumber' : 'Energy'} / ${unitText[unit]}`,
        domain: axisDomain(shownRange_cm1(curves), unit),
      }}
      y={{ label: props.yLabel ?? axisName[quantity], domain: yDomain, log }}
      margin={margin}
      height={props.height ?? 380}
      zoom="xy"
      empty={curves.length === 0 ? 'No spectrum: no band of this complex could be estimated.' : null}
      series={series}
      table={spectrumTable({ predicted, measured, bands, unit, quantity, bandFactor })}
      legend={spectrumLegend({
        hasPredicted: predicted !== null,
        hasRange: range !== null,
        bands: bandsShown ? bands : [],
        measured,
        allPredicted: props.allPredicted ?? false,
      })}
      tools={
        <>
          <UnitSwitch />
          <button type="button" aria-pressed={log} onClick={() => setLog(!log)}>
            Log
          </button>
          {bands.length > 0 && (
            <button type="button" aria-pressed={bandsShown} onClick={() => setBandsShown(!bandsShown)}>
              Bands
            </button>
          )}
        </>
      }
      note={
        <>
          {cutOff &&
            !log &&
            'The axis follows the bands that make the colour; stronger absorption leaves it at the top. '}
          {props.note}
        </>
      }
    >
      {(view) => (
        <PlotSvg view={view}>
          <Axes view={view} />
          <VisibleBand view={view} unit={unit} />
          <PlotClip view={view}>
            {predicted && range && (
              <path className="spectrum-range" d={rangePath(predicted, range, unit, lifted, view)} />
            )}
            {predicted &&
              bandsShown &&
              bands.map((band, index) => (
                <path
                  key={index}
                  className="spectrum-band"
                  strokeDasharray={bandDash(band.kind)}
                  fill="none"
                  d={componentPath(predicted, band, bandFactor, unit, lifted, view)}
                />
              ))}
            {drawn.map(({ xs, ys }, place) => {
              const isPredicted = predicted !== null && place === 0;
              return (
                <path
                  key={place}
                  className={isPredicted ? 'spectrum-predicted' : 'spectrum-measured'}
                  strokeDasharray={isPredicted ? undefined : measuredDash(place - (predicted ? 1 : 0))}
                  fill="none"
                  d={linePath(xs, ys.map(lifted), view.x, view.y)}
                />
              );
            })}
          </PlotClip>
          {bandsShown && <BandMarks view={view} bands={bands} unit={unit} />}
        </PlotSvg>
      )}
    </Plot>
  );
}

type View = Parameters<Parameters<typeof Plot>[0]['children']>[0];
type Unit = ReturnType<typeof useUnit>['unit'];

function rangePath(
  { wavenumber_cm1 }: SpectrumCurve,
  range: { readonly low: ArrayLike<number>; readonly high: ArrayLike<number> },
  unit: Unit,
  lifted: (value: number) => number,
  { x, y }: View,
): string {
  const low = curveInUnit({ wavenumber_cm1, value: range.low }, unit);
  const high = curveInUnit({ wavenumber_cm1, value: range.high }, unit);
  return areaPath(low.xs, low.ys.map(lifted), high.ys.map(lifted), x, y);
}

function componentPath(
  { wavenumber_cm1 }: SpectrumCurve,
  band: Band,
  factor: number,
  unit: Unit,
  lifted: (value: number) => number,
  { x, y }: View,
): string {
  const value = bandCurve(band, Float64Array.from(wavenumber_cm1)).map((height) => height * factor);
  const { xs, ys } = curveInUnit({ wavenumber_cm1, value }, unit);
  return linePath(xs, ys.map(lifted), x, y);
}
