import { useVersion } from '../../../app/session/observable';
import type { SearchRun } from './searchRun';

interface RunTabsProps {
  readonly runs: readonly SearchRun[];
  readonly shown: SearchRun;
  readonly onShow: (run: SearchRun) => void;
  readonly onClose: (run: SearchRun) => void;
}

/** Several searches of one window: which is shown, how far each is. */
export function RunTabs({ runs, shown, onShow, onClose }: RunTabsProps) {
  if (runs.length < 2) return null;
  return (
    <ul className="search-runs" aria-label="Searches">
      {runs.map((run, place) => (
        <RunTab
          key={run.setup.id}
          run={run}
          place={place + 1}
          shown={run === shown}
          onShow={() => onShow(run)}
          onClose={() => onClose(run)}
        />
      ))}
    </ul>
  );
}

interface RunTabProps {
  readonly run: SearchRun;
  readonly place: number;
  readonly shown: boolean;
  readonly onShow: () => void;
  readonly onClose: () => void;
}

function RunTab({ run, place, shown, onShow, onClose }: RunTabProps) {
  useVersion(run);
  const { state, phase } = run;
  const done = state === null ? 0 : (state.evaluated + state.skipped) / Math.max(1, state.count);
  const words = phase === 'running' ? `${Math.floor(100 * done)} %` : phase;
  const name = `${place}. ${run.setup.wish.name}`;
  return (
    <li data-shown={shown || undefined}>
      <button type="button" className="button-quiet" aria-pressed={shown} onClick={onShow}>
        {name} <span className="soft small">{words}</span>
      </button>
      <button
        type="button"
        className="button-quiet"
        aria-label={`Close the search ${name}`}
        onClick={onClose}
      >
        ✕
      </button>
    </li>
  );
}
