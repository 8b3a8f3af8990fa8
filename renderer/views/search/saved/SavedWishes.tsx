import { useCallback, useState } from 'react';
import type { SavedWish } from '../../../../core/record/wish';
import { checkWish, type WishInput } from '../../../../core/search';
import { Field } from '../../../app/form';
import { useAction, useServices, useStore, useStored } from '../../../app/services';
import { useProject } from '../../../app/session/ProjectSession';
import { useLibrary } from '../../../app/session/useLibrary';
import { ErrorPanel, useToast } from '../../../parts';
import type { Store } from '../../../store';
import type { Problem } from '../../../../core/errors';
import { readWishFile } from './readWishFile';

interface SavedWishesProps {
  /** The wish as the form has it now. */
  readonly wish: WishInput;
  readonly name: string;
  readonly onName: (name: string) => void;
  readonly onOpen: (wish: WishInput) => void;
}

/** Wishes kept under names, and as files that the command line reads too. */
export function SavedWishes({ wish, name, onName, onOpen }: SavedWishesProps) {
  const { project } = useProject();
  const { host } = useServices();
  const library = useLibrary();
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  const ask = useCallback((from: Store) => from.wishes.of(project.id), [project.id]);
  const { value: saved = [], error } = useStored(ask, ['wishes']);
  const [openId, setOpenId] = useState<string | null>(null);
  const [problems, setProblems] = useState<readonly Problem[]>([]);
  const opened = saved.find(({ id }) => id === openId);
  const undo = (): void => void act(() => store.journal.undo(project.id));

  const take = (row: SavedWish | undefined): void => {
    setOpenId(row?.id ?? null);
    if (row === undefined) return;
    const checked = checkWish({ ...row.wish, name: row.name }, library);
    // What contradicts itself is opened all the same: the form is where it is put right.
    const shape = checked.ok || checked.problems.every(({ code }) => code === 'contradictory-wish');
    setProblems(shape || checked.ok ? [] : checked.problems);
    if (shape) onOpen({ ...row.wish, name: row.name } as WishInput);
  };
  const save = (): void =>
    void act(async () => {
      const kept = { ...wish } as SavedWish['wish'];
      const row =
        opened?.name === wish.name
          ? await store.wishes.replace(opened, wish.name, kept)
          : await store.wishes.create(project.id, wish.name, kept);
      setOpenId(row.id);
      toast({ message: `Saved the wish “${row.name}”`, undo });
    });
  const remove = (row: SavedWish): void =>
    void act(async () => {
      await store.wishes.remove(row);
      setOpenId(null);
      toast({ message: `Deleted the wish “${row.name}”`, undo });
    });
  const exportFile = (): void =>
    void act(async () => {
      const suggestedName = `${wish.name.replace(/[^\p{L}\p{N}]+/gu, '-').replace(/^-|-$/g, '') || 'wish'}.json`;
      const data = `${JSON.stringify(wish, null, 2)}\n`;
      const answer = await host.saveFile({ kind: 'json', suggestedName, data });
      if (answer.saved) toast({ message: `Saved as ${answer.name}` });
    });
  const importFile = (): void =>
    void act(async () => {
      const [file] = await host.openFiles({ kind: 'json' });
      if (file === undefined) return;
      const outcome = readWishFile(new TextDecoder().decode(file.bytes), library);
      setProblems(outcome.ok ? [] : outcome.problems);
      if (!outcome.ok) return;
      setOpenId(null);
      onOpen(outcome.value);
      toast({ message: `Opened the wish “${outcome.value.name}”` });
    });

  return (
    <section className="panel stack saved-wishes" aria-label="Wishes">
      <div className="saved-wishes-row">
        <Field label="Saved wishes">
          {(attributes) => (
            <select
              {...attributes}
              value={openId ?? ''}
              onChange={(event) => take(saved.find(({ id }) => id === event.currentTarget.value))}
            >
              <option value="">{saved.length === 0 ? 'none yet' : 'choose one'}</option>
              {saved.map((row) => (
                <option key={row.id} value={row.id}>
                  {row.name}
                </option>
              ))}
            </select>
          )}
        </Field>
        <Field label="Name">
          {(attributes) => (
            <input
              {...attributes}
              autoComplete="off"
              maxLength={200}
              value={name}
              onChange={(event) => onName(event.currentTarget.value)}
            />
          )}
        </Field>
      </div>
      <div className="wish-buttons">
        <button type="button" onClick={save}>
          {opened?.name === wish.name ? 'Save the changes' : 'Save the wish'}
        </button>
        {opened && (
          <button type="button" className="button-quiet" onClick={() => remove(opened)}>
            Delete
          </button>
        )}
        <button type="button" className="button-quiet" onClick={exportFile}>
          Export
        </button>
        <button type="button" className="button-quiet" onClick={importFile}>
          Import…
        </button>
      </div>
      {error !== null && <p role="alert">{error}</p>}
      <ErrorPanel problems={problems} title="This wish cannot be opened" />
    </section>
  );
}
