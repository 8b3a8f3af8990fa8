import { useId, useState, type FormEvent, type KeyboardEvent } from 'react';
import type { TableRow } from '../tableRow';

/** What is changed in the table itself; the composition is changed in its own view, beside its estimate. */
export interface RowEdit {
  readonly name: string;
  readonly tags: readonly string[];
  readonly notes: string;
}

interface RowEditorProps {
  readonly row: TableRow;
  readonly formula: string;
  readonly onSave: (row: TableRow, edit: RowEdit) => void;
  /** Without a change, or after saving. */
  readonly onClose: () => void;
}

/** Called when the field appears, not with each draw. */
const focusOnce = (field: HTMLInputElement | null): void => {
  field?.focus({ preventScroll: true });
  field?.select();
};

const splitTags = (text: string): readonly string[] => [
  ...new Set(
    text
      .split(',')
      .map((tag) => tag.trim().replace(/^#/, '').slice(0, 50))
      .filter(Boolean),
  ),
];

/** Name, tags and notes of one candidate, in its own row: Enter keeps them, Escape leaves them as they were. */
export function RowEditor({ row, formula, onSave, onClose }: RowEditorProps) {
  const id = useId();
  const { candidate } = row;
  const [name, setName] = useState(candidate.name);
  const [tags, setTags] = useState(candidate.tags.join(', '));
  const [notes, setNotes] = useState(candidate.notes);
  // A field of one line would join the lines of a longer note.
  const longNotes = candidate.notes.includes('\n');

  const save = (event: FormEvent): void => {
    event.preventDefault();
    const edit = { name: name.trim(), tags: splitTags(tags).slice(0, 50), notes };
    const same =
      edit.name === candidate.name &&
      edit.notes === candidate.notes &&
      edit.tags.join('\n') === candidate.tags.join('\n');
    if (!same) onSave(row, edit);
    onClose();
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    event.stopPropagation();
    if (event.key !== 'Escape') return;
    event.preventDefault();
    onClose();
  };
  return (
    <form className="row-editor" aria-label={`Change ${formula}`} onSubmit={save} onKeyDown={onKeyDown}>
      <label htmlFor={`${id}-name`}>Name</label>
      <input
        id={`${id}-name`}
        ref={focusOnce}
        maxLength={200}
        value={name}
        onChange={(event) => setName(event.currentTarget.value)}
      />
      <label htmlFor={`${id}-tags`}>Tags</label>
      <input
        id={`${id}-tags`}
        placeholder="apart by commas"
        value={tags}
        onChange={(event) => setTags(event.currentTarget.value)}
      />
      <label htmlFor={`${id}-notes`}>Notes</label>
      <input
        id={`${id}-notes`}
        maxLength={100_000}
        readOnly={longNotes}
        title={longNotes ? 'These notes have several lines: change them on the sheet' : undefined}
        value={longNotes ? notes.replaceAll('\n', ' ') : notes}
        onChange={(event) => setNotes(event.currentTarget.value)}
      />
      <button type="submit" className="button-main">
        Keep
      </button>
      <button type="button" onClick={onClose}>
        Leave
      </button>
    </form>
  );
}
