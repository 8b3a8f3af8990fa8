import { fromWavenumber, type EnergyUnit } from '../../../core/units';
import { extent } from '../frame';
import { niceStep } from '../frame/ticks';
import { type CandidatePlace } from './CandidateMark';
import { type LevelLine } from './levelLine';

/** `absolute`: E against 10Dq, both in cm⁻¹. `over-B`: E/B against 10Dq/B, which has no unit to convert. */
export type DiagramAxes = 'absolute' | 'over-B';

/** Above this nothing is seen with an ordinary spectrometer (200 nm), and the model knows less and less. */
const usualCeiling: Readonly<Record<DiagramAxes, number>> = { absolute: 50_000, 'over-B': 80 };

/** Lines in the unit of the page. */
export function inUnit(lines: readonly LevelLine[], axes: DiagramAxes, unit: EnergyUnit) {
  if (axes === 'over-B' || unit === 'cm-1') return lines;
  return lines.map((line) => ({
    ...line,
    points: line.points.map(({ x, y }) => ({ x: fromWavenumber(x, unit), y: fromWavenumber(y, unit) })),
  }));
}

export const placeInUnit = (place: CandidatePlace, unit: EnergyUnit): CandidatePlace => ({
  ...place,
  x: fromWavenumber(place.x, unit),
  sigma: place.sigma === null ? null : fromWavenumber(place.sigma, unit),
});

/** Top of the energy axis: as asked for, or the highest level below the usual ceiling, rounded up. */
export function ceilingOf(
  lines: readonly LevelLine[],
  asked: number | undefined,
  axes: DiagramAxes,
  unit: EnergyUnit,
): number {
  const convert = (value: number): number => (axes === 'absolute' ? fromWavenumber(value, unit) : value);
  const highest = extent(lines.flatMap(({ points }) => points.map(({ y }) => y)))[1];
  const top = asked === undefined ? Math.min(highest, convert(usualCeiling[axes])) : convert(asked);
  const step = niceStep(top, 8);
  return Math.ceil(top / step - 1e-6) * step || 1;
}
