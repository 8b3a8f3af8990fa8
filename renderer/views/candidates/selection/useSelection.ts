import { useCallback, useMemo, useState } from 'react';
import type { TableRow } from '../tableRow';

export interface Selection {
  readonly ids: ReadonlySet<string>;
  readonly toggle: (id: string) => void;
  /** Selects all between the last one touched and this one, as the table stands. */
  readonly extendTo: (id: string) => void;
  readonly all: () => void;
  readonly clear: () => void;
}

/** Which rows are selected; what the filter hides or what was deleted is not selected any more. */
export function useSelection(shown: readonly TableRow[]): Selection {
  const [chosen, setChosen] = useState<ReadonlySet<string>>(new Set());
  const [anchor, setAnchor] = useState<string | null>(null);

  const ids = useMemo(() => {
    if (chosen.size === 0) return chosen;
    const visible = new Set<string>();
    for (const { candidate } of shown) if (chosen.has(candidate.id)) visible.add(candidate.id);
    return visible;
  }, [chosen, shown]);

  const toggle = useCallback((id: string) => {
    setAnchor(id);
    setChosen((before) => {
      const after = new Set(before);
      if (!after.delete(id)) after.add(id);
      return after;
    });
  }, []);
  const extendTo = useCallback(
    (id: string) => {
      const places = [anchor ?? id, id].map((each) =>
        shown.findIndex(({ candidate }) => candidate.id === each),
      );
      const [from, to] = [Math.min(...places), Math.max(...places)];
      setChosen((before) => {
        const after = new Set(before);
        for (let place = Math.max(0, from); place <= to; place++) after.add(shown[place]!.candidate.id);
        return after;
      });
    },
    [anchor, shown],
  );
  const all = useCallback(() => setChosen(new Set(shown.map(({ candidate }) => candidate.id))), [shown]);
  const clear = useCallback(() => setChosen(new Set()), []);
  return useMemo(() => ({ ids, toggle, extendTo, all, clear }), [ids, toggle, extendTo, all, clear]);
}
