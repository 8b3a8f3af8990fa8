import type { ParameterSet } from '../../../../core/record/project';
import { minuteOf } from '../../../app/services';

interface ParameterSetsProps {
  /** Newest first. */
  readonly sets: readonly ParameterSet[];
  readonly current: ParameterSet | null;
  readonly onChoose: (set: ParameterSet | null) => void;
}

/** Sets of the project with author, reason and hash; one of them, or the plain library, is in use. */
export function ParameterSets({ sets, current, onChoose }: ParameterSetsProps) {
  if (sets.length === 0) return null;
  return (
    <fieldset className="stack">
      <legend>Parameters in use</legend>
      <label className="check">
        <input type="radio" name="parameter-set" checked={current === null} onChange={() => onChoose(null)} />
        <span>the library as it is</span>
      </label>
      {sets.map((set) => (
        <label className="check" key={set.id}>
          <input
            type="radio"
            name="parameter-set"
            checked={current?.id === set.id}
            onChange={() => onChoose(set)}
          />
          <span>
            {set.name}, {minuteOf(set.createdAt)}, {set.author}: {set.reason}{' '}
            <span className="soft small">
              {Object.keys(set.values).length} values, hash {set.hash.slice(0, 12)}
            </span>
          </span>
        </label>
      ))}
    </fieldset>
  );
}
