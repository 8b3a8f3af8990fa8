import { useMemo, useState } from 'react';
import { fromWavenumber } from '../../../core/units';
import { multiplicityName, spokenTerm } from '../../parts/chemistry';
import { formatFigures, intervalUnit, unitText, useUnit } from '../../parts/number';
import { Axes, extent, linePath, Plot, PlotClip, PlotSvg, type Interval } from '../frame';
import { CandidateExtent, CandidateMark, type CandidatePlace } from './CandidateMark';
import { summaryOf } from './diagramSummary';
import { ceilingOf, inUnit, placeInUnit, type DiagramAxes } from './diagramUnits';
import { GroundLevels } from './GroundLevels';
import { crossoversOf, type Crossover, type LevelLine } from './levelLine';
import { LevelLabels } from './LevelLabels';
import { lineStyles } from './lineStyle';
import { SpinFilter } from './SpinFilter';
import './LevelDiagram.css';

export interface LevelDiagramProps {
  /** Energies above the ground level; all lines on one grid of rising x. */
  readonly lines: readonly LevelLine[];
  readonly axes: DiagramAxes;
  readonly candidate?: CandidatePlace | null;
  /** Found from the lines where not given. */
  readonly crossovers?: readonly Crossover[];
  readonly title?: string;
  /** Top of the energy axis, in the unit of the lines. */
  readonly ceiling?: number;
  readonly height?: number;
  readonly note?: string;
}

const margin = { top: 34, right: 64, bottom: 46, left: 80 };

/** Energies of all levels against the field, the ground level as zero, with the place of the candidate. */
export function LevelDiagram(props: LevelDiagramProps) {
  const { axes, candidate = null } = props;
  const { unit: chosen } = useUnit();
  const unit = intervalUnit(chosen);
  const [hidden, setHidden] = useState<ReadonlySet<number>>(new Set());

  const lines = useMemo(() => inUnit(props.lines, axes, unit), [props.lines, axes, unit]);
  const place = candidate && axes === 'absolute' ? placeInUnit(candidate, unit) : candidate;
  const styles = useMemo(() => lineStyles(lines.map(({ multiplicity }) => multiplicity)), [lines]);
  const visible = lines.filter(({ multiplicity }) => !hidden.has(multiplicity));
  const crossovers = useMemo(
    () =>
      props.crossovers?.map((one) => ({
        ...one,
        x: axes === 'absolute' ? fromWavenumber(one.x, unit) : one.x,
      })) ?? crossoversOf(lines),
    [props.crossovers, lines, axes, unit],
  );
  const ground = lines.find(({ points }) => points.every(({ y }) => Math.abs(y) < 1e-6))?.label ?? null;

  const xDomain = extent(lines.flatMap(({ points }) => points.map(({ x }) => x)));
  const yDomain: Interval = [0, ceilingOf(lines, props.ceiling, axes, unit)];
  const unitName = unitText[unit];
  const [xName, yName] = axes === 'over-B' ? ['10Dq/B', 'E/B'] : ['10Dq', 'Energy'];
  const unitPart = axes === 'over-B' ? '' : ` / ${unitName}`;
  const said = (value: number): string => formatFigures(value) + (axes === 'over-B' ? '' : ` ${unitName}`);

  return (
    <Plot
      title={props.title ?? 'Energy levels'}
      summary={summaryOf(visible, crossovers, place, said, xName)}
      x={{ label: `${xName}${unitPart}`, domain: xDomain }}
      y={{ label: `${yName} above the ground level${unitPart}`, domain: yDomain }}
      margin={margin}
      height={props.height ?? 440}
      zoom="xy"
      empty={lines.length === 0 ? 'No levels to draw: the field of this complex is not estimated.' : null}
      series={visible.map((line) => ({
        id: line.id,
        name: line.id,
        xs: line.points.map(({ x }) => x),
        ys: line.points.map(({ y }) => y),
        text: (index) => {
          const { x, y } = line.points[index]!;
          return `${ordinalOf(line)}${spokenTerm(line.label)}: ${said(y)} at ${xName} ${said(x)}`;
        },
      }))}
      table={{
        columns: [`${xName}${unitPart}`, ...visible.map(({ id }) => `${id}${unitPart}`)],
        rows: (lines[0]?.points ?? []).map(({ x }, index) => [
          x,
          ...visible.map(({ points }) => points[index]?.y ?? null),
        ]),
      }}
      tools={
        <SpinFilter
          styles={styles}
          hidden={hidden}
          onToggle={(multiplicity) => setHidden(toggled(hidden, multiplicity, styles.size))}
        />
      }
      legend={[
        ...[...styles]
          .filter(([multiplicity]) => !hidden.has(multiplicity))
          .map(([multiplicity, { className, dash, width }]) => ({
            text: `${multiplicityName(multiplicity)}s`,
            sample: (
              <path
                className={className}
                d="M0 7H32"
                strokeDasharray={dash}
                strokeWidth={width}
                fill="none"
              />
            ),
          })),
        ...(place
          ? [
              {
                text: `${place.name}: ${xName} ${said(place.x)}${place.sigma === null ? '' : ` ± ${said(place.sigma)}`}`,
                sample: (
                  <g className="level-candidate">
                    <rect className="plot-extent" width={32} height={14} />
                    <path d="M16 0V14" />
                  </g>
                ),
              },
            ]
          : []),
      ]}
      note={props.note}
    >
      {(view) => (
        <PlotSvg view={view}>
          {place && (
            <PlotClip view={view}>
              <CandidateExtent view={view} place={place} />
            </PlotClip>
          )}
          <Axes view={view} />
          <PlotClip view={view}>
            {visible.map((line) => {
              const { className, dash, width } = styles.get(line.multiplicity)!;
              return (
                <path
                  key={line.id}
                  className={className}
                  strokeDasharray={dash}
                  strokeWidth={width}
                  fill="none"
                  d={linePath(
                    line.points.map(({ x }) => x),
                    line.points.map(({ y }) => y),
                    view.x,
                    view.y,
                  )}
                />
              );
            })}
            {place && <CandidateMark view={view} place={place} lines={visible} />}
          </PlotClip>
          {view.y.domain[0] === 0 && <GroundLevels view={view} crossovers={crossovers} only={ground} />}
          <LevelLabels view={view} lines={visible} />
        </PlotSvg>
      )}
    </Plot>
  );
}

/** `2nd ` for the second level of its label from below; nothing for the only one. */
function ordinalOf({ id, label }: LevelLine): string {
  const place = Number(id.slice(label.length).replace(' #', ''));
  return place === 0 ? '' : `${place}${['st', 'nd', 'rd'][place - 1] ?? 'th'} `;
}

/** One multiplicity always stays. */
function toggled(hidden: ReadonlySet<number>, multiplicity: number, all: number): ReadonlySet<number> {
  const next = new Set(hidden);
  if (!next.delete(multiplicity)) next.add(multiplicity);
  return next.size === all ? hidden : next;
}
