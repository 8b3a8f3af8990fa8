import { useMemo } from 'react';
import { colourDifference } from '../../../core/colour/colourDifference';
import { type SeenColour } from '../../../core/colour/types';
import { colourNumbers } from '../../parts/colour';
import { formatShare } from '../../parts/number';
import { Axes, Plot, PlotClip, PlotSvg, type PlotView } from '../frame';
import { cloudLegend } from './cloudLegend';
import { cloudHeight, cloudMargin, cloudWidest, planeReach } from './cloudPlane';
import { LightnessColumn } from './LightnessColumn';
import { type ColourTarget } from './colourTarget';
import './ColourCloudPlot.css';

type Difference = (
  one: readonly [number, number, number],
  other: readonly [number, number, number],
) => number;

export interface ColourCloudPlotProps {
  /** Colours of the draws from the uncertainties. */
  readonly draws: readonly SeenColour[];
  /** Colour at the central estimate. */
  readonly centre?: SeenColour | null;
  readonly target?: ColourTarget | null;
  /** Colour difference that `tolerance` is meant in, and its name. */
  readonly difference?: Difference;
  readonly differenceName?: string;
  readonly title?: string;
}

/** Draws on the a*b* plane in their own colours on the neutral surround, with the target and how many meet it. */
export function ColourCloudPlot(props: ColourCloudPlotProps) {
  const {
    draws,
    centre = null,
    target = null,
    difference = colourDifference,
    differenceName = 'ΔE00 (CIEDE2000)',
  } = props;
  const inside = useMemo(
    () => draws.map(({ lab }) => target !== null && difference(lab, target.lab) <= target.tolerance),
    [draws, target, difference],
  );
  const reach = planeReach([
    ...draws.map(({ lab: [, a, b] }) => ({ a, b })),
    ...(centre ? [{ a: centre.lab[1], b: centre.lab[2] }] : []),
    ...(target ? [{ a: target.lab[1], b: target.lab[2], margin: target.tolerance }] : []),
  ]);
  const met = inside.filter(Boolean).length;
  const account =
    target === null
      ? null
      : `${met} of ${draws.length} draws (${formatShare(met / Math.max(1, draws.length))}) lie within ${target.tolerance} of the target, ${differenceName}.`;
  const byHue = draws
    .map((colour, index) => ({ colour, index }))
    .sort((one, other) => one.colour.lab[1] - other.colour.lab[1]);
  return (
    <Plot
      title={props.title ?? 'Possible colours'}
      summary={`${draws.length} draws from the uncertainties on the a*b* plane. ${account ?? ''}`}
      x={{ label: 'a*  (green – red)', domain: [-reach, reach] }}
      y={{ label: 'b*  (blue – yellow)', domain: [-reach, reach] }}
      widest={cloudWidest}
      margin={cloudMargin}
      height={cloudHeight}
      zoom="xy"
      read="nearest"
      empty={draws.length === 0 ? 'No colours: no spectrum could be estimated.' : null}
      series={[
        {
          id: 'draws',
          name: 'draws',
          xs: byHue.map(({ colour }) => colour.lab[1]),
          ys: byHue.map(({ colour }) => colour.lab[2]),
          text: (index) => {
            const { colour, index: draw } = byHue[index]!;
            return `${colour.words}: ${colourNumbers(colour).lab}, ${colour.srgb}${target === null ? '' : inside[draw] ? ', inside the tolerance' : ', outside the tolerance'}`;
          },
        },
        ...(centre
          ? [
              {
                id: 'centre',
                name: 'central estimate',
                xs: [centre.lab[1]],
                ys: [centre.lab[2]],
                text: () => `central estimate, ${centre.words}: ${colourNumbers(centre).lab}`,
              },
            ]
          : []),
      ]}
      table={{
        columns: ['L*', 'a*', 'b*', 'hex', 'words', 'inside the tolerance'],
        rows: draws.map(({ lab, srgb, words }, index) => [
          ...lab,
          srgb,
          words,
          target === null ? null : inside[index] ? 'yes' : 'no',
        ]),
      }}
      legend={cloudLegend(centre !== null, target)}
      note={
        <>
          {account} Lightness is not on the plane; it is the column at the right.
          {target && ' The ring is the tolerance as a plain distance in the plane, for orientation.'}
        </>
      }
    >
      {(view) => (
        <PlotSvg view={view}>
          <rect
            className="cloud-surround"
            x={view.area.left}
            y={view.area.top}
            width={view.area.right - view.area.left}
            height={view.area.bottom - view.area.top}
          />
          <Axes view={view} grid={false} />
          <PlotClip view={view}>
            <ChromaRings view={view} reach={reach} />
            {draws.map((colour, index) => (
              <circle
                key={index}
                className={inside[index] ? 'cloud-draw cloud-met' : 'cloud-draw'}
                cx={view.x(colour.lab[1])}
                cy={view.y(colour.lab[2])}
                r={inside[index] ? 4.5 : 4}
                fill={colour.srgb}
              />
            ))}
            {centre && (
              <rect
                className="cloud-centre"
                x={view.x(centre.lab[1]) - 7}
                y={view.y(centre.lab[2]) - 7}
                width={14}
                height={14}
                fill={centre.srgb}
              />
            )}
            {target && <TargetMark view={view} target={target} />}
          </PlotClip>
          <LightnessColumn view={view} draws={draws} centre={centre} target={target} />
        </PlotSvg>
      )}
    </Plot>
  );
}

function ChromaRings({ view, reach }: { readonly view: PlotView; readonly reach: number }) {
  const { x, y, area } = view;
  const step = reach > 60 ? 40 : 20;
  const rings = Array.from({ length: Math.floor((1.5 * reach) / step) }, (_, index) => (index + 1) * step);
  return (
    <g className="cloud-rings">
      <line x1={x(0)} x2={x(0)} y1={area.top} y2={area.bottom} />
      <line x1={area.left} x2={area.right} y1={y(0)} y2={y(0)} />
      {rings.map((chroma) => (
        <ellipse key={chroma} cx={x(0)} cy={y(0)} rx={x(chroma) - x(0)} ry={y(0) - y(chroma)} fill="none" />
      ))}
    </g>
  );
}

function TargetMark({ view, target }: { readonly view: PlotView; readonly target: ColourTarget }) {
  const [, a, b] = target.lab;
  const { x, y } = view;
  return (
    <g className="cloud-target">
      {['cloud-halo', 'cloud-line'].map((className) => (
        <g key={className}>
          <path
            className={className}
            d={`M${x(a) - 9} ${y(b)}H${x(a) + 9}M${x(a)} ${y(b) - 9}V${y(b) + 9}`}
          />
          <ellipse
            className={className}
            cx={x(a)}
            cy={y(b)}
            rx={x(a + target.tolerance) - x(a)}
            ry={y(b) - y(b + target.tolerance)}
            fill="none"
          />
        </g>
      ))}
    </g>
  );
}
