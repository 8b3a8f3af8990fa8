import type { ParameterLibrary } from '../../../core/library/parameterLibrary';
import type { GeometryId } from '../../../core/record/composition';
import './metal/MetalGrid.css';

interface GeometryRowProps {
  readonly value: GeometryId;
  readonly library: ParameterLibrary;
  readonly onChange: (geometry: GeometryId) => void;
}

/** The usual three at hand, the others in a list. */
const usual = ['octahedral', 'tetrahedral', 'square-planar'];

export function GeometryRow({ value, library, onChange }: GeometryRowProps) {
  const others = library.geometries.filter(({ id }) => !usual.includes(id));
  return (
    <fieldset className="geometry-row">
      <legend>Geometry</legend>
      <div className="choices">
        {library.geometries
          .filter(({ id }) => usual.includes(id))
          .map(({ id, name, coordinationNumber }) => (
            <label key={id} className="choice">
              <input
                type="radio"
                name="geometry"
                checked={id === value}
                onChange={() => onChange(id as GeometryId)}
              />
              <span>{name}</span>
              <small>{coordinationNumber} places</small>
            </label>
          ))}
        <select
          aria-label="Other geometries"
          value={usual.includes(value) ? '' : value}
          onChange={(event) => event.currentTarget.value && onChange(event.currentTarget.value as GeometryId)}
        >
          <option value="">other…</option>
          {others.map(({ id, name, coordinationNumber }) => (
            <option key={id} value={id}>
              {name}, {coordinationNumber} places
            </option>
          ))}
        </select>
      </div>
    </fieldset>
  );
}
