import './metal/MetalGrid.css';

interface IsomerRowProps {
  readonly names: readonly string[];
  readonly value: string | null;
  readonly onChange: (isomer: string | null) => void;
}

/** Only where the ligand set has more than one arrangement. */
export function IsomerRow({ names, value, onChange }: IsomerRowProps) {
  if (names.length === 0) return null;
  return (
    <fieldset className="isomer-row">
      <legend>Isomer</legend>
      <div className="choices">
        {names.map((name) => (
          <label key={name} className="choice">
            <input type="radio" name="isomer" checked={name === value} onChange={() => onChange(name)} />
            <em>{name}</em>
          </label>
        ))}
        <label className="choice">
          <input type="radio" name="isomer" checked={value === null} onChange={() => onChange(null)} />
          not said
        </label>
      </div>
    </fieldset>
  );
}
