import { useCallback, useState } from 'react';
import { useHistory } from '../services';
import { useProjectState } from '../session/ProjectSession';
import type { ViewDefinition } from '../view';
import { Tour } from '../tour/Tour';
import { FindDialog } from './FindDialog';
import { Rail } from './Rail';
import { ShortcutList } from './ShortcutList';
import { Troubles } from './Troubles';
import { TopBar } from './TopBar';
import { useFrameCommands } from './useFrameCommands';
import { useHostLink } from './useHostLink';
import { ViewPort } from './ViewPort';
import './Frame.css';

type Overlay = 'find' | 'shortcuts' | null;

export function Frame({ views }: { readonly views: readonly ViewDefinition[] }) {
  const project = useProjectState();
  const history = useHistory(project.state === 'open' ? project.session.project.id : null);
  const [overlay, setOverlay] = useState<Overlay>(null);
  const find = useCallback(() => setOverlay('find'), []);
  const shortcuts = useCallback(() => setOverlay('shortcuts'), []);
  const close = useCallback(() => setOverlay(null), []);
  useFrameCommands(views, { history, find, shortcuts });
  useHostLink(history);
  return (
    <div className="frame">
      <a className="skip-link" href="#content" onClick={skipToContent}>
        Skip to content
      </a>
      <TopBar history={history} onFind={find} onShortcuts={shortcuts} />
      <Rail views={views} />
      <div className="frame-main">
        <Troubles />
        <ViewPort views={views} />
        <Tour />
      </div>
      <FindDialog open={overlay === 'find'} onClose={close} />
      <ShortcutList open={overlay === 'shortcuts'} onClose={close} />
    </div>
  );
}

/** The part behind `#` is the address of the view: the link moves the focus without changing it. */
function skipToContent(event: { preventDefault(): void }): void {
  event.preventDefault();
  document.getElementById('content')?.focus();
}
