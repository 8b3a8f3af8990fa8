import { memo } from 'react';
import type { TableRow } from '../tableRow';
import type { Column } from './columns';

interface GridRowProps {
  readonly row: TableRow;
  readonly columns: readonly Column[];
  /** Place in the whole table, from 1, the head counted. */
  readonly place: number;
  readonly selected: boolean;
  readonly current: boolean;
  /** Distance from the top of the table and height, px. */
  readonly start: number;
  readonly height: number;
  readonly onToggle: (id: string, extend: boolean) => void;
  readonly onStar: (row: TableRow) => void;
  readonly onPoint: (id: string) => void;
}

/** One candidate. The row takes the focus as a whole; keys act on it (see `useGridKeys`). */
export const GridRow = memo(function GridRow(props: GridRowProps) {
  const { row, columns, place, selected, current, start, height, onToggle, onStar, onPoint } = props;
  const { candidate } = row;
  const formula = row.summary?.ok ? row.summary.formula : candidate.composition.metal;
  return (
    <div
      role="row"
      className="grid-row"
      aria-rowindex={place}
      aria-selected={selected}
      data-archived={candidate.archived || undefined}
      data-row={candidate.id}
      tabIndex={current ? 0 : -1}
      style={{ transform: `translateY(${start}px)`, blockSize: height }}
      onPointerDown={() => onPoint(candidate.id)}
      // Keys and commands act on the row that was reached by Tab as on one that was clicked.
      onFocus={() => onPoint(candidate.id)}
    >
      <span role="gridcell" className="grid-mark">
        <input
          type="checkbox"
          tabIndex={-1}
          aria-label={`Select ${formula}`}
          checked={selected}
          onClick={(event) => onToggle(candidate.id, event.shiftKey)}
          onChange={() => undefined}
        />
      </span>
      <span role="gridcell" className="grid-mark">
        <button
          type="button"
          tabIndex={-1}
          className="star"
          aria-pressed={candidate.starred}
          aria-label={`Star ${formula}`}
          onClick={() => onStar(row)}
        >
          <svg viewBox="0 0 20 20" width="18" height="18" aria-hidden="true">
            <path d="m10 2 2.4 5.2 5.6.6-4.2 3.8 1.2 5.6L10 14.3l-5 2.9 1.2-5.6L2 7.8l5.6-.6Z" />
          </svg>
        </button>
      </span>
      {columns.map((column) => (
        <span key={column.id} role="gridcell" className="grid-cell" data-column={column.id}>
          {column.cell(row)}
        </span>
      ))}
    </div>
  );
});
