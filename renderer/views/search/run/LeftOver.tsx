import { minuteOf } from '../../../app/services';
import { formatGiven } from '../../../parts';
import type { Overlay } from '../../../workers/protocol';
import { goesOnFrom, type OpenSearch } from './searchRuns';

interface LeftOverProps {
  readonly left: readonly OpenSearch[];
  /** Parameters that hold now: with others than it began with a search starts again. */
  readonly overlay: Overlay;
  readonly onTakeUp: (left: OpenSearch) => void;
  readonly onForget: (left: OpenSearch) => void;
}

/** Searches that were under way when the window was closed. */
export function LeftOver({ left, overlay, onTakeUp, onForget }: LeftOverProps) {
  if (left.length === 0) return null;
  return (
    <section className="panel stack" aria-label="Unfinished searches">
      {left.map((each) => (
        <div key={each.id} className="search-left-over">
          <p>
            The search for “{each.wish.name}” of {minuteOf(each.startedAt)} was not finished
            {each.count > 0 && `: ${formatGiven(each.done)} of ${formatGiven(each.count)} looked at`}.
          </p>
          <button type="button" className="button-main" onClick={() => onTakeUp(each)}>
            {goesOnFrom(each, overlay) === null ? 'Run it again' : 'Go on with it'}
          </button>
          <button type="button" className="button-quiet" onClick={() => onForget(each)}>
            Forget it
          </button>
        </div>
      ))}
    </section>
  );
}
