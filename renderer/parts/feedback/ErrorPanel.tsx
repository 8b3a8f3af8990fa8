import { type ReactNode } from 'react';
import { type Problem } from '../../../core/errors';
import './ErrorPanel.css';

interface ErrorPanelProps {
  readonly problems: readonly Problem[];
  readonly title?: string;
  /** Ways out: retry, open the backup, go back. */
  readonly children?: ReactNode;
}

/** Everything that is wrong, each with its place and what to do about it. */
export function ErrorPanel({ problems, title, children }: ErrorPanelProps) {
  if (problems.length === 0) return null;
  const heading =
    title ??
    (problems.length === 1 ? 'This needs a correction' : `These ${problems.length} points need a correction`);
  return (
    <div className="error-panel" role="alert">
      <p className="error-title">{heading}</p>
      <ul>
        {problems.map(({ code, field, message, remedy }, index) => (
          <li key={index} data-code={code}>
            <span className="error-message">{message}</span>
            {field !== '' && <span className="error-field"> (at {field})</span>}
            {remedy !== undefined && <span className="error-remedy">{remedy}</span>}
          </li>
        ))}
      </ul>
      {children !== undefined && <div className="error-actions">{children}</div>}
    </div>
  );
}
