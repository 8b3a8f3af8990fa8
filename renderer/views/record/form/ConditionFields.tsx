import { phases } from '../../../../core/record/sample';
import { Field } from '../../../app/form';
import type { ConditionsDraft } from '../draft/measurementDraft';
import { TextField } from './TextField';
import { UncertainField } from './UncertainField';

interface ConditionFieldsProps {
  readonly draft: ConditionsDraft;
  readonly onChange: (change: Partial<ConditionsDraft>) => void;
  /** Batch and phase belong to the sample and are not corrected with a measurement. */
  readonly withSample: boolean;
}

/** Under what conditions it was measured; nothing here is demanded. */
export function ConditionFields({ draft, onChange, withSample }: ConditionFieldsProps) {
  return (
    <fieldset className="record-fields">
      <legend>Conditions, as far as they are known</legend>
      <TextField label="Solvent" value={draft.solvent} onChange={(solvent) => onChange({ solvent })} />
      <UncertainField
        label="Temperature"
        unit="K"
        value={draft.temperature}
        u={draft.temperatureU}
        onChange={(temperature) => onChange({ temperature })}
        onU={(temperatureU) => onChange({ temperatureU })}
      />
      <UncertainField
        label="Concentration"
        unit="mM"
        value={draft.concentration}
        u={draft.concentrationU}
        onChange={(concentration) => onChange({ concentration })}
        onU={(concentrationU) => onChange({ concentrationU })}
      />
      <UncertainField
        label="Path length"
        unit="cm"
        value={draft.path}
        u={draft.pathU}
        onChange={(path) => onChange({ path })}
        onU={(pathU) => onChange({ pathU })}
      />
      <TextField label="Blank" value={draft.blank} onChange={(blank) => onChange({ blank })} />
      <TextField
        label="Spectral bandwidth"
        unit="nm"
        value={draft.bandwidth}
        onChange={(bandwidth) => onChange({ bandwidth })}
      />
      {withSample && (
        <>
          <TextField label="Batch" value={draft.batch} onChange={(batch) => onChange({ batch })} />
          <Field
            label="Phase"
            hint={draft.batch.trim() === '' ? 'kept with the batch: name it first' : undefined}
          >
            {(attributes) => (
              <select
                {...attributes}
                disabled={draft.batch.trim() === ''}
                value={draft.phase}
                onChange={(event) =>
                  onChange({ phase: event.currentTarget.value as ConditionsDraft['phase'] })
                }
              >
                <option value="">not stated</option>
                {phases.map((phase) => (
                  <option key={phase}>{phase}</option>
                ))}
              </select>
            )}
          </Field>
        </>
      )}
      <TextField
        label="Instrument"
        value={draft.instrument}
        onChange={(instrument) => onChange({ instrument })}
      />
      <TextField label="Date" type="date" value={draft.date} onChange={(date) => onChange({ date })} />
      <TextField label="Initials" value={draft.operator} onChange={(operator) => onChange({ operator })} />
    </fieldset>
  );
}
