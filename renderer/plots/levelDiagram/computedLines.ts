import { cubicLevels, groundCrossovers, type CubicGeometry } from '../../../core/dshell';
import { type DiagramAxes } from './diagramUnits';
import { linesFromLevels, type LevelLine } from './levelLine';

export interface DiagramProblem {
  readonly dElectrons: number;
  readonly geometry: CubicGeometry;
  /** Racah parameters, cm⁻¹; B above 0 for `over-B`. */
  readonly B: number;
  readonly C: number;
  readonly axes: DiagramAxes;
  /** End of the field axis, in its own unit: cm⁻¹ for `absolute`, 10Dq/B otherwise. */
  readonly upTo: number;
  /** Points along each line, kinks not counted. */
  readonly count?: number;
}

/**
 * All lines of the level diagram of one ion, exact at every point. The fields at which the ground level changes are
 * among the points, so that every line has its kink where it belongs.
 */
export function computedLines(problem: DiagramProblem): LevelLine[] {
  const { dElectrons, geometry, B, C, axes, upTo, count = 81 } = problem;
  const unit = axes === 'over-B' ? B : 1;
  const even = Array.from({ length: count }, (_, index) => (upTo * index) / (count - 1));
  const kinks =
    B > 0
      ? groundCrossovers(dElectrons, C / B, geometry).map(({ tenDqOverB }) => (tenDqOverB * B) / unit)
      : [];
  const fields = [...even, ...kinks.filter((x) => x < upTo)].sort((one, other) => one - other);
  return linesFromLevels(
    fields.map((x) => ({ x, levels: cubicLevels({ dElectrons, geometry, tenDq: x * unit, B, C }) })),
    1 / unit,
  );
}
