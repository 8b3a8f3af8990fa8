import { formatGiven } from '../number';
import './Progress.css';

interface ProgressProps {
  /** What is being done, `Estimating candidates`. */
  readonly label: string;
  readonly done: number;
  /** Null where the end is not known. */
  readonly total: number | null;
  /** One more line, `about 4 s left`. */
  readonly detail?: string;
  readonly onCancel?: () => void;
}

/** How far a long job has come, and the way to stop it. */
export function Progress({ label, done, total, detail, onCancel }: ProgressProps) {
  const known = total !== null && total > 0;
  return (
    <div className="progress">
      <div className="progress-head">
        <span className="progress-label">{label}</span>
        <span className="progress-count">
          {formatGiven(done)}
          {known && ` of ${formatGiven(total)}`}
        </span>
        {onCancel && (
          <button type="button" onClick={onCancel}>
            Stop
          </button>
        )}
      </div>
      <progress aria-label={label} {...(known ? { value: Math.min(done, total), max: total } : {})} />
      {detail !== undefined && <p className="progress-detail">{detail}</p>}
    </div>
  );
}
