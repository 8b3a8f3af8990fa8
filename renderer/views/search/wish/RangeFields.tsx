import { NumberField } from '../../../app/form';
import type { DraftRange } from './wishDraft';

interface RangeFieldsProps {
  readonly legend: string;
  readonly unit: string;
  readonly value: DraftRange;
  readonly most?: number;
  readonly onChange: (value: DraftRange) => void;
}

/** Two ends, each of which may be left open. */
export function RangeFields({ legend, unit, value, most, onChange }: RangeFieldsProps) {
  return (
    <fieldset className="wish-pair">
      <legend>{legend}</legend>
      {(['min', 'max'] as const).map((end) => (
        <NumberField
          key={end}
          label={end === 'min' ? 'from' : 'to'}
          unit={unit}
          value={value[end]}
          empty="any"
          {...(most === undefined ? {} : { most })}
          onChange={(typed) => onChange({ ...value, [end]: typed })}
        />
      ))}
    </fieldset>
  );
}
