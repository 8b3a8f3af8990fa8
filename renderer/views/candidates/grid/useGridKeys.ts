import { useCallback, type KeyboardEvent } from 'react';
import type { Selection } from '../selection/useSelection';
import type { TableRow } from '../tableRow';

interface GridKeys {
  readonly shown: readonly TableRow[];
  readonly current: string | null;
  readonly perPage: number;
  readonly selection: Selection;
  readonly onMove: (place: number) => void;
  readonly onOpen: (row: TableRow) => void;
}

/** Arrows move, Shift with arrows selects, Space marks, Enter opens. */
export function useGridKeys({ shown, current, perPage, selection, onMove, onOpen }: GridKeys) {
  return useCallback(
    (event: KeyboardEvent): void => {
      // A button or box inside a row has its own keys.
      if (!(event.target instanceof HTMLElement) || event.target.getAttribute('role') !== 'row') return;
      const place = Math.max(
        0,
        shown.findIndex(({ candidate }) => candidate.id === current),
      );
      const row = shown[place];
      if (!row) return;
      const goals: Partial<Record<string, number>> = {
        ArrowDown: place + 1,
        ArrowUp: place - 1,
        PageDown: place + perPage,
        PageUp: place - perPage,
        Home: 0,
        End: shown.length - 1,
      };
      const goal = goals[event.key];
      if (goal !== undefined && !event.ctrlKey && !event.metaKey && !event.altKey) {
        event.preventDefault();
        const next = Math.max(0, Math.min(shown.length - 1, goal));
        if (event.shiftKey) {
          if (!selection.ids.has(row.candidate.id)) selection.toggle(row.candidate.id);
          selection.extendTo(shown[next]!.candidate.id);
        }
        onMove(next);
      } else if (event.key === ' ') {
        event.preventDefault();
        selection.toggle(row.candidate.id);
      } else if (event.key === 'Enter') {
        event.preventDefault();
        onOpen(row);
      } else if (event.key === 'Escape' && selection.ids.size > 0) {
        event.preventDefault();
        selection.clear();
      }
    },
    [shown, current, perPage, selection, onMove, onOpen],
  );
}
