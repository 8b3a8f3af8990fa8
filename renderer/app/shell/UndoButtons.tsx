import { shownCombo } from '../commands';
import type { History } from '../services';

const Arrow = ({ turned }: { readonly turned: boolean }) => (
  <svg
    viewBox="0 0 20 16"
    width="20"
    height="16"
    aria-hidden="true"
    transform={turned ? 'scale(-1 1)' : undefined}
  >
    <path d="M6 2 2 6l4 4M2 6h9a5 5 0 0 1 0 9H7" fill="none" stroke="currentcolor" strokeWidth="1.8" />
  </svg>
);

export function UndoButtons({ history }: { readonly history: History }) {
  const { undoLabel, redoLabel, undo, redo } = history;
  const undoWords = undoLabel === null ? 'Nothing to undo' : `Undo: ${undoLabel}`;
  const redoWords = redoLabel === null ? 'Nothing to redo' : `Redo: ${redoLabel}`;
  return (
    <div className="undo-buttons" role="group" aria-label="Undo and redo">
      <button
        type="button"
        onClick={undo}
        disabled={undoLabel === null}
        title={`${undoWords} (${shownCombo('Mod+Z')})`}
        aria-label={undoWords}
      >
        <Arrow turned={false} />
      </button>
      <button
        type="button"
        onClick={redo}
        disabled={redoLabel === null}
        title={`${redoWords} (${shownCombo('Mod+Shift+Z')})`}
        aria-label={redoWords}
      >
        <Arrow turned />
      </button>
    </div>
  );
}
