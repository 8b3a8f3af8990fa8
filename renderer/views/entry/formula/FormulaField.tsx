import { useState } from 'react';
import { readFormula, type ReadFormula } from '../../../../core/formula';
import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { Field } from '../../../app/form';
import './FormulaField.css';

interface FormulaFieldProps {
  readonly library: ParameterLibrary;
  /** Called whenever what is typed makes a whole complex. */
  readonly onRead: (formula: ReadFormula) => void;
}

/** A complex typed as one writes it; what is wrong is said with the place, and what may be meant. */
export function FormulaField({ library, onRead }: FormulaFieldProps) {
  const [text, setText] = useState('');
  const reading = text.trim() === '' ? null : readFormula(text, library);
  const type = (typed: string): void => {
    setText(typed);
    const now = readFormula(typed, library);
    if (now.ok) onRead(now.value);
  };
  const problem = reading?.ok === false ? reading.problem : null;
  const assumed = reading?.ok ? reading.value.assumed : [];
  return (
    <div className="formula-field">
      <Field
        label="Formula or name"
        hint={
          problem === null && assumed.length === 0
            ? 'such as [Co(en)2Cl2]+, K3[Fe(CN)6] or hexaamminecobalt(III); or choose below'
            : undefined
        }
      >
        {(attributes) => (
          <input
            {...attributes}
            autoComplete="off"
            spellCheck={false}
            maxLength={400}
            value={text}
            onChange={(event) => type(event.currentTarget.value)}
          />
        )}
      </Field>
      <div role="status" className="small">
        {assumed.join(' ')}
        {problem && (
          <>
            <span className="formula-field-place" aria-hidden="true">
              {text.slice(0, problem.at)}
              <mark>{text.slice(problem.at, problem.at + 1) || '…'}</mark>
              {text.slice(problem.at + 1)}
            </span>{' '}
            {problem.message}, at character {problem.at + 1}.
          </>
        )}
      </div>
      {problem && problem.suggestions.length > 0 && (
        <div className="formula-field-suggestions">
          <span className="small">Is it</span>
          {problem.suggestions.map((suggestion) => (
            <button
              key={suggestion}
              type="button"
              onClick={() => type(replaced(text, problem.at, suggestion))}
            >
              {suggestion}
            </button>
          ))}
        </div>
      )}
    </div>
  );
}

/** The word at a place exchanged for another. */
function replaced(text: string, at: number, by: string): string {
  const word = /^[A-Za-z,'′-]+|^./.exec(text.slice(at))?.[0] ?? '';
  return text.slice(0, at) + by + text.slice(at + word.length);
}
