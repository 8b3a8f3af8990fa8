import { useCallback, useId, useMemo, useState, type KeyboardEvent } from 'react';
import { Dialog, Formula, Keys } from '../../parts';
import { shownCombo, useAllCommands, useCommandRegistry } from '../commands';
import { focusFirst } from '../form';
import { useRouter } from '../router/RouterContext';
import { useStored } from '../services';
import { useProjectState } from '../session/ProjectSession';
import { findCandidates, findCommands, findProjects, type FoundEntry } from './findEntries';
import type { Store } from '../../store';
import './FindDialog.css';

interface FindDialogProps {
  readonly open: boolean;
  readonly onClose: () => void;
}

/** One field for everything: records of this project, projects, commands. */
export function FindDialog({ open, onClose }: FindDialogProps) {
  return (
    <Dialog open={open} title="Find a record or a command" onClose={onClose}>
      <FindField onClose={onClose} />
    </Dialog>
  );
}

const listProjects = (store: Store) => store.projects.list();
const noProjects = [] as const;

function useFound(query: string): readonly FoundEntry[] {
  const commands = useAllCommands();
  const { value: projects = noProjects } = useStored(listProjects, ['projects']);
  const project = useProjectState();
  const session = project.state === 'open' ? project.session : null;
  return useMemo(
    () => [
      ...(session ? findCandidates(session.rows.values(), (id) => session.estimates.of(id), query) : []),
      ...findProjects(projects, query),
      ...findCommands(commands, query),
    ],
    [session, projects, commands, query],
  );
}

function FindField({ onClose }: Pick<FindDialogProps, 'onClose'>) {
  const id = useId();
  const [query, setQuery] = useState('');
  const [active, setActive] = useState(0);
  const found = useFound(query);
  const take = useTake(onClose);
  const current = Math.min(active, found.length - 1);

  const onKeyDown = (event: KeyboardEvent): void => {
    const moves: Partial<Record<string, number>> = { ArrowDown: 1, ArrowUp: -1, PageDown: 8, PageUp: -8 };
    const move = moves[event.key];
    if (move !== undefined) {
      event.preventDefault();
      const next = Math.max(0, Math.min(found.length - 1, current + move));
      setActive(next);
      document.getElementById(`${id}-${next}`)?.scrollIntoView({ block: 'nearest' });
    } else if (event.key === 'Enter') {
      event.preventDefault();
      if (found[current]) take(found[current]);
    }
  };

  return (
    <div className="find">
      <input
        role="combobox"
        aria-label="Words of a formula, a name, a tag, a note or a command"
        aria-expanded="true"
        aria-controls={`${id}-list`}
        aria-activedescendant={found.length > 0 ? `${id}-${current}` : undefined}
        placeholder="en, pink, #shortlist, export …"
        autoComplete="off"
        spellCheck={false}
        ref={focusFirst}
        value={query}
        onChange={(event) => {
          setQuery(event.currentTarget.value);
          setActive(0);
        }}
        onKeyDown={onKeyDown}
      />
      <ul id={`${id}-list`} role="listbox" aria-label="Found">
        {found.map((entry, index) => (
          <FindRow
            key={`${entry.kind} ${entry.id}`}
            id={`${id}-${index}`}
            entry={entry}
            active={index === current}
            onTake={() => take(entry)}
          />
        ))}
      </ul>
      {found.length === 0 && <p role="status">Nothing matches “{query}”.</p>}
    </div>
  );
}

interface FindRowProps {
  readonly id: string;
  readonly entry: FoundEntry;
  readonly active: boolean;
  readonly onTake: () => void;
}

function FindRow({ id, entry, active, onTake }: FindRowProps) {
  return (
    <li
      id={id}
      role="option"
      aria-selected={active}
      aria-disabled={entry.disabled || undefined}
      onClick={onTake}
    >
      <span>{entry.kind === 'candidate' ? <Formula formula={entry.label} /> : entry.label}</span>
      <span className="find-detail">
        {entry.kind === 'project' ? `project ${entry.detail}` : entry.detail}
      </span>
      {entry.keys !== null && <Keys combo={shownCombo(entry.keys)} />}
    </li>
  );
}

function useTake(onClose: () => void): (entry: FoundEntry) => void {
  const registry = useCommandRegistry();
  const { go } = useRouter();
  const project = useProjectState();
  const projectId = project.state === 'open' ? project.session.project.id : null;
  return useCallback(
    (entry) => {
      if (entry.disabled) return;
      onClose();
      if (entry.kind === 'candidate') go({ view: 'sheet', project: projectId, item: entry.id });
      else if (entry.kind === 'project') go({ view: 'candidates', project: entry.id });
      // After the dialog has closed, so that the command finds the focus where it was.
      else setTimeout(() => registry.find(entry.id)?.run());
    },
    [onClose, registry, go, projectId],
  );
}
