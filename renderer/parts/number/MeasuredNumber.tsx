import { fromWavenumber, widthFromWavenumber } from '../../../core/units';
import { formatFigures } from './formatNumber';
import { unitText } from './unitNames';
import { useUnit } from './UnitContext';

interface MeasuredNumberProps {
  /** cm⁻¹ */
  readonly value: number;
  /** Standard uncertainty, cm⁻¹; null where nobody stated one. */
  readonly u: number | null;
}

/** A measured position with its own uncertainty, which is smaller than any prediction's range. */
export function MeasuredNumber({ value, u }: MeasuredNumberProps) {
  const { unit } = useUnit();
  return (
    <span className="figures">
      <strong>{formatFigures(fromWavenumber(value, unit), 5)}</strong>
      {u !== null && ` ± ${formatFigures(widthFromWavenumber(value, u, unit), 2)}`} {unitText[unit]}
    </span>
  );
}
