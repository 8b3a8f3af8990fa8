import { Field } from '../../../app/form';

interface UncertainFieldProps {
  readonly label: string;
  readonly unit: string;
  readonly value: string;
  readonly u: string;
  readonly onChange: (value: string) => void;
  readonly onU: (u: string) => void;
  readonly disabled?: boolean;
}

/** A number with its standard uncertainty, both as typed. */
export function UncertainField({
  label,
  unit,
  value,
  u,
  onChange,
  onU,
  disabled = false,
}: UncertainFieldProps) {
  return (
    <Field label={label}>
      {(attributes) => (
        <span className="record-uncertain">
          <input
            {...attributes}
            inputMode="decimal"
            autoComplete="off"
            maxLength={40}
            disabled={disabled}
            value={value}
            onChange={(event) => onChange(event.currentTarget.value)}
          />
          <span aria-hidden>±</span>
          <input
            aria-label={`Uncertainty of the ${label.toLowerCase()}`}
            inputMode="decimal"
            autoComplete="off"
            maxLength={40}
            disabled={disabled}
            value={u}
            onChange={(event) => onU(event.currentTarget.value)}
          />
          <span className="field-unit">{unit}</span>
        </span>
      )}
    </Field>
  );
}
