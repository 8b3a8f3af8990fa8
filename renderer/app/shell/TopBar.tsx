import { UnitSwitch } from '../../parts';
import { shownCombo } from '../commands';
import { linkTo } from '../router/RouterContext';
import type { History } from '../services';
import { useProjectState } from '../session/ProjectSession';
import { Mark } from './Mark';
import { UndoButtons } from './UndoButtons';
import './TopBar.css';

interface TopBarProps {
  readonly history: History;
  readonly onFind: () => void;
  readonly onShortcuts: () => void;
}

export function TopBar({ history, onFind, onShortcuts }: TopBarProps) {
  const project = useProjectState();
  return (
    <header className="top-bar">
      <a className="top-bar-home" href={linkTo({ view: 'start' })} aria-label="Spinhue: all projects">
        <Mark />
        <span>Spinhue</span>
      </a>
      {project.state === 'open' && (
        <a
          className="top-bar-project"
          href={linkTo({ view: 'candidates', project: project.session.project.id })}
        >
          {project.session.project.name}
          {project.session.project.demo && <span className="top-bar-demo">demo</span>}
        </a>
      )}
      <button type="button" className="top-bar-find" onClick={onFind} aria-keyshortcuts="Control+K">
        <span>Find a record or a command</span>
        <kbd>{shownCombo('Mod+K')}</kbd>
      </button>
      <UnitSwitch />
      <UndoButtons history={history} />
      <button
        type="button"
        className="button-quiet top-bar-help"
        onClick={onShortcuts}
        title="Keyboard shortcuts (?)"
      >
        <span aria-hidden="true">?</span>
        <span className="visually-hidden">Keyboard shortcuts</span>
      </button>
    </header>
  );
}
