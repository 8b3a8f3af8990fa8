import { fromWavenumber } from '../../../../core/units';
import { useUnit } from '../../../parts';
import type { BandSummary } from '../../../workers/estimateSummary';
import { RangedFigure } from './IntervalCell';

/** The first spin-allowed band with its range, in the unit of the workbench. */
export function BandCell({ band }: { readonly band: BandSummary | null }) {
  const { unit } = useUnit();
  if (band === null) return <span className="soft">none</span>;
  const convert = (energy: number): number => fromWavenumber(Math.max(energy, 1), unit);
  const { energy, sigma } = band;
  return (
    <RangedFigure value={convert(energy)} low={convert(energy - sigma)} high={convert(energy + sigma)} />
  );
}
