import { TermText } from '../../parts/chemistry';
import { type PlotView } from '../frame';
import { fittingLabels } from './labelPlaces';
import { type LevelLine } from './levelLine';
import { lineEnd } from './lineEnds';

const rowHeight = 14;
const columnWidth = 34;
/** Farther from its line than this, a label would be taken for another line's. */
const reach = 26;

/**
 * Term labels where lines leave the plot: at the right edge, or along the top. They never overlap; where lines crowd,
 * high multiplicity and low energy are named first and the rest is left to reading.
 */
export function LevelLabels({
  view,
  lines,
}: {
  readonly view: PlotView;
  readonly lines: readonly LevelLine[];
}) {
  const { area, x, y } = view;
  const ends = lines.map((line) => lineEnd(line, x.domain, y.domain)).filter((end) => end !== null);
  const right = ends
    .filter((end) => end.edge === 'right')
    .map(({ line, y: height }) => ({
      line,
      at: y(height),
      priority: 1_000 * line.multiplicity + y(height),
    }))
    .sort((one, other) => one.at - other.at);
  const top = ends
    .filter((end) => end.edge === 'top')
    .map(({ line, x: place }) => ({ line, at: x(place), priority: 1_000 * line.multiplicity + x(place) }))
    .sort((one, other) => one.at - other.at);
  const rows = fittingLabels(right, rowHeight, [area.top + 4, area.bottom], reach);
  const columns = fittingLabels(top, columnWidth, [area.left + 12, area.right - 8], reach);
  return (
    <g className="level-labels">
      {rows.map(({ label: { line, at }, place }) => (
        <g key={line.id}>
          <path
            className="level-leader"
            d={`M${area.right + 1} ${at}L${area.right + 11} ${place}h4`}
            fill="none"
          />
          <text x={area.right + 18} y={place + 4}>
            <TermText label={line.label} />
          </text>
        </g>
      ))}
      {columns.map(({ label: { line, at }, place }) => (
        <g key={line.id}>
          <path className="level-leader" d={`M${at} ${area.top - 1}L${place} ${area.top - 9}`} fill="none" />
          <text x={place} y={area.top - 12} textAnchor="middle">
            <TermText label={line.label} />
          </text>
        </g>
      ))}
    </g>
  );
}
