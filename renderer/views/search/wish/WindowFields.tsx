import { NumberField } from '../../../app/form';
import type { DraftWindow } from './wishDraft';

export type WindowUnit = 'nm' | 'cm-1';

interface WindowFieldsProps {
  readonly legend: string;
  readonly unit: WindowUnit;
  readonly value: DraftWindow;
  /** What the molar absorptivity beside the window means; without it there is no such field. */
  readonly strength?: string;
  readonly onChange: (value: DraftWindow) => void;
  readonly onRemove?: (() => void) | undefined;
}

const shown = (nm: number | null, unit: WindowUnit): number | null =>
  nm === null ? null : unit === 'nm' ? Math.round(nm * 100) / 100 : Math.round(1e7 / nm);

/** A window of wavelengths, typed in nm or cm⁻¹; in cm⁻¹ its lower end is the longer wavelength. */
export function WindowFields({ legend, unit, value, strength, onChange, onRemove }: WindowFieldsProps) {
  const ends = unit === 'nm' ? (['from', 'to'] as const) : (['to', 'from'] as const);
  const most = unit === 'nm' ? 10_000 : 66_667;
  return (
    <fieldset className="wish-pair">
      <legend>{legend}</legend>
      {ends.map((end, place) => (
        <NumberField
          // Another unit is another number: the text starts afresh.
          key={`${end} ${unit}`}
          label={place === 0 ? 'from' : 'to'}
          unit={unit === 'nm' ? 'nm' : 'cm⁻¹'}
          value={shown(value[end], unit)}
          empty="any"
          most={most}
          onChange={(typed) =>
            onChange({ ...value, [end]: typed === null ? null : unit === 'nm' ? typed : 1e7 / typed })
          }
        />
      ))}
      {strength !== undefined && (
        <NumberField
          label="ε"
          unit="L mol⁻¹ cm⁻¹"
          value={value.absorptivity}
          empty={strength}
          onChange={(absorptivity) => onChange({ ...value, absorptivity })}
        />
      )}
      {onRemove && (
        <button type="button" className="button-quiet" onClick={onRemove}>
          Take this window out
        </button>
      )}
    </fieldset>
  );
}
