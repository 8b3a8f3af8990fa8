import { TermText } from '../../parts/chemistry';
import { formatFigures } from '../../parts/number';
import { type PlotView } from '../frame';
import { HaloText } from './HaloText';
import { type Crossover } from './levelLine';

interface GroundLevelsProps {
  readonly view: PlotView;
  readonly crossovers: readonly Crossover[];
  /** Label of the ground level where there is no crossover. */
  readonly only: string | null;
}

/** The ground level along the foot of the diagram, and where it changes. */
export function GroundLevels({ view, crossovers, only }: GroundLevelsProps) {
  const { area, x } = view;
  const shown = crossovers.filter(({ x: at }) => at > x.domain[0] && at < x.domain[1]);
  const first =
    shown[0]?.from ??
    crossovers.filter(({ x: at }) => at <= x.domain[0]).at(-1)?.to ??
    crossovers[0]?.from ??
    only;
  const stretches = [
    { from: x.domain[0], label: first },
    ...shown.map(({ x: at, to }) => ({ from: at, label: to })),
  ].map((stretch, index) => ({ ...stretch, to: shown[index]?.x ?? x.domain[1] }));
  return (
    <g className="level-ground">
      {shown.map(({ x: at, from, to }) => (
        <g key={at}>
          <line className="level-crossover" x1={x(at)} x2={x(at)} y1={area.top} y2={area.bottom} />
          <HaloText className="level-crossover-text" x={x(at) + 5} y={area.bottom - 22}>
            <tspan>{formatFigures(at)}: </tspan>
            <TermText label={from} />
            <tspan dy={from.length > 2 ? '-0.2em' : 0}> → </tspan>
            <TermText label={to} />
          </HaloText>
        </g>
      ))}
      {stretches.map(({ from, to, label }) => {
        if (label === null || x(to) - x(from) < 46) return null;
        return (
          <HaloText
            key={from}
            className="level-ground-text"
            x={(x(from) + x(to)) / 2}
            y={area.bottom - 6}
            textAnchor="middle"
          >
            <TermText label={label} />
          </HaloText>
        );
      })}
    </g>
  );
}
