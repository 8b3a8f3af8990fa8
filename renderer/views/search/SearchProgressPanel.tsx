import { formatGiven, Progress } from '../../parts';
import { resultsShown, type Search } from './useSearch';

const secondsLeft = (left: number, rate: number | null): string | undefined => {
  if (rate === null || rate <= 0) return undefined;
  const seconds = left / rate;
  const time = seconds < 90 ? `${Math.ceil(seconds)} s` : `${Math.ceil(seconds / 60)} min`;
  return `${formatGiven(Math.round(rate))} a second, about ${time} left`;
};

/** How far the search has come, what it has been through, and how to hold or end it. */
export function SearchProgressPanel({ search }: { readonly search: Search }) {
  const { phase, state } = search;
  if (phase === 'idle' || (state === null && phase !== 'running')) return null;
  if (state === null) return <p className="soft">Counting the combinations…</p>;
  const done = state.evaluated + state.skipped;
  if (phase === 'running' || phase === 'paused') {
    return (
      <div className="panel search-progress">
        <Progress
          label={phase === 'paused' ? 'Paused' : 'Estimating'}
          done={done}
          total={state.count}
          detail={phase === 'paused' ? undefined : secondsLeft(state.count - done, state.rate)}
          onCancel={search.stop}
        />
        <button type="button" onClick={phase === 'paused' ? search.resume : search.pause}>
          {phase === 'paused' ? 'Go on' : 'Pause'}
        </button>
      </div>
    );
  }
  const found = state.results.length;
  const through =
    phase === 'finished'
      ? `All ${formatGiven(state.count)} combinations were looked at`
      : `Stopped after ${formatGiven(done)} of ${formatGiven(state.count)} combinations`;
  return (
    <p>
      {through}
      {found === 0
        ? '; none has a chance to meet the wish. Widen a window, drop a condition, or allow more metals or ligands.'
        : found === resultsShown
          ? `; the best ${found} are listed.`
          : `; ${found} have a chance to meet the wish.`}
    </p>
  );
}
