import { useEffect, useState } from 'react';
import type { Candidate } from '../../../core/record/project';
import { Field } from '../../app/form';
import { inWords, useServices, useStore } from '../../app/services';
import { drafts } from '../../store';

/** Free words about the candidate, saved when one leaves the field; what cannot be saved stays on screen. */
export function NotesPanel({ candidate }: { readonly candidate: Candidate }) {
  const store = useStore();
  const { host } = useServices();
  const name = `notes:${candidate.id}`;
  const [text, setText] = useState(() => {
    const kept = drafts.read(name);
    return typeof kept === 'string' ? kept : candidate.notes;
  });
  const [base, setBase] = useState(candidate.notes);
  const [problem, setProblem] = useState<string | null>(null);
  if (base !== candidate.notes) {
    // Changed from outside, by undo for instance: follows unless something unsaved is on screen.
    setBase(candidate.notes);
    if (text === base) setText(candidate.notes);
  }
  const unsaved = text !== candidate.notes;
  useEffect(() => {
    host.setUnsaved(unsaved ? 'the notes you are writing' : null);
    return () => host.setUnsaved(null);
  }, [host, unsaved]);

  const save = (): void => {
    if (!unsaved) return;
    store.candidates.update(candidate, 'write notes', { notes: text }, candidate.revision).then(
      () => {
        setProblem(null);
        drafts.drop(name);
      },
      (error: unknown) => setProblem(inWords(error)),
    );
  };
  return (
    <section className="panel" aria-labelledby="sheet-notes">
      <h2 id="sheet-notes">Notes</h2>
      <Field
        label="About this candidate"
        error={problem}
        hint={unsaved ? 'Saved when you leave the field.' : 'Saved.'}
      >
        {(attributes) => (
          <textarea
            {...attributes}
            rows={5}
            maxLength={100_000}
            value={text}
            onChange={(event) => {
              setText(event.currentTarget.value);
              drafts.keep(name, event.currentTarget.value);
            }}
            onBlur={save}
          />
        )}
      </Field>
    </section>
  );
}
