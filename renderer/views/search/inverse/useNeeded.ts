import { useCallback, useEffect, useRef, useState } from 'react';
import type { NeededField, WishInput } from '../../../../core/search';
import type { Overlay } from '../../../workers/protocol';
import { patientAsker } from '../asking/searchAsker';

export interface Needed {
  readonly fields: readonly NeededField[];
  readonly done: number;
  readonly total: number;
  readonly running: boolean;
  readonly error: string | null;
  readonly begin: (wish: WishInput, overlay: Overlay, ions: readonly string[], band: number) => void;
  readonly stop: () => void;
}

const nothing = { fields: [], done: 0, total: 0, running: false, error: null };

/** Geometries in which the levels follow 10Dq alone. */
const cubic = ['octahedral', 'tetrahedral'] as const;

/** The fields that each ion would need, one ion after another. */
export function useNeeded(): Needed {
  const [state, setState] = useState<Omit<Needed, 'begin' | 'stop'>>(nothing);
  const turn = useRef(0);
  const stop = useCallback(() => {
    turn.current += 1;
    setState((before) => ({ ...before, running: false }));
  }, []);
  useEffect(() => () => void (turn.current += 1), []);
  const begin = useCallback<Needed['begin']>((wish, overlay, ions, band) => {
    const mine = ++turn.current;
    const asked = cubic
      .filter((id) => wish.geometries === 'all' || (wish.geometries ?? cubic).includes(id))
      .flatMap((geometry) => ions.map((ion) => ({ ion, geometry })));
    setState({ ...nothing, total: asked.length, running: true });
    void (async () => {
      for (const each of asked) {
        const question = { kind: 'needed' as const, wish, overlay, band, ...each };
        const answer = await patientAsker.ask(question).catch((error: Error) => error);
        if (turn.current !== mine) return;
        if (answer instanceof Error) {
          setState((before) => ({ ...before, running: false, error: answer.message }));
          return;
        }
        const found = answer.kind === 'needed' ? answer.fields : [];
        setState((before) => ({ ...before, done: before.done + 1, fields: [...before.fields, ...found] }));
      }
      setState((before) => ({ ...before, running: false }));
    })();
  }, []);
  return { ...state, begin, stop };
}
