import { Field } from '../../../app/form';

interface TextFieldProps {
  readonly label: string;
  readonly value: string;
  readonly onChange: (value: string) => void;
  readonly unit?: string;
  readonly hint?: string;
  readonly type?: 'text' | 'date';
}

export function TextField({ label, value, onChange, unit, hint, type = 'text' }: TextFieldProps) {
  return (
    <Field label={label} hint={hint} {...(unit === undefined ? {} : { unit })}>
      {(attributes) => (
        <input
          {...attributes}
          type={type}
          autoComplete="off"
          maxLength={200}
          value={value}
          onChange={(event) => onChange(event.currentTarget.value)}
        />
      )}
    </Field>
  );
}
