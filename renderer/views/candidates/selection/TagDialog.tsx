import { useId, useMemo, useState, type FormEvent } from 'react';
import { Field, focusFirst } from '../../../app/form';
import { Dialog } from '../../../parts';
import type { TableRow } from '../tableRow';

interface TagDialogProps {
  /** Rows to be tagged; null while the dialog is closed. */
  readonly rows: readonly TableRow[] | null;
  /** All rows of the project, whose tags are offered. */
  readonly all: readonly TableRow[];
  readonly onTag: (tag: string) => void;
  readonly onUntag: (tag: string) => void;
  readonly onClose: () => void;
}

export function TagDialog({ rows, all, onTag, onUntag, onClose }: TagDialogProps) {
  return (
    <Dialog open={rows !== null} title="Tags" onClose={onClose}>
      {rows !== null && <TagForm rows={rows} all={all} onTag={onTag} onUntag={onUntag} onClose={onClose} />}
    </Dialog>
  );
}

function TagForm({
  rows,
  all,
  onTag,
  onUntag,
  onClose,
}: TagDialogProps & { readonly rows: readonly TableRow[] }) {
  const list = useId();
  const [tag, setTag] = useState('');
  const known = useMemo(() => tagsOf(all), [all]);
  const present = tagsOf(rows);
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    const wanted = tag.trim().replace(/^#/, '').slice(0, 50);
    if (wanted === '') return;
    onTag(wanted);
    onClose();
  };
  return (
    <form className="stack" onSubmit={submit}>
      <Field label="Add a tag" hint="Then “#tag” in the filter shows what carries it.">
        {(attributes) => (
          <input
            {...attributes}
            ref={focusFirst}
            list={list}
            maxLength={50}
            value={tag}
            onChange={(event) => setTag(event.currentTarget.value)}
          />
        )}
      </Field>
      <datalist id={list}>
        {known.map((each) => (
          <option key={each} value={each} />
        ))}
      </datalist>
      {present.length > 0 && (
        <ul className="tag-list">
          {present.map((each) => (
            <li key={each}>
              <button type="button" onClick={() => onUntag(each)} aria-label={`Remove the tag ${each}`}>
                {each} ✕
              </button>
            </li>
          ))}
        </ul>
      )}
      <div>
        <button type="submit" className="button-main">
          Add the tag
        </button>
      </div>
    </form>
  );
}

const tagsOf = (rows: readonly TableRow[]): readonly string[] =>
  [...new Set(rows.flatMap(({ candidate }) => candidate.tags))].sort();
