import { useId, type ReactElement, type ReactNode } from 'react';
import './Field.css';

interface FieldProps {
  readonly label: string;
  /** What to enter and in which unit. */
  readonly hint?: ReactNode;
  readonly error?: string | null | undefined;
  readonly unit?: string;
  /** Draws the control with the attributes that tie it to label, hint and error. */
  readonly children: (attributes: {
    id: string;
    'aria-describedby': string | undefined;
    'aria-invalid': boolean | undefined;
  }) => ReactElement;
}

/** A labelled control with its hint, unit and error. */
export function Field({ label, hint, error, unit, children }: FieldProps) {
  const id = useId();
  const wrong = error !== null && error !== undefined;
  const described = [hint !== undefined && `${id}-hint`, wrong && `${id}-error`].filter(Boolean).join(' ');
  return (
    <div className="field">
      <label htmlFor={id}>{label}</label>
      <div className="field-control">
        {children({
          id,
          'aria-describedby': described === '' ? undefined : described,
          'aria-invalid': wrong || undefined,
        })}
        {unit !== undefined && <span className="field-unit">{unit}</span>}
      </div>
      {hint !== undefined && (
        <p id={`${id}-hint`} className="field-hint">
          {hint}
        </p>
      )}
      {wrong && (
        <p id={`${id}-error`} className="field-error">
          {error}
        </p>
      )}
    </div>
  );
}
