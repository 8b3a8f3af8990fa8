import type { AskedReply } from './asking/useReply';
import { ErrorPanel, formatGiven } from '../../parts';

interface BeforeProps {
  readonly ready: boolean;
  readonly count: AskedReply;
}

/** What a search would have to look at, or why it cannot start. */
export function Before({ ready, count: { reply, current, error } }: BeforeProps) {
  return (
    <div className="search-before stack">
      <p className="search-count" data-waiting={!current || undefined} role="status">
        {reply?.kind === 'counted'
          ? `${formatGiven(reply.count)} candidate${reply.count === 1 ? '' : 's'}`
          : reply?.kind === 'refused'
            ? 'No candidates'
            : error === null
              ? 'Counting…'
              : error}{' '}
        {!ready && (
          <span className="soft">
            Nothing is wanted of them yet: give a window to absorb in or to let through, a spin state, a range
            of 10Dq or a colour.
          </span>
        )}
      </p>
      {reply?.kind === 'refused' && (
        <ErrorPanel problems={reply.problems} title="This wish cannot be met by any complex" />
      )}
    </div>
  );
}
