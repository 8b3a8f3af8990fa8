import { useCallback, useState } from 'react';
import type { Candidate } from '../../../../core/record/project';
import { useAction, useStore } from '../../../app/services';
import { isPlain, plainViewing, type Viewing } from './viewing';

interface UsedViewing {
  readonly viewing: Viewing;
  readonly change: (change: Partial<Viewing>) => void;
  readonly reset: (() => void) | null;
  readonly keep: (() => void) | null;
}

/** The viewing of one candidate's sheet: its own strength until something is changed here. */
export function useViewing(
  candidate: Candidate,
  strength: { readonly concentration_mM: number; readonly path_cm: number },
): UsedViewing {
  const store = useStore();
  const act = useAction();
  const [changes, setChanges] = useState<Partial<Viewing>>({});
  const viewing = { ...plainViewing(strength), ...changes };
  const { concentration_mM, path_cm } = viewing;
  const change = useCallback(
    (more: Partial<Viewing>) => setChanges((before) => ({ ...before, ...more })),
    [],
  );
  const keep = (): void =>
    void act(() =>
      store.candidates.update(candidate, 'change the strength of 1 candidate', { concentration_mM, path_cm }),
    );
  const sameStrength = concentration_mM === strength.concentration_mM && path_cm === strength.path_cm;
  return {
    viewing,
    change,
    reset: isPlain(viewing, strength) ? null : () => setChanges({}),
    keep: sameStrength ? null : keep,
  };
}
