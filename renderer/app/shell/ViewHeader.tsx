import type { ReactNode } from 'react';
import './ViewHeader.css';

interface ViewHeaderProps {
  readonly title: ReactNode;
  /** One line under the title: what is shown, how many. */
  readonly summary?: ReactNode;
  readonly actions?: ReactNode;
}

/** Title of a view with what can be done there. */
export function ViewHeader({ title, summary, actions }: ViewHeaderProps) {
  return (
    <header className="view-header">
      <div className="view-header-words">
        <h1>{title}</h1>
        {summary !== undefined && <p className="view-header-summary">{summary}</p>}
      </div>
      {actions !== undefined && <div className="view-header-actions">{actions}</div>}
    </header>
  );
}
