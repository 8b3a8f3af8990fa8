import { counterIons } from '../../../core/library/counterIons';
import { Field, NumberField } from '../../app/form';
import { useProject } from '../../app/session/ProjectSession';
import type { Draft } from './draft';

interface DetailFieldsProps {
  readonly draft: Draft;
  readonly onChange: (change: Partial<Draft>) => void;
}

/** What may be said besides the complex itself. */
export function DetailFields({ draft, onChange }: DetailFieldsProps) {
  const { conditions } = useProject();
  const text = (
    label: string,
    key: 'name' | 'counterIon' | 'solvate' | 'tags',
    hint?: string,
    list?: string,
  ) => (
    <Field label={label} {...(hint === undefined ? {} : { hint })}>
      {(attributes) => (
        <input
          {...attributes}
          list={list}
          maxLength={200}
          value={draft[key]}
          onChange={(event) => onChange({ [key]: event.currentTarget.value })}
        />
      )}
    </Field>
  );
  return (
    <div className="entry-details">
      {text('Name of your own', 'name')}
      {text('Tags', 'tags', 'Apart by commas.')}
      {text('Counter-ion', 'counterIon', 'Decides on some of the cautions.', 'counter-ions')}
      <datalist id="counter-ions">
        {counterIons.map(({ formula, names }) => (
          <option key={formula} value={formula}>
            {names[0]}
          </option>
        ))}
      </datalist>
      {text('Solvate', 'solvate', 'For instance 2 H2O.')}
      <NumberField
        label="Concentration"
        unit="mM"
        value={draft.concentration_mM}
        most={55_000}
        empty={`Empty: ${conditions.concentration_mM} mM, as in the settings.`}
        onChange={(concentration_mM) => onChange({ concentration_mM })}
      />
      <NumberField
        label="Path length"
        unit="cm"
        value={draft.path_cm}
        most={1000}
        empty={`Empty: ${conditions.path_cm} cm, as in the settings.`}
        onChange={(path_cm) => onChange({ path_cm })}
      />
      <div className="entry-notes">
        <Field label="Notes">
          {(attributes) => (
            <textarea
              {...attributes}
              rows={3}
              value={draft.notes}
              onChange={(event) => onChange({ notes: event.currentTarget.value })}
            />
          )}
        </Field>
      </div>
    </div>
  );
}
