import { useState } from 'react';
import { Field, readNumber } from '../../../app/form';

interface LabFieldProps {
  readonly label: string;
  readonly value: number;
  readonly onChange: (value: number) => void;
}

/** One coordinate of a colour; what is no number is said and not taken. */
export function LabField({ label, value, onChange }: LabFieldProps) {
  const [text, setText] = useState(String(value));
  const [shown, setShown] = useState(value);
  if (shown !== value) {
    setShown(value);
    setText(String(value));
  }
  const number = readNumber(text);
  const wrong = number === null || Math.abs(number) > 200;
  return (
    <Field label={label} error={wrong ? 'Enter a number.' : null}>
      {(attributes) => (
        <input
          {...attributes}
          inputMode="decimal"
          value={text}
          onChange={(event) => {
            const typed = event.currentTarget.value;
            setText(typed);
            const next = readNumber(typed);
            if (next === null || Math.abs(next) > 200) return;
            setShown(next);
            onChange(next);
          }}
        />
      )}
    </Field>
  );
}
