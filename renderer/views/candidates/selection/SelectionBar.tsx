import { linkTo } from '../../../app/router/RouterContext';
import { counted } from '../../../store';
import { comparedAtMost, compareItem } from '../../compare/compareItem';
import type { TableRow } from '../tableRow';
import type { RowActions } from './useRowActions';
import './SelectionBar.css';

interface SelectionBarProps {
  readonly rows: readonly TableRow[];
  readonly actions: RowActions;
  readonly onTag: () => void;
  readonly onCopy: () => void;
  readonly onClear: () => void;
}

/** What can be done with the selected rows, while there are any. */
export function SelectionBar({ rows, actions, onTag, onCopy, onClear }: SelectionBarProps) {
  if (rows.length === 0) return null;
  const archived = rows.every(({ candidate }) => candidate.archived);
  return (
    <div className="selection-bar" role="toolbar" aria-label="With the selected candidates">
      <strong>{counted(rows.length, 'candidate')} selected</strong>
      <button type="button" onClick={() => actions.star(rows)}>
        Star
      </button>
      <button type="button" onClick={onTag}>
        Tag…
      </button>
      <button type="button" onClick={() => actions.duplicate(rows)}>
        Duplicate
      </button>
      {rows.length > 1 && (
        <a
          className="button"
          href={linkTo({
            view: 'compare',
            project: rows[0]!.candidate.projectId,
            item: compareItem(rows.map(({ candidate }) => candidate.id)),
          })}
        >
          {rows.length > comparedAtMost ? 'Order list' : 'Compare'}
        </a>
      )}
      <button type="button" onClick={onCopy}>
        Copy as table
      </button>
      <button type="button" onClick={() => actions.archive(rows, !archived)}>
        {archived ? 'Take back from the archive' : 'Archive'}
      </button>
      <button
        type="button"
        onClick={() => {
          actions.remove(rows);
          onClear();
        }}
      >
        Delete
      </button>
      <button type="button" className="button-quiet" onClick={onClear}>
        Clear selection
      </button>
    </div>
  );
}
