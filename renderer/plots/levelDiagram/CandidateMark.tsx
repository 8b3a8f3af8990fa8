import { type PlotView } from '../frame';
import { type LevelLine } from './levelLine';
import { heightAt } from './lineEnds';

/** Place of a complex on the field axis, in the unit of that axis. */
export interface CandidatePlace {
  readonly x: number;
  /** 68 %, drawn as extent; null where no range can be stated. */
  readonly sigma: number | null;
  readonly name: string;
}

interface CandidateMarkProps {
  readonly view: PlotView;
  readonly place: CandidatePlace;
  readonly lines: readonly LevelLine[];
}

/** The extent of the candidate's field behind the lines. */
export function CandidateExtent({ view, place }: Omit<CandidateMarkProps, 'lines'>) {
  const { area, x } = view;
  if (place.sigma === null) return null;
  const [left, right] = [x(place.x - place.sigma), x(place.x + place.sigma)];
  return (
    <>
      <rect
        className="plot-extent"
        x={left}
        y={area.top}
        width={Math.max(1, right - left)}
        height={area.bottom - area.top}
      />
      {[left, right].map((at) => (
        <line key={at} className="plot-extent-edge" x1={at} x2={at} y1={area.top} y2={area.bottom} />
      ))}
    </>
  );
}

/** A line at the candidate's field, with a dot on every level that it meets. */
export function CandidateMark({ view, place, lines }: CandidateMarkProps) {
  const { area, x, y } = view;
  const at = x(place.x);
  return (
    <g className="level-candidate">
      <line x1={at} x2={at} y1={area.top} y2={area.bottom} />
      {lines.map((line) => {
        const height = heightAt(line, place.x);
        return height === null || height < y.domain[0] || height > y.domain[1] ? null : (
          <circle key={line.id} cx={at} cy={y(height)} r={3} />
        );
      })}
    </g>
  );
}
