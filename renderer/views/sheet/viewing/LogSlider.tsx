import { Field } from '../../../app/form';
import { formatGiven } from '../../../parts';

interface LogSliderProps {
  readonly label: string;
  readonly value: number;
  readonly least: number;
  readonly most: number;
  readonly unit: string;
  readonly onChange: (value: number) => void;
}

/** Twenty steps to a decade, each a number of two figures that one would weigh out. */
const perDecade = 20;
const rounded = (value: number): number => Number(value.toPrecision(2));

/** A quantity that matters by its ratio, on a logarithmic slider. */
export function LogSlider({ label, value, least, most, unit, onChange }: LogSliderProps) {
  return (
    <Field label={`${label}, ${formatGiven(value)} ${unit}`}>
      {(attributes) => (
        <input
          {...attributes}
          type="range"
          min={Math.round(perDecade * Math.log10(least))}
          max={Math.round(perDecade * Math.log10(most))}
          step={1}
          value={Math.round(perDecade * Math.log10(value))}
          aria-valuetext={`${formatGiven(value)} ${unit}`}
          onChange={(event) => onChange(rounded(10 ** (event.currentTarget.valueAsNumber / perDecade)))}
        />
      )}
    </Field>
  );
}
