import { useId, useState, type FormEvent } from 'react';
import { Field, focusFirst } from '../../../app/form';
import { Dialog } from '../../../parts';
import type { IncomingFile } from './useReadings';

interface PasteSpectrumProps {
  readonly onText: (file: IncomingFile) => void;
  readonly onClose: () => void;
}

/** A table copied from a spreadsheet or a text file, read like a file of that content. */
export function PasteSpectrum({ onText, onClose }: PasteSpectrumProps) {
  const form = useId();
  const [text, setText] = useState('');
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    if (text.trim() !== '') onText({ name: 'pasted table', bytes: new TextEncoder().encode(text) });
  };
  return (
    <Dialog
      open
      wide
      title="Paste a table"
      onClose={onClose}
      actions={
        <>
          <button type="button" onClick={onClose}>
            Cancel
          </button>
          <button type="submit" form={form} className="button-main" disabled={text.trim() === ''}>
            Read it
          </button>
        </>
      }
    >
      <form id={form} className="stack" onSubmit={submit}>
        <Field
          label="Wavelength or wavenumber first, then absorbance or transmittance"
          hint="One line a point, with or without a head; several samples side by side are taken apart."
        >
          {(attributes) => (
            <textarea
              {...attributes}
              ref={focusFirst}
              className="record-paste"
              rows={12}
              spellCheck={false}
              value={text}
              onChange={(event) => setText(event.currentTarget.value)}
            />
          )}
        </Field>
      </form>
    </Dialog>
  );
}
