import { ErrorPanel } from '../../parts';
import type { StoreError } from '../../store';
import { Mark } from '../shell/Mark';
import './StartFailure.css';

interface StartFailureProps {
  readonly error: Pick<StoreError, 'message' | 'remedy'>;
  readonly onRetry: () => void;
  /** Shows the folder with the copies of the projects; absent where there is none. */
  readonly onShowCopies?: (() => void) | undefined;
}

/** In place of the workbench where the database cannot be opened: never an empty list that looks like a loss. */
export function StartFailure({ error, onRetry, onShowCopies }: StartFailureProps) {
  return (
    <main className="start-failure">
      <h1>
        <Mark /> Spinhue
      </h1>
      <ErrorPanel
        title="Your projects could not be opened"
        problems={[{ code: 'integrity', field: '', message: error.message, remedy: error.remedy }]}
      >
        <button type="button" className="button-main" onClick={onRetry}>
          Try again
        </button>
        {onShowCopies && (
          <button type="button" onClick={onShowCopies}>
            Show the folder of copies
          </button>
        )}
      </ErrorPanel>
      <p className="soft">Nothing was deleted. The data stay where they are until they can be opened.</p>
    </main>
  );
}
