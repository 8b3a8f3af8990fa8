import { multiplicityName } from '../../parts/chemistry';
import { type LineStyle } from './lineStyle';

interface SpinFilterProps {
  readonly styles: ReadonlyMap<number, LineStyle>;
  readonly hidden: ReadonlySet<number>;
  readonly onToggle: (multiplicity: number) => void;
}

/** Shows and hides the levels of each spin multiplicity. */
export function SpinFilter({ styles, hidden, onToggle }: SpinFilterProps) {
  if (styles.size < 2) return null;
  return (
    <span className="plot-zoom" role="group" aria-label="Spin multiplicities shown">
      {[...styles.keys()].map((multiplicity) => (
        <button
          key={multiplicity}
          type="button"
          aria-pressed={!hidden.has(multiplicity)}
          onClick={() => onToggle(multiplicity)}
        >
          {multiplicityName(multiplicity)}s
        </button>
      ))}
    </span>
  );
}
