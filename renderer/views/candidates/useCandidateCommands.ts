import { useMemo } from 'react';
import { type Command, useCommands } from '../../app/commands';
import { useRouter } from '../../app/router/RouterContext';
import { filterFieldId } from './FilterBar';
import type { RowActions } from './selection/useRowActions';
import type { TableRow } from './tableRow';

interface CandidateCommands {
  readonly projectId: string;
  /** The selected rows, or the row that has the focus. */
  readonly subjects: readonly TableRow[];
  readonly actions: RowActions;
  readonly onEdit: () => void;
  readonly onTag: () => void;
  readonly onCopy: () => void;
  readonly onPaste: () => void;
  readonly onSelectAll: () => void;
}

const group = 'Candidates';

export function useCandidateCommands(given: CandidateCommands): void {
  const { projectId, subjects, actions, onEdit, onTag, onCopy, onPaste, onSelectAll } = given;
  const { go } = useRouter();
  const commands = useMemo((): readonly Command[] => {
    const disabled = subjects.length === 0;
    const archived = !disabled && subjects.every(({ candidate }) => candidate.archived);
    const command = (id: string, label: string, keys: readonly string[], run: () => void): Command => ({
      id: `candidates.${id}`,
      label,
      group,
      keys,
      run,
      disabled,
    });
    return [
      {
        id: 'candidates.add',
        label: 'Add a candidate',
        group,
        keys: ['n'],
        run: () => go({ view: 'entry', project: projectId }),
      },
      {
        id: 'candidates.filter',
        label: 'Filter the candidates',
        group,
        keys: ['f'],
        run: () => document.getElementById(filterFieldId)?.focus(),
      },
      { id: 'candidates.paste', label: 'Paste formulas or a table', group, keys: ['v'], run: onPaste },
      { id: 'candidates.all', label: 'Select all that are shown', group, keys: ['Mod+A'], run: onSelectAll },
      command('star', 'Star or unstar', ['s'], () => actions.star(subjects)),
      command('edit', 'Change name, tags and notes in the row', ['F2', 'e'], onEdit),
      command('tag', 'Tag', ['t'], onTag),
      command('copy', 'Copy as a table for a spreadsheet', ['Mod+C'], onCopy),
      command('duplicate', 'Duplicate', ['d'], () => actions.duplicate(subjects)),
      command('archive', archived ? 'Take back from the archive' : 'Archive', ['a'], () =>
        actions.archive(subjects, !archived),
      ),
      command('delete', 'Delete', ['Delete'], () => actions.remove(subjects)),
    ];
  }, [go, projectId, subjects, actions, onEdit, onTag, onCopy, onPaste, onSelectAll]);
  useCommands(commands);
}
