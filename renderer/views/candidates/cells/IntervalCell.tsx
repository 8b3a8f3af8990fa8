import { fromWavenumber } from '../../../../core/units';
import { intervalUnit, useUnit, writeRange } from '../../../parts';
import type { ValueWithSigma } from '../../../workers/estimateSummary';

interface RangedProps {
  readonly value: number;
  readonly low: number | null;
  readonly high: number | null;
}

/** A figure over its 68 % range; the unit stands in the head of the column. */
export function RangedFigure({ value, low, high }: RangedProps) {
  const written = writeRange(value, low, high);
  return (
    <span className="cell-ranged" title={written.range === null ? undefined : 'below: 68 % range'}>
      <span className="cell-figure">{written.value}</span>
      {written.range !== null && <span className="cell-range">{written.range}</span>}
    </span>
  );
}

/** 10Dq and the like: an interval, never written as a wavelength. */
export function IntervalCell({ value }: { readonly value: ValueWithSigma | null }) {
  const { unit } = useUnit();
  if (value === null) return <span className="soft">not estimated</span>;
  const convert = (energy: number): number => fromWavenumber(energy, intervalUnit(unit));
  const { value: centre, sigma } = value;
  return (
    <RangedFigure
      value={convert(centre)}
      low={sigma === null ? null : convert(centre - sigma)}
      high={sigma === null ? null : convert(centre + sigma)}
    />
  );
}
