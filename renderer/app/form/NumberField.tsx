import { useState } from 'react';
import { Field } from './Field';
import { readNumber } from './readNumber';

interface NumberFieldProps {
  readonly label: string;
  readonly unit: string;
  readonly value: number | null;
  /** Called with each number that makes sense; null for an emptied field, where that is allowed. */
  readonly onChange: (value: number | null) => void;
  /** What an empty field means; without it a number is demanded. */
  readonly empty?: string;
  readonly most?: number;
}

/** A positive number as people type it, with point or comma; what makes no sense is said and not taken. */
export function NumberField({ label, unit, value, onChange, empty, most = 1e6 }: NumberFieldProps) {
  const [text, setText] = useState(value === null ? '' : String(value));
  const [shown, setShown] = useState(value);
  if (shown !== value) {
    // Changed from outside: by undo, say.
    setShown(value);
    if (readNumber(text) !== value) setText(value === null ? '' : String(value));
  }
  const problem = problemOf(text, empty !== undefined, most);
  return (
    <Field label={label} unit={unit} error={problem} hint={empty}>
      {(attributes) => (
        <input
          {...attributes}
          inputMode="decimal"
          autoComplete="off"
          value={text}
          onChange={(event) => {
            const typed = event.currentTarget.value;
            setText(typed);
            if (problemOf(typed, empty !== undefined, most) !== null) return;
            const number = readNumber(typed);
            setShown(number);
            onChange(number);
          }}
        />
      )}
    </Field>
  );
}

function problemOf(text: string, mayBeEmpty: boolean, most: number): string | null {
  if (text.trim() === '') return mayBeEmpty ? null : 'Enter a number.';
  const number = readNumber(text);
  if (number === null) return `“${text}” is not a number.`;
  if (number <= 0) return 'Enter a number above zero.';
  return number > most ? `At most ${most}.` : null;
}
