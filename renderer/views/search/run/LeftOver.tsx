import { minuteOf } from '../../../app/services';
import { formatGiven } from '../../../parts';
import type { OpenSearch } from './searchRuns';

interface LeftOverProps {
  readonly left: readonly OpenSearch[];
  readonly onTakeUp: (left: OpenSearch) => void;
  readonly onForget: (left: OpenSearch) => void;
}

/** Searches that were under way when the window was closed. */
export function LeftOver({ left, onTakeUp, onForget }: LeftOverProps) {
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
            {each.checkpoint === null ? 'Run it again' : 'Go on with it'}
          </button>
          <button type="button" className="button-quiet" onClick={() => onForget(each)}>
            Forget it
          </button>
        </div>
      ))}
    </section>
  );
}
