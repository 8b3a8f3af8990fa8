import type { DraftRange } from './wishDraft';
import { WholeNumberField } from './WholeNumberField';

interface WholeRangeFieldsProps {
  readonly legend: string;
  readonly what: string;
  readonly value: DraftRange;
  readonly onChange: (value: DraftRange) => void;
}

/** Two whole numbers, each of which may be left open. */
export function WholeRangeFields({ legend, what, value, onChange }: WholeRangeFieldsProps) {
  return (
    <fieldset className="wish-pair">
      <legend>{legend}</legend>
      {(['min', 'max'] as const).map((end) => (
        <WholeNumberField
          key={end}
          label={end === 'min' ? 'from' : 'to'}
          what={what}
          value={value[end]}
          onChange={(typed) => onChange({ ...value, [end]: typed })}
        />
      ))}
    </fieldset>
  );
}
