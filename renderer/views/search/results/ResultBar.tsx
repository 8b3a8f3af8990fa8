import { linkTo } from '../../../app/router/RouterContext';
import { useProject } from '../../../app/session/ProjectSession';
import { counted } from '../../../store';
import type { ShownResult } from '../../../workers/search/protocol';
import '../../candidates/selection/SelectionBar.css';
import { comparedAtMost, compareItem } from '../../compare/compareItem';

interface ResultBarProps {
  readonly chosen: readonly ShownResult[];
  readonly held: ReadonlySet<string>;
  readonly onAdd: (results: readonly ShownResult[]) => void;
  readonly onClear: () => void;
}

/** What can be done with the selected results, while there are any. */
export function ResultBar({ chosen, held, onAdd, onClear }: ResultBarProps) {
  const { project } = useProject();
  if (chosen.length === 0) return null;
  const fresh = chosen.filter(({ id }) => !held.has(id));
  const place = { view: 'compare', project: project.id, item: compareItem(chosen.map(({ id }) => id)) };
  return (
    <div className="selection-bar search-bar" role="toolbar" aria-label="With the selected results">
      <strong>{counted(chosen.length, 'result')} selected</strong>
      <button type="button" disabled={fresh.length === 0} onClick={() => onAdd(fresh)}>
        {fresh.length === 0 ? 'All in the project' : 'Add to the project'}
      </button>
      <a className="button" href={linkTo(place)}>
        {chosen.length > comparedAtMost ? 'Order list' : 'Compare and order'}
      </a>
      <button type="button" className="button-quiet" onClick={onClear}>
        Clear selection
      </button>
    </div>
  );
}
