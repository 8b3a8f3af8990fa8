import { type ReactNode } from 'react';
import './EmptyState.css';

interface EmptyStateProps {
  /** What is not there yet. */
  readonly title: string;
  /** What to do to have it. */
  readonly children?: ReactNode;
  /** Buttons that do it. */
  readonly actions?: ReactNode;
}

/** In place of an empty table or plot: what belongs here and how to get it. */
export function EmptyState({ title, children, actions }: EmptyStateProps) {
  return (
    <div className="empty-state">
      <h2>{title}</h2>
      {children !== undefined && <div className="empty-state-text">{children}</div>}
      {actions !== undefined && <div className="empty-state-actions">{actions}</div>}
    </div>
  );
}
