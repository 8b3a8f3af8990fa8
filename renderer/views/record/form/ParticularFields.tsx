import { Field } from '../../../app/form';
import type { MeasurementDraft } from '../draft/measurementDraft';
import { BandRows } from './BandRows';
import { TextField } from './TextField';

interface ParticularFieldsProps {
  readonly draft: MeasurementDraft;
  readonly onChange: (change: Partial<MeasurementDraft>) => void;
}

const methods = ['Evans', 'balance', 'magnetometer', 'typed'] as const;
const methodWords = {
  Evans: 'Evans, NMR',
  balance: 'balance',
  magnetometer: 'magnetometer',
  typed: 'not stated',
};

/** What only this kind of measurement has. */
export function ParticularFields({ draft, onChange }: ParticularFieldsProps) {
  switch (draft.kind) {
    case 'band list':
      return <BandRows draft={draft} onChange={onChange} />;
    case 'moment':
      return (
        <div className="record-fields">
          <TextField
            label="Effective moment"
            unit="μB"
            value={draft.moment}
            onChange={(moment) => onChange({ moment })}
          />
          <TextField
            label="Uncertainty"
            unit="μB"
            value={draft.momentUncertainty}
            onChange={(momentUncertainty) => onChange({ momentUncertainty })}
          />
          <Field label="Method">
            {(attributes) => (
              <select
                {...attributes}
                value={draft.method}
                onChange={(event) =>
                  onChange({ method: event.currentTarget.value as MeasurementDraft['method'] })
                }
              >
                {methods.map((method) => (
                  <option key={method} value={method}>
                    {methodWords[method]}
                  </option>
                ))}
              </select>
            )}
          </Field>
        </div>
      );
    case 'observed colour':
      return (
        <div className="record-fields">
          <TextField
            label="Colour in words"
            hint="as you see it, e.g. pale violet"
            value={draft.words}
            onChange={(words) => onChange({ words })}
          />
          <TextField
            label="Light source"
            hint="daylight, lamp"
            value={draft.lightSource}
            onChange={(lightSource) => onChange({ lightSource })}
          />
        </div>
      );
    case 'note':
      return null;
  }
}
