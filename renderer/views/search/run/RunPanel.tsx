import { useVersion } from '../../../app/session/observable';
import { formatGiven, Progress } from '../../../parts';
import { resultsKept, type SearchRun } from './searchRun';

const timeLeft = (left: number, rate: number | null): string | undefined => {
  if (rate === null || rate <= 0) return undefined;
  const seconds = left / rate;
  const time =
    seconds < 90
      ? `${Math.ceil(seconds)} s`
      : seconds < 5400
        ? `${Math.ceil(seconds / 60)} min`
        : `${Math.ceil(seconds / 3600)} h`;
  return `${formatGiven(Number(rate.toPrecision(3)))} a second, about ${time} left`;
};

/** How far a search has come, what it has been through, and how to hold, end or go on with it. */
export function RunPanel({ run }: { readonly run: SearchRun }) {
  useVersion(run);
  const { phase, state, results } = run;
  if (phase === 'refused' || phase === 'failed') return null;
  if (state === null) return <p className="soft">Laying out the combinations…</p>;
  const done = state.evaluated + state.skipped;
  if (phase === 'finished') {
    return (
      <p>
        All {formatGiven(state.count)} combinations were looked at; {foundText(results.length)}
      </p>
    );
  }
  return (
    <div className="panel search-progress" data-phase={phase}>
      <Progress
        label={phase === 'running' ? 'Estimating' : phase === 'paused' ? 'Paused' : 'Stopped'}
        done={done}
        total={state.count}
        detail={
          phase === 'running'
            ? timeLeft(state.count - done, state.rate)
            : `What is listed is the best of these; ${formatGiven(state.count - done)} are not looked at yet.`
        }
        {...(phase === 'stopped' ? {} : { onCancel: () => run.stop() })}
      />
      <button type="button" onClick={() => (phase === 'running' ? run.pause() : run.resume())}>
        {phase === 'running' ? 'Pause' : 'Go on'}
      </button>
    </div>
  );
}

function foundText(found: number): string {
  if (found === 0) return 'none has a chance to meet the wish.';
  if (found === resultsKept) return `the best ${found} are kept.`;
  return found === 1 ? 'one has a chance to meet the wish.' : `${found} have a chance to meet the wish.`;
}
