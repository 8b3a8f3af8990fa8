import { useId, useMemo, useState, type FormEvent } from 'react';
import { Field, focusFirst } from '../../../app/form';
import { useAction, useStore } from '../../../app/services';
import { useProject } from '../../../app/session/ProjectSession';
import { useLibrary } from '../../../app/session/useLibrary';
import { Dialog, ErrorPanel, useToast } from '../../../parts';
import { counted } from '../../../store';
import { readPastedTable } from './pastedTable';

interface PasteDialogProps {
  /** What was in the clipboard; empty where the dialog is to be filled by hand. */
  readonly start: string;
  readonly onClose: () => void;
}

/** Candidates from a list of formulas or a table, looked at before they are taken, as one step. */
export function PasteDialog({ start, onClose }: PasteDialogProps) {
  const form = useId();
  const { project, rows } = useProject();
  const library = useLibrary();
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  const [text, setText] = useState(start);
  const lines = useMemo(
    () =>
      text.trim() === ''
        ? []
        : readPastedTable(
            text,
            rows.values().filter(({ deletedAt }) => deletedAt === null),
            library,
          ),
    [text, rows, library],
  );
  const fresh = lines.flatMap((line) => (line.kind === 'new' ? [line.candidate] : []));
  const changed = lines.filter((line) => line.kind === 'changed');
  const wrong = lines.filter((line) => line.kind === 'wrong');
  const same = lines.length - fresh.length - changed.length - wrong.length;
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    if (fresh.length + changed.length === 0) return;
    void act(async () => {
      const label = `paste ${counted(fresh.length + changed.length, 'candidate')}`;
      await store.candidates.takeOver(
        project.id,
        label,
        fresh,
        changed.map(({ candidate, fields }) => ({ id: candidate.id, fields })),
      );
      toast({
        message: `${fresh.length} added, ${changed.length} changed`,
        undo: () => void act(() => store.journal.undo(project.id)),
      });
    }).then((done) => done && onClose());
  };
  return (
    <Dialog
      open
      wide
      title="Paste candidates"
      onClose={onClose}
      actions={
        <>
          <button type="button" onClick={onClose}>
            Cancel
          </button>
          <button
            type="submit"
            form={form}
            className="button-main"
            disabled={fresh.length + changed.length === 0}
          >
            {changed.length === 0
              ? `Add ${counted(fresh.length, 'candidate')}`
              : `Take over ${counted(fresh.length + changed.length, 'line')}`}
          </button>
        </>
      }
    >
      <form id={form} className="stack" onSubmit={submit}>
        <Field
          label="One complex a line"
          hint="a formula such as [Co(en)2Cl2]+ or a name, then a tab and a name of your own; or a table that was copied here"
        >
          {(attributes) => (
            <textarea
              {...attributes}
              ref={focusFirst}
              rows={10}
              spellCheck={false}
              value={text}
              onChange={(event) => setText(event.currentTarget.value)}
            />
          )}
        </Field>
        {lines.length > 0 && (
          <p role="status">
            {counted(fresh.length, 'candidate')} new, {changed.length} changed, {same} as they are
            {wrong.length > 0 && `, ${wrong.length} not understood`}.
          </p>
        )}
        <ErrorPanel
          title="Not understood, and left out"
          problems={wrong
            .slice(0, 10)
            .map(({ line, text: written, problem }) => ({ ...problem, field: `line ${line}: ${written}` }))}
        >
          {wrong.length > 10 && <p>… and {wrong.length - 10} more.</p>}
        </ErrorPanel>
      </form>
    </Dialog>
  );
}
