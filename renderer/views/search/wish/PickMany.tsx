import { useMemo } from 'react';
import { SearchableSelect } from '../../../parts';
import type { Choice } from './wishChoices';

interface PickManyProps {
  readonly legend: string;
  /** `metal ion`, for the field that adds one. */
  readonly one: string;
  readonly options: readonly Choice[];
  readonly chosen: 'all' | readonly string[];
  readonly onChange: (chosen: readonly string[]) => void;
  /** Where all at once is a choice of its own. */
  readonly onAll?: () => void;
  /** Sets that are put in place with one press. */
  readonly presets?: readonly { readonly label: string; readonly ids: readonly string[] }[];
}

/** Several of a long list, each in sight and taken out with one press. */
export function PickMany({ legend, one, options, chosen, onChange, onAll, presets = [] }: PickManyProps) {
  const labels = useMemo(() => new Map(options.map(({ id, label }) => [id, label])), [options]);
  const listed = chosen === 'all' ? [] : chosen;
  const left = useMemo(
    () => (chosen === 'all' ? options : options.filter(({ id }) => !chosen.includes(id))),
    [options, chosen],
  );
  return (
    <fieldset className="pick-many">
      <legend>
        {legend}{' '}
        <span className="soft small">
          {chosen === 'all'
            ? `all ${options.length}`
            : chosen.length === 0
              ? 'none'
              : `${chosen.length} chosen`}
        </span>
      </legend>
      {listed.length > 0 && (
        <ul className="pick-many-chosen">
          {listed.map((id) => (
            <li key={id}>
              <button
                type="button"
                aria-label={`Leave out ${labels.get(id) ?? id}`}
                onClick={() => onChange(listed.filter((each) => each !== id))}
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
        placeholder={chosen === 'all' ? `only this ${one}` : `add a ${one}`}
        options={left}
        value={null}
        onChange={(id) => onChange([...listed, id])}
        clearAfterChoice
      />
      {(onAll !== undefined || presets.length > 0) && (
        <div className="pick-many-presets">
          {onAll !== undefined && (
            <button
              type="button"
              className="button-quiet"
              aria-label={`${legend}: all ${options.length}`}
              onClick={onAll}
            >
              all {options.length}
            </button>
          )}
          {presets.map(({ label, ids }) => (
            <button
              key={label}
              type="button"
              className="button-quiet"
              aria-label={`${legend}: ${label}`}
              onClick={() => onChange(ids)}
            >
              {label}
            </button>
          ))}
        </div>
      )}
    </fieldset>
  );
}
