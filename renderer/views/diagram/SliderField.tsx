import { useId } from 'react';
import { NumberField } from '../../app/form';

interface SliderFieldProps {
  readonly label: string;
  readonly unit: string;
  readonly value: number;
  readonly onChange: (value: number) => void;
  readonly from: number;
  readonly to: number;
  readonly step: number;
  /** Largest number that may be typed. */
  readonly most: number;
}

/** A number that is dragged for a look and typed for exactness. */
export function SliderField({ label, unit, value, onChange, from, to, step, most }: SliderFieldProps) {
  const id = useId();
  return (
    <div className="slider-field">
      <NumberField
        label={label}
        unit={unit}
        value={value}
        most={most}
        onChange={(typed) => typed !== null && onChange(typed)}
      />
      <input
        id={id}
        type="range"
        aria-label={`${label}, slider`}
        aria-valuetext={`${value} ${unit}`}
        min={from}
        max={to}
        step={step}
        value={Math.max(from, Math.min(to, value))}
        onChange={(event) => onChange(Number(event.currentTarget.value))}
      />
    </div>
  );
}
