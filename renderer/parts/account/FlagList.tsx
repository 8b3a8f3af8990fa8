import { type Flag } from '../../../core/estimation/types';
import './FlagList.css';

const marks: Readonly<Record<Flag['severity'], readonly [mark: string, words: string]>> = {
  invalid: ['✕', 'Do not trust'],
  caution: ['!', 'Take care'],
  note: ['i', 'Note'],
};
const order: readonly Flag['severity'][] = ['invalid', 'caution', 'note'];

/** Remarks on an estimate, gravest first, each told apart by word and mark as well as by colour. */
export function FlagList({ flags }: { readonly flags: readonly Flag[] }) {
  if (flags.length === 0) return null;
  const sorted = [...flags].sort((one, other) => order.indexOf(one.severity) - order.indexOf(other.severity));
  return (
    <ul className="flag-list" aria-label="Remarks on this estimate">
      {sorted.map(({ code, severity, message }, index) => (
        <li key={`${code}-${index}`} data-severity={severity}>
          <span className="flag-mark" aria-hidden="true">
            {marks[severity][0]}
          </span>
          <span>
            <strong>{marks[severity][1]}:</strong> {message}
          </span>
        </li>
      ))}
    </ul>
  );
}

/** One small mark for a table row: the gravest flag, with all messages as its name. */
export function FlagMark({ flags }: { readonly flags: readonly Flag[] }) {
  const severity = order.find((grade) => flags.some((flag) => flag.severity === grade));
  if (severity === undefined) return null;
  const words = flags.map((flag) => `${marks[flag.severity][1]}: ${flag.message}`).join('; ');
  return (
    <span className="flag-mark" data-severity={severity} role="img" aria-label={words} title={words}>
      {marks[severity][0]}
    </span>
  );
}
