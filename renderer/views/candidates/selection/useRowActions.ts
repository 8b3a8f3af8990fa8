import { useMemo } from 'react';
import { useToast } from '../../../parts';
import { useAction, useStore } from '../../../app/services';
import { counted } from '../../../store';
import type { RowEdit } from '../grid/RowEditor';
import type { TableRow } from '../tableRow';

export interface RowActions {
  readonly star: (rows: readonly TableRow[]) => void;
  readonly edit: (row: TableRow, edit: RowEdit) => void;
  readonly archive: (rows: readonly TableRow[], archived: boolean) => void;
  readonly tag: (rows: readonly TableRow[], tag: string) => void;
  readonly untag: (rows: readonly TableRow[], tag: string) => void;
  readonly duplicate: (rows: readonly TableRow[]) => void;
  readonly remove: (rows: readonly TableRow[]) => void;
}

const idsOf = (rows: readonly TableRow[]): string[] => rows.map(({ candidate }) => candidate.id);

/** What can be done with one or many candidates; each is one step that can be undone. */
export function useRowActions(projectId: string): RowActions {
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  return useMemo((): RowActions => {
    const { candidates } = store;
    const done = (message: string): void =>
      toast({ message, undo: () => void act(() => store.journal.undo(projectId)) });
    return {
      star: (rows) => {
        const starred = !rows.every(({ candidate }) => candidate.starred);
        const label = `${starred ? 'star' : 'unstar'} ${counted(rows.length, 'candidate')}`;
        void act(() => candidates.updateMany(projectId, idsOf(rows), label, () => ({ starred })));
      },
      edit: (row, { name, tags, notes }) => {
        const label = 'change name, tags or notes of 1 candidate';
        void act(() =>
          candidates.updateMany(projectId, idsOf([row]), label, () => ({ name, tags: [...tags], notes })),
        );
      },
      archive: (rows, archived) =>
        void act(async () => {
          const label = `${archived ? 'archive' : 'take back from the archive'} ${counted(rows.length, 'candidate')}`;
          await candidates.updateMany(projectId, idsOf(rows), label, () => ({ archived }));
          done(`${counted(rows.length, 'candidate')} ${archived ? 'archived' : 'back from the archive'}`);
        }),
      tag: (rows, tag) => {
        const label = `tag ${counted(rows.length, 'candidate')} “${tag}”`;
        void act(() =>
          candidates.updateMany(projectId, idsOf(rows), label, ({ tags }) => ({
            tags: tags.includes(tag) ? tags : [...tags, tag],
          })),
        );
      },
      untag: (rows, tag) => {
        const label = `remove tag “${tag}” from ${counted(rows.length, 'candidate')}`;
        void act(() =>
          candidates.updateMany(projectId, idsOf(rows), label, ({ tags }) => ({
            tags: tags.filter((each) => each !== tag),
          })),
        );
      },
      duplicate: (rows) =>
        void act(async () => {
          const copies = rows.map(({ candidate }) => {
            const { composition, counterIon, solvate, concentration_mM, path_cm, tags, notes, name } =
              candidate;
            return {
              composition,
              counterIon,
              solvate,
              concentration_mM,
              path_cm,
              tags,
              notes,
              name: `${name} copy`.trim(),
            };
          });
          await candidates.create(projectId, copies, `duplicate ${counted(rows.length, 'candidate')}`);
        }),
      remove: (rows) =>
        void act(async () => {
          await candidates.remove(projectId, idsOf(rows));
          done(`${counted(rows.length, 'candidate')} moved to the bin`);
        }),
    };
  }, [store, act, toast, projectId]);
}
