import { useCallback } from 'react';
import type { Candidate, FrozenPrediction } from '../../../core/record/project';
import { minuteOf, useStored } from '../../app/services';
import { ErrorPanel, NumberWithRange } from '../../parts';
import type { Store } from '../../store';

/** Predictions of this candidate as they stood when they were frozen. */
export function FrozenPanel({ candidate }: { readonly candidate: Candidate }) {
  const ask = useCallback((store: Store) => store.frozenPredictions.of(candidate.id), [candidate.id]);
  const { value: frozen, error } = useStored(ask, ['frozenPredictions']);
  return (
    <section className="panel" aria-labelledby="sheet-frozen">
      <h2 id="sheet-frozen">Frozen predictions</h2>
      {error !== null && (
        <ErrorPanel
          problems={[{ code: 'integrity', field: '', message: error }]}
          title="They cannot be read"
        />
      )}
      {frozen?.length === 0 && (
        <p className="soft">
          None yet. Freeze one before you make the compound: what is computed after the measurement is no
          prediction.
        </p>
      )}
      {frozen !== undefined && frozen.length > 0 && (
        <ul className="stack frozen-list">
          {frozen.map((each) => (
            <FrozenLine key={each.id} frozen={each} />
          ))}
        </ul>
      )}
    </section>
  );
}

interface KnownParts {
  readonly tenDq?: { readonly value: number | null; readonly sigma: number | null };
  readonly spin?: { readonly words?: string };
}

function FrozenLine({ frozen }: { readonly frozen: FrozenPrediction }) {
  const { tenDq, spin } = frozen.prediction as KnownParts;
  return (
    <li>
      <strong>{minuteOf(frozen.frozenAt)}</strong> {frozen.reason}
      <br />
      {tenDq && (
        <>
          10Dq <NumberWithRange kind="interval" value={tenDq.value} sigma={tenDq.sigma} />
        </>
      )}
      {spin?.words !== undefined && <>, {spin.words}</>}
      <br />
      <span className="soft small">
        parameters {frozen.parameterHash.slice(0, 12)}, model {frozen.modelVersion}
      </span>
    </li>
  );
}
