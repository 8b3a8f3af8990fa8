import { fromWavenumber, widthFromWavenumber, type EnergyUnit } from '../../../core/units';
import { writeRange } from './formatRange';
import { intervalUnit, useUnit } from './UnitContext';
import { unitText } from './unitNames';
import './NumberWithRange.css';

interface Common {
  /** Null or absent: not estimated. */
  readonly value: number | null | undefined;
  /** Standard deviation (68 %), same unit; null: no range can be stated. */
  readonly sigma?: number | null;
  /** Ends of the range where it is not symmetric; overrides `sigma`. */
  readonly range?: readonly [number, number] | null;
  /** Significant figures at most; predictions keep 3. */
  readonly figures?: number;
  /** What to say in place of a missing value. */
  readonly missing?: string;
}

/** What kind of number it is decides how it follows the unit switch. */
export type NumberWithRangeProps = Common &
  (
    | {
        /** Energy of a transition in cm⁻¹: follows every unit. */
        readonly kind?: 'transition';
      }
    | {
        /** 10Dq, B, a gap between levels, in cm⁻¹: never written as a wavelength. */
        readonly kind: 'interval';
      }
    | {
        /** Full width in cm⁻¹ of a band at `centre` (cm⁻¹): a width converts differently from a value. */
        readonly kind: 'width';
        readonly centre: number;
      }
    | {
        /** Any other number, with its unit as text. */
        readonly kind: 'plain';
        readonly unit: string;
      }
  );

function conversion(props: NumberWithRangeProps, chosen: EnergyUnit): [string, (value: number) => number] {
  switch (props.kind) {
    case 'plain':
      return [props.unit, (value) => value];
    case 'interval': {
      const unit = intervalUnit(chosen);
      return [unitText[unit], (value) => fromWavenumber(value, unit)];
    }
    case 'width':
      return [unitText[chosen], (value) => widthFromWavenumber(props.centre, value, chosen)];
    default:
      // A range that reaches zero energy has no longest wavelength.
      return [
        unitText[chosen],
        (value) => fromWavenumber(chosen === 'nm' ? Math.max(0, value) : value, chosen),
      ];
  }
}

/** A number as the trade reads it: `21 700 (20 000–23 500) cm⁻¹`, the 68 % range in brackets. */
export function NumberWithRange(props: NumberWithRangeProps) {
  const { unit } = useUnit();
  const { value, sigma, range, figures = 3, missing = 'not estimated' } = props;
  if (value === null || value === undefined || Number.isNaN(value)) {
    return <span className="number-with-range number-missing">{missing}</span>;
  }
  const [unitName, convert] = conversion(props, unit);
  const ends = range ?? (sigma === null || sigma === undefined ? null : [value - sigma, value + sigma]);
  const written = writeRange(
    convert(value),
    ends ? convert(ends[0]!) : null,
    ends ? convert(ends[1]!) : null,
    figures,
  );
  return (
    <span className="number-with-range" title={ends && !range ? '68 % range in brackets' : undefined}>
      <span className="number-value">{written.value}</span>{' '}
      {written.range !== null && <span className="number-range">({written.range}) </span>}
      <span className="number-unit">{unitName}</span>
    </span>
  );
}
