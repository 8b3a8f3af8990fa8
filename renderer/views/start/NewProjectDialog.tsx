import { useId, useState, type FormEvent } from 'react';
import { Field, focusFirst } from '../../app/form';
import { useRouter } from '../../app/router/RouterContext';
import { useAction, useStore } from '../../app/services';
import { Dialog } from '../../parts';

interface NewProjectDialogProps {
  readonly open: boolean;
  readonly onClose: () => void;
}

export function NewProjectDialog({ open, onClose }: NewProjectDialogProps) {
  const form = useId();
  return (
    <Dialog
      open={open}
      title="New project"
      onClose={onClose}
      actions={
        <>
          <button type="button" onClick={onClose}>
            Cancel
          </button>
          <button type="submit" form={form} className="button-main">
            Create the project
          </button>
        </>
      }
    >
      <NewProjectForm id={form} onDone={onClose} />
    </Dialog>
  );
}

function NewProjectForm({ id, onDone }: { readonly id: string; readonly onDone: () => void }) {
  const store = useStore();
  const act = useAction();
  const { go } = useRouter();
  const [name, setName] = useState('');
  const [notes, setNotes] = useState('');
  const [tried, setTried] = useState(false);
  const problem = name.trim() === '' ? 'Give the project a name.' : null;

  const submit = (event: FormEvent): void => {
    event.preventDefault();
    setTried(true);
    if (problem !== null) return;
    void act(async () => {
      const project = await store.projects.create(name.trim().slice(0, 200), { notes });
      onDone();
      go({ view: 'candidates', project: project.id });
    });
  };
  return (
    <form id={id} onSubmit={submit} className="stack">
      <Field label="Name" error={tried ? problem : null}>
        {(attributes) => (
          <input
            {...attributes}
            ref={focusFirst}
            maxLength={200}
            value={name}
            onChange={(event) => setName(event.currentTarget.value)}
          />
        )}
      </Field>
      <Field label="What it is for" hint="For yourself and for whoever opens it in a year; may stay empty.">
        {(attributes) => (
          <textarea
            {...attributes}
            rows={3}
            value={notes}
            onChange={(event) => setNotes(event.currentTarget.value)}
          />
        )}
      </Field>
    </form>
  );
}
