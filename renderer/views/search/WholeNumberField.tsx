import { useState } from 'react';
import { Field } from '../../app/form';

interface WholeNumberFieldProps {
  readonly label: string;
  readonly value: number | null;
  readonly onChange: (value: number | null) => void;
}

/** A whole number with its sign, or nothing. */
export function WholeNumberField({ label, value, onChange }: WholeNumberFieldProps) {
  const [text, setText] = useState(value === null ? '' : String(value));
  const typed = text.trim().replace('−', '-');
  const wrong = typed !== '' && !/^[+-]?\d{1,2}$/.test(typed);
  return (
    <Field label={label} hint="any" error={wrong ? `“${text}” is not a charge.` : null}>
      {(attributes) => (
        <input
          {...attributes}
          autoComplete="off"
          value={text}
          onChange={(event) => {
            const next = event.currentTarget.value;
            setText(next);
            const plain = next.trim().replace('−', '-');
            if (plain === '') onChange(null);
            else if (/^[+-]?\d{1,2}$/.test(plain)) onChange(Number(plain));
          }}
        />
      )}
    </Field>
  );
}
