import { useEffect } from 'react';
import type { Candidate } from '../../../core/record/project';
import { Field } from '../../app/form';
import { useServices } from '../../app/services';
import { useNotesDraft } from './useNotesDraft';

/** Free words about the candidate, saved when one leaves the field; what cannot be saved stays on screen. */
export function NotesPanel({ candidate }: { readonly candidate: Candidate }) {
  const { host } = useServices();
  const notes = useNotesDraft(candidate);
  const { unsaved } = notes;
  useEffect(() => {
    host.setUnsaved(unsaved ? 'the notes you are writing' : null);
    return () => host.setUnsaved(null);
  }, [host, unsaved]);
  return (
    <section className="panel" aria-labelledby="sheet-notes">
      <h2 id="sheet-notes">Notes</h2>
      <Field
        label="About this candidate"
        error={notes.problem}
        hint={unsaved ? 'Saved when you leave the field.' : 'Saved.'}
      >
        {(attributes) => (
          <textarea
            {...attributes}
            rows={5}
            maxLength={100_000}
            value={notes.text}
            onChange={(event) => notes.write(event.currentTarget.value)}
            onBlur={notes.save}
          />
        )}
      </Field>
      {notes.theirs !== null && (
        <div role="alert" className="notes-conflict">
          <p>
            Other notes were stored meanwhile, in another window or by undo. Yours above are not saved yet;
            nothing was overwritten. Stored are:
          </p>
          <blockquote>{notes.theirs === '' ? 'no notes' : notes.theirs}</blockquote>
          <button type="button" onClick={notes.keepMine}>
            Store mine instead
          </button>
          <button type="button" onClick={notes.takeTheirs}>
            Go on from those
          </button>
        </div>
      )}
    </section>
  );
}
