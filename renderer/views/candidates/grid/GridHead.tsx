import { useUnit } from '../../../parts';
import type { Sort } from '../sorting';
import type { Column } from './columns';

interface GridHeadProps {
  readonly columns: readonly Column[];
  readonly sort: Sort;
  readonly onSort: (sort: Sort) => void;
  readonly allSelected: boolean;
  readonly someSelected: boolean;
  readonly onSelectAll: () => void;
  readonly onStarSort: () => void;
}

const sortWords = { ascending: 'smallest first', descending: 'largest first' };

export function GridHead({
  columns,
  sort,
  onSort,
  allSelected,
  someSelected,
  onSelectAll,
  onStarSort,
}: GridHeadProps) {
  const { unit } = useUnit();
  return (
    <div role="row" className="grid-head" aria-rowindex={1}>
      <span role="columnheader" className="grid-mark">
        <input
          type="checkbox"
          aria-label="Select all that are shown"
          checked={allSelected}
          ref={(box) => {
            if (box) box.indeterminate = someSelected && !allSelected;
          }}
          onChange={onSelectAll}
        />
      </span>
      <span
        role="columnheader"
        className="grid-mark"
        aria-sort={sort.by === 'starred' ? direction(sort) : 'none'}
      >
        <button type="button" className="star" aria-label="Starred first" onClick={onStarSort}>
          <svg viewBox="0 0 20 20" width="16" height="16" aria-hidden="true">
            <path d="m10 2 2.4 5.2 5.6.6-4.2 3.8 1.2 5.6L10 14.3l-5 2.9 1.2-5.6L2 7.8l5.6-.6Z" />
          </svg>
        </button>
      </span>
      {columns.map((column) => (
        <HeadCell key={column.id} column={column} sort={sort} onSort={onSort}>
          {column.under?.(unit)}
        </HeadCell>
      ))}
    </div>
  );
}

const direction = ({ descending }: Sort): 'ascending' | 'descending' =>
  descending ? 'descending' : 'ascending';

interface HeadCellProps extends Pick<GridHeadProps, 'sort' | 'onSort'> {
  readonly column: Column;
  readonly children: React.ReactNode;
}

function HeadCell({ column, sort, onSort, children }: HeadCellProps) {
  const { ranking, title } = column;
  if (ranking === undefined) {
    return (
      <span role="columnheader" className="grid-cell" data-column={column.id}>
        <span className="grid-title">{title}</span>
        {children !== undefined && <span className="grid-under">{children}</span>}
      </span>
    );
  }
  const active = sort.by === ranking;
  const next: Sort = { by: ranking, descending: active ? !sort.descending : false };
  return (
    <span
      role="columnheader"
      className="grid-cell"
      data-column={column.id}
      aria-sort={active ? direction(sort) : 'none'}
    >
      <button
        type="button"
        className="grid-title"
        title={`Rank by this, ${sortWords[direction(next)]}`}
        onClick={() => onSort(next)}
      >
        {title}
        <span className="grid-arrow" aria-hidden="true">
          {active && (sort.descending ? '▼' : '▲')}
        </span>
      </button>
      {children !== undefined && <span className="grid-under">{children}</span>}
    </span>
  );
}
