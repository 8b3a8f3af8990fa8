import { useMemo } from 'react';
import { SearchableSelect } from '../../parts';

interface PickManyProps {
  readonly legend: string;
  /** `metal ion`, for the field that adds one. */
  readonly one: string;
  readonly options: readonly { readonly id: string; readonly label: string; readonly detail?: string }[];
  readonly chosen: readonly string[];
  readonly onChange: (chosen: readonly string[]) => void;
  /** Sets that are put in place with one press. */
  readonly presets: readonly { readonly label: string; readonly ids: readonly string[] }[];
}

/** Several of a long list, each in sight and taken out with one press. */
export function PickMany({ legend, one, options, chosen, onChange, presets }: PickManyProps) {
  const labels = useMemo(() => new Map(options.map(({ id, label }) => [id, label])), [options]);
  const left = useMemo(() => options.filter(({ id }) => !chosen.includes(id)), [options, chosen]);
  return (
    <fieldset className="pick-many">
      <legend>
        {legend} <span className="soft small">{chosen.length} chosen</span>
      </legend>
      {chosen.length > 0 && (
        <ul className="pick-many-chosen">
          {chosen.map((id) => (
            <li key={id}>
              <button
                type="button"
                aria-label={`Leave out ${labels.get(id) ?? id}`}
                onClick={() => onChange(chosen.filter((each) => each !== id))}
              >
                {labels.get(id) ?? id} <span aria-hidden="true">✕</span>
              </button>
            </li>
          ))}
        </ul>
      )}
      <SearchableSelect
        label={`Add a ${one}`}
        hideLabel
        placeholder={`add a ${one}`}
        options={left}
        value={null}
        onChange={(id) => onChange([...chosen, id])}
        clearAfterChoice
      />
      <div className="pick-many-presets">
        {presets.map(({ label, ids }) => (
          <button key={label} type="button" className="button-quiet" onClick={() => onChange(ids)}>
            {label}
          </button>
        ))}
      </div>
    </fieldset>
  );
}
