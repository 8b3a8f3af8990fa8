import { useState } from 'react';
import { Field } from '../../../app/form';

interface WholeNumberFieldProps {
  readonly label: string;
  readonly value: number | null;
  /** What it counts, for the error: `charge`. */
  readonly what: string;
  readonly onChange: (value: number | null) => void;
}

const read = (text: string): number | null | undefined => {
  const plain = text.trim().replace('−', '-');
  if (plain === '') return null;
  return /^[+-]?\d{1,2}$/.test(plain) ? Number(plain) : undefined;
};

/** A whole number with its sign, or nothing. */
export function WholeNumberField({ label, value, what, onChange }: WholeNumberFieldProps) {
  const [text, setText] = useState(value === null ? '' : String(value));
  const [shown, setShown] = useState(value);
  if (shown !== value) {
    // Changed from outside: another wish was opened.
    setShown(value);
    if (read(text) !== value) setText(value === null ? '' : String(value));
  }
  return (
    <Field
      label={label}
      hint="any"
      error={read(text) === undefined ? `“${text.trim()}” is not a ${what}.` : null}
    >
      {(attributes) => (
        <input
          {...attributes}
          autoComplete="off"
          value={text}
          onChange={(event) => {
            const typed = event.currentTarget.value;
            setText(typed);
            const number = read(typed);
            if (number === undefined) return;
            setShown(number);
            onChange(number);
          }}
        />
      )}
    </Field>
  );
}
