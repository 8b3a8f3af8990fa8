import { colourInWords } from '../../../../core/colour';
import { NumberField } from '../../../app/form';
import { LabField } from '../../candidates/target/LabField';
import { labOfScreenColour, screenColour } from '../../candidates/target/labColour';
import '../../candidates/target/target.css';
import type { DraftColour } from './wishDraft';

interface ColourFieldsProps {
  readonly value: DraftColour | null;
  readonly target: readonly [number, number, number] | null;
  /** Conditions that hold unless others are typed. */
  readonly usual: { readonly concentration_mM: number; readonly path_cm: number };
  readonly onChange: (value: DraftColour | null) => void;
}

const startLab = [60, 30, -25] as const;

/** The seen colour that is wanted, how near it has to come, and for which solution. */
export function ColourFields({ value, target, usual, onChange }: ColourFieldsProps) {
  const from = (lab: readonly [number, number, number]): void =>
    onChange({ tolerance: 15, ...usual, ...value, lab });
  if (value === null) {
    return (
      <div className="wish-buttons">
        <button type="button" onClick={() => from(target ?? startLab)}>
          Wish for a seen colour
        </button>
      </div>
    );
  }
  const { lab } = value;
  const number = (label: string, place: 0 | 1 | 2) => (
    <LabField
      label={label}
      value={lab[place]}
      onChange={(next) => from([0, 1, 2].map((i) => (i === place ? next : lab[i]!)) as never)}
    />
  );
  return (
    <fieldset className="wish-colour">
      <legend>Seen colour</legend>
      <div className="wish-colour-pick">
        <span className="target-surround target-surround-large">
          <span className="target-patch" style={{ backgroundColor: screenColour(lab) }} />
        </span>
        <div className="stack">
          <strong>{colourInWords(lab)}</strong>
          <label className="check">
            <input
              type="color"
              value={screenColour(lab)}
              onChange={(event) => from(labOfScreenColour(event.currentTarget.value) ?? [...lab])}
            />
            Pick on the screen
          </label>
        </div>
      </div>
      <div className="wish-triple">
        {number('L*', 0)}
        {number('a*', 1)}
        {number('b*', 2)}
      </div>
      <NumberField
        label="within"
        unit="ΔE00"
        value={value.tolerance}
        empty="15 or more is honest: predicted colours are coarse"
        most={1e9}
        onChange={(tolerance) => onChange({ ...value, tolerance })}
      />
      <div className="wish-pair">
        <NumberField
          label="solution"
          unit="mmol/L"
          value={value.concentration_mM}
          most={1e5}
          onChange={(concentration_mM) => onChange({ ...value, concentration_mM })}
        />
        <NumberField
          label="path"
          unit="cm"
          value={value.path_cm}
          most={1000}
          onChange={(path_cm) => onChange({ ...value, path_cm })}
        />
      </div>
      <div className="wish-buttons">
        {target !== null && (
          <button type="button" className="button-quiet" onClick={() => from(target)}>
            The project’s target
          </button>
        )}
        <button type="button" className="button-quiet" onClick={() => onChange(null)}>
          No colour
        </button>
      </div>
    </fieldset>
  );
}
