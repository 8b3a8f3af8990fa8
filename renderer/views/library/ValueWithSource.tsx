import type { SourcedValue } from '../../../core/library/sourced';
import { formatGiven, SourceNote } from '../../parts';

interface ValueWithSourceProps {
  /** `f`, `10Dq of aqua complex` */
  readonly name: string;
  /** What the symbol means, for who has forgotten. */
  readonly meaning: string;
  readonly value: SourcedValue;
  readonly unit?: string;
}

/** One stored value with everything that is known about where it comes from. */
export function ValueWithSource({ name, meaning, value, unit }: ValueWithSourceProps) {
  const { range, note, alternatives, confidence, status, source } = value;
  return (
    <div className="value">
      <span className="value-figure">
        <abbr className="value-name" title={meaning}>
          {name}
        </abbr>
        {value.value === null ? (
          <span className="unknown">unknown</span>
        ) : (
          <span className="value-number">
            {formatGiven(value.value)} {unit}
          </span>
        )}
        {range !== null && (
          <span className="soft small">
            in print {formatGiven(range[0])}–{formatGiven(range[1])}
          </span>
        )}
        {confidence !== null && <span className="soft small">{confidence} confidence</span>}
      </span>
      {value.value !== null && <SourceNote source={source} status={status ?? 'unknown'} />}
      {note !== null && <span className="value-note">{note}</span>}
      {alternatives.map((other, index) => (
        <span key={index} className="value-note">
          also {formatGiven(other.value)}: {other.source}
        </span>
      ))}
    </div>
  );
}

/** The bare number for a table, with a word in place of a missing one. */
export function CellNumber({ value }: { readonly value: SourcedValue }) {
  if (value.value === null) return <span className="unknown">unknown</span>;
  return (
    <span title={value.source ?? undefined}>
      {formatGiven(value.value)}
      {value.status === 'own' && <span className="badge">own</span>}
    </span>
  );
}
