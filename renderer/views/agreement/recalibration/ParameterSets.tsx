import { useCallback } from 'react';
import type { ParameterSet } from '../../../../core/record/project';
import { minuteOf, useStored } from '../../../app/services';
import { useProject } from '../../../app/session/ProjectSession';
import type { Store } from '../../../store';

interface ParameterSetsProps {
  readonly current: ParameterSet | null;
  readonly onChoose: (set: ParameterSet | null) => void;
}

/** Sets of the project with author, reason and hash; one of them, or the plain library, is in use. */
export function ParameterSets({ current, onChoose }: ParameterSetsProps) {
  const { project } = useProject();
  const ask = useCallback((store: Store) => store.parameterSets.of(project.id), [project.id]);
  const { value: sets = [] } = useStored(ask, ['parameterSets']);
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
