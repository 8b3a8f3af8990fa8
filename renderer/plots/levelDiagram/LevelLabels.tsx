import { TermText } from '../../parts/chemistry';
import { type PlotView } from '../frame';
import { fittingLabels } from './labelPlaces';
import { type LevelLine } from './levelLine';
import { lineEnd } from './lineEnds';

const rowHeight = 14;
const columnWidth = 34;

/** Term labels where lines leave the plot: at the right edge, or along the top. They never overlap. */
export function LevelLabels({
  view,
  lines,
}: {
  readonly view: PlotView;
  readonly lines: readonly LevelLine[];
}) {
  const { area, x, y } = view;
  const ends = lines.map((line) => lineEnd(line, x.domain, y.domain)).filter((end) => end !== null);
  // From below, so that labels at low energy win where room is short.
  const right = ends
    .filter((end) => end.edge === 'right')
    .map((end) => ({ end, at: -y(end.y) }))
    .sort((one, other) => one.at - other.at);
  const top = ends
    .filter((end) => end.edge === 'top')
    .map((end) => ({ end, at: -x(end.x) }))
    .sort((one, other) => one.at - other.at);
  const rows = fittingLabels(
    right.map(({ at }) => at),
    rowHeight,
    [-area.bottom, -(area.top + 4)],
  );
  const columns = fittingLabels(
    top.map(({ at }) => at),
    columnWidth,
    [-(area.right - 8), -(area.left + 12)],
  );
  return (
    <g className="level-labels">
      {rows.places.map((place, index) => {
        const { end, at } = right[index]!;
        return (
          <g key={end.line.id}>
            <path
              className="level-leader"
              d={`M${area.right + 1} ${-at}L${area.right + 11} ${-place}h4`}
              fill="none"
            />
            <text x={area.right + 18} y={-place + 4}>
              <TermText label={end.line.label} />
            </text>
          </g>
        );
      })}
      {columns.places.map((place, index) => {
        const { end, at } = top[index]!;
        return (
          <g key={end.line.id}>
            <path
              className="level-leader"
              d={`M${-at} ${area.top - 1}L${-place} ${area.top - 9}`}
              fill="none"
            />
            <text x={-place} y={area.top - 12} textAnchor="middle">
              <TermText label={end.line.label} />
            </text>
          </g>
        );
      })}
    </g>
  );
}
